import type { BasisMove, SpecificationInput } from '@bellgap/common/api';
import type { Override } from '../../specifications/inheritance';
import type { Author } from '../people';

/** Who does it and when; dates of the story, UTC. */
export interface Act {
  by: Author;
  at: string;
}

/** One save of a document: what it adds to the input so far. */
export interface StorySave extends Act {
  kind: 'save';
  input: Partial<SpecificationInput>;
  /** Departures from the design basis: value by path, with the reason. */
  overrides?: (Override & { value: unknown })[];
}

export type StoryAct =
  | StorySave
  | (Act & { kind: 'create'; title: string })
  | (Act & { kind: 'draw' })
  | (Act & { kind: 'submit'; dueOn: string; note: string })
  /** A whole check, by the first rules that mean something; remarks stay open where it is returned. */
  | (Act & {
      kind: 'check';
      verdict: 'pass' | 'pass-with-notes' | 'return';
      note: string;
      /** Why the figures of the sheet are right where they lie outside the band of the rules. */
      differenceReason: string;
      remarks?: { path: string | null; text: string }[];
    })
  /** Issue, with one reason for all that is to be accepted. */
  | (Act & { kind: 'issue'; reason: string })
  | (Act & { kind: 'take-copy' })
  | (Act & { kind: 'next' });

export interface StoryDocument {
  projectCode: string;
  number: string;
  acts: StoryAct[];
}

export interface StoryBasis extends Act {
  projectCode: string;
  revision: number;
  faultCurrentKa: number;
  note: string;
}

/** A revision of a design basis on its way to issue. */
export interface StoryBasisWay {
  projectCode: string;
  revision: number;
  moves: (Act & { move: BasisMove; note: string })[];
}

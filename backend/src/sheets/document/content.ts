import type { Evaluation, EvaluationContext, RevisionState, SpecificationInput } from '@bellgap/common/api';

/** A name under a sheet with its date in the site's zone, YYYY-MM-DD. */
export interface Signature {
  name: string;
  on: string;
}

/** All that a sheet says. The document adds nothing of its own: no clock, no look-up. */
export interface SheetContent {
  project: { code: string; title: string; siteTimeZone: string; paper: 'A4' | 'Letter' };
  number: string;
  title: string;
  /** Label of the revision, e.g. "B". */
  revision: string;
  state: RevisionState;
  drafted: Signature | null;
  checked: Signature | null;
  approved: Signature | null;
  input: SpecificationInput;
  context: EvaluationContext;
  evaluation: Evaluation;
  /** The design basis that the draft is pinned to, with its values where they are to stand beside an override. */
  basis: { number: string; revision: number; system?: SpecificationInput['system']; basis?: string } | null;
  overrides: { path: string; reason: string }[];
  /** Date of the content in the site's zone, YYYY-MM-DD; also the date of the PDF file. */
  drawnOn: string;
  /** Where an issued sheet can be looked up; a draft has none. */
  verification: null;
}

export interface SheetDocument {
  bytes: Buffer;
  pages: number;
}

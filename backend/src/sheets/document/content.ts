import type {
  CheckRecord,
  Concession,
  Evaluation,
  EvaluationContext,
  Remark,
  RevisionState,
  SpecificationInput,
} from '@bellgap/common/api';

/** A name under a sheet with its date in the site's zone, YYYY-MM-DD. */
export interface Signature {
  name: string;
  on: string;
}

/** A decided check as the sheet repeats it; instants are printed in the site's zone. */
export type SheetCheck = Pick<
  CheckRecord,
  | 'label'
  | 'contentCode'
  | 'checkCategory'
  | 'checker'
  | 'ownFigures'
  | 'ownFiguresAt'
  | 'differences'
  | 'ticks'
  | 'checklist'
  | 'differenceReason'
  | 'independent'
  | 'verdict'
  | 'verdictNote'
  | 'decidedOn'
  | 'methodEdition'
>;

export type SheetRemark = Pick<Remark, 'label' | 'path' | 'text' | 'raisedBy' | 'raisedAt' | 'closedAt' | 'answers'>;

export type SheetConcession = Pick<
  Concession,
  'kind' | 'code' | 'field' | 'text' | 'reason' | 'validUntil' | 'givenBy' | 'givenAt'
>;

/** One line of the revision table: what was handed in or issued, and who signed it. */
export interface SheetRevision {
  /** Letter of a submission or number of an issue. */
  label: string;
  /** Date in the site's zone, YYYY-MM-DD. */
  on: string;
  /** What changed or happened, in words. */
  what: string;
  drafted: Signature | null;
  checked: Signature | null;
  approved: Signature | null;
}

/** What a sheet says once it is issued, and a draft does not. */
export interface Issue {
  contentCode: string;
  /** As it is stored, 16 signs; printed in fours. */
  verificationCode: string;
  /** Address under which a print is looked up: the one that the square code holds. */
  verificationUrl: string;
  /** Date in the site's zone, YYYY-MM-DD. */
  issuedOn: string;
  /** Number and hash of the last seal of the trail before the issue; null where there is none yet. */
  lastSeal: string | null;
  /** Decided checks, the one that passed first, then earlier ones, newest first. */
  checkRecords: SheetCheck[];
  /** In the order in which they were raised. */
  remarks: SheetRemark[];
  /** Acceptances, concessions, and what was not waited for. */
  concessions: SheetConcession[];
  /** The first first, this revision last. */
  revisionHistory: SheetRevision[];
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
  /** Null for everything that is not issued: it carries DRAFT, no code to look it up by, and no check record. */
  issued: Issue | null;
}

export interface SheetDocument {
  bytes: Buffer;
  pages: number;
}

/** States of a revision. */
export const REVISION_STATES = ['draft', 'in_check', 'checked', 'issued', 'superseded', 'withdrawn'] as const;
export type RevisionState = (typeof REVISION_STATES)[number];

export const REVISION_STATE_LABELS: Record<RevisionState, string> = {
  draft: 'Draft',
  in_check: 'In check',
  checked: 'Checked',
  issued: 'Issued',
  superseded: 'Superseded',
  withdrawn: 'Withdrawn',
};

/** How a sentence says it: "this revision is ...". */
export const REVISION_STATE_WORDS: Record<RevisionState, string> = {
  draft: 'a draft',
  in_check: 'in check',
  checked: 'checked and waits for approval',
  issued: 'issued',
  superseded: 'superseded',
  withdrawn: 'withdrawn',
};

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

import type { Evaluation, Revision } from '@bellgap/common/api';

/** A revision whose figures the reader may see. */
export type ShownRevision = Revision & { evaluation: Evaluation };

export const isShown = (revision: Revision): revision is ShownRevision => revision.evaluation !== null;

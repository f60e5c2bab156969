import type { Approval, BodyOf, contract } from '@bellgap/common/api';
import { issueRevisionSchema, requiredText } from '@bellgap/common/schemas';

type Body = BodyOf<typeof contract.issueRevision>;
type Matter = Approval['acceptances'][number];

/** What the fields of the approver hold. */
export interface ApprovalValues {
  acceptances: (Matter & { reason: string })[];
  concessions: (Matter & { reason: string; validUntil: string | null })[];
  laterChangesReason: string;
  password: string;
}

export function firstValues({ acceptances, fails }: Approval): ApprovalValues {
  return {
    acceptances: acceptances.map((matter) => ({ ...matter, reason: '' })),
    concessions: fails.map((matter) => ({ ...matter, reason: '', validUntil: null })),
    laterChangesReason: '',
    password: '',
  };
}

/** Where something is newer than the submission, the reason for not waiting is needed. */
export function approvalSchema(asksForWaitingReason: boolean) {
  return asksForWaitingReason
    ? issueRevisionSchema.shape({ laterChangesReason: requiredText('Reason for not waiting', 1000) })
    : issueRevisionSchema;
}

export function toIssueBody(values: ApprovalValues, asksForWaitingReason: boolean): Body {
  return {
    acceptances: values.acceptances.map((one) => ({ ...one, reason: one.reason.trim() })),
    concessions: values.concessions.map((one) => ({ ...one, reason: one.reason.trim() })) as Body['concessions'],
    laterChangesReason: asksForWaitingReason ? values.laterChangesReason.trim() : null,
    password: values.password,
  };
}

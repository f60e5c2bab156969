import type { Approval } from '@bellgap/common/api';

/** What an approver looks at, in the order of the page: its part of the page, its words, and how much there is of it. */
export interface Glance {
  anchor: string;
  label: string;
  count: number;
  /** Asks something of the approver, or bars the issue. */
  asks?: boolean;
}

export function glancesOf(approval: Approval): Glance[] {
  return [
    ...(approval.inForce ? [{ anchor: 'new', label: 'changed', count: approval.changes.length }] : []),
    { anchor: 'acceptances', label: 'outside limits', count: approval.acceptances.length, asks: true },
    { anchor: 'fails', label: 'failing', count: approval.fails.length, asks: true },
    { anchor: 'later', label: 'newer since', count: approval.laterChanges.length, asks: true },
    { anchor: 'assumed', label: 'assumed', count: approval.assumed.length },
    { anchor: 'disputed', label: 'disputed', count: approval.disputed.length },
    { anchor: 'not-assessed', label: 'not assessed', count: approval.notAssessed.length },
    { anchor: 'overrides', label: 'overrides', count: approval.overrides.length },
    { anchor: 'cautions', label: 'cautions', count: approval.cautions.length },
    { anchor: 'remarks', label: 'open remarks', count: approval.openRemarks, asks: true },
  ];
}

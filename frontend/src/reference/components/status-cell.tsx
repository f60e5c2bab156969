import type { RecordedConfirmation, TableDetails } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';

type Row = NonNullable<TableDetails['table']>['rows'][number];
export type Standing = Pick<Row, 'status' | 'statusBefore' | 'confirmation'>;

export function recordText({ outcome, edition, page, on, by, note }: RecordedConfirmation): string {
  const words = outcome === 'confirmed' ? 'agrees' : 'differs';
  return `Print ${words}: ${edition}, page ${page}, ${on}, ${by}${note ? `. ${note}` : ''}`;
}

export function standingText({ status, statusBefore, confirmation }: Standing): string {
  const words = CHOICE_LABELS.status[status];
  return confirmation && status !== statusBefore ? `${words}, before: ${CHOICE_LABELS.status[statusBefore]}` : words;
}

/** How well a figure is known, and who found what in the print. */
export function StatusCell({ standing }: { standing: Standing }) {
  return (
    <>
      <span className={`reference-status is-${standing.status}`}>{standingText(standing)}</span>
      {standing.confirmation && <small className="reference-record">{recordText(standing.confirmation)}</small>}
    </>
  );
}

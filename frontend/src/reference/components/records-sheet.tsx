import { contract, type RecordedConfirmation, type TableDetails } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { queryOf } from '../../api/queries';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Moment, momentText } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';

const COLUMNS: Column<RecordedConfirmation>[] = [
  { key: 'key', title: 'Row or formula', value: (row) => row.key, wraps: true },
  {
    key: 'outcome',
    title: 'Print',
    value: (row) => (row.outcome === 'confirmed' ? 'agrees' : 'differs'),
    sortable: true,
  },
  { key: 'edition', title: 'Edition', value: (row) => row.edition },
  { key: 'page', title: 'Page', value: (row) => row.page },
  { key: 'on', title: 'Looked at', value: (row) => row.on, sortable: true },
  { key: 'by', title: 'By', value: (row) => row.by },
  {
    key: 'recordedAt',
    title: 'Recorded',
    value: (row) => momentText(row.recordedAt),
    render: (row) => <Moment at={row.recordedAt} />,
  },
  { key: 'note', title: 'Note', value: (row) => row.note, wraps: true },
];

/** All that was recorded for this table or formula; the newest record of a row counts. */
export function RecordsSheet({ entry }: { entry: TableDetails }) {
  const list = useListState({ prefix: 'records-' });
  const confirmations = useQuery(queryOf(contract.tableConfirmations));
  const keys = new Set([entry.key, ...(entry.table?.rows ?? []).map(({ key }) => key)]);
  const records = (confirmations.data ?? []).filter(({ key }) => keys.has(key));
  if (records.length === 0) return null;
  return (
    <Sheet title="What owners of the print recorded" note="the newest record of a row counts" flush>
      <DataTable
        label="Records"
        name="table-confirmations"
        columns={COLUMNS}
        rows={records}
        rowKey={(row) => row.id}
        list={list}
      />
    </Sheet>
  );
}

import type { Concession, RegisterRow } from '@bellgap/common/api';
import { CONCESSION_COLUMNS } from '../../ui/concession-rows/concession-columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { BRIEF_REGISTER_COLUMNS } from '../../ui/register-rows/register-columns';

export function IssuedTable({ rows }: { rows: RegisterRow[] }) {
  const list = useListState({ defaultSort: '-issuedAt', prefix: 'issued-' });
  return (
    <DataTable
      label="Issued of late"
      name="issued"
      columns={BRIEF_REGISTER_COLUMNS}
      rows={rows}
      rowKey={(row) => row.id}
      list={list}
    />
  );
}

export function EndingTable({ rows }: { rows: Concession[] }) {
  const list = useListState({ defaultSort: 'validUntil', prefix: 'concessions-' });
  return (
    <DataTable
      label="Concessions that end"
      name="ending-concessions"
      columns={CONCESSION_COLUMNS}
      rows={rows}
      rowKey={(row) => row.id}
      list={list}
    />
  );
}

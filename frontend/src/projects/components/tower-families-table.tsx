import { contract, type AnswerOf } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { queryOf } from '../../api/queries';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';

type TowerFamily = AnswerOf<typeof contract.towerFamilies>[number];

const figure = (key: keyof TowerFamily, title: string): Column<TowerFamily> => ({
  key,
  title,
  value: (row) => row[key],
  figure: true,
  sortable: true,
});

const COLUMNS: Column<TowerFamily>[] = [
  {
    key: 'code',
    title: 'Family',
    value: (row) => row.code,
    render: (row) => <span className="num">{row.code}</span>,
    sortable: true,
  },
  { key: 'function', title: 'Function', value: (row) => row.function, sortable: true, wraps: true },
  { key: 'layout', title: 'Layout', value: (row) => row.layout, sortable: true },
  figure('phaseSpacingM', 'Phase spacing, m'),
  figure('verticalGapM', 'Vertical gap, m'),
  figure('horizontalOffsetM', 'Horizontal offset, m'),
  figure('maximumStringMm', 'Longest string, mm'),
  figure('maximumSwingDeg', 'Largest swing, °'),
  figure('attachmentKn', 'Attachment, kN'),
  { key: 'coupling', title: 'Coupling', value: (row) => row.coupling, sortable: true },
];

export function TowerFamiliesTable({ code }: { code: string }) {
  const families = useQuery(queryOf(contract.towerFamilies, { params: { code } }));
  const list = useListState({ defaultSort: 'code', prefix: 'families-' });
  return (
    <QueryState query={families} what="The tower families">
      {(rows) => (
        <DataTable
          label="Tower families"
          name={`tower-families-${code}`}
          columns={COLUMNS}
          rows={rows}
          rowKey={(row) => row.code}
          list={list}
          empty={
            <EmptyState title="No tower families on record">
              Strings are then checked without the room at the tower.
            </EmptyState>
          }
        />
      )}
    </QueryState>
  );
}

import type { TableDetails } from '@bellgap/common/api';
import { Button } from 'antd';
import { useMemo } from 'react';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { cellText } from '../model/entries';
import type { Recordable } from './confirmation-dialog';
import { recordText, StatusCell, standingText } from './status-cell';

type Table = NonNullable<TableDetails['table']>;
type Row = Table['rows'][number];

const isFigures = (rows: readonly Row[], key: string) =>
  rows.some(({ values }) => typeof values[key] === 'number') &&
  rows.every(({ values }) => typeof values[key] === 'number' || values[key] === null);

/** Decimals that the longest figure of a column needs, so that the column is even. */
function decimalsOf(rows: readonly Row[], key: string): number {
  const decimals = rows.map(({ values }) => String(values[key] ?? '').split('.')[1]?.length ?? 0);
  return Math.min(4, Math.max(0, ...decimals));
}

function wordsOf(table: Table, row: Row): string {
  return table.columns
    .filter(({ identifies }) => identifies)
    .map(
      ({ key, label, unit }) =>
        `${label} ${[cellText(key, row.values[key]) ?? 'none', unit].filter(Boolean).join(' ')}`,
    )
    .join(', ');
}

function columnsOf(table: Table, record: ((of: Recordable) => void) | null): Column<Row>[] {
  const printed = table.columns.map(({ key, label, unit, identifies }): Column<Row> => {
    const figure = isFigures(table.rows, key);
    return {
      key,
      title: unit ? `${label}, ${unit}` : label,
      value: ({ values }) => cellText(key, values[key]),
      figure,
      ...(figure ? { decimals: decimalsOf(table.rows, key) } : {}),
      sortable: identifies,
    };
  });
  const status: Column<Row> = {
    key: 'status',
    title: 'Status',
    value: standingText,
    render: (row) => <StatusCell standing={row} />,
    sortable: true,
    wraps: true,
  };
  const found: Column<Row> = {
    key: 'record',
    title: 'Record',
    value: ({ confirmation }) => (confirmation ? recordText(confirmation) : null),
    fileOnly: true,
  };
  const act: Column<Row> = {
    key: 'act',
    title: 'Print',
    value: () => null,
    render: (row) => {
      const words = wordsOf(table, row);
      return (
        <Button
          size="small"
          aria-label={`Record what the print says: ${words}`}
          onClick={() => record?.({ key: row.key, words })}
        >
          Record
        </Button>
      );
    },
    screenOnly: true,
  };
  return [...printed, status, found, ...(record ? [act] : [])];
}

interface TableRowsProps {
  name: string;
  title: string;
  table: Table;
  /** Null where the reader may not record. */
  record: ((of: Recordable) => void) | null;
}

/** The rows as they are printed, each with its own status. */
export function TableRows({ name, title, table, record }: TableRowsProps) {
  const list = useListState({ prefix: 'rows-' });
  const columns = useMemo(() => columnsOf(table, record), [table, record]);
  return (
    <DataTable
      label={title}
      name={name.replace(/[^\w-]+/g, '-')}
      columns={columns}
      rows={table.rows}
      rowKey={(row) => row.key}
      list={list}
      searchLabel="Search rows"
    />
  );
}

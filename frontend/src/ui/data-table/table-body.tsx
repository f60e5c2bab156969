import type { ReactNode } from 'react';
import { figureText, type Column } from './columns';
import type { ListState } from './use-list-state';

interface TableBodyProps<Row> {
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  list: ListState;
  /** Said where there are no rows. */
  nothing: string;
}

function SortMark({ way }: { way: 'ascending' | 'descending' | undefined }) {
  return (
    <svg className="sort-mark" width="7" height="12" viewBox="0 0 7 12" aria-hidden="true">
      <path d="M3.5 0.5L6.5 4.5H0.5z" className={way === 'ascending' ? 'is-on' : undefined} />
      <path d="M3.5 11.5L0.5 7.5H6.5z" className={way === 'descending' ? 'is-on' : undefined} />
    </svg>
  );
}

function classOf<Row>({ figure, wraps }: Column<Row>): string | undefined {
  return [figure && 'is-figure', wraps && 'is-wrapping'].filter(Boolean).join(' ') || undefined;
}

function Heading<Row>({ column, list }: { column: Column<Row>; list: ListState }) {
  const { key, title, sortable } = column;
  if (!sortable) {
    return (
      <th scope="col" className={classOf(column)}>
        {title}
      </th>
    );
  }
  const way = list.sort === key ? 'ascending' : list.sort === `-${key}` ? 'descending' : undefined;
  return (
    <th scope="col" className={classOf(column)} aria-sort={way}>
      <button
        type="button"
        className="plain-button sort-button"
        onClick={() => list.change({ sort: way === 'ascending' ? `-${key}` : key })}
      >
        {title}
        <SortMark way={way} />
      </button>
    </th>
  );
}

function cellContent<Row>({ value, render, decimals }: Column<Row>, row: Row): ReactNode {
  if (render) return render(row);
  const cell = value(row);
  if (cell === null || cell === undefined || cell === '') return <span className="soft">—</span>;
  return typeof cell === 'number' ? figureText(cell, decimals) : String(cell);
}

export function TableBody<Row>({ columns, rows, rowKey, list, nothing }: TableBodyProps<Row>) {
  const shown = columns.filter(({ fileOnly }) => !fileOnly);
  return (
    <table className="rows">
      <thead>
        <tr>
          {shown.map((column) => (
            <Heading key={column.key} column={column} list={list} />
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={rowKey(row)}>
            {shown.map((column) => (
              <td key={column.key} className={classOf(column)}>
                {cellContent(column, row)}
              </td>
            ))}
          </tr>
        ))}
        {rows.length === 0 && (
          <tr>
            <td colSpan={shown.length} className="soft rows-nothing">
              {nothing}
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}

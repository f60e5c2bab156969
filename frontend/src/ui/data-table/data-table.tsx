import { Button } from 'antd';
import { useMemo, type ReactNode } from 'react';
import { searchRows, sortRows, type Column } from './columns';
import './data-table.css';
import { TableActs } from './table-acts';
import { TableBody } from './table-body';
import { TableFilters, type TableFilter } from './table-filters';
import type { ListState } from './use-list-state';

interface DataTableProps<Row> {
  /** What the table shows, for those who cannot see it. */
  label: string;
  /** Name of the exported file, without its ending. */
  name: string;
  columns: Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  list: ListState;
  /** Sorted and searched by the server, page by page; otherwise the rows are all there and the browser does both. */
  pages?: { next: string | null; previous: string | null; allRows: () => Promise<readonly Row[]> };
  searchLabel?: string;
  filters?: TableFilter[];
  loading?: boolean;
  /** Address of the whole list as a file made by the server, where it may be too long for the browser; copies take the page. */
  file?: string;
  /** Shown where there are no rows and nothing narrows the list. */
  empty?: ReactNode;
}

/** The one table: sorts, filters, pages by cursor, copies and exports; wide ones scroll inside themselves. */
export function DataTable<Row extends object>(props: DataTableProps<Row>) {
  const { label, name, columns, rows, rowKey, list, pages, searchLabel, filters = [], loading, file, empty } = props;
  const shown = useMemo(
    () => (pages ? rows : sortRows(searchRows(rows, columns, list.search), columns, list.sort)),
    [pages, rows, columns, list.search, list.sort],
  );

  if (shown.length === 0 && !list.narrowed && !list.cursor && !loading && empty) return <>{empty}</>;
  return (
    <div className="data-table">
      {(searchLabel || filters.length > 0) && <TableFilters list={list} searchLabel={searchLabel} filters={filters} />}
      <div
        className="table-scroll"
        role="region"
        aria-label={`${label}, table`}
        tabIndex={0}
        aria-busy={loading ?? false}
      >
        <TableBody
          columns={columns}
          rows={shown}
          rowKey={rowKey}
          list={list}
          nothing={list.narrowed ? 'Nothing matches; show all, or look for something else.' : 'Nothing here yet.'}
        />
      </div>
      <div className="table-foot">
        {pages && (pages.next || pages.previous) ? (
          <nav className="table-pages" aria-label={`Pages of ${label}`}>
            <Button
              size="small"
              disabled={!pages.previous}
              onClick={() => pages.previous && list.turnTo(pages.previous)}
            >
              Previous
            </Button>
            <Button size="small" disabled={!pages.next} onClick={() => pages.next && list.turnTo(pages.next)}>
              Next
            </Button>
          </nav>
        ) : (
          <span>{shown.length === 1 ? '1 row' : `${shown.length} rows`}</span>
        )}
        <TableActs
          name={name}
          columns={columns}
          allRows={pages && file === undefined ? pages.allRows : () => shown}
          file={file}
        />
      </div>
    </div>
  );
}

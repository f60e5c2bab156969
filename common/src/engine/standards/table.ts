import type { Status } from '../model';

/**
 * A printed table as a typed constant. The print's own units are kept; conversion is code. `rule` says how the table is
 * read between its rows, and the look-up functions refuse to read it otherwise.
 */
export interface StandardTable<Row extends object> {
  /** Stable key, used by confirmations: "iec-60071-1:a1". */
  key: string;
  title: string;
  document: string;
  edition: string;
  clause: string;
  /** Public documents that reproduce the table and were read. */
  reproducedIn?: string;
  rule: 'rows-as-printed' | 'linear' | 'next-higher-row';
  /** The columns that tell one row from all others. */
  identifiedBy: readonly string[];
  /** What a reader of the table has to know: limits, gaps, doubts. */
  remarks?: readonly string[];
  rows: readonly (Row & { status: Status })[];
}

/** A row as it stands in a table. */
export type TableRow<Row extends object> = Row & { status: Status };

/** Key of a row within its table, used by confirmations: "245/460/1050". */
export function rowKeyOf<Row extends object>(table: StandardTable<Row>, row: TableRow<Row>): string {
  const cells = row as Record<string, unknown>;
  return table.identifiedBy.map((column) => [cells[column]].flat().join('+')).join('/');
}

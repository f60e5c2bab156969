import type { Status } from '../model';

/**
 * A printed table as a typed constant. The print's own units are kept; conversion is code. `rule` says how the table is
 * read between its rows, and the one look-up function obeys it.
 */
export interface StandardTable<Row extends object> {
  /** Stable key, used by confirmations: "iec-60071-1:a1". */
  key: string;
  title: string;
  document: string;
  edition: string;
  clause: string;
  rule: 'rows-as-printed' | 'linear' | 'next-higher-row';
  rows: readonly (Row & { status: Status })[];
}

import type { Status } from '../model';
import type { StandardTable, TableRow } from './table';

/**
 * What came of reading a table: at a printed row, between two rows, at the first row because the figure asked for lies
 * below the table (only where the table's clause says so), or outside, and then there is no figure.
 */
export type Found = 'row' | 'interpolated' | 'next-higher' | 'first-row' | 'outside';

export interface RowReading<Row extends object> {
  found: Found;
  row: TableRow<Row> | null;
}

export interface ValueReading<Row extends object> {
  found: Found;
  value: number | null;
  /** The rows read: one at a row, two where interpolated, none outside. */
  rows: readonly TableRow<Row>[];
}

function mustReadAs<Row extends object>(table: StandardTable<Row>, rule: StandardTable<Row>['rule']): void {
  if (table.rule !== rule) throw new Error(`${table.key} is read ${table.rule}, not ${rule}`);
}

/** The row that is printed so and not otherwise; a figure between two rows finds nothing. */
export function rowAsPrinted<Row extends object>(
  table: StandardTable<Row>,
  isAsked: (row: TableRow<Row>) => boolean,
): RowReading<Row> {
  const row = table.rows.find(isAsked);
  return row === undefined ? { found: 'outside', row: null } : { found: 'row', row };
}

interface Between<Row extends object> {
  /** The column the table is entered by. */
  by: (row: TableRow<Row>) => number;
  at: number;
  /** The column read; null where the row does not have it. */
  value: (row: TableRow<Row>) => number | null;
  /** Below the first row the first row holds; otherwise there is no figure. */
  firstRowBelow?: boolean;
}

/** The printed row at a printed figure, linear between rows elsewhere; above the last row there is no figure. */
export function linearBetweenRows<Row extends object>(
  table: StandardTable<Row>,
  { by, at, value, firstRowBelow = false }: Between<Row>,
): ValueReading<Row> {
  mustReadAs(table, 'linear');
  let lower: TableRow<Row> | undefined;
  let upper: TableRow<Row> | undefined;
  for (const row of table.rows) {
    if (value(row) === null) continue;
    if (by(row) < at && (lower === undefined || by(row) > by(lower))) lower = row;
    if (by(row) >= at && (upper === undefined || by(row) < by(upper))) upper = row;
  }
  if (upper === undefined) return { found: 'outside', value: null, rows: [] };
  if (by(upper) === at) return { found: 'row', value: value(upper), rows: [upper] };
  if (lower === undefined) {
    return firstRowBelow
      ? { found: 'first-row', value: value(upper), rows: [upper] }
      : { found: 'outside', value: null, rows: [] };
  }
  const [from, to] = [value(lower) as number, value(upper) as number];
  const interpolated = from + ((to - from) * (at - by(lower))) / (by(upper) - by(lower));
  return { found: 'interpolated', value: interpolated, rows: [lower, upper] };
}

/** The row at a printed figure, the next higher row elsewhere; above the last row there is none. */
export function nextHigherRow<Row extends object>(
  table: StandardTable<Row>,
  by: (row: TableRow<Row>) => number,
  at: number,
): RowReading<Row> {
  mustReadAs(table, 'next-higher-row');
  let upper: TableRow<Row> | undefined;
  for (const row of table.rows) if (by(row) >= at && (upper === undefined || by(row) < by(upper))) upper = row;
  if (upper === undefined) return { found: 'outside', row: null };
  return { found: by(upper) === at ? 'row' : 'next-higher', row: upper };
}

/** From the least to the best known; a figure made of several is known as well as the least of them. */
const FROM_LEAST_KNOWN: readonly Status[] = ['disputed', 'memory', 'practice', 'derived', 'seen', 'confirmed'];

/** How well a figure is known that rests on several; what was worked out between rows is derived at best. */
export function leastKnown(statuses: readonly Status[], interpolated = false): Status {
  const all: Status[] = interpolated ? [...statuses, 'derived'] : [...statuses];
  return FROM_LEAST_KNOWN.find((status) => all.includes(status)) ?? 'derived';
}

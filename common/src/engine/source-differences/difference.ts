import type { SourceReference, Status } from '../model';
import { rowKeyOf, type StandardTable, type TableRow } from '../standards';

/** What one source says of a quantity. */
export interface SourceFigure {
  /** In the unit of the quantity. */
  figure: number;
  /** Upper end where the source gives a range, in the same unit. */
  figureUpTo: number | null;
  /** What the figure is printed for: electrodes, level, row. */
  printedFor: string;
  source: SourceReference;
  /** Table or formula of the method that holds it; null where it is held for comparing only. */
  entryKey: string | null;
  /** Key by which the row or formula is confirmed; null where there is none. */
  key: string | null;
  /** Whether a figure of a sheet can rest on it. */
  isUsed: boolean;
}

/** One quantity of which two sources or more do not say the same. */
export interface SourceDifference {
  id: string;
  topic: string;
  quantity: string;
  unit: string;
  figures: readonly SourceFigure[];
  /** Which of them is used, and why. */
  choice: string;
}

/** A figure that is read from a row of a table of the method, cited as the table is. */
export function fromTable<Row extends object>(
  table: StandardTable<Row>,
  isAsked: (row: TableRow<Row>) => boolean,
  read: (row: TableRow<Row>) => number | null,
  {
    printedFor,
    isUsed,
    statusOf = (row) => row.status,
    source = table,
    upTo = () => null,
  }: {
    printedFor: string;
    isUsed: boolean;
    /** Where a column is known otherwise than its row. */
    statusOf?: (row: TableRow<Row>) => Status | null;
    /** Where a row is from another document than its table. */
    source?: Omit<SourceReference, 'status'>;
    upTo?: (row: TableRow<Row>) => number | null;
  },
): SourceFigure {
  const row = table.rows.find(isAsked);
  const figure = row === undefined ? null : read(row);
  if (row === undefined || figure === null) throw new Error(`${table.key} has no figure for ${printedFor}`);
  const { document, edition, clause } = source;
  return {
    figure,
    figureUpTo: upTo(row),
    printedFor,
    source: { document, edition, clause, status: statusOf(row) ?? row.status },
    entryKey: table.key,
    key: `${table.key}:${rowKeyOf(table, row)}`,
    isUsed,
  };
}

/** A figure that the method holds for comparing only. */
export function compared(
  figure: number,
  printedFor: string,
  source: SourceReference,
  figureUpTo: number | null = null,
): SourceFigure {
  return { figure, figureUpTo, printedFor, source, entryKey: null, key: null, isUsed: false };
}

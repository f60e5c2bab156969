import type { ReactNode } from 'react';

export type Cell = string | number | boolean | null | undefined;

/** A column of a table: how it reads, how it sorts, and what a spreadsheet gets. */
export interface Column<Row> {
  /** Also the name by which the server sorts. */
  key: string;
  /** Heading, with the unit where there is one. */
  title: string;
  value: (row: Row) => Cell;
  render?: (row: Row) => ReactNode;
  /** A figure: right-aligned, even digits. */
  figure?: boolean;
  /** Decimals of a figure on the screen. */
  decimals?: number;
  sortable?: boolean;
  /** Not in the copy and not in the file. */
  screenOnly?: boolean;
  /** Only in the copy and in the file: on the screen it would stand twice. */
  fileOnly?: boolean;
  /** Long words that may break; other cells stay on one line. */
  wraps?: boolean;
}

const COLLATOR = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

function compareCells(one: Cell, other: Cell): number {
  if (typeof one === 'number' && typeof other === 'number') return one - other;
  return COLLATOR.compare(String(one), String(other));
}

/** Rows in the order of a sort name such as "code" or "-code"; cells without a value stand last either way. */
export function sortRows<Row>(rows: readonly Row[], columns: readonly Column<Row>[], sort: string | undefined): Row[] {
  const column = columns.find(({ key }) => key === sort?.replace(/^-/, ''));
  if (!column || !sort) return [...rows];
  const direction = sort.startsWith('-') ? -1 : 1;
  return rows
    .map((row) => ({ row, cell: column.value(row) }))
    .sort((a, b) => {
      const aMissing = a.cell === null || a.cell === undefined;
      const bMissing = b.cell === null || b.cell === undefined;
      if (aMissing || bMissing) return Number(aMissing) - Number(bMissing);
      return direction * compareCells(a.cell, b.cell);
    })
    .map(({ row }) => row);
}

/** Rows that hold all the words looked for, in any column. */
export function searchRows<Row>(rows: readonly Row[], columns: readonly Column<Row>[], search: string): Row[] {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return [...rows];
  return rows.filter((row) => {
    const text = columns
      .map(({ value }) => String(value(row) ?? ''))
      .join(' ')
      .toLowerCase();
    return words.every((word) => text.includes(word));
  });
}

/** A figure as it is read: thousands apart, a true minus, and the same decimals down a column where they are given. */
export function figureText(value: number, decimals?: number): string {
  return value
    .toLocaleString('en-GB', { minimumFractionDigits: decimals ?? 0, maximumFractionDigits: decimals ?? 3 })
    .replace('-', '−');
}

import { spreadsheetText } from '@bellgap/common/api';
import type { Cell, Column } from './columns';

/** A text that a spreadsheet would take for a formula is marked as text; figures stay figures. */
function asText(cell: Cell): string {
  if (cell === null || cell === undefined) return '';
  if (typeof cell === 'number') return String(cell);
  if (typeof cell === 'boolean') return cell ? 'yes' : 'no';
  return spreadsheetText(cell);
}

function tableOf<Row>(rows: readonly Row[], columns: readonly Column<Row>[]): string[][] {
  const shown = columns.filter(({ screenOnly }) => !screenOnly);
  return [shown.map(({ title }) => title), ...rows.map((row) => shown.map(({ value }) => asText(value(row))))];
}

/** Rows for pasting into a spreadsheet: cells apart by tabs, lines by line feeds. */
export function toTsv<Row>(rows: readonly Row[], columns: readonly Column<Row>[]): string {
  return tableOf(rows, columns)
    .map((cells) => cells.map((cell) => cell.replace(/[\t\r\n]+/g, ' ')).join('\t'))
    .join('\n');
}

/** A CSV file after RFC 4180 in UTF-8 with its mark, figures with a decimal point. */
export function toCsv<Row>(rows: readonly Row[], columns: readonly Column<Row>[]): string {
  const quote = (cell: string) => (/[",\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);
  return `\uFEFF${tableOf(rows, columns)
    .map((cells) => cells.map(quote).join(','))
    .join('\r\n')}\r\n`;
}

export function saveFile(name: string, content: string, type: string): void {
  const address = URL.createObjectURL(new Blob([content], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}

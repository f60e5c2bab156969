import type { TableCell, TableEntry } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';

export type KnownStatus = keyof TableEntry['statusCounts'];

/** The best known first; in this order counts are shown. */
export const STATUS_ORDER: readonly KnownStatus[] = ['confirmed', 'seen', 'derived', 'practice', 'memory', 'disputed'];

export const KIND_LABELS: Record<TableEntry['kind'], string> = { table: 'Table', formula: 'Formula' };

export const RULE_LABELS: Record<TableEntry['rule'], string> = {
  'rows-as-printed': 'Rows as printed',
  linear: 'Linear between rows',
  'next-higher-row': 'Next higher row',
  formula: 'As written',
};

/** The first words of a status: the rest is said where there is room. */
export const statusWord = (status: KnownStatus): string => CHOICE_LABELS.status[status].split(',')[0] ?? status;

/** Rows by status in words, such as "20 seen, 15 from memory". */
export function countsText({ kind, statusCounts }: Pick<TableEntry, 'kind' | 'statusCounts'>): string {
  const there = STATUS_ORDER.filter((status) => statusCounts[status] > 0);
  return there
    .map((status) => (kind === 'formula' ? statusWord(status) : `${statusCounts[status]} ${statusWord(status)}`))
    .join(', ');
}

/** Figures of all tables and formulas together, by status. */
export function totals(entries: readonly TableEntry[]): Record<KnownStatus, number> & { all: number } {
  const sum = (status: KnownStatus) => entries.reduce((total, { statusCounts }) => total + statusCounts[status], 0);
  const counts = Object.fromEntries(STATUS_ORDER.map((status) => [status, sum(status)])) as Record<KnownStatus, number>;
  return { ...counts, all: STATUS_ORDER.reduce((total, status) => total + counts[status], 0) };
}

export function documentText({ document, edition }: Pick<TableEntry, 'document' | 'edition'>): string {
  return [document, edition].filter((part) => part !== '' && part !== 'none').join(', ');
}

export interface Narrowing {
  kind?: string | undefined;
  document?: string | undefined;
  status?: string | undefined;
}

/** Entries of a kind and a document that have at least one figure of a status. */
export function narrow(entries: readonly TableEntry[], { kind, document, status }: Narrowing): TableEntry[] {
  return entries.filter(
    (entry) =>
      (!kind || entry.kind === kind) &&
      (!document || entry.document === document) &&
      (!status || entry.statusCounts[status as KnownStatus] > 0),
  );
}

/** A cell in words; columns that say how well another column is known hold a status. */
export function cellText(key: string, cell: TableCell | undefined): string | number | null {
  if (typeof cell === 'boolean') return cell ? 'yes' : 'no';
  if (key.startsWith('status') && typeof cell === 'string') return statusWord(cell as KnownStatus);
  return cell ?? null;
}

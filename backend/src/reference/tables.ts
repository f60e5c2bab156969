import type { RecordedConfirmation, Status, TableCell, TableDetails, TableEntry } from '@bellgap/common/api';
import {
  ALL_FORMULAS,
  ALL_TABLES,
  FORMULA_USES,
  STATUSES,
  TABLE_USES,
  labelOfName,
  rowKeyOf,
  unitOf,
  type AnyFormula,
  type StandardTable,
  type TableRow,
} from '@bellgap/common/engine';

type AnyTable = StandardTable<object>;
/** What owners of the print have recorded, by key. */
type Words = ReadonlyMap<string, RecordedConfirmation>;

export const TABLES = ALL_TABLES as readonly unknown[] as readonly AnyTable[];
export const FORMULAS: readonly AnyFormula[] = ALL_FORMULAS;

const keyOfRow = (table: AnyTable, row: TableRow<object>): string => `${table.key}:${rowKeyOf(table, row)}`;

let keys: ReadonlySet<string> | null = null;

/** Keys of every row and every formula; a table as a whole is confirmed row by row. */
export function confirmableKeys(): ReadonlySet<string> {
  keys ??= new Set([
    ...TABLES.flatMap((table) => table.rows.map((row) => keyOfRow(table, row))),
    ...FORMULAS.map(({ definition }) => definition.id),
  ]);
  return keys;
}

function counted(statuses: readonly Status[]): TableEntry['statusCounts'] {
  const counts = Object.fromEntries(STATUSES.map((status) => [status, 0])) as TableEntry['statusCounts'];
  for (const status of statuses) counts[status] += 1;
  return counts;
}

export function tableEntry(table: AnyTable, words: Words): TableEntry {
  const statuses = table.rows.map((row) => words.get(keyOfRow(table, row))?.outcome ?? row.status);
  return {
    key: table.key,
    kind: 'table',
    title: table.title,
    document: table.document,
    edition: table.edition,
    clause: table.clause,
    rule: table.rule,
    rowCount: table.rows.length,
    statusCounts: counted(statuses),
    usedFor: TABLE_USES[table.key] ?? '',
  };
}

export function formulaEntry({ definition }: AnyFormula, words: Words): TableEntry {
  const { id, heading, source } = definition;
  return {
    key: id,
    kind: 'formula',
    title: heading,
    document: source.document,
    edition: source.edition,
    clause: source.clause,
    rule: 'formula',
    rowCount: 1,
    statusCounts: counted([words.get(id)?.outcome ?? source.status]),
    usedFor: FORMULA_USES[id.split('.')[0] ?? ''] ?? '',
  };
}

function cellOf(value: unknown): TableCell {
  if (Array.isArray(value)) return value.join(' / ');
  return (value ?? null) as TableCell;
}

export function tableDetails(table: AnyTable, words: Words): TableDetails {
  const names = [...new Set(table.rows.flatMap((row) => Object.keys(row)))].filter((name) => name !== 'status');
  return {
    ...tableEntry(table, words),
    reproducedIn: table.reproducedIn ?? null,
    remarks: [...(table.remarks ?? [])],
    table: {
      columns: names.map((name) => ({
        key: name,
        label: labelOfName(name),
        unit: name.startsWith('status') ? '' : (unitOf(name) ?? ''),
        identifies: table.identifiedBy.includes(name),
      })),
      rows: table.rows.map((row) => {
        const key = keyOfRow(table, row);
        const confirmation = words.get(key) ?? null;
        const cells = row as Record<string, unknown>;
        return {
          key,
          values: Object.fromEntries(names.map((name) => [name, cellOf(cells[name])])),
          status: confirmation?.outcome ?? row.status,
          statusBefore: row.status,
          confirmation,
        };
      }),
    },
    formula: null,
  };
}

export function formulaDetails(formula: AnyFormula, words: Words): TableDetails {
  const { id, expression, symbols, range, result, source } = formula.definition;
  const confirmation = words.get(id) ?? null;
  return {
    ...formulaEntry(formula, words),
    reproducedIn: null,
    remarks: [],
    table: null,
    formula: {
      expression,
      unit: unitOf(result) ?? '',
      symbols: Object.entries(symbols).map(([symbol, name]) => ({
        symbol,
        meaning: labelOfName(name),
        unit: unitOf(name) ?? '',
        least: range?.[name]?.[0] ?? null,
        most: range?.[name]?.[1] ?? null,
      })),
      status: confirmation?.outcome ?? source.status,
      statusBefore: source.status,
      confirmation,
    },
  };
}

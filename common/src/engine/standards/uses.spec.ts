import { ALL_FORMULAS } from '../all-formulas';
import { ALL_TABLES, rowKeyOf, type StandardTable } from '.';
import { FORMULA_USES, TABLE_USES } from './uses';

describe('what tables and formulas are for', () => {
  it('is said of every table, and of nothing that is no table', () => {
    expect(Object.keys(TABLE_USES).sort()).toEqual(ALL_TABLES.map(({ key }) => key).sort());
  });

  it('is said of every topic of formulas', () => {
    const topics = new Set(ALL_FORMULAS.map(({ definition }) => definition.id.split('.')[0]));
    for (const topic of topics) expect(Object.keys(FORMULA_USES)).toContain(topic);
  });
});

describe('keys', () => {
  it('tell every row and every formula from all others', () => {
    const tables = ALL_TABLES as readonly unknown[] as readonly StandardTable<object>[];
    const keys = [
      ...ALL_FORMULAS.map(({ definition }) => definition.id),
      ...tables.flatMap((table) => [table.key, ...table.rows.map((row) => `${table.key}:${rowKeyOf(table, row)}`)]),
    ];
    expect(new Set(keys).size).toBe(keys.length);
    for (const key of keys) expect(key.length).toBeLessThanOrEqual(200);
  });
});

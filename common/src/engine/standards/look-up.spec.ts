import { leastKnown, linearBetweenRows, nextHigherRow, rowAsPrinted } from './look-up';
import { rowKeyOf, type StandardTable } from './table';
import { ALL_TABLES, IEC_60071_1_TABLE_A2, IEC_60071_1_TABLE_A3, IEC_61936_1_CLEARANCES } from '.';

/** Invented rows, out of order on purpose. */
const LINEAR: StandardTable<{ voltageKv: number; lengthMm: number | null }> = {
  key: 'invented:linear',
  title: 'Invented',
  document: 'DOC-X',
  edition: '9',
  clause: 'table 3',
  rule: 'linear',
  identifiedBy: ['voltageKv'],
  rows: [
    { voltageKv: 50, lengthMm: null, status: 'seen' },
    { voltageKv: 300, lengthMm: 3000, status: 'memory' },
    { voltageKv: 100, lengthMm: 1000, status: 'seen' },
    { voltageKv: 200, lengthMm: 1900, status: 'seen' },
  ],
};
const HIGHER: typeof LINEAR = { ...LINEAR, key: 'invented:higher', rule: 'next-higher-row' };
const read = (at: number, firstRowBelow = false) =>
  linearBetweenRows(LINEAR, { by: (row) => row.voltageKv, at, value: (row) => row.lengthMm, firstRowBelow });

describe('reading a table (invented figures)', () => {
  it('gives the printed figure at a printed row', () => {
    expect(read(200)).toMatchObject({ found: 'row', value: 1900 });
  });

  it('is linear between the two nearest rows, whatever their order in print', () => {
    expect(read(150)).toMatchObject({ found: 'interpolated', value: 1450 });
    expect(read(250).rows.map((row) => row.voltageKv)).toEqual([200, 300]);
  });

  it('has no figure above the last row, nor below the first unless the clause says that the first row holds', () => {
    expect(read(300.1)).toEqual({ found: 'outside', value: null, rows: [] });
    expect(read(99)).toEqual({ found: 'outside', value: null, rows: [] });
    expect(read(99, true)).toMatchObject({ found: 'first-row', value: 1000 });
  });

  it('skips rows without the figure asked for', () => {
    expect(read(50)).toMatchObject({ found: 'outside' });
  });

  it('takes the next higher row and none above the last', () => {
    expect(nextHigherRow(HIGHER, (row) => row.voltageKv, 101)).toMatchObject({
      found: 'next-higher',
      row: { lengthMm: 1900 },
    });
    expect(nextHigherRow(HIGHER, (row) => row.voltageKv, 200)).toMatchObject({ found: 'row', row: { lengthMm: 1900 } });
    expect(nextHigherRow(HIGHER, (row) => row.voltageKv, 301)).toEqual({ found: 'outside', row: null });
  });

  it('finds a row as printed or nothing', () => {
    expect(rowAsPrinted(LINEAR, (row) => row.voltageKv === 100).row?.lengthMm).toBe(1000);
    expect(rowAsPrinted(LINEAR, (row) => row.voltageKv === 101)).toEqual({ found: 'outside', row: null });
  });

  it('refuses to read a table by another rule than its own', () => {
    expect(() => nextHigherRow(LINEAR, (row) => row.voltageKv, 100)).toThrow('invented:linear');
  });

  it('knows a figure only as well as the least known of the figures it is made of', () => {
    expect(leastKnown(['seen', 'memory'])).toBe('memory');
    expect(leastKnown(['seen', 'seen'], true)).toBe('derived');
    expect(leastKnown(['confirmed', 'disputed'])).toBe('disputed');
  });
});

describe('the tables of the engine', () => {
  it.each(ALL_TABLES.map((table) => [table.key, table as StandardTable<object>]))(
    '%s tells its rows apart and is not empty',
    (_key, table) => {
      expect(table.rows.length).toBeGreaterThan(2);
      for (const row of table.rows) for (const column of table.identifiedBy) expect(Object.keys(row)).toContain(column);
      const keys = table.rows.map((row) => rowKeyOf(table, row));
      expect(new Set(keys).size).toBe(keys.length);
    },
  );

  it('have different keys', () => {
    expect(new Set(ALL_TABLES.map(({ key }) => key)).size).toBe(ALL_TABLES.length);
  });

  it('name a row by the columns that identify it', () => {
    expect(IEC_60071_1_TABLE_A3.rows.map((row) => rowKeyOf(IEC_60071_1_TABLE_A3, row))[2]).toBe('850/1.6');
    expect(rowKeyOf(IEC_61936_1_CLEARANCES, IEC_61936_1_CLEARANCES.rows.at(-1)!)).toBe('765+800/1950+2100/1550');
  });

  it('read the first row of Table A.2 below it', () => {
    const reading = linearBetweenRows(IEC_60071_1_TABLE_A2, {
      by: (row) => row.switchingKv,
      at: 700,
      value: (row) => row.rodStructureMm,
      firstRowBelow: true,
    });
    expect(reading).toMatchObject({ found: 'first-row', value: 1900 });
  });
});

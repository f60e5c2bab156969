import { ALL_FORMULAS } from '../all-formulas';
import { ALL_TABLES, rowKeyOf, type StandardTable } from '../standards';
import { sourceDifferences } from '.';

const DIFFERENCES = sourceDifferences();
const byId = (id: string) => DIFFERENCES.find((one) => one.id === id)!;
const span = ({ figure, figureUpTo }: { figure: number; figureUpTo: number | null }) => [figure, figureUpTo];

describe(sourceDifferences.name, () => {
  it('are of two figures or more that are not the same, each with document, clause and status', () => {
    expect(DIFFERENCES.length).toBeGreaterThan(25);
    expect(new Set(DIFFERENCES.map(({ id }) => id)).size).toBe(DIFFERENCES.length);
    for (const { id, quantity, choice, figures } of DIFFERENCES) {
      expect([id, new Set(figures.map((one) => span(one).join())).size >= 2]).toEqual([id, true]);
      for (const { figure, source, printedFor } of figures) {
        expect([id, Number.isFinite(figure)]).toEqual([id, true]);
        for (const text of [source.document, printedFor, quantity, choice]) expect(text.length).toBeGreaterThan(0);
      }
    }
  });

  it('point to rows and formulas that the method holds', () => {
    const tables = ALL_TABLES as readonly unknown[] as readonly StandardTable<object>[];
    const keys = new Set([
      ...tables.flatMap((table) => table.rows.map((row) => `${table.key}:${rowKeyOf(table, row)}`)),
      ...ALL_FORMULAS.map(({ definition }) => definition.id),
    ]);
    const pointed = DIFFERENCES.flatMap(({ figures }) => figures.flatMap(({ key }) => key ?? []));
    expect(pointed.filter((key) => !keys.has(key))).toEqual([]);
  });

  it.each([
    // RPTD No 05 Tables 1 and 2 (read): 1200 kV with 2100 and 1550 kV.
    ['levels.1200-with-2100', [1675, 1550]],
    // EN 50341-1 Annex E: 530 (0.74 + 0.26 x 1.45) = 592.0; 560 line practice; 500/0.961.
    ['string.lightning-per-metre', [592, 560, 520.3]],
    // RD 223/2008 Table 15, Table A.1, RPTD No 07 Table 4.
    ['clearances.line-earth-245', [1700, 1900, 2100, 1800]],
    // ANSI C37.32 Table 5 and NFPA 70 (both read).
    ['clearances.bus-ground-362', [84, 83]],
    // Common practice and the bulletin from memory; a paper on lightning performance (read).
    ['string.discs-230', [14, 12]],
    // RD 337/2014 ITC-RAT 15 (read); IEC 61936-1 from memory.
    ['clearances.safety-outdoor-obstacle', [1250, 600]],
  ])('%s: %j', (id, figures) => expect(byId(id).figures.map(({ figure }) => figure)).toEqual(figures));

  it('carry what an owner of the print has recorded', () => {
    const key = 'iec-60071-1:a1:1050';
    const confirmed = { key, outcome: 'disputed', edition: '2019', page: '30', on: '2026-01-01', by: 'A' } as const;
    const of = (differences: typeof DIFFERENCES) =>
      differences.flatMap(({ figures }) => figures.filter((one) => one.key === key).map(({ source }) => source.status));
    expect(of(sourceDifferences([confirmed])).every((status) => status === 'disputed')).toBe(true);
    expect(of(DIFFERENCES).length).toBeGreaterThan(1);
    expect(of(DIFFERENCES)).not.toContain('disputed');
  });
});

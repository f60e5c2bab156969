import { ALL_FORMULAS, type AnyFormula } from './all-formulas';
import * as pollution from './pollution';
import { unitOf } from './quantities';
import { cite, DEFINITION } from './sources';
import { IEC_TS_60815_USCD } from './standards';
import { evaluateExpression } from './testing/expression';
import { Calculation, figureText, formula } from './trace';

/** Figures for a formula: the ends of its range where it has one, else a few of ordinary size. */
function samples({ definition }: AnyFormula): Record<string, number>[] {
  const names = [...new Set(Object.values(definition.symbols))];
  return [0, 1, 2].map((round) =>
    Object.fromEntries(
      names.map((name, index) => {
        const limits = definition.range?.[name];
        if (limits !== undefined) return [name, [limits[0], (limits[0] + limits[1]) / 2, limits[1]][round] as number];
        return [name, [0.9, 1.37, 3.1][round]! * (1 + index / 7)];
      }),
    ),
  );
}

describe('formulas', () => {
  it('are found', () => {
    expect(ALL_FORMULAS.length).toBeGreaterThan(25);
  });

  it.each(ALL_FORMULAS.map((one) => [one.definition.id, one] as const))('%s runs what it shows', async (_id, one) => {
    const { expression, symbols, result } = one.definition;
    const [, ...right] = expression.split(' = ');
    for (const figures of samples(one)) {
      const bySymbol = Object.fromEntries(
        Object.entries(symbols).map(([symbol, name]) => [symbol, figures[name] as number]),
      );
      const shown = await evaluateExpression(right.join(' = '), bySymbol);
      const run = one(figures);
      if (Number.isFinite(shown)) expect(run).toBeCloseTo(shown, 9);
    }
    expect(unitOf(result)).not.toBeNull();
  });

  it('have ids of their own', () => {
    const ids = ALL_FORMULAS.map(({ definition }) => definition.id);
    expect(new Set(ids).size).toBe(ids.length);
  });
});

describe(formula.name, () => {
  const sectionLength = formula({
    id: 'example.section-length',
    heading: 'Section length',
    source: cite(DEFINITION, 'equal units in series', 'derived'),
    expression: 'L = n * P',
    symbols: { n: 'units', P: 'spacingMm' },
    result: 'lengthMm',
    range: { units: [1, 60] },
    compute: ({ units: n, spacingMm: P }: { units: number; spacingMm: number }) => n * P,
  });

  it('shows itself with the figures put in', () => {
    expect(sectionLength.line({ units: 12, spacingMm: 150 }, 1800)).toMatchObject({
      formula: 'L = n * P',
      substitution: 'L = 12 * 150',
      result: 1800,
      unit: 'mm',
    });
  });

  it('names the figure that lies outside its range, boundaries included', () => {
    expect(sectionLength.outside({ units: 60 })).toBeNull();
    expect(sectionLength.outside({ units: 61 })).toEqual({ name: 'units', value: 61, least: 1, most: 60 });
  });
});

describe(figureText.name, () => {
  it('keeps seven digits and brackets what is negative', () => {
    expect(figureText(141.4508131)).toBe('141.4508');
    expect(figureText(-0.5)).toBe('(-0.5)');
  });
});

describe(Calculation.name, () => {
  const row = IEC_TS_60815_USCD.rows[1]!;

  it('takes what an owner of the print has recorded about a row', () => {
    const key = 'iec-ts-60815:uscd:b';
    const confirmation = { edition: '2008', page: '12', on: '2026-03-01', by: 'A. Reader' };
    const confirmed = new Calculation(false, [{ key, outcome: 'confirmed', ...confirmation }]);
    expect(confirmed.row(IEC_TS_60815_USCD, row).status).toBe('confirmed');
    const disputed = new Calculation(false, [{ key, outcome: 'disputed', ...confirmation }]);
    disputed.row(IEC_TS_60815_USCD, row);
    expect(disputed.disputed).toEqual([key]);
  });

  it('keeps no line where no trace is wanted', () => {
    const calculation = new Calculation(false);
    calculation.run(pollution.phaseToEarthVoltage, { highestVoltageKv: 245 });
    calculation.note(() => {
      throw new Error('not to be built');
    });
    expect(calculation.lines).toEqual([]);
  });
});

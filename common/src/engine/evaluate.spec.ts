import { evaluate } from './evaluate';
import { METHOD_EDITION } from './method-edition';
import type { Evaluation, EvaluationContext } from './model';
import { unitOf } from './quantities';
import { mechanicalLoads } from './testing/loads';
import { aContext, aLine, companySettings, rangeOneLevel, rangeTwoLevel } from './testing/specifications';

const isStopped = ({ cautions }: Evaluation): boolean => cautions.some(({ severity }) => severity === 'stop');

function numbersOf(value: unknown, path = ''): [path: string, value: number][] {
  if (typeof value === 'number') return [[path, value]];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersOf(inner, `${path}.${key}`));
}

describe(evaluate.name, () => {
  describe('outside the method', () => {
    const noFigures = ({ string, clearances, ruleOfThumb }: Evaluation): void => {
      expect(string).toMatchObject({
        units: null,
        governedBy: null,
        creepageRequiredMm: null,
        creepageProvidedMm: null,
        dryArcRequiredMm: null,
        sectionLengthMm: null,
        unitsOut: [],
        testLevels: { lightningDryKvPeak: null, switchingWetKvPeak: null, powerFrequencyWetKvRms: null },
      });
      expect(
        string?.criteria.every(({ requiredUnits, requiredValue }) => requiredUnits === null && requiredValue === null),
      ).toBe(true);
      expect(clearances).toMatchObject({ phaseToEarthMm: null, phaseToPhaseMm: null });
      expect(clearances?.rows.filter(({ valueMm }) => valueMm !== null)).toEqual([]);
      expect(
        ruleOfThumb.rows.filter(({ estimate, verdict }) => estimate !== null || verdict !== 'out-of-range'),
      ).toEqual([]);
    };

    it('stops above 4500 m, names the field and gives no figure', () => {
      const evaluation = evaluate(aLine({ site: { altitudeM: 6000 } }), aContext());
      expect(evaluation.cautions).toContainEqual(
        expect.objectContaining({ severity: 'stop', field: 'site.altitudeM', code: 'altitude-outside-method' }),
      );
      noFigures(evaluation);
    });

    it.each([1, 2000])('stops at a highest voltage of %d kV', (highestVoltageKv) => {
      const evaluation = evaluate(aLine({ system: { nominalVoltageKv: 1, highestVoltageKv } }), aContext());
      expect(evaluation.cautions).toContainEqual(
        expect.objectContaining({ severity: 'stop', field: 'system.highestVoltageKv' }),
      );
      noFigures(evaluation);
    });
  });

  it.each([
    [2000, []],
    [2001, ['caution altitude-over-2000']],
    [3000, ['caution altitude-over-2000']],
    [3001, ['acceptance altitude-over-3000']],
    [4500, ['acceptance altitude-over-3000']],
    [4501, ['stop altitude-outside-method']],
  ])('takes the milder case exactly at a limit: %d m', (altitudeM, expected) => {
    const { cautions } = evaluate(aLine({ site: { altitudeM } }), aContext());
    const found = cautions
      .filter(({ code }) => code.startsWith('altitude'))
      .map(({ code, severity }) => `${severity} ${code}`);
    expect(found).toEqual(expected);
  });

  it('counts a site below the sea as at the sea, and needs no correction up to 1000 m', () => {
    const at = (altitudeM: number) => evaluate(aLine({ site: { altitudeM } }), aContext(), { trace: false });
    expect(at(-300).string).toEqual(at(0).string);
    expect(at(1000)).toEqual(at(0));
  });

  it('reads 525 as 550 and 765 as 800, with a note', () => {
    const system = { nominalVoltageKv: 500, highestVoltageKv: 525, insulationLevel: rangeTwoLevel(1175, 1.5, 1550) };
    const { string, cautions } = evaluate(aLine({ system }), aContext());
    expect(string?.creepageVoltageKv).toBeCloseTo(550 / Math.sqrt(3), 9);
    expect(cautions).toContainEqual(expect.objectContaining({ code: 'voltage-read-as', severity: 'info' }));
  });

  it('says that it looks unusual where the highest voltage exceeds the nominal by more than a fifth', () => {
    const codes = (nominalVoltageKv: number) =>
      evaluate(aLine({ system: { nominalVoltageKv } }), aContext()).cautions.map(({ code }) => code);
    expect(codes(120)).toContain('voltage-ratio-unusual');
    expect(codes(121)).not.toContain('voltage-ratio-unusual');
  });

  it('has no string for a bay, and names the parts it does not cover or does not find', () => {
    const bay = evaluate(aLine({ string: null }, { kind: 'bay' }), aContext({ insulator: null }));
    expect(bay.string).toBeNull();
    expect(bay.notAssessed.map(({ part }) => part)).toContain('bay');
    const line = evaluate(aLine({}, { midSpan: { spanM: 300 } as never }), aContext());
    expect(line.notAssessed).toContainEqual({ part: 'midSpan', why: 'Not covered by this method edition.' });
    expect(line.notAssessed).toContainEqual({ part: 'towerHead', why: 'Not filled in.' });
    expect(line.methodEdition).toBe(METHOD_EDITION);
  });

  it('says in one line that the sheet rests on memory, and asks acceptance of a disputed figure', () => {
    const key = 'iec-ts-60815:uscd:b';
    const confirmation = {
      key,
      outcome: 'disputed',
      edition: '2008',
      page: '9',
      on: '2026-03-01',
      by: 'owner',
    } as const;
    const { cautions, trace } = evaluate(aLine(), aContext({ confirmations: [confirmation] }));
    expect(cautions.filter(({ code }) => code === 'rests-on-memory')).toHaveLength(1);
    expect(cautions).toContainEqual(expect.objectContaining({ code: 'figure-disputed', severity: 'acceptance' }));
    expect(trace.find(({ id }) => id === 'pollution.reference')?.source.status).toBe('disputed');
  });

  it('rounds distances to be built only', () => {
    const evaluation = evaluate(aLine({ site: { altitudeM: 1937 } }), aContext());
    expect(evaluation.clearances!.phaseToEarthMm! % 10).toBe(0);
    expect(evaluation.string!.creepageRequiredMm! % 1).not.toBe(0);
    expect(evaluation.string!.dryArcRequiredMm! % 1).not.toBe(0);
  });

  it('has a unit in the name of every number', () => {
    /** Older names of the contract, whose unit stands beside them or in their meaning. */
    const exceptions = new Set([
      'requiredValue',
      'providedValue',
      'estimate',
      'given',
      'band',
      'result',
      'exponent',
      'parallelStrings',
      'rodsInSeries',
      'voltageSharing',
      'subconductors',
      'factorRequired',
      'factorProvided',
    ]);
    const named = (value: unknown): string[] =>
      numbersOf(value).map(([path]) => path.split('.').findLast((step) => Number.isNaN(Number(step)))!);
    const input = aLine(
      { system: { insulationLevel: rangeOneLevel(275, 650) }, string: { hardwareLengthMm: 400 } },
      { mechanical: mechanicalLoads() },
    );
    const unnamed = [...named(input), ...named(evaluate(input, aContext()))].filter(
      (name) => unitOf(name) === null && !exceptions.has(name),
    );
    expect([...new Set(unnamed)]).toEqual([]);
  });

  it('takes a company level', () => {
    const level = {
      highestVoltageKv: 145,
      powerFrequencyKv: 325,
      switchingKv: null,
      switchingPhaseRatio: null,
      lightningKv: 750,
      reason: 'salt',
    };
    const context: EvaluationContext = aContext({ settings: companySettings({ insulationLevels: [level] }) });
    const evaluation = evaluate(aLine({ system: { insulationLevel: rangeOneLevel(325, 750) } }), context);
    expect(isStopped(evaluation)).toBe(false);
    expect(evaluation.string?.testLevels.lightningDryKvPeak).toBe(750);
  });
});

import fc from 'fast-check';
import { evaluate } from './evaluate';
import { METHOD_EDITION } from './method-edition';
import {
  POLLUTION_CLASSES,
  SURROUNDINGS,
  type Evaluation,
  type EvaluationContext,
  type InsulationLevelInput,
  type SpecificationInput,
} from './model';
import { insulationLevelsFor } from './overvoltage';
import { unitOf } from './quantities';
import {
  aCompositeRod,
  aContext,
  aDisc,
  aLine,
  companySettings,
  rangeOneLevel,
  rangeTwoLevel,
} from './testing/specifications';

/** Every standard level of the tables, by its Um. */
const LEVELS = [72.5, 123, 145, 170, 245, 300, 362, 420, 550, 800].map((highestVoltageKv) => ({
  highestVoltageKv,
  levels: insulationLevelsFor(highestVoltageKv, 'iec').map(
    ({ lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio }): InsulationLevelInput => ({
      lightningKv,
      switchingKv,
      powerFrequencyKv,
      switchingPhaseRatio,
    }),
  ),
}));

const aVoltage = fc
  .constantFrom(...LEVELS)
  .chain(({ highestVoltageKv, levels }) =>
    fc.constantFrom(...levels).map((insulationLevel) => ({ highestVoltageKv, insulationLevel })),
  );
const anAltitude = fc.integer({ min: -300, max: 4500 });
const aClass = fc.constantFrom(...POLLUTION_CLASSES);
const aUnit = fc.constantFrom(
  aDisc(),
  aDisc({ spacingMm: 170, diameterMm: 330, creepageMm: 525, profile: 'fog' }),
  aCompositeRod({ dryArcMm: 2400, creepageMm: 9000 }),
);
const aCase = fc.record({
  voltage: aVoltage,
  altitudeM: anAltitude,
  pollutionClass: aClass,
  unit: aUnit,
  surroundings: fc.constantFrom(...SURROUNDINGS),
  earthFault: fc.constantFrom('cleared' as const, 'sustained' as const),
});
type Case = typeof aCase extends fc.Arbitrary<infer T> ? T : never;

function inputOf({ voltage, altitudeM, pollutionClass, surroundings, earthFault }: Case): SpecificationInput {
  const { highestVoltageKv, insulationLevel } = voltage;
  return aLine({
    system: {
      nominalVoltageKv: Math.round(highestVoltageKv / 1.1),
      highestVoltageKv,
      insulationLevel,
      neutralEarthing: 'isolated',
      earthFault,
    },
    site: { altitudeM, pollution: { class: pollutionClass, type: 'A', basis: 'measured', recheckBy: null } },
    string: { surroundings },
  });
}

const evaluateCase = (one: Case): Evaluation =>
  evaluate(inputOf(one), aContext({ insulator: one.unit }), { trace: false });
const copyOf = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;
const stopsOf = ({ cautions }: Evaluation): string[] =>
  cautions.filter(({ severity }) => severity === 'stop').map(({ code }) => code);
const isStopped = (evaluation: Evaluation): boolean => stopsOf(evaluation).length > 0;
/** Stops of a table of clearances leave the string alone. */
const stringIsStopped = (evaluation: Evaluation): boolean =>
  stopsOf(evaluation).some((code) => !code.startsWith('clearance'));

/** Larger or equal, where both have a figure. */
function expectNotLess(more: number | null | undefined, less: number | null | undefined): void {
  if (typeof more === 'number' && typeof less === 'number') expect(more).toBeGreaterThanOrEqual(less - 1e-9);
}

function numbersOf(value: unknown, path = ''): [path: string, value: number][] {
  if (typeof value === 'number') return [[path, value]];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersOf(inner, `${path}.${key}`));
}

describe(evaluate.name, () => {
  it('never shortens creepage or string where pollution grows', () => {
    fc.assert(
      fc.property(aCase, aClass, (one, otherClass) => {
        const [light, heavy] = [one.pollutionClass, otherClass].sort();
        const less = evaluateCase({ ...one, pollutionClass: light! }).string;
        const more = evaluateCase({ ...one, pollutionClass: heavy! }).string;
        expectNotLess(more?.creepageRequiredMm, less?.creepageRequiredMm);
        expectNotLess(more?.units, less?.units);
      }),
    );
  });

  it('never shortens a gap, a creepage or a string where the site lies higher', () => {
    fc.assert(
      fc.property(aCase, anAltitude, (one, otherM) => {
        const [lowM, highM] = [one.altitudeM, otherM].sort((a, b) => a - b);
        const low = evaluateCase({ ...one, altitudeM: lowM! });
        const high = evaluateCase({ ...one, altitudeM: highM! });
        expectNotLess(high.string?.units, low.string?.units);
        expectNotLess(high.string?.creepageRequiredMm, low.string?.creepageRequiredMm);
        expectNotLess(high.string?.dryArcRequiredMm, low.string?.dryArcRequiredMm);
        expectNotLess(high.clearances?.phaseToEarthMm, low.clearances?.phaseToEarthMm);
        expectNotLess(high.clearances?.phaseToPhaseMm, low.clearances?.phaseToPhaseMm);
      }),
    );
  });

  it('never shortens a gap or a string where the level is higher', () => {
    const twoLevels = fc
      .constantFrom(...LEVELS)
      .chain(({ highestVoltageKv, levels }) =>
        fc.tuple(fc.constant(highestVoltageKv), fc.constantFrom(...levels), fc.constantFrom(...levels)),
      );
    fc.assert(
      fc.property(aCase, twoLevels, (one, [highestVoltageKv, first, second]) => {
        const reaches = (key: 'lightningKv' | 'switchingKv' | 'powerFrequencyKv'): boolean =>
          (second[key] ?? 0) >= (first[key] ?? 0);
        fc.pre(reaches('lightningKv') && reaches('switchingKv') && reaches('powerFrequencyKv'));
        const less = evaluateCase({ ...one, voltage: { highestVoltageKv, insulationLevel: first } });
        const more = evaluateCase({ ...one, voltage: { highestVoltageKv, insulationLevel: second } });
        expectNotLess(more.string?.units, less.string?.units);
        expectNotLess(more.string?.dryArcRequiredMm, less.string?.dryArcRequiredMm);
        expectNotLess(more.clearances?.phaseToEarthMm, less.clearances?.phaseToEarthMm);
      }),
    );
  });

  it('gives neither NaN nor infinity, and nothing below zero but margins and differences', () => {
    fc.assert(
      fc.property(aCase, (one) => {
        for (const [path, value] of numbersOf(evaluate(inputOf(one), aContext({ insulator: one.unit })))) {
          expect([path, Number.isFinite(value)]).toEqual([path, true]);
          if (!/margin/i.test(path)) expect([path, value >= 0]).toEqual([path, true]);
        }
      }),
    );
  });

  it('gives the same bytes for the same input, and the same answer with and without a trace', () => {
    fc.assert(
      fc.property(aCase, (one) => {
        const [input, context] = [inputOf(one), aContext({ insulator: one.unit })];
        const first = evaluate(input, context);
        expect(JSON.stringify(evaluate(copyOf(input), copyOf(context)))).toBe(JSON.stringify(first));
        expect(evaluate(input, context, { trace: false })).toEqual({ ...first, trace: [] });
        expect(first.trace.length).toBeGreaterThan(5);
        expect(new Set(first.trace.map(({ id }) => id)).size).toBe(first.trace.length);
      }),
      { numRuns: 40 },
    );
  });

  it('answers an input with any part missing, null or left out, and never passes what is not there', () => {
    const paths = [
      'kind',
      'basis',
      'system',
      'system.nominalVoltageKv',
      'system.highestVoltageKv',
      'system.neutralEarthing',
      'system.earthFault',
      'system.insulationLevel',
      'system.insulationLevel.lightningKv',
      'system.insulationLevel.switchingKv',
      'system.insulationLevel.powerFrequencyKv',
      'system.insulationLevel.switchingPhaseRatio',
      'site',
      'site.altitudeM',
      'site.pollution',
      'site.pollution.class',
      'string',
      'string.arrangement',
      'string.parallelStrings',
      'string.surroundings',
      'string.spareUnits',
      'string.arcingDevices',
      'string.arcGapMm',
    ];
    const take = (input: SpecificationInput, path: string, away: 'null' | 'left out'): void => {
      const steps = path.split('.');
      const last = steps.pop()!;
      let at: Record<string, unknown> | null = input as unknown as Record<string, unknown>;
      for (const step of steps) at = (at?.[step] as Record<string, unknown> | undefined) ?? null;
      if (at === null) return;
      if (away === 'null') at[last] = null;
      else delete at[last];
    };
    fc.assert(
      fc.property(
        aCase,
        fc.subarray(paths, { minLength: 1 }),
        fc.constantFrom('null' as const, 'left out' as const),
        (one, taken, away) => {
          const input = copyOf(inputOf(one));
          for (const path of taken) take(input, path, away);
          const evaluation = evaluate(input, aContext({ insulator: one.unit }));
          for (const [path, value] of numbersOf(evaluation))
            expect([path, Number.isFinite(value)]).toEqual([path, true]);
          for (const { state, requiredValue, verdict } of evaluation.string?.criteria ?? []) {
            if (state === 'not-assessed') expect([requiredValue, verdict]).toEqual([null, 'unknown']);
          }
          if (taken.includes('site.altitudeM') || taken.includes('site')) {
            if (one.unit.kind === 'cap-and-pin') expect(evaluation.string?.units ?? null).toBeNull();
            expect(evaluation.clearances?.phaseToEarthMm ?? null).toBeNull();
          }
        },
      ),
    );
  });

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

    it('has no figure together with a stop', () => {
      const wide = fc.record({ one: aCase, altitudeM: fc.integer({ min: 3000, max: 6000 }) });
      fc.assert(
        fc.property(wide, ({ one, altitudeM }) => {
          const evaluation = evaluateCase({ ...one, altitudeM });
          if (isStopped(evaluation) && !stringIsStopped(evaluation)) {
            const { phaseToEarthMm, phaseToPhaseMm } = evaluation.clearances!;
            expect([phaseToEarthMm, phaseToPhaseMm]).toContain(null);
          }
          if (!stringIsStopped(evaluation)) return;
          expect(evaluation.string).toMatchObject({ units: null, governedBy: null, sectionLengthMm: null });
        }),
      );
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
    ]);
    const named = (value: unknown): string[] =>
      numbersOf(value).map(([path]) => path.split('.').findLast((step) => Number.isNaN(Number(step)))!);
    const input = aLine({ system: { insulationLevel: rangeOneLevel(275, 650) }, string: { hardwareLengthMm: 400 } });
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

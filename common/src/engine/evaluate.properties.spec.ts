import fc from 'fast-check';
import { evaluate } from './evaluate';
import {
  POLLUTION_CLASSES,
  SURROUNDINGS,
  type Evaluation,
  type InsulationLevelInput,
  type SpecificationInput,
} from './model';
import { insulationLevelsFor } from './overvoltage';
import { aCompositeRod, aContext, aDisc, aLine } from './testing/specifications';

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

describe('every evaluation', () => {
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
          if (!/margin|bridge/i.test(path)) expect([path, value >= 0]).toEqual([path, true]);
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

import fc from 'fast-check';
import { evaluate } from './evaluate';
import {
  ARCING_DEVICES,
  ARRANGEMENTS,
  CLEARANCE_METHODS,
  CONTAMINATION_LEVELS,
  EN_GAPS,
  FAST_FRONT_SOURCES,
  LOAD_CASE_KINDS,
  MECHANICAL_BASES,
  NEUTRAL_EARTHINGS,
  POLLUTION_CLASSES,
  SAFETY_SOURCES,
  SHAPES_PHASE_TO_EARTH,
  SHAPES_PHASE_TO_PHASE,
  SURROUNDINGS,
  type Basis,
  type Evaluation,
  type InsulationLevelInput,
  type InsulatorUnit,
  type ShedDimensions,
  type SpecificationInput,
} from './model';
import { insulationLevelsFor } from './overvoltage';
import {
  aCeramicRod,
  aCompositeRod,
  aContext,
  aDisc,
  aSuspensionUnit,
  companySettings,
} from './testing/specifications';

/** Ten thousand inputs of every kind, whole and in part; what has to hold of every answer holds of each of them. */
const RUNS = 10_000;

/** Often there, sometimes not filled in, sometimes left out altogether. */
const maybe = <T>(value: fc.Arbitrary<T>): fc.Arbitrary<T | null> => fc.option(value, { freq: 25, nil: null });
const oneOf = <const T>(values: readonly T[]): fc.Arbitrary<T | null> => maybe(fc.constantFrom(...values));
const real = (min: number, max: number): fc.Arbitrary<number | null> =>
  maybe(fc.double({ min, max, noNaN: true, noDefaultInfinity: true }));
const whole = (min: number, max: number): fc.Arbitrary<number | null> => maybe(fc.integer({ min, max }));

const LEVELS: { basis: Basis; highestVoltageKv: number; level: InsulationLevelInput }[] = (
  ['iec', 'north-american'] as const
).flatMap((basis) =>
  insulationLevelsFor(null, basis).map(
    ({ highestVoltageKv, lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio }) => ({
      basis,
      highestVoltageKv,
      level: { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio },
    }),
  ),
);

const aPollution = (basis: Basis): fc.Arbitrary<NonNullable<SpecificationInput['site']>['pollution']> =>
  basis === 'iec'
    ? fc.record({
        class: oneOf(POLLUTION_CLASSES),
        type: fc.constant('A' as const),
        basis: fc.constant('measured' as const),
        recheckBy: fc.constant(null),
      })
    : fc.record({
        contamination: oneOf(CONTAMINATION_LEVELS),
        basis: fc.constant('estimated' as const),
        recheckBy: fc.constant(null),
      });

const aString: fc.Arbitrary<NonNullable<SpecificationInput['string']>> = fc.record({
  insulatorCode: fc.constant('any'),
  arrangement: oneOf(ARRANGEMENTS),
  parallelStrings: whole(1, 4),
  rodsInSeries: whole(1, 3),
  surroundings: oneOf(SURROUNDINGS),
  spareUnits: whole(0, 3),
  arcingDevices: oneOf(ARCING_DEVICES),
  arcGapMm: real(200, 6000),
  hardwareLengthMm: real(0, 900),
  vAngleWindwardDeg: real(20, 70),
  vAngleLeewardDeg: real(20, 70),
  postAngleDeg: real(0, 90),
});

const aClearance: fc.Arbitrary<NonNullable<SpecificationInput['clearance']>> = fc.record({
  method: oneOf(CLEARANCE_METHODS),
  shapePhaseToEarth: oneOf(SHAPES_PHASE_TO_EARTH),
  shapePhaseToPhase: oneOf(SHAPES_PHASE_TO_PHASE),
  fastFrontFrom: oneOf(FAST_FRONT_SOURCES),
  enGap: oneOf(EN_GAPS),
  externalClearanceMm: real(300, 9000),
  safetySource: oneOf(SAFETY_SOURCES),
});

const aLoadCase = fc.record({
  name: maybe(fc.constantFrom('everyday', 'storm')),
  kind: oneOf(LOAD_CASE_KINDS),
  conductorWeightNPerM: real(3, 60),
  windPressurePa: real(0, 3000),
  conductorDiameterMm: real(8, 60),
  iceRadialMm: fc.oneof(fc.constant(null), real(0, 40)),
  iceDensityKgPerM3: real(300, 920),
  conductorTensionN: real(0, 90_000),
  stringWindN: real(0, 2000),
  stringWeightN: real(0, 5000),
  hardwareWeightN: real(0, 2000),
});

const mechanicalLoads: fc.Arbitrary<NonNullable<SpecificationInput['mechanical']>> = fc.record({
  basis: oneOf(MECHANICAL_BASES),
  subconductors: whole(1, 4),
  crossing: maybe(fc.boolean()),
  acceptedStatistically: maybe(fc.boolean()),
  windSpanM: real(0, 900),
  weightSpanM: real(-200, 1200),
  lineAngleDeg: real(-60, 60),
  fittingsStrengthKn: fc.oneof(fc.constant(null), real(40, 400)),
  cases: maybe(fc.array(aLoadCase, { maxLength: 2 })),
});

const aMeasure = fc.constantFrom(null, 12, 30, 45, 62, 95, 170);
const someSheds: fc.Arbitrary<ShedDimensions> = fc.record({
  spacingMm: aMeasure,
  overhangMm: aMeasure,
  secondOverhangMm: aMeasure,
  clearanceMm: aMeasure,
  pathMm: aMeasure,
  pathClearanceMm: aMeasure,
  underRibs: fc.constantFrom(null, true, false),
});

const UNITS = [
  aDisc(),
  aDisc({
    spacingMm: 170,
    diameterMm: 330,
    creepageMm: 525,
    profile: 'fog',
    failingLoadKn: 160,
    creepageIsNominal: true,
  }),
  aSuspensionUnit(),
  aCompositeRod(),
  aCompositeRod({ dryArcMm: null, routineTestLoadKn: 60 }),
  aCeramicRod(),
  aCeramicRod({ averageDiameterMm: null }),
  aCompositeRod({ kind: 'line-post' }),
  aCeramicRod({ kind: 'line-post', cantileverStrengthKn: 12 }),
  null,
];
const withSheds = (unit: InsulatorUnit | null): fc.Arbitrary<InsulatorUnit | null> =>
  unit === null ? fc.constant(null) : fc.option(someSheds, { nil: null }).map((sheds) => ({ ...unit, sheds }));
const SETTINGS = [
  companySettings(),
  companySettings({
    tensionExtraUnits: 2,
    creepageAltitudeOriginM: 0,
    companyMinimumUnits: [132, 220].map((nominalVoltageKv) => ({ nominalVoltageKv, units: 15 })),
  }),
];

const aCase = fc.constantFrom(...LEVELS).chain(({ basis, highestVoltageKv, level }) =>
  fc.record({
    insulator: fc.constantFrom(...UNITS).chain(withSheds),
    settings: fc.constantFrom(...SETTINGS),
    input: fc.record(
      {
        kind: oneOf(['line', 'line', 'bay'] as const),
        basis: maybe(fc.constant(basis)),
        system: maybe(
          fc.record({
            nominalVoltageKv: oneOf([highestVoltageKv / 1.1, 33, 66, 132, 220].filter((kv) => kv <= highestVoltageKv)),
            highestVoltageKv: maybe(fc.constant(highestVoltageKv)),
            frequencyHz: oneOf([50, 60]),
            neutralEarthing: oneOf(NEUTRAL_EARTHINGS),
            earthFault: oneOf(['cleared', 'sustained'] as const),
            insulationLevel: maybe(fc.constantFrom(level, { ...level, levelHoldsToM: 2000 })),
          }),
        ),
        site: maybe(
          fc.record({ altitudeM: maybe(fc.integer({ min: -400, max: 5200 })), pollution: aPollution(basis) }),
        ),
        string: maybe(aString),
        clearance: maybe(aClearance),
        mechanical: maybe(mechanicalLoads),
      },
      { requiredKeys: ['kind', 'basis', 'system', 'site'] },
    ) satisfies fc.Arbitrary<SpecificationInput>,
  }),
);
type Case = typeof aCase extends fc.Arbitrary<infer T> ? T : never;

/** Plain checks instead of matchers: matchers would take longer than ten thousand evaluations. */
function faultOf(holds: boolean, what: string): string[] {
  return holds ? [] : [what];
}

function numberFaults(value: unknown, path = ''): string[] {
  if (typeof value === 'number') {
    const mayBeNegative = /margin|bridge/i.test(path);
    return faultOf(Number.isFinite(value) && (mayBeNegative || value >= 0), `${path} is ${value}`);
  }
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numberFaults(inner, `${path}.${key}`));
}

function bridgeFaults({ ruleOfThumb, string }: Evaluation): string[] {
  const { bridge, bridgeWhyNot, rows } = ruleOfThumb;
  if (bridge === null) return faultOf(bridgeWhyNot !== null && bridgeWhyNot !== '', 'no bridge and no reason');
  const rule = rows.find(({ id }) => id === 'discs-by-15-kv')?.estimate ?? NaN;
  const reached = bridge.reduce((sum, { units }) => sum + units, rule);
  return faultOf(reached === string?.units && bridgeWhyNot === null, `the bridge ends at ${reached}`);
}

/** What was left out, or could not be assessed, is named and never passed. */
function passedFaults(
  { string, clearances, mechanical, notAssessed, cautions }: Evaluation,
  { input }: Case,
): string[] {
  const parts = new Set(notAssessed.map(({ part }) => part.split('.')[0]));
  const line = input.kind !== 'bay';
  const criteria = (string?.criteria ?? []).flatMap(({ criterion, state, verdict, requiredValue }) =>
    faultOf(
      state === 'assessed' || (verdict === 'unknown' && requiredValue === null),
      `${criterion} is ${state} and ${verdict}`,
    ),
  );
  const cases = (mechanical?.cases ?? []).flatMap(({ loadPerStringN, factorRequired, factorProvided, verdict }) =>
    faultOf(
      verdict === 'unknown' || (loadPerStringN !== null && factorRequired !== null && factorProvided !== null),
      `a load case without figures is ${verdict}`,
    ),
  );
  const shortCase = mechanical?.cases.some(({ verdict }) => verdict === 'short') ?? false;
  const failed = cautions.some(({ code, severity }) => code === 'strength-short' && severity === 'fail');
  return [
    ...criteria,
    ...cases,
    ...faultOf(shortCase === failed, 'a short load case without its fail'),
    ...faultOf(!line || input.string || parts.has('string') ? true : false, 'a string left out is not named'),
    ...faultOf(!line || input.mechanical || parts.has('mechanical') ? true : false, 'loads left out are not named'),
    ...faultOf(input.mechanical || mechanical === null ? true : false, 'loads that nobody gave'),
    ...faultOf(
      mechanical?.cases.some(({ verdict }) => verdict === 'unknown') !== true || parts.has('mechanical'),
      'a load case that was not assessed is not named',
    ),
    ...faultOf(
      clearances === null || clearances.phaseToEarthMm !== null || parts.has('clearances') || parts.has('clearance'),
      'a distance that is missing is not named',
    ),
  ];
}

/** Checks of the profile say something and change nothing. */
function profileFaults({ string, cautions, notAssessed }: Evaluation, { insulator }: Case): string[] {
  const own = cautions.filter(({ code }) => code.startsWith('profile-'));
  const named = notAssessed.some(({ part }) => part === 'string.profile');
  return [
    ...faultOf(
      own.every(({ severity }) => severity === 'info' || severity === 'caution'),
      'a profile that does more than warn',
    ),
    ...faultOf(string === null || insulator === null || named || own.length > 0, 'a profile of which nothing is said'),
    ...faultOf(insulator?.sheds ? true : own.length === 0, 'a profile without dimensions'),
  ];
}

/** No figure together with a stop. */
function stopFaults({ string, mechanical, cautions }: Evaluation): string[] {
  const stops = cautions.filter(({ severity }) => severity === 'stop').map(({ code }) => code);
  const legs = (mechanical?.cases ?? []).flatMap(({ legs: one, slackLeg, loadPerStringN }) =>
    one ? faultOf(slackLeg === (one.leewardN === 0) || loadPerStringN === null, 'a slack leg that carries') : [],
  );
  const uplift = stops.includes('mechanical-uplift');
  const ofString = stops.some((code) => !code.startsWith('clearance') && !code.startsWith('mechanical'));
  return [
    ...legs,
    ...faultOf(!ofString || string === null || string.units === null, 'a count beside a stop'),
    ...faultOf(!uplift || mechanical?.classRequiredKn === null, 'a class beside uplift'),
    ...faultOf(
      string === null || string.units === null || string.voltageSharing.length === 0
        ? true
        : Math.abs(string.voltageSharing.reduce((sum, one) => sum + one, 0) - 100) < 1e-9,
      'shares that do not add up',
    ),
  ];
}

describe(`${RUNS} inputs of every kind`, () => {
  it('have answers without NaN, negative figures or unearned passes, whose bridges add up, the same bytes each time', () => {
    let bridges = 0;
    let strengths = 0;
    let posts = 0;
    let profiles = 0;
    fc.assert(
      fc.property(aCase, (one) => {
        const context = aContext({ insulator: one.insulator, settings: one.settings });
        const evaluation = evaluate(one.input, context, { trace: false });
        const again = evaluate(JSON.parse(JSON.stringify(one.input)) as SpecificationInput, context, { trace: false });
        const faults = [
          ...numberFaults(evaluation),
          ...bridgeFaults(evaluation),
          ...passedFaults(evaluation, one),
          ...stopFaults(evaluation),
          ...profileFaults(evaluation, one),
          ...faultOf(JSON.stringify(evaluation) === JSON.stringify(again), 'other bytes for the same input'),
        ];
        if (evaluation.ruleOfThumb.bridge !== null) bridges += 1;
        if (typeof evaluation.mechanical?.strengthRequiredKn === 'number') strengths += 1;
        if (evaluation.mechanical?.cases.some(({ post }) => post)) posts += 1;
        if (evaluation.cautions.some(({ code }) => code.startsWith('profile-'))) profiles += 1;
        if (faults.length > 0) throw new Error(faults.join('; '));
      }),
      { numRuns: RUNS },
    );
    expect(bridges).toBeGreaterThan(RUNS / 400);
    expect(strengths).toBeGreaterThan(RUNS / 400);
    expect(posts).toBeGreaterThan(RUNS / 400);
    expect(profiles).toBeGreaterThan(RUNS / 400);
  }, 120_000);
});

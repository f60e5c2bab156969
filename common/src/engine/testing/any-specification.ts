import fc from 'fast-check';
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
  type InsulationLevelInput,
  type InsulatorUnit,
  type ShedDimensions,
  type SpecificationInput,
} from '../model';
import { insulationLevelsFor } from '../overvoltage';
import { aCeramicRod, aCompositeRod, aDisc, aSuspensionUnit, companySettings } from './specifications';

/** Inputs of every kind for properties: whole and in part, on both bases, with every kind of unit. */

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
  sharing: fc.oneof(fc.constant(null), fc.record({ pinToEarthRatio: real(0, 1), pinToLineRatio: real(0, 1) })),
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

/** A line or bay of any kind with its unit and settings. */
export const anyCase = fc.constantFrom(...LEVELS).chain(({ basis, highestVoltageKv, level }) =>
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
export type AnyCase = typeof anyCase extends fc.Arbitrary<infer T> ? T : never;

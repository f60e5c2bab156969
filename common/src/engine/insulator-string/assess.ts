import { levelAltitudeCorrection } from '../atmosphere';
import type {
  Criterion,
  EvaluationContext,
  InsulatorUnit,
  SpecificationInput,
  StringInput,
  StringResult,
} from '../model';
import { requiredCreepageMm } from '../quantities';
import { creepageRequirement, type CreepageRequirement } from '../pollution';
import type { Situation } from '../situation';
import type { Calculation } from '../trace';
import { demand, notAssessed, type Demand } from './demand';
import { countOf, testLevel, unitsByCreepage } from './formulas';
import { lightningDemand, stringGapFactor, switchingDemand, type Devices } from './impulse';
import { minimumDemand } from './minimum';
import { powerFrequencyDemand } from './power-frequency';
import { putTogether } from './result';
import { isDisc } from './unit';

/** Figures of the level at the site, null where not known: each criterion's own altitude factor and test level. */
export interface SiteFactors {
  lightning: number | null;
  switching: number | null;
  powerFrequency: number | null;
}

export interface StringCase {
  input: SpecificationInput;
  string: StringInput;
  situation: Situation;
  context: EvaluationContext;
  unit: InsulatorUnit;
  /** Rods in series; 1 for discs, composite rods and posts. */
  rods: number;
  devices: Devices;
}

export interface StringAssessment {
  given: StringCase;
  result: StringResult;
  demands: readonly Demand[];
}

const UNITS_BY_POLLUTION = { as: 'pollution', heading: 'Units by pollution' } as const;

/** Discs that a creepage calls for. */
export function unitsByPollution(requiredMm: number, { creepageMm }: InsulatorUnit, calculation: Calculation): number {
  const quotientRatio = calculation.run(unitsByCreepage, { requiredMm, creepageMm });
  return calculation.run(countOf, { quotientRatio }, UNITS_BY_POLLUTION);
}

function pollutionDemand({ unit }: StringCase, requirement: CreepageRequirement, calculation: Calculation): Demand {
  const { requiredMm } = requirement;
  if (requiredMm === null) return notAssessed('pollution', 'mm', requirement.whyNot ?? '');
  const common = {
    criterion: 'pollution',
    unit: 'mm',
    requiredValue: requiredMm,
    roundedRequirement: requiredCreepageMm(requiredMm),
    provided: (units: number) => units * unit.creepageMm,
  } as const;
  if (!isDisc(unit)) return demand(common);
  return demand({ ...common, requiredUnits: unitsByPollution(requiredMm, unit, calculation) });
}

function siteFactors({ situation }: StringCase, calculation: Calculation): SiteFactors {
  const { altitudeM, level, range, stopped } = situation;
  if (altitudeM === null || level === null || stopped)
    return { lightning: null, switching: null, powerFrequency: null };
  const { holdsToM } = level;
  const factor = (stress: 'lightning' | 'switching-phase-to-earth' | 'power-frequency', use: string): number =>
    levelAltitudeCorrection({ altitudeM, holdsToM, stress, use }, calculation);
  return {
    lightning: level.lightningKv === null ? null : factor('lightning', 'string-lightning'),
    switching:
      level.switchingKv === null || range !== 2 ? null : factor('switching-phase-to-earth', 'string-switching'),
    powerFrequency:
      level.powerFrequencyKv === null || range !== 1 ? null : factor('power-frequency', 'string-power-frequency'),
  };
}

function testLevels(
  { situation }: StringCase,
  factors: SiteFactors,
  calculation: Calculation,
): StringResult['testLevels'] {
  const { level } = situation;
  const at = (
    levelKv: number | null | undefined,
    altitudeFactor: number | null,
    as: string,
    heading: string,
  ): number | null =>
    levelKv === null || levelKv === undefined || altitudeFactor === null
      ? null
      : calculation.run(testLevel, { levelKv, altitudeFactor }, { as, heading });
  return {
    lightningDryKvPeak: at(level?.lightningKv, factors.lightning, 'lightning', 'Dry lightning test, kV peak'),
    switchingWetKvPeak: at(level?.switchingKv, factors.switching, 'switching', 'Wet switching test, kV peak'),
    powerFrequencyWetKvRms: at(
      level?.powerFrequencyKv,
      factors.powerFrequency,
      'power-frequency',
      'Wet power-frequency test, kV rms',
    ),
  };
}

/** The string by every criterion, put together, with what it provides and what the supplier has to prove. */
export function assessString(given: StringCase, calculation: Calculation): StringAssessment {
  const { input, string, situation, context, unit, rods, devices } = given;
  const creepage = creepageRequirement(
    { situation, pollution: input.site?.pollution, unit, settings: context.settings },
    calculation,
  );
  const pollution = pollutionDemand(given, creepage, calculation);
  const factors = siteFactors(given, calculation);
  const gapFactor = stringGapFactor(string.surroundings ?? null, calculation);
  const impulse = { situation, unit, gapFactor, devices };
  const demands: Record<Criterion, Demand> = {
    pollution,
    lightning: lightningDemand(impulse, factors.lightning, calculation),
    switching: switchingDemand(impulse, factors.switching, calculation),
    'power-frequency': powerFrequencyDemand({ situation, unit, rods }, factors.powerFrequency, calculation),
    minimum: minimumDemand({ situation, unit, settings: context.settings, rods }, calculation),
  };
  const levels = testLevels(given, factors, calculation);
  const inOrder = Object.values(demands);
  return {
    given,
    result: putTogether(given, { demands: inOrder, creepage, testLevels: levels }, calculation),
    demands: inOrder,
  };
}

import { SURROUNDINGS_GAP_FACTORS } from '../air-gaps';
import { levelAltitudeCorrection, type LevelStress } from '../atmosphere';
import { unitsByPollution, type StringCase } from '../insulator-string/assess';
import type { Demand } from '../insulator-string/demand';
import { wetFlashoverNeeded } from '../insulator-string/formulas';
import { lightningArcM, switchingArcM, unitsByArc } from '../insulator-string/impulse';
import { leastString } from '../insulator-string/power-frequency';
import { wetFlashoverOf } from '../insulator-string/unit';
import type {
  BridgeCause,
  CompanyInsulationLevel,
  Criterion,
  Evaluation,
  InsulatorUnit,
  PollutionInput,
  ContaminationInput,
  RuleOfThumbRow,
} from '../model';
import { insulationLevelsFor } from '../overvoltage';
import { creepageRequirement } from '../pollution';
import { ALTITUDE_LIMITS_M } from '../quantities';
import type { Situation, SituationLevel } from '../situation';
import { cite, PRACTICE } from '../sources';
import { Calculation } from '../trace';
import { discReason, NOTHING_TO_COMPARE, type Checked } from './card';

/**
 * The bridge: from what the rule of discs says to the specified count. First the count of the method under the rule's
 * own conditions, then each input set to its real value, one after the other, and the count taken anew. Only counts are
 * made, and only of the criteria that an input touches, so that every evaluation can afford it.
 */
type Bridge = Pick<Evaluation['ruleOfThumb'], 'bridge' | 'bridgeWhyNot'>;
const no = (bridgeWhyNot: string): Bridge => ({ bridge: null, bridgeWhyNot });

/** The disc that the rule of thumb speaks of: 146 mm by 295 mm, of standard profile. */
const STANDARD_DISC: InsulatorUnit = {
  code: 'standard disc',
  version: 1,
  family: 'iec-60305',
  kind: 'cap-and-pin',
  material: null,
  profile: 'standard',
  failingLoadKn: 120,
  coupling: null,
  spacingMm: 146,
  diameterMm: 255,
  averageDiameterMm: null,
  creepageMm: 295,
  creepageIsNominal: false,
  dryArcMm: null,
  massKg: null,
  routineTestLoadKn: null,
  wetFlashover: null,
  note: null,
  source: cite(PRACTICE, 'no published source', 'practice'),
  withdrawn: false,
};
const LIGHT = { basis: null, recheckBy: null } as const;

type Electrical = Exclude<Criterion, 'minimum'>;
const ELECTRICAL = ['pollution', 'lightning', 'switching', 'power-frequency'] as const satisfies Electrical[];
const NONE: readonly Electrical[] = [];
const POLLUTION = ['pollution'] as const satisfies Electrical[];
const IN_GAPS = ['lightning', 'switching'] as const satisfies Electrical[];
const ON_LEVEL = ['lightning', 'switching', 'power-frequency'] as const satisfies Electrical[];

/** What one count is made from. */
interface Conditions {
  situation: Situation;
  pollution: PollutionInput | ContaminationInput | null;
  surroundings: keyof typeof SURROUNDINGS_GAP_FACTORS;
  unit: InsulatorUnit;
}

/** Highest level of a voltage among the printed rows, else among the company's; null where there is none. */
function highestLevel(
  { highestVoltageKv, basis }: Situation,
  companyLevels: readonly CompanyInsulationLevel[],
): SituationLevel | null {
  const printed = insulationLevelsFor(highestVoltageKv, basis);
  const rows = printed.length > 0 ? printed : insulationLevelsFor(highestVoltageKv, basis, companyLevels);
  const [first, ...others] = rows;
  if (first === undefined) return null;
  const highest = others.reduce((most, row) => (row.lightningKv > most.lightningKv ? row : most), first);
  const { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio } = highest;
  return { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio, holdsToM: ALTITUDE_LIMITS_M.origin };
}

/** Units by criterion, each asked for only where an input that it rests on has changed. */
class Counts {
  private readonly calculation = new Calculation(false);
  private readonly units: Record<Electrical, number | null> = {
    pollution: null,
    lightning: null,
    switching: null,
    'power-frequency': null,
  };

  constructor(private readonly given: StringCase) {}

  private pollution({ situation, pollution, unit }: Conditions): number | null {
    const { settings } = this.given.context;
    const { requiredMm } = creepageRequirement({ situation, pollution, unit, settings }, this.calculation);
    return requiredMm === null ? null : unitsByPollution(requiredMm, unit, this.calculation);
  }

  /** Altitude factor on the level; null where altitude or level is not known. */
  private factor({ altitudeM, level }: Situation, stress: LevelStress): number | null {
    if (altitudeM === null || level === null) return null;
    return levelAltitudeCorrection({ altitudeM, holdsToM: level.holdsToM, stress }, this.calculation);
  }

  private impulse({ situation, surroundings, unit }: Conditions, criterion: 'lightning' | 'switching'): number | null {
    const lightning = criterion === 'lightning';
    if (!lightning && situation.range === 1) return null;
    const withstandKvPeak = (lightning ? situation.level?.lightningKv : situation.level?.switchingKv) ?? null;
    const altitudeFactor = this.factor(situation, lightning ? 'lightning' : 'switching-phase-to-earth');
    if (withstandKvPeak === null || altitudeFactor === null) return null;
    const atSite = { withstandKvPeak, altitudeFactor, gapFactor: SURROUNDINGS_GAP_FACTORS[surroundings].gapFactor };
    const dryArcM = lightning ? lightningArcM(atSite, this.calculation) : switchingArcM(atSite, this.calculation);
    return unitsByArc(criterion, dryArcM, unit, this.calculation);
  }

  private powerFrequency({ situation, unit }: Conditions): number | null {
    const powerFrequencyKvRms = situation.level?.powerFrequencyKv ?? null;
    const altitudeFactor = this.factor(situation, 'power-frequency');
    const strings = wetFlashoverOf(unit);
    if (situation.range !== 1 || powerFrequencyKvRms === null || altitudeFactor === null || strings === null) {
      return null;
    }
    return leastString(strings, wetFlashoverNeeded({ powerFrequencyKvRms, altitudeFactor }))?.units ?? null;
  }

  private count(criterion: Electrical, conditions: Conditions): number | null {
    if (criterion === 'pollution') return this.pollution(conditions);
    return criterion === 'power-frequency' ? this.powerFrequency(conditions) : this.impulse(conditions, criterion);
  }

  /** Takes these criteria anew; the largest count of all, null where none has a figure. */
  take(conditions: Conditions, criteria: readonly Electrical[]): number | null {
    for (const criterion of criteria) this.units[criterion] = this.count(criterion, conditions);
    let most: number | null = null;
    for (const criterion of ELECTRICAL) {
      const units = this.units[criterion];
      if (units !== null && (most === null || units > most)) most = units;
    }
    return most;
  }
}

const sameLevel = (one: SituationLevel, other: SituationLevel | null): boolean =>
  one.lightningKv === other?.lightningKv &&
  one.switchingKv === other.switchingKv &&
  one.powerFrequencyKv === other.powerFrequencyKv &&
  one.holdsToM === other.holdsToM;

/** A criterion that the real count misses: then a step from it has no figure. */
function missingCriterion(demands: readonly Demand[]): string | null {
  const missing = demands.find(
    ({ criterion, applies, whyNot }) =>
      applies && whyNot !== null && criterion !== 'power-frequency' && criterion !== 'minimum',
  );
  return missing === undefined ? null : `The count lacks ${missing.criterion}. ${missing.whyNot}`;
}

const unitsOf = (demands: readonly Demand[], wanted: readonly Criterion[]): number =>
  Math.max(
    ...demands.flatMap(({ criterion, requiredUnits }) =>
      requiredUnits !== null && wanted.includes(criterion) ? [requiredUnits] : [],
    ),
  );

/** The bridge of a string of discs from the rule's count, or why there is none. */
export function bridge(checked: Checked, rule: RuleOfThumbRow | undefined): Bridge {
  const { assessment, situation, settings } = checked;
  const reason = discReason(checked);
  if (reason !== null) return no(reason);
  if (rule === undefined || rule.estimate === null) return no(rule?.why ?? NOTHING_TO_COMPARE);
  if (assessment === null) return no(NOTHING_TO_COMPARE);
  const { given, result, demands } = assessment;
  const { units, extraUnits, unitsBeforeExtra } = result;
  if (units === null || extraUnits === null || unitsBeforeExtra === null) return no(NOTHING_TO_COMPARE);
  const missing = missingCriterion(demands);
  const { surroundings } = given.string;
  if (missing !== null || surroundings === null) return no(missing ?? NOTHING_TO_COMPARE);
  const level = highestLevel(situation, settings.insulationLevels);
  if (level === null) return no('No standard insulation level is held for this voltage to begin from.');

  const northAmerican = situation.basis === 'north-american';
  const conditions: Conditions = {
    situation: { ...situation, altitudeM: 0, altitudeWhyNot: null, earthFault: 'cleared', level },
    pollution: northAmerican ? { contamination: 'very-light', ...LIGHT } : { class: 'b', type: null, ...LIGHT },
    surroundings: 'cross-arm',
    unit: STANDARD_DISC,
  };
  const real = situation;
  const counts = new Counts(given);
  const steps: { cause: BridgeCause; units: number }[] = [];
  let from = rule.estimate;
  const without: BridgeCause[] = [];
  const step = (cause: BridgeCause, count: number | null): void => {
    if (count === null) without.push(cause);
    steps.push({ cause, units: (count ?? from) - from });
    from = count ?? from;
  };

  step('rule-to-method', counts.take(conditions, ELECTRICAL));
  conditions.pollution = given.input.site?.pollution ?? null;
  step('pollution', counts.take(conditions, POLLUTION));
  const sameFault = real.earthFault === 'cleared';
  conditions.situation = { ...conditions.situation, earthFault: real.earthFault };
  step('earth-fault', counts.take(conditions, sameFault ? NONE : POLLUTION));
  conditions.situation = { ...conditions.situation, altitudeM: real.altitudeM, altitudeWhyNot: real.altitudeWhyNot };
  step('altitude', counts.take(conditions, real.altitudeM === 0 ? NONE : ELECTRICAL));
  conditions.situation = { ...conditions.situation, level: real.level };
  step('insulation-level', counts.take(conditions, sameLevel(level, real.level) ? NONE : ON_LEVEL));
  conditions.surroundings = surroundings;
  step('surroundings', counts.take(conditions, surroundings === 'cross-arm' ? NONE : IN_GAPS));
  // A gap between devices is checked as it is: no count cures it, so none changes.
  step('arcing-devices', from);
  step('unit', unitsOf(demands, ELECTRICAL));
  step('minimum', unitsBeforeExtra);
  step('extra-units', unitsBeforeExtra + extraUnits);
  const [first] = without;
  return first === undefined ? { bridge: steps, bridgeWhyNot: null } : no(`The step "${first}" has no figure.`);
}

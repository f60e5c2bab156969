import type { InsulatorUnit, StringFlashover } from '../model';
import type { Situation } from '../situation';
import { STRING_FLASHOVER_254X146 } from '../standards';
import type { Calculation } from '../trace';
import { demand, notApplicable, notAssessed, type Demand } from './demand';
import { wetFlashoverNeeded } from './formulas';
import { isDisc, wetFlashoverOf } from './unit';

const UNIT = 'kV';

/** Shows the row of the string flashover data that decides. */
function noteRow(unit: InsulatorUnit, units: number, wetKvRms: number, calculation: Calculation): void {
  const row = unit.wetFlashover?.length ? undefined : STRING_FLASHOVER_254X146.rows.find((one) => one.units === units);
  const source = row === undefined ? unit.source : calculation.row(STRING_FLASHOVER_254X146, row);
  calculation.note(() => ({
    id: 'string.wet-flashover-row',
    heading: 'Units whose wet flashover reaches it',
    formula: 'n = first row with Uwet >= Uf',
    substitution: `Uwet(${units}) = ${wetKvRms} kV`,
    result: units,
    unit: 'units',
    source,
  }));
}

/** The shortest string whose wet flashover reaches what is needed, kV r.m.s.; null where none of them does. */
export function leastString(strings: readonly StringFlashover[], neededKvRms: number): StringFlashover | null {
  let least: StringFlashover | null = null;
  for (const one of strings) {
    if (one.wetKvRms >= neededKvRms && (least === null || one.units < least.units)) least = one;
  }
  return least;
}

/**
 * Power frequency, wet, range I: 0.910 of the string's wet flashover reaches the level times Ka. Known for units of 254
 * or 255 x 146 mm up to 20, or where the catalogue has the string's own flashover.
 */
export function powerFrequencyDemand(
  { situation, unit, rods }: { situation: Situation; unit: InsulatorUnit; rods: number },
  altitudeFactor: number | null,
  calculation: Calculation,
): Demand {
  if (situation.range === 2) return notApplicable('power-frequency', UNIT);
  if (situation.range === null) return notAssessed('power-frequency', UNIT, situation.highestVoltageWhyNot ?? '');
  const powerFrequencyKvRms = situation.level?.powerFrequencyKv ?? null;
  if (situation.basis === 'north-american' && situation.level !== null && powerFrequencyKvRms === null) {
    return notApplicable('power-frequency', UNIT);
  }
  if (situation.altitudeWhyNot !== null) return notAssessed('power-frequency', UNIT, situation.altitudeWhyNot);
  if (powerFrequencyKvRms === null || altitudeFactor === null) {
    return notAssessed('power-frequency', UNIT, 'The power-frequency level is not filled in.');
  }
  const strings = wetFlashoverOf(unit);
  if (strings === null) {
    return notAssessed('power-frequency', UNIT, 'The wet flashover of complete strings of this unit is not known.');
  }
  const requiredValue = calculation.run(wetFlashoverNeeded, { powerFrequencyKvRms, altitudeFactor });
  const provided = (units: number): number | null => strings.find((one) => one.units === units)?.wetKvRms ?? null;
  const common = {
    criterion: 'power-frequency',
    unit: UNIT,
    requiredValue,
    roundedRequirement: requiredValue,
    provided,
  } as const;
  if (!isDisc(unit)) {
    if (provided(rods) === null) {
      return notAssessed('power-frequency', UNIT, `The wet flashover of ${rods} of these rods in series is not known.`);
    }
    return demand(common);
  }
  const least = leastString(strings, requiredValue);
  if (least === null) {
    const most = Math.max(...strings.map(({ units }) => units));
    return notAssessed(
      'power-frequency',
      UNIT,
      `The wet flashover of strings of more than ${most} units is not known.`,
    );
  }
  noteRow(unit, least.units, least.wetKvRms, calculation);
  return demand({ ...common, requiredUnits: least.units });
}

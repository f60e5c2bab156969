import type { Criterion, CriterionResult, StringResult } from '../model';
import { inFromMm } from '../quantities';
import type { CreepageRequirement } from '../pollution';
import { cite, DEFINITION } from '../sources';
import { voltageSharing } from '../string-voltage';
import type { Calculation } from '../trace';
import type { StringCase } from './assess';
import { coordination } from './coordination';
import { cautionString } from './cautions';
import { criterionResult } from './criterion-result';
import type { Demand } from './demand';
import { extraUnits } from './extra-units';
import { providedCreepage, sectionLength, specificCreepage } from './formulas';
import { lengthLimits } from './length-limits';
import { isDisc, stringDryArcMm } from './unit';
import { unitsOut } from './units-out';

export interface Parts {
  demands: readonly Demand[];
  creepage: CreepageRequirement;
  testLevels: StringResult['testLevels'];
}

/** Count before extra units: the largest of the criteria assessed; none where one lies outside the method. */
function countBeforeExtra({ unit, rods, situation }: StringCase, demands: readonly Demand[]): number | null {
  if (situation.stopped || demands.some(({ stopped }) => stopped)) return null;
  if (!isDisc(unit)) return rods;
  const counts = demands.flatMap(({ requiredUnits }) => (requiredUnits === null ? [] : [requiredUnits]));
  return counts.length === 0 ? null : Math.max(...counts);
}

interface Governing {
  governedBy: Criterion | null;
  tiedWith: Criterion[];
}

/** Discs: the criterion with the largest count. Rods: the one with the least margin. Ties are named in order. */
function governing(disc: boolean, unitsBeforeExtra: number | null, criteria: readonly CriterionResult[]): Governing {
  if (unitsBeforeExtra === null) return { governedBy: null, tiedWith: [] };
  const assessed = criteria.filter(({ state }) => state === 'assessed');
  const named = disc
    ? assessed.filter(({ requiredUnits }) => requiredUnits === unitsBeforeExtra)
    : leastMargin(assessed);
  const [first, ...others] = named.map(({ criterion }) => criterion);
  return { governedBy: first ?? null, tiedWith: others };
}

function leastMargin(assessed: readonly CriterionResult[]): CriterionResult[] {
  const margins = assessed.flatMap((one) => (one.marginPercent === null ? [] : [one.marginPercent]));
  const least = Math.min(...margins);
  return assessed.filter((one) => one.marginPercent === least);
}

function noteCount(
  demands: readonly Demand[],
  { before, extra, units }: { before: number | null; extra: number | null; units: number | null },
  calculation: Calculation,
): void {
  if (before === null || extra === null || units === null) return;
  calculation.note(() => {
    const counts = demands.flatMap(({ criterion, requiredUnits }) =>
      requiredUnits === null ? [] : [`${requiredUnits} (${criterion})`],
    );
    return {
      id: 'string.units',
      heading: 'Units in the string: the largest count, then extra units',
      formula: counts.length === 0 ? 'n = rods in series' : 'n = max(counts) + extra',
      substitution: counts.length === 0 ? `n = ${before}` : `n = max(${counts.join(', ')}) + ${extra}`,
      result: units,
      unit: 'units',
      source: cite(DEFINITION, 'the largest count governs', 'derived'),
    };
  });
}

const CONVENTIONS = {
  uscd: 'on the voltage across the insulator',
  scd1986: 'convention of 1986, on the highest voltage line to line',
} as const;

/** Specific creepage of a length in one convention; null where either figure is not known. */
function specific(
  creepageMm: number | null,
  voltageKvRms: number | null,
  convention: keyof typeof CONVENTIONS,
  of: 'required' | 'provided',
  calculation: Calculation,
): number | null {
  if (creepageMm === null || voltageKvRms === null) return null;
  const heading = `Specific creepage ${of}, ${CONVENTIONS[convention]}`;
  return calculation.run(specificCreepage, { creepageMm, voltageKvRms }, { as: `${convention}-${of}`, heading });
}

/** The string and what it provides. */
export function putTogether(given: StringCase, parts: Parts, calculation: Calculation): StringResult {
  const { string, situation, unit, devices } = given;
  const { demands, creepage, testLevels } = parts;
  const disc = isDisc(unit);
  const unitsBeforeExtra = countBeforeExtra(given, demands);
  const extra = extraUnits(given, calculation);
  const units = unitsBeforeExtra === null || extra === null ? null : unitsBeforeExtra + extra;
  const criteria = demands.map((one) => criterionResult(one, disc, units));
  const byCriterion = (criterion: Criterion): number | null =>
    demands.find((one) => one.criterion === criterion)?.requiredValue ?? null;
  const arcs = [byCriterion('lightning'), byCriterion('switching')].filter((one) => one !== null);
  noteCount(demands, { before: unitsBeforeExtra, extra, units }, calculation);
  const creepageProvidedMm =
    units === null ? null : calculation.run(providedCreepage, { units, creepageMm: unit.creepageMm });
  const dryArcMm = units === null ? null : stringDryArcMm(unit, units);
  const withGap = devices.kind !== null && devices.kind !== 'none' && devices.gapMm !== null;
  const uscdRequired = specific(creepage.requiredMm, creepage.voltageKv, 'uscd', 'required', calculation);
  const uscdProvided = specific(creepageProvidedMm, creepage.voltageKv, 'uscd', 'provided', calculation);
  const { highestVoltageKv } = situation;
  const northAmerican = situation.basis === 'north-american';
  const massKg = units === null || unit.massKg === null ? null : units * unit.massKg;
  const { parallelStrings = null, arrangement } = string;
  const stringsInSet = parallelStrings === null ? null : parallelStrings * (arrangement === 'v-suspension' ? 2 : 1);
  const result: StringResult = {
    units,
    unitsBeforeExtra,
    extraUnits: extra,
    ...governing(disc, unitsBeforeExtra, criteria),
    criteria,
    creepageRequiredMm: creepage.requiredMm,
    creepageProvidedMm,
    creepageVoltageKv: creepage.voltageKv,
    creepageVoltageBasis: creepage.voltageBasis,
    uscdRequiredMmPerKv: uscdRequired,
    uscdProvidedMmPerKv: uscdProvided,
    scd1986RequiredMmPerKvUm: specific(creepage.requiredMm, highestVoltageKv, 'scd1986', 'required', calculation),
    scd1986ProvidedMmPerKvUm: specific(creepageProvidedMm, highestVoltageKv, 'scd1986', 'provided', calculation),
    leakageInPerKvLineToGround: northAmerican && uscdRequired !== null ? inFromMm(uscdRequired) : null,
    leakageProvidedInPerKvLineToGround: northAmerican && uscdProvided !== null ? inFromMm(uscdProvided) : null,
    sectionLengthMm: units === null ? null : calculation.run(sectionLength, { units, spacingMm: unit.spacingMm }),
    dryArcMm,
    dryArcRequiredMm: arcs.length === 0 ? null : Math.max(...arcs),
    dryArcWithDevicesMm: withGap && dryArcMm !== null ? Math.min(devices.gapMm ?? dryArcMm, dryArcMm) : null,
    ...lengthLimits(given, units, calculation),
    massKg,
    massPerSetKg: massKg === null || stringsInSet === null ? null : massKg * stringsInSet,
    unitsOut: disc && units !== null ? unitsOut(demands, units) : [],
    coordination: coordination(given, dryArcMm, calculation),
    testLevels,
    ...voltageSharing({ unit, units, given: given.string.sharing }, calculation),
  };
  cautionString(given, parts, result, calculation);
  return result;
}

import type { Criterion, StringResult } from '../model';
import { checkProfile } from '../profile';
import { isKnown } from '../quantities';
import { infoRings } from '../string-voltage';
import type { Calculation } from '../trace';
import type { StringCase } from './assess';
import { isAssessed } from './demand';
import { countOf, spacingTolerance, unitsByCreepage } from './formulas';
import type { Parts } from './result';
import { arcAllowanceMm, isComposite, isDisc } from './unit';

const NAMES: Record<Criterion, string> = {
  pollution: 'Pollution',
  lightning: 'Lightning',
  switching: 'Switching',
  'power-frequency': 'Power frequency, wet,',
  minimum: 'The minimum',
};

/** A criterion that applies without a figure: to be accepted, or proved by the supplier where a test level stands. */
function cautionNotAssessed(
  given: StringCase,
  { demands, testLevels }: Parts,
  units: number | null,
  calculation: Calculation,
): void {
  const tested: Record<Criterion, boolean> = {
    pollution: false,
    lightning: testLevels.lightningDryKvPeak !== null,
    switching: testLevels.switchingWetKvPeak !== null,
    'power-frequency': testLevels.powerFrequencyWetKvRms !== null,
    minimum: false,
  };
  const anyAssessed = demands.some(isAssessed);
  for (const { criterion, applies, whyNot } of demands) {
    if (!applies || whyNot === null) continue;
    calculation.missing(`string.${criterion}`, whyNot);
    if (units === null || !anyAssessed) continue;
    const proved = tested[criterion];
    const text = `${NAMES[criterion]} was not assessed. ${whyNot}${
      proved ? ' The supplier has to prove this withstand of the complete string.' : ''
    }`;
    calculation.caution(
      `${criterion}-not-assessed`,
      proved ? 'caution' : 'acceptance',
      text,
      fieldOf(criterion, given),
    );
  }
}

/** The input that a criterion misses, or the unit whose data it misses. */
function fieldOf(criterion: Criterion, { situation, string }: StringCase): string {
  if (criterion === 'pollution') return situation.earthFault === null ? 'system.earthFault' : 'site.pollution';
  if (criterion === 'minimum') return 'system.nominalVoltageKv';
  const levels = {
    lightning: situation.level?.lightningKv,
    switching: situation.level?.switchingKv,
    'power-frequency': situation.level?.powerFrequencyKv,
  };
  if (!isKnown(levels[criterion])) return 'system.insulationLevel';
  const bySurroundings = criterion !== 'power-frequency' && !isKnown(string.surroundings);
  return bySurroundings ? 'string.surroundings' : 'string.insulatorCode';
}

function cautionDevices({ devices }: StringCase, { demands }: Parts, calculation: Calculation): void {
  const short = demands.filter(({ gapReaches }) => gapReaches === false);
  if (short.length > 0) {
    const needed = Math.max(...short.map(({ roundedRequirement }) => roundedRequirement ?? 0));
    const text = `The gap of ${devices.gapMm} mm between the arcing devices is below the ${needed} mm that ${short
      .map(({ criterion }) => criterion)
      .join(' and ')} calls for; more units do not cure it.`;
    calculation.caution('arc-gap-short', 'fail', text, 'string.arcGapMm');
  }
  if (devices.kind === 'rings' && devices.gapMm === null) {
    const text = 'Rings shorten the arc path; without their gap the string is checked by its own dry arc only.';
    calculation.caution('rings-without-gap', 'acceptance', text, 'string.arcGapMm');
  }
  if (devices.kind === null) {
    calculation.missing('string.arcingDevices', 'Whether the string carries arcing devices is not filled in.');
  }
}

/** Rods: how much of the requirement is there. */
function cautionRod({ unit }: StringCase, { criteria }: StringResult, calculation: Calculation): void {
  if (isDisc(unit)) return;
  for (const { criterion, verdict, providedValue, requiredValue, unit: figure } of criteria) {
    if (verdict !== 'short' || providedValue === null || requiredValue === null) continue;
    const text = `${NAMES[criterion]} asks for ${requiredValue.toFixed(0)} ${figure}; ${unit.code} has ${providedValue.toFixed(0)} ${figure}.`;
    calculation.caution(`${criterion}-short`, 'fail', text, 'string.insulatorCode');
  }
}

/** At the lower tolerance of their spacing, discs may fall below the dry arc that was counted with. */
function cautionTolerance(
  { unit }: StringCase,
  { demands }: Parts,
  { units }: StringResult,
  calculation: Calculation,
): void {
  if (!isDisc(unit) || units === null) return;
  const shortestMm = units * (unit.spacingMm - spacingTolerance(unit)) + arcAllowanceMm(unit);
  const arcs = demands.filter((one) => one.unit === 'mm' && one.criterion !== 'pollution' && isAssessed(one));
  const short = arcs.filter(({ requiredValue }) => requiredValue !== null && shortestMm < requiredValue);
  if (short.length === 0) return;
  const text = `With every spacing at its lower tolerance the string is ${shortestMm.toFixed(0)} mm, below what ${short
    .map(({ criterion }) => criterion)
    .join(' and ')} calls for; agree a least length with the supplier or add a unit.`;
  calculation.caution('spacing-tolerance', 'caution', text, 'string.insulatorCode');
}

/** A margin within the tolerance of a nominal creepage is none. */
function cautionCreepage({ unit }: StringCase, result: StringResult, calculation: Calculation): void {
  const { creepageProvidedMm, creepageRequiredMm, units } = result;
  if (!unit.creepageIsNominal || creepageProvidedMm === null || creepageRequiredMm === null || units === null) return;
  const toleranceMm = units * (0.04 * unit.creepageMm + 1.5);
  const marginMm = creepageProvidedMm - creepageRequiredMm;
  if (marginMm < 0 || marginMm >= toleranceMm) return;
  const text = `The creepage of ${unit.code} is a nominal figure; the margin of ${marginMm.toFixed(0)} mm lies within its tolerance.`;
  calculation.caution('creepage-tolerance', 'caution', text, 'string.insulatorCode');
}

/** With an earth fault that may stand, the count on the voltage of a sound system stands beside. */
function infoSoundSystem({ unit }: StringCase, { creepage }: Parts, calculation: Calculation): void {
  if (creepage.soundSystemMm === null) return;
  const count = isDisc(unit)
    ? ` or ${countOf({ quotientRatio: unitsByCreepage({ requiredMm: creepage.soundSystemMm, creepageMm: unit.creepageMm }) })} units`
    : '';
  const text = `Creepage is counted on the line-to-line voltage because an earth fault may stand. On the phase-to-earth voltage it would be ${creepage.soundSystemMm.toFixed(0)} mm${count}.`;
  calculation.caution('creepage-on-line-voltage', 'info', text, 'system.earthFault');
}

function infoArrangement({ string, unit, rods }: StringCase, calculation: Calculation): void {
  const { arrangement, parallelStrings, vAngleWindwardDeg, vAngleLeewardDeg, rodsInSeries } = string;
  if (arrangement === 'v-suspension' || (isKnown(parallelStrings) && parallelStrings > 1)) {
    const text =
      'V strings and strings close beside each other need the same count; their pollution withstand may be lower.';
    calculation.caution('strings-side-by-side', 'info', text, 'string.arrangement');
  }
  if (arrangement === 'v-suspension' && !(isKnown(vAngleWindwardDeg) && isKnown(vAngleLeewardDeg))) {
    const text = 'The angles of the V legs are not filled in; whether a leg goes slack cannot be said.';
    calculation.caution('v-angles-missing', 'caution', text, 'string.vAngleWindwardDeg');
  }
  if (unit.kind === 'ceramic-rod' && !isKnown(rodsInSeries)) {
    const text = 'The number of rods in series is not filled in; one rod is checked.';
    calculation.caution('rods-in-series-missing', 'info', text, 'string.rodsInSeries');
  }
  if (unit.kind !== 'ceramic-rod' && isKnown(rodsInSeries) && rodsInSeries > rods) {
    const text = `Rods in series are counted for ceramic long rods only; ${unit.code} stands for one unit.`;
    calculation.caution('rods-in-series-unused', 'info', text, 'string.rodsInSeries');
  }
  if (isComposite(unit)) {
    const text =
      'The reference creepage is taken for composite without correction of the diameter; its ageing under pollution is not judged here.';
    calculation.caution('composite-creepage', 'info', text, 'string.insulatorCode');
  }
  if (unit.withdrawn) {
    calculation.caution(
      'unit-withdrawn',
      'caution',
      `${unit.code} is withdrawn from the catalogue.`,
      'string.insulatorCode',
    );
  }
}

/** All that a reader of the string has to be told. */
export function cautionString(given: StringCase, parts: Parts, result: StringResult, calculation: Calculation): void {
  cautionNotAssessed(given, parts, result.unitsBeforeExtra, calculation);
  cautionDevices(given, parts, calculation);
  cautionRod(given, result, calculation);
  cautionTolerance(given, parts, result, calculation);
  cautionCreepage(given, result, calculation);
  infoSoundSystem(given, parts, calculation);
  infoArrangement(given, calculation);
  const { unit, devices, situation, input } = given;
  const pollution = input.site?.pollution;
  const byClass = situation.basis === 'iec' && isKnown(pollution) && 'class' in pollution;
  checkProfile({ unit, pollutionClass: byClass ? pollution.class : null, string: result }, calculation);
  infoRings({ unit, devices, highestVoltageKv: situation.highestVoltageKv }, calculation);
}

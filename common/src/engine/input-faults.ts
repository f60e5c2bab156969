import type { EvaluationContext, SpecificationInput } from './model';
import { isDisc } from './insulator-string/unit';
import { matchInsulationLevel } from './overvoltage';
import { isKnown, rangeOf } from './quantities';
import { isWithinVoltages, readHighestVoltageKv } from './situation';

/** One fault of one input, in the user's terms: what cannot be read together. */
export interface FieldFault {
  path: string;
  message: string;
}

/** Range II has a switching level, range I has none; on the North American basis it may be left out. */
function levelFaults({ system, basis }: SpecificationInput, { settings }: EvaluationContext): FieldFault[] {
  const level = system?.insulationLevel;
  const givenKv = system?.highestVoltageKv;
  if (!isKnown(level) || !isKnown(givenKv) || !isKnown(basis) || !isWithinVoltages(givenKv)) return [];
  const rangeTwo = rangeOf(readHighestVoltageKv(givenKv)) === 2;
  const switchingPath = 'system.insulationLevel.switchingKv';
  if (!rangeTwo && isKnown(level.switchingKv)) {
    const message = 'Up to 245 kV an insulation level has no switching withstand';
    return [{ path: switchingPath, message }];
  }
  if (rangeTwo && basis === 'iec' && isKnown(level.lightningKv) && !isKnown(level.switchingKv)) {
    return [{ path: switchingPath, message: 'Above 245 kV an insulation level needs its switching withstand' }];
  }
  const match = matchInsulationLevel({
    highestVoltageKv: givenKv,
    basis,
    level,
    companyLevels: settings.insulationLevels,
  });
  return match.found === 'no-row' ? [{ path: 'system.insulationLevel', message: match.text }] : [];
}

function systemFaults({ system }: SpecificationInput): FieldFault[] {
  const faults: FieldFault[] = [];
  const { nominalVoltageKv, highestVoltageKv, neutralEarthing, earthFault } = system ?? {};
  if (isKnown(nominalVoltageKv) && isKnown(highestVoltageKv) && highestVoltageKv < nominalVoltageKv) {
    faults.push({
      path: 'system.highestVoltageKv',
      message: 'The highest voltage must not be below the nominal voltage',
    });
  }
  if (neutralEarthing === 'effective' && earthFault === 'sustained') {
    faults.push({
      path: 'system.earthFault',
      message: 'With an effectively earthed neutral an earth fault is cleared; it cannot stand for hours',
    });
  }
  return faults;
}

function stringFaults({ string }: SpecificationInput, { insulator }: EvaluationContext): FieldFault[] {
  const faults: FieldFault[] = [];
  if (!isKnown(string)) return faults;
  if (isKnown(string.insulatorCode) && string.insulatorCode !== '' && insulator === null) {
    faults.push({
      path: 'string.insulatorCode',
      message: `The catalogue has no insulator unit ${string.insulatorCode}`,
    });
  }
  if (insulator !== null && !isDisc(insulator) && (string.spareUnits ?? 0) > 0) {
    faults.push({ path: 'string.spareUnits', message: 'Extra units are for strings of discs; a rod has none' });
  }
  if (string.arcingDevices === 'horns' && !isKnown(string.arcGapMm)) {
    faults.push({ path: 'string.arcGapMm', message: 'Horns need the gap between them' });
  }
  if (string.arrangement === 'v-suspension') {
    for (const name of ['vAngleWindwardDeg', 'vAngleLeewardDeg'] as const) {
      if (!isKnown(string[name])) faults.push({ path: `string.${name}`, message: 'A V needs the angle of each leg' });
    }
  }
  return faults;
}

/** All that cannot be read: what a schema cannot say because it needs the tables or the context. */
export function inputFaults(input: SpecificationInput, context: EvaluationContext): FieldFault[] {
  return [...systemFaults(input), ...levelFaults(input, context), ...stringFaults(input, context)];
}

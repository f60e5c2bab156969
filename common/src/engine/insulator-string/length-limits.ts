import type { StringResult } from '../model';
import type { Calculation } from '../trace';
import type { StringCase } from './assess';
import { spacingTolerance } from './formulas';
import { isDisc } from './unit';

type Limits = Pick<StringResult, 'stringLengthWithFittingsMinMm' | 'stringLengthWithFittingsMaxMm'>;

const UNKNOWN: Limits = { stringLengthWithFittingsMinMm: null, stringLengthWithFittingsMaxMm: null };

/** Shortest and longest string of discs by the tolerance of their spacing, with fittings (IEC 60305). */
export function lengthLimits({ string, unit }: StringCase, units: number | null, calculation: Calculation): Limits {
  const part = 'string.lengthWithFittings';
  if (units === null) return UNKNOWN;
  if (!isDisc(unit)) {
    calculation.missing(part, 'No tolerance of length is held for rods; take the limits from the drawing of the rod.');
    return UNKNOWN;
  }
  const hardwareMm = string.hardwareLengthMm ?? null;
  if (hardwareMm === null) {
    calculation.missing(part, 'The length of the fittings is not filled in.');
    return UNKNOWN;
  }
  const toleranceMm = calculation.run(spacingTolerance, { spacingMm: unit.spacingMm });
  return {
    stringLengthWithFittingsMinMm: units * (unit.spacingMm - toleranceMm) + hardwareMm,
    stringLengthWithFittingsMaxMm: units * (unit.spacingMm + toleranceMm) + hardwareMm,
  };
}

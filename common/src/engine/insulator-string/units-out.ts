import type { UnitsOutResult } from '../model';
import { providedFor } from './criterion-result';
import { isAssessed, type Demand } from './demand';

const UNITS_OUT = [1, 2] as const;

/** Electrical margin of a damaged string, criterion by criterion; no basis for live work. Discs only. */
export function unitsOut(demands: readonly Demand[], units: number): UnitsOutResult[] {
  const electrical = demands.filter((one) => isAssessed(one) && one.criterion !== 'minimum');
  return UNITS_OUT.filter((out) => out < units).flatMap((out) =>
    electrical.map((one) => {
      const { marginPercent, verdict } = providedFor(one, true, units - out);
      return { unitsOut: out, criterion: one.criterion, marginPercent, verdict };
    }),
  );
}

import type { CriterionResult, Verdict } from '../model';
import { marginPercent, reaches } from '../quantities';
import { isAssessed, type Demand } from './demand';

function verdictOf(one: Demand, disc: boolean, units: number, providedValue: number | null): Verdict {
  if (one.gapReaches === false) return 'short';
  const short = disc
    ? one.requiredUnits !== null && units < one.requiredUnits
    : providedValue !== null && one.roundedRequirement !== null && !reaches(providedValue, one.roundedRequirement);
  if (short) return 'short';
  if (one.providedUnknown) return 'unknown';
  return disc || providedValue !== null ? 'met' : 'unknown';
}

/** One criterion as it is answered, for a string of so many units. */
export function criterionResult(one: Demand, disc: boolean, units: number | null): CriterionResult {
  const { criterion, applies, unit, requiredUnits, requiredValue } = one;
  const assessed = isAssessed(one);
  const state = !applies ? 'not-applicable' : assessed ? 'assessed' : 'not-assessed';
  const common = { criterion, applies, state, requiredUnits, requiredValue, unit } as const;
  if (!assessed || units === null) {
    return { ...common, providedValue: null, marginPercent: null, marginUnits: null, verdict: 'unknown' };
  }
  const along = one.provided(units);
  const providedValue = one.providedUnknown ? null : along;
  return {
    ...common,
    providedValue,
    marginPercent:
      providedValue === null || requiredValue === null ? null : marginPercent(providedValue, requiredValue),
    marginUnits: disc && requiredUnits !== null ? units - requiredUnits : null,
    verdict: verdictOf(one, disc, units, along),
  };
}

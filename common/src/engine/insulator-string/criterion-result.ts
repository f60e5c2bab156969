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

/** What a string of so many units provides for one criterion that was assessed. */
export function providedFor(
  one: Demand,
  disc: boolean,
  units: number,
): Pick<CriterionResult, 'providedValue' | 'marginPercent' | 'verdict'> {
  const along = one.provided(units);
  const providedValue = one.providedUnknown ? null : along;
  const margin =
    providedValue === null || one.requiredValue === null ? null : marginPercent(providedValue, one.requiredValue);
  return { providedValue, marginPercent: margin, verdict: verdictOf(one, disc, units, along) };
}

/** One criterion as it is answered, for a string of so many units. */
export function criterionResult(one: Demand, disc: boolean, units: number | null): CriterionResult {
  const { criterion, applies, unit, requiredUnits, requiredValue } = one;
  const provided = units === null || !isAssessed(one) ? null : providedFor(one, disc, units);
  return {
    criterion,
    applies,
    state: !applies ? 'not-applicable' : one.whyNot === null ? 'assessed' : 'not-assessed',
    requiredUnits,
    requiredValue,
    providedValue: provided === null ? null : provided.providedValue,
    unit,
    marginPercent: provided === null ? null : provided.marginPercent,
    marginUnits: provided !== null && disc && units !== null && requiredUnits !== null ? units - requiredUnits : null,
    verdict: provided === null ? 'unknown' : provided.verdict,
  };
}

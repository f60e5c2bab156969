import type { SpecificationInput } from '../engine/model';

/**
 * Caution where the day has passed by which the pollution class was to be measured again. It depends on today and so is
 * no part of an evaluation, which stays as it was. `today` is YYYY-MM-DD where the line or yard stands.
 */
export function recheckCaution(
  input: SpecificationInput,
  today: string,
): { code: string; field: string | null; text: string } | null {
  const recheckBy = input.site?.pollution?.recheckBy ?? null;
  if (recheckBy === null || recheckBy >= today) return null;
  return {
    code: 'recheck-passed',
    field: 'site.pollution.recheckBy',
    text: `The pollution class was to be measured again by ${recheckBy}; that day has passed.`,
  };
}

import type { FieldError } from '@bellgap/common/api';
import { labelOf, submissionFaults } from '@bellgap/common/schemas';
import { changesBetween } from '../platform/values';
import { canonicalJson } from '../platform/canonical-json';
import type { StoredRevision } from '../specifications/specifications.service';

/** What stands in the way of a submission, each at its field. */
export function submissionBars({ input, overrides, evaluation }: StoredRevision): FieldError[] {
  const open = submissionFaults(input).map(({ path, message }) => ({ path: `input.${path}`, message }));
  const unreasoned = overrides
    .filter(({ reason }) => reason.trim() === '')
    .map(({ path }) => ({
      path: `overrides.${path}`,
      message: `${labelOf(path)}: departs from the design basis; a reason is needed`,
    }));
  const stops = evaluation.cautions
    .filter(({ severity }) => severity === 'stop')
    .map(({ field, text }) => ({ path: field === null ? 'input' : `input.${field}`, message: text }));
  return [...open, ...unreasoned, ...stops];
}

const FIGURES = {
  units: 'units',
  governedBy: 'governing criterion',
  creepageRequiredMm: 'creepage required, mm',
  creepageProvidedMm: 'creepage provided, mm',
} as const;

type Answer = StoredRevision['evaluation'];

/** What the same input would be answered now, where that differs from what is stored; null where it does not. */
export function differenceNow(stored: Answer, now: Answer): string | null {
  if (canonicalJson(stored) === canonicalJson(now)) return null;
  const parts = Object.entries(FIGURES).flatMap(([name, words]) => {
    const key = name as keyof typeof FIGURES;
    return inWords(words, stored.string?.[key] ?? null, now.string?.[key] ?? null);
  });
  const clearance = inWords(
    'clearance to earth, mm',
    stored.clearances?.phaseToEarthMm ?? null,
    now.clearances?.phaseToEarthMm ?? null,
  );
  const edition = inWords('edition of the method', stored.methodEdition, now.methodEdition);
  const named = [...parts, ...clearance, ...edition];
  if (named.length > 0) return named.join('; ');
  const others = Object.keys(changesBetween(stored, now));
  return `${others.length} other ${others.length === 1 ? 'value' : 'values'} of the answer`;
}

function inWords(words: string, before: unknown, after: unknown): string[] {
  const text = (value: unknown) => (value === null ? 'none' : String(value as string | number));
  return before === after ? [] : [`${words}: ${text(before)}, now ${text(after)}`];
}

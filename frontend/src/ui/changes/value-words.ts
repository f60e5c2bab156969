import { trailFieldLabel, inputFieldOf, type TrailChange } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';

/** Choices by the end of the path, where the last name alone would name another list. */
const CHOICES_AT: [end: string, choices: Record<string, string>][] = [
  ['pollution.class', CHOICE_LABELS.pollutionClass],
  ['pollution.type', CHOICE_LABELS.pollutionType],
  ['pollution.basis', CHOICE_LABELS.pollutionBasis],
  ['clearance.method', CHOICE_LABELS.clearanceMethod],
  ['mechanical.basis', CHOICE_LABELS.mechanicalBasis],
  ['cases.kind', CHOICE_LABELS.loadCaseKind],
];

const LONGEST = 160;

/** A value of the trail as it is read: choices in their words, figures with their unit. */
export function trailValueWords(path: string, value: unknown): string {
  if (value === null || value === undefined || value === '') return 'nothing';
  if (typeof value === 'boolean') return value ? CHOICE_LABELS.yesNo.yes : CHOICE_LABELS.yesNo.no;
  if (path === 'sha256' && typeof value === 'string') return value.slice(0, 12);
  const field = inputFieldOf(path) ?? path;
  if (typeof value === 'string') return choiceWords(field, value) ?? cut(value);
  if (typeof value === 'number') {
    const unit = path.startsWith('overrides.') ? undefined : fieldOf(field)?.unit;
    return unit === undefined ? String(value) : `${value} ${unit}`;
  }
  return cut(JSON.stringify(value));
}

/** The whole value, where the words show only its beginning. */
export function wholeValue(value: unknown): string | undefined {
  const text = typeof value === 'string' ? value : JSON.stringify(value);
  return text !== undefined && text.length > 12 ? text : undefined;
}

function choiceWords(field: string, value: string): string | undefined {
  const byEnd = CHOICES_AT.find(([end]) => field.endsWith(end))?.[1];
  const name = field.slice(field.lastIndexOf('.') + 1);
  const choices = byEnd ?? (CHOICE_LABELS as Record<string, Record<string, string>>)[name];
  return choices?.[value];
}

const cut = (text: string): string => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text);

/** Changes as one text, for a copy. */
export function changesText(changes: readonly TrailChange[]): string {
  return changes
    .map(({ path, from, to, hidden }) => {
      const values = hidden ? 'not shown yet' : `${trailValueWords(path, from)} → ${trailValueWords(path, to)}`;
      return `${trailFieldLabel(path)}: ${values}`;
    })
    .join('; ');
}

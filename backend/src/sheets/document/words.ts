import {
  trailFieldLabel,
  type ClearanceRow,
  type Evaluation,
  type SourceReference,
  type SpecificationInput,
} from '@bellgap/common/api';
import { figure } from '@bellgap/common/drawing';
import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import type { SheetContent } from './content';

export const NOT_STATED = 'not stated';
export const UNKNOWN = '–';

/** Binary dust would push an exact figure over the edge of the digit it is rounded at. */
const withoutDust = (value: number): number => Math.round(value * 1e9) / 1e9;
const rounded = (value: number, decimals: number, turn: (value: number) => number): string => {
  const power = 10 ** decimals;
  return figure(turn(withoutDust(value * power)) / power, decimals);
};

/** Requirements go up, what is provided and margins go down. */
export const up = (value: number | null | undefined, decimals = 0): string =>
  value === null || value === undefined ? UNKNOWN : rounded(value, decimals, Math.ceil);
export const down = (value: number | null | undefined, decimals = 0): string =>
  value === null || value === undefined ? UNKNOWN : rounded(value, decimals, Math.floor);
export const near = (value: number | null | undefined, decimals = 0): string =>
  value === null || value === undefined ? UNKNOWN : rounded(value, decimals, Math.round);

/** A figure as it was entered or printed in a table: no digit more, none less. */
export function plain(value: number | null | undefined): string {
  if (value === null || value === undefined) return UNKNOWN;
  const text = String(Number(Math.abs(value).toPrecision(10)));
  const decimals = /^\d+\.(\d+)$/.exec(text)?.[1]?.length ?? 0;
  return /^\d+(\.\d+)?$/.test(text) ? figure(value, decimals) : String(value);
}

/** A computed figure: whole where it is whole, else to one decimal. */
export const short = (value: number | null | undefined): string =>
  near(value, typeof value === 'number' && Number.isInteger(withoutDust(value)) ? 0 : 1);

/** A difference with its sign; nothing has none. */
export const signed = (value: number): string => (value > 0 ? `+${short(value)}` : short(value));

/** A figure with its unit, or the words for a missing one. */
export const withUnit = (text: string, unit: string): string =>
  text === UNKNOWN || unit === '' ? text : `${text} ${unit}`;

/** Some sources have no edition or clause; a dash or "none" then stands in the row. */
const said = (words: string): boolean => words !== '' && words !== '-' && words !== 'none';

export function citation({ document, edition, clause }: SourceReference): string {
  const named = said(edition) ? `${document}:${edition}` : document;
  return said(clause) ? `${named}, ${clause}` : named;
}

export const statusWords = ({ status }: SourceReference): string => CHOICE_LABELS.status[status];

export const sameWords = (one: string, other: string): boolean => one.toLowerCase() === other.toLowerCase();

/** Source and status in one line, each once. */
export function sourceWords(source: SourceReference): string {
  const cited = citation(source);
  const status = statusWords(source);
  return sameWords(cited, status) ? cited : `${cited}; ${status}`;
}

/** Label of a choice; null is said, never left blank. */
export function choice(list: Record<string, string>, value: string | number | null | undefined): string {
  return value === null || value === undefined ? NOT_STATED : (list[String(value)] ?? String(value));
}

export function valueAt(root: unknown, path: string): unknown {
  return path
    .split(/[.[\]]+/)
    .filter(Boolean)
    .reduce<unknown>(
      (value, key) =>
        typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[key] : undefined,
      root,
    );
}

const CHOICES = CHOICE_LABELS as Record<string, Record<string, string>>;
const LIST_OF: Record<string, string> = {
  'site.pollution.class': 'pollutionClass',
  'site.pollution.type': 'pollutionType',
  'site.pollution.basis': 'pollutionBasis',
  'clearance.method': 'clearanceMethod',
  'mechanical.basis': 'mechanicalBasis',
  'mechanical.cases.kind': 'loadCaseKind',
};

const withoutRows = (path: string): string => path.replace(/\[\d+\]/g, '');

/** An input by its label; of a list, with its row: "Wind span, row 2". */
export const fieldWords = (path: string): string => trailFieldLabel(path.replace(/\[(\d+)\]/g, '.$1'));

/** Any input as words with its unit: numbers, choices, and an insulation level as one row. */
export function inputWords(path: string, value: unknown): string {
  if (value === null || value === undefined) return NOT_STATED;
  if (typeof value === 'number') return withUnit(plain(value), fieldOf(path)?.unit ?? '');
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'object') {
    return Object.entries(value)
      .filter(([, part]) => part !== null && part !== undefined)
      .map(([key, part]) => {
        const field = `${path}.${key}`;
        return `${fieldOf(field)?.label ?? key}: ${inputWords(field, part)}`;
      })
      .join('; ');
  }
  const name = LIST_OF[withoutRows(path)] ?? path.split('.').pop() ?? path;
  if (typeof value !== 'string') return NOT_STATED;
  return CHOICES[name]?.[value] ?? value;
}

export const DISTANCE_WORDS: Record<ClearanceRow['distance'], string> = {
  'phase-to-earth': 'Distance from phase to earth',
  'phase-to-phase': 'Distance between phases',
  section: 'Distance to a section',
  safety: 'Safety distance for people',
};

export const STRESS_WORDS: Record<string, string> = {
  lightning: 'lightning',
  switching: 'switching',
  'power-frequency': 'power frequency',
  'fast-front': 'fast front',
  'slow-front': 'slow front',
  ...Object.fromEntries(Object.entries(CHOICE_LABELS.safetyKind).map(([kind, label]) => [kind, label.toLowerCase()])),
};

export const SHAPE_WORDS: Record<string, string> = {
  'rod-structure': 'rod to structure',
  'conductor-structure': 'conductor to structure',
  'rod-conductor': 'rod to conductor',
  'conductor-conductor': 'conductor to conductor',
};

const PARTS_OF_TIME = {
  year: 'numeric',
  month: '2-digit',
  day: '2-digit',
  hour: '2-digit',
  minute: '2-digit',
  hourCycle: 'h23',
} as const;

/** An instant where the line or yard stands: "2026-03-17 02:05". */
export function siteTime(instant: string, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', { timeZone, ...PARTS_OF_TIME }).formatToParts(new Date(instant));
  const part = (type: string): string => parts.find((one) => one.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')} ${part('hour')}:${part('minute')}`;
}

/** The time zone of the site by name, with how far it is from UTC on the day of the sheet. */
export function zoneWords({ project: { siteTimeZone: timeZone }, drawnOn }: SheetContent): string {
  const format = new Intl.DateTimeFormat('en-GB', { timeZone, timeZoneName: 'longOffset' });
  const parts = format.formatToParts(new Date(`${drawnOn}T12:00:00Z`));
  const offset = parts.find(({ type }) => type === 'timeZoneName')?.value.replace('GMT', 'UTC') ?? '';
  return offset === timeZone ? timeZone : `${timeZone} (${offset === 'UTC' ? 'UTC+00:00' : offset})`;
}

/** "1 stop", "2 stops". */
export const counted = (count: number, what: string): string => `${count} ${what}${count === 1 ? '' : 's'}`;

/** "17 units G160-S"; words where no count is known. */
export function answerWords(input: SpecificationInput, evaluation: Evaluation, code: string | null): string {
  const units = evaluation.string?.units;
  if (input.kind === 'bay') return 'Substation bay';
  if (!code) return 'No insulator unit chosen';
  if (units === null || units === undefined) return `${code}: no count`;
  return `${units} ${units === 1 ? 'unit' : 'units'} ${code}`;
}

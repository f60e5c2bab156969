import { fieldOf } from '@bellgap/common/schemas';
import { setIn } from 'formik';
import { sameFigure } from './inheritance';
import type { FormValues } from './form';

type Tree = Record<string, unknown>;
const isTree = (value: unknown): value is Tree => typeof value === 'object' && value !== null && !Array.isArray(value);

/** Paths that are compared and chosen as a whole although they hold parts. */
const WHOLE = ['input.system.insulationLevel'];

function leaves(value: unknown, path: string, into: Map<string, unknown>): Map<string, unknown> {
  if (isTree(value) && !WHOLE.includes(path)) {
    for (const [name, part] of Object.entries(value)) leaves(part, path === '' ? name : `${path}.${name}`, into);
  } else {
    into.set(path, value);
  }
  return into;
}

/** Reasons stand under paths with points in them, so they are told apart by a key of their own. */
function flat({ title, input, reasons }: FormValues): Map<string, unknown> {
  const all = leaves(input, 'input', new Map([['title', title as unknown]]));
  for (const [path, reason] of Object.entries(reasons)) if (reason !== '') all.set(`reasons:${path}`, reason);
  return all;
}

export interface Difference {
  key: string;
  label: string;
  mine: unknown;
  theirs: unknown;
  /** What both began from. */
  before: unknown;
  /** Who changed it since both had the same: both is a true conflict. */
  changedBy: 'me' | 'them' | 'both';
}

function labelOf(key: string): string {
  if (key === 'title') return 'Title';
  if (key.startsWith('reasons:')) return `Reason, ${fieldOf(key.slice(8))?.label ?? key.slice(8)}`;
  const path = key.replace(/^input\./, '');
  return fieldOf(path)?.label ?? path;
}

/** Fields in which two versions of a draft differ, and who moved each away from the version both began with. */
export function differences(mine: FormValues, theirs: FormValues, origin: FormValues): Difference[] {
  const [a, b, o] = [flat(mine), flat(theirs), flat(origin)];
  const keys = new Set([...a.keys(), ...b.keys()]);
  return [...keys]
    .filter((key) => !sameFigure(a.get(key), b.get(key)))
    .map((key) => {
      const mineMoved = !sameFigure(a.get(key), o.get(key));
      const theirsMoved = !sameFigure(b.get(key), o.get(key));
      return {
        key,
        label: labelOf(key),
        mine: a.get(key) ?? null,
        theirs: b.get(key) ?? null,
        before: o.get(key) ?? null,
        changedBy: mineMoved && theirsMoved ? 'both' : mineMoved ? 'me' : 'them',
      };
    });
}

/** Their version with the fields of mine that were chosen. */
export function merged(
  theirs: FormValues,
  differing: readonly Difference[],
  takeMine: ReadonlySet<string>,
): FormValues {
  return differing
    .filter(({ key }) => takeMine.has(key))
    .reduce<FormValues>((values, { key, mine }) => {
      if (key.startsWith('reasons:')) {
        return { ...values, reasons: { ...values.reasons, [key.slice(8)]: (mine as string | null) ?? '' } };
      }
      return setIn(values, key, mine) as FormValues;
    }, theirs);
}

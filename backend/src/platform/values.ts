/** Plain JSON values by dotted path. A blank is one thing, whether it is null, left out, or a part whose figures are all blank. */

export type Json = null | boolean | number | string | Json[] | { [key: string]: Json | undefined };

export function isPart(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

export function valueAt(root: unknown, path: string): unknown {
  let value: unknown = root;
  for (const key of path.split('.')) {
    if (!isPart(value)) return undefined;
    value = value[key];
  }
  return value;
}

/** A copy of the root with one value set; parts on the way are made where they are missing. */
export function withValueAt<T extends object>(root: T, path: string, value: unknown): T {
  const [key, ...rest] = path.split('.') as [string, ...string[]];
  const part = root as Record<string, unknown>;
  if (rest.length === 0) return { ...part, [key]: value } as T;
  const child = part[key];
  return { ...part, [key]: withValueAt(isPart(child) ? child : {}, rest.join('.'), value) } as T;
}

/** The value without its blanks; null where nothing is left. */
export function withoutBlanks(value: unknown): unknown {
  if (value === undefined || value === null) return null;
  if (Array.isArray(value)) return value.length === 0 ? null : value.map(withoutBlanks);
  if (!isPart(value)) return value;
  const entries = Object.entries(value)
    .map(([key, child]) => [key, withoutBlanks(child)] as const)
    .filter(([, child]) => child !== null);
  return entries.length === 0 ? null : Object.fromEntries(entries);
}

export function sameValue(one: unknown, other: unknown): boolean {
  return sameShape(withoutBlanks(one), withoutBlanks(other));
}

function sameShape(one: unknown, other: unknown): boolean {
  if (Object.is(one, other) || one === other) return true;
  if (Array.isArray(one) && Array.isArray(other)) {
    return one.length === other.length && one.every((child, i) => sameShape(child, other[i]));
  }
  if (!isPart(one) || !isPart(other)) return false;
  const keys = Object.keys(one);
  return (
    keys.length === Object.keys(other).length &&
    keys.every((key) => Object.hasOwn(other, key) && sameShape(one[key], other[key]))
  );
}

/** Value before and value after, by path; blanks are null, lists are compared item by item. */
export type Changes = Record<string, { from: unknown; to: unknown }>;

export function changesBetween(before: unknown, after: unknown, path = ''): Changes {
  if (sameValue(before, after)) return {};
  const from = childrenOf(before);
  const to = childrenOf(after);
  if (!from && !to) return { [path]: { from: before ?? null, to: after ?? null } };
  if ((!from && before !== null && before !== undefined) || (!to && after !== null && after !== undefined)) {
    return { [path]: { from: before ?? null, to: after ?? null } };
  }
  const keys = new Set([...Object.keys(from ?? {}), ...Object.keys(to ?? {})]);
  const changes: Changes = {};
  for (const key of keys) {
    Object.assign(changes, changesBetween(from?.[key], to?.[key], path ? `${path}.${key}` : key));
  }
  return changes;
}

function childrenOf(value: unknown): Record<string, unknown> | null {
  if (Array.isArray(value)) return Object.fromEntries(value.map((child, i) => [String(i), child as unknown]));
  return isPart(value) ? value : null;
}

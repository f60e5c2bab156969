import type { DesignBasis } from '@bellgap/common/api';
import type { InheritedPath } from '@bellgap/common/schemas';
import { INHERITED_PATHS } from '@bellgap/common/schemas';
import { getIn } from 'formik';

export type PinnedBasis = Pick<DesignBasis, 'number' | 'revision' | 'basis' | 'system' | 'worksheet'>;

/** Equal as figures of a sheet: absent and null both say "not known". */
export function sameFigure(one: unknown, other: unknown): boolean {
  if (one === null || one === undefined || other === null || other === undefined) {
    return isEmpty(one) && isEmpty(other);
  }
  if (typeof one === 'object' && typeof other === 'object') {
    const names = new Set([...Object.keys(one), ...Object.keys(other)]);
    return [...names].every((name) =>
      sameFigure((one as Record<string, unknown>)[name], (other as Record<string, unknown>)[name]),
    );
  }
  return one === other;
}

function isEmpty(value: unknown): boolean {
  if (value === null || value === undefined) return true;
  return typeof value === 'object' && !Array.isArray(value) && Object.values(value).every(isEmpty);
}

/** The inherited path that a field belongs to; a level and the overvoltages are inherited whole. */
export function inheritedPathOf(path: string): InheritedPath | null {
  return INHERITED_PATHS.find((inherited) => path === inherited || path.startsWith(`${inherited}.`)) ?? null;
}

export function basisValue(path: string, basis: PinnedBasis): unknown {
  return (getIn({ basis: basis.basis, system: basis.system }, path) as unknown) ?? null;
}

export function differsFromBasis(path: string, input: object, basis: PinnedBasis): boolean {
  return !sameFigure(getIn(input, path), basisValue(path, basis));
}

/** Where the altitude up to which the level holds comes from; null where the basis does not say it. */
export function levelHoldsFrom(input: object, basis: PinnedBasis | null): string | null {
  const path = 'system.insulationLevel.levelHoldsToM';
  if (!basis || basisValue(path, basis) === null || differsFromBasis(path, input, basis)) return null;
  const where = `from ${basis.number} revision ${basis.revision}`;
  const workedOutFor = (basis.worksheet?.altitudeM ?? null) === basisValue(path, basis);
  return workedOutFor ? `${where}, whose worksheet is worked out for this altitude` : where;
}

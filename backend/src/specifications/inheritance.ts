import type { DesignBasis, FieldError, SpecificationInput, SpecificationKind } from '@bellgap/common/api';
import type { Caution } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf, INHERITED_PATHS } from '@bellgap/common/schemas';
import type { InheritedPath } from '@bellgap/common/schemas';
import { isPart, sameValue, valueAt, withValueAt } from '../platform/values';

export interface Override {
  path: string;
  reason: string;
}

/** What a specification takes from its design basis, and how it may depart from it. */

export function isInherited(path: string): path is InheritedPath {
  return (INHERITED_PATHS as readonly string[]).includes(path);
}

/** The first input of a draft: what the basis says; everything else is left for the engineer to choose. */
export function inputFromBasis(kind: SpecificationKind, basis: DesignBasis): SpecificationInput {
  const blank: SpecificationInput = { kind, basis: null, system: null, site: null };
  return takeBasisOver(blank, basis, []);
}

/** The input with every inherited value taken from the basis, save those that are overridden. */
export function takeBasisOver(
  input: SpecificationInput,
  basis: DesignBasis,
  overrides: readonly Override[],
): SpecificationInput {
  const kept = new Set(overrides.map(({ path }) => path));
  return INHERITED_PATHS.filter((path) => !kept.has(path)).reduce(
    (taken, path) =>
      valueAt(basis, path) === undefined && valueAt(taken, path) === undefined
        ? taken
        : withValueAt(taken, path, valueAt(basis, path) ?? null),
    input,
  );
}

/** Faults of the overrides themselves, and inherited inputs that differ from the basis without an override. */
export function inheritanceFaults(
  input: SpecificationInput,
  basis: DesignBasis | null,
  overrides: readonly Override[],
): FieldError[] {
  const faults: FieldError[] = [];
  const named = new Set<string>();
  overrides.forEach(({ path }, i) => {
    if (!isInherited(path)) {
      faults.push({ path: `overrides[${i}].path`, message: `${path} is not taken from the design basis` });
    } else if (named.has(path)) {
      faults.push({ path: `overrides[${i}].path`, message: `${labelOf(path)}: overridden twice` });
    }
    named.add(path);
  });
  if (!basis) return faults;
  for (const path of INHERITED_PATHS) {
    if (named.has(path) || sameValue(valueAt(input, path), valueAt(basis, path))) continue;
    faults.push({
      path: `input.${path}`,
      message:
        `${labelOf(path)}: ${inWords(path, valueAt(input, path))} differs from ${inWords(path, valueAt(basis, path))} ` +
        `of the design basis ${basis.number} revision ${basis.revision}; override it with a reason, or take the basis`,
    });
  }
  return faults;
}

/** An override may be saved before its reason is written; it then bars submission, and says so. */
export function overrideCautions(overrides: readonly Override[]): Caution[] {
  return overrides
    .filter(({ reason }) => reason.trim() === '')
    .map(({ path }) => ({
      code: 'override-without-reason',
      severity: 'caution',
      text: `${labelOf(path)} departs from the design basis without a reason; it cannot be submitted for check until one is given`,
      field: path,
    }));
}

function labelOf(path: string): string {
  return fieldOf(path)?.label ?? path;
}

function inWords(path: string, value: unknown): string {
  if (value === null || value === undefined) return 'nothing';
  if (isPart(value)) {
    const parts = Object.entries(value)
      .filter(([, child]) => child !== null && child !== undefined)
      .map(([key, child]) => inWords(`${path}.${key}`, child));
    return parts.length === 0 ? 'nothing' : parts.join(' / ');
  }
  const name = path.split('.').at(-1) ?? path;
  const choices = (CHOICE_LABELS as Record<string, Record<string, string>>)[name];
  const text = String(value as string | number | boolean);
  const unit = fieldOf(path)?.unit;
  return choices?.[text] ?? (unit ? `${text} ${unit}` : text);
}

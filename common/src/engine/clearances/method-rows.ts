import type { ClearanceMethod, ClearanceRow, Severity } from '../model';
import { requiredDistanceMm } from '../quantities';
import type { Calculation } from '../trace';

/** A caution that holds only where its method is the one chosen. */
export interface MethodCaution {
  code: string;
  severity: Severity;
  text: string;
  field: string;
}

/** Rows of one distance by one method; the largest is what the method asks for. */
export interface MethodDistance {
  distance: 'phase-to-earth' | 'phase-to-phase';
  rows: ClearanceRow[];
  /** Why the method has no figure for this distance; null where it has one. */
  whyNot: string | null;
}

export interface MethodAnswer {
  method: ClearanceMethod;
  distances: MethodDistance[];
  /** Rows that inform and never govern. */
  beside: ClearanceRow[];
  /** Parts that the method cannot answer. */
  missing: { part: string; why: string }[];
  cautions: MethodCaution[];
}

/** A method that cannot begin: both distances without figure for one reason. */
export function noAnswer(method: ClearanceMethod, whyNot: string): MethodAnswer {
  const none = (distance: MethodDistance['distance']): MethodDistance => ({ distance, rows: [], whyNot });
  return {
    method,
    distances: [none('phase-to-earth'), none('phase-to-phase')],
    beside: [],
    missing: [],
    cautions: [],
  };
}

/** The words of a distance. */
export const DISTANCE_WORDS = {
  'phase-to-earth': 'phase to earth',
  'phase-to-phase': 'between phases',
  section: 'to a section',
  safety: 'for people',
} as const satisfies Record<ClearanceRow['distance'], string>;

/** Rounds a required distance up to 10 mm and shows that it did. */
export function rounded(
  row: Omit<ClearanceRow, 'valueMm' | 'governs'>,
  unroundedMm: number | null,
  calculation: Calculation,
): ClearanceRow {
  const valueMm = unroundedMm === null ? null : requiredDistanceMm(unroundedMm);
  calculation.note(() => ({
    id: `clearances.row:${row.method}:${row.distance}:${row.stress}${row.shape === null ? '' : `:${row.shape}`}`,
    heading: [`Distance ${DISTANCE_WORDS[row.distance]}`, row.stress, ...(row.shape === null ? [] : [row.shape])].join(
      ', ',
    ),
    formula: 'D, up to the next 10 mm',
    substitution: unroundedMm === null ? 'no figure' : `${Number(unroundedMm.toPrecision(7))} mm`,
    result: valueMm,
    unit: 'mm',
    source: row.source,
  }));
  // Written out: a spread here costs a third of the time of an evaluation.
  return {
    method: row.method,
    distance: row.distance,
    stress: row.stress,
    shape: row.shape,
    withstandKv: row.withstandKv,
    altitudeFactor: row.altitudeFactor,
    h0M: row.h0M,
    exponent: row.exponent,
    valueMm,
    interpolated: row.interpolated,
    withinSource: row.withinSource,
    governs: false,
    source: row.source,
  };
}

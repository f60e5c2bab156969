import type { ClearanceInput, ClearanceRow, ClearancesResult } from '../model';
import type { InsulationLevelRow } from '../overvoltage';
import type { Situation } from '../situation';
import type { Calculation } from '../trace';
import { empiricalMethod } from './en-empirical';
import { tableMethod } from './iec-table';
import { DISTANCE_WORDS, type MethodAnswer, type MethodDistance } from './method-rows';

export { EN_ALTITUDE_LIMIT_M } from './en-empirical';

export interface ClearancesCase {
  situation: Situation;
  /** The level as a row; null where it is not known. */
  level: InsulationLevelRow | null;
  /** Left out altogether: the table method, both shapes. */
  clearance: Partial<ClearanceInput> | null | undefined;
  /** Um as it was given; the line tables print 525 and 765 kV themselves. */
  givenHighestVoltageKv?: number | null;
}

const PART = { 'phase-to-earth': 'clearances.phaseToEarthMm', 'phase-to-phase': 'clearances.phaseToPhaseMm' } as const;

/** The largest row of a distance, with the rows that reach it marked; null where the method has no figure. */
function headline({ distance, rows, whyNot }: MethodDistance, calculation: Calculation): number | null {
  if (whyNot !== null) {
    calculation.missing(PART[distance], whyNot);
    return null;
  }
  const largestMm = Math.max(...rows.map(({ valueMm }) => valueMm ?? 0));
  for (const row of rows) row.governs = row.valueMm === largestMm;
  const governing = rows.find(({ governs }) => governs) as ClearanceRow;
  calculation.note(() => ({
    id: PART[distance],
    heading: `Clearance ${DISTANCE_WORDS[distance]}`,
    formula: 'the largest that applies',
    substitution: rows
      .map(({ stress, shape, valueMm }) => `${[stress, shape].filter((word) => word !== null).join(' ')} ${valueMm} mm`)
      .join('; '),
    result: largestMm,
    unit: 'mm',
    source: governing.source,
  }));
  return largestMm;
}

function headlines(answer: MethodAnswer, calculation: Calculation): Record<MethodDistance['distance'], number | null> {
  for (const { code, severity, text, field } of answer.cautions) calculation.caution(code, severity, text, field);
  for (const { part, why } of answer.missing) calculation.missing(part, why);
  const [earth, phase] = answer.distances.map((distance) => headline(distance, calculation));
  return { 'phase-to-earth': earth ?? null, 'phase-to-phase': phase ?? null };
}

/**
 * Clearances by the method chosen, with the rows of the other method beside them. Distances between phases, to earth, to
 * a section and for safety are four different things; one is never computed from another.
 */
export function assessClearances(
  { situation, level, clearance, givenHighestVoltageKv = null }: ClearancesCase,
  calculation: Calculation,
): ClearancesResult {
  const leftOut = clearance === null || clearance === undefined;
  const method = leftOut ? 'iec-table' : (clearance.method ?? null);
  const shapePhaseToEarth = clearance?.shapePhaseToEarth ?? null;
  const shapePhaseToPhase = clearance?.shapePhaseToPhase ?? null;
  const answers = [
    tableMethod({ situation, level, shapePhaseToEarth, shapePhaseToPhase }, calculation),
    empiricalMethod({ situation, givenHighestVoltageKv }, calculation),
  ];
  const chosen = answers.find((answer) => answer.method === method);
  let found: Record<MethodDistance['distance'], number | null> = { 'phase-to-earth': null, 'phase-to-phase': null };
  if (chosen !== undefined) found = headlines(chosen, calculation);
  else {
    const why = method === null ? 'The clearance method is not chosen.' : 'Not covered by this method edition.';
    calculation.missing('clearances', why);
  }
  const ordered = [...answers].sort((one, other) => Number(other === chosen) - Number(one === chosen));
  return {
    method,
    phaseToEarthMm: found['phase-to-earth'],
    phaseToPhaseMm: found['phase-to-phase'],
    rows: ordered.flatMap(({ distances, beside }) => [...distances.flatMap(({ rows }) => rows), ...beside]),
  };
}

import type { ClearanceInput, ClearanceRow, ClearancesResult, OvervoltagesInput, SpecificationKind } from '../model';
import type { InsulationLevelRow } from '../overvoltage';
import type { Situation } from '../situation';
import type { Calculation } from '../trace';
import { empiricalMethod } from './en-empirical';
import { theoreticalMethod, type StringBeside } from './en-theoretical';
import { tableMethod } from './iec-table';
import { DISTANCE_WORDS, noAnswer, type MethodAnswer, type MethodDistance } from './method-rows';
import { northAmericanMethod } from './north-american';
import { safetyDistances } from './safety';

export { EN_ALTITUDE_LIMIT_M } from './en-empirical';
export type { StringBeside } from './en-theoretical';

export interface ClearancesCase {
  situation: Situation;
  /** The level as a row; null where it is not known. */
  level: InsulationLevelRow | null;
  /** Left out altogether: the table method, both shapes. */
  clearance: Partial<ClearanceInput> | null | undefined;
  /** Um as it was given; the line tables print 525 and 765 kV themselves. */
  givenHighestVoltageKv?: number | null;
  kind?: SpecificationKind | null;
  overvoltages?: Partial<OvervoltagesInput> | null;
  /** The string, from which the fast-front voltage may be taken; null where there is none. */
  beside?: StringBeside | null;
}

const PART = { 'phase-to-earth': 'clearances.phaseToEarthMm', 'phase-to-phase': 'clearances.phaseToPhaseMm' } as const;

const ONLY_NORTH_AMERICAN = 'These distances are for the North American basis only.';

const POWER_FREQUENCY_TO_EARTH = 'clearances.powerFrequencyPhaseToEarth';

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

const answers = (
  { situation, level, clearance, givenHighestVoltageKv = null, kind = null, overvoltages, beside }: ClearancesCase,
  method: ClearancesResult['method'],
  calculation: Calculation,
): [MethodAnswer, ...MethodAnswer[]] => {
  const { shapePhaseToEarth = null, shapePhaseToPhase = null, fastFrontFrom = null, enGap = null } = clearance ?? {};
  const northAmerican = method === 'north-american';
  return [
    tableMethod({ situation, level, shapePhaseToEarth, shapePhaseToPhase }, calculation),
    empiricalMethod({ situation, givenHighestVoltageKv }, calculation),
    theoreticalMethod(
      {
        situation,
        clearance: { fastFrontFrom, enGap },
        overvoltages: overvoltages ?? null,
        beside: beside ?? null,
        chosen: method === 'en-theoretical',
      },
      calculation,
    ),
    // The factor that divides a distance is for the North American basis only.
    ...(northAmerican || situation.basis === 'north-american'
      ? [northAmericanMethod({ situation, kind }, calculation)]
      : []),
  ];
};

/** Where an earth fault may stand, the theoretical method has the power-frequency distance that the table has not. */
function withoutAnswered(chosen: MethodAnswer, all: readonly MethodAnswer[]): MethodAnswer {
  const answered = all
    .flatMap(({ beside }) => beside)
    .some((row) => row.distance === 'phase-to-earth' && row.stress === 'power-frequency' && row.valueMm !== null);
  if (!answered) return chosen;
  return { ...chosen, missing: chosen.missing.filter(({ part }) => part !== POWER_FREQUENCY_TO_EARTH) };
}

/** Why the methods beside the chosen one have no figure; a method that was not even tried says what it is for. */
function besideWhyNot(
  all: readonly MethodAnswer[],
  chosen: MethodAnswer | undefined,
): NonNullable<ClearancesResult['besideWhyNot']> {
  const tried = new Set(all.map(({ method }) => method));
  const untried = tried.has('north-american') ? [] : [noAnswer('north-american', ONLY_NORTH_AMERICAN)];
  return [...all, ...untried]
    .filter((answer) => answer !== chosen)
    .flatMap(({ method, distances }) =>
      distances.flatMap(({ distance, whyNot }) => (whyNot === null ? [] : [{ method, distance, why: whyNot }])),
    );
}

/**
 * Clearances by the method chosen, with the rows of the other methods beside them where their inputs are there.
 * Distances between phases, to earth, to a section and for safety are four different things; one is never computed from
 * another.
 */
export function assessClearances(given: ClearancesCase, calculation: Calculation): ClearancesResult {
  const { situation, clearance } = given;
  const leftOut = clearance === null || clearance === undefined;
  const method = leftOut ? 'iec-table' : (clearance.method ?? null);
  const all = answers(given, method, calculation);
  const chosen = all.find((answer) => answer.method === method);
  let found: Record<MethodDistance['distance'], number | null> = { 'phase-to-earth': null, 'phase-to-phase': null };
  if (chosen !== undefined) found = headlines(withoutAnswered(chosen, all), calculation);
  else calculation.missing('clearances', 'The clearance method is not chosen.');
  const ordered = [...all].sort((one, other) => Number(other === chosen) - Number(one === chosen));
  const safety = safetyDistances({ situation, clearance: clearance ?? {}, table: all[0] }, calculation);
  return {
    method,
    phaseToEarthMm: found['phase-to-earth'],
    phaseToPhaseMm: found['phase-to-phase'],
    rows: [
      ...ordered.flatMap(({ distances, beside }) => [...distances.flatMap(({ rows }) => rows), ...beside]),
      ...safety,
    ],
    besideWhyNot: besideWhyNot(all, chosen),
  };
}

import {
  altitudeFactor,
  creepageAltitudeRule,
  dielectricFactor,
  lineAltitudeFactor,
  LEVEL_ALTITUDE_RULES,
  type AltitudeRule,
} from './atmosphere';
import type { SourceReference, TableConfirmation } from './model';
import { ALTITUDE_LIMITS_M, roundUp } from './quantities';
import { NATIONAL_ALTITUDE_RULES, type NationalAltitudeRow, type TableRow } from './standards';
import { Calculation } from './trace';

/** What a factor for thin air is applied to, and how. */
export const ALTITUDE_ACTIONS = [
  'multiplies-voltage',
  'multiplies-creepage',
  'multiplies-strength',
  'multiplies-distance',
  'divides-distance',
] as const;

/** One source's way with thin air. */
export interface AltitudeConvention {
  id: string;
  title: string;
  action: (typeof ALTITUDE_ACTIONS)[number];
  /** Where the source begins to count. */
  originM: number;
  /** Null where the source names no end. */
  validUpToM: number | null;
  /** As the source itself has it; null beyond its end. */
  sourceFactor: number | null;
  /**
   * What is required here over what is required at 1000 m, up to which the usual levels hold: never below 1, so that
   * sources can be compared. A factor on a voltage and one on a distance are compared as they stand.
   */
  increaseFactor: number | null;
  source: SourceReference;
}

/** A gap of each column of EN 50341-1 Table E.4, kV peak. */
const LINE_COLUMNS: readonly (readonly [id: string, words: string, gapKvPeak: number])[] = [
  ['up-to-200', 'gaps up to 200 kV', 200],
  ['up-to-400', 'gaps of 201 to 400 kV', 400],
  ['up-to-700', 'gaps of 401 to 700 kV', 700],
  ['up-to-1100', 'gaps of 701 to 1100 kV', 1100],
  ['above-1100', 'gaps above 1100 kV', 1200],
];
const EN_END_M = 3000;

const EXPONENTS: readonly (readonly [
  id: string,
  title: string,
  action: AltitudeConvention['action'],
  rule: AltitudeRule,
])[] = [
  [
    'exponent-1',
    'Exponent 1: lightning, power frequency, switching between phases',
    'multiplies-voltage',
    LEVEL_ALTITUDE_RULES.lightning,
  ],
  [
    'exponent-0.9',
    'Exponent 0.9: switching, longitudinal',
    'multiplies-voltage',
    LEVEL_ALTITUDE_RULES['switching-longitudinal'],
  ],
  [
    'exponent-0.75',
    'Exponent 0.75: switching to earth',
    'multiplies-voltage',
    LEVEL_ALTITUDE_RULES['switching-phase-to-earth'],
  ],
  ['exponent-0.5', 'Exponent 0.5: polluted, standard profile', 'multiplies-creepage', creepageAltitudeRule('standard')],
];

function byExponents(altitudeM: number): AltitudeConvention[] {
  const originM = ALTITUDE_LIMITS_M.origin;
  return EXPONENTS.map(([id, title, action, { exponent, source }]) => {
    const factor = altitudeFactor({ altitudeM, originM, altitudeExponent: exponent });
    const validUpToM = ALTITUDE_LIMITS_M.stop;
    return { id, title, action, originM, validUpToM, sourceFactor: factor, increaseFactor: factor, source };
  });
}

function byLineColumns(altitudeM: number, calculation: Calculation): AltitudeConvention[] {
  return LINE_COLUMNS.map(([id, words, gapKvPeak]) => {
    const at = (heightM: number) => lineAltitudeFactor({ altitudeM: heightM, gapKvPeak, use: id }, calculation);
    const { factor, source } = at(altitudeM);
    const { factor: originFactor } = at(ALTITUDE_LIMITS_M.origin);
    const increase = factor === null || originFactor === null ? null : Math.max(originFactor / factor, 1);
    return {
      id: `en-50341-1:${id}`,
      title: `Line gaps, ${words}`,
      action: 'multiplies-strength',
      originM: 0,
      validUpToM: EN_END_M,
      sourceFactor: factor,
      increaseFactor: increase,
      source,
    };
  });
}

/** So many percent for every so many metres above the origin of the rule. */
function regulationFactor(row: NationalAltitudeRow, altitudeM: number): number | null {
  if (row.validUpToM !== null && altitudeM > row.validUpToM) return null;
  const steps = Math.max(altitudeM - row.originM, 0) / row.stepM;
  return 1 + (row.increasePercent / 100) * (row.wholeSteps ? roundUp(steps, 1) : steps);
}

function byRegulation(
  row: TableRow<NationalAltitudeRow>,
  altitudeM: number,
  calculation: Calculation,
): AltitudeConvention {
  const factor = regulationFactor(row, altitudeM);
  const { status } = calculation.row(NATIONAL_ALTITUDE_RULES, row);
  return {
    id: row.rule,
    title: `${row.title}: ${row.increasePercent} % per ${row.stepM} m${row.wholeSteps ? ' or part' : ''}`,
    action: 'multiplies-distance',
    originM: row.originM,
    validUpToM: row.validUpToM,
    sourceFactor: factor,
    increaseFactor: factor,
    source: { document: row.title, edition: '', clause: row.appliesTo, status },
  };
}

function byDielectricFactor(altitudeM: number, calculation: Calculation): AltitudeConvention {
  const { factor, source } = dielectricFactor(altitudeM, calculation);
  return {
    id: 'c37.30',
    title: 'North American practice, next higher altitude printed',
    action: 'divides-distance',
    originM: ALTITUDE_LIMITS_M.origin,
    validUpToM: null,
    sourceFactor: factor,
    increaseFactor: factor === null ? null : 1 / factor,
    source,
  };
}

/**
 * The ways in which the sources reckon with thin air, side by side: they differ by more than a tenth at 2000 m, and no
 * two of them are ever put on one figure. Beyond the end of a source, and above 4500 m, there is no figure.
 *
 * Source: IEC 62271-1, GB/T 16434, EN 50341-1 Table E.4, national regulations that were read, C37.30 (from memory).
 * Example: 2000 m give 1.13 by exponent 1, 1.14 by RD 337/2014, 1.04 to 1.08 by EN 50341-1.
 */
export function altitudeConventions(
  altitudeM: number,
  confirmations: readonly TableConfirmation[] = [],
): AltitudeConvention[] {
  const calculation = new Calculation(false, confirmations);
  const heightM = Math.min(Math.max(altitudeM, 0), ALTITUDE_LIMITS_M.stop);
  const rows = [
    ...byExponents(heightM),
    ...byLineColumns(heightM, calculation),
    ...NATIONAL_ALTITUDE_RULES.rows.map((row) => byRegulation(row, heightM, calculation)),
    byDielectricFactor(heightM, calculation),
  ];
  if (altitudeM <= ALTITUDE_LIMITS_M.stop) return rows;
  return rows.map((row) => ({ ...row, sourceFactor: null, increaseFactor: null }));
}

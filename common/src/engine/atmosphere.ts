import type { InsulatorUnit, SourceReference } from './model';
import { ALTITUDE_LIMITS_M } from './quantities';
import { cite, GB_T_16434, IEC_60071_2, IEC_62271_1, ISO_2533 } from './sources';
import {
  C37_30_ALTITUDE,
  EN_50341_1_ALTITUDE,
  linearBetweenRows,
  nextHigherRow,
  type LineAltitudeRow,
  type TableRow,
} from './standards';
import { formula, type Calculation } from './trace';

/**
 * Thin air. Three kinds of factor, never two on one figure: Ka >= 1 multiplies a required voltage or creepage; ka of
 * EN 50341-1 <= 1 multiplies a strength; the C37.30 factor divides a distance, on the North American basis only.
 */

/**
 * Altitude factor that multiplies a required withstand or creepage.
 *
 * Source: IEC 62271-1:2011 (exponents 1.0, 0.9 and 0.75, origin 1000 m).   Valid: 0 to 4500 m; most sources stop at
 * 2000 m. Example: 2000 m, exponent 1 and origin 1000 m give 1.13.
 */
export const altitudeFactor = formula({
  id: 'atmosphere.altitude-factor',
  heading: 'Altitude factor',
  source: cite(IEC_62271_1, 'altitude correction of external insulation', 'seen'),
  expression: 'Ka = exp(m * max(H - H0, 0) / 8150)',
  symbols: { m: 'altitudeExponent', H: 'altitudeM', H0: 'originM' },
  result: 'altitudeFactor',
  range: { altitudeM: [0, ALTITUDE_LIMITS_M.stop] },
  compute: ({
    altitudeM: H,
    originM: H0,
    altitudeExponent: m,
  }: {
    altitudeM: number;
    originM: number;
    altitudeExponent: number;
  }) => Math.exp((m * Math.max(H - H0, 0)) / 8150),
});

/** What an altitude correction is applied to, with the exponent that belongs to it and where that is from. */
export interface AltitudeRule {
  exponent: number;
  source: SourceReference;
}

const SWITCHGEAR_CLAUSE = 'altitude correction of external insulation';
/** Corrections of a standard level, counted from the altitude up to which the level was proved. */
export const LEVEL_ALTITUDE_RULES = {
  lightning: { exponent: 1, source: cite(IEC_62271_1, SWITCHGEAR_CLAUSE, 'seen') },
  'power-frequency': { exponent: 1, source: cite(IEC_62271_1, SWITCHGEAR_CLAUSE, 'seen') },
  'switching-phase-to-phase': { exponent: 1, source: cite(IEC_62271_1, SWITCHGEAR_CLAUSE, 'seen') },
  'switching-phase-to-earth': { exponent: 0.75, source: cite(IEC_62271_1, SWITCHGEAR_CLAUSE, 'seen') },
  'switching-longitudinal': { exponent: 0.9, source: cite(IEC_62271_1, SWITCHGEAR_CLAUSE, 'seen') },
} as const satisfies Record<string, AltitudeRule>;
export type LevelStress = keyof typeof LEVEL_ALTITUDE_RULES;

const PLAIN_CREEPAGE: AltitudeRule = { exponent: 0.5, source: cite(GB_T_16434, 'annex B', 'seen') };
const FOG_CREEPAGE: AltitudeRule = {
  exponent: 0.8,
  source: cite(IEC_60071_2, 'atmospheric correction of polluted insulators', 'memory'),
};

/**
 * Correction of creepage by profile, counted from the company's origin: 0.5 for standard, open and alternating
 * profiles (GB/T 16434:1996 annex B agrees with IEC 60071-2), 0.8 for fog profiles and where the profile is not known.
 */
export function creepageAltitudeRule(profile: InsulatorUnit['profile']): AltitudeRule {
  return profile === 'fog' || profile === 'unknown' ? FOG_CREEPAGE : PLAIN_CREEPAGE;
}

export interface AltitudeCorrection {
  altitudeM: number;
  originM: number;
  exponent: number;
  /** What is corrected, e.g. "creepage"; tells the lines of the working apart. */
  use: string;
  /** Where `use` is a name of its own and no words. */
  heading?: string;
  source: SourceReference;
}

/** The altitude factor of one use, with its line in the working. */
export function altitudeCorrection(
  { altitudeM, originM, exponent, use, heading = `Altitude factor, ${use}`, source }: AltitudeCorrection,
  calculation: Calculation,
): number {
  const figures = { altitudeM: Math.max(0, altitudeM), originM, altitudeExponent: exponent };
  return calculation.run(altitudeFactor, figures, { as: use, heading, source });
}

/** The altitude factor on a level, counted from the altitude up to which the level holds. */
export function levelAltitudeCorrection(
  {
    altitudeM,
    holdsToM,
    stress,
    use = stress,
  }: { altitudeM: number; holdsToM: number; stress: LevelStress; use?: string },
  calculation: Calculation,
): number {
  return altitudeCorrection({ altitudeM, originM: holdsToM, use, ...LEVEL_ALTITUDE_RULES[stress] }, calculation);
}

// ---- the other two kinds of factor ---------------------------------------------------------------------------------

export interface FactorReading {
  /** Null outside the table: there is no figure. */
  factor: number | null;
  interpolated: boolean;
  source: SourceReference;
}

/**
 * Factor on the strength of external insulation in North American practice; a distance is divided by it. The next
 * higher printed altitude holds; 1 up to 3300 ft.
 */
export function dielectricFactor(altitudeM: number, calculation: Calculation, as?: string): FactorReading {
  const { row } = nextHigherRow(C37_30_ALTITUDE, (one) => one.altitudeM, altitudeM);
  const last = C37_30_ALTITUDE.rows.at(-1) as (typeof C37_30_ALTITUDE.rows)[number];
  const read = row ?? last;
  const source = calculation.row(C37_30_ALTITUDE, read);
  if (row !== null) {
    calculation.note(() => ({
      id: as === undefined ? 'atmosphere.dielectric-factor' : `atmosphere.dielectric-factor:${as}`,
      heading: 'Factor on the strength in thin air',
      formula: 'F(H), next higher altitude printed',
      substitution: `F(${altitudeM} m), row of ${row.altitudeM} m`,
      result: row.dielectricFactor,
      unit: '',
      source,
    }));
  }
  return { factor: row?.dielectricFactor ?? null, interpolated: false, source };
}

/**
 * Upper ends of the columns of EN 50341-1 Table E.4, kV peak withstood by the gap; the last column has none. The print
 * bounds them in whole kilovolts (up to 200, 201 to 400, ...), so the voltage is taken to the kilovolt: 245 kV to earth,
 * 200.04 kV peak, falls in the first column, which gives the printed D50Hz of 0.43 m.
 */
const LINE_COLUMNS: readonly (readonly [upToKv: number, factorOf: (row: TableRow<LineAltitudeRow>) => number])[] = [
  [200, (row) => row.upTo200KvFactor],
  [400, (row) => row.upTo400KvFactor],
  [700, (row) => row.upTo700KvFactor],
  [1100, (row) => row.upTo1100KvFactor],
  [Infinity, (row) => row.above1100KvFactor],
];

/**
 * Factor on the strength of a line gap: EN 50341-1:2001 Table E.4, linear between printed altitudes, column by the
 * voltage of the gap. Origin sea level. Valid to 3000 m; above there is no figure.
 * Example printed in Annex F: 1000 m and 385 kV give 0.946; 1550 kV give 0.978.
 */
export function lineAltitudeFactor(
  { altitudeM, gapKvPeak, use, as = use }: { altitudeM: number; gapKvPeak: number; use: string; as?: string },
  calculation: Calculation,
): FactorReading {
  const [upToKv, factorOf] = LINE_COLUMNS.find(
    ([upTo]) => Math.round(gapKvPeak) <= upTo,
  ) as (typeof LINE_COLUMNS)[number];
  const reading = linearBetweenRows(EN_50341_1_ALTITUDE, {
    by: (row) => row.altitudeM,
    at: Math.max(0, altitudeM),
    value: factorOf,
  });
  const [row = EN_50341_1_ALTITUDE.rows[0] as TableRow<LineAltitudeRow>] = reading.rows;
  const source = calculation.row(EN_50341_1_ALTITUDE, row);
  const interpolated = reading.found === 'interpolated';
  if (reading.value !== null) {
    calculation.note(() => ({
      id: `atmosphere.line-altitude-factor:${as}`,
      heading: `Altitude factor of the strength, ${use}`,
      formula: 'ka(H, U), linear between printed altitudes',
      substitution: `ka(${altitudeM} m, ${Number(gapKvPeak.toPrecision(7))} kV), ${
        upToKv === Infinity ? 'column above 1100 kV' : `column up to ${upToKv} kV`
      }`,
      result: reading.value,
      unit: '',
      source,
    }));
  }
  return { factor: reading.value, interpolated, source };
}

// ---- air density ---------------------------------------------------------------------------------------------------

/**
 * Relative air density.
 *
 * Source: printed in M. S. Naidu, V. Kamaraju, High Voltage Engineering, with 760 mmHg and 20 degrees C.
 * Example 7.3, p. 278: 37 degrees C and 750 mmHg give 0.9327.
 */
export const relativeAirDensity = formula({
  id: 'atmosphere.relative-air-density',
  heading: 'Relative air density',
  source: {
    document: 'M. S. Naidu, V. Kamaraju, High Voltage Engineering',
    edition: '',
    clause: 'example 7.3',
    status: 'seen',
  },
  expression: 'd = p / p0 * (273 + 20) / (273 + t)',
  symbols: { p: 'pressureKpa', p0: 'referencePressureKpa', t: 'temperatureC' },
  result: 'relativeAirDensityRatio',
  range: { temperatureC: [-60, 60] },
  compute: ({
    pressureKpa: p,
    referencePressureKpa: p0,
    temperatureC: t,
  }: {
    pressureKpa: number;
    referencePressureKpa: number;
    temperatureC: number;
  }) => ((p / p0) * (273 + 20)) / (273 + t),
});

/**
 * Air density at an altitude over that at sea level, in the standard atmosphere.
 *
 * Source: ISO 2533:1975, T = 288.15 - 0.0065 H and density exponent 4.25588.   Valid: 0 to 11000 m.
 * Example of printed tables of the standard atmosphere: 1000 m 0.9075, 3000 m 0.7423, 4000 m 0.6689.
 */
export const standardAirDensity = formula({
  id: 'atmosphere.standard-air-density',
  heading: 'Air density of the standard atmosphere over that at sea level',
  source: cite(ISO_2533, 'standard atmosphere up to 11 km', 'seen'),
  expression: 'd = ((288.15 - 0.0065 * H) / 288.15) ^ 4.25588',
  symbols: { H: 'altitudeM' },
  result: 'airDensityRatio',
  range: { altitudeM: [0, 11000] },
  compute: ({ altitudeM: H }: { altitudeM: number }) => ((288.15 - 0.0065 * H) / 288.15) ** 4.25588,
});

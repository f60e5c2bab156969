/**
 * Units, conversions, rounding rules and the limits of the method, in one place. Every number's name ends with its
 * unit; the endings stand here once, and the trace takes the unit it prints from them.
 */

// ---- units by the ending of a name ---------------------------------------------------------------------------------

/** Ending of a name and the unit it stands for; longer endings first, so that "MmPerKv" is not read as "Kv". */
export const UNIT_OF_ENDING: readonly (readonly [ending: string, unit: string])[] = [
  ['MmPerKvUm', 'mm/kV'],
  ['MmPerKv', 'mm/kV'],
  ['InPerKvLineToGround', 'in/kV'],
  ['InPerKv', 'in/kV'],
  ['KgPerM3', 'kg/m³'],
  ['PerKmYear', '1/(km·year)'],
  ['PerYear', '1/year'],
  ['Pu', 'p.u.'],
  ['KvPerM', 'kV/m'],
  ['DensityPerKv', '1/kV'],
  ['NPerM', 'N/m'],
  ['MPerS', 'm/s'],
  ['KvPeak', 'kV peak'],
  ['PeakKv', 'kV peak'],
  ['KvRms', 'kV rms'],
  ['RmsKv', 'kV rms'],
  ['Kv', 'kV'],
  ['Percent', '%'],
  ['Exponent', ''],
  ['Factor', ''],
  ['Ratio', ''],
  ['Probability', ''],
  ['Count', ''],
  ['DegC', '°C'],
  ['Deg', '°'],
  ['Hz', 'Hz'],
  ['Kpa', 'kPa'],
  ['Pa', 'Pa'],
  ['Kn', 'kN'],
  ['Kg', 'kg'],
  ['Ka', 'kA'],
  ['Mm', 'mm'],
  ['In', 'in'],
  ['Ft', 'ft'],
  ['M', 'm'],
  ['N', 'N'],
  ['S', 's'],
  ['C', '°C'],
];

/** The unit that the ending of a name stands for; "units" for counts of insulators, null where no ending is known. */
export function unitOf(name: string): string | null {
  if (/units(Out|BeforeExtra)?$/i.test(name)) return 'units';
  for (const [ending, unit] of UNIT_OF_ENDING) {
    if (name.endsWith(ending) || name === ending.toLowerCase()) return unit;
  }
  return null;
}

// ---- conversions ---------------------------------------------------------------------------------------------------

/** Millimetres in an inch; exact by definition. */
export const MM_PER_IN = 25.4;
/** Metres in a foot; exact by definition. */
export const M_PER_FT = 0.3048;

export const mmFromM = (lengthM: number): number => lengthM * 1000;
export const mFromMm = (lengthMm: number): number => lengthMm / 1000;
export const mmFromIn = (lengthIn: number): number => lengthIn * MM_PER_IN;
export const inFromMm = (lengthMm: number): number => lengthMm / MM_PER_IN;
export const mFromFt = (lengthFt: number): number => lengthFt * M_PER_FT;
export const ftFromM = (lengthM: number): number => lengthM / M_PER_FT;

/** Phase-to-earth voltage, kV r.m.s., of a line-to-line voltage. */
export const phaseToEarthKv = (lineToLineKv: number): number => lineToLineKv / Math.sqrt(3);

// ---- rounding, once, at the end ------------------------------------------------------------------------------------

/** Nine decimals: the dust of binary arithmetic goes, every figure that means anything stays. */
function withoutDust(value: number): number {
  return Math.round(value * 1e9) / 1e9;
}

/**
 * Number of units from a quotient: rounded to nine decimals, then upward, at least one. 15 stays 15, also where the
 * arithmetic gave 15.000000000000002.
 */
export function countUp(quotient: number): number {
  return Math.max(1, Math.ceil(withoutDust(quotient)));
}

export function roundUp(value: number, step: number): number {
  return Math.ceil(withoutDust(value / step)) * step;
}

export function roundDown(value: number, step: number): number {
  return Math.floor(withoutDust(value / step)) * step;
}

/** Step of distances to be built, mm: required distances are rounded up to it. */
export const DISTANCE_STEP_MM = 10;
/** Step of required creepage, mm. */
export const CREEPAGE_STEP_MM = 1;

/** Required distance, mm, upward to 10 mm. */
export const requiredDistanceMm = (distanceMm: number): number => roundUp(distanceMm, DISTANCE_STEP_MM);
/** Required creepage, mm, upward to 1 mm. */
export const requiredCreepageMm = (creepageMm: number): number => roundUp(creepageMm, CREEPAGE_STEP_MM);
/** Provided distance, mm, downward to 10 mm. */
export const providedDistanceMm = (distanceMm: number): number => roundDown(distanceMm, DISTANCE_STEP_MM);
/** Provided creepage, mm, downward to 1 mm. */
export const providedCreepageMm = (creepageMm: number): number => roundDown(creepageMm, CREEPAGE_STEP_MM);

/** Provided against required, percent of the requirement; negative where short. */
export function marginPercent(provided: number, required: number): number {
  return withoutDust((provided / required - 1) * 100);
}

/** True where the provided value reaches the requirement; equal passes, binary dust aside. */
export function reaches(provided: number, required: number): boolean {
  return withoutDust(provided) >= withoutDust(required);
}

// ---- limits of the method ------------------------------------------------------------------------------------------

/** Highest voltages Um that the method covers, line-to-line, kV r.m.s. (IEC 60071-1, lowest and highest row). */
export const HIGHEST_VOLTAGE_LIMITS_KV = { least: 3.6, most: 1200 } as const;
/** Range I ends here, boundary included, Um in kV r.m.s. (IEC 60071-1). */
export const RANGE_ONE_UP_TO_KV = 245;
/** Altitudes, m: "over" excludes the boundary. */
export const ALTITUDE_LIMITS_M = { origin: 1000, caution: 2000, acceptance: 3000, stop: 4500 } as const;
/** Um/Un above this is unusual. */
export const UNUSUAL_VOLTAGE_RATIO = 1.2;

/** Which range of IEC 60071-1 a highest voltage belongs to. */
export function rangeOf(highestVoltageKv: number): 1 | 2 {
  return highestVoltageKv <= RANGE_ONE_UP_TO_KV ? 1 : 2;
}

/** True for a figure that is there; null and undefined are "unknown". */
export function isKnown<T>(value: T | null | undefined): value is T {
  return value !== null && value !== undefined;
}

import { DEVIATION_FACTORS, lineGapFactor, slowFrontDistance, slowFrontWithstand } from '../air-gaps';
import { lineAltitudeFactor } from '../atmosphere';
import type { ClearanceRow, SourceReference, Status } from '../model';
import { ALTITUDE_LIMITS_M, mmFromM } from '../quantities';
import type { Situation } from '../situation';
import { cite, RD_223_2008 } from '../sources';
import {
  EN_50341_1_CLEARANCES,
  leastKnown,
  linearBetweenRows,
  type LineClearanceRow,
  type TableRow,
} from '../standards';
import { figureText, type Calculation } from '../trace';
import { altitudeQuotient, distanceInThinAir, powerFrequencyInThinAir } from './formulas';
import { DISTANCE_WORDS, noAnswer, rounded, type MethodAnswer, type MethodDistance } from './method-rows';

/** Where the altitude factors of EN 50341-1 end, m. */
export const EN_ALTITUDE_LIMIT_M = 3000;
/** No distance to earth below this, m (RD 223/2008 ITC-LAT 07). */
const LEAST_TO_EARTH_M = 0.2;
const LEAST_TO_EARTH: SourceReference = cite(RD_223_2008, '5, distance between live parts and support', 'seen');

export interface EmpiricalMethodInput {
  situation: Situation;
  /** Um as it was given: the table prints 525 and 765 kV themselves. */
  givenHighestVoltageKv: number | null;
}

interface Wanted {
  distance: MethodDistance['distance'];
  stress: 'Del' | 'Dpp' | 'power-frequency';
  valueM: (row: TableRow<LineClearanceRow>) => number | null;
  status: (row: TableRow<LineClearanceRow>) => Status;
  /** Kg that turns a slow-front distance of range II into a voltage; null for power frequency. */
  gapFactor: number | null;
}

const DEL: Wanted = {
  distance: 'phase-to-earth',
  stress: 'Del',
  valueM: (row) => row.delM,
  status: (row) => row.status,
  gapFactor: lineGapFactor('structure'),
};
const DPP: Wanted = {
  distance: 'phase-to-phase',
  stress: 'Dpp',
  valueM: (row) => row.dppM,
  status: (row) => row.status,
  gapFactor: lineGapFactor('phase-to-phase'),
};
const powerFrequency = (distance: MethodDistance['distance'], valueM: Wanted['valueM']): Wanted => ({
  distance,
  stress: 'power-frequency',
  valueM,
  status: (row) => row.statusD50Hz ?? row.status,
  gapFactor: null,
});
const D50HZ_TO_EARTH = powerFrequency('phase-to-earth', (row) => row.d50HzPhaseToEarthM);
const D50HZ_BETWEEN_PHASES = powerFrequency('phase-to-phase', (row) => row.d50HzPhaseToPhaseM);

interface Site {
  altitudeM: number;
  range: 1 | 2;
  highestVoltageKv: number;
  lightningKv: number | null;
}

interface Corrected {
  distanceM: number | null;
  altitudeFactor: number | null;
  /** Voltage by which the column of the altitude factor was chosen, kV peak. */
  gapKv: number | null;
}

/** Strength at 1000 m over strength at the site for a gap of this voltage; null above the source's limit. */
function quotientAt(gapKvPeak: number, altitudeM: number, as: string, calculation: Calculation): number | null {
  const at = (heightM: number, use: string): number | null =>
    lineAltitudeFactor({ altitudeM: heightM, gapKvPeak, use: `${as} at ${use}` }, calculation).factor;
  const originFactor = at(ALTITUDE_LIMITS_M.origin, '1000 m');
  const siteFactor = at(altitudeM, 'the site');
  if (originFactor === null || siteFactor === null) return null;
  return calculation.run(altitudeQuotient, { originFactor, siteFactor }, { as });
}

/** The distance at the site. Up to 1000 m as printed; the printed figures are never reduced. */
function correct(tabulatedM: number, wanted: Wanted, site: Site, calculation: Calculation): Corrected {
  const { altitudeM, range, highestVoltageKv, lightningKv } = site;
  const as = `${wanted.stress} ${DISTANCE_WORDS[wanted.distance]}`;
  if (altitudeM <= ALTITUDE_LIMITS_M.origin) return { distanceM: tabulatedM, altitudeFactor: 1, gapKv: null };
  if (wanted.gapFactor === null) {
    const acrossKv = wanted.distance === 'phase-to-earth' ? highestVoltageKv / Math.sqrt(3) : highestVoltageKv;
    const gapKv = acrossKv * Math.SQRT2;
    const altitudeFactor = quotientAt(gapKv, altitudeM, as, calculation);
    if (altitudeFactor === null) return { distanceM: null, altitudeFactor, gapKv };
    const distanceM = calculation.run(powerFrequencyInThinAir, { tabulatedM, altitudeFactor }, { as });
    return { distanceM, altitudeFactor, gapKv };
  }
  if (range === 1) {
    if (lightningKv === null) return { distanceM: null, altitudeFactor: null, gapKv: null };
    const altitudeFactor = quotientAt(lightningKv, altitudeM, as, calculation);
    if (altitudeFactor === null) return { distanceM: null, altitudeFactor, gapKv: lightningKv };
    const distanceM = calculation.run(distanceInThinAir, { tabulatedM, altitudeFactor }, { as });
    return { distanceM, altitudeFactor, gapKv: lightningKv };
  }
  const gap = { deviationFactor: DEVIATION_FACTORS.slowFront, gapFactor: wanted.gapFactor };
  const gapKv = calculation.run(slowFrontWithstand, { ...gap, distanceM: tabulatedM }, { as });
  const altitudeFactor = quotientAt(gapKv, altitudeM, as, calculation);
  if (altitudeFactor === null) return { distanceM: null, altitudeFactor, gapKv };
  const requiredKvPeak = gapKv * altitudeFactor;
  const distanceM = calculation.run(slowFrontDistance, { ...gap, requiredKvPeak, lineAltitudeFactor: 1 }, { as });
  return { distanceM, altitudeFactor, gapKv };
}

/** One row by the table and its altitude correction; null where the table has nothing to read. */
function readRow(wanted: Wanted, voltageKv: number, site: Site, calculation: Calculation): ClearanceRow | null {
  const reading = linearBetweenRows(EN_50341_1_CLEARANCES, {
    by: (row) => row.highestVoltageKv,
    at: voltageKv,
    value: wanted.valueM,
  });
  if (reading.value === null) return null;
  const interpolated = reading.found === 'interpolated';
  const statuses = reading.rows.map((row) => calculation.row(EN_50341_1_CLEARANCES, row, wanted.status(row)).status);
  const { document, edition, clause } = EN_50341_1_CLEARANCES;
  const printed = { document, edition, clause, status: leastKnown(statuses, interpolated) };
  const as = `${wanted.distance}:${wanted.stress}`;
  const shown = (): string =>
    reading.rows.map((row) => `${row.highestVoltageKv} kV: ${wanted.valueM(row)} m`).join('; ');
  calculation.note(() => ({
    id: `clearances.empirical:${as}`,
    heading: `${clause}, ${wanted.stress}`,
    formula: interpolated ? 'D(Us), linear between rows' : 'D(Us), row as printed',
    substitution: `D(${figureText(voltageKv)} kV); ${shown()}`,
    result: reading.value,
    unit: 'm',
    source: printed,
  }));
  const { distanceM, altitudeFactor, gapKv } = correct(reading.value, wanted, site, calculation);
  const floored = wanted.stress === 'Del' && distanceM !== null && distanceM < LEAST_TO_EARTH_M;
  const corrected = { ...printed, status: leastKnown([printed.status], altitudeFactor !== 1) };
  return rounded(
    {
      method: 'en-empirical',
      distance: wanted.distance,
      stress: wanted.stress,
      shape: null,
      withstandKv: gapKv,
      altitudeFactor,
      h0M: ALTITUDE_LIMITS_M.origin,
      exponent: null,
      interpolated,
      withinSource: distanceM !== null,
      source: floored ? LEAST_TO_EARTH : corrected,
    },
    distanceM === null ? null : mmFromM(floored ? LEAST_TO_EARTH_M : distanceM),
    calculation,
  );
}

function whyNoFigure(row: ClearanceRow | null, voltageKv: number, { altitudeM }: Site): string | null {
  if (row === null) return `EN 50341-1 has no empirical clearance for ${voltageKv} kV line to line.`;
  if (row.valueMm !== null) return null;
  return altitudeM > EN_ALTITUDE_LIMIT_M
    ? `EN 50341-1 has no altitude factor above ${EN_ALTITUDE_LIMIT_M} m.`
    : 'The lightning level, by which the altitude factor is chosen, is not known.';
}

function cautionsOf(del: ClearanceRow | null, whyNot: string | null, { altitudeM }: Site): MethodAnswer['cautions'] {
  if (del === null && whyNot !== null) {
    return [{ code: 'clearance-outside-table', severity: 'stop', text: whyNot, field: 'system.highestVoltageKv' }];
  }
  if (whyNot !== null && altitudeM > EN_ALTITUDE_LIMIT_M) {
    return [{ code: 'clearance-beyond-source', severity: 'stop', text: whyNot, field: 'site.altitudeM' }];
  }
  if (del?.interpolated !== true) return [];
  const text = 'The empirical clearances stand between two voltages of the table; linear between them.';
  return [{ code: 'clearance-interpolated', severity: 'caution', text, field: 'system.highestVoltageKv' }];
}

/**
 * Empirical clearances of EN 50341-1: Del and Dpp by highest voltage, and beside them the power-frequency distances for
 * extreme wind. They hold from 0 to 1000 m and are never reduced; above, the altitude factor of the line method applies.
 */
export function empiricalMethod(
  { situation, givenHighestVoltageKv }: EmpiricalMethodInput,
  calculation: Calculation,
): MethodAnswer {
  const { altitudeM, range } = situation;
  const voltageKv = givenHighestVoltageKv ?? situation.highestVoltageKv;
  if (range === null || voltageKv === null) {
    return noAnswer('en-empirical', situation.highestVoltageWhyNot ?? 'The highest voltage is not known.');
  }
  if (altitudeM === null) return noAnswer('en-empirical', situation.altitudeWhyNot ?? 'The altitude is not known.');
  const site = { altitudeM, range, highestVoltageKv: voltageKv, lightningKv: situation.level?.lightningKv ?? null };
  const del = readRow(DEL, voltageKv, site, calculation);
  const dpp = readRow(DPP, voltageKv, site, calculation);
  const missing: MethodAnswer['missing'] = [];
  const beside: ClearanceRow[] = [];
  if (situation.earthFault === 'cleared') {
    const toEarth = readRow(D50HZ_TO_EARTH, voltageKv, site, calculation);
    if (toEarth !== null) beside.push(toEarth);
  } else {
    const why =
      situation.earthFault === 'sustained'
        ? 'The tabulated power-frequency distance to earth does not hold where an earth fault may stand.'
        : 'Whether an earth fault is cleared or may stand is not filled in.';
    missing.push({ part: 'clearances.powerFrequencyPhaseToEarth', why });
  }
  const betweenPhases = readRow(D50HZ_BETWEEN_PHASES, voltageKv, site, calculation);
  if (betweenPhases !== null) beside.push(betweenPhases);
  const whyNot = whyNoFigure(del, voltageKv, site);
  return {
    method: 'en-empirical',
    distances: [
      { distance: 'phase-to-earth', rows: del === null ? [] : [del], whyNot },
      { distance: 'phase-to-phase', rows: dpp === null ? [] : [dpp], whyNot: whyNoFigure(dpp, voltageKv, site) },
    ],
    beside,
    missing,
    cautions: cautionsOf(del, whyNot, site),
  };
}

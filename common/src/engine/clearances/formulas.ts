import { roundUp } from '../quantities';
import { cite, DEFINITION, EN_50341_1, NESC_1997, RD_337_2014_RAT_12 } from '../sources';
import { formula } from '../trace';

/** The withstand that a gap at the site has to have, referred to standard atmosphere: the voltage is corrected first. */
export const correctedWithstand = formula({
  id: 'clearances.corrected-withstand',
  heading: 'Withstand corrected for altitude',
  source: cite(DEFINITION, 'withstand at the site referred to standard atmosphere', 'derived'),
  expression: 'Uc = U * Ka',
  symbols: { U: 'withstandKvPeak', Ka: 'altitudeFactor' },
  result: 'correctedKvPeak',
  compute: ({ withstandKvPeak: U, altitudeFactor: Ka }: { withstandKvPeak: number; altitudeFactor: number }) => U * Ka,
});

/**
 * How much the factor on the strength falls from 1000 m, up to where the empirical clearances hold, to the site.
 * Source: EN 50341-1:2001 Annex E, Table E.4, the quotient of two of its figures.
 */
export const altitudeQuotient = formula({
  id: 'clearances.altitude-quotient',
  heading: 'Strength at 1000 m over strength at the site',
  source: cite(EN_50341_1, 'Annex E, Table E.4', 'derived'),
  expression: 'q = ka1000 / kaH',
  symbols: { ka1000: 'originFactor', kaH: 'siteFactor' },
  result: 'altitudeFactor',
  compute: ({ originFactor, siteFactor }: { originFactor: number; siteFactor: number }) => originFactor / siteFactor,
});

/** Range I: an empirical distance in thin air. Source: fast-front clearance of EN 50341-1:2001, linear in the voltage. */
export const distanceInThinAir = formula({
  id: 'clearances.distance-in-thin-air',
  heading: 'Distance at the site',
  source: cite(EN_50341_1, 'Annex E, fast-front clearance', 'derived'),
  expression: 'D = D1000 * q',
  symbols: { D1000: 'tabulatedM', q: 'altitudeFactor' },
  result: 'distanceM',
  compute: ({ tabulatedM: D1000, altitudeFactor: q }: { tabulatedM: number; altitudeFactor: number }) => D1000 * q,
});

/**
 * A power-frequency distance in thin air: turned into a voltage by the law of the gap, the voltage corrected, and turned
 * back. Source: power-frequency strength of EN 50341-1:2001 Annex E.
 */
export const powerFrequencyInThinAir = formula({
  id: 'clearances.power-frequency-in-thin-air',
  heading: 'Power-frequency distance at the site',
  source: cite(EN_50341_1, 'Annex E, power-frequency clearance', 'derived'),
  expression: 'D = ((exp(q * ln(1 + 0.55 * D1000 ^ 1.2)) - 1) / 0.55) ^ (1 / 1.2)',
  symbols: { q: 'altitudeFactor', D1000: 'tabulatedM' },
  result: 'distanceM',
  compute: ({ tabulatedM: D1000, altitudeFactor: q }: { tabulatedM: number; altitudeFactor: number }) =>
    ((Math.exp(q * Math.log(1 + 0.55 * D1000 ** 1.2)) - 1) / 0.55) ** (1 / 1.2),
});

// ---- theoretical method --------------------------------------------------------------------------------------------

/**
 * Fast-front withstand (90 %) of a string, by the distance between its ends.
 * Source: EN 50341-1:2001 Annex E, where U90 of the string is not known.
 */
export const stringFastFront = formula({
  id: 'clearances.string-fast-front',
  heading: 'Fast-front withstand of the string',
  source: cite(EN_50341_1, 'Annex E, fast-front voltage of the insulator string', 'seen'),
  expression: 'U90 = Kz * Kff * 530 * d',
  symbols: { Kz: 'deviationFactor', Kff: 'fastFrontGapFactor', d: 'dryArcM' },
  result: 'fastFrontKvPeak',
  range: { dryArcM: [0, 10] },
  compute: ({
    deviationFactor: Kz,
    fastFrontGapFactor: Kff,
    dryArcM: d,
  }: {
    deviationFactor: number;
    fastFrontGapFactor: number;
    dryArcM: number;
  }) => Kz * Kff * 530 * d,
});

/**
 * Fast-front voltage that the gap between phases has to withstand.
 * Source: EN 50341-1:2001 Annex E. Example F.2.1: 385 kV to earth, 462 kV between phases.
 */
export const fastFrontBetweenPhases = formula({
  id: 'clearances.fast-front-between-phases',
  heading: 'Fast-front voltage between phases',
  source: cite(EN_50341_1, 'Annex E, representative fast-front voltage', 'seen'),
  expression: 'U = 1.2 * U90',
  symbols: { U90: 'fastFrontKvPeak' },
  result: 'requiredKvPeak',
  compute: ({ fastFrontKvPeak: U90 }: { fastFrontKvPeak: number }) => 1.2 * U90,
});

/**
 * Slow-front voltage that the gap to earth has to withstand: the overvoltage that 2 % of the events exceed times the
 * statistical co-ordination factor 1.05, a risk of about one in a thousand.
 * Source: EN 50341-1:2001 Annex E. Example F.2.3: 1050 kV give 1103 kV (rounded).
 */
export const slowFrontToEarth = formula({
  id: 'clearances.slow-front-to-earth',
  heading: 'Slow-front voltage to earth',
  source: cite(EN_50341_1, 'Annex E, representative slow-front voltage', 'seen'),
  expression: 'U = 1.05 * Ue2',
  symbols: { Ue2: 'slowFrontKvPeak' },
  result: 'requiredKvPeak',
  compute: ({ slowFrontKvPeak: Ue2 }: { slowFrontKvPeak: number }) => 1.05 * Ue2,
});

/**
 * Slow-front voltage that the gap between phases has to withstand.
 * Source: EN 50341-1:2001 Annex E. Example F.2.3: 1050 kV give 1544 kV (rounded).
 */
export const slowFrontBetweenPhases = formula({
  id: 'clearances.slow-front-between-phases',
  heading: 'Slow-front voltage between phases',
  source: cite(EN_50341_1, 'Annex E, representative slow-front voltage', 'seen'),
  expression: 'U = 1.4 * 1.05 * Ue2',
  symbols: { Ue2: 'slowFrontKvPeak' },
  result: 'requiredKvPeak',
  compute: ({ slowFrontKvPeak: Ue2 }: { slowFrontKvPeak: number }) => 1.4 * 1.05 * Ue2,
});

/** Peak of the power-frequency voltage across a gap; by it the column of the altitude factor is chosen. */
export const powerFrequencyPeak = formula({
  id: 'clearances.power-frequency-peak',
  heading: 'Peak of the power-frequency voltage across the gap',
  source: cite(DEFINITION, 'peak of a sine', 'derived'),
  expression: 'U = sqrt(2) * Us',
  symbols: { Us: 'acrossKvRms' },
  result: 'gapKvPeak',
  compute: ({ acrossKvRms: Us }: { acrossKvRms: number }) => Math.SQRT2 * Us,
});

// ---- North American method -----------------------------------------------------------------------------------------

/** A printed distance where the air is thinner. Source: C37.30, the distance divided by the factor on the strength. */
export const distanceByDielectricFactor = formula({
  id: 'clearances.distance-by-dielectric-factor',
  heading: 'Distance at the site',
  source: cite(DEFINITION, 'distance divided by the factor on the strength', 'derived'),
  expression: 'D = 25.4 * D0 / F',
  symbols: { D0: 'tabulatedIn', F: 'dielectricFactor' },
  result: 'distanceMm',
  compute: ({ tabulatedIn: D0, dielectricFactor: F }: { tabulatedIn: number; dielectricFactor: number }) =>
    (25.4 * D0) / F,
});

/**
 * A printed distance with its adder for every 1,000 ft or part above 3,300 ft.
 * Source: NESC Rule 235 (3 % of the part over 50 kV); its use for Table 235-6 is from memory.
 */
export const distanceWithAdder = formula({
  id: 'clearances.distance-with-adder',
  heading: 'Distance at the site',
  source: cite(NESC_1997, 'Rule 235B1b, altitude, applied to Table 235-6', 'memory'),
  expression: 'D = 25.4 * (D0 + a * max(ceil((h - 3300) / 1000), 0))',
  symbols: { D0: 'tabulatedIn', a: 'adderIn', h: 'altitudeFt' },
  result: 'distanceMm',
  compute: ({
    tabulatedIn: D0,
    adderIn: a,
    altitudeFt: h,
  }: {
    tabulatedIn: number;
    adderIn: number;
    altitudeFt: number;
  }) => 25.4 * (D0 + a * Math.max(roundUp((h - 3300) / 1000, 1), 0)),
});

// ---- safety distances ----------------------------------------------------------------------------------------------

/**
 * Factor on a station distance: 1.4 % for every 100 m or part of them above 1000 m.
 * Source: RD 337/2014 ITC-RAT 12, 3.3.3.   Valid: up to 3000 m. Example: 2000 m give 1.14, 3000 m give 1.28.
 */
export const stationDistanceFactor = formula({
  id: 'clearances.station-distance-factor',
  heading: 'Altitude factor of the distance',
  source: cite(RD_337_2014_RAT_12, '3.3.3', 'seen'),
  expression: 'k = 1 + 0.014 * max(ceil((H - 1000) / 100), 0)',
  symbols: { H: 'altitudeM' },
  result: 'distanceFactor',
  range: { altitudeM: [0, 3000] },
  compute: ({ altitudeM: H }: { altitudeM: number }) => 1 + 0.014 * Math.max(roundUp((H - 1000) / 100, 1), 0),
});

/** A station distance at the site. Source: RD 337/2014 ITC-RAT 12, 3.3.3. */
export const stationDistance = formula({
  id: 'clearances.station-distance',
  heading: 'Distance d at the site',
  source: cite(RD_337_2014_RAT_12, '3.3.3', 'seen'),
  expression: 'd = d1000 * k',
  symbols: { d1000: 'tabulatedMm', k: 'distanceFactor' },
  result: 'distanceMm',
  compute: ({ tabulatedMm, distanceFactor }: { tabulatedMm: number; distanceFactor: number }) =>
    tabulatedMm * distanceFactor,
});

/**
 * A safety distance: the electrical distance with an addition, not below a least figure.
 * Source: RD 337/2014 ITC-RAT 15, 4.1 to 4.3, and IEC 61936-1. Example: d of 2100 mm gives a height of 4600 mm.
 */
export const safetyDistance = formula({
  id: 'clearances.safety-distance',
  heading: 'Safety distance',
  source: cite(DEFINITION, 'electrical distance with an addition', 'derived'),
  expression: 'D = max(N + a, least)',
  symbols: { N: 'electricalMm', a: 'additionMm', least: 'leastMm' },
  result: 'distanceMm',
  compute: ({
    electricalMm: N,
    additionMm: a,
    leastMm,
  }: {
    electricalMm: number;
    additionMm: number;
    leastMm: number;
  }) => Math.max(N + a, leastMm),
});

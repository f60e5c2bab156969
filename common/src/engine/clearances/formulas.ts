import { cite, DEFINITION, EN_50341_1 } from '../sources';
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

import { cite, IEC_60060_1 } from './sources';
import { formula } from './trace';

/**
 * Exponent of the altitude factor of a slow-front withstand to earth, by the parameter g of IEC 60060-1. From memory,
 * not verified: an exponent read off the standard's own curve may be given instead.
 */
const SOURCE = cite(IEC_60060_1, 'atmospheric correction, parameter g', 'memory');

/**
 * Arcing length of a gap of gap factor 1.3 with this 50 % flashover voltage.
 * Source: slow-front law of the gap, K fixed at 1.3.
 */
export const arcingLength = formula({
  id: 'atmosphere.arcing-length',
  heading: 'Least arcing length',
  source: SOURCE,
  expression: 'L = (exp(U50 / (1080 * 1.3)) - 1) / 0.46',
  symbols: { U50: 'fiftyPercentKvPeak' },
  result: 'arcingLengthM',
  compute: ({ fiftyPercentKvPeak: U50 }: { fiftyPercentKvPeak: number }) => (Math.exp(U50 / (1080 * 1.3)) - 1) / 0.46,
});

/** The parameter g at standard density and dry: the mean gradient over 500 kV per metre. */
export const gParameter = formula({
  id: 'atmosphere.g-parameter',
  heading: 'Parameter g',
  source: SOURCE,
  expression: 'g = U50 / (500 * L)',
  symbols: { U50: 'fiftyPercentKvPeak', L: 'arcingLengthM' },
  result: 'gradientRatio',
  compute: ({ fiftyPercentKvPeak: U50, arcingLengthM: L }: { fiftyPercentKvPeak: number; arcingLengthM: number }) =>
    U50 / (500 * L),
});

/**
 * Exponent by g: 0 below 0.2, rising to 1 at 1, 1 up to 1.2, falling to 0 at 2, 0 above.
 * Source: IEC 60060-1, from memory.
 */
export const gExponent = formula({
  id: 'atmosphere.g-exponent',
  heading: 'Altitude exponent by the parameter g',
  source: SOURCE,
  expression: 'm = min(max(g * (g - 0.2) / 0.8, 0), 1, max(2 - g, 0) * max(2.2 - g, 0) / 0.8)',
  symbols: { g: 'gradientRatio' },
  result: 'altitudeExponent',
  compute: ({ gradientRatio: g }: { gradientRatio: number }) =>
    Math.min(Math.max((g * (g - 0.2)) / 0.8, 0), 1, (Math.max(2 - g, 0) * Math.max(2.2 - g, 0)) / 0.8),
});

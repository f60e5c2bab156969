import { cite, TEXTBOOK_NETWORK } from '../sources';
import { formula } from '../trace';

/**
 * String efficiency: the string's voltage over n times the voltage of the line-end unit.
 * Example: three units, c = 0.11: 85.7 % (Mehta, example 8.1).
 */
export const stringEfficiency = formula({
  id: 'string-voltage.efficiency',
  heading: 'String efficiency',
  source: cite(TEXTBOOK_NETWORK, 'string efficiency', 'seen'),
  expression: 'e = 100 / (n * s)',
  symbols: { n: 'units', s: 'lineEndRatio' },
  result: 'efficiencyPercent',
  compute: ({ units: n, lineEndRatio: s }: { units: number; lineEndRatio: number }) => 100 / (n * s),
});

/** Simple form: c from the voltages of the first two units at the tower. Example: 9 and 11 kV give 0.222. */
export const ratioFromFirstTwo = formula({
  id: 'string-voltage.ratio-from-first-two',
  heading: 'Pin-to-earth ratio from the two units at the tower',
  source: cite(TEXTBOOK_NETWORK, 'two measured units', 'derived'),
  expression: 'c = (V2 - V1) / V1',
  symbols: { V1: 'firstKvRms', V2: 'secondKvRms' },
  result: 'pinToEarthRatio',
  compute: ({ firstKvRms: V1, secondKvRms: V2 }: { firstKvRms: number; secondKvRms: number }) => (V2 - V1) / V1,
});

/**
 * Simple form: c from the second and third unit at the tower, the root of V2 c^2 + (3 V2 - V3) c + (V2 - V3) = 0.
 * Valid: V3 over V2 from 1. Example: 15 and 21 kV give 0.2198 (J. B. Gupta, E8).
 */
export const ratioFromSecondAndThird = formula({
  id: 'string-voltage.ratio-from-second-and-third',
  heading: 'Pin-to-earth ratio from the second and third unit at the tower',
  source: cite(TEXTBOOK_NETWORK, 'two measured units', 'derived'),
  expression: 'c = (V3 - 3 * V2 + sqrt((3 * V2 - V3)^2 + 4 * V2 * (V3 - V2))) / (2 * V2)',
  symbols: { V2: 'secondKvRms', V3: 'thirdKvRms' },
  result: 'pinToEarthRatio',
  range: { secondKvRms: [1, 20], thirdKvRms: [20, 40] },
  compute: ({ secondKvRms: V2, thirdKvRms: V3 }: { secondKvRms: number; thirdKvRms: number }) =>
    (V3 - 3 * V2 + Math.sqrt((3 * V2 - V3) ** 2 + 4 * V2 * (V3 - V2))) / (2 * V2),
});

/** Voltage of a string whose line-end unit carries so much. Example: 17.5 kV, three units, c = 1/8: 44.24 kV. */
export const stringVoltageFromLineEnd = formula({
  id: 'string-voltage.from-line-end',
  heading: 'Voltage of the string by its line-end unit',
  source: cite(TEXTBOOK_NETWORK, 'shares along the string', 'derived'),
  expression: 'V = Vn / s',
  symbols: { Vn: 'lineEndKvRms', s: 'lineEndRatio' },
  result: 'stringKvRms',
  compute: ({ lineEndKvRms: Vn, lineEndRatio: s }: { lineEndKvRms: number; lineEndRatio: number }) => Vn / s,
});

/**
 * Static shielding: capacitance from link j, counted from the tower, to the line that makes all units share alike, over
 * the pin-to-earth capacitance. Example: eight units, first link 1/7, last link 7 (J. B. Gupta, E10).
 */
export const shieldingCapacitance = formula({
  id: 'string-voltage.shielding-capacitance',
  heading: 'Capacitance to the line for equal sharing, over pin to earth',
  source: cite(TEXTBOOK_NETWORK, 'static shielding', 'seen'),
  expression: 'x = j / (n - j)',
  symbols: { j: 'linkCount', n: 'units' },
  result: 'toEarthRatio',
  range: { linkCount: [1, 7], units: [8, 20] },
  compute: ({ linkCount: j, units: n }: { linkCount: number; units: number }) => j / (n - j),
});

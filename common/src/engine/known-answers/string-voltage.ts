import {
  equalisingLineRatio,
  ratioFromFirstTwo,
  ratioFromSecondAndThird,
  shieldingCapacitance,
  stringEfficiency,
  stringVoltageFromLineEnd,
  voltageShareRatios,
  type StringNetwork,
} from '../string-voltage';
import type { KnownAnswer } from './known-answer';

/** Shares and efficiency as the books print them: percent, tower end first. */
function string(network: StringNetwork): { shares: number[]; lineEndRatio: number; efficiencyPercent: number } {
  const ratios = voltageShareRatios(network);
  const lineEndRatio = ratios[0] as number;
  return {
    shares: [...ratios].reverse().map((ratio) => ratio * 100),
    lineEndRatio,
    efficiencyPercent: stringEfficiency({ units: network.units, lineEndRatio }),
  };
}

/** Names for a row of figures: "unit1", "unit2". */
const row = (name: string, figures: readonly number[]): Record<string, number> =>
  Object.fromEntries(figures.map((figure, index) => [`${name}${index + 1}`, figure]));

interface Shares {
  source: string;
  title: string;
  network: StringNetwork;
  /** Printed shares, percent, tower end first. */
  shares?: readonly number[];
  efficiencyPercent: number;
  within: number;
  why?: string;
}

const sharesExample = ({ source, title, network, shares, efficiencyPercent, within, why }: Shares): KnownAnswer => ({
  source,
  title,
  computed: () => {
    const found = string(network);
    return { ...(shares ? row('unit', found.shares) : {}), efficiencyPercent: found.efficiencyPercent };
  },
  printed: { ...(shares ? row('unit', shares) : {}), efficiencyPercent },
  within,
  why: why ?? 'half of the last printed digit, or as the book rounds on the way',
});

interface LineVoltage {
  source: string;
  title: string;
  network: StringNetwork;
  lineKv: number;
  unitsKv: readonly number[];
  efficiencyPercent: number;
  within: number;
  efficiencyWithin: number;
}

const lineExample = (given: LineVoltage): KnownAnswer => {
  const { source, title, network, lineKv, unitsKv, efficiencyPercent, within, efficiencyWithin } = given;
  return {
    source,
    title,
    computed: () => {
      const { shares, efficiencyPercent: found } = string(network);
      const acrossKv = lineKv / Math.sqrt(3);
      return {
        ...row(
          'unit',
          shares.map((share) => (share / 100) * acrossKv),
        ),
        efficiencyPercent: found,
      };
    },
    printed: { ...row('unit', unitsKv), efficiencyPercent },
    within: {
      ...row(
        'unit',
        unitsKv.map(() => within),
      ),
      efficiencyPercent: efficiencyWithin,
    },
    why: 'the book rounds the ratios of the units to two decimals on the way',
  };
};

interface UnitLimit {
  source: string;
  title: string;
  network: StringNetwork;
  lineEndKv: number;
  stringKv: number;
  within: number;
  efficiencyPercent: number;
  efficiencyWithin: number;
}

const limitExample = (given: UnitLimit): KnownAnswer => ({
  source: given.source,
  title: given.title,
  computed: () => {
    const { lineEndRatio, efficiencyPercent } = string(given.network);
    return { stringKv: stringVoltageFromLineEnd({ lineEndKvRms: given.lineEndKv, lineEndRatio }), efficiencyPercent };
  },
  printed: { stringKv: given.stringKv, efficiencyPercent: given.efficiencyPercent },
  within: { stringKv: given.within, efficiencyPercent: given.efficiencyWithin },
  why: 'the book rounds the ratio of the line-end unit on the way',
});

const MEHTA = 'V. K. Mehta, R. Mehta, Principles of Power System';
const GUPTA = 'J. B. Gupta, Elements of Power System';
const CHAKRABARTI = 'Chakrabarti, Soni, Gupta, Bhatnagar, A Textbook on Power System Engineering';
const RAY = 'S. Ray, Electrical Power Systems: Concepts, Theory and Practice';
const THERAJA = 'B. L. Theraja, A Textbook of Electrical Technology, vol. III';

export const STRING_VOLTAGE: KnownAnswer[] = [
  lineExample({
    source: `${MEHTA}, example 8.1, p. 171`,
    title: '3 units on 33 kV, c = 0.11',
    network: { units: 3, pinToEarthRatio: 0.11 },
    lineKv: 33,
    unitsKv: [5.52, 6.13, 7.4],
    efficiencyPercent: 85.7,
    within: 0.02,
    efficiencyWithin: 0.1,
  }),
  limitExample({
    source: `${MEHTA}, example 8.3, p. 172; ${CHAKRABARTI}, example 2.4.4`,
    title: '3 units, line-end unit at 17.5 kV, c = 1/8',
    network: { units: 3, pinToEarthRatio: 1 / 8 },
    lineEndKv: 17.5,
    stringKv: 44.24,
    within: 0.02,
    efficiencyPercent: 84.27,
    efficiencyWithin: 0.05,
  }),
  limitExample({
    source: `${MEHTA}, example 8.5, p. 173`,
    title: '3 units, no unit above 15 kV, c = 1/8',
    network: { units: 3, pinToEarthRatio: 1 / 8 },
    lineEndKv: 15,
    stringKv: 37.937,
    within: 0.03,
    efficiencyPercent: 84.3,
    efficiencyWithin: 0.05,
  }),
  lineExample({
    source: `${MEHTA}, example 8.7, p. 175`,
    title: '5 units on 100 kV, c = 0.1',
    network: { units: 5, pinToEarthRatio: 0.1 },
    lineKv: 100,
    unitsKv: [8, 8.8, 10.5, 13.19, 17.3],
    efficiencyPercent: 66.9,
    within: 0.05,
    efficiencyWithin: 0.2,
  }),
  sharesExample({
    source: `${MEHTA}, example 8.9, p. 177`,
    title: '4 units, self capacitance five times pin to earth',
    network: { units: 4, pinToEarthRatio: 0.2 },
    shares: [16, 19.2, 26, 38.5],
    efficiencyPercent: 64.87,
    within: 0.3,
    why: 'the book rounds the shares to whole and half percents',
  }),
  sharesExample({
    source: `${MEHTA}, example 8.11, p. 179; ${CHAKRABARTI}, examples 2.4.3 and 2.4.7`,
    title: 'guard ring: pin to earth 0.2, pin to line 0.1 and 0.3',
    network: { units: 3, pinToEarthRatio: 0.2, pinToLineRatio: [0.1, 0.3] },
    shares: [32.63, 32.42, 34.95],
    efficiencyPercent: 95.38,
    within: 0.05,
  }),
  sharesExample({
    source: `${GUPTA}, example E1, p. 220`,
    title: '5 units, c = 1/6',
    network: { units: 5, pinToEarthRatio: 1 / 6 },
    shares: [11.168, 13.029, 17.062, 23.938, 34.804],
    efficiencyPercent: 57.46,
    within: 0.01,
  }),
  sharesExample({
    source: `${GUPTA}, example E3(i), p. 222`,
    title: '5 units, c = 1/5, dry',
    network: { units: 5, pinToEarthRatio: 0.2 },
    efficiencyPercent: 54.16,
    within: 0.01,
  }),
  limitExample({
    source: `${GUPTA}, example E6, p. 224`,
    title: '4 units, no unit above 12 kV, c = 0.1',
    network: { units: 4, pinToEarthRatio: 0.1 },
    lineEndKv: 12,
    stringKv: 36.78,
    within: 0.01,
    efficiencyPercent: 76.635,
    efficiencyWithin: 0.01,
  }),
  {
    source: `${GUPTA}, example E8, p. 225`,
    title: '4 units, c from the second (15 kV) and third unit (21 kV)',
    computed: () => {
      const pinToEarthRatio = ratioFromSecondAndThird({ secondKvRms: 15, thirdKvRms: 21 });
      const { shares, efficiencyPercent } = string({ units: 4, pinToEarthRatio });
      const stringKv = (15 / (shares[1] as number)) * 100;
      return { pinToEarthRatio, lineKv: stringKv * Math.sqrt(3), efficiencyPercent };
    },
    printed: { pinToEarthRatio: 0.2198, lineKv: 138.4, efficiencyPercent: 63.19 },
    within: { pinToEarthRatio: 0.0001, lineKv: 0.1, efficiencyPercent: 0.1 },
    why: 'the book goes on with c rounded to four decimals',
  },
  {
    source: `${GUPTA}, example E10, p. 229; ${CHAKRABARTI}, example 2.4.5`,
    title: 'static shielding of 8 units, capacitances to the line in pin-to-earth units',
    computed: () =>
      row(
        'link',
        [1, 2, 3, 4, 5, 6, 7].map((linkCount) => shieldingCapacitance({ linkCount, units: 8 })),
      ),
    printed: row('link', [0.143, 0.333, 0.6, 1, 1.667, 3, 7]),
    within: 0.001,
    why: 'printed to 0.001',
  },
  {
    source: `${GUPTA}, example E12; ${CHAKRABARTI}, example 2.4.9, p. 188`,
    title: '3 units on 20 kV, c = 0.2: capacitance to the line that evens the two lower units',
    computed: () => {
      const { pinToLineRatio, lineEndShareRatio } = equalisingLineRatio({ units: 3, pinToEarthRatio: 0.2 });
      return { lineEndKv: 20 * lineEndShareRatio, pinToLineRatio };
    },
    printed: { lineEndKv: 7.06, pinToLineRatio: 0.367 },
    within: 0.005,
    why: 'printed to three digits',
  },
  {
    source: `${RAY}, example 5.6, p. 160`,
    title: '8 units, c = 1/6: shares, and the system voltage with 30 kV on the line-end unit',
    computed: () => {
      const { shares, lineEndRatio } = string({ units: 8, pinToEarthRatio: 1 / 6 });
      const stringKv = stringVoltageFromLineEnd({ lineEndKvRms: 30, lineEndRatio });
      return { ...row('unit', shares), systemKv: stringKv * Math.sqrt(3) };
    },
    printed: { ...row('unit', [3.26, 3.8, 4.98, 6.98, 10.15, 15.01, 22.37, 33.46]), systemKv: 155.29 },
    within: { ...row('unit', new Array<number>(8).fill(0.01)), systemKv: 0.05 },
    why: 'shares printed to 0.01',
  },
  sharesExample({
    source: `${RAY}, example 5.9, p. 164`,
    title: '3 units without guard ring, c = 0.18 (read from the printed ratios 1, 1.18, 1.5724)',
    network: { units: 3, pinToEarthRatio: 0.18 },
    shares: [26.65, 31.45, 41.91],
    efficiencyPercent: 79.54,
    within: 0.02,
  }),
  lineExample({
    source: `${THERAJA}, example 41.49, p. 1659`,
    title: '3 units on 33 kV, c = 1/9',
    network: { units: 3, pinToEarthRatio: 1 / 9 },
    lineKv: 33,
    unitsKv: [5.51, 6.12, 7.42],
    efficiencyPercent: 85.63,
    within: 0.01,
    efficiencyWithin: 0.01,
  }),
  {
    source: `${CHAKRABARTI}, example 2.4.1, p. 183`,
    title: '3 units, c from the two at the tower (9 and 11 kV)',
    computed: () => {
      const pinToEarthRatio = ratioFromFirstTwo({ firstKvRms: 9, secondKvRms: 11 });
      const { shares, efficiencyPercent } = string({ units: 3, pinToEarthRatio });
      const lineKv = (9 / (shares[0] as number)) * 100 * Math.sqrt(3);
      return { pinToEarthRatio, lineKv, efficiencyPercent };
    },
    printed: { pinToEarthRatio: 0.2222, lineKv: 61.39, efficiencyPercent: 76 },
    within: { pinToEarthRatio: 0.0001, lineKv: 0.01, efficiencyPercent: 0.6 },
    why: 'the efficiency is printed in whole percents, rounded down',
  },
];

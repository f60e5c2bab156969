import type { SourceReference } from '../model';
import { cite, EN_50341_1 } from '../sources';
import { formula } from '../trace';

const ANNEX_E = (clause: string): SourceReference => cite(EN_50341_1, `Annex E, ${clause}`, 'seen');

/**
 * Distance that withstands a fast-front voltage.
 *
 * Source: EN 50341-1:2001 Annex E.   Valid: results up to 10 m.
 * Example F.2.1 (90 kV, 1000 m): 385 kV, ka 0.946, Kg 1.25 give 0.75 m; F.2.3 (400 kV): 1550 kV, ka 0.978 give 2.92 m.
 */
export const fastFrontDistance = formula({
  id: 'air-gaps.fast-front-distance',
  heading: 'Distance for the fast-front voltage',
  source: ANNEX_E('fast-front clearance'),
  expression: 'D = U / (530 * ka * Kz * Kff)',
  symbols: { U: 'requiredKvPeak', ka: 'lineAltitudeFactor', Kz: 'deviationFactor', Kff: 'fastFrontGapFactor' },
  result: 'distanceM',
  compute: ({
    requiredKvPeak: U,
    lineAltitudeFactor: ka,
    deviationFactor: Kz,
    fastFrontGapFactor: Kff,
  }: {
    requiredKvPeak: number;
    lineAltitudeFactor: number;
    deviationFactor: number;
    fastFrontGapFactor: number;
  }) => U / (530 * ka * Kz * Kff),
});

/**
 * Distance that withstands a slow-front voltage.
 *
 * Source: EN 50341-1:2001 Annex E.   Valid: results up to 25 m.
 * Example F.2.3 (400 kV, 1000 m): 1.05 x 1050 kV, ka 0.978, Kg 1.25 give 3.20 m; between phases 3.68 m.
 */
export const slowFrontDistance = formula({
  id: 'air-gaps.slow-front-distance',
  heading: 'Distance for the slow-front voltage',
  source: ANNEX_E('slow-front clearance'),
  expression: 'D = (exp(U / (1080 * ka * Kz * K)) - 1) / 0.46',
  symbols: { U: 'requiredKvPeak', ka: 'lineAltitudeFactor', Kz: 'deviationFactor', K: 'gapFactor' },
  result: 'distanceM',
  compute: ({
    requiredKvPeak: U,
    lineAltitudeFactor: ka,
    deviationFactor: Kz,
    gapFactor: K,
  }: {
    requiredKvPeak: number;
    lineAltitudeFactor: number;
    deviationFactor: number;
    gapFactor: number;
  }) => (Math.exp(U / (1080 * ka * Kz * K)) - 1) / 0.46,
});

/**
 * Voltage that a distance withstands: the slow-front clearance turned round, at ka = 1.
 * Source: EN 50341-1:2001 Annex E, turned round.   Valid: up to 25 m.
 */
export const slowFrontWithstand = formula({
  id: 'air-gaps.slow-front-withstand',
  heading: 'Slow-front voltage that the distance withstands',
  source: { ...ANNEX_E('slow-front clearance'), status: 'derived' },
  expression: 'U = 1080 * Kz * K * ln(1 + 0.46 * D)',
  symbols: { Kz: 'deviationFactor', K: 'gapFactor', D: 'distanceM' },
  result: 'withstandKvPeak',
  range: { distanceM: [0, 25] },
  compute: ({
    deviationFactor: Kz,
    gapFactor: K,
    distanceM: D,
  }: {
    deviationFactor: number;
    gapFactor: number;
    distanceM: number;
  }) => 1080 * Kz * K * Math.log(1 + 0.46 * D),
});

/** The constant c of the power-frequency distance: what Us is measured across. */
export const POWER_FREQUENCY_CONSTANTS = { phaseToEarth: 750 * Math.sqrt(3), phaseToPhase: 750 } as const;

/**
 * Distance that withstands the power-frequency voltage, D50Hz.
 *
 * Source: EN 50341-1:2001 Annex E; c is 750 root 3 to earth and 750 between phases, for Us line to line in kV r.m.s.
 * Example F.2.3 (420 kV, 1000 m): ka 0.946, Kg 1.45 give 0.70 m to earth; ka 0.959, Kg 1.60 give 1.17 m between phases.
 */
export const powerFrequencyDistance = formula({
  id: 'air-gaps.power-frequency-distance',
  heading: 'Distance for the power-frequency voltage',
  source: ANNEX_E('power-frequency clearance'),
  expression: 'D = 0.55 ^ (-1 / 1.2) * (exp(Us / (c * ka * Kz * Kpf)) - 1) ^ (1 / 1.2)',
  symbols: {
    Us: 'highestVoltageKv',
    c: 'strengthConstantKv',
    ka: 'lineAltitudeFactor',
    Kz: 'deviationFactor',
    Kpf: 'powerFrequencyGapFactor',
  },
  result: 'distanceM',
  compute: ({
    highestVoltageKv: Us,
    strengthConstantKv: c,
    lineAltitudeFactor: ka,
    deviationFactor: Kz,
    powerFrequencyGapFactor: Kpf,
  }: {
    highestVoltageKv: number;
    strengthConstantKv: number;
    lineAltitudeFactor: number;
    deviationFactor: number;
    powerFrequencyGapFactor: number;
  }) => 0.55 ** (-1 / 1.2) * (Math.exp(Us / (c * ka * Kz * Kpf)) - 1) ** (1 / 1.2),
});

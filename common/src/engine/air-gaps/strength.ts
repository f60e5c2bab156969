import type { SourceReference } from '../model';
import { cite, EN_50341_1 } from '../sources';
import { formula } from '../trace';

/**
 * What an air gap withstands, and how long it has to be. Distances in m, voltages in kV peak. The fast-front law holds
 * for gaps up to 10 m, the slow-front law up to 25 m; beyond there is no figure.
 */
export const GAP_LIMITS_M = { fastFront: 10, slowFront: 25 } as const;

const ANNEX_E = (clause: string): SourceReference => cite(EN_50341_1, `Annex E, ${clause}`, 'seen');

// ---- scatter -------------------------------------------------------------------------------------------------------

/** Coefficient of variation of the flashover voltage and the deviations that the withstand lies below the mean. */
export const SCATTER = {
  fastFront: { variationRatio: 0.03, deviationsCount: 1.3 },
  slowFront: { variationRatio: 0.06, deviationsCount: 1.3 },
  powerFrequency: { variationRatio: 0.03, deviationsCount: 3 },
} as const;

/**
 * Withstand over 50 % flashover voltage.
 *
 * Source: EN 50341-1:2001 Annex E, E.2.2 and Table E.1: 0.961 fast front, 0.922 slow front, 0.910 power frequency.
 */
export const deviationFactor = formula({
  id: 'air-gaps.deviation-factor',
  heading: 'Withstand over 50 % flashover voltage',
  source: ANNEX_E('E.2.2, Table E.1'),
  expression: 'Kz = 1 - N * z',
  symbols: { N: 'deviationsCount', z: 'variationRatio' },
  result: 'deviationFactor',
  compute: ({ deviationsCount: N, variationRatio: z }: { deviationsCount: number; variationRatio: number }) =>
    1 - N * z,
});

/** 0.961, 0.922 and 0.910. */
export const DEVIATION_FACTORS = {
  fastFront: deviationFactor(SCATTER.fastFront),
  slowFront: deviationFactor(SCATTER.slowFront),
  powerFrequency: deviationFactor(SCATTER.powerFrequency),
} as const;

/** 50 % flashover voltage that a required withstand asks for. Source: the deviation factor read backwards. */
export const fiftyPercentVoltage = formula({
  id: 'air-gaps.fifty-percent-voltage',
  heading: '50 % flashover voltage required',
  source: { ...ANNEX_E('E.2.2, Table E.1'), status: 'derived' },
  expression: 'U50 = Uw * Ka / (1 - N * z)',
  symbols: { Uw: 'withstandKvPeak', Ka: 'altitudeFactor', N: 'deviationsCount', z: 'variationRatio' },
  result: 'fiftyPercentKvPeak',
  compute: ({
    withstandKvPeak: Uw,
    altitudeFactor: Ka,
    deviationsCount: N,
    variationRatio: z,
  }: {
    withstandKvPeak: number;
    altitudeFactor: number;
    deviationsCount: number;
    variationRatio: number;
  }) => (Uw * Ka) / (1 - N * z),
});

// ---- strength of a gap ---------------------------------------------------------------------------------------------

/**
 * 50 % fast-front flashover voltage of a gap. Source: EN 50341-1:2001 Annex E.   Valid: up to 10 m.
 */
export const fastFrontStrength = formula({
  id: 'air-gaps.fast-front-strength',
  heading: '50 % fast-front flashover voltage of the gap',
  source: ANNEX_E('fast-front strength'),
  expression: 'U50 = Kff * 530 * d',
  symbols: { Kff: 'fastFrontGapFactor', d: 'distanceM' },
  result: 'fiftyPercentKvPeak',
  range: { distanceM: [0, GAP_LIMITS_M.fastFront] },
  compute: ({ fastFrontGapFactor: Kff, distanceM: d }: { fastFrontGapFactor: number; distanceM: number }) =>
    Kff * 530 * d,
});

/**
 * 50 % slow-front flashover voltage of a gap. Source: EN 50341-1:2001 Annex E.   Valid: up to 25 m.
 */
export const slowFrontStrength = formula({
  id: 'air-gaps.slow-front-strength',
  heading: '50 % slow-front flashover voltage of the gap',
  source: ANNEX_E('slow-front strength'),
  expression: 'U50 = K * 1080 * ln(1 + 0.46 * d)',
  symbols: { K: 'gapFactor', d: 'distanceM' },
  result: 'fiftyPercentKvPeak',
  range: { distanceM: [0, GAP_LIMITS_M.slowFront] },
  compute: ({ gapFactor: K, distanceM: d }: { gapFactor: number; distanceM: number }) =>
    K * 1080 * Math.log(1 + 0.46 * d),
});

/** 50 % power-frequency flashover voltage of a gap, kV peak. Source: EN 50341-1:2001 Annex E, by its printed answers. */
export const powerFrequencyStrength = formula({
  id: 'air-gaps.power-frequency-strength',
  heading: '50 % power-frequency flashover voltage of the gap',
  source: ANNEX_E('power-frequency strength'),
  expression: 'U50 = Kpf * 750 * sqrt(2) * ln(1 + 0.55 * d ^ 1.2)',
  symbols: { Kpf: 'powerFrequencyGapFactor', d: 'distanceM' },
  result: 'fiftyPercentKvPeak',
  compute: ({ powerFrequencyGapFactor: Kpf, distanceM: d }: { powerFrequencyGapFactor: number; distanceM: number }) =>
    Kpf * 750 * Math.SQRT2 * Math.log(1 + 0.55 * d ** 1.2),
});

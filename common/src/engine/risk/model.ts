import type { Caution, TraceLine } from '../model';

export const RISK_FRONTS = ['slow', 'fast'] as const;
export type RiskFront = (typeof RISK_FRONTS)[number];
/** Usual deviation of the strength, percent of U50 (IEC 60071-2, memory). */
export const USUAL_DEVIATION_PERCENT = { slow: 6, fast: 3 } as const satisfies Record<RiskFront, number>;
/** Truncated: no surge above its mean by so many deviations, no flashover below U50 by so many (IEC 60071-2, memory). */
export const TRUNCATED_AT = { stressRatio: 3, strengthRatio: 4 } as const;
/** Where the distributions end: nowhere, or stress and strength cut off where nothing was ever measured. */
export const RISK_TAILS = ['gaussian', 'truncated'] as const;
export type RiskTail = (typeof RISK_TAILS)[number];

/** Most gaps in parallel that a risk is asked for: the towers of a long line, three phases each. */
export const RISK_GAPS_LIMIT = 100_000;

/** Stress and strength of equal gaps; kV peak of the same polarity and between the same parts. */
export interface FlashoverRiskInput {
  front: RiskFront;
  stressMeanKvPeak: number;
  stressDeviationKvPeak: number;
  /** 50 % flashover voltage of one gap. */
  fiftyPercentKvPeak: number;
  /** Deviation of the strength, percent of its 50 % voltage; null takes the usual figure of the front. */
  deviationPercent: number | null;
  /** Gaps in parallel that see the same surge. */
  gapCount: number;
}

export interface FlashoverRiskByTail {
  tail: RiskTail;
  singleGapProbability: number;
  gapsProbability: number;
  /** Per operation, positive polarity alone; null for fast fronts, which have no such rate. */
  switchingFlashoverProbability: number | null;
}

/** One voltage of the chart of stress and strength. */
export interface StressStrengthPoint {
  voltageKvPeak: number;
  stressDensityPerKv: number;
  singleGapProbability: number;
  gapsProbability: number;
  /** Stress times strength of the gaps: its area is the risk. */
  riskDensityPerKv: number;
}

export interface FlashoverRisk {
  methodEdition: string;
  deviationPercent: number;
  strengthDeviationKvPeak: number;
  byTail: FlashoverRiskByTail[];
  /** Brown's estimate of the switching-surge flashover rate; null for fast fronts. */
  estimatedProbability: number | null;
  chart: StressStrengthPoint[];
  cautions: Caution[];
  trace: TraceLine[];
}

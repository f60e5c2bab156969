import type { TraceLine } from '../model';

export const RISK_FRONTS = ['slow', 'fast'] as const;
/** Where the distributions end: nowhere, or stress and strength cut off where nothing was ever measured. */
export const RISK_TAILS = ['gaussian', 'truncated'] as const;
export type RiskTail = (typeof RISK_TAILS)[number];

/** Stress and strength of equal gaps; kV peak of the same polarity and between the same parts. */
export interface FlashoverRiskInput {
  front: (typeof RISK_FRONTS)[number];
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
  trace: TraceLine[];
}

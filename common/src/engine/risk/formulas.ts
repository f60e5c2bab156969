import { cite, IEC_60071_2, SWITCHING_SURGE_RATE } from '../sources';
import { formula } from '../trace';
import { RISK_GAPS_LIMIT } from './model';
import { normalProbability } from './normal';

/** Deviation of a strength that is given as share of its 50 % voltage. */
export const strengthDeviation = formula({
  id: 'risk.strength-deviation',
  heading: 'Deviation of the strength',
  source: cite(IEC_60071_2, 'scatter of self-restoring insulation', 'memory'),
  expression: 'sf = s * U50 / 100',
  symbols: { s: 'deviationPercent', U50: 'fiftyPercentKvPeak' },
  result: 'strengthDeviationKvPeak',
  compute: ({
    deviationPercent: s,
    fiftyPercentKvPeak: U50,
  }: {
    deviationPercent: number;
    fiftyPercentKvPeak: number;
  }) => (s * U50) / 100,
});

/**
 * Risk of flashover of one gap, stress and strength both Gaussian without an end: the closed form of the risk integral.
 * Phi is the normal distribution. Example: 2.0 and 0.25 p.u. against 3.0 p.u. and 6 %: 0.000585.
 */
export const singleGapRisk = formula({
  id: 'risk.single-gap',
  heading: 'Risk of flashover of one gap',
  source: cite(IEC_60071_2, 'risk of failure, closed form of two Gaussian distributions', 'memory'),
  expression: 'R = Phi((mu - U50) / sqrt(ss^2 + sf^2))',
  symbols: {
    mu: 'stressMeanKvPeak',
    U50: 'fiftyPercentKvPeak',
    ss: 'stressDeviationKvPeak',
    sf: 'strengthDeviationKvPeak',
  },
  result: 'flashoverProbability',
  compute: ({
    stressMeanKvPeak: mu,
    fiftyPercentKvPeak: U50,
    stressDeviationKvPeak: ss,
    strengthDeviationKvPeak: sf,
  }: {
    stressMeanKvPeak: number;
    fiftyPercentKvPeak: number;
    stressDeviationKvPeak: number;
    strengthDeviationKvPeak: number;
  }) => normalProbability((mu - U50) / Math.hypot(ss, sf)),
});

/** Probability that at least one of n equal gaps under the same stress flashes over. Example: 0.01 and 200 gaps: 0.866. */
export const gapsInParallel = formula({
  id: 'risk.gaps-in-parallel',
  heading: 'Flashover of at least one of n gaps',
  source: cite(IEC_60071_2, 'insulations in parallel', 'memory'),
  expression: 'Pn = 1 - (1 - P)^n',
  symbols: { P: 'singleGapProbability', n: 'gapCount' },
  result: 'gapsProbability',
  range: { singleGapProbability: [0, 1], gapCount: [1, RISK_GAPS_LIMIT] },
  compute: ({ singleGapProbability: P, gapCount: n }: { singleGapProbability: number; gapCount: number }) =>
    -Math.expm1(n * Math.log1p(-P)),
});

/** Probability of one gap at which n of them flash over in half of all cases. */
export const halfOfGaps = formula({
  id: 'risk.half-of-gaps',
  heading: 'Probability of one gap at which one of n flashes over in half of all cases',
  source: cite(SWITCHING_SURGE_RATE, 'estimate by a step', 'memory'),
  expression: 'P = 1 - 0.5^(1 / n)',
  symbols: { n: 'gapCount' },
  result: 'singleGapProbability',
  range: { gapCount: [1, RISK_GAPS_LIMIT] },
  compute: ({ gapCount: n }: { gapCount: number }) => -Math.expm1(-Math.LN2 / n),
});

/** The 50 % voltage of n gaps together: below that of one. */
export const fiftyPercentOfGaps = formula({
  id: 'risk.fifty-percent-of-gaps',
  heading: '50 % voltage of n gaps together',
  source: cite(SWITCHING_SURGE_RATE, 'estimate by a step', 'memory'),
  expression: 'Un = U50 + z * sf',
  symbols: { U50: 'fiftyPercentKvPeak', z: 'quantileRatio', sf: 'strengthDeviationKvPeak' },
  result: 'gapsFiftyPercentKvPeak',
  compute: ({
    fiftyPercentKvPeak: U50,
    quantileRatio: z,
    strengthDeviationKvPeak: sf,
  }: {
    fiftyPercentKvPeak: number;
    quantileRatio: number;
    strengthDeviationKvPeak: number;
  }) => U50 + z * sf,
});

/**
 * Brown's estimate of the switching-surge flashover rate: the strength of n gaps as a step at their 50 % voltage, half of
 * it because positive polarity alone counts.
 */
export const brownsEstimate = formula({
  id: 'risk.browns-estimate',
  heading: "Brown's estimate of the flashover rate",
  source: cite(SWITCHING_SURGE_RATE, 'estimate by a step', 'memory'),
  expression: 'S = Phi((mu - Un) / ss) / 2',
  symbols: { mu: 'stressMeanKvPeak', Un: 'gapsFiftyPercentKvPeak', ss: 'stressDeviationKvPeak' },
  result: 'estimatedProbability',
  compute: ({
    stressMeanKvPeak: mu,
    gapsFiftyPercentKvPeak: Un,
    stressDeviationKvPeak: ss,
  }: {
    stressMeanKvPeak: number;
    gapsFiftyPercentKvPeak: number;
    stressDeviationKvPeak: number;
  }) => normalProbability((mu - Un) / ss) / 2,
});

import type { FlashoverRisk, TraceLine } from '@bellgap/common/api';

const aLine = (id: string, formula: string, result: number): TraceLine => ({
  id,
  heading: id,
  formula,
  substitution: formula,
  result,
  unit: '',
  source: { document: 'IEC 60071-2', edition: '1996', clause: 'risk of failure', status: 'memory' },
});

/** An answer about 200 gaps whose tails lie a quarter apart; the figures are made up. */
export const aFlashoverRisk = (): FlashoverRisk => ({
  methodEdition: '2026.2',
  deviationPercent: 6,
  strengthDeviationKvPeak: 60,
  byTail: [
    {
      tail: 'gaussian',
      singleGapProbability: 0.00135,
      gapsProbability: 0.04,
      switchingFlashoverProbability: 0.02,
    },
    {
      tail: 'truncated',
      singleGapProbability: 0.001349,
      gapsProbability: 0.03,
      switchingFlashoverProbability: 0.015,
    },
  ],
  estimatedProbability: 0.012,
  chart: [400, 700, 850, 1000, 1200].map((voltageKvPeak, index) => {
    const stressDensityPerKv = [0, 0.005, 0.001, 0, 0][index]!;
    const gapsProbability = [0, 0.01, 0.5, 1, 1][index]!;
    return {
      voltageKvPeak,
      stressDensityPerKv,
      singleGapProbability: [0, 0, 0.01, 0.5, 1][index]!,
      gapsProbability,
      riskDensityPerKv: stressDensityPerKv * gapsProbability,
    };
  }),
  cautions: [
    { code: 'risk.usual-deviation', severity: 'info', text: 'The usual 6 % is taken', field: 'deviationPercent' },
    { code: 'risk.tails-apart', severity: 'caution', text: 'The tails lie 25 % apart', field: null },
  ],
  trace: [
    aLine('risk.single-gap', 'R = Phi((mu - U50) / sqrt(ss^2 + sf^2))', 0.00135),
    aLine('risk.integral:gaussian', 'Rn = integral', 0.04),
    aLine('risk.switching-flashover-rate:gaussian', 'S = Rn / 2', 0.02),
    aLine('risk.integral-one-gap:truncated', 'R = integral', 0.001349),
    aLine('risk.integral:truncated', 'Rn = integral', 0.03),
    aLine('risk.switching-flashover-rate:truncated', 'S = Rn / 2', 0.015),
    aLine('risk.browns-estimate', 'S = Phi((mu - Un) / ss) / 2', 0.012),
  ],
});

import { METHOD_EDITION } from '../method-edition';
import type { TableConfirmation } from '../model';
import { cite, DEFINITION, IEC_60071_2 } from '../sources';
import { Calculation, figureText } from '../trace';
import { warn } from './cautions';
import {
  brownsEstimate,
  fiftyPercentOfGaps,
  gapsInParallel,
  halfOfGaps,
  singleGapRisk,
  strengthDeviation,
} from './formulas';
import { integrate } from './integrate';
import {
  TRUNCATED_AT,
  USUAL_DEVIATION_PERCENT,
  type FlashoverRisk,
  type FlashoverRiskByTail,
  type FlashoverRiskInput,
  type RiskTail,
  type StressStrengthPoint,
} from './model';
import { normalDensity, normalProbability, normalQuantile } from './normal';

/** So far from the mean nothing is left that a double could hold beside the rest. */
const WHOLE_REACH = 9;
const PANELS = 60;
const CHART_POINTS = 121;

interface Distributions {
  meanKvPeak: number;
  stressKvPeak: number;
  fiftyPercentKvPeak: number;
  strengthKvPeak: number;
}

/** Probability that one gap flashes over at a voltage. */
function strengthAt(voltageKvPeak: number, given: Distributions, tail: RiskTail): number {
  const z = (voltageKvPeak - given.fiftyPercentKvPeak) / given.strengthKvPeak;
  return tail === 'truncated' && z < -TRUNCATED_AT.strengthRatio ? 0 : normalProbability(z);
}

function stressDensityAt(voltageKvPeak: number, { meanKvPeak, stressKvPeak }: Distributions): number {
  return normalDensity((voltageKvPeak - meanKvPeak) / stressKvPeak) / stressKvPeak;
}

/**
 * Risk integral of n gaps: stress density times the probability that at least one of them flashes over, integrated over
 * the voltage. Cut where the strength begins and where n gaps turn from holding to flashing over, so that a steep strength is met too.
 */
export function gapsRisk(given: Distributions, gapCount: number, tail: RiskTail): number {
  const { meanKvPeak, stressKvPeak, fiftyPercentKvPeak, strengthKvPeak } = given;
  const truncated = tail === 'truncated';
  const least = Math.max(
    meanKvPeak - WHOLE_REACH * stressKvPeak,
    truncated ? fiftyPercentKvPeak - TRUNCATED_AT.strengthRatio * strengthKvPeak : -Infinity,
  );
  const most = meanKvPeak + (truncated ? TRUNCATED_AT.stressRatio : WHOLE_REACH) * stressKvPeak;
  const turnKvPeak = fiftyPercentKvPeak + normalQuantile(halfOfGaps({ gapCount })) * strengthKvPeak;
  const cuts = [-8, -2, 0, 2, 8].map((reach) => turnKvPeak + reach * strengthKvPeak);
  const edges = [least, ...cuts.filter((cut) => cut > least && cut < most), most];
  const density = (voltageKvPeak: number): number =>
    stressDensityAt(voltageKvPeak, given) *
    gapsInParallel({ singleGapProbability: strengthAt(voltageKvPeak, given, tail), gapCount });
  return edges.slice(1).reduce((sum, edge, index) => sum + integrate(density, edges[index] as number, edge, PANELS), 0);
}

function chartOf(given: Distributions, gapCount: number): StressStrengthPoint[] {
  const { meanKvPeak, stressKvPeak, fiftyPercentKvPeak, strengthKvPeak } = given;
  const least = Math.max(0, Math.min(meanKvPeak - 4 * stressKvPeak, fiftyPercentKvPeak - 4 * strengthKvPeak));
  const most = Math.max(meanKvPeak + 4 * stressKvPeak, fiftyPercentKvPeak + 3 * strengthKvPeak);
  return Array.from({ length: CHART_POINTS }, (_, index) => {
    const voltageKvPeak = least + ((most - least) * index) / (CHART_POINTS - 1);
    const singleGapProbability = strengthAt(voltageKvPeak, given, 'gaussian');
    const gapsProbability = gapsInParallel({ singleGapProbability, gapCount });
    const stressDensityPerKv = stressDensityAt(voltageKvPeak, given);
    return {
      voltageKvPeak,
      stressDensityPerKv,
      singleGapProbability,
      gapsProbability,
      riskDensityPerKv: stressDensityPerKv * gapsProbability,
    };
  });
}

const TAIL_WORDS: Record<RiskTail, string> = {
  gaussian: 'Gaussian tails without an end',
  truncated: `stress cut off ${TRUNCATED_AT.stressRatio} deviations above its mean, strength ${TRUNCATED_AT.strengthRatio} below its 50 % voltage`,
};

function byTail(
  given: Distributions,
  { gapCount, front }: FlashoverRiskInput,
  tail: RiskTail,
  calculation: Calculation,
): FlashoverRiskByTail {
  const singleGapProbability = tail === 'gaussian' ? singleGapRisk(figuresOf(given)) : gapsRisk(given, 1, tail);
  const gapsProbability = gapsRisk(given, gapCount, tail);
  const switchingFlashoverProbability = front === 'slow' ? gapsProbability / 2 : null;
  const status = calculation.status(`risk.tail:${tail}`, tail === 'gaussian' ? 'derived' : 'memory');
  const figures = `f: ${figureText(given.meanKvPeak)} and ${figureText(given.stressKvPeak)} kV; P: ${figureText(
    given.fiftyPercentKvPeak,
  )} and ${figureText(given.strengthKvPeak)} kV`;
  const source = cite(IEC_60071_2, 'risk of failure, by numeric integration', status);
  if (tail === 'truncated') {
    calculation.note(() => ({
      id: `risk.integral-one-gap:${tail}`,
      heading: `Risk of one gap, ${TAIL_WORDS[tail]}`,
      formula: 'R = integral of f(U) * P(U) dU',
      substitution: figures,
      result: singleGapProbability,
      unit: '',
      source,
    }));
  }
  calculation.note(() => ({
    id: `risk.integral:${tail}`,
    heading: `Risk of ${gapCount} gaps, ${TAIL_WORDS[tail]}`,
    formula: 'Rn = integral of f(U) * (1 - (1 - P(U))^n) dU',
    substitution: `${figures}; n = ${gapCount}`,
    result: gapsProbability,
    unit: '',
    source,
  }));
  if (switchingFlashoverProbability !== null) {
    calculation.note(() => ({
      id: `risk.switching-flashover-rate:${tail}`,
      heading: `Switching-surge flashover rate, ${tail}: positive polarity alone`,
      formula: 'S = Rn / 2',
      substitution: `S = ${figureText(gapsProbability)} / 2`,
      result: switchingFlashoverProbability,
      unit: '',
      source: cite(DEFINITION, 'half of the surges are positive', 'memory'),
    }));
  }
  return { tail, singleGapProbability, gapsProbability, switchingFlashoverProbability };
}

const figuresOf = ({ meanKvPeak, stressKvPeak, fiftyPercentKvPeak, strengthKvPeak }: Distributions) => ({
  stressMeanKvPeak: meanKvPeak,
  stressDeviationKvPeak: stressKvPeak,
  fiftyPercentKvPeak,
  strengthDeviationKvPeak: strengthKvPeak,
});

function estimate(given: Distributions, gapCount: number, calculation: Calculation): number {
  const figures = figuresOf(given);
  const singleGapProbability = calculation.run(halfOfGaps, { gapCount });
  const quantileRatio = normalQuantile(singleGapProbability);
  calculation.note(() => ({
    id: 'risk.quantile',
    heading: 'Deviations below the 50 % voltage at that probability',
    formula: 'z so that Phi(z) = P',
    substitution: `P = ${figureText(singleGapProbability)}`,
    result: quantileRatio,
    unit: '',
    source: cite(DEFINITION, 'normal distribution', 'derived'),
  }));
  const gapsFiftyPercentKvPeak = calculation.run(fiftyPercentOfGaps, {
    fiftyPercentKvPeak: figures.fiftyPercentKvPeak,
    quantileRatio,
    strengthDeviationKvPeak: figures.strengthDeviationKvPeak,
  });
  return calculation.run(brownsEstimate, {
    stressMeanKvPeak: figures.stressMeanKvPeak,
    gapsFiftyPercentKvPeak,
    stressDeviationKvPeak: figures.stressDeviationKvPeak,
  });
}

/**
 * Risk of flashover of one gap and of n equal gaps under the same surge, by both tails; for slow fronts the
 * switching-surge flashover rate and Brown's estimate of it. The tails differ by a quarter and more at 200 towers: which
 * one was used is part of the figure.
 */
export function flashoverRisk(
  input: FlashoverRiskInput,
  confirmations: readonly TableConfirmation[] = [],
): FlashoverRisk {
  const { front, fiftyPercentKvPeak, stressMeanKvPeak, stressDeviationKvPeak, gapCount } = input;
  const calculation = new Calculation(true, confirmations);
  const deviationPercent = input.deviationPercent ?? USUAL_DEVIATION_PERCENT[front];
  const strengthKvPeak = calculation.run(strengthDeviation, { deviationPercent, fiftyPercentKvPeak });
  const given: Distributions = {
    meanKvPeak: stressMeanKvPeak,
    stressKvPeak: stressDeviationKvPeak,
    fiftyPercentKvPeak,
    strengthKvPeak,
  };
  calculation.run(singleGapRisk, figuresOf(given));
  const tails = (['gaussian', 'truncated'] as const).map((tail) => byTail(given, input, tail, calculation));
  const estimatedProbability = front === 'slow' ? estimate(given, gapCount, calculation) : null;
  warn(calculation, input, tails);
  return {
    methodEdition: METHOD_EDITION,
    deviationPercent,
    strengthDeviationKvPeak: strengthKvPeak,
    byTail: tails,
    estimatedProbability,
    chart: chartOf(given, gapCount),
    cautions: calculation.cautions,
    trace: calculation.lines,
  };
}

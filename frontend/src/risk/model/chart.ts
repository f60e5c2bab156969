import type { StressStrengthPoint } from '@bellgap/common/api';
import { formatNumber } from '../../ui/figure';

/** A point in a box of 100 by 100, y downward: 100 is the axis. */
export type Point = readonly [x: number, y: number];

export interface ChartCurves {
  leastKvPeak: number;
  mostKvPeak: number;
  /** Density of the stress, its peak at `STRESS_PEAK` of the height. */
  stress: Point[];
  /** Probability of flashover, 0 at the axis and 1 on top. */
  oneGap: Point[];
  gaps: Point[];
  /** Stress times probability on the scale of the stress, enlarged. */
  product: Point[];
  /** How many times larger the product is drawn; null where it is too small to be drawn at all. */
  enlarged: number | null;
}

/** Share of the height that the stress fills; below 1, so that it does not run along the probability of 1. */
export const STRESS_PEAK = 0.9;
/** An enlarged product fills at most this share of the height. */
const PRODUCT_PEAK = 0.6;
const MOST_ENLARGED = 1e6;

const largest = (figures: readonly number[]): number => Math.max(...figures);

/** The largest of 1, 2, 5, 10, 20 ... that keeps a peak within its share; never below 1. */
function enlargement(peak: number): number | null {
  if (peak * MOST_ENLARGED < PRODUCT_PEAK / 10) return null;
  const room = Math.min(MOST_ENLARGED, PRODUCT_PEAK / peak);
  const power = 10 ** Math.floor(Math.log10(room));
  return Math.max(1, ([5, 2, 1].find((step) => step * power <= room) ?? 1) * power);
}

/** The curves of stress and strength in a box of 100 by 100. */
export function chartCurves(points: readonly StressStrengthPoint[]): ChartCurves {
  const leastKvPeak = points[0]?.voltageKvPeak ?? 0;
  const mostKvPeak = points.at(-1)?.voltageKvPeak ?? 1;
  const perDensity = STRESS_PEAK / largest(points.map(({ stressDensityPerKv }) => stressDensityPerKv));
  const enlarged = enlargement(perDensity * largest(points.map(({ riskDensityPerKv }) => riskDensityPerKv)));
  const curve = (shareOf: (point: StressStrengthPoint) => number): Point[] =>
    points.map((point) => [
      (100 * (point.voltageKvPeak - leastKvPeak)) / (mostKvPeak - leastKvPeak),
      100 * (1 - shareOf(point)),
    ]);
  return {
    leastKvPeak,
    mostKvPeak,
    stress: curve(({ stressDensityPerKv }) => stressDensityPerKv * perDensity),
    oneGap: curve(({ singleGapProbability }) => singleGapProbability),
    gaps: curve(({ gapsProbability }) => gapsProbability),
    product: curve(({ riskDensityPerKv }) => riskDensityPerKv * perDensity * (enlarged ?? 0)),
    enlarged,
  };
}

/** Round figures along an axis, about five of them. */
export function axisMarks(least: number, most: number): number[] {
  const rough = (most - least) / 5;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((one) => one * power).find((one) => one >= rough) ?? rough;
  const first = Math.ceil(least / step) * step;
  return Array.from({ length: Math.floor((most - first) / step) + 1 }, (_, mark) => first + mark * step);
}

/** Voltage at which stress and strength meet the most. */
export function meetingKvPeak(points: readonly StressStrengthPoint[]): number {
  const most = largest(points.map(({ riskDensityPerKv }) => riskDensityPerKv));
  return points.find(({ riskDensityPerKv }) => riskDensityPerKv === most)?.voltageKvPeak ?? 0;
}

/** How the product is drawn, in words. */
export function productText(enlarged: number | null): string {
  if (enlarged === null) return 'stress times probability: too small to be drawn';
  if (enlarged === 1) return 'stress times probability, whose area is the risk';
  return `stress times probability, whose area is the risk; drawn ${formatNumber(enlarged)} times larger`;
}

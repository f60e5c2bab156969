import type { StressStrengthPoint } from '@bellgap/common/api';
import { axisMarks, chartCurves, meetingKvPeak, productText, STRESS_PEAK } from './chart';

const aPoint = (voltageKvPeak: number, stress: number, one: number, gaps: number): StressStrengthPoint => ({
  voltageKvPeak,
  stressDensityPerKv: stress,
  singleGapProbability: one,
  gapsProbability: gaps,
  riskDensityPerKv: stress * gaps,
});
const POINTS = [
  aPoint(400, 0, 0, 0),
  aPoint(700, 0.004, 0.001, 0.005),
  aPoint(900, 0.001, 0.02, 0.1),
  aPoint(1400, 0, 0.99, 1),
];

describe('the curves of stress and strength', () => {
  it('stand on one axis of voltages, from end to end', () => {
    const { leastKvPeak, mostKvPeak, stress, oneGap, gaps, product } = chartCurves(POINTS);
    expect([leastKvPeak, mostKvPeak]).toEqual([400, 1400]);
    for (const curve of [stress, oneGap, gaps, product]) expect(curve.map(([x]) => x)).toEqual([0, 30, 50, 100]);
  });

  it('have the stress by its peak, and probabilities from the axis to the top', () => {
    const { stress, oneGap, gaps } = chartCurves(POINTS);
    expect(stress[1]![1]).toBeCloseTo(100 * (1 - STRESS_PEAK), 9);
    expect(stress[2]![1]).toBeCloseTo(100 * (1 - STRESS_PEAK / 4), 9);
    expect(stress[0]![1]).toBe(100);
    expect(oneGap.map(([, y]) => y)).toEqual([100, 99.9, 98, expect.closeTo(1, 9)]);
    expect(gaps.at(-1)).toEqual([100, 0]);
  });

  it('have the product on the scale of the stress, enlarged by a round figure that is named', () => {
    // The product's peak is 0.0001 per kV, 0.9 / 40 = 0.0225 of the height; 20 times that is 0.45, 50 times too much.
    const { product, enlarged } = chartCurves(POINTS);
    expect(enlarged).toBe(20);
    expect(product[2]![1]).toBeCloseTo(55, 9);
    expect(productText(enlarged)).toContain('drawn 20 times larger');
    expect(meetingKvPeak(POINTS)).toBe(900);
  });

  it('are never made smaller, and leave out what cannot be seen', () => {
    expect(chartCurves([aPoint(400, 0, 0, 0), aPoint(700, 0.004, 1, 1), aPoint(1400, 0, 1, 1)]).enlarged).toBe(1);
    const apart = chartCurves([aPoint(400, 0.004, 0, 0), aPoint(1400, 1e-12, 1, 1)]);
    expect(apart.enlarged).toBeNull();
    expect(apart.product.every(([, y]) => y === 100)).toBe(true);
    expect(productText(null)).toContain('too small to be drawn');
  });
});

describe(axisMarks.name, () => {
  it('gives round figures inside what is shown', () => {
    expect(axisMarks(342, 1295)).toEqual([400, 600, 800, 1000, 1200]);
    expect(axisMarks(0, 4.2)).toEqual([0, 1, 2, 3, 4]);
  });
});

import fc from 'fast-check';
import { flashoverRiskSchema } from '../../schemas/risk';
import { unitOf } from '../quantities';
import { flashoverRisk, gapsRisk } from './flashover-risk';
import { gapsInParallel, halfOfGaps, singleGapRisk } from './formulas';
import type { FlashoverRisk, FlashoverRiskInput, RiskTail } from './model';
import { normalDensity, normalProbability } from './normal';

const aRisk = (overrides: Partial<FlashoverRiskInput> = {}): FlashoverRiskInput => ({
  front: 'slow',
  stressMeanKvPeak: 686,
  stressDeviationKvPeak: 86,
  fiftyPercentKvPeak: 1098,
  deviationPercent: null,
  gapCount: 200,
  ...overrides,
});
const tailOf = ({ byTail }: FlashoverRisk, tail: RiskTail) => byTail.find((one) => one.tail === tail)!;

/** The risk integral by the plainest of rules, a hundred thousand steps. */
function byTrapezoids(given: Parameters<typeof gapsRisk>[0], gapCount: number, tail: RiskTail): number {
  const { meanKvPeak, stressKvPeak, fiftyPercentKvPeak, strengthKvPeak } = given;
  const from = meanKvPeak - 8 * stressKvPeak;
  const to = meanKvPeak + (tail === 'truncated' ? 3 : 8) * stressKvPeak;
  const steps = 100_000;
  const width = (to - from) / steps;
  let sum = 0;
  for (let step = 0; step <= steps; step += 1) {
    const voltage = from + step * width;
    const z = (voltage - fiftyPercentKvPeak) / strengthKvPeak;
    const strength = tail === 'truncated' && z < -4 ? 0 : normalProbability(z);
    const density = normalDensity((voltage - meanKvPeak) / stressKvPeak) / stressKvPeak;
    sum += density * (1 - (1 - strength) ** gapCount) * (step === 0 || step === steps ? 0.5 : 1);
  }
  return sum * width;
}

const aDistribution = fc.record({
  meanKvPeak: fc.double({ min: 300, max: 1500, noNaN: true }),
  stressKvPeak: fc.double({ min: 20, max: 200, noNaN: true }),
  fiftyPercentKvPeak: fc.double({ min: 400, max: 2500, noNaN: true }),
  strengthKvPeak: fc.double({ min: 10, max: 150, noNaN: true }),
});

describe(gapsRisk.name, () => {
  it('is the closed form for one gap', () => {
    fc.assert(
      fc.property(aDistribution, (given) => {
        const closed = singleGapRisk({
          stressMeanKvPeak: given.meanKvPeak,
          stressDeviationKvPeak: given.stressKvPeak,
          fiftyPercentKvPeak: given.fiftyPercentKvPeak,
          strengthDeviationKvPeak: given.strengthKvPeak,
        });
        const integrated = gapsRisk(given, 1, 'gaussian');
        expect(Math.abs(integrated - closed)).toBeLessThan(1e-12 + 1e-9 * closed);
      }),
    );
  });

  it('agrees with another rule of integration for many gaps, by both tails', () => {
    const given = { meanKvPeak: 686, stressKvPeak: 86, fiftyPercentKvPeak: 1098, strengthKvPeak: 65.9 };
    for (const tail of ['gaussian', 'truncated'] as const) {
      for (const gapCount of [1, 20, 200, 5000]) {
        const other = byTrapezoids(given, gapCount, tail);
        expect(Math.abs(gapsRisk(given, gapCount, tail) / other - 1)).toBeLessThan(1e-4);
      }
    }
  });

  it('stays between 0 and 1, grows with the gaps, and is smaller with ends cut off', () => {
    fc.assert(
      fc.property(aDistribution, fc.integer({ min: 1, max: 50_000 }), (given, gapCount) => {
        const whole = gapsRisk(given, gapCount, 'gaussian');
        expect(whole).toBeGreaterThanOrEqual(0);
        expect(whole).toBeLessThanOrEqual(1 + 1e-9);
        expect(gapsRisk(given, gapCount + 1, 'gaussian')).toBeGreaterThanOrEqual(whole * (1 - 1e-9));
        expect(gapsRisk(given, gapCount, 'truncated')).toBeLessThanOrEqual(whole * (1 + 1e-9));
      }),
    );
  });
});

describe('gaps in parallel', () => {
  it('keep a small probability, where 1 - (1 - P)^n would lose it', () => {
    expect(gapsInParallel({ singleGapProbability: 1e-18, gapCount: 3 })).toBeCloseTo(3e-18, 30);
    expect(gapsInParallel({ singleGapProbability: 1, gapCount: 200 })).toBe(1);
    expect(gapsInParallel({ singleGapProbability: halfOfGaps({ gapCount: 200 }), gapCount: 200 })).toBeCloseTo(0.5, 12);
  });
});

describe(flashoverRisk.name, () => {
  it('gives the rate of 200 towers by both tails, a quarter apart, and the estimate beside', () => {
    const risk = flashoverRisk(aRisk());
    const [whole, cut] = (['gaussian', 'truncated'] as const).map((tail) => tailOf(risk, tail));
    expect(whole?.switchingFlashoverProbability).toBe(whole!.gapsProbability / 2);
    expect(whole!.switchingFlashoverProbability! / 0.0027).toBeCloseTo(1, 1);
    expect(cut!.switchingFlashoverProbability! / whole!.switchingFlashoverProbability!).toBeGreaterThan(0.65);
    expect(cut!.switchingFlashoverProbability! / whole!.switchingFlashoverProbability!).toBeLessThan(0.8);
    expect(risk.estimatedProbability! / whole!.switchingFlashoverProbability!).toBeGreaterThan(0.5);
    expect(risk.estimatedProbability).toBeLessThan(whole!.switchingFlashoverProbability!);
  });

  it('takes the usual deviation of the front, and has no switching rate for fast fronts', () => {
    expect(flashoverRisk(aRisk()).deviationPercent).toBe(6);
    const fast = flashoverRisk(aRisk({ front: 'fast' }));
    expect([fast.deviationPercent, fast.estimatedProbability]).toEqual([3, null]);
    expect(tailOf(fast, 'gaussian').switchingFlashoverProbability).toBeNull();
    expect(flashoverRisk(aRisk({ deviationPercent: 5 })).strengthDeviationKvPeak).toBeCloseTo(54.9, 9);
  });

  it('draws stress and strength over one range of voltages, whose areas are 1 and the risk', () => {
    const { chart, byTail } = flashoverRisk(aRisk());
    const area = (key: 'stressDensityPerKv' | 'riskDensityPerKv'): number =>
      chart.slice(1).reduce((sum, point, index) => {
        const before = chart[index]!;
        return sum + ((point[key] + before[key]) / 2) * (point.voltageKvPeak - before.voltageKvPeak);
      }, 0);
    expect(area('stressDensityPerKv')).toBeCloseTo(1, 3);
    expect(area('riskDensityPerKv') / byTail[0]!.gapsProbability).toBeCloseTo(1, 1);
    expect(chart[0]!.gapsProbability).toBeLessThan(0.05);
    expect(chart.at(-1)!.singleGapProbability).toBeGreaterThan(0.99);
  });

  it('names the tails in its working, with lines of their own and a unit in every name', () => {
    const risk = flashoverRisk(aRisk());
    const ids = risk.trace.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(risk.trace.find(({ id }) => id === 'risk.integral:truncated')?.heading).toContain('cut off');
    expect(ids).toContain('risk.integral-one-gap:truncated');
    const { trace: _trace, ...figures } = risk;
    const names = [...Object.keys(risk.chart[0]!), ...Object.keys(risk.byTail[0]!), ...Object.keys(figures)];
    const text = ['tail', 'methodEdition', 'byTail', 'chart', 'cautions'];
    expect(names.filter((name) => unitOf(name) === null && !text.includes(name))).toEqual([]);
  });

  it('warns of what the reader has to know, and of nothing else', () => {
    const codes = (overrides: Partial<FlashoverRiskInput>): string[] =>
      flashoverRisk(aRisk({ deviationPercent: 6, ...overrides })).cautions.map(({ code }) => code);
    expect(codes({})).toEqual(['risk.tails-apart']);
    expect(codes({ deviationPercent: null })).toEqual(['risk.tails-apart', 'risk.usual-deviation']);
    expect(codes({ stressMeanKvPeak: 1098 })).toEqual(['risk.stress-reaches-strength']);
    expect(codes({ stressMeanKvPeak: 200 })).toContain('risk.stress-near-zero');
    expect(codes({ stressMeanKvPeak: 300 })).toEqual(['risk.tails-do-not-meet']);
  });

  it('stands with the status that an owner of the print has recorded', () => {
    const recorded = { key: 'risk.single-gap', edition: '1996', page: '57', on: '2026-03-01', by: 'A. Reader' };
    const statusOf = ({ trace }: FlashoverRisk) => trace.find(({ id }) => id === 'risk.single-gap')?.source.status;
    expect(statusOf(flashoverRisk(aRisk()))).toBe('memory');
    expect(statusOf(flashoverRisk(aRisk(), [{ ...recorded, outcome: 'confirmed' }]))).toBe('confirmed');
    const disputed = flashoverRisk(aRisk(), [{ ...recorded, outcome: 'disputed' }]);
    expect(disputed.cautions.find(({ code }) => code === 'risk.disputed')?.text).toContain('risk.single-gap');
  });

  it('is asked for by a schema that names what is wrong', () => {
    expect(flashoverRiskSchema.isValidSync(aRisk(), { strict: true })).toBe(true);
    const fault = (overrides: object): string => {
      try {
        flashoverRiskSchema.validateSync({ ...aRisk(), ...overrides }, { strict: true });
        return '';
      } catch (error) {
        return (error as Error).message;
      }
    };
    expect(fault({ gapCount: 0 })).toBe('Gaps in parallel: must be at least 1');
    expect(fault({ stressDeviationKvPeak: 0 })).toBe('Deviation of the stress: must be more than 0');
    expect(fault({ fiftyPercentKvPeak: null })).toBe('50 % flashover voltage: is needed');
    expect(fault({ front: 'square' })).toContain('choose one of slow, fast');
  });
});

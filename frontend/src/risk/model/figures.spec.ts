import type { FlashoverRisk } from '@bellgap/common/api';
import { aFlashoverRisk } from '../testing/a-flashover-risk';
import { oneInText, probabilityParts, riskFigures } from './figures';

const words = (risk: FlashoverRisk, gapCount = 200) =>
  riskFigures(risk, { gapCount }).map(({ title, aside, rows }) => [title, aside, rows.map(({ label }) => label)]);

describe(riskFigures.name, () => {
  it('sets the tails side by side where they differ, each with its own line of the working', () => {
    expect(words(aFlashoverRisk())).toEqual([
      ['One gap', '', ['By both tails']],
      ['At least one of 200 gaps', '25 % apart', ['Gaussian tails', 'Ends cut off']],
      ['Switching-surge flashover rate', '25 % apart', ['Gaussian tails', 'Ends cut off']],
      ["Brown's estimate of that rate", 'strength taken as a step', ['By a step']],
    ]);
    const rows = riskFigures(aFlashoverRisk(), { gapCount: 200 }).flatMap((figure) => figure.rows);
    expect(rows.map(({ line }) => line?.id)).toEqual([
      'risk.single-gap',
      'risk.integral:gaussian',
      'risk.integral:truncated',
      'risk.switching-flashover-rate:gaussian',
      'risk.switching-flashover-rate:truncated',
      'risk.browns-estimate',
    ]);
  });

  it('has no rate and no estimate for fast fronts, and says one gap once', () => {
    const { byTail, ...risk } = aFlashoverRisk();
    const fast = byTail.map((one) => ({ ...one, switchingFlashoverProbability: null }));
    expect(words({ ...risk, byTail: fast, estimatedProbability: null }, 1).map(([title]) => title)).toEqual([
      'One gap',
    ]);
  });
});

describe('a probability in words', () => {
  it.each([
    [0.5, '0.500', null],
    [0.00135, '0.00135', null],
    [0.000584913, '0.000585', null],
    [3.16712e-5, '3.17', -5],
    [2.5e-12, '2.50', -12],
    [9.999e-5, '0.000100', null],
    [0, '0', null],
  ])('%p is %p and %p', (probability, figure, power) => {
    expect(probabilityParts(probability)).toEqual({ figure, power });
  });

  it('is one in so many, where that says more', () => {
    expect(oneInText(0.00135)).toBe('1 in 741');
    expect(oneInText(0.3)).toBe('1 in 3.3');
    expect(oneInText(0.7)).toBe('');
    expect(oneInText(0)).toBe('never, by this tail');
  });
});

import fc from 'fast-check';
import { integrate } from './integrate';
import { normalDensity, normalProbability, normalQuantile } from './normal';

const loadMath = () => import('mathjs');
let math: Awaited<ReturnType<typeof loadMath>>;
beforeAll(async () => {
  math = await loadMath();
});

describe(normalProbability.name, () => {
  // Printed tables of the normal distribution (Abramowitz and Stegun, Tables 26.1 and 26.2).
  it.each([
    [0, 0.5],
    [1, 0.841344746069],
    [1.96, 0.975002104852],
    [2.5, 0.993790334674],
    [-1, 0.158655253931],
    [-2, 0.0227501319482],
    [-3, 0.00134989803163],
    [-4, 3.16712418331e-5],
    [-5, 2.86651571879e-7],
    [-6, 9.86587645038e-10],
    [-8, 6.22096057427e-16],
  ])('is the printed figure at %d', (z, printed) => {
    expect(Math.abs(normalProbability(z) / printed - 1)).toBeLessThan(1e-11);
  });

  it('agrees with the error function of a library, and with its mirror', () => {
    fc.assert(
      fc.property(fc.double({ min: -6, max: 6, noNaN: true }), (z) => {
        expect(Math.abs(normalProbability(z) - (1 + math.erf(z / Math.SQRT2)) / 2)).toBeLessThan(1e-14);
        expect(Math.abs(normalProbability(z) + normalProbability(-z) - 1)).toBeLessThan(1e-14);
      }),
    );
  });

  it('has no step where the series gives way to the fraction', () => {
    const difference = normalProbability(-2.5 + 1e-9) - normalProbability(-2.5 - 1e-9);
    expect(Math.abs(difference / (2e-9 * normalDensity(2.5)) - 1)).toBeLessThan(1e-5);
  });
});

describe(normalQuantile.name, () => {
  it('is the inverse, tails included', () => {
    for (const probability of [1e-12, 1e-6, 0.0035, 0.025, 0.3, 0.5, 0.8, 0.975, 0.9999]) {
      expect(Math.abs(normalProbability(normalQuantile(probability)) / probability - 1)).toBeLessThan(1e-11);
    }
    expect(normalQuantile(0.025)).toBeCloseTo(-1.959963984540054, 12);
    expect(() => normalQuantile(0)).toThrow(RangeError);
  });
});

describe(integrate.name, () => {
  it('is exact for a polynomial of the ninth degree, and nothing where there is nothing', () => {
    expect(integrate((x) => 10 * x ** 9, 0, 2, 1)).toBeCloseTo(1024, 9);
    expect(integrate(Math.sin, 0, Math.PI, 20)).toBeCloseTo(2, 12);
    expect(integrate(Math.sin, 1, 1, 20)).toBe(0);
  });
});

import { roundUp } from '../quantities';

const degrees =
  (of: (radians: number) => number) =>
  (deg: number): number =>
    of((deg * Math.PI) / 180);

/** Words of expressions that a general parser knows otherwise: angles are in degrees, rounding is the engine's. */
const WORDS: Record<string, (...args: number[]) => number> = {
  ln: Math.log,
  sin: degrees(Math.sin),
  cos: degrees(Math.cos),
  tan: degrees(Math.tan),
  round: (value) => Math.round(Math.round(value * 1e6) / 1e6),
  ceil: (value) => roundUp(value, 1),
};

/** Evaluates what a formula shows, by a general-purpose parser (mathjs), so that a test can compare it with what is run. */
export async function evaluateExpression(expression: string, figures: Record<string, number>): Promise<number> {
  const { evaluate, erf } = await import('mathjs');
  const Phi = (z: number): number => (1 + erf(z / Math.SQRT2)) / 2;
  const value: unknown = evaluate(expression, { ...WORDS, Phi, ...figures });
  if (typeof value !== 'number') throw new Error(`${expression} is no number`);
  return value;
}

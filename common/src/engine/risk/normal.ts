/**
 * Normal distribution to double precision, its tails included: a risk of one in ten million is a tail.
 */

const ROOT_TWO_PI = Math.sqrt(2 * Math.PI);
/** From here outward the continued fraction is the better way, inward the series. */
const TAIL_FROM = 2.5;
const FRACTION_TERMS = 120;

/** Density of the standard normal distribution. */
export const normalDensity = (z: number): number => Math.exp(-0.5 * z * z) / ROOT_TWO_PI;

/** Probability above z, z from 0: series about the middle, continued fraction in the tail. */
function upperTail(z: number): number {
  if (z < TAIL_FROM) {
    let term = z;
    let sum = z;
    for (let odd = 3; Math.abs(term) > 1e-18 * Math.abs(sum); odd += 2) {
      term *= (z * z) / odd;
      sum += term;
    }
    return 0.5 - normalDensity(z) * sum;
  }
  let fraction = z;
  for (let k = FRACTION_TERMS; k >= 1; k -= 1) fraction = z + k / fraction;
  return normalDensity(z) / fraction;
}

/** Probability below z. Example: z = -3 gives 0.001349898. */
export const normalProbability = (z: number): number => (z <= 0 ? upperTail(-z) : 1 - upperTail(z));

/**
 * The z below which a probability lies: a rational start (Abramowitz and Stegun 26.2.23), then Halley's steps on the
 * tail. Valid: probability between 0 and 1, ends excluded. Example: 0.025 gives -1.959964.
 */
export function normalQuantile(probability: number): number {
  if (!(probability > 0 && probability < 1)) throw new RangeError(`${probability} is no probability between 0 and 1`);
  const tail = Math.min(probability, 1 - probability);
  const t = Math.sqrt(-2 * Math.log(tail));
  let z =
    t - (2.515517 + 0.802853 * t + 0.010328 * t ** 2) / (1 + 1.432788 * t + 0.189269 * t ** 2 + 0.001308 * t ** 3);
  for (let step = 0; step < 4; step += 1) {
    const difference = (normalProbability(-z) - tail) / normalDensity(z);
    z += difference / (1 - (z * difference) / 2);
  }
  return probability < 0.5 ? -z : z;
}

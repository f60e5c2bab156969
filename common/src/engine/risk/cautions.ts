import type { Calculation } from '../trace';
import { USUAL_DEVIATION_PERCENT, type FlashoverRiskByTail, type FlashoverRiskInput } from './model';

/** From so much apart on the tail is no detail of the method any more. */
const TAILS_APART_PERCENT = 10;
/** Below so many deviations from zero a Gaussian stress has a share of voltages that do not exist. */
const LEAST_DEVIATIONS_FROM_ZERO = 3;

/** What a reader has to know before a risk is used. */
export function warn(
  calculation: Calculation,
  { front, stressMeanKvPeak, stressDeviationKvPeak, fiftyPercentKvPeak, deviationPercent }: FlashoverRiskInput,
  byTail: readonly FlashoverRiskByTail[],
): void {
  if (stressMeanKvPeak >= fiftyPercentKvPeak) {
    const text = 'The mean of the stress reaches the 50 % voltage of a gap: every other surge flashes over';
    calculation.caution('risk.stress-reaches-strength', 'caution', text, 'stressMeanKvPeak');
  }
  if (stressMeanKvPeak < LEAST_DEVIATIONS_FROM_ZERO * stressDeviationKvPeak) {
    const text = `The stress lies less than ${LEAST_DEVIATIONS_FROM_ZERO} of its deviations above zero: a Gaussian distribution does not fit it`;
    calculation.caution('risk.stress-near-zero', 'caution', text, 'stressDeviationKvPeak');
  }
  const [whole, cut] = (['gaussian', 'truncated'] as const).map(
    (tail) => byTail.find((one) => one.tail === tail)?.gapsProbability ?? 0,
  ) as [number, number];
  const apartPercent = whole === 0 ? 0 : (1 - cut / whole) * 100;
  if (cut === 0 && whole > 0) {
    const text = 'With their ends cut off, stress and strength do not meet; that is no proof that nothing flashes over';
    calculation.caution('risk.tails-do-not-meet', 'caution', text);
  } else if (apartPercent >= TAILS_APART_PERCENT) {
    const text = `The tails lie ${Math.round(apartPercent)} % apart: say beside the figure which one was used`;
    calculation.caution('risk.tails-apart', 'caution', text);
  }
  if (deviationPercent === null) {
    const text = `No deviation of the strength is given: the usual ${USUAL_DEVIATION_PERCENT[front]} % is taken`;
    calculation.caution('risk.usual-deviation', 'info', text, 'deviationPercent');
  }
  if (calculation.disputed.length > 0) {
    const text = `An owner of the print disputes what is used here: ${calculation.disputed.join(', ')}`;
    calculation.caution('risk.disputed', 'caution', text);
  }
}

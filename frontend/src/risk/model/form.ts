import type { FlashoverRiskInput } from '@bellgap/common/api';
import { RISK_FIELDS, RISK_USUAL_DEVIATION_PERCENT } from '@bellgap/common/schemas';

/** What the fields hold: a figure, text that cannot be read as one, or nothing. */
export type RiskValues = { [Name in keyof FlashoverRiskInput]: FlashoverRiskInput[Name] | string | null };

/** Nothing is chosen beforehand. */
export const BLANK: RiskValues = {
  front: null,
  stressMeanKvPeak: null,
  stressDeviationKvPeak: null,
  fiftyPercentKvPeak: null,
  deviationPercent: null,
  gapCount: null,
};

export const sameValues = (one: RiskValues, other: RiskValues): boolean =>
  (Object.keys(RISK_FIELDS) as (keyof RiskValues)[]).every((name) => Object.is(one[name], other[name]));

/** What is taken where the deviation of the strength is left blank. */
export function usualDeviationText(front: RiskValues['front']): string {
  const { slow, fast } = RISK_USUAL_DEVIATION_PERCENT;
  if (front === 'slow') return `blank: ${slow} %, usual for slow fronts`;
  if (front === 'fast') return `blank: ${fast} %, usual for fast fronts`;
  return `blank: ${slow} % for slow, ${fast} % for fast fronts`;
}

import * as yup from 'yup';
import { RISK_FRONTS, RISK_GAPS_LIMIT, USUAL_DEVIATION_PERCENT } from '../engine/risk/model';
import type { Field } from './fields';
import { measure, oneOf } from './parts';

export type RiskField = Field | (Omit<Field, 'unit'> & { unit: '%' });

/** Every input of a risk of flashover by its name: words, unit and limits. */
export const RISK_FIELDS = {
  front: { label: 'Front of the surge' },
  stressMeanKvPeak: { label: 'Mean of the stress', unit: 'kV peak', above: 0, atMost: 10_000 },
  stressDeviationKvPeak: { label: 'Deviation of the stress', unit: 'kV peak', above: 0, atMost: 5000 },
  fiftyPercentKvPeak: { label: '50 % flashover voltage', unit: 'kV peak', above: 0, atMost: 10_000 },
  deviationPercent: { label: 'Deviation of the strength', unit: '%', above: 0, atMost: 50 },
  gapCount: { label: 'Gaps in parallel', atLeast: 1, atMost: RISK_GAPS_LIMIT, whole: true },
} as const satisfies Record<string, RiskField>;

/** The words of every choice of a risk of flashover, and of what its answer is told by. */
export const RISK_CHOICES = {
  front: { slow: 'Slow, switching', fast: 'Fast, lightning' },
  tail: { gaussian: 'Gaussian tails', truncated: 'Ends cut off' },
} as const;

/** Percent of the 50 % voltage that is taken where no deviation of the strength is given. */
export const RISK_USUAL_DEVIATION_PERCENT = USUAL_DEVIATION_PERCENT;

function risk(name: keyof typeof RISK_FIELDS) {
  const field: RiskField = RISK_FIELDS[name];
  return measure(field.label, field);
}

function needed(name: keyof typeof RISK_FIELDS) {
  return risk(name).required(`${RISK_FIELDS[name].label}: is needed`);
}

export const flashoverRiskSchema = yup
  .object({
    front: oneOf(RISK_FIELDS.front.label, RISK_FRONTS).required(`${RISK_FIELDS.front.label}: is needed`),
    stressMeanKvPeak: needed('stressMeanKvPeak'),
    stressDeviationKvPeak: needed('stressDeviationKvPeak'),
    fiftyPercentKvPeak: needed('fiftyPercentKvPeak'),
    deviationPercent: risk('deviationPercent').defined(),
    gapCount: needed('gapCount'),
  })
  .noUnknown()
  .required();

import * as yup from 'yup';
import { RISK_FRONTS } from '../engine/risk/model';
import { measure, oneOf } from './parts';

/** Most gaps in parallel that a risk is asked for: the towers of a long line, three phases each. */
export const RISK_GAPS_LIMIT = 100_000;

export const flashoverRiskSchema = yup
  .object({
    front: oneOf('Front of the surge', RISK_FRONTS).required('Front of the surge: is needed'),
    stressMeanKvPeak: measure('Mean of the stress', { above: 0, atMost: 10_000 }).required(
      'Mean of the stress: is needed',
    ),
    stressDeviationKvPeak: measure('Deviation of the stress', { above: 0, atMost: 5000 }).required(
      'Deviation of the stress: is needed',
    ),
    fiftyPercentKvPeak: measure('50 % flashover voltage', { above: 0, atMost: 10_000 }).required(
      '50 % flashover voltage: is needed',
    ),
    deviationPercent: measure('Deviation of the strength', { above: 0, atMost: 50 }).defined(),
    gapCount: measure('Gaps in parallel', { atLeast: 1, atMost: RISK_GAPS_LIMIT, whole: true }).required(
      'Gaps in parallel: is needed',
    ),
  })
  .noUnknown()
  .required();

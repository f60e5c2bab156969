import { strengthDeviation, singleGapRisk } from '../risk';
import { gapsRisk } from '../risk/flashover-risk';
import type { KnownAnswer } from './known-answer';

/** Stress of 2.0 and 0.25 p.u. against 3.0 p.u. and 6 %; a risk does not depend on the unit of voltage. */
const STRESS = { stressMeanKvPeak: 2, stressDeviationKvPeak: 0.25, fiftyPercentKvPeak: 3 } as const;
const STRENGTH = strengthDeviation({ deviationPercent: 6, fiftyPercentKvPeak: 3 });

export const RISK: KnownAnswer[] = [
  {
    source: 'risk integral of IEC 60071-2 (method from memory, not verified); figure worked out by hand, not printed',
    title: 'one gap: stress 2.0 and 0.25 p.u., strength 3.0 p.u. and 6 %',
    computed: () => ({
      closedForm: singleGapRisk({ ...STRESS, strengthDeviationKvPeak: STRENGTH }),
      byIntegration: gapsRisk(
        { meanKvPeak: 2, stressKvPeak: 0.25, fiftyPercentKvPeak: 3, strengthKvPeak: STRENGTH },
        1,
        'gaussian',
      ),
    }),
    printed: { closedForm: 0.00058491, byIntegration: 0.00058491 },
    within: 1e-8,
    why: 'given to five digits',
    status: 'memory',
  },
];

import type { Status } from '../model';
import type { StandardTable } from './table';

/** An altitude rule of a regulation: so many percent for every so many metres above its origin. */
export interface NationalAltitudeRow {
  rule: 'rd-337' | 'rptd-07' | 'china-switchgear' | 'china-line';
  title: string;
  appliesTo: string;
  increasePercent: number;
  stepM: number;
  /** True where a part of a step counts as a whole one. */
  wholeSteps: boolean;
  originM: number;
  /** Null where the rule names no end. */
  validUpToM: number | null;
  /** Relative to the figure at 1000 m, at 2000 m. */
  at2000Factor: number;
  /** Relative to the figure at 1000 m, at 3000 m. */
  at3000Factor: number;
}

const rule = (
  key: NationalAltitudeRow['rule'],
  title: string,
  appliesTo: string,
  increasePercent: number,
  stepM: number,
  wholeSteps: boolean,
  originM: number,
  validUpToM: number | null,
  at2000Factor: number,
  at3000Factor: number,
): NationalAltitudeRow & { status: Status } => ({
  rule: key,
  title,
  appliesTo,
  increasePercent,
  stepM,
  wholeSteps,
  originM,
  validUpToM,
  at2000Factor,
  at3000Factor,
  status: 'seen',
});

// Rule, title, what it applies to; percent, step, whole steps; origin, end; factors at 2000 and 3000 m.
/** Second opinions on thin air; only RD 337/2014 enters a figure, and only where it is the source chosen. */
export const NATIONAL_ALTITUDE_RULES: StandardTable<NationalAltitudeRow> = {
  key: 'national:altitude-rules',
  title: 'Altitude rules of public regulations',
  document: 'National regulations',
  edition: 'as each row names it',
  clause: 'altitude',
  rule: 'rows-as-printed',
  identifiedBy: ['rule'],
  remarks: ['The Chinese line rule has no correction up to 35 kV below 2000 m.'],
  rows: [
    rule('rd-337', 'Spain, RD 337/2014 ITC-RAT 12, 3.3.3', 'clearance', 1.4, 100, true, 1000, 3000, 1.14, 1.28),
    rule('rptd-07', 'Chile, RPTD No 07, 5.6', 'clearance and insulation level', 3, 300, false, 1000, null, 1.1, 1.2),
    rule('china-switchgear', 'Chinese switchgear rule', 'clearance', 10, 1000, false, 1000, null, 1.1, 1.2),
    rule('china-line', 'Chinese line rule', 'clearance', 1, 100, false, 1000, null, 1.1, 1.2),
  ],
};

import type { Status } from '../model';
import { RUS_1724E_200 } from '../sources';
import type { StandardTable } from './table';

export const STRENGTH_RULES = ['NESC 277', 'RUS 1724E-200', 'purchaser standard after ANSI C29.12'] as const;

/** Largest share of its rating that an insulator may be loaded with. */
export interface StrengthShareRow {
  rule: (typeof STRENGTH_RULES)[number];
  insulator: string;
  action: string;
  loadCase: string;
  /** Load over rated strength, at most. */
  maximumRatio: number;
}

const share = (
  rule: StrengthShareRow['rule'],
  insulator: string,
  action: string,
  loadCase: string,
  maximumRatio: number,
  status: Status,
): StrengthShareRow & { status: Status } => ({ rule, insulator, action, loadCase, maximumRatio, status });

const DISTRICT = 'district (Rule 250B)';
const EXTREME = 'extreme wind or ice';
const CERAMIC = 'ceramic or glass suspension';
const COMPOSITE = 'composite suspension';

/** Allowed loads of insulators in North American practice. */
export const INSULATOR_STRENGTH: StandardTable<StrengthShareRow> = {
  key: 'rus-1724e-200:insulator-strength',
  title: 'Allowed load of insulators as share of their rating',
  ...RUS_1724E_200,
  clause: 'chapter 8; NESC Rule 277',
  rule: 'rows-as-printed',
  identifiedBy: ['rule', 'insulator', 'action', 'loadCase'],
  remarks: [
    'District loads of NESC Rule 250B are taken without overload factors.',
    'The three figures of NESC Rule 277 were seen as quoted from the edition of 2002; the figures of the bulletin are from memory.',
  ],
  rows: [
    share('NESC 277', 'any', 'cantilever', DISTRICT, 0.4, 'seen'),
    share('NESC 277', 'any', 'compression', DISTRICT, 0.5, 'seen'),
    share('NESC 277', 'any', 'tension', DISTRICT, 0.5, 'seen'),
    share('RUS 1724E-200', CERAMIC, 'tension', DISTRICT, 0.4, 'memory'),
    share('RUS 1724E-200', CERAMIC, 'tension', EXTREME, 0.65, 'memory'),
    share('RUS 1724E-200', 'ceramic post', 'cantilever', DISTRICT, 0.4, 'memory'),
    share('RUS 1724E-200', COMPOSITE, 'tension', DISTRICT, 0.5, 'memory'),
    share('RUS 1724E-200', COMPOSITE, 'tension', EXTREME, 0.65, 'memory'),
    share(
      'purchaser standard after ANSI C29.12',
      COMPOSITE,
      'routine tension load RTL',
      'factory proof test',
      0.5,
      'seen',
    ),
  ],
};

import type { Status } from '../model';
import type { StandardTable } from './table';

/** Usual number of standard discs (254 to 255 x 146 mm) in a suspension string. */
export interface DiscCountRow {
  /** Line to line, kV r.m.s. */
  nominalVoltageKv: number;
  discsMinimum: number;
  discsMaximum: number;
  /** Where the count comes from. */
  origin: string;
}

const discs = (
  nominalVoltageKv: number,
  discsMinimum: number,
  discsMaximum: number,
  origin: string,
  status: Status,
): DiscCountRow & { status: Status } => ({ nominalVoltageKv, discsMinimum, discsMaximum, origin, status });

/** Usual counts, for checking and never for ordering. */
export const TRADE_DISC_COUNTS: StandardTable<DiscCountRow> = {
  key: 'trade:disc-counts',
  title: 'Usual disc counts by voltage',
  document: 'Rules of the trade',
  edition: 'none',
  clause: 'counts of standard discs by system voltage',
  rule: 'rows-as-printed',
  identifiedBy: ['nominalVoltageKv', 'origin'],
  remarks: [
    'For checking only. Polluted and high sites are outside these counts; tension strings usually carry one or two more.',
  ],
  rows: [
    discs(138, 10, 10, 'R. Alipio and others, lightning performance paper', 'seen'),
    discs(230, 14, 14, 'R. Alipio and others, lightning performance paper', 'seen'),
    discs(132, 7, 7, 'published rule n = kV/(11 sqrt 3) rounded up', 'seen'),
    discs(34.5, 3, 3, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(46, 3, 3, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(69, 4, 4, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(115, 7, 7, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(138, 8, 8, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(161, 10, 10, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(230, 12, 12, 'RUS Bulletin 1724E-200 chapter 8', 'memory'),
    discs(345, 16, 18, 'common practice', 'practice'),
    discs(500, 24, 28, 'common practice', 'practice'),
    discs(765, 30, 36, 'common practice', 'practice'),
    discs(66, 5, 6, 'common practice, IEC-type systems', 'practice'),
    discs(110, 7, 8, 'common practice, IEC-type systems', 'practice'),
    discs(132, 9, 10, 'common practice, IEC-type systems', 'practice'),
    discs(220, 13, 15, 'common practice, IEC-type systems', 'practice'),
    discs(400, 21, 24, 'common practice, IEC-type systems', 'practice'),
    discs(66, 5, 5, 'public examination question bank', 'seen'),
    discs(132, 10, 10, 'public examination question bank', 'seen'),
  ],
};

import type { Status } from '../model';
import type { StandardTable } from './table';

/** Flashover of a string of standard 10 x 5 3/4 in (254 x 146 mm) suspension units. */
export interface StringFlashoverRow {
  /** Units in the string. */
  units: number;
  /** Units times 146 mm. */
  stringLengthMm: number;
  /** 60 Hz, dry, kV r.m.s. */
  dryKvRms: number;
  /** 60 Hz, wet, kV r.m.s. */
  wetKvRms: number;
  /** 50 % impulse, positive, kV peak. */
  impulsePositiveKvPeak: number;
  /** 50 % impulse, negative, kV peak. */
  impulseNegativeKvPeak: number;
}

const flashover = (
  units: number,
  stringLengthMm: number,
  dryKvRms: number,
  wetKvRms: number,
  impulsePositiveKvPeak: number,
  impulseNegativeKvPeak: number,
  status: Status,
): StringFlashoverRow & { status: Status } => ({
  units,
  stringLengthMm,
  dryKvRms,
  wetKvRms,
  impulsePositiveKvPeak,
  impulseNegativeKvPeak,
  status,
});

/** Multi-unit flashover, 1 to 20 units. */
export const STRING_FLASHOVER_254X146: StandardTable<StringFlashoverRow> = {
  key: 'string-flashover-254x146',
  title: 'Flashover of strings of 254 x 146 mm units',
  document: 'American handbooks and ANSI/NEMA C29.2 data',
  edition: 'multi-unit table',
  clause: 'strings of 10 x 5 3/4 in units',
  rule: 'rows-as-printed',
  identifiedBy: ['units'],
  remarks: [
    'Catalogue flashover, not the strength in a tower window: a published lightning study takes 1050 kV for 14 units.',
    'Rows 21 to 30 were not recalled reliably and are left out.',
  ],
  rows: [
    flashover(1, 146, 80, 50, 125, 130, 'memory'),
    flashover(2, 292, 155, 90, 250, 255, 'memory'),
    flashover(3, 438, 215, 130, 355, 340, 'memory'),
    flashover(4, 584, 270, 170, 440, 415, 'memory'),
    flashover(5, 730, 325, 215, 525, 495, 'memory'),
    flashover(6, 876, 380, 255, 610, 585, 'memory'),
    flashover(7, 1022, 435, 295, 695, 670, 'memory'),
    flashover(8, 1168, 485, 335, 780, 760, 'memory'),
    flashover(9, 1314, 540, 375, 860, 845, 'memory'),
    flashover(10, 1460, 590, 415, 945, 930, 'memory'),
    flashover(11, 1606, 640, 455, 1025, 1015, 'memory'),
    flashover(12, 1752, 690, 490, 1105, 1105, 'memory'),
    flashover(13, 1898, 735, 525, 1185, 1190, 'memory'),
    flashover(14, 2044, 785, 565, 1265, 1275, 'memory'),
    flashover(15, 2190, 830, 600, 1345, 1360, 'memory'),
    flashover(16, 2336, 875, 630, 1425, 1440, 'memory'),
    flashover(17, 2482, 920, 660, 1505, 1530, 'memory'),
    flashover(18, 2628, 965, 690, 1585, 1615, 'memory'),
    flashover(19, 2774, 1010, 720, 1665, 1700, 'memory'),
    flashover(20, 2920, 1055, 750, 1745, 1785, 'memory'),
  ],
};

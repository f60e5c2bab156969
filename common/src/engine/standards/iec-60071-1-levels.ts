import type { Status } from '../model';
import { IEC_60071_1 } from '../sources';
import type { StandardTable } from './table';

/** One standard insulation level of range I (1 kV < Um <= 245 kV); lightning holds to earth and between phases. */
export interface RangeIRow {
  /** Highest voltage for equipment Um, line to line, kV r.m.s. */
  highestVoltageKv: number;
  /** Short-duration power-frequency withstand, kV r.m.s. */
  powerFrequencyKv: number;
  /** Lightning impulse withstand, kV peak. */
  lightningKv: number;
  /** Printed in brackets: the withstand between phases is to be proved by further tests. */
  bracketed: boolean;
}

/** One standard insulation level of range II (Um > 245 kV). */
export interface RangeIIRow {
  /** Highest voltage for equipment Um, line to line, kV r.m.s. */
  highestVoltageKv: number;
  /** Switching impulse component of the longitudinal test, kV peak; null is not known. */
  longitudinalKv: number | null;
  /** Switching impulse withstand phase to earth, kV peak. */
  switchingKv: number;
  /** Switching withstand between phases over that to earth. */
  switchingPhaseRatio: number;
  /** Switching impulse withstand between phases, kV peak, rounded to 1 kV as in Table A.3. */
  switchingPhaseToPhaseKv: number;
  /** Lightning impulse withstand, kV peak. */
  lightningKv: number;
  /** How well the longitudinal value and the ratio are known; `status` stands for the pair of withstands. */
  statusRatio: Status;
}

const rangeI = (
  highestVoltageKv: number,
  powerFrequencyKv: number,
  lightningKv: number,
  bracketed: boolean,
  status: Status,
): RangeIRow & { status: Status } => ({ highestVoltageKv, powerFrequencyKv, lightningKv, bracketed, status });

/** Range I, 1 kV < Um <= 245 kV. Read in the Spanish regulations that reproduce the table. */
export const IEC_60071_1_RANGE_I: StandardTable<RangeIRow> = {
  key: 'iec-60071-1:range-i',
  title: 'Standard insulation levels, range I',
  ...IEC_60071_1,
  clause: 'Table 2',
  reproducedIn: 'RD 223/2008 ITC-LAT 07 Table 12; RD 337/2014 ITC-RAT 12 Tables 1 and 2',
  rule: 'rows-as-printed',
  identifiedBy: ['highestVoltageKv', 'powerFrequencyKv', 'lightningKv'],
  remarks: [
    'Bracketed levels of 100 kV and of 245 kV with 275/650 are from memory; for 123 kV the regulation brackets 185 kV only.',
  ],
  rows: [
    rangeI(3.6, 10, 20, false, 'seen'),
    rangeI(3.6, 10, 40, false, 'seen'),
    rangeI(7.2, 20, 40, false, 'seen'),
    rangeI(7.2, 20, 60, false, 'seen'),
    rangeI(12, 28, 60, false, 'seen'),
    rangeI(12, 28, 75, false, 'seen'),
    rangeI(12, 28, 95, false, 'seen'),
    rangeI(17.5, 38, 75, false, 'seen'),
    rangeI(17.5, 38, 95, false, 'seen'),
    rangeI(24, 50, 95, false, 'seen'),
    rangeI(24, 50, 125, false, 'seen'),
    rangeI(24, 50, 145, false, 'seen'),
    rangeI(36, 70, 145, false, 'seen'),
    rangeI(36, 70, 170, false, 'seen'),
    rangeI(52, 95, 250, false, 'seen'),
    rangeI(72.5, 140, 325, false, 'seen'),
    rangeI(100, 150, 380, true, 'memory'),
    rangeI(100, 185, 450, false, 'seen'),
    rangeI(123, 185, 450, true, 'seen'),
    rangeI(123, 230, 550, false, 'seen'),
    rangeI(145, 185, 450, true, 'seen'),
    rangeI(145, 230, 550, false, 'seen'),
    rangeI(145, 275, 650, false, 'seen'),
    rangeI(170, 230, 550, true, 'seen'),
    rangeI(170, 275, 650, false, 'seen'),
    rangeI(170, 325, 750, false, 'seen'),
    rangeI(245, 275, 650, true, 'seen'),
    rangeI(245, 325, 750, true, 'seen'),
    rangeI(245, 360, 850, false, 'seen'),
    rangeI(245, 395, 950, false, 'seen'),
    rangeI(245, 460, 1050, false, 'seen'),
  ],
};

const rangeII = (
  highestVoltageKv: number,
  longitudinalKv: number | null,
  switchingKv: number,
  switchingPhaseRatio: number,
  switchingPhaseToPhaseKv: number,
  lightningKv: number,
  status: Status,
  statusRatio: Status,
): RangeIIRow & { status: Status } => ({
  highestVoltageKv,
  longitudinalKv,
  switchingKv,
  switchingPhaseRatio,
  switchingPhaseToPhaseKv,
  lightningKv,
  status,
  statusRatio,
});

/** Range II, Um > 245 kV. The 420 kV rows were read; of others the pair or nothing. */
export const IEC_60071_1_RANGE_II: StandardTable<RangeIIRow> = {
  key: 'iec-60071-1:range-ii',
  title: 'Standard insulation levels, range II',
  ...IEC_60071_1,
  clause: 'Table 3',
  reproducedIn: 'RD 223/2008 ITC-LAT 07 Table 13 (420 kV); RPTD No 05 of Chile (pairs of 362, 550 and 800 kV)',
  rule: 'rows-as-printed',
  identifiedBy: ['highestVoltageKv', 'switchingKv', 'switchingPhaseRatio', 'lightningKv'],
  remarks: [
    'Um 550 and 800 kV were 525 and 765 kV in editions before 2010.',
    '550 kV with 1175 kV: one edition prints 1050 kV as the longitudinal value.',
    '1100 and 1200 kV were added by Amendment 1:2010; how their columns belong together is least certain.',
    'RPTD No 05 lists 1200 kV with 2100/1550 kV, below the lowest row here.',
  ],
  rows: [
    rangeII(300, 750, 750, 1.5, 1125, 850, 'memory', 'memory'),
    rangeII(300, 750, 750, 1.5, 1125, 950, 'memory', 'memory'),
    rangeII(300, 750, 850, 1.5, 1275, 950, 'memory', 'memory'),
    rangeII(300, 750, 850, 1.5, 1275, 1050, 'memory', 'memory'),
    rangeII(362, 850, 850, 1.5, 1275, 950, 'memory', 'memory'),
    rangeII(362, 850, 850, 1.5, 1275, 1050, 'memory', 'memory'),
    rangeII(362, 850, 950, 1.5, 1425, 1050, 'memory', 'memory'),
    rangeII(362, 850, 950, 1.5, 1425, 1175, 'seen', 'memory'),
    rangeII(420, 850, 850, 1.6, 1360, 1050, 'seen', 'seen'),
    rangeII(420, 850, 850, 1.6, 1360, 1175, 'seen', 'seen'),
    rangeII(420, 950, 950, 1.5, 1425, 1175, 'seen', 'seen'),
    rangeII(420, 950, 950, 1.5, 1425, 1300, 'seen', 'seen'),
    rangeII(420, 950, 1050, 1.5, 1575, 1300, 'seen', 'seen'),
    rangeII(420, 950, 1050, 1.5, 1575, 1425, 'seen', 'seen'),
    rangeII(550, 950, 950, 1.7, 1615, 1175, 'memory', 'memory'),
    rangeII(550, 950, 950, 1.7, 1615, 1300, 'memory', 'memory'),
    rangeII(550, 950, 1050, 1.6, 1680, 1300, 'memory', 'memory'),
    rangeII(550, 950, 1050, 1.6, 1680, 1425, 'memory', 'memory'),
    rangeII(550, 950, 1175, 1.5, 1763, 1425, 'memory', 'memory'),
    rangeII(550, 950, 1175, 1.5, 1763, 1550, 'seen', 'memory'),
    rangeII(800, 1175, 1300, 1.7, 2210, 1675, 'memory', 'memory'),
    rangeII(800, 1175, 1300, 1.7, 2210, 1800, 'memory', 'memory'),
    rangeII(800, 1175, 1425, 1.7, 2423, 1800, 'seen', 'memory'),
    rangeII(800, 1175, 1425, 1.7, 2423, 1950, 'memory', 'memory'),
    rangeII(800, 1175, 1550, 1.6, 2480, 1950, 'memory', 'memory'),
    rangeII(800, 1175, 1550, 1.6, 2480, 2100, 'memory', 'memory'),
    rangeII(1100, null, 1425, 1.7, 2423, 1950, 'memory', 'memory'),
    rangeII(1100, null, 1425, 1.7, 2423, 2100, 'memory', 'memory'),
    rangeII(1100, 1425, 1550, 1.7, 2635, 2100, 'memory', 'memory'),
    rangeII(1100, 1425, 1550, 1.7, 2635, 2250, 'memory', 'memory'),
    rangeII(1100, 1550, 1675, 1.65, 2764, 2250, 'memory', 'memory'),
    rangeII(1100, 1550, 1675, 1.65, 2764, 2400, 'memory', 'memory'),
    rangeII(1100, 1675, 1800, 1.6, 2880, 2400, 'memory', 'memory'),
    rangeII(1100, 1675, 1800, 1.6, 2880, 2550, 'memory', 'memory'),
    rangeII(1200, 1550, 1675, 1.7, 2848, 2100, 'memory', 'memory'),
    rangeII(1200, 1550, 1675, 1.7, 2848, 2250, 'memory', 'memory'),
    rangeII(1200, 1675, 1800, 1.65, 2970, 2250, 'memory', 'memory'),
    rangeII(1200, 1675, 1800, 1.65, 2970, 2400, 'memory', 'memory'),
    rangeII(1200, 1800, 1950, 1.6, 3120, 2550, 'memory', 'memory'),
    rangeII(1200, 1800, 1950, 1.6, 3120, 2700, 'memory', 'memory'),
  ],
};

import type { Status } from '../model';
import { IEC_60071_1 } from '../sources';
import type { StandardTable } from './table';

/** Air clearance for one lightning impulse withstand, up to 1000 m. */
export interface LightningClearanceRow {
  /** Lightning impulse withstand, kV peak. */
  lightningKv: number;
  /** Rod to structure; between phases as well. mm. */
  rodStructureMm: number;
  /** Conductor to structure, mm; null where one value serves both shapes. */
  conductorStructureMm: number | null;
  /** How well the conductor-structure figure is known; `status` stands for rod-structure. */
  statusConductorStructure: Status | null;
}

/** Air clearance to earth for one switching impulse withstand, range II, up to 1000 m. */
export interface SwitchingEarthClearanceRow {
  /** Switching impulse withstand phase to earth, kV peak. */
  switchingKv: number;
  /** Conductor to structure, mm. */
  conductorStructureMm: number;
  /** Rod to structure, mm. */
  rodStructureMm: number;
  /** How well the conductor-structure figure is known; `status` stands for rod-structure. */
  statusConductorStructure: Status;
}

/** Air clearance between phases for one switching impulse withstand, range II, up to 1000 m. */
export interface SwitchingPhaseClearanceRow {
  /** Switching impulse withstand phase to earth, kV peak. */
  switchingKv: number;
  /** Between phases over to earth. */
  switchingPhaseRatio: number;
  /** Switching impulse withstand between phases, kV peak. */
  switchingPhaseToPhaseKv: number;
  /** Parallel conductors, mm. */
  conductorConductorMm: number;
  /** Rod to conductor, mm. */
  rodConductorMm: number;
  /** How well the conductor-conductor figure is known; `status` stands for rod-conductor. */
  statusConductorConductor: Status;
}

const a1 = (
  lightningKv: number,
  rodStructureMm: number,
  conductorStructureMm: number | null,
  status: Status,
  statusConductorStructure: Status | null,
): LightningClearanceRow & { status: Status } => ({
  lightningKv,
  rodStructureMm,
  conductorStructureMm,
  status,
  statusConductorStructure,
});

/** Lightning clearances to earth by shape; the rod-structure column also serves between phases. */
export const IEC_60071_1_TABLE_A1: StandardTable<LightningClearanceRow> = {
  key: 'iec-60071-1:a1',
  title: 'Minimum air clearances for the lightning impulse withstand',
  ...IEC_60071_1,
  clause: 'Annex A, Table A.1',
  reproducedIn: 'RD 337/2014 ITC-RAT 12 Tables 1 to 3',
  rule: 'linear',
  identifiedBy: ['lightningKv'],
  remarks: [
    'Electrical minimum only: no allowance for tolerances, movement by wind or short-circuit, or safety of persons. Altitude up to 1000 m.',
    'From 450 kV upward the rod-structure column is 500 kV per metre exactly.',
    '1425 kV, conductor to structure: read only as an upper bound.',
  ],
  rows: [
    a1(20, 60, null, 'seen', null),
    a1(40, 60, null, 'seen', null),
    a1(60, 90, null, 'seen', null),
    a1(75, 120, null, 'seen', null),
    a1(95, 160, null, 'seen', null),
    a1(125, 220, null, 'seen', null),
    a1(145, 270, null, 'seen', null),
    a1(170, 320, null, 'seen', null),
    a1(200, 380, null, 'memory', null),
    a1(250, 480, null, 'seen', null),
    a1(325, 630, null, 'seen', null),
    a1(380, 750, null, 'memory', null),
    a1(450, 900, null, 'seen', null),
    a1(550, 1100, null, 'seen', null),
    a1(650, 1300, null, 'seen', null),
    a1(750, 1500, null, 'seen', null),
    a1(850, 1700, 1600, 'seen', 'memory'),
    a1(950, 1900, 1700, 'seen', 'memory'),
    a1(1050, 2100, 1900, 'seen', 'seen'),
    a1(1175, 2350, 2200, 'memory', 'seen'),
    a1(1300, 2600, 2400, 'memory', 'seen'),
    a1(1425, 2850, 2600, 'memory', 'memory'),
    a1(1550, 3100, 2900, 'memory', 'memory'),
    a1(1675, 3350, 3100, 'memory', 'memory'),
    a1(1800, 3600, 3300, 'memory', 'memory'),
    a1(1950, 3900, 3600, 'memory', 'memory'),
    a1(2100, 4200, 3900, 'memory', 'memory'),
    a1(2250, 4500, 4150, 'memory', 'memory'),
    a1(2400, 4800, 4450, 'memory', 'memory'),
    a1(2550, 5100, 4700, 'memory', 'memory'),
    a1(2700, 5400, 5000, 'memory', 'memory'),
  ],
};

const a2 = (
  switchingKv: number,
  conductorStructureMm: number,
  rodStructureMm: number,
  status: Status,
  statusConductorStructure: Status,
): SwitchingEarthClearanceRow & { status: Status } => ({
  switchingKv,
  conductorStructureMm,
  rodStructureMm,
  status,
  statusConductorStructure,
});

/** Switching clearances phase to earth by shape, range II. */
export const IEC_60071_1_TABLE_A2: StandardTable<SwitchingEarthClearanceRow> = {
  key: 'iec-60071-1:a2',
  title: 'Minimum air clearances to earth for the switching impulse withstand, range II',
  ...IEC_60071_1,
  clause: 'Annex A, Table A.2',
  reproducedIn: 'RD 337/2014 ITC-RAT 12 Table 3; CEA (India) guidelines for 765 kV substations, clause 4.1(i)',
  rule: 'linear',
  identifiedBy: ['switchingKv'],
  remarks: [
    'Electrical minimum only: no allowance for tolerances, movement by wind or short-circuit, or safety of persons. Altitude up to 1000 m.',
    'The clearance to use is the larger of this figure and that of Table A.1.',
    'That the 765 kV clearances of the Indian guideline belong to 1550 kV is concluded from the exact match.',
  ],
  rows: [
    a2(750, 1600, 1900, 'memory', 'memory'),
    a2(850, 1800, 2400, 'seen', 'memory'),
    a2(950, 2200, 2900, 'seen', 'seen'),
    a2(1050, 2600, 3400, 'seen', 'seen'),
    a2(1175, 3100, 4100, 'memory', 'memory'),
    a2(1300, 3600, 4800, 'memory', 'memory'),
    a2(1425, 4200, 5600, 'memory', 'memory'),
    a2(1550, 4900, 6400, 'seen', 'seen'),
    a2(1675, 5600, 7400, 'memory', 'memory'),
    a2(1800, 6300, 8300, 'memory', 'memory'),
    a2(1950, 7200, 9500, 'memory', 'memory'),
  ],
};

const a3 = (
  switchingKv: number,
  switchingPhaseRatio: number,
  switchingPhaseToPhaseKv: number,
  conductorConductorMm: number,
  rodConductorMm: number,
  status: Status,
  statusConductorConductor: Status,
): SwitchingPhaseClearanceRow & { status: Status } => ({
  switchingKv,
  switchingPhaseRatio,
  switchingPhaseToPhaseKv,
  conductorConductorMm,
  rodConductorMm,
  status,
  statusConductorConductor,
});

/** Switching clearances between phases by shape, range II. */
export const IEC_60071_1_TABLE_A3: StandardTable<SwitchingPhaseClearanceRow> = {
  key: 'iec-60071-1:a3',
  title: 'Minimum air clearances between phases for the switching impulse withstand, range II',
  ...IEC_60071_1,
  clause: 'Annex A, Table A.3',
  reproducedIn:
    'RD 337/2014 ITC-RAT 12 Table 3; CEA (India) guidelines for 765 kV substations, clause 4.1(i); RPTD No 07 of Chile, Table 3 less 2.00 m',
  rule: 'linear',
  identifiedBy: ['switchingKv', 'switchingPhaseRatio'],
  remarks: [
    'Electrical minimum only: no allowance for tolerances, movement by wind or short-circuit, or safety of persons. Altitude up to 1000 m.',
    'Rows from 1550 kV with ratio 1.7 onward were added in 2010 and are least certain.',
  ],
  rows: [
    a3(750, 1.5, 1125, 2300, 2600, 'memory', 'memory'),
    a3(850, 1.5, 1275, 2600, 3100, 'derived', 'memory'),
    a3(850, 1.6, 1360, 2900, 3400, 'seen', 'seen'),
    a3(950, 1.5, 1425, 3100, 3600, 'seen', 'seen'),
    a3(950, 1.7, 1615, 3700, 4300, 'memory', 'memory'),
    a3(1050, 1.5, 1575, 3600, 4200, 'seen', 'seen'),
    a3(1050, 1.6, 1680, 3900, 4600, 'memory', 'memory'),
    a3(1175, 1.5, 1763, 4200, 5000, 'derived', 'memory'),
    a3(1300, 1.7, 2210, 6100, 7400, 'memory', 'memory'),
    a3(1425, 1.7, 2423, 7200, 9000, 'memory', 'memory'),
    a3(1550, 1.6, 2480, 7600, 9400, 'seen', 'seen'),
    a3(1550, 1.7, 2635, 8400, 10000, 'memory', 'memory'),
    a3(1675, 1.65, 2764, 9100, 10900, 'memory', 'memory'),
    a3(1675, 1.7, 2848, 9600, 11400, 'memory', 'memory'),
    a3(1800, 1.6, 2880, 9800, 11600, 'memory', 'memory'),
    a3(1800, 1.65, 2970, 10300, 12300, 'memory', 'memory'),
    a3(1950, 1.6, 3120, 11200, 13300, 'memory', 'memory'),
  ],
};

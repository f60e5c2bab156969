import type { Status } from '../model';
import { IEC_61936_1 } from '../sources';
import type { StandardTable } from './table';

/** Minimum clearance N in a station, up to 1000 m; range I by indoor and outdoor, range II by shape. */
export interface StationClearanceRow {
  range: 'I' | 'II';
  /** Um, line to line, kV r.m.s.; two where editions differ. */
  highestVoltagesKv: number[];
  /** kV r.m.s. */
  powerFrequencyKv: number | null;
  /** Lightning impulse withstands that share the row, kV peak. */
  lightningKv: number[];
  /** Phase to earth, kV peak. */
  switchingKv: number | null;
  /** N to earth and between phases, indoor, range I. */
  indoorMm: number | null;
  /** N to earth and between phases, outdoor, range I. */
  outdoorMm: number | null;
  /** N to earth, conductor to structure, one for each lightning level where they differ. */
  conductorStructureMm: number[] | null;
  /** N to earth, rod to structure. */
  rodStructureMm: number | null;
  /** kV peak. */
  switchingPhaseToPhaseKv: number | null;
  conductorConductorMm: number | null;
  rodConductorMm: number | null;
  /** How well the levels are known; `status` stands for the distances. */
  statusLevels: Status;
}

const NO_RANGE_I = { powerFrequencyKv: null, indoorMm: null, outdoorMm: null };
const NO_RANGE_II = {
  switchingKv: null,
  conductorStructureMm: null,
  rodStructureMm: null,
  switchingPhaseToPhaseKv: null,
  conductorConductorMm: null,
  rodConductorMm: null,
};

const rangeI = (
  highestVoltageKv: number,
  powerFrequencyKv: number,
  lightningKv: number,
  indoorMm: number,
  outdoorMm: number,
  status: Status,
): StationClearanceRow & { status: Status } => ({
  ...NO_RANGE_II,
  range: 'I',
  highestVoltagesKv: [highestVoltageKv],
  powerFrequencyKv,
  lightningKv: [lightningKv],
  indoorMm,
  outdoorMm,
  status,
  statusLevels: status,
});

const rangeII = (
  highestVoltagesKv: number[],
  lightningKv: number[],
  switchingKv: number,
  conductorStructureMm: number[],
  rodStructureMm: number,
  switchingPhaseToPhaseKv: number,
  conductorConductorMm: number,
  rodConductorMm: number,
  status: Status,
  statusLevels: Status,
): StationClearanceRow & { status: Status } => ({
  ...NO_RANGE_I,
  range: 'II',
  highestVoltagesKv,
  lightningKv,
  switchingKv,
  conductorStructureMm,
  rodStructureMm,
  switchingPhaseToPhaseKv,
  conductorConductorMm,
  rodConductorMm,
  status,
  statusLevels,
});

/** N by insulation level. */
export const IEC_61936_1_CLEARANCES: StandardTable<StationClearanceRow> = {
  key: 'iec-61936-1:clearances',
  title: 'Minimum clearances in air of stations',
  ...IEC_61936_1,
  clause: 'Tables 1 and 2',
  reproducedIn: 'RD 337/2014 ITC-RAT 12 Tables 1 to 3; CEA (India) guidelines for 765 kV substations, clause 4.1(i)',
  rule: 'rows-as-printed',
  identifiedBy: ['highestVoltagesKv', 'lightningKv', 'switchingKv'],
  remarks: [
    'Held as a cross-check of Tables A.1 and A.2 of IEC 60071-1. Altitude up to 1000 m.',
    'Derived: every figure of the row was read for the same withstand in a row of another Um.',
  ],
  rows: [
    rangeI(3.6, 10, 20, 60, 120, 'seen'),
    rangeI(3.6, 10, 40, 60, 120, 'seen'),
    rangeI(7.2, 20, 40, 60, 120, 'seen'),
    rangeI(7.2, 20, 60, 90, 120, 'seen'),
    rangeI(12, 28, 60, 90, 150, 'seen'),
    rangeI(12, 28, 75, 120, 150, 'seen'),
    rangeI(12, 28, 95, 160, 160, 'derived'),
    rangeI(17.5, 38, 75, 120, 160, 'seen'),
    rangeI(17.5, 38, 95, 160, 160, 'seen'),
    rangeI(24, 50, 95, 160, 160, 'seen'),
    rangeI(24, 50, 125, 220, 220, 'seen'),
    rangeI(24, 50, 145, 270, 270, 'seen'),
    rangeI(36, 70, 145, 270, 270, 'seen'),
    rangeI(36, 70, 170, 320, 320, 'seen'),
    rangeI(52, 95, 250, 480, 480, 'seen'),
    rangeI(72.5, 140, 325, 630, 630, 'seen'),
    rangeI(123, 185, 450, 900, 900, 'seen'),
    rangeI(123, 230, 550, 1100, 1100, 'seen'),
    rangeI(145, 185, 450, 900, 900, 'seen'),
    rangeI(145, 230, 550, 1100, 1100, 'seen'),
    rangeI(145, 275, 650, 1300, 1300, 'seen'),
    rangeI(170, 230, 550, 1100, 1100, 'seen'),
    rangeI(170, 275, 650, 1300, 1300, 'seen'),
    rangeI(170, 325, 750, 1500, 1500, 'seen'),
    rangeI(245, 325, 750, 1500, 1500, 'seen'),
    rangeI(245, 360, 850, 1700, 1700, 'seen'),
    rangeI(245, 395, 950, 1900, 1900, 'seen'),
    rangeI(245, 460, 1050, 2100, 2100, 'seen'),
    rangeI(245, 275, 650, 1300, 1300, 'derived'),
    rangeII([300], [850, 950], 750, [1600, 1700], 1900, 1125, 2300, 2600, 'memory', 'memory'),
    rangeII([300], [950, 1050], 850, [1800, 1900], 2400, 1275, 2600, 3100, 'memory', 'memory'),
    rangeII([362], [950, 1050], 850, [1800, 1900], 2400, 1275, 2600, 3100, 'memory', 'memory'),
    rangeII([362], [1050, 1175], 950, [2200], 2900, 1425, 3100, 3600, 'derived', 'derived'),
    rangeII([420], [1050], 850, [1900], 2400, 1360, 2900, 3400, 'seen', 'seen'),
    rangeII([420], [1175], 850, [2200], 2400, 1360, 2900, 3400, 'seen', 'seen'),
    rangeII([420], [1175], 950, [2200], 2900, 1425, 3100, 3600, 'seen', 'seen'),
    rangeII([420], [1300], 950, [2400], 2900, 1425, 3100, 3600, 'seen', 'seen'),
    rangeII([420], [1300], 1050, [2600], 3400, 1575, 3600, 4200, 'seen', 'seen'),
    rangeII([420], [1425], 1050, [2600], 3400, 1575, 3600, 4200, 'seen', 'seen'),
    rangeII([525, 550], [1175, 1300], 950, [2200, 2400], 2900, 1615, 3700, 4300, 'memory', 'memory'),
    rangeII([525, 550], [1300, 1425], 1050, [2600], 3400, 1680, 3900, 4600, 'memory', 'memory'),
    rangeII([525, 550], [1425, 1550], 1175, [3100], 4100, 1763, 4200, 5000, 'memory', 'memory'),
    rangeII([765, 800], [1675, 1800], 1300, [3600], 4800, 2210, 6100, 7400, 'memory', 'memory'),
    rangeII([765, 800], [1800, 1950], 1425, [4200], 5600, 2423, 7200, 9000, 'memory', 'memory'),
    rangeII([765, 800], [1950, 2100], 1550, [4900], 6400, 2480, 7600, 9400, 'seen', 'memory'),
  ],
};

import type { Status } from '../model';
import { EN_50341_1 } from '../sources';
import type { StandardTable } from './table';

/** Empirical clearances of an overhead line, 0 to 1000 m. */
export interface LineClearanceRow {
  /** Highest system voltage Us, line to line, kV r.m.s. */
  highestVoltageKv: number;
  /** Del, live part to earth, m. */
  delM: number;
  /** Dpp, between phases, m. */
  dppM: number;
  /** Power frequency under extreme wind, to earth, m; null below 52 kV. */
  d50HzPhaseToEarthM: number | null;
  /** Power frequency under extreme wind, between phases, m; null below 52 kV. */
  d50HzPhaseToPhaseM: number | null;
  /** How well the two power-frequency distances are known; `status` stands for Del and Dpp. */
  statusD50Hz: Status | null;
}

/** Altitude factor of the strength of a gap, by the voltage the gap withstands (kV peak); 1 at sea level. */
export interface LineAltitudeRow {
  /** Altitude above sea level, m. */
  altitudeM: number;
  /** Gaps up to 200 kV. */
  upTo200KvFactor: number;
  /** 201 to 400 kV. */
  upTo400KvFactor: number;
  /** 401 to 700 kV. */
  upTo700KvFactor: number;
  /** 701 to 1100 kV. */
  upTo1100KvFactor: number;
  /** Above 1100 kV. */
  above1100KvFactor: number;
}

/** Slow-front gap factor Kg of a configuration. */
export interface GapFactorRow {
  gap: 'window' | 'structure' | 'obstacle' | 'phase-to-phase';
  configuration: string;
  /** Kg; the fast-front and power-frequency factors follow from it. */
  slowFrontGapFactor: number;
}

const clearance = (
  highestVoltageKv: number,
  delM: number,
  dppM: number,
  d50HzPhaseToEarthM: number | null,
  d50HzPhaseToPhaseM: number | null,
  status: Status,
  statusD50Hz: Status | null,
): LineClearanceRow & { status: Status } => ({
  highestVoltageKv,
  delM,
  dppM,
  d50HzPhaseToEarthM,
  d50HzPhaseToPhaseM,
  status,
  statusD50Hz,
});

/** Del, Dpp and D50Hz by highest system voltage. */
export const EN_50341_1_CLEARANCES: StandardTable<LineClearanceRow> = {
  key: 'en-50341-1:clearances',
  title: 'Empirical clearances of overhead lines',
  ...EN_50341_1,
  clause: 'Table 5.5; up to 45 kV EN 50423-1',
  reproducedIn: 'RD 223/2008 ITC-LAT 07 Table 15',
  rule: 'linear',
  identifiedBy: ['highestVoltageKv'],
  remarks: [
    'Valid from 0 to 1000 m; the minimum between live parts and the support is Del and not below 0.20 m.',
    'The power-frequency distances agree with the formula of Annex E within 0.01 m.',
    'Del depends on the insulation of the string: this table is one choice among several.',
  ],
  rows: [
    clearance(3.6, 0.08, 0.1, null, null, 'seen', null),
    clearance(7.2, 0.09, 0.1, null, null, 'seen', null),
    clearance(12, 0.12, 0.15, null, null, 'seen', null),
    clearance(17.5, 0.16, 0.2, null, null, 'seen', null),
    clearance(24, 0.22, 0.25, null, null, 'seen', null),
    clearance(30, 0.27, 0.33, null, null, 'seen', null),
    clearance(36, 0.35, 0.4, null, null, 'seen', null),
    clearance(52, 0.6, 0.7, 0.11, 0.17, 'seen', 'derived'),
    clearance(72.5, 0.7, 0.8, 0.15, 0.23, 'seen', 'derived'),
    clearance(82.5, 0.75, 0.85, 0.16, 0.26, 'memory', 'derived'),
    clearance(100, 0.9, 1.05, 0.19, 0.3, 'memory', 'seen'),
    clearance(123, 1, 1.15, 0.23, 0.37, 'seen', 'derived'),
    clearance(145, 1.2, 1.4, 0.27, 0.42, 'seen', 'derived'),
    clearance(170, 1.3, 1.5, 0.31, 0.49, 'seen', 'derived'),
    clearance(245, 1.7, 2, 0.43, 0.69, 'seen', 'derived'),
    clearance(300, 2.1, 2.4, 0.51, 0.83, 'memory', 'derived'),
    clearance(420, 2.8, 3.2, 0.7, 1.17, 'seen', 'seen'),
    clearance(525, 3.5, 4, 0.86, 1.47, 'memory', 'derived'),
    clearance(765, 4.9, 5.6, 1.28, 2.3, 'memory', 'derived'),
  ],
};

const altitude = (
  altitudeM: number,
  upTo200KvFactor: number,
  upTo400KvFactor: number,
  upTo700KvFactor: number,
  upTo1100KvFactor: number,
  above1100KvFactor: number,
  status: Status,
): LineAltitudeRow & { status: Status } => ({
  altitudeM,
  upTo200KvFactor,
  upTo400KvFactor,
  upTo700KvFactor,
  upTo1100KvFactor,
  above1100KvFactor,
  status,
});

/** ka of the line method, never to be mixed with the Ka that multiplies a voltage. */
export const EN_50341_1_ALTITUDE: StandardTable<LineAltitudeRow> = {
  key: 'en-50341-1:altitude',
  title: 'Altitude factor of overhead-line clearances',
  ...EN_50341_1,
  clause: 'Annex E, Table E.4',
  reproducedIn: 'OEVE/OENORM EN 50341, Annex E',
  rule: 'linear',
  identifiedBy: ['altitudeM'],
  remarks: [
    'The factor multiplies the strength and starts at sea level; the law is weaker than the exponent 1 of IEC 60071-2.',
    'Columns by the withstand voltage of the gap; for power frequency its peak.',
  ],
  rows: [
    altitude(0, 1, 1, 1, 1, 1, 'seen'),
    altitude(100, 0.994, 0.995, 0.997, 0.998, 0.999, 'seen'),
    altitude(300, 0.982, 0.985, 0.99, 0.993, 0.996, 'seen'),
    altitude(500, 0.97, 0.975, 0.982, 0.987, 0.992, 'seen'),
    altitude(1000, 0.938, 0.946, 0.959, 0.97, 0.978, 'seen'),
    altitude(1500, 0.904, 0.915, 0.934, 0.948, 0.96, 'seen'),
    altitude(2000, 0.87, 0.883, 0.906, 0.923, 0.938, 'seen'),
    altitude(2500, 0.834, 0.849, 0.875, 0.896, 0.913, 'seen'),
    altitude(3000, 0.798, 0.815, 0.844, 0.867, 0.885, 'seen'),
  ],
};

const gapFactor = (
  gap: GapFactorRow['gap'],
  configuration: string,
  slowFrontGapFactor: number,
  status: Status,
): GapFactorRow & { status: Status } => ({ gap, configuration, slowFrontGapFactor, status });

/** Kg of the configurations of Annex E. */
export const EN_50341_1_GAP_FACTORS: StandardTable<GapFactorRow> = {
  key: 'en-50341-1:gap-factors',
  title: 'Gap factors of overhead-line configurations',
  ...EN_50341_1,
  clause: 'Annex E, Table E.2',
  reproducedIn: 'OEVE/OENORM EN 50341, Annex E',
  rule: 'rows-as-printed',
  identifiedBy: ['gap'],
  remarks: ['Other values backed by test may be used (note of Table E.2).'],
  rows: [
    gapFactor('obstacle', 'conductor to obstacle (external clearance)', 1.3, 'seen'),
    gapFactor('window', 'conductor to tower window (suspension or V string in the window)', 1.25, 'seen'),
    gapFactor('structure', 'conductor to tower structure (suspension string at crossarm end; V strings)', 1.45, 'seen'),
    gapFactor('phase-to-phase', 'conductor to conductor (internal clearance)', 1.6, 'seen'),
  ],
};

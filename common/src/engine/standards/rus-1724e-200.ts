import type { ContaminationLevel, Status } from '../model';
import { RUS_1724E_200 } from '../sources';
import type { StandardTable } from './table';

/** Recommended insulation of tangent and small-angle structures at sea level, 254 x 146 mm units. */
export interface SuspensionLevelRow {
  /** Line to line, kV r.m.s. */
  nominalVoltageKv: number;
  /** Maximum operating voltage, line to line, kV r.m.s. */
  maximumVoltageKv: number;
  /** How well the maximum voltage is known; `status` stands for the rest of the row. */
  statusMaximumVoltage: Status;
  /** Units in a suspension string. */
  units: number;
  dryKvRms: number;
  wetKvRms: number;
  impulsePositiveKvPeak: number;
  impulseNegativeKvPeak: number;
  /** Leakage distance of the string, in. */
  leakageIn: number;
  /** The same, ft. */
  leakageFt: number;
}

/** Leakage guidance in inches per kV r.m.s. line to ground. */
export interface ContaminationRow {
  /** A: the bulletin; B: the guide for contaminated environments of 1979. */
  rowSet: 'A' | 'B';
  contamination: ContaminationLevel;
  esddMinimumMgPerCm2: number;
  esddMaximumMgPerCm2: number | null;
  /** Lower figure. */
  leakageMinimumInPerKv: number;
  /** Upper figure; null where only the lower is known. */
  leakageMaximumInPerKv: number | null;
  stringType: 'any' | 'I-string' | 'V-string';
}

const level = (
  nominalVoltageKv: number,
  maximumVoltageKv: number,
  statusMaximumVoltage: Status,
  units: number,
  dryKvRms: number,
  wetKvRms: number,
  impulsePositiveKvPeak: number,
  impulseNegativeKvPeak: number,
  leakageIn: number,
  leakageFt: number,
  status: Status,
): SuspensionLevelRow & { status: Status } => ({
  nominalVoltageKv,
  maximumVoltageKv,
  statusMaximumVoltage,
  units,
  dryKvRms,
  wetKvRms,
  impulsePositiveKvPeak,
  impulseNegativeKvPeak,
  leakageIn,
  leakageFt,
  status,
});

// Nominal, maximum, its status; units; dry, wet; impulse +, -; leakage in, ft.
/** Suspension levels at sea level; nothing is recalled above 230 kV. */
export const RUS_SUSPENSION_LEVELS: StandardTable<SuspensionLevelRow> = {
  key: 'rus-1724e-200:suspension-levels',
  title: 'Recommended suspension insulation levels',
  ...RUS_1724E_200,
  clause: 'chapter 8',
  reproducedIn: 'Revised pages for Bulletin 1724E-200, par. 4.2.2 (maximum voltages of 69 to 230 kV)',
  rule: 'next-higher-row',
  identifiedBy: ['nominalVoltageKv'],
  remarks: ['Only the maximum operating voltages of 69 to 230 kV were read; the table page itself was not.'],
  rows: [
    level(34.5, 36.2, 'memory', 3, 215, 130, 355, 340, 34.5, 2.88, 'memory'),
    level(46, 48.3, 'memory', 3, 215, 130, 355, 340, 34.5, 2.88, 'memory'),
    level(69, 72.5, 'seen', 4, 270, 170, 440, 415, 46, 3.83, 'memory'),
    level(115, 121, 'seen', 7, 435, 295, 695, 670, 80.5, 6.71, 'memory'),
    level(138, 145, 'seen', 8, 485, 335, 780, 760, 92, 7.67, 'memory'),
    level(161, 169, 'seen', 10, 590, 415, 945, 930, 115, 9.58, 'memory'),
    level(230, 242, 'seen', 12, 690, 490, 1105, 1105, 138, 11.5, 'memory'),
  ],
};

const leakage = (
  rowSet: 'A' | 'B',
  contamination: ContaminationLevel,
  esddMinimumMgPerCm2: number,
  esddMaximumMgPerCm2: number | null,
  leakageMinimumInPerKv: number,
  leakageMaximumInPerKv: number | null,
  stringType: 'any' | 'I-string' | 'V-string',
  status: Status,
): ContaminationRow & { status: Status } => ({
  rowSet,
  contamination,
  esddMinimumMgPerCm2,
  esddMaximumMgPerCm2,
  leakageMinimumInPerKv,
  leakageMaximumInPerKv,
  stringType,
  status,
});

/** Inches per kV line to ground; never converted from or to class letters. */
export const RUS_CONTAMINATION: StandardTable<ContaminationRow> = {
  key: 'rus-1724e-200:contamination',
  title: 'Leakage by contamination level',
  document:
    'RUS Bulletins 1724E-200 and 1724E-220; row set B: IEEE working group guide on insulators in contaminated environments',
  edition: '2005; 1979',
  clause: 'chapter 8',
  rule: 'rows-as-printed',
  identifiedBy: ['rowSet', 'contamination', 'stringType'],
  remarks: ['Every figure is from memory. Use the upper figure where no measurement supports the lower.'],
  rows: [
    leakage('A', 'light', 0.03, 0.06, 1, 1.25, 'any', 'memory'),
    leakage('A', 'moderate', 0.06, 0.1, 1.5, 1.75, 'any', 'memory'),
    leakage('A', 'heavy', 0.1, 0.25, 2, 2.5, 'any', 'memory'),
    leakage('A', 'very-heavy', 0.25, 0.4, 2.75, null, 'any', 'memory'),
    leakage('B', 'very-light', 0, 0.03, 0.94, 0.94, 'I-string', 'memory'),
    leakage('B', 'light', 0.03, 0.06, 1.18, 1.18, 'I-string', 'memory'),
    leakage('B', 'moderate', 0.06, 0.1, 1.34, 1.34, 'I-string', 'memory'),
    leakage('B', 'heavy', 0.1, null, 1.59, 1.59, 'I-string', 'memory'),
    leakage('B', 'very-light', 0, 0.03, 0.8, 0.8, 'V-string', 'memory'),
    leakage('B', 'light', 0.03, 0.06, 0.97, 0.97, 'V-string', 'memory'),
    leakage('B', 'moderate', 0.06, 0.1, 1.05, 1.05, 'V-string', 'memory'),
    leakage('B', 'heavy', 0.1, null, 1.19, 1.19, 'V-string', 'memory'),
  ],
};

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

export const SWING_CONDITIONS = ['no-wind', 'moderate-wind', 'high-wind'] as const;
export const SWING_PARTS = ['structure-or-guy', 'structure', 'jointly-used-structure', 'anchor-guy'] as const;

/** Least distance from a conductor to what it swings toward, measured from the live part. */
export interface SwingClearanceRow {
  condition: (typeof SWING_CONDITIONS)[number];
  /** Line to line, kV r.m.s. */
  nominalVoltageKv: number;
  /** Maximum operating voltage, line to line, kV r.m.s. */
  maximumVoltageKv: number;
  /** Units of 254 x 146 mm that the row is written for. */
  units: number;
  clearanceTo: (typeof SWING_PARTS)[number];
  clearanceIn: number;
  /** NESC Table 235-6 at the maximum operating voltage; moderate wind only. */
  nescIn: number | null;
  /** The same, up to the next inch. */
  nescRoundedUpIn: number | null;
  /** Adder for every 1,000 ft or part above 3,300 ft, in. */
  nescAdderIn: number | null;
  /** How well the NESC figures are known; `status` stands for the bulletin's. */
  statusNesc: Status | null;
}

const swing = (
  condition: SwingClearanceRow['condition'],
  nominalVoltageKv: number,
  maximumVoltageKv: number,
  units: number,
  clearanceTo: SwingClearanceRow['clearanceTo'],
  clearanceIn: number,
  nescIn: number | null,
  nescRoundedUpIn: number | null,
  nescAdderIn: number | null,
): SwingClearanceRow & { status: Status } => ({
  condition,
  nominalVoltageKv,
  maximumVoltageKv,
  units,
  clearanceTo,
  clearanceIn,
  nescIn,
  nescRoundedUpIn,
  nescAdderIn,
  status: 'memory',
  statusNesc: nescIn === null ? null : 'derived',
});

// Condition; nominal, maximum; units; to; bulletin; NESC, rounded up, adder.
/** Clearances of a swung conductor to structure and guys; nothing is recalled above 230 kV. */
export const RUS_SWING_CLEARANCES: StandardTable<SwingClearanceRow> = {
  key: 'rus-1724e-200:swing-clearances',
  title: 'Clearances of a swung conductor to structure and guys',
  ...RUS_1724E_200,
  clause: 'chapter 7',
  reproducedIn: 'NESC (IEEE C2-1997) Table 235-6 (rule of the moderate-wind rows)',
  rule: 'next-higher-row',
  identifiedBy: ['condition', 'nominalVoltageKv', 'clearanceTo'],
  remarks: [
    'All 21 moderate-wind figures equal NESC Table 235-6, rounded up to the inch; the others were not read.',
    'At 46 and 69 kV the high-wind figures are an inch below what the other rows suggest.',
  ],
  rows: [
    swing('no-wind', 34.5, 36.2, 3, 'structure-or-guy', 19, null, null, null),
    swing('no-wind', 46, 48.3, 3, 'structure-or-guy', 19, null, null, null),
    swing('no-wind', 69, 72.5, 4, 'structure-or-guy', 25, null, null, null),
    swing('no-wind', 115, 121, 7, 'structure-or-guy', 42, null, null, null),
    swing('no-wind', 138, 145, 8, 'structure-or-guy', 48, null, null, null),
    swing('no-wind', 161, 169, 10, 'structure-or-guy', 60, null, null, null),
    swing('no-wind', 230, 242, 12, 'structure-or-guy', 71, null, null, null),
    swing('moderate-wind', 34.5, 36.2, 3, 'structure', 9, 8.5, 9, 0),
    swing('moderate-wind', 46, 48.3, 3, 'structure', 11, 10.92, 11, 0),
    swing('moderate-wind', 69, 72.5, 4, 'structure', 16, 15.5, 16, 0.14),
    swing('moderate-wind', 115, 121, 7, 'structure', 26, 25.2, 26, 0.43),
    swing('moderate-wind', 138, 145, 8, 'structure', 30, 30, 30, 0.57),
    swing('moderate-wind', 161, 169, 10, 'structure', 35, 34.8, 35, 0.71),
    swing('moderate-wind', 230, 242, 12, 'structure', 50, 49.4, 50, 1.15),
    swing('moderate-wind', 34.5, 36.2, 3, 'jointly-used-structure', 11, 10.5, 11, 0),
    swing('moderate-wind', 46, 48.3, 3, 'jointly-used-structure', 13, 12.92, 13, 0),
    swing('moderate-wind', 69, 72.5, 4, 'jointly-used-structure', 18, 17.5, 18, 0.14),
    swing('moderate-wind', 115, 121, 7, 'jointly-used-structure', 28, 27.2, 28, 0.43),
    swing('moderate-wind', 138, 145, 8, 'jointly-used-structure', 32, 32, 32, 0.57),
    swing('moderate-wind', 161, 169, 10, 'jointly-used-structure', 37, 36.8, 37, 0.71),
    swing('moderate-wind', 230, 242, 12, 'jointly-used-structure', 52, 51.4, 52, 1.15),
    swing('moderate-wind', 34.5, 36.2, 3, 'anchor-guy', 13, 12.88, 13, 0),
    swing('moderate-wind', 46, 48.3, 3, 'anchor-guy', 16, 15.9, 16, 0),
    swing('moderate-wind', 69, 72.5, 4, 'anchor-guy', 22, 21.62, 22, 0.17),
    swing('moderate-wind', 115, 121, 7, 'anchor-guy', 34, 33.75, 34, 0.53),
    swing('moderate-wind', 138, 145, 8, 'anchor-guy', 40, 39.75, 40, 0.71),
    swing('moderate-wind', 161, 169, 10, 'anchor-guy', 46, 45.75, 46, 0.89),
    swing('moderate-wind', 230, 242, 12, 'anchor-guy', 64, 64, 64, 1.44),
    swing('high-wind', 34.5, 36.2, 3, 'structure-or-guy', 3, null, null, null),
    swing('high-wind', 46, 48.3, 3, 'structure-or-guy', 3, null, null, null),
    swing('high-wind', 69, 72.5, 4, 'structure-or-guy', 5, null, null, null),
    swing('high-wind', 115, 121, 7, 'structure-or-guy', 10, null, null, null),
    swing('high-wind', 138, 145, 8, 'structure-or-guy', 12, null, null, null),
    swing('high-wind', 161, 169, 10, 'structure-or-guy', 14, null, null, null),
    swing('high-wind', 230, 242, 12, 'structure-or-guy', 20, null, null, null),
  ],
};

import type { Status } from '../model';
import { ANSI_C29_2 } from '../sources';
import type { StandardTable } from './table';

/** Suspension insulator class. Inches and pounds with their metric figures beside them. */
export interface SuspensionClassRow {
  ansiClass: string;
  coupling: string;
  spacingIn: number;
  spacingMm: number;
  diameterIn: number;
  diameterMm: number;
  /** Leakage distance, in. */
  leakageIn: number;
  /** Leakage distance, mm. */
  leakageMm: number;
  /** Combined mechanical and electrical strength, lb. */
  strengthLb: number;
  /** Combined mechanical and electrical strength, kN. */
  strengthKn: number;
  /** Power frequency, kV r.m.s. */
  dryFlashoverKv: number;
  /** Power frequency, kV r.m.s. */
  wetFlashoverKv: number;
  /** 50 % impulse, kV peak. */
  impulsePositiveKv: number;
  /** 50 % impulse, kV peak. */
  impulseNegativeKv: number;
  /** kV r.m.s. */
  punctureKv: number;
}

const suspension = (
  ansiClass: string,
  coupling: string,
  spacingIn: number,
  spacingMm: number,
  diameterIn: number,
  diameterMm: number,
  leakageIn: number,
  leakageMm: number,
  strengthLb: number,
  strengthKn: number,
  dryFlashoverKv: number,
  wetFlashoverKv: number,
  impulsePositiveKv: number,
  impulseNegativeKv: number,
  punctureKv: number,
  status: Status,
): SuspensionClassRow & { status: Status } => ({
  ansiClass,
  coupling,
  spacingIn,
  spacingMm,
  diameterIn,
  diameterMm,
  leakageIn,
  leakageMm,
  strengthLb,
  strengthKn,
  dryFlashoverKv,
  wetFlashoverKv,
  impulsePositiveKv,
  impulseNegativeKv,
  punctureKv,
  status,
});

// Class, coupling; spacing in, mm; diameter in, mm; leakage in, mm; strength lb, kN; dry, wet; impulse +, -; puncture.
/** Wet-process porcelain and toughened glass classes. */
export const ANSI_C29_2_UNITS: StandardTable<SuspensionClassRow> = {
  key: 'ansi-c29.2:units',
  title: 'Suspension insulator classes',
  ...ANSI_C29_2,
  clause: 'figures and table of classes 52-1 to 52-12',
  rule: 'rows-as-printed',
  identifiedBy: ['ansiClass'],
  remarks: [
    'Every figure is from memory. Class 52-7 was not recalled; 52-10 to 52-12 least surely.',
    'Since 2013 the standard is split in C29.2A (distribution) and C29.2B (transmission).',
  ],
  rows: [
    suspension('52-1', 'clevis', 5.5, 140, 6.5, 165, 7, 178, 10000, 44, 60, 30, 100, 100, 80, 'memory'),
    suspension('52-2', 'clevis', 5.75, 146, 8, 203, 8.25, 210, 15000, 67, 65, 35, 115, 115, 90, 'memory'),
    suspension('52-3', 'ball and socket', 5.75, 146, 10, 254, 11.5, 292, 15000, 67, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-4', 'clevis', 5.75, 146, 10, 254, 11.5, 292, 15000, 67, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-5', 'ball and socket', 5.75, 146, 10, 254, 11, 279, 25000, 111, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-6', 'clevis', 5.75, 146, 10, 254, 11, 279, 25000, 111, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-8', 'ball and socket', 5.75, 146, 10.75, 273, 11, 279, 36000, 160, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-9', 'clevis', 6.25, 159, 4.25, 108, 6.75, 171, 10000, 44, 60, 30, 100, 90, 80, 'memory'),
    suspension('52-10', 'clevis', 6.5, 165, 10.75, 273, 11, 279, 36000, 160, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-11', 'ball and socket', 6.125, 156, 11.5, 292, 11, 279, 50000, 222, 80, 50, 125, 130, 110, 'memory'),
    suspension('52-12', 'clevis', 7, 178, 11.5, 292, 11, 279, 50000, 222, 80, 50, 125, 130, 110, 'memory'),
  ],
};

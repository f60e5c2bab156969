import { IEC_60433 } from '../sources';
import type { StandardTable } from './table';

/** Strength class of a ceramic long rod. */
export interface LongRodClassRow {
  /** Specified mechanical failing load, kN. */
  failingLoadKn: number;
  /** Ball and socket size of IEC 60120. */
  couplingIec60120: string;
}

const rod = (failingLoadKn: number, couplingIec60120: string): LongRodClassRow & { status: 'memory' } => ({
  failingLoadKn,
  couplingIec60120,
  status: 'memory',
});

/** Strength classes of ceramic long rods, as far as they are remembered. */
export const IEC_60433_CLASSES: StandardTable<LongRodClassRow> = {
  key: 'iec-60433:classes',
  title: 'Strength classes of ceramic long rods with ball and socket coupling',
  ...IEC_60433,
  clause: 'Table 1',
  rule: 'next-higher-row',
  identifiedBy: ['failingLoadKn'],
  remarks: ['Every row is from memory; classes between 210 and 300 kN and above 300 kN differ between editions.'],
  rows: [
    rod(40, '11'),
    rod(100, '16'),
    rod(120, '16'),
    rod(160, '20'),
    rod(210, '20'),
    rod(300, '24'),
    rod(400, '28'),
    rod(530, '32'),
  ],
};

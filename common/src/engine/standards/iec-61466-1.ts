import { IEC_61466_1 } from '../sources';
import type { StandardTable } from './table';

/** Strength class of a composite string unit with the end fittings that belong to it. */
export interface CompositeClassRow {
  /** Specified mechanical load SML, kN. */
  failingLoadKn: number;
  /** Ball and socket size of IEC 60120. */
  couplingIec60120: string;
  /** Clevis and tongue size of IEC 60471. */
  clevisTongue: string | null;
  yClevis: string | null;
  eye: string | null;
}

const composite = (
  failingLoadKn: number,
  couplingIec60120: string,
  clevisTongue: string | null,
  yClevis: string | null,
  eye: string | null,
): CompositeClassRow & { status: 'memory' } => ({
  failingLoadKn,
  couplingIec60120,
  clevisTongue,
  yClevis,
  eye,
  status: 'memory',
});

/** Standard strength classes of composite string units. */
export const IEC_61466_1_CLASSES: StandardTable<CompositeClassRow> = {
  key: 'iec-61466-1:classes',
  title: 'Strength classes and end fittings of composite string units',
  ...IEC_61466_1,
  clause: 'clause 7',
  rule: 'next-higher-row',
  identifiedBy: ['failingLoadKn'],
  remarks: [
    'Every row is from memory. The edition of 2016 added classes for ultra-high voltage; they were not seen.',
    'The columns of clevis, Y-clevis and eye are known least.',
  ],
  rows: [
    composite(40, '11', null, null, null),
    composite(70, '16', '13L', '16', '17'),
    composite(100, '16', '16L', '16', '24'),
    composite(120, '16', '16L', '16', '24'),
    composite(160, '20', '19L', '19', '25'),
    composite(210, '20', '19L / 22L', '19 / 22', '25'),
    composite(300, '24', '22L', '22', '30'),
    composite(400, '28', '25L', '25', '32'),
    composite(530, '32', '32L', '30', '38'),
  ],
};

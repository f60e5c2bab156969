import type { Status } from '../model';
import { IEC_60305 } from '../sources';
import type { StandardTable } from './table';

/** Ball and socket cap and pin unit. Makers usually exceed the least creepage. */
export interface CapAndPinRow {
  designation: string;
  /** Specified failing load, kN. */
  failingLoadKn: number;
  /** Greatest nominal diameter of the insulating part, mm. */
  diameterMaximumMm: number;
  /** Nominal spacing P, mm; tolerance 0.03 P + 0.3 mm either way. */
  spacingMm: number;
  /** Least nominal creepage, mm. */
  creepageMinimumMm: number;
  /** Coupling size of IEC 60120. */
  couplingIec60120: string;
  profile: 'standard' | 'pollution';
}

const unit = (
  designation: string,
  failingLoadKn: number,
  diameterMaximumMm: number,
  spacingMm: number,
  creepageMinimumMm: number,
  couplingIec60120: string,
  profile: 'standard' | 'pollution',
  status: Status,
): CapAndPinRow & { status: Status } => ({
  designation,
  failingLoadKn,
  diameterMaximumMm,
  spacingMm,
  creepageMinimumMm,
  couplingIec60120,
  profile,
  status,
});

/** Units by designation; the figures are limits, not what a maker supplies. */
export const IEC_60305_UNITS: StandardTable<CapAndPinRow> = {
  key: 'iec-60305:units',
  title: 'Cap and pin string units with ball and socket coupling',
  ...IEC_60305,
  clause: 'Table 1',
  rule: 'rows-as-printed',
  identifiedBy: ['designation'],
  remarks: [
    'The table prints least creepages; catalogue units normally exceed them.',
    'The dimensions of the four 160 kN units were read in a public script, not in the standard. The rows of the 2021 edition were not seen.',
  ],
  rows: [
    unit('U40B', 40, 175, 110, 190, '11', 'standard', 'memory'),
    unit('U70BS', 70, 255, 127, 295, '16', 'standard', 'memory'),
    unit('U70BL', 70, 255, 146, 295, '16', 'standard', 'memory'),
    unit('U70BLP', 70, 280, 146, 440, '16', 'pollution', 'memory'),
    unit('U100BS', 100, 255, 127, 295, '16', 'standard', 'memory'),
    unit('U100BL', 100, 255, 146, 295, '16', 'standard', 'memory'),
    unit('U100BLP', 100, 280, 146, 440, '16', 'pollution', 'memory'),
    unit('U120B', 120, 255, 146, 295, '16', 'standard', 'memory'),
    unit('U120BP', 120, 280, 146, 440, '16', 'pollution', 'memory'),
    unit('U160BS', 160, 280, 146, 315, '20', 'standard', 'seen'),
    unit('U160BSP', 160, 330, 146, 440, '20', 'pollution', 'seen'),
    unit('U160BL', 160, 280, 170, 340, '20', 'standard', 'seen'),
    unit('U160BLP', 160, 330, 170, 525, '20', 'pollution', 'seen'),
    unit('U210B', 210, 300, 170, 370, '20', 'standard', 'memory'),
    unit('U210BP', 210, 330, 170, 525, '20', 'pollution', 'memory'),
    unit('U300B', 300, 330, 195, 390, '24', 'standard', 'memory'),
    unit('U300BP', 300, 400, 195, 590, '24', 'pollution', 'memory'),
    unit('U400B', 400, 380, 205, 525, '28', 'standard', 'memory'),
    unit('U530B', 530, 380, 240, 600, '32', 'standard', 'memory'),
  ],
};

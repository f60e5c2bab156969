import { cite, IEC_60071_1 } from '../sources';
import { EN_50341_1_CLEARANCES, IEC_60071_1_RANGE_II } from '../standards';
import { compared, fromTable, type SourceDifference } from './difference';
import { RPTD_05 } from './documents';

const TOPIC = 'Insulation level';

export const LEVEL_DIFFERENCES: readonly SourceDifference[] = [
  {
    id: 'levels.1200-with-2100',
    topic: TOPIC,
    quantity: 'Switching withstand to earth that goes with 2100 kV lightning, highest voltage 1200 kV',
    unit: 'kV peak',
    figures: [
      fromTable(
        IEC_60071_1_RANGE_II,
        (row) => row.highestVoltageKv === 1200 && row.lightningKv === 2100,
        (row) => row.switchingKv,
        { printedFor: 'lowest row of 1200 kV', isUsed: true },
      ),
      compared(1550, '1000 kV systems', cite(RPTD_05, 'Tables 1 and 2', 'seen')),
    ],
    choice: 'A level is a row of IEC 60071-1; a company may add the other as a row of its own, with its reason.',
  },
  {
    id: 'levels.550-longitudinal',
    topic: TOPIC,
    quantity: 'Longitudinal switching withstand that goes with 1175 kV to earth, highest voltage 550 kV',
    unit: 'kV peak',
    figures: [
      fromTable(
        IEC_60071_1_RANGE_II,
        (row) => row.highestVoltageKv === 550 && row.switchingKv === 1175,
        (row) => row.longitudinalKv,
        { printedFor: 'rows with 1175 kV', isUsed: true, statusOf: (row) => row.statusRatio },
      ),
      compared(
        1050,
        'the same rows in another edition',
        cite({ ...IEC_60071_1, edition: 'another' }, 'Table 3', 'memory'),
      ),
    ],
    choice: 'The row as it is held; no distance and no count rests on the longitudinal value.',
  },
  {
    id: 'levels.500-kv-systems',
    topic: TOPIC,
    quantity: 'Highest voltage of 500 kV systems, line to line',
    unit: 'kV rms',
    figures: [
      fromTable(
        IEC_60071_1_RANGE_II,
        (row) => row.highestVoltageKv === 550,
        (row) => row.highestVoltageKv,
        { printedFor: 'editions from 2010', isUsed: true },
      ),
      compared(525, 'editions before 2010', cite({ ...IEC_60071_1, edition: '2006' }, 'Table 3', 'memory')),
      fromTable(
        EN_50341_1_CLEARANCES,
        (row) => row.highestVoltageKv === 525,
        (row) => row.highestVoltageKv,
        { printedFor: 'row of the empirical clearances', isUsed: true },
      ),
    ],
    choice:
      'For the level 525 kV is read as 550 kV and the sheet says so; the clearances of EN 50341-1 keep their row.',
  },
];

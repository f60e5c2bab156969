import { cite } from '../sources';
import {
  C37_32_BUS_CLEARANCES,
  IEC_60071_1_TABLE_A1,
  IEC_61936_1_CLEARANCES,
  SAFETY_DISTANCES,
  SAFETY_DOCUMENTS,
  type BusClearanceRow,
  type SafetyDistanceRow,
} from '../standards';
import { compared, fromTable, type SourceDifference, type SourceFigure } from './difference';
import { CEA_GUIDELINES, IEEE_1427, INDIAN_RULES, NEC, NEMA_SG_6 } from './documents';

const TOPIC = 'Clearances';
const ONE_FAMILY =
  'ANSI C37.32 on the North American basis: one family of distances throughout, and the sheet names it.';
const SAFETY_CHOICE =
  'The source chosen on the sheet. IEC 61936-1 is from memory: a sheet with it asks for acceptance and names the local rule.';

const bus = (
  ratedMaximumVoltageKv: number,
  bilKv: number,
  read: (row: BusClearanceRow) => number | null,
  what: string,
) =>
  fromTable(
    C37_32_BUS_CLEARANCES,
    (row) => row.ratedMaximumVoltageKv === ratedMaximumVoltageKv && row.bilKv === bilKv,
    read,
    { printedFor: `${ratedMaximumVoltageKv} kV, BIL ${bilKv} kV, ${what}`, isUsed: true },
  );

const safetyRow = (
  source: SafetyDistanceRow['source'],
  kind: SafetyDistanceRow['kind'],
  read: 'additionMm' | 'leastMm',
  symbol: string | null,
): SourceFigure =>
  fromTable(
    SAFETY_DISTANCES,
    (row) => row.source === source && row.kind === kind && (symbol === null || row.symbol === symbol),
    (row) => row[read],
    { printedFor: symbol ?? 'no letter', isUsed: true, source: SAFETY_DOCUMENTS[source] },
  );

const ADDED = 'added to the electrical distance';
/** Kind, what is compared, words; the letter of the row of IEC 61936-1 where it has several. */
const SAFETY: readonly (readonly [SafetyDistanceRow['kind'], 'additionMm' | 'leastMm', string, string | null])[] = [
  ['solid-wall', 'additionMm', `Safety distance behind a solid wall, ${ADDED}`, 'B1'],
  ['mesh-or-screen', 'additionMm', `Safety distance behind a mesh up to 52 kV, ${ADDED}`, 'B3'],
  ['indoor-obstacle', 'leastMm', 'Safety distance to an obstacle indoors, at least', 'O1'],
  ['outdoor-obstacle', 'leastMm', 'Safety distance to an obstacle outdoors, at least', 'O2'],
  ['height-over-access', 'additionMm', `Height of live parts over ground walked on, ${ADDED}`, 'H'],
  ['insulator-base-height', 'leastMm', 'Height of the base of an insulator over ground walked on', null],
];

export const STATION_CLEARANCE_DIFFERENCES: readonly SourceDifference[] = [
  {
    id: 'clearances.station-earth-220',
    topic: TOPIC,
    quantity: 'Clearance to earth in a 220 or 230 kV station, lightning withstand 1050 kV',
    unit: 'mm',
    figures: [
      fromTable(
        IEC_60071_1_TABLE_A1,
        (row) => row.lightningKv === 1050,
        (row) => row.rodStructureMm,
        { printedFor: 'rod to structure', isUsed: true },
      ),
      bus(242, 1050, (row) => row.groundMinimumMm, 'least ground clearance'),
      compared(2100, 'nominal 220 kV', cite(CEA_GUIDELINES, '4.1(i), Schedule 2', 'seen')),
      compared(
        2400,
        'nominal 220 kV; 2100 mm between phases, the two perhaps exchanged',
        cite(INDIAN_RULES, 'Rule 64', 'seen'),
      ),
    ],
    choice: 'Table A.1 on the IEC basis, ANSI C37.32 on the North American; the Indian rules agree with neither.',
  },
  {
    id: 'clearances.station-section-220',
    topic: TOPIC,
    quantity: 'Section clearance in a 220 kV station',
    unit: 'mm',
    figures: [
      compared(5000, 'nominal 220 kV', cite(CEA_GUIDELINES, '4.1(i), Schedule 2', 'seen')),
      compared(4300, 'nominal 220 kV', cite(INDIAN_RULES, 'Rule 64', 'seen')),
    ],
    choice: 'Neither: the section clearance is left to the national rule that the sheet names.',
  },
  {
    id: 'clearances.station-earth-12',
    topic: TOPIC,
    quantity: 'Clearance in air outdoors at 12 kV, lightning withstand 75 kV',
    unit: 'mm',
    figures: [
      fromTable(
        IEC_60071_1_TABLE_A1,
        (row) => row.lightningKv === 75,
        (row) => row.rodStructureMm,
        { printedFor: 'all electrodes', isUsed: true },
      ),
      fromTable(
        IEC_61936_1_CLEARANCES,
        (row) => row.highestVoltagesKv.includes(12) && row.lightningKv.includes(75),
        (row) => row.outdoorMm,
        { printedFor: 'N outdoors, an installation minimum', isUsed: true },
      ),
    ],
    choice:
      'Table A.1 by the table method; N of the station rule stands beside it, for it guards against more than voltage.',
  },
  {
    id: 'clearances.bus-ground-900',
    topic: TOPIC,
    quantity: 'Least ground clearance at 230 kV, BIL 900 kV',
    unit: 'mm',
    figures: [
      bus(242, 900, (row) => row.groundMinimumMm, 'least ground clearance'),
      compared(1710, '230 kV, BIL 900 kV', cite(IEEE_1427, 'substation clearances', 'seen')),
    ],
    choice: ONE_FAMILY,
  },
  {
    id: 'clearances.bus-phases-900',
    topic: TOPIC,
    quantity: 'Least distance between phases at 230 kV, BIL 900 kV, metal to metal',
    unit: 'mm',
    figures: [
      bus(242, 900, (row) => row.metalToMetalMm, 'rigid parts'),
      compared(1970, '230 kV, BIL 900 kV', cite(IEEE_1427, 'substation clearances', 'seen')),
    ],
    choice: ONE_FAMILY,
  },
  {
    id: 'clearances.bus-ground-362',
    topic: TOPIC,
    quantity: 'Least ground clearance at 345 kV, BIL 1050 kV',
    unit: 'in',
    figures: [
      bus(362, 1050, (row) => row.groundMinimumIn, 'least ground clearance'),
      compared(83, 'outdoor, phase to ground', cite(NEC, 'least clearance of live parts', 'seen')),
    ],
    choice: ONE_FAMILY,
  },
  {
    id: 'clearances.bus-spacing-650',
    topic: TOPIC,
    quantity: 'Phase spacing of switches and bus supports, BIL 650 kV, centre to centre',
    unit: 'in',
    figures: [
      bus(145, 650, (row) => row.phaseSpacingIn, 'vertical-break switches and bus supports'),
      compared(96, 'the same', cite(NEMA_SG_6, 'phase spacing', 'memory')),
    ],
    choice: 'ANSI C37.32 as it was read, and the larger; 96 in is remembered, and the page may hold a misprint.',
  },
  ...SAFETY.map(([kind, read, quantity, symbol]) => ({
    id: `clearances.safety-${kind}`,
    topic: TOPIC,
    quantity,
    unit: 'mm',
    figures: [safetyRow('rd-337', kind, read, null), safetyRow('iec-61936-1', kind, read, symbol)],
    choice: SAFETY_CHOICE,
  })),
];

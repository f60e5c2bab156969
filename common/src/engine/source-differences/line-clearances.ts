import { cite, EN_50341_1 } from '../sources';
import {
  EN_50341_1_CLEARANCES,
  IEC_60071_1_TABLE_A1,
  IEC_60071_1_TABLE_A2,
  IEC_60071_1_TABLE_A3,
  type LineClearanceRow,
} from '../standards';
import { compared, fromTable, type SourceDifference, type SourceFigure } from './difference';
import { CEA_GUIDELINES, INDIAN_RULES, RPTD_07 } from './documents';

const TOPIC = 'Clearances';
const METHOD_CHOSEN =
  'The method chosen on the sheet governs; the others stand beside it. Del and Dpp come from distances found enough on lines, the tables of IEC 60071-1 from the withstand voltage alone.';

const inMm = (metres: number | null) => (metres === null ? null : Math.round(metres * 1000));

const empirical = (highestVoltageKv: number, read: (row: LineClearanceRow) => number | null, name: string) =>
  fromTable(
    EN_50341_1_CLEARANCES,
    (row) => row.highestVoltageKv === highestVoltageKv,
    (row) => inMm(read(row)),
    { printedFor: `${name}, highest voltage ${highestVoltageKv} kV`, isUsed: true },
  );

function byLightning(lightningKv: number): SourceFigure[] {
  const isAsked = (row: { lightningKv: number }) => row.lightningKv === lightningKv;
  return [
    fromTable(IEC_60071_1_TABLE_A1, isAsked, (row) => row.conductorStructureMm, {
      printedFor: `${lightningKv} kV lightning, conductor to structure`,
      isUsed: true,
      statusOf: (row) => row.statusConductorStructure,
    }),
    fromTable(IEC_60071_1_TABLE_A1, isAsked, (row) => row.rodStructureMm, {
      printedFor: `${lightningKv} kV lightning, rod to structure`,
      isUsed: true,
    }),
  ];
}

function bySwitching(switchingKv: number): SourceFigure[] {
  const isAsked = (row: { switchingKv: number }) => row.switchingKv === switchingKv;
  return [
    fromTable(IEC_60071_1_TABLE_A2, isAsked, (row) => row.conductorStructureMm, {
      printedFor: `${switchingKv} kV switching, conductor to structure`,
      isUsed: true,
      statusOf: (row) => row.statusConductorStructure,
    }),
    fromTable(IEC_60071_1_TABLE_A2, isAsked, (row) => row.rodStructureMm, {
      printedFor: `${switchingKv} kV switching, rod to structure`,
      isUsed: true,
    }),
  ];
}

function betweenPhases(switchingPhaseToPhaseKv: number): SourceFigure[] {
  const isAsked = (row: { switchingPhaseToPhaseKv: number }) => row.switchingPhaseToPhaseKv === switchingPhaseToPhaseKv;
  return [
    fromTable(IEC_60071_1_TABLE_A3, isAsked, (row) => row.conductorConductorMm, {
      printedFor: `${switchingPhaseToPhaseKv} kV switching, conductor to conductor`,
      isUsed: true,
      statusOf: (row) => row.statusConductorConductor,
    }),
    fromTable(IEC_60071_1_TABLE_A3, isAsked, (row) => row.rodConductorMm, {
      printedFor: `${switchingPhaseToPhaseKv} kV switching, rod to conductor`,
      isUsed: true,
    }),
  ];
}

const toStructure = (distanceMm: number, nominalVoltageKv: number) =>
  compared(
    distanceMm,
    `transient overvoltage, nominal ${nominalVoltageKv} kV`,
    cite(RPTD_07, 'Table 4, 5.2 and 5.3', 'seen'),
  );
const ofStations = (distanceMm: number, printedFor: string) =>
  compared(distanceMm, printedFor, cite(CEA_GUIDELINES, '4.1(i), Schedule 2', 'seen'));

export const LINE_CLEARANCE_DIFFERENCES: readonly SourceDifference[] = [
  {
    id: 'clearances.line-earth-245',
    topic: TOPIC,
    quantity: 'Clearance to earth of a 220 kV line, highest voltage 245 kV',
    unit: 'mm',
    figures: [empirical(245, (row) => row.delM, 'Del'), ...byLightning(1050), toStructure(1800, 220)],
    choice: METHOD_CHOSEN,
  },
  {
    id: 'clearances.line-earth-420',
    topic: TOPIC,
    quantity: 'Clearance to earth at 400 kV, highest voltage 420 kV',
    unit: 'mm',
    figures: [
      empirical(420, (row) => row.delM, 'Del'),
      ...bySwitching(1050),
      ofStations(3500, 'stations, nominal 400 kV, conductor to structure'),
    ],
    choice: METHOD_CHOSEN,
  },
  {
    id: 'clearances.line-phases-420',
    topic: TOPIC,
    quantity: 'Clearance between phases at 400 kV, highest voltage 420 kV',
    unit: 'mm',
    figures: [
      empirical(420, (row) => row.dppM, 'Dpp'),
      ...betweenPhases(1575),
      ofStations(4000, 'stations, nominal 400 kV, conductor to conductor'),
      ofStations(4200, 'stations, nominal 400 kV, rod to conductor'),
      compared(4100, 'stations, nominal 400 kV', cite(INDIAN_RULES, 'Rule 64', 'seen')),
    ],
    choice: METHOD_CHOSEN,
  },
  {
    id: 'clearances.line-earth-500-kv',
    topic: TOPIC,
    quantity: 'Clearance to earth of a 500 kV line',
    unit: 'mm',
    figures: [empirical(525, (row) => row.delM, 'Del'), ...bySwitching(1175), toStructure(3950, 500)],
    choice: METHOD_CHOSEN,
  },
  {
    id: 'clearances.power-frequency-245',
    topic: TOPIC,
    quantity: 'Clearance to earth at power frequency under extreme wind, highest voltage 245 kV',
    unit: 'mm',
    figures: [
      fromTable(
        EN_50341_1_CLEARANCES,
        (row) => row.highestVoltageKv === 245,
        (row) => inMm(row.d50HzPhaseToEarthM),
        { printedFor: 'D50Hz as tabulated', isUsed: true, statusOf: (row) => row.statusD50Hz },
      ),
      compared(
        424,
        'D50Hz by the formula, gap factor 1.45, 1000 m',
        cite(EN_50341_1, 'Annex E and Table E.4', 'derived'),
      ),
      compared(750, 'nominal 220 kV, string swung by the full wind', cite(RPTD_07, 'Table 4, 5.2 and 5.3', 'seen')),
    ],
    choice: 'The table of EN 50341-1, rounded upward from its formula; the Chilean rule asks for more than either.',
  },
  {
    id: 'clearances.power-frequency-100',
    topic: TOPIC,
    quantity: 'Clearance to earth at power frequency under extreme wind, highest voltage 100 kV',
    unit: 'mm',
    figures: [
      fromTable(
        EN_50341_1_CLEARANCES,
        (row) => row.highestVoltageKv === 100,
        (row) => inMm(row.d50HzPhaseToEarthM),
        {
          printedFor: 'example of the 90 kV line',
          isUsed: true,
          statusOf: (row) => row.statusD50Hz,
          source: { ...EN_50341_1, clause: 'Annex F, Table F.1' },
        },
      ),
      compared(200, 'row of 100 kV', cite(EN_50341_1, 'Table 5.5', 'memory')),
    ],
    choice: 'The figure of Annex F: it was read, and its formula gives it; the other is remembered.',
  },
];

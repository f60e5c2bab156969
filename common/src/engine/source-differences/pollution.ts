import { cite, IEC_60815, IEC_TS_60815_1, RUS_1724E_200 } from '../sources';
import { RUS_CONTAMINATION, type ContaminationRow } from '../standards';
import { compared, fromTable, type SourceDifference } from './difference';
import { GB_50545, GB_T_26218_PRACTICE } from './documents';

const TOPIC = 'Pollution';

const DOCUMENTS = {
  A: { document: 'RUS Bulletins 1724E-200 and 1724E-220', edition: '2005', clause: 'chapter 8' },
  B: { document: 'IEEE guide on insulators in contaminated environments', edition: '1979', clause: 'I-strings' },
} as const;

const leakage = (rowSet: ContaminationRow['rowSet'], contamination: ContaminationRow['contamination']) =>
  fromTable(
    RUS_CONTAMINATION,
    (row) => row.rowSet === rowSet && row.contamination === contamination && row.stringType !== 'V-string',
    (row) => row.leakageMinimumInPerKv,
    {
      printedFor: rowSet === 'A' ? 'any string; the upper figure is used' : 'I-strings of standard units',
      isUsed: rowSet === 'A',
      source: DOCUMENTS[rowSet],
      upTo: (row) => (row.leakageMaximumInPerKv === row.leakageMinimumInPerKv ? null : row.leakageMaximumInPerKv),
    },
  );

export const POLLUTION_DIFFERENCES: readonly SourceDifference[] = [
  ...(['light', 'moderate', 'heavy'] as const).map((contamination) => ({
    id: `pollution.leakage-${contamination}`,
    topic: TOPIC,
    quantity: `Leakage under ${contamination} contamination, inches per kV line to ground`,
    unit: 'in/kV',
    figures: [leakage('A', contamination), leakage('B', contamination)],
    choice: 'The upper figure of the bulletin, on the safe side; both are from memory.',
  })),
  {
    id: 'pollution.salt-heavy',
    topic: TOPIC,
    quantity: 'Equivalent salt deposit density of class d or level III, heavy, type A',
    unit: 'mg/cm²',
    figures: [
      compared(
        0.06,
        'read off the figure at a non-soluble deposit of 0.1 mg/cm²',
        cite(IEC_TS_60815_1, 'Figure 1', 'memory'),
        0.2,
      ),
      compared(0.3, 'level III', cite(IEC_60815, 'guide to equivalence', 'memory'), 0.6),
      compared(0.1, 'class III of lines', cite(GB_50545, 'appendix B', 'memory'), 0.25),
      compared(0.1, 'class d, reference disc', cite(GB_T_26218_PRACTICE, 'class limits', 'memory'), 0.25),
      compared(0.1, 'heavy', cite(RUS_1724E_200, 'chapter 8', 'memory'), 0.25),
    ],
    choice:
      'None: the engineer chooses the class and says how it is known. No class is worked out from a salt deposit.',
  },
];

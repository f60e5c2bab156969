import { DEVIATION_FACTORS, fastFrontGapFactor } from '../air-gaps';
import { FACTORS } from '../mechanical/factors';
import { cite, EN_50341_1, IEC_60071_1, PRACTICE } from '../sources';
import { INSULATOR_STRENGTH, STRING_FLASHOVER_254X146, TRADE_DISC_COUNTS, type StrengthShareRow } from '../standards';
import { compared, fromTable, type SourceDifference, type SourceFigure } from './difference';
import { LIGHTNING_STUDY, RPTD_05 } from './documents';

const TOPIC = 'String';

/** Gap factor of a conductor to a structure, for which the strengths per metre are compared. */
const STRUCTURE_GAP_FACTOR = 1.45;
const LIGHTNING_LAW = 'air-gaps.lightning-dry-arc';

const strengthPerMetre: SourceDifference = {
  id: 'string.lightning-per-metre',
  topic: TOPIC,
  quantity: '50 % lightning strength of a metre of air, conductor to structure',
  unit: 'kV/m',
  figures: [
    {
      figure: Number((530 * fastFrontGapFactor({ gapFactor: STRUCTURE_GAP_FACTOR })).toFixed(1)),
      figureUpTo: null,
      printedFor: '530 times the fast-front factor of gap factor 1.45',
      source: cite(EN_50341_1, 'Annex E, fast-front strength', 'seen'),
      entryKey: LIGHTNING_LAW,
      key: LIGHTNING_LAW,
      isUsed: true,
    },
    {
      figure: 560,
      figureUpTo: null,
      printedFor: 'strings of line insulators, any surroundings',
      source: cite(PRACTICE, 'lightning strength of line insulation', 'memory'),
      entryKey: LIGHTNING_LAW,
      key: LIGHTNING_LAW,
      isUsed: true,
    },
    compared(
      Number((500 / DEVIATION_FACTORS.fastFront).toFixed(1)),
      'rod to structure: 500 kV/m of withstand, turned into 50 %',
      cite(IEC_60071_1, 'Table A.1, from 450 kV', 'derived'),
    ),
  ],
  choice:
    'The dry arc of the string takes the smaller of the first two, which gives the longer string; Table A.1 is for clearances.',
};

function usualDiscs(nominalVoltageKv: number): SourceDifference {
  const rows = TRADE_DISC_COUNTS.rows.filter((row) => row.nominalVoltageKv === nominalVoltageKv);
  return {
    id: `string.discs-${nominalVoltageKv}`,
    topic: TOPIC,
    quantity: `Usual count of 254 x 146 mm discs at ${nominalVoltageKv} kV nominal`,
    unit: 'units',
    figures: rows.map((asked): SourceFigure => {
      const figure = fromTable(
        TRADE_DISC_COUNTS,
        (row) => row === asked,
        (row) => row.discsMinimum,
        {
          printedFor: 'suspension strings, clean sites',
          isUsed: false,
          source: { document: asked.origin, edition: '', clause: '' },
        },
      );
      return { ...figure, figureUpTo: asked.discsMaximum === asked.discsMinimum ? null : asked.discsMaximum };
    }),
    choice: 'None decides a count: the criteria do. The counts stand on cards for whoever checks.',
  };
}

const tension = (rule: StrengthShareRow['rule'], insulator: string) =>
  fromTable(
    INSULATOR_STRENGTH,
    (row) =>
      row.rule === rule && row.insulator === insulator && row.action === 'tension' && /district/.test(row.loadCase),
    (row) => row.maximumRatio,
    { printedFor: insulator === 'any' ? 'any insulator' : insulator, isUsed: true, source: STRENGTH_DOCUMENTS[rule] },
  );
const STRENGTH_DOCUMENTS: Record<StrengthShareRow['rule'], { document: string; edition: string; clause: string }> = {
  'NESC 277': { document: 'NESC (IEEE C2)', edition: '2002', clause: 'Rule 277' },
  'RUS 1724E-200': { document: INSULATOR_STRENGTH.document, edition: INSULATOR_STRENGTH.edition, clause: 'chapter 8' },
  'purchaser standard after ANSI C29.12': { document: 'ANSI C29.12', edition: '', clause: 'purchaser standard' },
};

const ruleFactor = (rule: keyof typeof FACTORS, printedFor: string): SourceFigure => ({
  figure: FACTORS[rule].factor,
  figureUpTo: null,
  printedFor,
  source: FACTORS[rule].source,
  entryKey: null,
  key: null,
  isUsed: true,
});

export const STRING_DIFFERENCES: readonly SourceDifference[] = [
  strengthPerMetre,
  {
    id: 'string.impulse-of-14-discs',
    topic: TOPIC,
    quantity: '50 % lightning flashover of 14 discs of 254 x 146 mm, positive',
    unit: 'kV peak',
    figures: [
      fromTable(
        STRING_FLASHOVER_254X146,
        (row) => row.units === 14,
        (row) => row.impulsePositiveKvPeak,
        { printedFor: 'the string by itself', isUsed: false },
      ),
      compared(1050, 'the string in a tower, 230 kV', cite(LIGHTNING_STUDY, 'critical flashover', 'seen')),
    ],
    choice:
      'Neither: lightning asks for a dry arc by the gap law. A catalogue figure is not the strength near a tower.',
  },
  ...[66, 132, 138, 230].map(usualDiscs),
  {
    id: 'string.share-of-rating',
    topic: 'Mechanical',
    quantity: 'Largest share of the rating in tension under district loads, porcelain or glass discs',
    unit: '',
    figures: [tension('NESC 277', 'any'), tension('RUS 1724E-200', 'ceramic or glass suspension')],
    choice: 'The strength basis chosen on the sheet. The bulletin is the stricter; its figures are from memory.',
  },
  {
    id: 'string.strength-over-load',
    topic: 'Mechanical',
    quantity: 'Failing load of an insulator over its largest load, at least',
    unit: '',
    figures: [
      ruleFactor('rd-223', 'ordinary acceptance'),
      ruleFactor('rd-223-statistical', 'accepted statistically'),
      ruleFactor('en-50341', 'partial factor'),
      compared(2, 'largest working load', cite(RPTD_05, '6.2', 'seen')),
    ],
    choice: 'The strength basis chosen on the sheet; a factor is put on the loads of its own basis only.',
  },
];

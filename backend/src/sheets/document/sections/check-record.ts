import { CHECK_CATEGORY_LABELS } from '@bellgap/common/api';
import { CHECKLIST, CHECKLIST_ANSWERS, CHECK_VERDICTS } from '@bellgap/common/schemas';
import { cell, figures, heading, paragraph, type Block, type Cell, type Pairs } from '../blocks';
import type { SheetCheck, SheetContent } from '../content';
import {
  citation,
  fieldWords,
  inputWords,
  near,
  plain,
  short,
  signed,
  siteTime,
  UNKNOWN,
  valueAt,
  withUnit,
} from '../words';

type Difference = SheetCheck['differences'][number];

const FIGURES: Record<Difference['figure'], string> = { units: 'Count of units', clearance: 'Clearance to earth' };

/** The checks as they were recorded: own figures before the author's, inputs one by one, checklist, verdict. */
export function checkRecord(content: SheetContent): Block[] {
  return (content.issued?.checkRecords ?? []).flatMap((check, i) => [
    ...(i === 0 ? [heading(1, 'Check record')] : []),
    heading(2, `Revision ${check.label}: ${verdictWords(check)}`),
    particulars(check, content),
    ...differences(check, content),
    ...ticks(check, content),
    ...checklist(check),
  ]);
}

const verdictWords = ({ verdict, checker, decidedOn }: SheetCheck): string =>
  `${verdict ? CHECK_VERDICTS[verdict].toLowerCase() : 'not decided'}, ${checker}, ${decidedOn ?? UNKNOWN}`;

function particulars(check: SheetCheck, { issued, project }: SheetContent): Pairs {
  const same = check.contentCode === issued?.contentCode;
  const optional = (label: string, value: string): Pairs['rows'] => (value.trim() === '' ? [] : [{ label, value }]);
  return {
    kind: 'pairs',
    labelShare: 0.27,
    rows: [
      { label: 'Checker', value: check.checker },
      {
        label: 'Category of the check',
        value: `category ${CHECK_CATEGORY_LABELS[check.checkCategory] ?? check.checkCategory}`,
      },
      { label: 'Independence', value: check.independent ? 'declared: no part in the work' : 'not declared' },
      {
        label: 'Content code checked',
        value: check.contentCode,
        mono: true,
        note: same ? 'what is issued here' : 'an earlier submission, not what is issued here',
      },
      { label: 'Method edition', value: check.methodEdition },
      {
        label: 'Own figures entered',
        value: siteTime(check.ownFiguresAt, project.siteTimeZone),
        note: 'before those of the author were shown',
      },
      ...optional('How he came to them', check.ownFigures.note),
      ...optional('Reason for the difference', check.differenceReason),
      { label: 'Verdict', value: check.verdict ? CHECK_VERDICTS[check.verdict] : 'not decided', strong: true },
      { label: 'Signed', value: `${check.checker}, ${check.decidedOn ?? UNKNOWN}` },
      ...optional('Note to the verdict', check.verdictNote),
    ],
  };
}

/** The cards that were named stand in the answer with their words and source. */
function cardWords(id: string | null, { evaluation }: SheetContent): string {
  if (!id) return 'no rule named';
  const card = evaluation.ruleOfThumb.rows.find((row) => row.id === id);
  return card ? `${card.rule} (${citation(card.source)})` : id;
}

function differences(check: SheetCheck, content: SheetContent): Block[] {
  const { ownFigures } = check;
  if (check.differences.length === 0)
    return [
      paragraph(
        `Own count: ${withUnit(plain(ownFigures.units), 'units')}, ${cardWords(ownFigures.unitsCard ?? null, content)}. ` +
          `Own clearance to earth: ${withUnit(plain(ownFigures.clearanceMm), 'mm')}, ${cardWords(ownFigures.clearanceCard ?? null, content)}.`,
      ),
    ];
  return [
    heading(2, "Own figures beside the author's"),
    {
      kind: 'table',
      summary: 'Own figures of the checker beside those of the author',
      columns: [
        { head: 'figure', share: 1.5 },
        { head: 'own', share: 1.2, align: 'right' },
        { head: 'own figure by', share: 2.6 },
        { head: "author's", share: 1.2, align: 'right' },
        { head: 'difference', share: 1.2, align: 'right' },
        { head: 'band', share: 0.8, align: 'right' },
        { head: 'result', share: 1.3 },
      ],
      rows: check.differences.map((one) => ({
        cells: [
          cell(FIGURES[one.figure]),
          figures(withUnit(short(one.own), one.unit)),
          cell(cardWords(one.card, content), { tone: 'soft' }),
          figures(withUnit(short(one.authors), one.unit)),
          differenceCell(one),
          figures(one.band === null ? UNKNOWN : `±${short(one.band)}`),
          cell(standing(one), one.outside ? { face: 'semibold' } : {}),
        ],
      })),
    },
  ];
}

function differenceCell({ difference, differencePercent }: Difference): Cell {
  const absolute = figures(difference === null ? UNKNOWN : signed(difference));
  if (differencePercent === null) return absolute;
  const sign = differencePercent > 0 ? '+' : '';
  const percent = { text: `${sign}${near(differencePercent, 1)} %`, face: 'mono' as const, tone: 'soft' as const };
  return { ...absolute, lines: [...absolute.lines, percent] };
}

function standing({ outside, difference, band }: Difference): string {
  if (outside) return 'outside the band, see the reason';
  return difference === null || band === null ? 'not compared' : 'within the band';
}

/** Values stand beside the ticks only where the check was of what is issued: earlier ones were of other values. */
function ticks({ ticks: rows, contentCode }: SheetCheck, { input, issued }: SheetContent): Block[] {
  if (rows.length === 0) return [];
  const same = contentCode === issued?.contentCode;
  return [
    heading(2, 'Inputs, one by one'),
    {
      kind: 'table',
      summary: 'Inputs that the checker went through, with what they were seen in',
      columns: [
        { head: 'input', share: 2.6 },
        ...(same ? [{ head: 'value', share: 2.2 }] : []),
        { head: 'seen in', share: 3 },
        { head: 'agreed', share: 1 },
      ],
      rows: rows.map(({ path, seenIn, agreed }) => ({
        cells: [
          cell(fieldWords(path)),
          ...(same ? [cell(inputWords(path, valueAt(input, path)))] : []),
          cell(seenIn.trim() === '' ? UNKNOWN : seenIn),
          cell(agreed ? 'agreed' : 'NOT agreed', agreed ? {} : { face: 'semibold' }),
        ],
      })),
    },
  ];
}

function checklist({ checklist: rows }: SheetCheck): Block[] {
  if (rows.length === 0) return [];
  return [
    heading(2, 'Checklist'),
    {
      kind: 'table',
      summary: 'Checklist of the checker',
      columns: [
        { head: 'point', share: 4.4 },
        { head: 'answer', share: 1.2 },
        { head: 'note', share: 3 },
      ],
      rows: rows.map(({ item, answer, note }) => ({
        cells: [
          cell(CHECKLIST[item]),
          cell(CHECKLIST_ANSWERS[answer], answer === 'no' ? { face: 'semibold' } : {}),
          cell(note.trim() === '' ? UNKNOWN : note),
        ],
      })),
    },
  ];
}

import type { ClearanceRow, ClearancesResult } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { cell, figures, heading, paragraph, type Block, type Row } from '../blocks';
import type { SheetContent } from '../content';
import { DISTANCE_WORDS, near, plain, SHAPE_WORDS, sourceWords, STRESS_WORDS, up, withUnit } from '../words';

const KINDS: ClearanceRow['distance'][] = ['phase-to-earth', 'phase-to-phase', 'section', 'safety'];

/** Distances by kind, each kind a block of its own: none is ever used for another. */
export function clearances({ evaluation }: SheetContent): Block[] {
  const answer = evaluation.clearances;
  const blocks: Block[] = [heading(1, 'Clearances')];
  if (!answer) return [...blocks, paragraph('Not assessed.', { tone: 'soft' })];
  blocks.push(
    paragraph(
      `Method: ${answer.method ? CHOICE_LABELS.clearanceMethod[answer.method] : 'not chosen'}. ` +
        'Distances to earth, between phases, to ground and for people are different things: none is used for another.',
      { tone: 'soft' },
    ),
  );
  for (const kind of KINDS) {
    const rows = answer.rows.filter((row) => row.distance === kind);
    if (rows.length === 0) {
      if (kind === 'safety')
        blocks.push(heading(2, DISTANCE_WORDS.safety), paragraph('Not covered by this sheet: the local rule decides.'));
      continue;
    }
    const absent = (answer.besideWhyNot ?? []).filter(({ distance }) => distance === kind);
    blocks.push(heading(2, DISTANCE_WORDS[kind]), {
      kind: 'table',
      summary: DISTANCE_WORDS[kind],
      columns: [
        { head: 'method', share: 2 },
        { head: 'stress', share: 1.3 },
        { head: 'shape', share: 1.7 },
        { head: 'withstand, kV', share: 1.2, align: 'right' },
        { head: 'altitude factor', share: 1.2, align: 'right' },
        { head: 'needed', share: 1.45, align: 'right' },
        { head: 'source', share: 2.9 },
      ],
      rows: rows.map(clearanceRow),
    });
    if (absent.length > 0) blocks.push(paragraph(absent.map(absenceWords).join(' '), { tone: 'soft' }));
  }
  return [...blocks, ...coordination(evaluation.string?.coordination)];
}

/** Why a method that is not the chosen one has no figure. */
function absenceWords({ method, why }: NonNullable<ClearancesResult['besideWhyNot']>[number]): string {
  return `${CHOICE_LABELS.clearanceMethod[method]}, no figure beside: ${/^[A-Z][a-z]/.test(why) ? why.charAt(0).toLowerCase() + why.slice(1) : why}`;
}

function clearanceRow(row: ClearanceRow): Row {
  const value = row.withinSource ? withUnit(up(row.valueMm), 'mm') : 'outside source';
  const method = CHOICE_LABELS.clearanceMethod[row.method];
  return {
    governs: row.governs,
    cells: [
      cell(row.governs ? `${method}, governs` : method),
      cell(STRESS_WORDS[row.stress] ?? row.stress.replaceAll('-', ' ')),
      cell(row.shape === null ? '–' : (SHAPE_WORDS[row.shape] ?? row.shape.replaceAll('-', ' '))),
      figures(
        row.withstandKv === null || Number.isInteger(row.withstandKv) ? plain(row.withstandKv) : up(row.withstandKv, 1),
      ),
      figures(near(row.altitudeFactor, 3)),
      figures(value),
      cell(`${sourceWords(row.source)}${row.interpolated ? '; interpolated' : ''}`, {
        tone: 'soft',
      }),
    ],
  };
}

function coordination(answer: NonNullable<SheetContent['evaluation']['string']>['coordination'] | undefined): Block[] {
  if (!answer) return [];
  return [
    heading(2, 'String against its surroundings'),
    {
      kind: 'pairs',
      labelShare: 0.4,
      rows: [
        { label: 'Shortest arc of the string', value: withUnit(near(answer.shortestArcMm), 'mm') },
        {
          label: 'External clearance needed, 1.1 times that arc',
          value: withUnit(up(answer.requiredExternalMm), 'mm'),
        },
        {
          label: 'External clearance provided',
          value: answer.providedExternalMm === null ? 'not stated' : `${plain(answer.providedExternalMm)} mm`,
          note: CHOICE_LABELS.verdict[answer.verdict].toLowerCase(),
        },
      ],
    },
  ];
}

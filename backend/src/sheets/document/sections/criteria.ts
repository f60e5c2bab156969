import type { CriterionResult } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { cell, figures, heading, type Block, type Row } from '../blocks';
import type { SheetContent } from '../content';
import { down, near, up, withUnit } from '../words';

/** Units by each criterion, and what is left when units are out. */
export function criteria({ evaluation }: SheetContent): Block[] {
  const answer = evaluation.string;
  if (!answer) return [];
  const whys = new Map(evaluation.notAssessed.map(({ part, why }) => [part, why]));
  const blocks: Block[] = [
    heading(2, 'Units by criterion'),
    {
      kind: 'table',
      size: 7.8,
      summary: 'Units of the string by criterion, with what each needs, what is provided, the margin and the verdict',
      columns: [
        { head: 'criterion', share: 2.1 },
        { head: 'needed', share: 1.6, align: 'right' },
        { head: 'provided', share: 1.6, align: 'right' },
        { head: 'units', share: 0.95, align: 'right' },
        { head: 'margin', share: 1.3, align: 'right' },
        { head: 'verdict', share: 1.15 },
      ],
      rows: answer.criteria.map((row) => criterionRow(row, row.criterion === answer.governedBy, whys)),
    },
  ];
  if (answer.unitsOut.length > 0) {
    blocks.push(heading(2, 'With units out of service: electrical margin only, no basis for live work'), {
      kind: 'table',
      summary: 'Margin of the string with one and two units out of service',
      columns: [
        { head: 'units out', share: 1, align: 'right' },
        { head: 'criterion', share: 2.4 },
        { head: 'margin', share: 1.2, align: 'right' },
        { head: 'verdict', share: 3 },
      ],
      rows: answer.unitsOut.map((row) => ({
        cells: [
          figures(near(row.unitsOut)),
          cell(CHOICE_LABELS.criterion[row.criterion]),
          figures(withUnit(down(row.marginPercent, 1), '%')),
          cell(CHOICE_LABELS.verdict[row.verdict]),
        ],
      })),
    });
  }
  return blocks;
}

function criterionRow(row: CriterionResult, governs: boolean, whys: Map<string, string>): Row {
  const name = CHOICE_LABELS.criterion[row.criterion];
  if (row.state !== 'assessed') {
    const why = whys.get(`string.${row.criterion}`);
    const words = row.state === 'not-applicable' ? 'does not apply' : `not assessed${why ? `: ${why}` : ''}`;
    return { cells: [cell(name), cell(words, { tone: 'soft', span: 5 })] };
  }
  return {
    governs,
    cells: [
      cell(governs ? `${name}, governs` : name),
      figures(withUnit(up(row.requiredValue, row.unit === 'mm' ? 0 : 1), row.unit)),
      figures(withUnit(down(row.providedValue, row.unit === 'mm' ? 0 : 1), row.unit)),
      figures(near(row.requiredUnits)),
      figures(withUnit(down(row.marginPercent, 1), '%')),
      cell(CHOICE_LABELS.verdict[row.verdict]),
    ],
  };
}

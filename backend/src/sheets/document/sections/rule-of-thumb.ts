import { cell, figures, heading, paragraph, type Block } from '../blocks';
import type { SheetContent } from '../content';
import { near, plain, sourceWords, withUnit } from '../words';

const VERDICTS = { within: 'within the band', explain: 'to be explained', 'out-of-range': 'does not apply' } as const;

/** The checker's independent estimates beside the sheet's figures. */
export function ruleOfThumb({ evaluation }: SheetContent): Block[] {
  const { rows } = evaluation.ruleOfThumb;
  const head = heading(1, 'Rules of thumb: for checking, not for ordering');
  if (rows.length === 0) return [head, paragraph('No rule applies to this sheet.', { tone: 'soft' })];
  return [
    head,
    {
      kind: 'table',
      summary: 'Estimates by rules of thumb beside the figures of the sheet',
      columns: [
        { head: 'rule', share: 3 },
        { head: 'estimate', share: 1.35, align: 'right' },
        { head: 'sheet', share: 1.35, align: 'right' },
        { head: 'band', share: 0.9, align: 'right' },
        { head: 'verdict', share: 1.9 },
        { head: 'source', share: 2.4 },
      ],
      rows: rows.map((row) => ({
        cells: [
          cell(row.rule),
          figures(withUnit(digits(row.estimate), row.unit)),
          figures(withUnit(digits(row.given), row.unit)),
          figures(row.band === null ? '–' : `±${plain(row.band)}`),
          cell(row.why ? `${VERDICTS[row.verdict]}: ${row.why}` : VERDICTS[row.verdict]),
          cell(sourceWords(row.source), { tone: 'soft' }),
        ],
      })),
    },
  ];
}

const digits = (value: number | null): string => near(value, value !== null && Number.isInteger(value) ? 0 : 1);

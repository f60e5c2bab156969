import type { Evaluation, RuleOfThumbRow } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { cell, figures, heading, paragraph, type Block, type Row } from '../blocks';
import type { SheetContent } from '../content';
import { plain, short, signed, sourceWords, withUnit } from '../words';

const VERDICTS = { within: 'within the band', explain: 'to be explained', 'out-of-range': 'does not apply' } as const;

/** The checker's independent estimates beside the sheet's figures. */
export function ruleOfThumb({ evaluation }: SheetContent): Block[] {
  const { rows } = evaluation.ruleOfThumb;
  const head = heading(1, 'Rules of thumb: for checking, not for ordering');
  if (rows.length === 0) return [head, paragraph('No rule applies to this sheet.', { tone: 'soft' })];
  return [head, cards(rows), ...bridge(evaluation)];
}

function cards(rows: RuleOfThumbRow[]): Block {
  return {
    kind: 'table',
    summary: 'Estimates by rules of thumb beside the figures of the sheet',
    columns: [
      { head: 'rule', share: 2.6 },
      { head: 'estimate', share: 1.5, align: 'right' },
      { head: 'sheet', share: 1.5, align: 'right' },
      { head: 'band', share: 1.05, align: 'right' },
      { head: 'verdict', share: 1.9 },
      { head: 'source', share: 2.4 },
    ],
    rows: rows.map((row) => ({
      cells: [
        cell(row.rule),
        figures(withUnit(short(row.estimate), row.unit)),
        figures(withUnit(short(row.given), row.unit)),
        figures(row.band === null ? '–' : `±${short(row.band)}`),
        cell(row.why ? `${VERDICTS[row.verdict]}: ${row.why}` : VERDICTS[row.verdict]),
        cell(sourceWords(row.source), { tone: 'soft' }),
      ],
    })),
  };
}

const CAUSES: Record<string, string> = CHOICE_LABELS.bridgeCause;

/** From the rule's count to the specified one, cause by cause; the units add up. */
function bridge({ ruleOfThumb: { bridge: steps, bridgeWhyNot }, string }: Evaluation): Block[] {
  const title = heading(2, 'From the rule to the count');
  const specified = string?.units ?? null;
  if (steps === null || specified === null)
    return bridgeWhyNot === null ? [] : [title, paragraph(`No bridge: ${bridgeWhyNot}`, { tone: 'soft' })];
  const rule = specified - steps.reduce((sum, { units }) => sum + units, 0);
  let count = rule;
  const row = (cause: string, units: string, then: number, governs = false): Row => ({
    governs,
    cells: [cell(cause), figures(units), figures(plain(then))],
  });
  return [
    title,
    {
      kind: 'table',
      summary: 'Causes that lead from the count by rule of thumb to the specified count, with signed units',
      columns: [
        { head: 'cause', share: 3 },
        { head: 'units', share: 1, align: 'right' },
        { head: 'count then', share: 1, align: 'right' },
      ],
      rows: [
        row('Rule, 15 kV a disc', plain(rule), rule),
        ...steps.map(({ cause, units }) => {
          count += units;
          return row(CAUSES[cause] ?? cause.replaceAll('-', ' '), signed(units), count);
        }),
        row('Specified', plain(specified), specified, true),
      ],
    },
  ];
}

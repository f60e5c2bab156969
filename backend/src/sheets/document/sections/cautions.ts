import { REVISION_STATE_LABELS, type ConcessionKind, type Severity } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import { cell, heading, paragraph, type Block, type NoticeItem } from '../blocks';
import type { SheetContent } from '../content';
import { counted } from '../words';
import { concessionNotices } from './concessions';

const ORDER: Severity[] = ['stop', 'fail', 'acceptance', 'caution', 'info'];

const MEANING: Partial<Record<Severity, string>> = {
  stop: 'outside the method: no figure',
  fail: 'a requirement is not met',
  acceptance: 'to be accepted by the approver, with a reason',
};

/** What an approver has put in their place once the sheet is issued. */
const ANSWERED_BY: Partial<Record<Severity, ConcessionKind>> = { fail: 'concession', acceptance: 'acceptance' };

/** Cautions of this sheet, the heaviest first. */
export function cautions({ evaluation }: SheetContent): Block[] {
  const head = heading(1, 'Cautions, acceptances, stops');
  if (evaluation.cautions.length === 0) return [head, paragraph('None.', { tone: 'soft' })];
  const rows = [...evaluation.cautions].sort(
    (one, other) => ORDER.indexOf(one.severity) - ORDER.indexOf(other.severity),
  );
  return [
    head,
    {
      kind: 'table',
      summary: 'Cautions, acceptances and stops of this sheet',
      columns: [
        { head: 'kind', share: 1.1 },
        { head: 'what', share: 5.4 },
        { head: 'concerns', share: 1.7 },
      ],
      rows: rows.map((row) => ({
        cells: [
          { lines: [{ text: CHOICE_LABELS.severity[row.severity], face: 'semibold' as const }] },
          cell(row.text),
          cell(row.field ? (fieldOf(row.field)?.label ?? '–') : '–', { tone: 'soft' }),
        ],
      })),
    },
  ];
}

/** What stands at the head of the sheet, in words. */
export function notices({ evaluation, state, issued }: SheetContent): NoticeItem[] {
  const items: NoticeItem[] = issued ? concessionNotices(issued) : [];
  for (const severity of ['stop', 'fail', 'acceptance'] as const) {
    const found = evaluation.cautions.filter((caution) => caution.severity === severity);
    const shown = issued?.concessions.some(({ kind }) => kind === ANSWERED_BY[severity]) ? [] : found;
    if (shown.length > 0)
      items.push({
        mark: counted(shown.length, CHOICE_LABELS.severity[severity].toLowerCase()),
        text: MEANING[severity] ?? '',
      });
  }
  const memory = evaluation.trace.filter(({ source }) => source.status === 'memory').length;
  if (memory > 0)
    items.push({
      mark: 'memory',
      text: `${memory} of ${evaluation.trace.length} lines of the calculation rest on figures from memory, not verified`,
    });
  if (!issued) {
    const stage = state === 'draft' ? '' : `${REVISION_STATE_LABELS[state].toLowerCase()}, not issued: `;
    items.push({ mark: 'draft', text: `${stage}not for ordering, not for construction` });
  }
  return items;
}

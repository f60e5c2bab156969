import type { Status, TraceLine } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { heading, paragraph, type Block, type Cell, type Row, type Words } from '../blocks';
import type { SheetContent } from '../content';
import { citation, sameWords, statusWords, withUnit } from '../words';

const RESULT_DIGITS = 10;
const SIZE = 7.5;

/** The working, line by line: formula, the same with figures, the unrounded result, the clause and how well it is known. */
export function calculation({ evaluation }: SheetContent): Block[] {
  const head = heading(1, 'Calculation');
  if (evaluation.trace.length === 0) return [head, paragraph('No working: nothing was computed.', { tone: 'soft' })];
  return [
    head,
    paragraph(
      `Method edition ${evaluation.methodEdition}. Results are unrounded; rounding comes once, at the end: requirements upward, ` +
        `what is provided downward. ${statusSummary(evaluation.trace)}`,
      { tone: 'soft' },
    ),
    {
      kind: 'table',
      summary: 'The calculation line by line: formula, substitution, result, source and status',
      size: SIZE,
      columns: [
        { head: 'no', share: 0.5, align: 'right' },
        { head: 'formula and substitution', share: 4.1 },
        { head: 'result', share: 1.9, align: 'right' },
        { head: 'source and status', share: 3 },
      ],
      rows: evaluation.trace.map(traceRow),
    },
  ];
}

function traceRow(line: TraceLine, index: number): Row {
  const same = line.formula === line.substitution;
  const working: Cell = {
    lines: [
      { text: line.heading, face: 'semibold' },
      { text: printed(line.formula), face: 'mono' },
      ...(same || line.substitution === '' ? [] : [{ text: printed(line.substitution), face: 'mono' as const }]),
    ],
  };
  return {
    cells: [
      { lines: [{ text: String(index + 1), face: 'mono', tone: 'soft' }], align: 'right' },
      working,
      { lines: [{ text: withUnit(resultWords(line.result), line.unit), face: 'mono' }], align: 'right' },
      { lines: sourceLines(line) },
    ],
  };
}

/** Signs as they are printed: a raised dot, a root, a minus. */
const printed = (formula: string): string =>
  formula
    .replace(/ \* /g, ' · ')
    .replace(/\bsqrt\(/g, '√(')
    .replace(/ - /g, ' − ');

function sourceLines({ source }: TraceLine): Words[] {
  const cited = citation(source);
  const status = statusWords(source);
  return sameWords(cited, status) ? [{ text: cited }] : [{ text: cited }, { text: status, tone: 'soft' }];
}

function resultWords(result: number | string | null): string {
  if (result === null) return 'no figure';
  if (typeof result === 'string') return result;
  return String(Number(result.toPrecision(RESULT_DIGITS))).replace('-', '−');
}

/** "Of 12 lines: 8 seen; 3 from memory, not verified; ..." */
function statusSummary(trace: TraceLine[]): string {
  const counts = new Map<Status, number>();
  for (const { source } of trace) counts.set(source.status, (counts.get(source.status) ?? 0) + 1);
  const parts = [...counts].map(([status, count]) => `${count} ${CHOICE_LABELS.status[status]}`);
  return `Of ${trace.length} ${trace.length === 1 ? 'line' : 'lines'}: ${parts.join('; ')}.`;
}

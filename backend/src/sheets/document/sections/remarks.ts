import { heading, paragraph, type Block } from '../blocks';
import type { SheetContent, SheetRemark } from '../content';
import { fieldWords, siteTime } from '../words';

const TRACE = 'trace:';

/** What the checker remarked and what the author answered, in the order in which it was said. */
export function remarks(content: SheetContent): Block[] {
  if (!content.issued) return [];
  const head = heading(1, 'Remarks and answers');
  if (content.issued.remarks.length === 0) return [head, paragraph('None.', { tone: 'soft' })];
  return [head, ...content.issued.remarks.flatMap((remark, i) => one(remark, i + 1, content))];
}

function one(
  { label, path, text, raisedBy, raisedAt, closedAt, answers }: SheetRemark,
  no: number,
  content: SheetContent,
): Block[] {
  const at = (instant: string): string => siteTime(instant, content.project.siteTimeZone);
  return [
    heading(2, `${no}. On revision ${label}: ${placeWords(path, content)}`),
    paragraph(`${raisedBy}, ${at(raisedAt)}: ${text}`),
    ...answers.map((answer) => paragraph(`Answer by ${answer.by}, ${at(answer.at)}: ${answer.text}`)),
    paragraph(closedAt === null ? 'Not closed.' : `Closed by ${raisedBy}, ${at(closedAt)}.`, { tone: 'soft' }),
  ];
}

function placeWords(path: string | null, { evaluation }: SheetContent): string {
  if (path === null) return 'the whole sheet';
  if (!path.startsWith(TRACE)) return fieldWords(path);
  const id = path.slice(TRACE.length).trim();
  const line = evaluation.trace.findIndex((one) => one.id === id);
  return line < 0 ? `calculation, ${id}` : `calculation, line ${line + 1}, ${evaluation.trace[line]?.heading ?? id}`;
}

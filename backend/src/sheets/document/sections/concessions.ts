import { CONCESSION_KIND_LABELS, CONCESSION_KINDS, type ConcessionKind } from '@bellgap/common/api';
import { heading, type Block, type NoticeItem, type Shape } from '../blocks';
import type { Issue, SheetConcession, SheetContent } from '../content';
import { counted, fieldWords, siteTime } from '../words';

const HEAD = 'Accepted, conceded, not waited for';

const SHAPES: Record<ConcessionKind, Shape> = {
  concession: 'triangle',
  acceptance: 'diamond',
  'later-change': 'square',
};
const MEANING: Record<ConcessionKind, string> = {
  concession: 'a requirement is not met and was conceded for a time',
  acceptance: 'outside a source, accepted with a reason',
  'later-change': 'newer than what this sheet rests on',
};
/** The heaviest first. */
const ORDER: ConcessionKind[] = [...CONCESSION_KINDS].sort((one, other) => weightOf(one) - weightOf(other));

function weightOf(kind: ConcessionKind): number {
  return Object.keys(SHAPES).indexOf(kind);
}

/** Beside the answer, in words and shape: how many of each, and until when. */
export function concessionNotices({ concessions }: Issue): NoticeItem[] {
  const items = ORDER.flatMap((kind): NoticeItem[] => {
    const found = concessions.filter((one) => one.kind === kind);
    if (found.length === 0) return [];
    const ends = found.flatMap(({ validUntil }) => (validUntil === null ? [] : [validUntil])).sort();
    const until = ends[0] === undefined ? '' : `, the first until ${ends[0]}`;
    const name = CONCESSION_KIND_LABELS[kind].toLowerCase();
    return [
      {
        shape: SHAPES[kind],
        mark: kind === 'later-change' ? `${found.length} ${name}` : counted(found.length, name),
        text: `${MEANING[kind]}${found.length === 1 ? until.replace('the first ', '') : until}`,
      },
    ];
  });
  return items.length === 0 ? [] : [...items, { mark: '', text: `Each in full, with its reason, under "${HEAD}".` }];
}

/** Each with its reason, who gave it, and its end. */
export function concessions({ issued, project }: SheetContent): Block[] {
  if (!issued || issued.concessions.length === 0) return [];
  const rows = [...issued.concessions].sort((one, other) => weightOf(one.kind) - weightOf(other.kind));
  return [heading(1, HEAD), ...rows.map((one) => box(one, project.siteTimeZone))];
}

function box({ kind, field, text, reason, validUntil, givenBy, givenAt }: SheetConcession, timeZone: string): Block {
  const concerns = field === null ? undefined : fieldWords(field);
  return {
    kind: 'notice',
    items: [
      { shape: SHAPES[kind], mark: CONCESSION_KIND_LABELS[kind], text },
      ...(concerns ? [{ mark: 'Concerns', text: concerns }] : []),
      { mark: 'Reason', text: reason },
      ...(validUntil === null ? [] : [{ mark: 'Valid until', text: validUntil }]),
      { mark: 'Given by', text: `${givenBy}, ${siteTime(givenAt, timeZone)}` },
    ],
  };
}

import type { CheckRecord } from '@bellgap/common/api';
import { CHECKLIST, type ChecklistAnswer, type ChecklistItem } from '@bellgap/common/schemas';
import type { CheckBody } from '../queries/use-check';

/** How one input was seen. Without `agreed` it is not looked at yet. */
export interface Tick {
  seenIn: string;
  agreed: boolean | null;
}

export interface Point {
  answer: ChecklistAnswer | null;
  note: string;
}

/** A check as far as it has come, by field and by point. */
export interface CheckDraft {
  ticks: Readonly<Record<string, Tick>>;
  points: Readonly<Partial<Record<ChecklistItem, Point>>>;
  differenceReason: string;
  independent: boolean;
}

type Stored = Pick<CheckRecord, 'ticks' | 'checklist' | 'differenceReason' | 'independent'>;

export function draftOf({ ticks, checklist, differenceReason, independent }: Stored): CheckDraft {
  return {
    ticks: Object.fromEntries(ticks.map(({ path, seenIn, agreed }) => [path, { seenIn: seenIn ?? '', agreed }])),
    points: Object.fromEntries(checklist.map(({ item, answer, note }) => [item, { answer, note }])),
    differenceReason,
    independent,
  };
}

/** What is sent: inputs that were looked at and points that were answered. */
export function bodyOf({ ticks, points, differenceReason, independent }: CheckDraft): CheckBody & Stored {
  return {
    ticks: Object.entries(ticks).flatMap(([path, { seenIn, agreed }]) =>
      agreed === null ? [] : [{ path, seenIn: seenIn.trim(), agreed }],
    ),
    checklist: (Object.keys(CHECKLIST) as ChecklistItem[]).flatMap((item) => {
      const point = points[item];
      return point?.answer ? [{ item, answer: point.answer, note: point.note.trim() }] : [];
    }),
    differenceReason: differenceReason.trim(),
    independent,
  };
}

export const keyOfDraft = (draft: CheckDraft): string => JSON.stringify(bodyOf(draft));

const same = (one: unknown, other: unknown): boolean => JSON.stringify(one ?? null) === JSON.stringify(other ?? null);

function mergedRecord<T>(
  mine: Readonly<Record<string, T>>,
  theirs: Readonly<Record<string, T>>,
  origin: Readonly<Record<string, T>>,
): Record<string, T> {
  const merged: Record<string, T> = { ...theirs };
  for (const [key, value] of Object.entries(mine)) if (!same(value, origin[key])) merged[key] = value;
  return merged;
}

/** The check was saved in another window too: what was written here stands, the rest is taken from there. */
export function mergedDraft(mine: CheckDraft, theirs: CheckDraft, origin: CheckDraft): CheckDraft {
  return {
    ticks: mergedRecord(mine.ticks, theirs.ticks, origin.ticks),
    points: mergedRecord(
      mine.points as Record<string, Point>,
      theirs.points as Record<string, Point>,
      origin.points as Record<string, Point>,
    ),
    differenceReason:
      mine.differenceReason === origin.differenceReason ? theirs.differenceReason : mine.differenceReason,
    independent: mine.independent === origin.independent ? theirs.independent : mine.independent,
  };
}

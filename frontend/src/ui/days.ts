const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric', timeZone: 'UTC' });

/** A day such as "2026-12-31" as it is read: "31 Dec 2026". */
export function dayText(day: string): string {
  const date = new Date(`${day}T00:00:00Z`);
  return Number.isNaN(date.getTime()) ? day : DAY.format(date);
}

/** Whole days from today, where the reader is; negative when the day has passed. */
export function daysUntil(day: string, now: Date = new Date()): number {
  const today = Date.UTC(now.getFullYear(), now.getMonth(), now.getDate());
  return Math.round((Date.parse(`${day}T00:00:00Z`) - today) / 86_400_000);
}

const countOf = (days: number) => (days === 1 ? '1 day' : `${days} days`);

/** When something is wanted. */
export function dueWords(daysLeft: number): string {
  if (daysLeft < 0) return `overdue by ${countOf(-daysLeft)}`;
  return daysLeft === 0 ? 'due today' : `in ${countOf(daysLeft)}`;
}

/** When something ends whose last day is counted. */
export function endWords(daysLeft: number): string {
  if (daysLeft < 0) return `ended ${countOf(-daysLeft)} ago`;
  return daysLeft === 0 ? 'ends today' : `ends in ${countOf(daysLeft)}`;
}

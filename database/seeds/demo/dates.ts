const DAY_MS = 86_400_000;

/** The story is written as if today were this day. */
export const STORY_TODAY = '2026-03-16';

/** A day of the story, moved by whole days so that the story ends today. Both dates YYYY-MM-DD. */
export function storyDay(day: string, today: string): string {
  return new Date(Date.parse(day) + Date.parse(today) - Date.parse(STORY_TODAY)).toISOString().slice(0, 10);
}

export function todayUtc(): string {
  return new Date(Math.floor(Date.now() / DAY_MS) * DAY_MS).toISOString().slice(0, 10);
}

import { Clock } from '../platform/clock';

const DAY_MS = 86_400_000;

/** The story is written as if today were this day. */
const STORY_TODAY = '2026-03-16';

/**
 * A clock that is set by hand to the moments of the story, moved by whole days so that the story ends today; it never
 * runs ahead of the real one.
 */
export class StoryClock extends Clock {
  private at: Date;

  constructor(private readonly realNow: () => Date = () => new Date()) {
    super();
    this.at = realNow();
  }

  now(): Date {
    return new Date(this.at);
  }

  /** Sets the clock to a moment of the story, such as "2026-03-12T07:30:00Z". */
  set(moment: string): void {
    this.at = new Date(Math.min(Date.parse(moment) + this.shiftMs(), this.realNow().getTime()));
  }

  /** A day of the story as a real one, YYYY-MM-DD. */
  day(day: string): string {
    return new Date(Date.parse(day) + this.shiftMs()).toISOString().slice(0, 10);
  }

  private shiftMs(): number {
    return Math.floor(this.realNow().getTime() / DAY_MS) * DAY_MS - Date.parse(STORY_TODAY);
  }
}

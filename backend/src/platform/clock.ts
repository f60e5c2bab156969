/** The present, handed in so that the demonstration and tests can live at another time. */
export abstract class Clock {
  abstract now(): Date;

  /** The day in UTC, YYYY-MM-DD: grants begin and end with it. */
  today(): string {
    return this.now().toISOString().slice(0, 10);
  }
}

export class SystemClock extends Clock {
  now(): Date {
    return new Date();
  }
}

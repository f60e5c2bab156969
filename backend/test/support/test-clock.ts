import { Clock } from '../../src/platform/clock';

/** The present, moved by hand. */
export class TestClock extends Clock {
  private aheadMs = 0;

  now(): Date {
    return new Date(Date.now() + this.aheadMs);
  }

  advance({ minutes = 0, seconds = 0, days = 0 }: { minutes?: number; seconds?: number; days?: number }): void {
    this.aheadMs += ((days * 24 * 60 + minutes) * 60 + seconds) * 1000;
  }
}

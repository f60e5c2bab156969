import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { Clock } from '../platform/clock';
import { SealsRepository } from './seals.repository';

const BATCH_ROWS = 1000;
/** Rows that began before others and were committed after them are looked for so far back at each turn. */
const LOOK_BACK_IDS = 10_000;
/** How often the whole trail is looked through for rows without a seal; also at the start. */
const WHOLE_EVERY_MS = 3600 * 1000;

/** Numbers what has been committed to the trail and chains it; of many processes one at a time. */
@Injectable()
export class SealingService implements OnModuleDestroy {
  private stopping = false;
  private wholeAt = -Infinity;

  constructor(
    private readonly clock: Clock,
    private readonly seals: SealsRepository,
  ) {}

  /** A batch under way is finished, another is not begun. */
  onModuleDestroy(): void {
    this.stopping = true;
  }

  /** Seals all that is there; how many rows that were. */
  async seal(): Promise<number> {
    const startedAt = this.clock.now().getTime();
    const whole = startedAt - this.wholeAt >= WHOLE_EVERY_MS;
    let pastId = whole ? 0 : (await this.seals.newestSealedEvent()) - LOOK_BACK_IDS;
    let sealedCount = 0;
    while (!this.stopping) {
      const batch = await this.seals.sealNext(pastId, BATCH_ROWS, this.clock.now());
      if (batch === null) return sealedCount;
      sealedCount += batch.count;
      pastId = batch.lastId;
      if (batch.count < BATCH_ROWS) {
        if (whole) this.wholeAt = startedAt;
        return sealedCount;
      }
    }
    return sealedCount;
  }
}

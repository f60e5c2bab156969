import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { AccountLinksService } from '../account-links/account-links.service';
import { Clock } from '../platform/clock';
import { SessionsService } from './sessions.service';
import { ThrottleService } from './throttle.service';

const HOUR_MS = 3600 * 1000;
const DAY_MS = 24 * HOUR_MS;

/** Removes what has served its time: attempts after a day, sessions and links three months after their end. */
@Injectable()
export class HousekeepingService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Housekeeping');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly clock: Clock,
    private readonly throttle: ThrottleService,
    private readonly sessions: SessionsService,
    private readonly links: AccountLinksService,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(
      () => void this.tidy().catch((error: unknown) => this.logger.warn(String(error))),
      HOUR_MS,
    );
    this.timer.unref();
  }

  onApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  async tidy(): Promise<void> {
    const now = this.clock.now().getTime();
    await this.throttle.forget(new Date(now - DAY_MS));
    await this.sessions.forgetOld(new Date(now - 90 * DAY_MS));
    await this.links.forget(new Date(now - 90 * DAY_MS));
  }
}

import { Inject, Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { CONFIG, type Config } from '../platform/config';
import { SealingService } from './sealing.service';

const EVERY_MS = 2000;

/** Seals every few seconds, in processes that work and do not only serve pages. */
@Injectable()
export class SealingTimerService implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly logger = new Logger('Sealing');
  private timer: NodeJS.Timeout | undefined;
  private running: Promise<unknown> = Promise.resolve();
  private stopping = false;
  private lastFault = '';

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly sealing: SealingService,
  ) {}

  onApplicationBootstrap(): void {
    if (this.config.role !== 'web') this.waitForTurn();
  }

  async onModuleDestroy(): Promise<void> {
    this.stopping = true;
    clearTimeout(this.timer);
    await this.running;
  }

  private waitForTurn(): void {
    if (this.stopping) return;
    this.timer = setTimeout(() => {
      this.running = this.takeTurn().finally(() => this.waitForTurn());
    }, EVERY_MS);
    this.timer.unref();
  }

  /** A fault that stays the same is written down once. */
  private async takeTurn(): Promise<void> {
    try {
      await this.sealing.seal();
      this.lastFault = '';
    } catch (error) {
      const fault = String(error);
      if (fault !== this.lastFault) this.logger.warn(fault);
      this.lastFault = fault;
    }
  }
}

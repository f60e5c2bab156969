import {
  Inject,
  Injectable,
  Logger,
  type BeforeApplicationShutdown,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import type { Knex } from 'knex';
import { CONFIG, type Config } from '../platform/config';
import { QueueWorker, type Task } from './queue-worker';

export interface JobOptions {
  /** A job of the same key that has not begun yet is replaced. */
  key?: string;
  /** Not before this moment; at once where left out. */
  runAt?: Date;
}

/** Work that happens after the answer, or again until it succeeds: jobs stand in PostgreSQL beside what caused them. */
@Injectable()
export class QueueService implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly tasks = new Map<string, Task>();
  private worker: QueueWorker | null = null;

  constructor(@Inject(CONFIG) private readonly config: Config) {}

  /**
   * Says how jobs of a name are done; to be called before the application has started. A job runs at least once, so
   * its task must be able to run again. With `cron` (minute, hour, day, month, weekday, in UTC) it also runs by itself,
   * once for all processes together.
   */
  register<P>(name: string, run: (payload: P) => Promise<void>, { cron = null }: { cron?: string | null } = {}): void {
    if (this.tasks.has(name)) throw new Error(`Two tasks are named ${name}.`);
    this.tasks.set(name, { run: run as Task['run'], cron });
  }

  /** Adds a job in the transaction of its cause: without the cause there is no job, and the other way round. */
  async add(db: Knex.Transaction, name: string, payload: object, { key, runAt }: JobOptions = {}): Promise<void> {
    await db.raw('select graphile_worker.add_job(?, ?::json, job_key => ?, run_at => ?)', [
      name,
      JSON.stringify(payload),
      key ?? null,
      runAt ?? null,
    ]);
  }

  onApplicationBootstrap(): void {
    if (this.config.role === 'web' || this.tasks.size === 0) return;
    this.worker = new QueueWorker(this.config.databaseUrl, this.tasks, new Logger('Queue'));
    this.worker.start();
  }

  /** Before the connections of the product are closed: a job under way is finished. */
  async beforeApplicationShutdown(): Promise<void> {
    await this.worker?.stop();
  }
}

import { Client } from 'pg';

/** Locks of the database's session that say who lives; the number keeps them apart from other advisory locks. */
const STARTING = 7_402_001;
const lockOf = (worker: string) => `hashtextextended(${worker}, 7402001)`;

/**
 * A sign of life of one worker in the database. A job is locked by the worker that took it, and a worker that was killed
 * never gives it back; the sign goes out with its connection, and any other worker then frees the job.
 */
export class WorkerLife {
  private constructor(
    private readonly client: Client,
    private worker: string | null,
  ) {}

  /** Between this and `begin` nobody frees anything, because the worker's name is not known yet. */
  static async announce(connectionString: string, lost: (error: Error) => void): Promise<WorkerLife> {
    const client = new Client({ connectionString, application_name: 'bellgap-queue', keepAlive: true });
    client.on('error', lost);
    await client.connect();
    await client.query('select pg_advisory_lock_shared($1)', [STARTING]);
    return new WorkerLife(client, null);
  }

  async begin(worker: string): Promise<void> {
    await this.client.query(`select pg_advisory_lock(${lockOf('$1')})`, [worker]);
    await this.client.query('select pg_advisory_unlock_shared($1)', [STARTING]);
    this.worker = worker;
  }

  /** Frees the jobs of workers that live no longer; answers how many workers those were. */
  async freeJobsOfTheDead(): Promise<number> {
    const { rows } = await this.client.query<{ alone: boolean }>('select pg_try_advisory_lock($1) as alone', [
      STARTING,
    ]);
    if (!rows[0]?.alone) return 0;
    try {
      await this.client.query('begin');
      const { rows: dead } = await this.client.query<{ worker: string }>(
        `select worker
         from (select distinct locked_by as worker from graphile_worker.jobs where locked_by is not null) w
         where worker is distinct from $1 and pg_try_advisory_xact_lock(${lockOf('worker')})`,
        [this.worker],
      );
      const names = dead.map(({ worker }) => worker);
      if (names.length > 0) {
        await this.client.query('select graphile_worker.force_unlock_workers($1)', [names]);
        await this.client.query('select pg_notify($1, $2)', ['jobs:insert', JSON.stringify({ count: names.length })]);
      }
      await this.client.query('commit');
      return names.length;
    } catch (error) {
      await this.client.query('rollback').catch(() => undefined);
      throw error;
    } finally {
      await this.client.query('select pg_advisory_unlock($1)', [STARTING]).catch(() => undefined);
    }
  }

  async end(): Promise<void> {
    this.client.removeAllListeners('error');
    this.client.on('error', () => undefined);
    await this.client.end().catch(() => undefined);
  }
}

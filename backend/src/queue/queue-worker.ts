import { EventEmitter } from 'node:events';
import type { Logger } from '@nestjs/common';
import type { ParsedCronItem, Runner, TaskList, WorkerEvents } from 'graphile-worker';
import { WorkerLife } from './worker-life';

export interface Task {
  run: (payload: unknown) => Promise<void>;
  cron: string | null;
}

const LOUD: ReadonlySet<string> = new Set(['error', 'warning']);
const JOBS_AT_A_TIME = 4;
/** New jobs announce themselves; only those that are tried again are found by looking. */
const LOOK_EVERY_MS = 5_000;
const FREE_EVERY_MS = 15_000;
const TRY_AGAIN_MS = 5_000;
/** After a stop was asked for. What is not done by then is done by the next process. */
const FINISH_WITHIN_MS = 5_000;

/** Works on the queue until it is stopped. It outlives the loss of its connections. */
export class QueueWorker {
  private stopping = false;
  private wake: () => void = () => undefined;
  private whole: Promise<void> | null = null;

  constructor(
    private readonly connectionString: string,
    private readonly tasks: ReadonlyMap<string, Task>,
    private readonly logger: Logger,
  ) {}

  /** Returns at once: pages are served whether or not the queue can be reached. */
  start(): void {
    this.whole = this.keepWorking();
  }

  async stop(): Promise<void> {
    this.stopping = true;
    this.wake();
    await this.whole;
  }

  private async keepWorking(): Promise<void> {
    while (!this.stopping) {
      try {
        await this.workOnce();
      } catch (error) {
        this.logger.warn(`The queue stands still: ${wordsOf(error)}`);
      }
      if (!this.stopping) await this.pause(TRY_AGAIN_MS);
    }
  }

  private pause(ms: number): Promise<void> {
    return new Promise((resolve) => {
      const timer = setTimeout(resolve, ms);
      this.wake = () => {
        clearTimeout(timer);
        resolve();
      };
    });
  }

  /** Works until it is stopped or a connection is lost. */
  private async workOnce(): Promise<void> {
    let lost: (error: Error) => void = () => undefined;
    const connectionLost = new Promise<Error>((resolve) => (lost = resolve));
    const life = await WorkerLife.announce(this.connectionString, lost);
    let timer: NodeJS.Timeout | undefined;
    try {
      const runner = await this.run(life);
      const free = () => life.freeJobsOfTheDead().catch((error: unknown) => this.logger.warn(wordsOf(error)));
      await free();
      timer = setInterval(() => void free(), FREE_EVERY_MS);
      const asked = new Promise<null>((resolve) => (this.wake = () => resolve(null)));
      const ended = runner.promise.then(
        () => new Error('the worker has ended'),
        (error: unknown) => (error instanceof Error ? error : new Error(wordsOf(error))),
      );
      const error = this.stopping ? null : await Promise.race([asked, connectionLost, ended]);
      await runner.stop().catch((fault: unknown) => this.logger.warn(wordsOf(fault)));
      if (error) throw error;
    } finally {
      clearInterval(timer);
      await life.end();
    }
  }

  private async run(life: WorkerLife): Promise<Runner> {
    // Loaded here, so that a process that only serves pages does without it.
    const { Logger: QueueLogger, parseCronItems, run } = await import('graphile-worker');
    const events = new EventEmitter() as unknown as WorkerEvents;
    let begun: Promise<void> = Promise.resolve();
    events.on('pool:create', ({ workerPool }) => (begun = life.begin(workerPool.id)));
    const runner = await run({
      connectionString: this.connectionString,
      concurrency: JOBS_AT_A_TIME,
      maxPoolSize: JOBS_AT_A_TIME + 1,
      pollInterval: LOOK_EVERY_MS,
      gracefulShutdownAbortTimeout: FINISH_WITHIN_MS,
      noHandleSignals: true,
      logger: new QueueLogger(() => (level, message) => {
        if (LOUD.has(level)) this.logger.warn(message.split('\n')[0]);
      }),
      events,
      taskList: this.taskList(),
      parsedCronItems: this.cronItems(parseCronItems),
    });
    try {
      await begun;
    } catch (error) {
      await runner.stop().catch(() => undefined);
      throw error;
    }
    return runner;
  }

  private taskList(): TaskList {
    // A job that takes longer than a stop may is given back, and done again by the next worker.
    return Object.fromEntries(
      [...this.tasks].map(([name, { run }]) => [
        name,
        (payload, { abortPromise }) => Promise.race([run(payload), abortPromise]),
      ]),
    );
  }

  private cronItems(parse: typeof import('graphile-worker').parseCronItems): ParsedCronItem[] {
    return parse(
      [...this.tasks].flatMap(([task, { cron }]) => (cron ? [{ task, match: cron, identifier: task }] : [])),
    );
  }
}

const wordsOf = (error: unknown) => (error instanceof Error ? error.message : String(error));

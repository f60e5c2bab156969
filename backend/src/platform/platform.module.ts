import { Global, Inject, Module, type DynamicModule, type OnApplicationShutdown } from '@nestjs/common';
import { APP_FILTER } from '@nestjs/core';
import type { Knex } from 'knex';
import { createKnex } from '@bellgap/database';
import { Clock, SystemClock } from './clock';
import { CONFIG, type Config } from './config';
import { KNEX } from './knex';
import { ProblemFilter } from './problem-filter';

export interface PlatformOptions {
  config: Config;
  clock?: Clock;
}

/** Settings, clock and database for every feature, and what all requests share. */
@Global()
@Module({})
export class PlatformModule implements OnApplicationShutdown {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  static with({ config, clock = new SystemClock() }: PlatformOptions): DynamicModule {
    return {
      module: PlatformModule,
      providers: [
        { provide: CONFIG, useValue: config },
        { provide: Clock, useValue: clock },
        { provide: KNEX, useFactory: () => createKnex({ url: config.databaseUrl, poolMax: config.databasePoolMax }) },
        { provide: APP_FILTER, useClass: ProblemFilter },
      ],
      exports: [CONFIG, Clock, KNEX],
    };
  }

  async onApplicationShutdown(): Promise<void> {
    await this.knex.destroy();
  }
}

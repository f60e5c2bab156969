import { readFileSync } from 'node:fs';
import path from 'node:path';
import { Controller, Get, Inject, Res } from '@nestjs/common';
import type { Response } from 'express';
import type { Knex } from 'knex';
import type { healthAnswer } from '@bellgap/common/api';
import { METHOD_EDITION } from '@bellgap/common/engine';
import type { InferType } from 'yup';
import { KNEX } from '../platform/knex';
import { Open } from '../platform/route';

type Health = InferType<typeof healthAnswer>;

const { version } = JSON.parse(readFileSync(path.resolve(__dirname, '../../package.json'), 'utf8')) as {
  version: string;
};
const PATIENCE_MS = 2000;

@Controller()
export class HealthController {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  @Open()
  @Get('/api/health')
  async health(@Res({ passthrough: true }) response: Response): Promise<Health> {
    const reachable = await this.databaseAnswers();
    response.status(reachable ? 200 : 503).setHeader('Cache-Control', 'no-store');
    return {
      status: reachable ? 'ok' : 'unavailable',
      database: reachable ? 'ok' : 'unreachable',
      version,
      methodEdition: METHOD_EDITION,
    };
  }

  private async databaseAnswers(): Promise<boolean> {
    try {
      await this.knex.raw('select 1').timeout(PATIENCE_MS);
      return true;
    } catch {
      return false;
    }
  }
}

import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { KNEX } from '../platform/knex';

export interface Recipient {
  email: string;
  name: string;
  active: boolean;
  isDemo: boolean;
}

@Injectable()
export class RecipientsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async find(userId: string): Promise<Recipient | null> {
    const row = (await this.knex('users as u')
      .where('u.id', userId)
      .first('u.email', 'u.name', 'u.active', 'u.is_demo')) as
      { email: string; name: string; active: boolean; is_demo: boolean } | undefined;
    return row ? { email: row.email, name: row.name, active: row.active, isDemo: row.is_demo } : null;
  }
}

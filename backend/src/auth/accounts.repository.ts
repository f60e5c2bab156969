import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { Config } from '../platform/config';
import { KNEX } from '../platform/knex';

/** What signing in needs to know of a person. */
export interface Account {
  id: string;
  email: string;
  name: string;
  passwordHash: string | null;
  active: boolean;
  isDemo: boolean;
}

interface AccountRow {
  id: string;
  email: string;
  name: string;
  password_hash: string | null;
  active: boolean;
  is_demo: boolean;
}

const COLUMNS = ['u.id', 'u.email', 'u.name', 'u.password_hash', 'u.active', 'u.is_demo'] as const;

@Injectable()
export class AccountsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async findByEmail(email: string, db: Knex = this.knex): Promise<Account | null> {
    const row = (await db('users as u')
      .whereRaw('lower(u.email) = lower(?)', [email])
      .first(...COLUMNS)) as AccountRow | undefined;
    return row ? toAccount(row) : null;
  }

  async find(id: string, db: Knex = this.knex): Promise<Account | null> {
    const row = (await db('users as u')
      .where('u.id', id)
      .first(...COLUMNS)) as AccountRow | undefined;
    return row ? toAccount(row) : null;
  }

  async setPasswordHash(id: string, passwordHash: string, db: Knex): Promise<void> {
    await db('users').where({ id }).update({ password_hash: passwordHash });
  }
}

export function maySignIn({ active, isDemo }: Account, { demoAccounts }: Config): boolean {
  return active && (!isDemo || demoAccounts);
}

function toAccount(row: AccountRow): Account {
  return {
    id: row.id,
    email: row.email,
    name: row.name,
    passwordHash: row.password_hash,
    active: row.active,
    isDemo: row.is_demo,
  };
}

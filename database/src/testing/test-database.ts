import { randomBytes } from 'node:crypto';
import type { Knex } from 'knex';
import { createKnex } from '../create-knex';

/** Migrated and seeded with the reference rows once a run; every test file works on a copy of its own. */
export const TEMPLATE = 'bellgap_template';

export interface TestDatabase {
  /** The product's role, bellgap_app. */
  url: string;
  knex: Knex;
  /** The schema's owner, for rows that the product may not write and for the schema itself. */
  ownerUrl: string;
  owner: Knex;
  /** Closes the connections and drops the database. */
  close(): Promise<void>;
}

const OBJECT_IN_USE = '55006';

/** A fresh copy of the template. Needs the test cluster that the global set-up of jest starts. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const name = `test_${process.env.JEST_WORKER_ID ?? '0'}_${randomBytes(4).toString('hex')}`;
  await copyTemplate(name);
  const url = onDatabase(setting('TEST_DATABASE_URL'), name);
  const ownerUrl = onDatabase(setting('TEST_MIGRATION_DATABASE_URL'), name);
  const knex = createKnex({ url, applicationName: name });
  const owner = createKnex({ url: ownerUrl, poolMax: 2, applicationName: name });
  return {
    url,
    knex,
    ownerUrl,
    owner,
    close: async () => {
      await Promise.all([knex.destroy(), owner.destroy()]);
      await asSuperuser((superuser) => superuser.raw('drop database if exists ?? with (force)', [name]));
    },
  };
}

async function copyTemplate(name: string): Promise<void> {
  await asSuperuser(async (superuser) => {
    for (let attempt = 1; ; attempt += 1) {
      try {
        await superuser.raw('create database ?? template ?? owner bellgap_owner', [name, TEMPLATE]);
        break;
      } catch (error) {
        if ((error as { code?: string }).code !== OBJECT_IN_USE || attempt === 50) throw error;
        await new Promise((resolve) => setTimeout(resolve, 50 + 50 * Math.random()));
      }
    }
    await superuser.raw('revoke all on database ?? from public', [name]);
    await superuser.raw('grant connect on database ?? to bellgap_app', [name]);
  });
}

async function asSuperuser(act: (superuser: Knex) => Promise<unknown>): Promise<void> {
  const superuser = createKnex({ url: setting('TEST_SUPERUSER_DATABASE_URL'), poolMax: 1 });
  try {
    await act(superuser);
  } finally {
    await superuser.destroy();
  }
}

function setting(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: these tests need the global set-up of jest.`);
  return value;
}

function onDatabase(url: string, name: string): string {
  const changed = new URL(url);
  changed.pathname = `/${name}`;
  return changed.href;
}

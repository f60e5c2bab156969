import { existsSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import type { Knex } from 'knex';
import { MIGRATIONS_FOLDER } from './create-knex';
import { installQueue, removeQueue } from './queue';

/** Brings the schema up to date; answers the names of the migrations that ran. */
export async function migrate(knex: Knex): Promise<string[]> {
  removeOrphans();
  await installQueue(knex);
  const [, names] = (await knex.migrate.latest()) as [number, string[]];
  return names;
}

/** Takes every migration back, and the queue. */
export async function migrateDown(knex: Knex): Promise<string[]> {
  const [, names] = (await knex.migrate.rollback(undefined, true)) as [number, string[]];
  await removeQueue(knex);
  return names;
}

/** A migration that was renamed or taken out leaves its old build behind, and that must not run. */
function removeOrphans(): void {
  const sources = path.join(MIGRATIONS_FOLDER, '../../migrations');
  if (!existsSync(sources)) return;
  for (const name of readdirSync(MIGRATIONS_FOLDER)) {
    const source = path.join(sources, name.replace(/\.(js|d\.ts)(\.map)?$/, '.ts'));
    if (!existsSync(source)) rmSync(path.join(MIGRATIONS_FOLDER, name));
  }
}

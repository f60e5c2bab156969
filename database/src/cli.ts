import { createKnex } from './create-knex';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo';
import { migrate, migrateDown } from './migrate';
import { seedDemo } from '../seeds/demo';
import { seedReference } from '../seeds/reference';
import type { Knex } from 'knex';

const COMMANDS: Record<string, (knex: Knex) => Promise<void>> = {
  migrate: async (knex) => report('Migrated', await migrate(knex)),
  'migrate-down': async (knex) => report('Taken back', await migrateDown(knex)),
  'seed-reference': seedReference,
  'seed-demo': (knex) => seedDemo(knex),
};

function report(word: string, names: string[]): void {
  for (const name of names) console.log(`${word}: ${name}`);
}

function printDemoAccounts(): void {
  const width = Math.max(...DEMO_PEOPLE.map(({ email }) => email.length));
  for (const { email, name, title } of DEMO_PEOPLE) console.log(`  ${email.padEnd(width)}  ${name}, ${title}`);
  console.log(`  password of all: ${DEMO_PASSWORD}`);
}

/** node cli.js COMMAND...: each in turn over one connection of the schema's owner. */
async function main(commands: string[]): Promise<void> {
  if (commands.length === 1 && commands[0] === 'demo-accounts') return printDemoAccounts();
  const unknown = commands.find((name) => !(name in COMMANDS));
  if (commands.length === 0 || unknown !== undefined) {
    throw new Error(`Commands: ${[...Object.keys(COMMANDS), 'demo-accounts'].join(', ')}`);
  }
  const url = process.env.MIGRATION_DATABASE_URL;
  if (!url) throw new Error('MIGRATION_DATABASE_URL is not set.');
  const knex = createKnex({ url, poolMax: 2, applicationName: 'bellgap-schema' });
  try {
    for (const name of commands) await COMMANDS[name]?.(knex);
  } finally {
    await knex.destroy();
  }
}

main(process.argv.slice(2)).catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});

import type { Knex } from 'knex';
import { seedCatalogue } from './catalogue';
import { todayUtc } from './dates';
import { seedPeople, seedRoleGrants } from './people';
import { DEMO_PROJECT_IDS, seedProjects } from './projects';
import { seedSettings } from './settings';

/**
 * The plain rows of the demonstration; documents are made by the product's own services. May run again without harm.
 * `today` (YYYY-MM-DD) is the day on which the story ends.
 */
export async function seedDemo(knex: Knex, today: string = todayUtc()): Promise<void> {
  if (process.env.NODE_ENV === 'production') throw new Error('The demonstration is never loaded in production.');
  await knex.transaction(async (transaction) => {
    await seedPeople(transaction, today);
    await seedProjects(transaction, today);
    await seedRoleGrants(transaction, today, DEMO_PROJECT_IDS);
    await seedSettings(transaction, today);
    await seedCatalogue(transaction);
  });
}

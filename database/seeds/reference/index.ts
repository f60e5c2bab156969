import type { Knex } from 'knex';
import { seedCompanySettings } from './company-settings';

/** Rows that every installation has. May run again without harm. */
export async function seedReference(knex: Knex): Promise<void> {
  await knex.transaction((transaction) => seedCompanySettings(transaction));
}

import type { Knex } from 'knex';

/** What the insulation level of a design basis was worked out from. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table design_bases
      add column worksheet jsonb
      constraint design_bases_worksheet_check check (worksheet is null or jsonb_typeof(worksheet) = 'object');
    comment on column design_bases.worksheet is 'input of the worksheet, names with units as in the API; null where the level was known';
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table design_bases drop column worksheet');
}

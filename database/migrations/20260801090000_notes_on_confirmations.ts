import type { Knex } from 'knex';

/** What an owner of the print writes beside his word on a row: above all, what the print says where it differs. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table table_confirmations
      add column note text not null default '',
      add column sequence bigint generated always as identity;
    drop index table_confirmations_key_index;
    create index table_confirmations_key_index on table_confirmations (key, sequence desc);
    comment on column table_confirmations.sequence is 'order of recording: of a key the highest holds, also within one instant';
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop index table_confirmations_key_index;
    create index table_confirmations_key_index on table_confirmations (key, created_at desc);
    alter table table_confirmations drop column sequence, drop column note;
  `);
}

import type { Knex } from 'knex';

/** Company rules as versions that are added, never changed; and the owners' word on printed tables. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table company_settings (
      version integer constraint company_settings_pkey primary key,
      settings jsonb not null,
      set_by uuid constraint company_settings_set_by_fkey references users (id),
      set_at timestamptz not null default now(),
      reason text not null,
      constraint company_settings_version_check check (version >= 1),
      constraint company_settings_settings_check check (jsonb_typeof(settings) = 'object'),
      constraint company_settings_reason_check check (length(btrim(reason)) > 0)
    );
    comment on column company_settings.settings is 'the rules without their version, names with units as in the API';
    comment on column company_settings.set_by is 'null for the settings that come with the product';
    grant select, insert on company_settings to bellgap_app;

    create table table_confirmations (
      id uuid constraint table_confirmations_pkey primary key default gen_random_uuid(),
      key text not null,
      outcome text not null constraint table_confirmations_outcome_check check (outcome in ('confirmed', 'disputed')),
      edition text not null,
      page text not null,
      confirmed_on date not null,
      confirmed_by uuid not null constraint table_confirmations_confirmed_by_fkey references users (id),
      created_at timestamptz not null default now(),
      constraint table_confirmations_key_check check (length(btrim(key)) > 0)
    );
    create index table_confirmations_key_index on table_confirmations (key, created_at desc);
    comment on column table_confirmations.key is 'table or formula, with its row after a colon: iec-60071-1:a1; the newest row of a key holds';
    grant select, insert on table_confirmations to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table table_confirmations;
    drop table company_settings;
  `);
}

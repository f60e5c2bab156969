import type { Knex } from 'knex';

/** Specifications and their revisions: what was asked, what was looked up, what came out. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table specifications (
      id uuid constraint specifications_pkey primary key default gen_random_uuid(),
      project_id uuid not null constraint specifications_project_id_fkey references projects (id),
      number text not null,
      title text not null,
      kind text not null constraint specifications_kind_check check (kind in ('line', 'bay')),
      created_by uuid not null constraint specifications_created_by_fkey references users (id),
      created_at timestamptz not null default now(),
      constraint specifications_project_id_number_key unique (project_id, number),
      constraint specifications_number_check check (number ~ '^[A-Za-z0-9][A-Za-z0-9._-]{0,59}$'),
      constraint specifications_title_check check (length(btrim(title)) between 1 and 200)
    );
    grant select, insert, update on specifications to bellgap_app;

    create table revisions (
      id uuid constraint revisions_pkey primary key default gen_random_uuid(),
      specification_id uuid not null constraint revisions_specification_id_fkey references specifications (id),
      label text not null,
      state text not null default 'draft',
      basis_revision_id uuid constraint revisions_basis_revision_id_fkey references design_bases (id),
      insulator_code text,
      insulator_version integer,
      input jsonb not null,
      overrides jsonb not null default '{}',
      context jsonb,
      evaluation jsonb,
      method_edition text,
      units integer,
      governed_by text,
      highest_voltage_kv double precision,
      altitude_m double precision,
      severity text,
      worst_margin_percent double precision,
      cautions_count integer not null default 0,
      acceptances_count integer not null default 0,
      fails_count integer not null default 0,
      stops_count integer not null default 0,
      lock_version integer not null default 1,
      drafted_by uuid not null constraint revisions_drafted_by_fkey references users (id),
      checked_by uuid constraint revisions_checked_by_fkey references users (id),
      approved_by uuid constraint revisions_approved_by_fkey references users (id),
      saved_by uuid not null constraint revisions_saved_by_fkey references users (id),
      saved_at timestamptz not null default now(),
      returned_at timestamptz,
      created_at timestamptz not null default now(),
      constraint revisions_specification_id_label_key unique (specification_id, label),
      constraint revisions_label_check check (label ~ '^([A-Z]{1,2}|[0-9]{1,3})$'),
      constraint revisions_state_check
        check (state in ('draft', 'in_check', 'checked', 'issued', 'superseded', 'withdrawn')),
      constraint revisions_insulator_fkey
        foreign key (insulator_code, insulator_version) references insulators (code, version) match full,
      constraint revisions_input_check check (jsonb_typeof(input) = 'object'),
      constraint revisions_overrides_check check (jsonb_typeof(overrides) = 'object'),
      constraint revisions_evaluation_check
        check ((evaluation is null) = (context is null) and (evaluation is null) = (method_edition is null)),
      constraint revisions_units_check check (units >= 0),
      constraint revisions_counts_check check (least(cautions_count, acceptances_count, fails_count, stops_count) >= 0),
      constraint revisions_three_people_check check (
        (checked_by is null or checked_by <> drafted_by)
        and (approved_by is null or (approved_by <> drafted_by and checked_by is not null and approved_by <> checked_by))
      )
    );
    create index revisions_specification_id_index on revisions (specification_id, created_at desc);
    create index revisions_state_index on revisions (state, saved_at desc, id);
    create index revisions_insulator_index on revisions (insulator_code, insulator_version);
    create index revisions_basis_revision_id_index on revisions (basis_revision_id);
    comment on column revisions.overrides is 'by path: the reason why the input departs from the design basis';
    comment on column revisions.units is 'list column, written with the evaluation, like those after it to stops_count';
    comment on column revisions.severity is 'pollution class letter, or contamination level in words';
    grant select, insert, update on revisions to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table revisions;
    drop table specifications;
  `);
}

import type { Knex } from 'knex';

/** Lines and yards, their design bases, and who may do what on them. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table projects (
      id uuid constraint projects_pkey primary key default gen_random_uuid(),
      code text not null constraint projects_code_key unique,
      title text not null,
      kind text not null constraint projects_kind_check check (kind in ('line', 'yard')),
      site_time_zone text not null,
      paper text not null default 'A4' constraint projects_paper_check check (paper in ('A4', 'Letter')),
      description text not null default '',
      lock_version integer not null default 1,
      created_by uuid not null constraint projects_created_by_fkey references users (id),
      created_at timestamptz not null default now(),
      updated_by uuid not null constraint projects_updated_by_fkey references users (id),
      updated_at timestamptz not null default now(),
      constraint projects_code_check check (code ~ '^[A-Z0-9][A-Z0-9-]{0,23}$'),
      constraint projects_title_check check (length(btrim(title)) between 1 and 200)
    );
    comment on column projects.site_time_zone is 'zone name or offset of the site, as PostgreSQL and the browser know it: Etc/GMT-4';
    grant select, insert, update on projects to bellgap_app;

    create table design_bases (
      id uuid constraint design_bases_pkey primary key default gen_random_uuid(),
      project_id uuid not null constraint design_bases_project_id_fkey references projects (id),
      revision integer not null,
      number text not null,
      basis text not null constraint design_bases_basis_check check (basis in ('iec', 'north-american')),
      system jsonb not null,
      rules jsonb not null default '{}',
      note text not null default '',
      state text not null default 'draft',
      created_by uuid not null constraint design_bases_created_by_fkey references users (id),
      created_at timestamptz not null default now(),
      constraint design_bases_project_id_revision_key unique (project_id, revision),
      constraint design_bases_revision_check check (revision >= 1),
      constraint design_bases_number_check check (length(btrim(number)) between 1 and 60),
      constraint design_bases_system_check check (jsonb_typeof(system) = 'object'),
      constraint design_bases_rules_check check (jsonb_typeof(rules) = 'object'),
      constraint design_bases_state_check
        check (state in ('draft', 'in_check', 'checked', 'issued', 'superseded', 'withdrawn'))
    );
    comment on table design_bases is 'each saved change is a new revision; the highest revision of a project is the present one';
    comment on column design_bases.system is 'voltages in kV, earthing and insulation level, names with units as in the API';
    comment on column design_bases.rules is 'rules of this line or yard, names with units as in the API';
    grant select, insert on design_bases to bellgap_app;

    create table role_grants (
      id uuid constraint role_grants_pkey primary key default gen_random_uuid(),
      user_id uuid not null constraint role_grants_user_id_fkey references users (id),
      role text not null,
      project_id uuid constraint role_grants_project_id_fkey references projects (id),
      check_category smallint,
      valid_from date not null default current_date,
      valid_to date,
      granted_by uuid constraint role_grants_granted_by_fkey references users (id),
      granted_at timestamptz not null default now(),
      ended_at timestamptz,
      constraint role_grants_role_check
        check (role in ('engineer', 'checker', 'approver', 'procurement', 'reader', 'administrator')),
      constraint role_grants_check_category_check
        check (check_category is null or (role = 'checker' and check_category between 1 and 3)),
      constraint role_grants_valid_to_check check (valid_to is null or valid_to >= valid_from),
      constraint role_grants_granted_by_check check (granted_by <> user_id)
    );
    create index role_grants_user_id_index on role_grants (user_id);
    create index role_grants_project_id_index on role_grants (project_id);
    comment on column role_grants.project_id is 'null means all projects';
    comment on column role_grants.check_category is 'highest category a checker may take: 1 self, 2 independent, 3 outside; null means all';
    comment on column role_grants.valid_to is 'last day of validity, included; null for no end';
    comment on column role_grants.ended_at is 'from this instant the grant holds no more, whatever its dates say';
    comment on column role_grants.granted_by is 'null for the first administrator';
    grant select, insert, update on role_grants to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table role_grants;
    drop table design_bases;
    drop table projects;
  `);
}

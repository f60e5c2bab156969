import type { Knex } from 'knex';

/** Notes on a revision, some with the figures of a case that was thought of. They never reach the sheet. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table revision_notes (
      id uuid constraint revision_notes_pkey primary key default gen_random_uuid(),
      revision_id uuid not null constraint revision_notes_revision_id_fkey references revisions (id),
      title text not null,
      figures jsonb,
      text text not null default '',
      written_by uuid not null constraint revision_notes_written_by_fkey references users (id),
      written_at timestamptz not null default now(),
      constraint revision_notes_title_check check (length(btrim(title)) between 1 and 200),
      constraint revision_notes_figures_check check (figures is null or jsonb_typeof(figures) = 'object')
    );
    create index revision_notes_revision_id_index on revision_notes (revision_id, written_at desc, id);
    comment on column revision_notes.figures is 'key figures before and after the change thought of, names with units as in the API; null for words alone';
    grant select, insert, delete on revision_notes to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table revision_notes');
}

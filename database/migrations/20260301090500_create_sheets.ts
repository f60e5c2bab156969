import type { Knex } from 'knex';

/** Drawn sheets with what they were drawn from; the bytes stand apart, so that lists never read them. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table sheets (
      id uuid constraint sheets_pkey primary key default gen_random_uuid(),
      revision_id uuid not null constraint sheets_revision_id_fkey references revisions (id),
      kind text not null constraint sheets_kind_check check (kind in ('draft')),
      drawn_at timestamptz not null default now(),
      drawn_by uuid not null constraint sheets_drawn_by_fkey references users (id),
      input jsonb not null,
      context jsonb not null,
      evaluation jsonb not null,
      method_edition text not null,
      content_code text not null,
      file_sha256 text not null,
      pages integer not null,
      constraint sheets_content_code_check check (content_code ~ '^[0-9a-f]{12}$'),
      constraint sheets_file_sha256_check check (file_sha256 ~ '^[0-9a-f]{64}$'),
      constraint sheets_pages_check check (pages >= 1)
    );
    create unique index sheets_draft_key on sheets (revision_id) where kind = 'draft';
    comment on index sheets_draft_key is 'only the last drawn draft of a revision is kept';
    comment on column sheets.content_code is
      'first 12 digits of the SHA-256 over canonical JSON of input, context, evaluation and method edition';
    grant select, insert, delete on sheets to bellgap_app;

    create table sheet_files (
      sheet_id uuid constraint sheet_files_pkey primary key
        constraint sheet_files_sheet_id_fkey references sheets (id) on delete cascade,
      bytes bytea not null,
      constraint sheet_files_bytes_check check (octet_length(bytes) > 0)
    );
    comment on table sheet_files is 'never changed; the bytes of a replaced draft go with its row in sheets';
    grant select, insert on sheet_files to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table sheet_files;
    drop table sheets;
  `);
}

import type { Knex } from 'knex';

/** The way of a revision from draft to issued: labels, who changed what, submissions, checks, remarks, decisions. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table revisions
      add column title text,
      add column submitted_by uuid constraint revisions_submitted_by_fkey references users (id),
      add column submitted_at timestamptz,
      add column checked_at timestamptz,
      add column issued_at timestamptz,
      add column due_on date,
      add column check_category smallint,
      add column content_code text,
      add column return_note text,
      add column derived_from uuid constraint revisions_derived_from_fkey references revisions (id),
      add column standing_since timestamptz,
      add column standing_by uuid constraint revisions_standing_by_fkey references users (id),
      add column standing_reason text,
      add column successor_id uuid constraint revisions_successor_id_fkey references revisions (id),
      add constraint revisions_check_category_check check (check_category in (2, 3)),
      add constraint revisions_content_code_check check (content_code ~ '^[0-9a-f]{12}$'),
      add constraint revisions_return_check check (returned_at is null or return_note is not null);
    update revisions as r set title = s.title from specifications as s where s.id = r.specification_id;
    alter table revisions
      alter column title set not null,
      add constraint revisions_title_check check (length(btrim(title)) between 1 and 200),
      add constraint revisions_submitted_check check (
        (state = 'draft') = (submitted_at is null)
        and (submitted_at is null) = (submitted_by is null)
        and (submitted_at is null) = (content_code is null)
        and (submitted_at is null or evaluation is not null)
      ),
      add constraint revisions_checked_check check (
        (state in ('draft', 'in_check')) = (checked_by is null) and (checked_by is null) = (checked_at is null)
      ),
      add constraint revisions_issued_check check (
        (state in ('draft', 'in_check', 'checked')) = (approved_by is null) and (approved_by is null) = (issued_at is null)
      ),
      add constraint revisions_standing_check check (
        (state in ('superseded', 'withdrawn')) = (standing_since is not null)
        and (standing_since is null) = (standing_by is null)
        and (state <> 'withdrawn' or length(btrim(standing_reason)) > 0)
        and (state <> 'superseded' or successor_id is not null)
      ),
      add constraint revisions_label_state_check check (
        (label ~ '^[0-9]') = (state in ('issued', 'superseded', 'withdrawn'))
      );
    create unique index revisions_in_work_key on revisions (specification_id) where state in ('draft', 'in_check', 'checked');
    create unique index revisions_in_force_key on revisions (specification_id) where state = 'issued';
    create index revisions_waiting_index on revisions (state, due_on, submitted_at) where state in ('in_check', 'checked');
    comment on column revisions.title is 'the title of the specification as this revision has it';
    comment on column revisions.content_code is 'of what was submitted; the same that the sheet carries when it is issued';
    comment on column revisions.check_category is '2 independent, 3 outside; nobody checks his own work, so there is no 1';
    comment on column revisions.derived_from is 'the issued revision that this one was begun from';
    comment on column revisions.standing_since is 'when it ceased to be in force, with who, why and what follows it';

    create table revision_labels (
      specification_id uuid not null constraint revision_labels_specification_id_fkey references specifications (id),
      label text not null,
      revision_id uuid not null constraint revision_labels_revision_id_fkey references revisions (id),
      given_at timestamptz not null default now(),
      constraint revision_labels_pkey primary key (specification_id, label),
      constraint revision_labels_label_check check (label ~ '^([A-Z]{1,2}|[0-9]{1,3})$')
    );
    insert into revision_labels (specification_id, label, revision_id, given_at)
      select specification_id, label, id, created_at from revisions;
    create index revision_labels_revision_id_index on revision_labels (revision_id, given_at);
    comment on table revision_labels is 'every label that a revision ever had; a label is never given twice';
    grant select, insert on revision_labels to bellgap_app;

    create table revision_changes (
      id bigint generated always as identity constraint revision_changes_pkey primary key,
      revision_id uuid not null constraint revision_changes_revision_id_fkey references revisions (id),
      changed_by uuid not null constraint revision_changes_changed_by_fkey references users (id),
      at timestamptz not null default now(),
      paths text[] not null,
      constraint revision_changes_paths_check check (cardinality(paths) > 0)
    );
    insert into revision_changes (revision_id, changed_by, at, paths)
      select id, drafted_by, created_at, array['input'] from revisions
      union all
      select id, saved_by, saved_at, array['input'] from revisions where saved_by <> drafted_by;
    create index revision_changes_revision_id_index on revision_changes (revision_id, changed_by, id);
    comment on table revision_changes is 'who changed the content of a revision, and where; whoever stands here can neither check nor approve it';
    grant select, insert on revision_changes to bellgap_app;

    create table submissions (
      id uuid constraint submissions_pkey primary key default gen_random_uuid(),
      revision_id uuid not null constraint submissions_revision_id_fkey references revisions (id),
      label text not null,
      submitted_by uuid not null constraint submissions_submitted_by_fkey references users (id),
      submitted_at timestamptz not null default now(),
      due_on date,
      check_category smallint not null constraint submissions_check_category_check check (check_category in (2, 3)),
      note text not null default '',
      title text not null,
      input jsonb not null,
      overrides jsonb not null,
      context jsonb not null,
      evaluation jsonb not null,
      method_edition text not null,
      content_code text not null constraint submissions_content_code_check check (content_code ~ '^[0-9a-f]{12}$'),
      constraint submissions_revision_id_label_key unique (revision_id, label)
    );
    comment on table submissions is 'what was handed in under each letter, kept as it was';
    grant select, insert on submissions to bellgap_app;

    create table check_records (
      id uuid constraint check_records_pkey primary key default gen_random_uuid(),
      submission_id uuid not null constraint check_records_submission_id_fkey references submissions (id),
      checker_id uuid not null constraint check_records_checker_id_fkey references users (id),
      started_at timestamptz not null default now(),
      lock_version integer not null default 1,
      own_figures jsonb not null,
      own_figures_at timestamptz not null,
      ticks jsonb not null default '[]',
      checklist jsonb not null default '[]',
      difference_reason text not null default '',
      independent boolean not null default false,
      verdict text constraint check_records_verdict_check check (verdict in ('pass', 'pass-with-notes', 'return')),
      verdict_note text not null default '',
      decided_at timestamptz,
      method_edition text not null,
      constraint check_records_submission_id_checker_id_key unique (submission_id, checker_id),
      constraint check_records_own_figures_check check (jsonb_typeof(own_figures) = 'object'),
      constraint check_records_decided_check check ((verdict is null) = (decided_at is null))
    );
    create index check_records_checker_id_index on check_records (checker_id, started_at desc);
    comment on column check_records.own_figures is
      'the count and clearance of the checker by the cards he named, entered before he saw those of the author; never changed';
    grant select, insert, update on check_records to bellgap_app;

    create table review_remarks (
      id uuid constraint review_remarks_pkey primary key default gen_random_uuid(),
      revision_id uuid not null constraint review_remarks_revision_id_fkey references revisions (id),
      label text not null,
      path text,
      text text not null,
      raised_by uuid not null constraint review_remarks_raised_by_fkey references users (id),
      raised_at timestamptz not null default now(),
      closed_at timestamptz,
      constraint review_remarks_text_check check (length(btrim(text)) between 1 and 2000)
    );
    create index review_remarks_revision_id_index on review_remarks (revision_id, raised_at, id);
    create index review_remarks_open_index on review_remarks (revision_id) where closed_at is null;
    comment on column review_remarks.path is 'field of the input, or "trace:" and the line of the calculation; null for the whole';
    comment on column review_remarks.closed_at is 'only who raised it closes it';
    grant select, insert, update (closed_at) on review_remarks to bellgap_app;

    create table review_answers (
      id uuid constraint review_answers_pkey primary key default gen_random_uuid(),
      remark_id uuid not null constraint review_answers_remark_id_fkey references review_remarks (id),
      text text not null,
      written_by uuid not null constraint review_answers_written_by_fkey references users (id),
      written_at timestamptz not null default now(),
      constraint review_answers_text_check check (length(btrim(text)) between 1 and 2000)
    );
    create index review_answers_remark_id_index on review_answers (remark_id, written_at);
    grant select, insert on review_answers to bellgap_app;

    create table concessions (
      id uuid constraint concessions_pkey primary key default gen_random_uuid(),
      revision_id uuid not null constraint concessions_revision_id_fkey references revisions (id),
      kind text not null constraint concessions_kind_check check (kind in ('acceptance', 'concession', 'later-change')),
      code text not null,
      field text,
      text text not null,
      reason text not null,
      valid_until date,
      given_by uuid not null constraint concessions_given_by_fkey references users (id),
      given_at timestamptz not null default now(),
      constraint concessions_reason_check check (length(btrim(reason)) between 1 and 1000),
      constraint concessions_valid_until_check check ((kind = 'concession') = (valid_until is not null))
    );
    create unique index concessions_key on concessions (revision_id, kind, code, coalesce(field, ''), md5(text));
    create index concessions_valid_until_index on concessions (valid_until) where kind = 'concession';
    comment on table concessions is
      'what the approver took upon himself: outside a source, a fail until a date, or a newer basis that was not waited for';
    grant select, insert on concessions to bellgap_app;

    create table presences (
      revision_id uuid not null constraint presences_revision_id_fkey references revisions (id),
      user_id uuid not null constraint presences_user_id_fkey references users (id),
      editing boolean not null default false,
      seen_at timestamptz not null default now(),
      constraint presences_pkey primary key (revision_id, user_id)
    );
    comment on table presences is 'who has a revision open; rows of the last minute count, older ones are removed';
    grant select, insert, update, delete on presences to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table presences;
    drop table concessions;
    drop table review_answers;
    drop table review_remarks;
    drop table check_records;
    drop table submissions;
    drop table revision_changes;
    drop table revision_labels;
    drop index revisions_in_work_key, revisions_in_force_key, revisions_waiting_index;
    alter table revisions
      drop column title, drop column submitted_by, drop column submitted_at, drop column checked_at,
      drop column issued_at, drop column due_on, drop column check_category, drop column content_code,
      drop column return_note, drop column derived_from, drop column standing_since, drop column standing_by,
      drop column standing_reason, drop column successor_id,
      drop constraint if exists revisions_label_state_check;
  `);
}

import type { Knex } from 'knex';

/** Issued sheets: what the register lists, the code by which a print is looked up, and that they stay as they are. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table sheets drop constraint sheets_kind_check;
    alter table sheets
      add constraint sheets_kind_check check (kind in ('draft', 'issued')),
      add column specification_id uuid constraint sheets_specification_id_fkey references specifications (id),
      add column project_id uuid constraint sheets_project_id_fkey references projects (id),
      add column number text,
      add column title text,
      add column label text,
      add column specification_kind text,
      add column units integer,
      add column insulator_code text,
      add column governed_by text,
      add column highest_voltage_kv double precision,
      add column altitude_m double precision,
      add column severity text,
      add column worst_margin_percent double precision,
      add column acceptances_count integer,
      add column concessions_count integer,
      add column verification_code text,
      add column last_seal text,
      add column standing text,
      add column standing_since timestamptz,
      add column standing_by uuid constraint sheets_standing_by_fkey references users (id),
      add column standing_reason text,
      add column successor_id uuid constraint sheets_successor_id_fkey references sheets (id),
      add constraint sheets_verification_code_key unique (verification_code),
      add constraint sheets_verification_code_check check (verification_code ~ '^[2-9A-HJ-NP-Z]{16}$'),
      add constraint sheets_standing_check check (standing in ('current', 'superseded', 'withdrawn')),
      add constraint sheets_standing_since_check check (
        (standing is null or standing = 'current') = (standing_since is null)
        and (standing_since is null) = (standing_by is null)
        and (standing is distinct from 'superseded' or successor_id is not null)
        and (standing is distinct from 'withdrawn' or length(btrim(standing_reason)) > 0)
      ),
      add constraint sheets_issued_check check (
        (kind = 'issued') = (verification_code is not null)
        and (kind = 'issued') = (standing is not null)
        and (kind = 'draft' or (specification_id is not null and project_id is not null and number is not null
          and title is not null and label ~ '^[0-9]{1,3}$' and specification_kind is not null
          and acceptances_count is not null and concessions_count is not null))
      );
    create unique index sheets_issued_key on sheets (revision_id) where kind = 'issued';
    create unique index sheets_current_key on sheets (specification_id) where standing = 'current';
    create index sheets_issued_at_index on sheets (drawn_at, id) where kind = 'issued';
    create index sheets_number_index on sheets (number, id) where kind = 'issued';
    create index sheets_title_index on sheets (title, id) where kind = 'issued';
    create index sheets_project_index on sheets (project_id, drawn_at, id) where kind = 'issued';
    create index sheets_standing_index on sheets (standing, drawn_at, id) where kind = 'issued';
    create index sheets_units_index on sheets (units, id) where kind = 'issued';
    create index sheets_voltage_index on sheets (highest_voltage_kv, id) where kind = 'issued';
    create index sheets_altitude_index on sheets (altitude_m, id) where kind = 'issued';
    create index sheets_specification_index on sheets (specification_id, drawn_at) where kind = 'issued';
    create index sheets_insulator_index on sheets (insulator_code) where kind = 'issued';
    comment on column sheets.verification_code is '16 of 32 signs without look-alikes, random; printed in fours';
    comment on column sheets.last_seal is 'number and hash of the last seal of the trail when the sheet was issued';
    comment on column sheets.drawn_at is 'of an issued sheet: when it was issued';
    grant update (standing, standing_since, standing_by, standing_reason, successor_id) on sheets to bellgap_app;

    create function guard_sheet() returns trigger language plpgsql as $$
    begin
      if tg_op = 'DELETE' then
        if old.kind = 'issued' then
          raise exception 'An issued sheet stays.' using errcode = '23514', constraint = 'sheets_issued_kept';
        end if;
        return old;
      end if;
      if old.kind <> 'issued' or new.standing = 'current' or old.standing <> 'current'
        or (to_jsonb(old) - '{standing,standing_since,standing_by,standing_reason,successor_id}'::text[])
          <> (to_jsonb(new) - '{standing,standing_since,standing_by,standing_reason,successor_id}'::text[]) then
        raise exception 'What is issued stays as it is; only its standing may change, once.'
          using errcode = '23514', constraint = 'sheets_issued_kept';
      end if;
      return new;
    end $$;
    create trigger sheets_guard before update or delete on sheets for each row execute function guard_sheet();
    create trigger sheets_no_truncate before truncate on sheets execute function refuse_change();

    create function guard_sheet_file() returns trigger language plpgsql as $$
    begin
      if tg_op = 'UPDATE' or exists (select from sheets as s where s.id = old.sheet_id and s.kind = 'issued') then
        raise exception 'The bytes of a sheet stay as they are.' using errcode = '23514', constraint = 'sheet_files_kept';
      end if;
      return old;
    end $$;
    create trigger sheet_files_guard before update or delete on sheet_files
      for each row execute function guard_sheet_file();
    create trigger sheet_files_no_truncate before truncate on sheet_files execute function refuse_change();

    create table sheet_readings (
      sheet_id uuid not null constraint sheet_readings_sheet_id_fkey references sheets (id),
      user_id uuid not null constraint sheet_readings_user_id_fkey references users (id),
      first_at timestamptz not null default now(),
      last_at timestamptz not null default now(),
      constraint sheet_readings_pkey primary key (sheet_id, user_id)
    );
    comment on table sheet_readings is 'who took a copy of an issued sheet: he is told when it is superseded or withdrawn';
    grant select, insert, update (last_at) on sheet_readings to bellgap_app;

    create table verification_look_ups (
      id bigint generated always as identity constraint verification_look_ups_pkey primary key,
      address text not null,
      at timestamptz not null default now()
    );
    create index verification_look_ups_index on verification_look_ups (address, at);
    comment on table verification_look_ups is 'counted by address, so that codes cannot be guessed at; old rows are removed';
    grant select, insert, delete on verification_look_ups to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table verification_look_ups;
    drop table sheet_readings;
    drop trigger sheet_files_no_truncate on sheet_files;
    drop trigger sheet_files_guard on sheet_files;
    drop function guard_sheet_file();
    drop trigger sheets_no_truncate on sheets;
    drop trigger sheets_guard on sheets;
    drop function guard_sheet();
    delete from sheets where kind = 'issued';
    revoke update (standing, standing_since, standing_by, standing_reason, successor_id) on sheets from bellgap_app;
    alter table sheets
      drop column specification_id, drop column project_id, drop column number, drop column title, drop column label,
      drop column specification_kind, drop column units, drop column insulator_code, drop column governed_by,
      drop column highest_voltage_kv, drop column altitude_m, drop column severity, drop column worst_margin_percent,
      drop column acceptances_count, drop column concessions_count, drop column verification_code,
      drop column last_seal, drop column standing, drop column standing_since, drop column standing_by,
      drop column standing_reason, drop column successor_id,
      drop constraint sheets_kind_check,
      add constraint sheets_kind_check check (kind in ('draft'));
  `);
}

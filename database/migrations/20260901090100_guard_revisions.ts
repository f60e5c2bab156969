import type { Knex } from 'knex';

/** What no code may do, whoever runs it: skip a state, sign what one has changed, touch what is issued. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function guard_revision() returns trigger language plpgsql as $$
    declare
      content_is_same boolean;
    begin
      if tg_op <> 'UPDATE' then
        raise exception 'Revisions are never removed.' using errcode = '23514', constraint = 'revisions_kept';
      end if;
      if (old.id, old.specification_id, old.drafted_by, old.created_at, old.derived_from)
        is distinct from (new.id, new.specification_id, new.drafted_by, new.created_at, new.derived_from) then
        raise exception 'Where a revision comes from does not change.'
          using errcode = '23514', constraint = 'revisions_origin_kept';
      end if;
      content_is_same := (old.title, old.input, old.overrides, old.context, old.evaluation, old.method_edition,
          old.basis_revision_id, old.insulator_code, old.insulator_version)
        is not distinct from (new.title, new.input, new.overrides, new.context, new.evaluation, new.method_edition,
          new.basis_revision_id, new.insulator_code, new.insulator_version);
      if not content_is_same and (old.state <> 'draft' or new.state <> 'draft') then
        raise exception 'The content of a revision changes only while it is a draft.'
          using errcode = '23514', constraint = 'revisions_content_kept';
      end if;
      if old.state <> new.state and (old.state, new.state) not in (
        ('draft', 'in_check'), ('in_check', 'draft'), ('in_check', 'checked'), ('checked', 'draft'),
        ('checked', 'issued'), ('issued', 'superseded'), ('issued', 'withdrawn')
      ) then
        raise exception 'A revision does not go from % to %.', old.state, new.state
          using errcode = '23514', constraint = 'revisions_state_order';
      end if;
      if old.state in ('issued', 'superseded', 'withdrawn') then
        if old.state <> 'issued' or new.state = 'issued'
          or (to_jsonb(old) - '{state,standing_since,standing_by,standing_reason,successor_id,lock_version}'::text[])
            <> (to_jsonb(new) - '{state,standing_since,standing_by,standing_reason,successor_id,lock_version}'::text[]) then
          raise exception 'What is issued stays as it is; only its standing may change, once.'
            using errcode = '23514', constraint = 'revisions_issued_kept';
        end if;
      end if;
      if exists (
        select from revision_changes as c
        where c.revision_id = new.id
          and ((c.changed_by = new.checked_by and new.checked_by is distinct from old.checked_by)
            or (c.changed_by = new.approved_by and new.approved_by is distinct from old.approved_by))
      ) then
        raise exception 'Who changed a revision can neither check nor approve it.'
          using errcode = '23514', constraint = 'revisions_own_work';
      end if;
      return new;
    end $$;
    create trigger revisions_guard before update or delete on revisions for each row execute function guard_revision();

    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% are never changed or removed.', tg_table_name
        using errcode = '23514', constraint = tg_table_name || '_kept';
    end $$;
    create trigger revisions_no_truncate before truncate on revisions execute function refuse_change();
    create trigger revision_labels_kept before update or delete on revision_labels for each row execute function refuse_change();
    create trigger revision_labels_no_truncate before truncate on revision_labels execute function refuse_change();
    create trigger revision_changes_kept before update or delete on revision_changes for each row execute function refuse_change();
    create trigger revision_changes_no_truncate before truncate on revision_changes execute function refuse_change();
    create trigger submissions_kept before update or delete on submissions for each row execute function refuse_change();
    create trigger submissions_no_truncate before truncate on submissions execute function refuse_change();
    create trigger concessions_kept before update or delete on concessions for each row execute function refuse_change();
    create trigger concessions_no_truncate before truncate on concessions execute function refuse_change();
    create trigger review_answers_kept before update or delete on review_answers for each row execute function refuse_change();
    create trigger review_answers_no_truncate before truncate on review_answers execute function refuse_change();
    create trigger review_remarks_no_truncate before truncate on review_remarks execute function refuse_change();
    create trigger check_records_no_truncate before truncate on check_records execute function refuse_change();

    create function guard_check_record() returns trigger language plpgsql as $$
    begin
      if tg_op = 'DELETE' or old.decided_at is not null
        or (old.submission_id, old.checker_id, old.started_at, old.own_figures, old.own_figures_at, old.method_edition)
          is distinct from
          (new.submission_id, new.checker_id, new.started_at, new.own_figures, new.own_figures_at, new.method_edition) then
        raise exception 'The own figures of a checker, and a decided check, stay as they are.'
          using errcode = '23514', constraint = 'check_records_kept';
      end if;
      return new;
    end $$;
    create trigger check_records_guard before update or delete on check_records
      for each row execute function guard_check_record();

    create function guard_remark() returns trigger language plpgsql as $$
    begin
      if tg_op = 'DELETE' or old.closed_at is not null
        or (to_jsonb(old) - 'closed_at') <> (to_jsonb(new) - 'closed_at') then
        raise exception 'A remark is only closed, once.' using errcode = '23514', constraint = 'review_remarks_kept';
      end if;
      return new;
    end $$;
    create trigger review_remarks_guard before update or delete on review_remarks
      for each row execute function guard_remark();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop trigger review_remarks_guard on review_remarks;
    drop trigger check_records_guard on check_records;
    drop trigger check_records_no_truncate on check_records;
    drop trigger review_remarks_no_truncate on review_remarks;
    drop trigger review_answers_no_truncate on review_answers;
    drop trigger review_answers_kept on review_answers;
    drop trigger concessions_no_truncate on concessions;
    drop trigger concessions_kept on concessions;
    drop trigger submissions_no_truncate on submissions;
    drop trigger submissions_kept on submissions;
    drop trigger revision_changes_no_truncate on revision_changes;
    drop trigger revision_changes_kept on revision_changes;
    drop trigger revision_labels_no_truncate on revision_labels;
    drop trigger revision_labels_kept on revision_labels;
    drop trigger revisions_no_truncate on revisions;
    drop trigger revisions_guard on revisions;
    drop function guard_remark();
    drop function guard_check_record();
    drop function refuse_change();
    drop function guard_revision();
  `);
}

import type { Knex } from 'knex';

/** The chain over the trail, and the rule that neither trail nor chain is ever changed, whoever asks. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_seals (
      number bigint constraint audit_seals_pkey primary key,
      event_id bigint not null constraint audit_seals_event_id_key unique,
      hash text not null,
      sealed_at timestamptz not null default now(),
      constraint audit_seals_number_check check (number >= 1),
      constraint audit_seals_hash_check check (hash ~ '^[0-9a-f]{64}$')
    );
    comment on table audit_seals is 'no foreign key to the trail: a seal outlasts the row that it seals, so that a removal shows';
    comment on column audit_seals.hash is 'SHA-256 over the hash before and the canonical JSON of the row';
    grant select, insert on audit_seals to bellgap_app;

    create index audit_events_at_index on audit_events (at);
    create index audit_events_action_index on audit_events (action, id);
    create index audit_events_entity_id_index on audit_events (entity_id, id);
    drop index audit_events_entity_index;

    create function refuse_change_of_trail() returns trigger language plpgsql as $$
    begin
      raise exception '% is only ever added to', tg_table_name using errcode = 'restrict_violation';
    end $$;
    create trigger audit_events_added_to_only before update or delete or truncate on audit_events
      for each statement execute function refuse_change_of_trail();
    create trigger audit_seals_added_to_only before update or delete or truncate on audit_seals
      for each statement execute function refuse_change_of_trail();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table audit_seals;
    drop trigger audit_events_added_to_only on audit_events;
    drop function refuse_change_of_trail();
    create index audit_events_entity_index on audit_events (entity, entity_id, id);
    drop index audit_events_entity_id_index;
    drop index audit_events_action_index;
    drop index audit_events_at_index;
  `);
}

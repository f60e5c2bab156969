import type { Knex } from 'knex';

/** Who did what, written in the transaction of its cause. The product may add and read, nothing else. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_events (
      id bigint generated always as identity constraint audit_events_pkey primary key,
      at timestamptz not null default now(),
      actor_id uuid constraint audit_events_actor_id_fkey references users (id),
      action text not null,
      entity text not null,
      entity_id text not null,
      project_id uuid constraint audit_events_project_id_fkey references projects (id),
      changes jsonb not null default '{}',
      reason text,
      constraint audit_events_action_check check (length(btrim(action)) > 0),
      constraint audit_events_entity_check check (length(btrim(entity)) > 0),
      constraint audit_events_changes_check check (jsonb_typeof(changes) = 'object')
    );
    create index audit_events_entity_index on audit_events (entity, entity_id, id);
    create index audit_events_project_id_index on audit_events (project_id, id);
    create index audit_events_actor_id_index on audit_events (actor_id, id);
    comment on column audit_events.actor_id is 'null where the product itself acted';
    comment on column audit_events.changes is 'by path: the value before and the value after';
    grant select, insert on audit_events to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table audit_events');
}

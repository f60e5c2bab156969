import type { Knex } from 'knex';

const SCHEMA = 'graphile_worker';

/**
 * What the product's role needs to add jobs and to work on them; nothing of it changes the schema. The queue's tables
 * have row level security and no policy, so that none but their owner sees a row until one is made.
 */
const PRIVILEGES = `
  grant usage on schema ${SCHEMA} to bellgap_app;
  grant select, insert, update, delete on all tables in schema ${SCHEMA} to bellgap_app;
  revoke insert, update, delete on ${SCHEMA}.migrations from bellgap_app;
  grant usage, select on all sequences in schema ${SCHEMA} to bellgap_app;
  grant execute on all functions in schema ${SCHEMA} to bellgap_app;
  do $$
  declare
    queue_table text;
  begin
    for queue_table in
      select relname from pg_class c
      where relnamespace = '${SCHEMA}'::regnamespace and relkind = 'r' and relrowsecurity
        and not exists (select from pg_policy p where p.polrelid = c.oid and p.polname = 'bellgap_app')
    loop
      execute format('create policy bellgap_app on ${SCHEMA}.%I to bellgap_app using (true) with check (true)', queue_table);
    end loop;
  end
  $$;
`;

/** Brings the tables of the job queue up to date by the queue's own migrations, and lets the product use them. */
export async function installQueue(knex: Knex): Promise<void> {
  const { Logger, runMigrations } = await import('graphile-worker');
  const { connectionString } = (knex.client as Knex.Client).config.connection as { connectionString: string };
  await runMigrations({ connectionString, maxPoolSize: 1, concurrency: 1, logger: new Logger(() => () => undefined) });
  await knex.raw(PRIVILEGES);
}

export async function removeQueue(knex: Knex): Promise<void> {
  await knex.raw(`drop schema if exists ${SCHEMA} cascade`);
}

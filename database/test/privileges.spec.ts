import { createTestDatabase, seedDemo, type TestDatabase } from '../src';

const DENIED = '42501';

describe('the role of the product', () => {
  let database: TestDatabase;

  beforeAll(async () => {
    database = await createTestDatabase();
    await seedDemo(database.owner, '2026-03-16');
  });
  afterAll(() => database.close());

  const codeOf = (statement: string): Promise<string> =>
    database.knex.raw(statement).then(
      () => 'allowed',
      (error: { code?: string }) => error.code ?? 'no code',
    );

  const tables = async (): Promise<string[]> =>
    (await database.owner('pg_tables').where({ schemaname: 'public' }).pluck('tablename')) as string[];

  it.each([
    'create table intruder (id int primary key)',
    'create temporary table intruder (id int primary key)',
    'create schema intruder',
    'create function intruder() returns int language sql as $$select 1$$',
    'create role intruder',
    'create database intruder',
    'alter table users add column intruder text',
    'alter table users disable trigger all',
    'drop table users',
    'create index intruder on users (name)',
    'set role bellgap_owner',
    'set session_replication_role = replica',
    "copy users to '/tmp/users'",
    "select pg_read_file('postgresql.conf')",
    'create table graphile_worker.intruder (id int primary key)',
    'alter table graphile_worker._private_jobs disable row level security',
    'truncate table graphile_worker._private_jobs',
    'drop function graphile_worker.remove_job',
    'insert into graphile_worker.migrations (id) values (999)',
    'delete from graphile_worker.migrations',
  ])('may not: %s', async (statement) => {
    expect(await codeOf(statement)).toBe(DENIED);
  });

  it('cannot hand its privileges on', async () => {
    await database.knex.raw('grant all on users to public');
    const { rows } = await database.knex.raw<{ rows: unknown[] }>(
      `select from information_schema.role_table_grants where table_name = 'users' and grantee = 'PUBLIC'`,
    );
    expect(rows).toEqual([]);
  });

  it('may truncate no table', async () => {
    for (const table of await tables())
      expect([table, await codeOf(`truncate table ${table} cascade`)]).toEqual([table, DENIED]);
  });

  it.each([
    'audit_events',
    'audit_seals',
    'sheet_files',
    'company_settings',
    'table_confirmations',
    'design_bases',
    'design_basis_moves',
  ])('may add to %s and read it, but neither change nor remove its rows', async (table) => {
    const { rows } = await database.knex.raw<{ rows: { privilege: string }[] }>(
      `select privilege from unnest(array['SELECT', 'INSERT', 'UPDATE', 'DELETE', 'TRUNCATE', 'REFERENCES', 'TRIGGER']) privilege
         where has_table_privilege(current_user, ?, privilege)`,
      [table],
    );
    expect(rows.map(({ privilege }) => privilege).sort()).toEqual(['INSERT', 'SELECT']);
    const column = Object.keys(await database.owner(table).columnInfo()).find((name) => name !== 'id');
    expect(await codeOf(`update ${table} set ${column} = ${column}`)).toBe(DENIED);
    expect(await codeOf(`delete from ${table}`)).toBe(DENIED);
  });

  it.each(['users', 'role_grants', 'projects', 'specifications', 'revisions', 'insulators'])(
    'never deletes from %s',
    async (table) => {
      expect(await codeOf(`delete from ${table}`)).toBe(DENIED);
    },
  );

  it('adds jobs to the queue, sees them and takes them out again', async () => {
    const { rows } = await database.knex.raw<{ rows: { id: number }[] }>(
      `select id from graphile_worker.add_job('tell', '{"what":"nothing"}'::json)`,
    );
    const jobs = () => database.knex('graphile_worker.jobs').where({ task_identifier: 'tell' }).pluck('id');
    expect(await jobs()).toEqual([rows[0]!.id]);
    await database.knex.raw('select graphile_worker.complete_jobs(array[?]::bigint[])', [rows[0]!.id]);
    expect(await jobs()).toEqual([]);
  });

  it('changes of a catalogue unit only whether it is withdrawn', async () => {
    expect(await codeOf("update insulators set creepage_mm = 1 where code = 'G120-S'")).toBe(DENIED);
    expect(await codeOf("update insulators set withdrawn = true where code = 'G120-S'")).toBe('allowed');
  });
});

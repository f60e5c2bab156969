import { createTestDatabase, migrate, migrateDown, type TestDatabase } from '../src';

describe('the schema', () => {
  let database: TestDatabase;

  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(() => database.close());

  const tables = async (): Promise<string[]> => {
    const { rows } = await database.owner.raw<{ rows: { name: string }[] }>(
      `select relname as name from pg_class where relkind in ('r', 'p') and relnamespace = 'public'::regnamespace order by 1`,
    );
    return rows.map(({ name }) => name);
  };

  it('gives every table a primary key', async () => {
    const { rows } = await database.owner.raw<{ rows: { name: string }[] }>(
      `select relname as name from pg_class c
       where relkind in ('r', 'p') and relnamespace = 'public'::regnamespace
         and not exists (select from pg_constraint k where k.conrelid = c.oid and k.contype = 'p')`,
    );
    expect(rows).toEqual([]);
  });

  it('leaves nothing behind when all is taken back, and comes up again the same', async () => {
    const before = await tables();
    expect(before.length).toBeGreaterThan(15);

    await migrateDown(database.owner);
    expect(await tables()).toEqual(['knex_migrations', 'knex_migrations_lock']);

    await migrate(database.owner);
    expect(await tables()).toEqual(before);
  });
});

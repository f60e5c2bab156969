import { createTestDatabase, seedDemo, seedReference, type TestDatabase } from '../src';

describe('the seeds', () => {
  let database: TestDatabase;

  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(() => database.close());

  const everything = async (): Promise<Record<string, unknown[]>> => {
    const tables = (await database.owner('pg_tables').where({ schemaname: 'public' }).pluck('tablename')) as string[];
    const entries = tables.sort().map(async (table) => [table, await database.owner(table).orderBy(1)] as const);
    return Object.fromEntries(await Promise.all(entries));
  };

  it('may run again without changing a row', async () => {
    await seedReference(database.owner);
    await seedDemo(database.owner, '2026-03-16');
    const once = await everything();
    expect(once.users).toHaveLength(11);
    expect(once.projects).toHaveLength(4);
    expect(once.insulators).toHaveLength(12);
    expect(once.tower_families).toHaveLength(7);

    await seedReference(database.owner);
    await seedDemo(database.owner, '2026-05-01');
    expect(await everything()).toEqual(once);
  });

  it('moves the days of the story so that it ends on the day given', async () => {
    const later = await createTestDatabase();
    try {
      await seedDemo(later.owner, '2026-03-26');
      const delegation = await later.owner('role_grants').whereNotNull('valid_to').first('valid_from', 'valid_to');
      expect(delegation).toEqual({ valid_from: '2026-03-12', valid_to: '2026-03-30' });
    } finally {
      await later.close();
    }
  });

  it('gives the first design basis of KL221 the mistaken 220 kV and the second 245 kV', async () => {
    const bases = await database
      .owner('design_bases as b')
      .join('projects as p', 'p.id', 'b.project_id')
      .where('p.code', 'KL221')
      .orderBy('b.revision')
      .select<{ revision: number; system: { highestVoltageKv: number } }[]>('b.revision', 'b.system');
    expect(bases.map(({ revision, system }) => [revision, system.highestVoltageKv])).toEqual([
      [1, 220],
      [2, 245],
    ]);
  });

  it('refuses the demonstration in production', async () => {
    const before = process.env.NODE_ENV;
    process.env.NODE_ENV = 'production';
    try {
      await expect(seedDemo(database.owner)).rejects.toThrow('never loaded in production');
    } finally {
      process.env.NODE_ENV = before;
    }
  });
});

import { createTestDatabase, type TestDatabase } from '@bellgap/database';
import { listPage, type Page } from '../src/platform/list';

interface Row {
  id: string;
  value: number | null;
  at: Date;
}

const SORTS = {
  value: { column: 't.value', type: 'double precision' },
  at: { column: 't.at', type: 'timestamptz' },
} as const;

describe('listPage', () => {
  let database: TestDatabase;
  beforeAll(async () => {
    database = await createTestDatabase();
    await database.owner.raw(
      'create table t (id uuid primary key default gen_random_uuid(), value double precision, at timestamptz not null)',
    );
    await database.owner.raw(`insert into t (value, at)
      select case when i % 4 = 0 then null else (i % 3) / 3.0 end, timestamptz '2026-01-01' + (i % 5) * interval '1 microsecond'
      from generate_series(1, 23) i`);
  });
  afterAll(() => database.close());

  const page = (asked: { limit?: string; cursor?: string; sort?: string }): Promise<Page<Row>> =>
    listPage({
      query: database.owner('t').select('t.*'),
      knex: database.owner,
      asked,
      sorts: SORTS,
      defaultSort: 'value',
      idColumn: 't.id',
      toItem: (row: Row) => row,
    });

  it.each(['value', '-value', 'at', '-at'])(
    'walks by %s through every row once and back, empty values last',
    async (sort) => {
      const all = (await page({ sort, limit: '200' })).items;
      expect(all).toHaveLength(23);
      if (sort.endsWith('value')) expect(all.slice(-5).every(({ value }) => value === null)).toBe(true);
      const pages = [await page({ sort, limit: '4' })];
      while (pages.at(-1)!.next) pages.push(await page({ sort, limit: '4', cursor: pages.at(-1)!.next! }));
      expect(pages.flatMap(({ items }) => items)).toEqual(all);
      let back = pages.at(-1)!;
      const walkedBack = [back];
      while (back.previous) {
        back = await page({ sort, limit: '4', cursor: back.previous });
        walkedBack.unshift(back);
      }
      expect(walkedBack.flatMap(({ items }) => items)).toEqual(all);
    },
  );

  it('goes on where the reader was when rows before it are gone', async () => {
    const first = await page({ sort: 'value', limit: '4' });
    const second = await page({ sort: 'value', limit: '4', cursor: first.next! });
    await database.owner('t').where({ id: first.items[3]!.id }).delete();
    expect((await page({ sort: 'value', limit: '4', cursor: first.next! })).items).toEqual(second.items);
  });

  it('refuses a cursor that was not written here', async () => {
    const forge = (cursor: object) => Buffer.from(JSON.stringify(cursor)).toString('base64url');
    const id = '7b0c9f1e-1111-4111-8111-111111111111';
    for (const cursor of [
      'garbage',
      forge({}),
      forge({ sort: 'value', value: 'x', id, back: false }),
      forge({ sort: 'value', value: '1', id: 'x', back: false }),
      forge({ sort: 'at', value: '1', id, back: false }),
    ]) {
      await expect(page({ sort: 'value', cursor })).rejects.toMatchObject({ code: 'validation' });
    }
  });
});

import { createTestDatabase, type TestDatabase } from '../src';

const RESTRICTED = '23001';

describe('the trail and its seals', () => {
  let database: TestDatabase;

  beforeAll(async () => {
    database = await createTestDatabase();
    await database.knex('audit_events').insert({ action: 'project.created', entity: 'project', entity_id: 'x' });
    await database.knex('audit_seals').insert({ number: 1, event_id: 1, hash: '0'.repeat(64) });
  });
  afterAll(() => database.close());

  const codeOf = (statement: string): Promise<string> =>
    database.owner.raw(statement).then(
      () => 'allowed',
      (error: { code?: string }) => error.code ?? 'no code',
    );

  it.each([
    "update audit_events set reason = 'another'",
    'delete from audit_events',
    'truncate audit_events',
    'truncate audit_events cascade',
    "update audit_seals set hash = repeat('1', 64)",
    'delete from audit_seals',
    'truncate audit_seals',
  ])('are only added to, also by their owner: %s', async (statement) => {
    expect(await codeOf(statement)).toBe(RESTRICTED);
  });

  it('take a number, a row and nothing but a hash once', async () => {
    const seal = { number: 2, event_id: 2, hash: 'a'.repeat(64) };
    const codeOfInsert = (row: object) =>
      database
        .knex('audit_seals')
        .insert(row)
        .then(
          () => 'allowed',
          (error: { code?: string }) => error.code,
        );
    expect(await codeOfInsert({ ...seal, number: 1 })).toBe('23505');
    expect(await codeOfInsert({ ...seal, event_id: 1 })).toBe('23505');
    expect(await codeOfInsert({ ...seal, hash: 'A'.repeat(64) })).toBe('23514');
    expect(await codeOfInsert({ ...seal, number: 0 })).toBe('23514');
  });
});

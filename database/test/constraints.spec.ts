import { createTestDatabase, seedDemo, type TestDatabase } from '../src';

describe('rules kept by the database itself', () => {
  let database: TestDatabase;
  let people: string[];
  let specificationId: string;

  beforeAll(async () => {
    database = await createTestDatabase();
    await seedDemo(database.owner, '2026-03-16');
    people = (await database.knex('users').orderBy('email').pluck('id')) as string[];
    const project = await database.knex('projects').where({ code: 'KL221' }).first<{ id: string }>('id');
    const [row] = await database
      .knex('specifications')
      .insert({ project_id: project?.id, number: 'INS-221-900', title: 'Strings', kind: 'line', created_by: people[0] })
      .returning<{ id: string }[]>('id');
    specificationId = row?.id as string;
  });
  afterAll(() => database.close());

  const revision = (fields: object): Promise<string> =>
    database
      .knex('revisions')
      .insert({ specification_id: specificationId, input: '{}', drafted_by: people[0], saved_by: people[0], ...fields })
      .then(
        () => 'stored',
        (error: { constraint?: string; message: string }) => error.constraint ?? error.message,
      );

  it('refuses one person in two of the three signatures', async () => {
    expect(await revision({ label: 'A', checked_by: people[0] })).toBe('revisions_three_people_check');
    expect(await revision({ label: 'A', checked_by: people[1], approved_by: people[1] })).toBe(
      'revisions_three_people_check',
    );
    expect(await revision({ label: 'A', checked_by: people[1], approved_by: people[0] })).toBe(
      'revisions_three_people_check',
    );
    expect(await revision({ label: 'A', approved_by: people[2] })).toBe('revisions_three_people_check');
    expect(await revision({ label: 'A', checked_by: people[1], approved_by: people[2] })).toBe('stored');
  });

  it('refuses a second revision of the same label', async () => {
    expect(await revision({ label: 'B' })).toBe('stored');
    expect(await revision({ label: 'B' })).toBe('revisions_specification_id_label_key');
  });

  it('refuses a unit that is in no catalogue', async () => {
    expect(await revision({ label: 'C', insulator_code: 'G120-S', insulator_version: 9 })).toBe(
      'revisions_insulator_fkey',
    );
  });

  it('refuses an evaluation without its context and edition', async () => {
    expect(await revision({ label: 'C', evaluation: '{}' })).toBe('revisions_evaluation_check');
  });

  it('takes an e-mail address once, whatever its case', async () => {
    const again = database.knex('users').insert({ email: 'T.ORVELLE@kigc.example', name: 'Somebody' });
    await expect(again).rejects.toMatchObject({ constraint: 'users_email_key' });
  });

  it('refuses a role granted to oneself', async () => {
    const grant = database.knex('role_grants').insert({ user_id: people[0], role: 'approver', granted_by: people[0] });
    await expect(grant).rejects.toMatchObject({ constraint: 'role_grants_granted_by_check' });
  });

  it('answers dates as text, counters as numbers and measures as numbers', async () => {
    const { rows } = await database.knex.raw<{ rows: unknown[] }>(
      `select date '2026-03-16' as day, count(*) as people, 0.1::double precision as measure, 12.30::numeric as money from users`,
    );
    expect(rows).toEqual([{ day: '2026-03-16', people: 11, measure: 0.1, money: '12.30' }]);
  });
});

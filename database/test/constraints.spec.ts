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
      .insert({
        specification_id: specificationId,
        title: 'Strings',
        input: '{}',
        drafted_by: people[0],
        saved_by: people[0],
        ...fields,
      })
      .then(
        () => 'stored',
        (error: { constraint?: string; message: string }) => error.constraint ?? error.message,
      );

  const signed = {
    state: 'issued',
    context: '{}',
    evaluation: '{}',
    method_edition: '1',
    content_code: 'abcdef012345',
    submitted_at: '2026-03-01T00:00:00Z',
    checked_at: '2026-03-02T00:00:00Z',
    issued_at: '2026-03-03T00:00:00Z',
  };

  it('refuses one person in two of the three signatures', async () => {
    const by = (checked: number, approved: number) =>
      revision({
        ...signed,
        label: '7',
        submitted_by: people[0],
        checked_by: people[checked],
        approved_by: people[approved],
      });
    expect(await by(0, 2)).toBe('revisions_three_people_check');
    expect(await by(1, 1)).toBe('revisions_three_people_check');
    expect(await by(1, 0)).toBe('revisions_three_people_check');
    expect(await by(1, 2)).toBe('stored');
  });

  it('refuses a signature that the state does not have, and a state without its signatures', async () => {
    expect(await revision({ label: 'A', checked_by: people[1], checked_at: signed.checked_at })).toBe(
      'revisions_checked_check',
    );
    expect(
      await revision({ ...signed, state: 'in_check', label: 'A', submitted_by: people[0], checked_at: null }),
    ).toBe('revisions_issued_check');
    expect(await revision({ label: '8' })).toBe('revisions_label_state_check');
    expect(await revision({ label: 'A' })).toBe('stored');
  });

  it('has one revision of a specification in work at a time', async () => {
    expect(await revision({ label: 'C' })).toBe('revisions_in_work_key');
  });

  it('refuses a second revision of the same label', async () => {
    expect(await revision({ label: 'A' })).toBe('revisions_specification_id_label_key');
  });

  it('refuses a unit that is in no catalogue', async () => {
    const [other] = await database
      .owner('specifications')
      .insert({
        project_id: database.owner('projects').where({ code: 'KL221' }).select('id'),
        number: 'INS-221-901',
        title: 'Strings',
        kind: 'line',
        created_by: people[0],
      })
      .returning<{ id: string }[]>('id');
    expect(
      await revision({ specification_id: other?.id, label: 'A', insulator_code: 'G120-S', insulator_version: 9 }),
    ).toBe('revisions_insulator_fkey');
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

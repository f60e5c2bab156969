import { contract, type User } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';
import type { TestPerson } from './support/people';

const { createUser, endGrant, grantRole, inviteUser, sessions, signIn, updateUser, users } = contract;

describe('people', () => {
  let test: TestApp;
  let client: TestClient;
  let administrator: TestPerson;
  beforeAll(async () => {
    test = await TestApp.start();
    ({ client, person: administrator } = await test.signedIn({ name: 'Wen Tollarsson', roles: ['administrator'] }));
  });
  afterAll(() => test.stop());

  const find = async (email: string): Promise<User> =>
    (await client.call(users, { query: { search: email } })).answer.items.find((user) => user.email === email)!;

  const grant = {
    role: 'engineer',
    projectCode: null,
    checkCategory: null,
    validFrom: '2026-01-01',
    validTo: null,
  };

  it('are invited, found and changed', async () => {
    const body = { email: 'l.brant@company.example', name: 'Leocadia Brant' };
    const { status, answer } = await client.call(createUser, { body });
    expect(status).toBe(201);
    expect(answer.user).toMatchObject({ ...body, active: true, hasPassword: false, grants: [] });

    const changed = { email: 'leocadia@company.example', name: 'Leocadia Brant-Osei', active: true };
    const updated = await client.call(updateUser, { params: { id: answer.user.id }, body: changed });
    expect(updated.answer).toMatchObject(changed);
    expect(await find('leocadia@company.example')).toEqual(updated.answer);
    const trail = await test.database.owner('audit_events').where({ entity_id: answer.user.id }).orderBy('id');
    expect(trail.map(({ action }: { action: string }) => action)).toEqual(['user.created', 'user.changed']);
    expect((trail[1] as { changes: unknown }).changes).toEqual({
      email: { from: 'l.brant@company.example', to: 'leocadia@company.example' },
      name: { from: 'Leocadia Brant', to: 'Leocadia Brant-Osei' },
    });
  });

  it('have addresses of their own, whatever the case of the letters', async () => {
    const { status, problem } = await client.call(createUser, {
      body: { email: administrator.email.toUpperCase(), name: 'Somebody' },
    });
    expect(status).toBe(409);
    expect(problem).toMatchObject({ code: 'already-exists', errors: [{ path: 'email' }] });
  });

  it('that do not exist are not found', async () => {
    const body = { email: 'x@company.example', name: 'X', active: true };
    for (const id of ['nobody', '7b0c9f1e-1111-4111-8111-111111111111']) {
      expect((await client.call(updateUser, { params: { id }, body })).status).toBe(404);
      expect((await client.call(inviteUser, { params: { id } })).status).toBe(404);
      expect((await client.call(grantRole, { params: { id }, body: grant })).status).toBe(404);
    }
  });

  it('are deactivated: their sessions end, they cannot come back until activated', async () => {
    const { client: theirs, person } = await test.signedIn({});
    const { id, email, name, password } = person;
    const set = (active: boolean) => client.call(updateUser, { params: { id }, body: { email, name, active } });
    expect((await theirs.call(sessions)).status).toBe(200);
    expect((await set(false)).answer.active).toBe(false);
    expect((await theirs.call(sessions)).status).toBe(401);
    expect((await test.stranger().call(signIn, { body: { email, password } })).status).toBe(401);
    expect((await client.call(inviteUser, { params: { id } })).status).toBe(409);
    expect((await set(true)).answer.active).toBe(true);
    expect((await theirs.call(sessions)).status).toBe(401);
    await test.signIn(person);
  });

  it('cannot deactivate themselves', async () => {
    const { id, email, name } = administrator;
    const { status, problem } = await client.call(updateUser, { params: { id }, body: { email, name, active: false } });
    expect(status).toBe(422);
    expect(problem.errors[0]!.path).toBe('active');
  });

  describe('and their roles', () => {
    it('hold from the next request on, and end with it', async () => {
      const { client: theirs, person } = await test.signedIn({});
      expect((await theirs.call(users)).status).toBe(403);
      const given = await client.call(grantRole, {
        params: { id: person.id },
        body: { ...grant, role: 'administrator', validFrom: new Date().toISOString().slice(0, 10) },
      });
      expect(given.status).toBe(201);
      expect(given.answer).toMatchObject({ role: 'administrator', projectCode: null, grantedBy: 'Wen Tollarsson' });
      expect((await theirs.call(users)).status).toBe(200);
      const ended = await client.call(endGrant, { params: { id: person.id, grantId: given.answer.id } });
      expect(ended.status).toBe(204);
      expect((await theirs.call(users)).status).toBe(403);
      expect((await client.call(endGrant, { params: { id: person.id, grantId: given.answer.id } })).status).toBe(404);
      expect((await find(person.email)).grants).toEqual([]);
    });

    it('are not changed by the person himself', async () => {
      const id = administrator.id;
      expect((await client.call(grantRole, { params: { id }, body: grant })).status).toBe(403);
      const own = (await find(administrator.email)).grants[0]!;
      expect((await client.call(endGrant, { params: { id, grantId: own.id } })).status).toBe(403);
    });

    it.each([
      ['a project that does not exist', { projectCode: 'NONE' }, 'projectCode'],
      ['an administrator of one project', { role: 'administrator', projectCode: 'KL1' }, 'projectCode'],
      ['a check category for an engineer', { checkCategory: 2 }, 'checkCategory'],
      ['an end before the beginning', { validTo: '2025-12-31' }, 'validTo'],
      ['an end in the past', { validFrom: '2020-01-01', validTo: '2020-12-31' }, 'validTo'],
      ['a day that does not exist', { validFrom: '2026-02-30' }, 'validFrom'],
      ['a role that does not exist', { role: 'owner' }, 'role'],
    ])('are refused for %s', async (_, change, path) => {
      const { id } = await test.people.add();
      const { status, problem } = await client.call(grantRole, { params: { id }, body: { ...grant, ...change } });
      expect(status).toBe(422);
      expect(problem.errors.map((error) => error.path)).toEqual([path]);
    });

    it('are not given twice for the same days', async () => {
      const { id } = await test.people.add();
      const first = { ...grant, validFrom: '2026-01-01', validTo: '2099-01-31' };
      expect((await client.call(grantRole, { params: { id }, body: first })).status).toBe(201);
      const overlapping = { ...grant, validFrom: '2099-01-31', validTo: null };
      expect((await client.call(grantRole, { params: { id }, body: overlapping })).status).toBe(409);
      const later = { ...grant, validFrom: '2099-02-01', validTo: null };
      expect((await client.call(grantRole, { params: { id }, body: later })).status).toBe(201);
    });
  });

  it('are listed page by page, both ways, each once', async () => {
    for (let i = 0; i < 12; i += 1) await test.people.add({ name: i % 2 ? 'Same Name' : `Name ${i}` });
    const all = (await client.call(users, { query: { limit: '200' } })).answer.items.map(({ id }) => id);
    const seen: string[] = [];
    let query: Record<string, string> = { limit: '5' };
    let page = (await client.call(users, { query })).answer;
    const pages = [page];
    expect(page.previous).toBeNull();
    while (page.next !== null) {
      query = { limit: '5', cursor: page.next };
      page = (await client.call(users, { query })).answer;
      pages.push(page);
    }
    for (const { items } of pages) seen.push(...items.map(({ id }) => id));
    expect(seen).toEqual(all);
    for (let i = pages.length - 2; i >= 0; i -= 1) {
      page = (await client.call(users, { query: { limit: '5', cursor: page.previous! } })).answer;
      expect(page.items).toEqual(pages[i]!.items);
      expect(page.next).not.toBeNull();
    }
    expect(page.previous).toBeNull();
  });

  it('are searched literally and sorted as asked', async () => {
    await test.people.add({ name: 'Per_Cent 100%' });
    await test.people.add({ name: 'PerXCent 1000' });
    const { items } = (await client.call(users, { query: { search: 'r_cent 100%' } })).answer;
    expect(items.map(({ name }) => name)).toEqual(['Per_Cent 100%']);
    const newest = (await client.call(users, { query: { sort: '-createdAt', limit: '1' } })).answer;
    expect(newest.items[0]!.name).toBe('PerXCent 1000');
    const foreign = await client.call(users, { query: { sort: 'name', cursor: newest.next! } });
    expect(foreign.status).toBe(422);
  });
});

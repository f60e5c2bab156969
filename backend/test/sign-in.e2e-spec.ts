import { contract } from '@bellgap/common/api';
import { TestApp } from './support/test-app';

const { signIn, signOut, currentSession, sessions, endSession } = contract;

describe('signing in', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  it('goes from stranger to signed in and back', async () => {
    const person = await test.people.add({ name: 'Ada Orvelle', roles: ['engineer', 'checker'] });
    const client = test.stranger();
    expect((await client.call(currentSession)).answer).toEqual({ user: null });

    const signedIn = await client.call(signIn, {
      body: { email: person.email.toUpperCase(), password: person.password },
    });
    expect(signedIn.status).toBe(201);
    const user = { id: person.id, email: person.email, name: 'Ada Orvelle', roles: ['engineer', 'checker'] };
    expect({ ...signedIn.answer.user, roles: [...signedIn.answer.user!.roles].sort().reverse() }).toEqual(user);
    expect((await client.call(currentSession)).answer.user?.id).toBe(person.id);

    const cookie = client.cookie!;
    expect((await client.call(signOut)).status).toBe(204);
    expect((await client.call(currentSession)).answer).toEqual({ user: null });
    client.cookie = cookie;
    expect((await client.call(sessions)).status).toBe(401);
  });

  it('gives the cookie to this site only, out of reach of scripts, and no token in the body', async () => {
    const person = await test.people.add();
    const { headers, response } = await test.stranger().call(signIn, { body: credentials(person) });
    const cookie = [headers['set-cookie']].flat()[0]!;
    expect(cookie).toMatch(/^bellgap_session=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Strict$/);
    const token = /=([^;]+);/.exec(cookie)![1]!;
    expect(response.text).not.toContain(token);
  });

  it('gives one answer for a wrong password, an unknown address, an inactive and an uninvited account', async () => {
    const person = await test.people.add();
    const inactive = await test.people.add({ active: false });
    const uninvited = await test.people.add();
    await test.database.owner('users').where({ id: uninvited.id }).update({ password_hash: null });
    const answers = [];
    for (const body of [
      { email: person.email, password: 'not the password' },
      { email: 'nobody@company.example', password: person.password },
      credentials(inactive),
      credentials(uninvited),
    ]) {
      const { problem } = await test.stranger().call(signIn, { body });
      answers.push({ ...problem, instance: '' });
    }
    expect(answers[0]).toMatchObject({ status: 401, code: 'not-signed-in', errors: [{ path: 'password' }] });
    for (const answer of answers) expect(answer).toEqual(answers[0]);
  });

  it('takes a forged, foreign or garbled cookie for none', async () => {
    const { client } = await test.signedIn({});
    const [header, , signature] = client.cookie!.split('.');
    const payload = Buffer.from(JSON.stringify({ sid: '7b0c9f1e-1111-4111-8111-111111111111' })).toString('base64url');
    for (const cookie of [`${header}.${payload}.${signature}`, 'bellgap_session=x', `bellgap_session=${payload}`]) {
      client.cookie = cookie;
      expect((await client.call(sessions)).status).toBe(401);
      expect((await client.call(currentSession)).answer).toEqual({ user: null });
    }
  });

  it('lists the own sessions and ends one of them at once, never that of somebody else', async () => {
    const person = await test.people.add();
    const here = await test.signIn(person);
    const there = await test.signIn(person);
    const { client: other } = await test.signedIn({});
    const list = (await here.call(sessions)).answer;
    expect(list).toHaveLength(2);
    expect(list.filter(({ current }) => current)).toHaveLength(1);
    const away = list.find(({ current }) => !current)!;
    expect((await there.call(sessions)).status).toBe(200);

    expect((await other.call(endSession, { params: { id: away.id } })).status).toBe(404);
    expect((await here.call(endSession, { params: { id: 'no-such' } })).status).toBe(404);
    expect((await here.call(endSession, { params: { id: away.id } })).status).toBe(204);
    expect((await there.call(sessions)).status).toBe(401);
    expect((await here.call(endSession, { params: { id: away.id } })).status).toBe(404);
    expect((await here.call(sessions)).answer).toHaveLength(1);
  });

  it('writes sign-in and sign-out into the trail', async () => {
    const { client, person } = await test.signedIn({});
    await client.call(signOut);
    const actions = await test.database
      .owner('audit_events')
      .where({ actor_id: person.id })
      .orderBy('id')
      .pluck('action');
    expect(actions).toEqual(['session.began', 'session.ended']);
  });
});

describe('the life of a session', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  it('lapses after 60 minutes without activity', async () => {
    const { client } = await test.signedIn({});
    test.clock.advance({ minutes: 59 });
    expect((await client.call(sessions)).status).toBe(200);
    test.clock.advance({ minutes: 59 });
    expect((await client.call(sessions)).status).toBe(200);
    test.clock.advance({ minutes: 60, seconds: 1 });
    expect((await client.call(sessions)).status).toBe(401);
  });

  it('is not kept alive by polling and timed saves', async () => {
    const { client } = await test.signedIn({});
    for (let minutes = 0; minutes < 50; minutes += 10) {
      test.clock.advance({ minutes: 10 });
      expect((await client.call(sessions, { headers: { 'X-Bellgap-Passive': '1' } })).status).toBe(200);
    }
    test.clock.advance({ minutes: 11 });
    expect((await client.call(sessions, { headers: { 'X-Bellgap-Passive': '1' } })).status).toBe(401);
  });

  it('ends after 12 hours whatever happens', async () => {
    const { client } = await test.signedIn({});
    for (let hours = 0; hours < 12; hours += 0.5) {
      expect((await client.call(sessions)).status).toBe(200);
      test.clock.advance({ minutes: 30 });
    }
    test.clock.advance({ seconds: 1 });
    expect((await client.call(sessions)).status).toBe(401);
  });

  it('writes the last activity at most once a minute', async () => {
    const { client, person } = await test.signedIn({});
    const lastActive = async () =>
      (
        await test.database
          .owner('sessions')
          .where({ user_id: person.id })
          .first<{ last_active_at: Date }>('last_active_at')
      ).last_active_at;
    const begun = await lastActive();
    test.clock.advance({ seconds: 30 });
    await client.call(sessions);
    expect(await lastActive()).toEqual(begun);
    test.clock.advance({ seconds: 31 });
    await client.call(sessions);
    const written = await lastActive();
    expect(written > begun).toBe(true);
    test.clock.advance({ seconds: 30 });
    await client.call(sessions);
    expect(await lastActive()).toEqual(written);
  });

  it('marks the cookie Secure where the product is reached by https', async () => {
    const secure = await TestApp.start({ PUBLIC_URL: 'https://bellgap.company.example' });
    try {
      const person = await secure.people.add();
      const { headers } = await secure.stranger().call(signIn, { body: credentials(person) });
      expect([headers['set-cookie']].flat()[0]).toMatch(/; Secure/);
      expect(headers['strict-transport-security']).toMatch(/max-age=/);
    } finally {
      await secure.stop();
    }
  });

  it('lets the accounts of the demonstration in only where they are allowed', async () => {
    const demo = await test.signedIn({ demo: true });
    expect((await demo.client.call(sessions)).status).toBe(200);
    const closed = await TestApp.start({ DEMO_ACCOUNTS: 'no' });
    try {
      const person = await closed.people.add({ demo: true });
      expect((await closed.stranger().call(signIn, { body: credentials(person) })).status).toBe(401);
    } finally {
      await closed.stop();
    }
  });
});

function credentials({ email, password }: { email: string; password: string }) {
  return { email, password };
}

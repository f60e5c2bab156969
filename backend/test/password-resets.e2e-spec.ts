import { contract } from '@bellgap/common/api';
import { RESET_LETTERS_AN_HOUR } from '../src/auth/password-resets.service';
import { THROTTLE } from '../src/auth/throttle.service';
import { MailServer, until } from './support/mail-server';
import { TestApp } from './support/test-app';

const { acceptPasswordReset, requestPasswordReset, sessions, signIn } = contract;
const NEW_PASSWORD = 'a lantern in the fen';

describe('a forgotten password', () => {
  let mail: MailServer;
  let test: TestApp;
  beforeAll(async () => {
    mail = await MailServer.start();
    test = await TestApp.start({ ROLE: 'both', SMTP_URL: mail.url, TRUST_PROXY: 'loopback' });
  });
  afterAll(async () => {
    await test.stop();
    await mail.stop();
  });

  let addresses = 0;
  const request = (email: string, address = `192.0.2.${(addresses += 1)}`) =>
    test.stranger().call(requestPasswordReset, { body: { email }, headers: { 'X-Forwarded-For': address } });
  const accept = (token: string, password = NEW_PASSWORD) =>
    test.stranger().call(acceptPasswordReset, { body: { token, password } });
  const tokensTo = async (email: string, atLeast = 1) =>
    (await mail.to(email, atLeast)).map(({ text }) => /\/reset#([\w-]{43})\n/.exec(text ?? '')![1]!);
  const queueIsEmpty = () =>
    until(async () => (await test.database.owner('graphile_worker.jobs').pluck('id')).length === 0);
  const trailOf = (id: string) =>
    test.database.owner('audit_events').where({ entity_id: id }).orderBy('id').pluck('action');

  it('is replaced by a mailed link, once; every session ends', async () => {
    const { client, person } = await test.signedIn({});
    expect((await request(person.email.toUpperCase())).status).toBe(204);
    const [token] = await tokensTo(person.email);
    expect((await client.call(sessions)).status).toBe(200);

    expect((await accept(token!)).status).toBe(204);
    expect((await client.call(sessions)).status).toBe(401);
    const { email } = person;
    expect((await test.stranger().call(signIn, { body: { email, password: person.password } })).status).toBe(401);
    await test.signIn({ email, password: NEW_PASSWORD });

    const again = await accept(token!, 'another lantern');
    expect(again.status).toBe(422);
    expect(again.problem.errors[0]!.path).toBe('token');
    expect(await trailOf(person.id)).toEqual(['user.password-reset-mailed', 'user.password-changed']);
  });

  it('keeps its link where the new one is refused, for an hour', async () => {
    const { email } = await test.people.add({ name: 'Ottoline Grebe' });
    await request(email);
    const [token] = await tokensTo(email);
    const refused = await accept(token!, 'ottoline 44');
    expect(refused.status).toBe(422);
    expect(refused.problem.errors[0]!.path).toBe('password');
    test.clock.advance({ minutes: 61 });
    expect((await accept(token!)).status).toBe(422);
    expect((await accept('no such token')).status).toBe(422);
  });

  it('takes no invitation for a reset, and the other way round', async () => {
    const { client } = await test.signedIn({ roles: ['administrator'] });
    const body = { email: 'new@company.example', name: 'Ottoline Grebe' };
    const { answer } = await client.call(contract.createUser, { body });
    expect((await accept(answer.link.split('#')[1]!)).status).toBe(422);
    await request(body.email);
    const token = (await mail.to(body.email, 2)).flatMap(
      ({ text }) => /\/reset#([\w-]{43})/.exec(text ?? '')?.[1] ?? [],
    );
    const password = NEW_PASSWORD;
    const asInvitation = await test
      .stranger()
      .call(contract.acceptInvitation, { body: { token: token[0]!, password } });
    expect(asInvitation.status).toBe(422);
    expect((await accept(token[0]!)).status).toBe(204);
    const invitation = { token: answer.link.split('#')[1]!, password };
    expect((await test.stranger().call(contract.acceptInvitation, { body: invitation })).status).toBe(422);
  });

  it('is answered the same for accounts that do not exist or are closed, and nothing is mailed', async () => {
    const closed = await test.people.add({ active: false });
    for (const email of ['nobody@company.example', closed.email]) {
      const { status, response } = await request(email);
      expect([status, response.text]).toEqual([204, '']);
    }
    await queueIsEmpty();
    for (const email of ['nobody@company.example', closed.email]) {
      expect(mail.letters.some(({ to }) => JSON.stringify(to).includes(email))).toBe(false);
    }
    expect((await request('no address')).status).toBe(422);
  });

  it('is asked for a few times from one address, and fills no letter box from many', async () => {
    const { email } = await test.people.add();
    for (let i = 0; i < THROTTLE.perAccountAndAddress; i += 1)
      expect((await request(email, '198.51.100.7')).status).toBe(204);
    const refused = await request(email, '198.51.100.7');
    expect(refused.status).toBe(429);
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    expect((await request(email, '198.51.100.8')).status).toBe(204);
    await queueIsEmpty();
    expect(await tokensTo(email)).toHaveLength(RESET_LETTERS_AN_HOUR);
  });

  it('uses up no tries at signing in', async () => {
    const person = await test.people.add();
    const address = '198.51.100.20';
    for (let i = 0; i < THROTTLE.perAccountAndAddress; i += 1) await request(person.email, address);
    const { email, password } = person;
    const signedIn = await test
      .stranger()
      .call(signIn, { body: { email, password }, headers: { 'X-Forwarded-For': address } });
    expect(signedIn.status).toBe(201);
  });

  it('makes the links of other letters void once it is replaced', async () => {
    const { email } = await test.people.add();
    await request(email);
    await request(email);
    const [first, second] = await tokensTo(email, 2);
    expect((await accept(second!)).status).toBe(204);
    expect((await accept(first!)).status).toBe(422);
  });
});

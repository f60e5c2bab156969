import { contract } from '@bellgap/common/api';
import { THROTTLE } from '../src/auth/throttle.service';
import { TestApp } from './support/test-app';

const { signIn } = contract;

describe('slowing down guesses', () => {
  let test: TestApp;
  beforeEach(async () => {
    test = await TestApp.start({ TRUST_PROXY: 'loopback' });
  });
  afterEach(() => test.stop());

  const attempt = (email: string, password: string, address = '192.0.2.10') =>
    test.stranger().call(signIn, { body: { email, password }, headers: { 'X-Forwarded-For': address } });

  it('refuses an account from one address after ten failures, also with the right password', async () => {
    const person = await test.people.add();
    for (let i = 0; i < THROTTLE.perAccountAndAddress; i += 1) {
      expect((await attempt(person.email, 'wrong guess')).status).toBe(401);
    }
    const refused = await attempt(person.email, person.password);
    expect(refused.status).toBe(429);
    const retryAfterS = Number(refused.headers['retry-after']);
    expect(retryAfterS).toBeGreaterThan(THROTTLE.windowS - 60);
    expect(retryAfterS).toBeLessThanOrEqual(THROTTLE.windowS);

    expect((await attempt(person.email, person.password, '192.0.2.99')).status).toBe(201);
    test.clock.advance({ seconds: retryAfterS + 1 });
    expect((await attempt(person.email, person.password)).status).toBe(201);
  });

  it('does not prolong the wait by tries that it refuses', async () => {
    const person = await test.people.add();
    for (let i = 0; i < THROTTLE.perAccountAndAddress; i += 1) await attempt(person.email, 'wrong guess');
    test.clock.advance({ minutes: 10 });
    expect((await attempt(person.email, 'wrong guess')).status).toBe(429);
    test.clock.advance({ minutes: 5, seconds: 5 });
    expect((await attempt(person.email, person.password)).status).toBe(201);
  });

  it('forgets the failures of an account once its password was right', async () => {
    const person = await test.people.add();
    for (let round = 0; round < 3; round += 1) {
      for (let i = 0; i < THROTTLE.perAccountAndAddress - 1; i += 1) {
        expect((await attempt(person.email, 'wrong guess')).status).toBe(401);
      }
      expect((await attempt(person.email, person.password)).status).toBe(201);
    }
  });

  it('counts tries that come at the same moment', async () => {
    const person = await test.people.add();
    const answers = await Promise.all(Array.from({ length: 25 }, () => attempt(person.email, 'wrong guess')));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(THROTTLE.perAccountAndAddress);
    expect(statuses.filter((status) => status === 429)).toHaveLength(25 - THROTTLE.perAccountAndAddress);
  });

  it('refuses an address after fifty failures over many accounts, and no other address', async () => {
    const person = await test.people.add();
    for (let i = 0; i < THROTTLE.perAddress; i += 1) {
      expect((await attempt(`guess${i}@company.example`, 'wrong guess')).status).toBe(401);
    }
    expect((await attempt(person.email, person.password)).status).toBe(429);
    expect((await attempt(person.email, person.password, '192.0.2.11')).status).toBe(201);
  });

  it('counts the addresses of one IPv6 customer together', async () => {
    const person = await test.people.add();
    for (let i = 0; i < THROTTLE.perAccountAndAddress; i += 1) {
      expect((await attempt(person.email, 'wrong guess', `2001:db8:1:2::${i + 1}`)).status).toBe(401);
    }
    expect((await attempt(person.email, person.password, '2001:db8:1:2:ffff::1')).status).toBe(429);
    expect((await attempt(person.email, person.password, '2001:db8:1:3::1')).status).toBe(201);
  });
});

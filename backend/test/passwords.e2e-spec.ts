import { contract } from '@bellgap/common/api';
import { UsersService } from '../src/users/users.service';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { acceptInvitation, changePassword, createUser, inviteUser, sessions, signIn } = contract;
const NEW_PASSWORD = 'nine grey egrets';

describe('passwords', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  describe('changing the own one', () => {
    it('holds at once and ends the other sessions', async () => {
      const person = await test.people.add();
      const here = await test.signIn(person);
      const there = await test.signIn(person);
      const body = { currentPassword: person.password, newPassword: NEW_PASSWORD };
      expect((await here.call(changePassword, { body })).status).toBe(204);
      expect((await here.call(sessions)).status).toBe(200);
      expect((await there.call(sessions)).status).toBe(401);
      const old = await test.stranger().call(signIn, { body: { email: person.email, password: person.password } });
      expect(old.status).toBe(401);
      await test.signIn({ email: person.email, password: NEW_PASSWORD });
    });

    it('needs the current one', async () => {
      const { client } = await test.signedIn({});
      const { status, problem } = await client.call(changePassword, {
        body: { currentPassword: 'something else', newPassword: NEW_PASSWORD },
      });
      expect(status).toBe(422);
      expect(problem.errors).toEqual([{ path: 'currentPassword', message: 'Current password: is not right' }]);
    });

    it.each([
      ['short', 'seven77'],
      ['common', 'password123'],
      ['long', 'x'.repeat(129)],
      ['the name of the product', 'my BellGap key'],
      ['the name of the person', 'Holvenstein 1987'],
      ['the address of the person', 'its person77 again'],
    ])('refuses one that is or holds: %s', async (_, newPassword) => {
      const person = await test.people.add({ name: 'Amara Holvenstein' });
      await test.database
        .owner('users')
        .where({ id: person.id })
        .update({ email: `person77.${person.id}@company.example` });
      const client = await test.signIn({ ...person, email: `person77.${person.id}@company.example` });
      const { status, problem } = await client.call(changePassword, {
        body: { currentPassword: person.password, newPassword },
      });
      expect(status).toBe(422);
      expect(problem.errors).toHaveLength(1);
      expect(problem.errors[0]!.path).toBe('newPassword');
    });

    it('lets every character of a long one count', async () => {
      const person = await test.people.add();
      const client = await test.signIn(person);
      const long = `${'grey heron '.repeat(10)}a`;
      await client.call(changePassword, { body: { currentPassword: person.password, newPassword: long } });
      const almost = `${long.slice(0, -1)}b`;
      const body = { email: person.email, password: almost };
      expect((await test.stranger().call(signIn, { body })).status).toBe(401);
      await test.signIn({ email: person.email, password: long });
    });
  });

  describe('an invitation', () => {
    let administrator: TestClient;
    beforeAll(async () => {
      ({ client: administrator } = await test.signedIn({ roles: ['administrator'] }));
    });
    const tokenOf = (link: string) => link.split('#')[1]!;
    const invite = async (email: string) =>
      (await administrator.call(createUser, { body: { email, name: 'Ottoline Grebe' } })).answer;
    const accept = (token: string, password = NEW_PASSWORD) =>
      test.stranger().call(acceptInvitation, { body: { token, password } });

    it('lets a person choose a password once', async () => {
      const { link, user } = await invite('o.grebe@company.example');
      expect(link).toMatch(/^http:\/\/127\.0\.0\.1:3000\/invitation#[\w-]{43}$/);
      expect(user.hasPassword).toBe(false);
      expect((await accept(tokenOf(link))).status).toBe(204);
      await test.signIn({ email: user.email, password: NEW_PASSWORD });
      const again = await accept(tokenOf(link));
      expect(again.status).toBe(422);
      expect(again.problem.errors[0]!.path).toBe('token');
    });

    it('is not used up by a password that is refused', async () => {
      const { link } = await invite('second@company.example');
      const refused = await accept(tokenOf(link), 'ottoline 44');
      expect(refused.status).toBe(422);
      expect(refused.problem.errors[0]!.path).toBe('password');
      expect((await accept(tokenOf(link))).status).toBe(204);
    });

    it('holds for seven days, and only the newest one', async () => {
      const first = await invite('third@company.example');
      const second = await administrator.call(inviteUser, { params: { id: first.user.id } });
      expect((await accept(tokenOf(first.link))).status).toBe(422);
      test.clock.advance({ days: 7, seconds: 1 });
      expect((await accept(tokenOf(second.answer.link))).status).toBe(422);
      expect((await accept('no such token at all')).status).toBe(422);
    });

    it('makes the first administrator of an installation, and a new link for one who lost his password', async () => {
      const given = { email: 'first@company.example', name: 'Wen Tollarsson' };
      const first = await test.app.get(UsersService).inviteAdministrator(given);
      expect(first.user.grants).toMatchObject([{ role: 'administrator', projectCode: null, grantedBy: null }]);
      const second = await test.app.get(UsersService).inviteAdministrator(given);
      expect(second.user).toEqual(first.user);
      expect((await accept(tokenOf(first.link))).status).toBe(422);
      expect((await accept(tokenOf(second.link))).status).toBe(204);
      const client = await test.signIn({ email: given.email, password: NEW_PASSWORD });
      expect((await client.call(contract.users)).status).toBe(200);
    });

    it('is stored as a hash only', async () => {
      ({ client: administrator } = await test.signedIn({ roles: ['administrator'] }));
      const { link } = await invite('fourth@company.example');
      const rows = await test.database.owner('account_tokens').select();
      expect(JSON.stringify(rows)).not.toContain(tokenOf(link));
    });
  });
});

import { getRounds } from 'bcryptjs';
import { loadConfig } from '../platform/config';
import { Passwords, hashOfNobody } from './passwords';

const config = loadConfig({ NODE_ENV: 'test', PASSWORD_COST: '4', DATABASE_URL: 'postgres://u:p@127.0.0.1/d' });

describe(Passwords.name, () => {
  const passwords = new Passwords(config);

  it('knows a password again, beyond 72 bytes and behind a zero byte', async () => {
    for (const password of ['short one', 'x'.repeat(200), 'before\u0000after', 'ñandú 日本']) {
      const hash = await passwords.hash(password);
      expect(hash).toMatch(/^\$2b\$04\$/);
      expect(await passwords.matches(password, hash)).toBe(true);
      expect(await passwords.matches(`${password}.`, hash)).toBe(false);
    }
  });

  it('compares with a whole hash of the same cost where there is no account, and never agrees', async () => {
    expect(getRounds(hashOfNobody(11))).toBe(11);
    expect(hashOfNobody(4)).toMatch(/^\$2b\$04\$[./A-Za-z0-9]{53}$/);
    expect(await passwords.matches('', null)).toBe(false);
  });
});

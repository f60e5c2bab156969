import { loadConfig } from './config';
import { ConfigError } from './config-values';

const DATABASE_URL = 'postgres://bellgap_app:x@127.0.0.1:5432/bellgap';
const SESSION_SECRET = 'a secret of more than thirty-two characters';
const PRODUCTION = {
  NODE_ENV: 'production',
  DATABASE_URL,
  SESSION_SECRET,
  PUBLIC_URL: 'https://bellgap.company.example',
  SMTP_URL: 'smtps://mail.company.example',
};

function faultsOf(env: NodeJS.ProcessEnv): readonly string[] {
  try {
    loadConfig(env);
    return [];
  } catch (error) {
    if (error instanceof ConfigError) return error.faults;
    throw error;
  }
}

describe(loadConfig.name, () => {
  it('needs nothing but a database on loopback', () => {
    expect(loadConfig({ DATABASE_URL })).toMatchObject({
      production: false,
      host: '127.0.0.1',
      port: 3000,
      secureCookie: false,
      demoAccounts: true,
      passwordCost: 11,
      role: 'both',
      smtpUrl: null,
      mailFrom: { name: 'Bellgap', address: 'bellgap@localhost' },
    });
  });

  it('takes a complete production, without the accounts of the demonstration', () => {
    expect(loadConfig(PRODUCTION)).toMatchObject({ production: true, secureCookie: true, demoAccounts: false });
  });

  it.each([
    ['no secret', { SESSION_SECRET: '' }, /^SESSION_SECRET/],
    ['a short secret', { SESSION_SECRET: 'short' }, /^SESSION_SECRET/],
    ['no public address', { PUBLIC_URL: '' }, /^PUBLIC_URL/],
    ['plain http', { PUBLIC_URL: 'http://bellgap.company.example' }, /^PUBLIC_URL/],
    ['plain http on an open port', { PUBLIC_URL: 'http://127.0.0.1:3000', HOST: '0.0.0.0' }, /^PUBLIC_URL/],
    ['accounts of the demonstration', { DEMO_ACCOUNTS: 'yes' }, /^DEMO_ACCOUNTS/],
    ['no database', { DATABASE_URL: '' }, /^DATABASE_URL/],
    ['no mail server', { SMTP_URL: '' }, /^SMTP_URL/],
    ['a mail server of another kind', { SMTP_URL: 'https://mail.company.example' }, /^SMTP_URL/],
    ['a sender without an address', { MAIL_FROM: 'Bellgap' }, /^MAIL_FROM/],
    ['a role that no process has', { ROLE: 'clerk' }, /^ROLE/],
    ['passwords that are cheap to guess', { PASSWORD_COST: '4' }, /^PASSWORD_COST/],
  ])('refuses production with %s', (_, change, fault) => {
    expect(faultsOf({ ...PRODUCTION, ...change })).toEqual([expect.stringMatching(fault)]);
  });

  it('asks processes that only serve pages for no mail server', () => {
    expect(faultsOf({ ...PRODUCTION, SMTP_URL: '', ROLE: 'web' })).toEqual([]);
    expect(faultsOf({ ...PRODUCTION, SMTP_URL: '', ROLE: 'worker' })).toEqual([expect.stringMatching(/^SMTP_URL/)]);
  });

  it.each([
    [undefined, 'Bellgap', 'bellgap@bellgap.company.example'],
    ['sheets@company.example', 'Bellgap', 'sheets@company.example'],
    ['Line sheets <sheets@company.example>', 'Line sheets', 'sheets@company.example'],
    ['"Sheets, lines" <sheets@company.example>', 'Sheets, lines', 'sheets@company.example'],
  ])('reads the sender %s', (given, name, address) => {
    expect(loadConfig({ ...PRODUCTION, MAIL_FROM: given }).mailFrom).toEqual({ name, address });
  });

  it('takes plain http in production on loopback', () => {
    expect(faultsOf({ ...PRODUCTION, PUBLIC_URL: 'http://127.0.0.1:3000' })).toEqual([]);
  });

  it('closes the accounts of the demonstration where others can reach the product', () => {
    expect(loadConfig({ DATABASE_URL, HOST: '0.0.0.0', SESSION_SECRET }).demoAccounts).toBe(false);
    expect(faultsOf({ DATABASE_URL, HOST: '0.0.0.0' })).toEqual([expect.stringMatching(/^SESSION_SECRET/)]);
  });

  it('names every fault at once and no password', () => {
    const faults = faultsOf({
      NODE_ENV: 'live',
      PORT: '99999',
      DATABASE_URL: 'mysql://u:hidden@h/d',
      REQUEST_LOG: 'maybe',
    });
    expect(faults.map((fault) => fault.split(':')[0])).toEqual(['NODE_ENV', 'PORT', 'DATABASE_URL', 'REQUEST_LOG']);
    expect(faults.join()).not.toContain('hidden');
  });
});

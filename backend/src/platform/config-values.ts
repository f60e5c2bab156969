import { isIP } from 'node:net';

export class ConfigError extends Error {
  constructor(readonly faults: readonly string[]) {
    super(`The settings in the environment are not usable:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
    this.name = 'ConfigError';
  }
}

export function isLoopback(host: string): boolean {
  const name = host.replace(/^\[|\]$/g, '').toLowerCase();
  return name === 'localhost' || name === '::1' || (isIP(name) === 4 && name.startsWith('127.'));
}

export function readChoice<const T extends string>(
  env: NodeJS.ProcessEnv,
  name: string,
  choices: readonly T[],
  fallback: T,
  faults: string[],
): T {
  const given = env[name];
  if (!given) return fallback;
  const found = choices.find((choice) => choice === given);
  if (!found) faults.push(`${name}: one of ${choices.join(', ')}, not "${given}"`);
  return found ?? fallback;
}

export function readNumber(
  env: NodeJS.ProcessEnv,
  name: string,
  { fallback, atLeast, atMost }: { fallback: number; atLeast: number; atMost: number },
  faults: string[],
): number {
  const given = env[name];
  if (!given) return fallback;
  const value = /^\d+$/.test(given) ? Number(given) : NaN;
  if (!(value >= atLeast && value <= atMost)) {
    faults.push(`${name}: a whole number from ${atLeast} to ${atMost}, not "${given}"`);
    return fallback;
  }
  return value;
}

export function readBoolean(env: NodeJS.ProcessEnv, name: string, fallback: boolean, faults: string[]): boolean {
  const given = env[name]?.toLowerCase();
  if (!given) return fallback;
  if (['1', 'true', 'yes', 'on'].includes(given)) return true;
  if (['0', 'false', 'no', 'off'].includes(given)) return false;
  faults.push(`${name}: yes or no, not "${env[name]}"`);
  return fallback;
}

export function readUrl(
  env: NodeJS.ProcessEnv,
  name: string,
  protocols: readonly string[],
  faults: string[],
): URL | null {
  const given = env[name];
  if (!given) return null;
  const url = URL.canParse(given) ? new URL(given) : null;
  if (url && protocols.includes(url.protocol)) return url;
  // The value itself may hold a password and is not repeated.
  faults.push(`${name}: an address that begins with ${protocols.map((protocol) => `${protocol}//`).join(' or ')}`);
  return null;
}

export interface Mailbox {
  name: string;
  address: string;
}

/** "name@company.example", or a name with the address behind it in angle brackets. */
export function readMailbox(env: NodeJS.ProcessEnv, name: string, fallback: Mailbox, faults: string[]): Mailbox {
  const given = env[name]?.trim();
  if (!given) return fallback;
  const [, words, bracketed, bare] = /^(?:"?([^"<>\r\n]*?)"?\s*<([^<>\s]+)>|([^<>\s]+))$/.exec(given) ?? [];
  const address = bracketed ?? bare ?? '';
  if (/^[^@\s]+@[^@\s]+$/.test(address)) return { name: words || fallback.name, address };
  faults.push(`${name}: an address such as Bellgap <bellgap@company.example>, not "${given}"`);
  return fallback;
}

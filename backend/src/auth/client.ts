import { isIPv4, isIPv6 } from 'node:net';

/** The address that failures are counted by: an IPv4 address, or the /64 that one IPv6 customer usually has. */
export function networkOf(address: string): string {
  const plain = address.replace(/^::ffff:/i, '');
  if (isIPv4(plain) || !isIPv6(plain)) return plain.slice(0, 60);
  const [head = '', tail] = plain.split('%')[0]!.split('::');
  const left = head ? head.split(':') : [];
  const right = tail ? tail.split(':') : [];
  const gap = tail === undefined ? 0 : 8 - left.length - right.length;
  const groups = [...left, ...Array<string>(Math.max(0, gap)).fill('0'), ...right];
  return `${groups
    .slice(0, 4)
    .map((group) => group.toLowerCase().replace(/^0+(?=.)/, ''))
    .join(':')}::/64`;
}

const BROWSERS: [name: string, mark: RegExp][] = [
  ['Edge', /\bEdg(e|A|iOS)?\//],
  ['Opera', /\bOPR\//],
  ['Firefox', /\b(Firefox|FxiOS)\//],
  ['Chrome', /\b(Headless)?(Chrome|CriOS)\//],
  ['Safari', /\bSafari\//],
];
const SYSTEMS: [name: string, mark: RegExp][] = [
  ['Android', /Android/],
  ['iOS', /iPhone|iPad/],
  ['Windows', /Windows/],
  ['macOS', /Mac OS X/],
  ['Linux', /Linux/],
];

/** Browser and system as a person would name them, or the program's own word for itself. */
export function browserOf(userAgent: string | null): string | null {
  if (!userAgent) return null;
  const nameOf = (list: [string, RegExp][]) => list.find(([, mark]) => mark.test(userAgent))?.[0];
  const browser = nameOf(BROWSERS);
  const system = nameOf(SYSTEMS);
  if (!browser) return userAgent.split(/[\s/]/)[0]!.slice(0, 40) || null;
  return system ? `${browser} on ${system}` : browser;
}

import { createHash } from 'node:crypto';

/** The same key for the same name in every database, so that a seed that runs again finds its own rows. */
export function demoId(kind: string, name: string): string {
  const digits = createHash('sha256').update(`bellgap demo ${kind} ${name}`).digest('hex');
  const variant = ((parseInt(digits.slice(16, 18), 16) & 0x3f) | 0x80).toString(16);
  return [
    digits.slice(0, 8),
    digits.slice(8, 12),
    `4${digits.slice(13, 16)}`,
    `${variant}${digits.slice(18, 20)}`,
    digits.slice(20, 32),
  ].join('-');
}

import { randomInt } from 'node:crypto';
import { VERIFICATION_ALPHABET, VERIFICATION_LENGTH, inFours } from '@bellgap/common/api';

/** A code that nobody can guess from others. */
export function newVerificationCode(): string {
  return Array.from(
    { length: VERIFICATION_LENGTH },
    () => VERIFICATION_ALPHABET[randomInt(VERIFICATION_ALPHABET.length)],
  ).join('');
}

/** Where whoever holds a print looks it up. */
export function verificationUrl(publicUrl: URL, code: string): string {
  return new URL(`/verify/${inFours(code)}`, publicUrl).href;
}

import { VERIFICATION_ALPHABET, VERIFICATION_LENGTH, inFours } from '@bellgap/common/api';

const signsOf = (typed: string) => [...typed.toUpperCase().replace(/[\s-]/g, '')];

/** What is typed, in capitals and fours, as it stands on the print. */
export function typedInFours(typed: string): string {
  return inFours(signsOf(typed).slice(0, VERIFICATION_LENGTH).join(''));
}

/** Why what was typed can be no code; null where it can. */
export function codeFault(typed: string): string | null {
  const signs = signsOf(typed);
  if (signs.length === 0) return 'Type the code that stands on the print';
  const foreign = [...new Set(signs.filter((sign) => !VERIFICATION_ALPHABET.includes(sign)))];
  if (foreign.length > 0) {
    const stand = foreign.length === 1 ? 'stands' : 'stand';
    return `${foreign.join(', ')} ${stand} in no code, to avoid look-alikes: read the print again`;
  }
  if (signs.length === VERIFICATION_LENGTH) return null;
  return `A code has ${VERIFICATION_LENGTH} signs; these are ${signs.length}`;
}

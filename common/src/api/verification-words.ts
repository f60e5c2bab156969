import { NAMED_AT_MOST, type TrailVerification } from './trail-answers';

type Findings = TrailVerification['broken'];

/** What a verification of the trail found, in sentences; the first says whether all is well. */
export function verificationWords(verification: TrailVerification): string[] {
  const { sound, checkedCount, lastSeal, broken, missing, unsealed, knownSeal } = verification;
  const words = [
    sound
      ? `The trail is sound: ${countOf(checkedCount, 'sealed row')} checked, each as it was sealed.`
      : `The trail is not sound: ${countOf(checkedCount, 'sealed row')} checked.`,
  ];
  if (broken.count > 0) words.push(`Changed since sealed: ${named(broken)}.`);
  if (missing.count > 0) words.push(`Gone: ${named(missing)}.`);
  if (unsealed.count > 0) words.push(`Not sealed, though older than a minute: ${named(unsealed)}.`);
  if (knownSeal === 'agrees') words.push('The seal that was given stands in the chain.');
  if (knownSeal === 'differs')
    words.push('The seal that was given differs from the chain: rows before it were changed.');
  if (knownSeal === 'gone') words.push('The seal that was given is not in the chain: its end was cut off.');
  words.push(
    lastSeal ? `Last seal: number ${lastSeal.number}, ${lastSeal.hash}, of ${lastSeal.at}.` : 'There is no seal yet.',
  );
  return words;
}

function named({ count, named: rows }: Findings): string {
  const places = rows.map(({ number, eventId }) => {
    if (eventId === null) return `seal ${number}`;
    return number === null ? `row ${eventId}` : `row ${eventId} (seal ${number})`;
  });
  const rest = count - rows.length;
  return `${places.join(', ')}${rest > 0 ? ` and ${rest} more than the ${NAMED_AT_MOST} named` : ''}`;
}

const countOf = (count: number, what: string): string => `${count} ${what}${count === 1 ? '' : 's'}`;

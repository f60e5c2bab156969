import * as fc from 'fast-check';
import { REVISION_STATES } from './states';
import {
  inFours,
  nextLetter,
  nextNumber,
  readVerificationCode,
  transitionsFrom,
  VERIFICATION_ALPHABET,
} from './workflow';

describe('labels of a specification', () => {
  it.each([
    [[], 'A'],
    [['A'], 'B'],
    [['A', 'B', '0'], 'C'],
    [['Y', 'Z'], 'AA'],
    [['Z', 'AZ'], 'BA'],
    [['ZZ'], null],
  ])('after %j comes the letter %s', (given, next) => expect(nextLetter(given)).toBe(next));

  it.each([
    [['A', 'B'], '0'],
    [['A', 'B', '0', 'C'], '1'],
    [['9', '10'], '11'],
    [['999'], null],
  ])('after %j comes the number %s', (given, next) => expect(nextNumber(given)).toBe(next));

  it('never gives a letter twice', () => {
    const given: string[] = [];
    for (let label = nextLetter(given); label !== null; label = nextLetter(given)) given.push(label);
    expect(given).toHaveLength(26 + 26 * 26);
    expect(new Set(given).size).toBe(given.length);
    expect(given.every((label) => /^[A-Z]{1,2}$/.test(label))).toBe(true);
  });
});

describe('moves of a revision', () => {
  it('start where the table says', () => {
    expect(Object.fromEntries(REVISION_STATES.map((state) => [state, transitionsFrom(state)]))).toEqual({
      draft: ['submit'],
      in_check: ['recall', 'pass', 'return'],
      checked: ['refuse', 'issue'],
      issued: ['supersede', 'withdraw'],
      superseded: [],
      withdrawn: [],
    });
  });
});

describe('verification codes', () => {
  it('are read in the shape in which they are printed, and in small letters', () => {
    const code = fc.array(fc.constantFrom(...VERIFICATION_ALPHABET), { minLength: 16, maxLength: 16 });
    fc.assert(
      fc.property(code, (signs) => {
        const whole = signs.join('');
        expect(readVerificationCode(inFours(whole))).toBe(whole);
        expect(readVerificationCode(` ${whole.toLowerCase()} `)).toBe(whole);
      }),
    );
  });

  it.each(['', 'ABCD', '0000-0000-0000-0000', 'ABCD-EFGH-JKLM-NPQR-S'])('are not: %s', (typed) =>
    expect(readVerificationCode(typed)).toBeNull(),
  );
});

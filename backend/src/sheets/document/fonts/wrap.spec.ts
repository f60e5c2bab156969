import { MissingGlyphError, runsOf, widthOf } from './faces';
import { unpackWoff } from './woff';
import { wrap } from './wrap';

describe('words in the faces of the sheet', () => {
  it('takes Greek letters from Plex Sans where Plex Mono has none', () => {
    expect(runsOf('1 − 1.3·σ ≤ √3', 'mono').map(({ face, text }) => [face, text])).toEqual([
      ['mono', '1 − 1.3·'],
      ['sans', 'σ'],
      ['mono', ' ≤ √3'],
    ]);
  });

  it('gives every figure of Plex Mono the same width', () => {
    expect(widthOf('0123456789', 'mono')).toBeCloseTo(10 * widthOf('1', 'mono'), 9);
  });

  it('refuses signs that it cannot draw, control characters among them', () => {
    expect(() => runsOf('a\u0007b', 'sans')).toThrow(MissingGlyphError);
    expect(() => runsOf('⌈', 'mono')).toThrow('U+2308');
  });

  it('breaks between words, and within a word that is longer than a line', () => {
    expect(wrap('one two three', 'mono', 10, 48)).toEqual(['one two', 'three']);
    expect(wrap('abcdefghij', 'mono', 10, 30)).toEqual(['abcde', 'fghij']);
    expect(wrap('one\ntwo', 'mono', 10, 300)).toEqual(['one', 'two']);
  });

  it('shortens with an ellipsis when only so many lines may stand', () => {
    const [first, second, ...more] = wrap('one two three four five', 'mono', 10, 48, 2);
    expect(first).toBe('one two');
    expect(second).toMatch(/…$/);
    expect(more).toEqual([]);
  });

  it('refuses a file that is no font', () => {
    expect(() => unpackWoff(Buffer.from('not a font'))).toThrow('Not a WOFF 1 font');
  });
});

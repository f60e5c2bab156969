import { canonicalJson, sha256Of } from './canonical-json';
import { contentCodeOf } from './content-code';

describe('content code', () => {
  it('does not depend on the order of keys', () => {
    expect(canonicalJson({ b: [{ d: 1, c: null }], a: 'x', u: undefined })).toBe('{"a":"x","b":[{"c":null,"d":1}]}');
    const context = { x: 1, y: 2 };
    const one = contentCodeOf({ input: { a: 1, b: 2 }, context, evaluation: {}, methodEdition: '1' });
    const other = contentCodeOf({ methodEdition: '1', evaluation: {}, context, input: { b: 2, a: 1 } });
    expect(one).toBe(other);
    expect(one).toMatch(/^[0-9a-f]{12}$/);
  });

  // FIPS 180-4, example "abc"
  it('hashes with SHA-256', () => {
    expect(sha256Of('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
  });
});

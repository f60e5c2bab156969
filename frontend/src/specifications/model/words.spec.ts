import { compositeUnit, discUnit, lineInput, postUnit } from '@bellgap/common/drawing/fixtures';
import { stringWords, unitWords } from './words';

describe('the words of a string', () => {
  it('name its arrangement, failing load and coupling', () => {
    expect(stringWords(lineInput({ parallelStrings: 2 }), discUnit())).toBe(
      'double suspension string, 160 kN, coupling 20',
    );
    expect(stringWords(lineInput(), compositeUnit())).toBe('single suspension string, 120 kN, coupling 16');
  });

  it('of a post name its angle and its strength in bending', () => {
    expect(stringWords(lineInput({ postAngleDeg: 15 }), postUnit())).toBe(
      'line post, 15° above the horizontal, 10 kN in bending, clamp',
    );
    expect(stringWords(lineInput({ parallelStrings: 2 }), postUnit({ cantileverStrengthKn: null }))).toBe(
      '2 line posts in parallel, bending strength not known, clamp',
    );
    expect(unitWords(postUnit())).toContain('10 kN in bending');
  });
});

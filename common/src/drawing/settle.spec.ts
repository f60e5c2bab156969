import { answer, discUnit, drawingCases, lineInput, wordsInTheWay } from './fixtures';
import { drawString, type Drawing } from './index';

/** Height of text on paper and the scales of sheets, one to so many. */
const TEXT_ON_PAPER_MM = 2.4;
const SCALES = [10, 15, 20, 25, 30, 40, 50, 60, 75, 100, 125, 150, 200, 500];

const drawn = (drawing: Drawing | null): Drawing => {
  if (!drawing) throw new Error('nothing was drawn');
  return drawing;
};

describe('the words of a drawing', () => {
  it.each(drawingCases)('stand on nothing at any scale of a sheet: $name', ({ input, context, evaluation }) => {
    const plain = drawn(drawString(input, context, evaluation));
    expect(wordsInTheWay(plain)).toEqual([]);
    for (const scale of SCALES) {
      const textScale = (TEXT_ON_PAPER_MM * scale) / plain.textHeightMm;
      // Where words are this high, a sheet has no room for the drawing, or takes it at a larger scale.
      if (textScale > 4 || textScale < 0.3) continue;
      const drawing = drawn(drawString(input, context, evaluation, { textScale }));
      expect({ scale, found: wordsInTheWay(drawing) }).toEqual({ scale, found: [] });
    }
  });

  it('stay where they usually stand when nothing is in the way', () => {
    const { input, context, evaluation } = drawingCases[0]!;
    const section = drawn(drawString(input, context, evaluation)).primitives.find(
      (p) => p.about === 'string.sectionLengthMm',
    );
    expect(section).toMatchObject({ kind: 'dimension' });
    expect(section).not.toHaveProperty('wordsAt');
  });

  it('move off a line that is too short for them', () => {
    const unit = discUnit();
    const input = lineInput({ arrangement: 'tension' });
    const drawing = drawn(drawString(input, { insulator: unit }, answer(unit, 2), { textScale: 4 }));
    expect(drawing.primitives.some((p) => p.kind === 'dimension' && p.wordsAt !== undefined)).toBe(true);
    expect(wordsInTheWay(drawing)).toEqual([]);
  });

  it('are the same each time', () => {
    for (const { input, context, evaluation } of drawingCases) {
      const once = drawString(input, context, evaluation, { textScale: 2.2 });
      expect(drawString({ ...input }, context, evaluation, { textScale: 2.2 })).toEqual(once);
    }
  });
});

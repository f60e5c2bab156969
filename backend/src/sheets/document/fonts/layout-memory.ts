import type { Font, GlyphPosition, GlyphRun } from 'fontkit';

/** Words of all sheets together; beyond that the memory begins anew. */
const WORDS_AT_MOST = 20_000;

interface KnownWord {
  glyphs: GlyphRun['glyphs'];
  positions: GlyphPosition[];
  advanceWidth: number;
}

/**
 * The same font, remembering how it set a word: sheets share most of their words, and shaping them is most of the work
 * of drawing one. Every caller gets positions of its own, because PDFKit scales them in place.
 */
export function withLayoutMemory(font: Font): Font {
  const known = new Map<string, KnownWord>();
  const layout: Font['layout'] = (text, features, ...rest) => {
    if (features || rest.length > 0) return font.layout(text, features, ...rest);
    let word = known.get(text);
    if (!word) {
      const { glyphs, positions, advanceWidth } = font.layout(text);
      word = { glyphs, positions: positions.map(copyOf), advanceWidth };
      if (known.size >= WORDS_AT_MOST) known.clear();
      known.set(text, word);
    }
    return { ...word, positions: word.positions.map(copyOf) } as GlyphRun;
  };
  return Object.create(font, { layout: { value: layout } }) as Font;
}

const copyOf = ({ xAdvance, yAdvance, xOffset, yOffset }: GlyphPosition): GlyphPosition => ({
  xAdvance,
  yAdvance,
  xOffset,
  yOffset,
});

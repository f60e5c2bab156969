import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { create, type Font } from 'fontkit';
import { withLayoutMemory } from './layout-memory';
import { unpackWoff } from './woff';

export const FACES = ['sans', 'semibold', 'mono'] as const;
export type Face = (typeof FACES)[number];

const FILES: Record<Face, string> = {
  sans: 'IBMPlexSans-Regular.woff',
  semibold: 'IBMPlexSans-SemiBold.woff',
  mono: 'IBMPlexMono-Regular.woff',
};
const FOLDER = join(__dirname, '..', '..', '..', '..', 'assets', 'fonts');

/** A sign that no face of the sheet can draw: a visible error, so that nothing is printed with a gap in it. */
export class MissingGlyphError extends Error {
  constructor(
    readonly character: string,
    readonly text: string,
  ) {
    const code = (character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');
    super(`The sheet's fonts have no sign for "${character}" (U+${code}) in "${text}"`);
    this.name = 'MissingGlyphError';
  }
}

interface LoadedFace {
  font: Font;
  /** Advance as a share of the size, or null where the face lacks the sign. */
  advanceOf: (codePoint: number) => number | null;
}

const loaded = new Map<Face, LoadedFace>();

export const openFont = (face: Face): Font => create(unpackWoff(readFileSync(join(FOLDER, FILES[face])))) as Font;

/** Each face is read and unpacked once in a process. */
function load(face: Face): LoadedFace {
  const known = loaded.get(face);
  if (known) return known;
  const font = withLayoutMemory(openFont(face));
  const advances = new Map<number, number | null>();
  const advanceOf = (codePoint: number): number | null => {
    const seen = advances.get(codePoint);
    if (seen !== undefined) return seen;
    const advance =
      codePoint >= 0x20 && font.hasGlyphForCodePoint(codePoint)
        ? font.glyphForCodePoint(codePoint).advanceWidth / font.unitsPerEm
        : null;
    advances.set(codePoint, advance);
    return advance;
  };
  const entry = { font, advanceOf };
  loaded.set(face, entry);
  return entry;
}

export const fontOf = (face: Face): Font => load(face).font;

/** A stretch of text in one face; `width` is a share of the size. */
export interface Run {
  face: Face;
  text: string;
  width: number;
}

/** Cuts a text into stretches that one face can draw: Greek letters in Plex Mono's place come from Plex Sans. */
export function runsOf(text: string, face: Face): Run[] {
  const own = load(face);
  const runs: Run[] = [];
  let last: Run | undefined;
  for (const character of text) {
    const codePoint = character.codePointAt(0) ?? 0;
    let advance = own.advanceOf(codePoint);
    let used = face;
    if (advance === null && face === 'mono') {
      advance = load('sans').advanceOf(codePoint);
      used = 'sans';
    }
    if (advance === null) throw new MissingGlyphError(character, text);
    if (last && last.face === used) {
      last.text += character;
      last.width += advance;
    } else {
      last = { face: used, text: character, width: advance };
      runs.push(last);
    }
  }
  return runs;
}

export function widthOf(text: string, face: Face): number {
  let width = 0;
  for (const run of runsOf(text, face)) width += run.width;
  return width;
}

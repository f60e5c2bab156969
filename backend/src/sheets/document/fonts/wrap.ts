import { widthOf, type Face } from './faces';

const ROUNDING = 1e-6;

/** Breaks a text into lines of at most `width` points; a word that is longer than a line is cut. */
export function wrap(text: string, face: Face, size: number, width: number, mostLines = Infinity): string[] {
  const lines: string[] = [];
  for (const paragraph of text.replace(/\r\n?/g, '\n').replace(/\t/g, ' ').split('\n')) {
    lines.push(...wrapParagraph(paragraph, face, width / size));
  }
  if (lines.length <= mostLines) return lines;
  const kept = lines.slice(0, mostLines);
  let last = kept[mostLines - 1] ?? '';
  while (last.length > 0 && widthOf(`${last}…`, face) > width / size) last = last.slice(0, -1).trimEnd();
  kept[mostLines - 1] = `${last}…`;
  return kept;
}

function wrapParagraph(text: string, face: Face, width: number): string[] {
  const whole = widthOf(text, face);
  if (whole <= width + ROUNDING) return [text];
  const space = widthOf(' ', face);
  const lines: string[] = [];
  let line = '';
  let used = 0;
  const put = (word: string, wide: number): void => {
    if (line === '') {
      line = word;
      used = wide;
    } else if (used + space + wide <= width + ROUNDING) {
      line += ` ${word}`;
      used += space + wide;
    } else {
      lines.push(line);
      line = word;
      used = wide;
    }
  };
  for (const word of text.split(' ')) {
    const wide = widthOf(word, face);
    if (wide <= width + ROUNDING) {
      put(word, wide);
      continue;
    }
    let piece = '';
    let pieceWidth = 0;
    for (const character of word) {
      const advance = widthOf(character, face);
      if (piece !== '' && pieceWidth + advance > width) {
        put(piece, pieceWidth);
        piece = '';
        pieceWidth = 0;
      }
      piece += character;
      pieceWidth += advance;
    }
    put(piece, pieceWidth);
  }
  lines.push(line);
  return lines;
}

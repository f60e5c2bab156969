import type { Tone } from '../blocks';
import { runsOf, type Face } from '../fonts/faces';
import { COLOURS, type Mark } from './marks';

export const LEADING = 1.32;
const ASCENT = 1.0;

export interface LineStyle {
  face: Face;
  size: number;
  tone?: Tone;
  align?: 'left' | 'right';
}

/** Marks of one line of text whose box begins at `top`; with `right`, it ends there. */
export function textMarks(text: string, x: number, top: number, width: number, style: LineStyle): Mark[] {
  const runs = runsOf(text, style.face);
  const total = runs.reduce((sum, run) => sum + run.width, 0) * style.size;
  let at = style.align === 'right' ? x + width - total : x;
  const baseline = top + ASCENT * style.size;
  return runs.map((run, i) => {
    const mark: Mark = {
      kind: 'text',
      x: at,
      baseline,
      size: style.size,
      face: run.face,
      text: run.text,
      width: run.width * style.size,
      colour: COLOURS[style.tone ?? 'ink'],
      endsLine: i === runs.length - 1,
    };
    at += run.width * style.size;
    return mark;
  });
}

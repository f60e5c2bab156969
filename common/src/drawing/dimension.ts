import { at, degrees } from './geometry';
import type { DimensionPrimitive, Point, TextPrimitive } from './primitives';

/** Height of figures and capitals, and depth below the baseline, as shares of the height of text. */
export const CAP_SHARE = 0.7;
export const DESCENT_SHARE = 0.22;

export interface LaidOutDimension {
  lines: [Point, Point][];
  words: TextPrimitive;
}

/** Turns a dimension into lines (extension lines, dimension line, oblique end strokes) and its words. */
export function layOutDimension(dimension: DimensionPrimitive, textHeightMm: number): LaidOutDimension {
  const { from, to, offsetMm } = dimension;
  const dx = to.xMm - from.xMm;
  const dy = to.yMm - from.yMm;
  const length = Math.hypot(dx, dy) || 1;
  const along = at(dx / length, dy / length);
  const left = at(along.yMm, -along.xMm);
  const side = offsetMm < 0 ? -1 : 1;
  const go = (p: Point, v: Point, distance: number): Point => at(p.xMm + v.xMm * distance, p.yMm + v.yMm * distance);
  const start = go(from, left, offsetMm);
  const end = go(to, left, offsetMm);
  const lines: [Point, Point][] = [[start, end]];
  const gap = 0.35 * textHeightMm;
  if (Math.abs(offsetMm) > 2 * gap) {
    for (const [foot, head] of [
      [from, start],
      [to, end],
    ] as const)
      lines.push([go(foot, left, side * gap), go(head, left, side * gap)]);
  }
  const stroke = 0.32 * textHeightMm;
  for (const head of [start, end]) {
    const lean = at(along.xMm + left.xMm, along.yMm + left.yMm);
    lines.push([go(head, lean, -stroke), go(head, lean, stroke)]);
  }
  const words = wordsOf(dimension, start, end, along, at(left.xMm * side, left.yMm * side), textHeightMm);
  return { lines, words: dimension.wordsAt ? { ...words, at: dimension.wordsAt } : words };
}

function wordsOf(
  dimension: DimensionPrimitive,
  start: Point,
  end: Point,
  along: Point,
  outward: Point,
  textHeightMm: number,
): TextPrimitive {
  const { layer, about, text } = dimension;
  const middle = at((start.xMm + end.xMm) / 2, (start.yMm + end.yMm) / 2);
  const common = { kind: 'text', layer, text, ...(about === undefined ? {} : { about }) } as const;
  const gap = 0.4 * textHeightMm;
  const cap = CAP_SHARE * textHeightMm;
  if (dimension.beside) {
    const level = Math.abs(outward.xMm) > 0.5;
    return {
      ...common,
      at: level
        ? at(middle.xMm + outward.xMm * gap * 1.4, middle.yMm + cap / 2)
        : at(middle.xMm, middle.yMm + (outward.yMm > 0 ? gap + cap : -gap)),
      anchor: level ? (outward.xMm > 0 ? 'start' : 'end') : 'middle',
      angleDeg: 0,
    };
  }
  let angleDeg = degrees(Math.atan2(along.yMm, along.xMm));
  if (angleDeg >= 90 - 1e-6) angleDeg -= 180;
  if (angleDeg < -90 - 1e-6) angleDeg += 180;
  const turn = (angleDeg * Math.PI) / 180;
  const up = at(Math.sin(turn), -Math.cos(turn));
  const above = dimension.offsetMm === 0 || outward.xMm * up.xMm + outward.yMm * up.yMm > 0;
  const rise = above ? gap : -(gap + cap);
  return {
    ...common,
    at: at(middle.xMm + up.xMm * rise, middle.yMm + up.yMm * rise),
    anchor: 'middle',
    angleDeg: angleDeg === 0 ? 0 : angleDeg,
  };
}

import { CAP_SHARE, DESCENT_SHARE } from './dimension';
import { at, radians } from './geometry';
import type { Point, TextPrimitive } from './primitives';

/** Advance of every letter of IBM Plex Mono as a share of its size; the drawings use no other face. */
export const ADVANCE_SHARE = 0.6;

/** The four corners of a line of words, going round. */
export function textBox(words: TextPrimitive, textHeightMm: number): [Point, Point, Point, Point] {
  const width = [...words.text].length * ADVANCE_SHARE * textHeightMm;
  const start = words.anchor === 'start' ? 0 : words.anchor === 'middle' ? -width / 2 : -width;
  const cos = Math.cos(radians(words.angleDeg));
  const sin = Math.sin(radians(words.angleDeg));
  const corner = (x: number, y: number): Point =>
    at(words.at.xMm + x * cos - y * sin, words.at.yMm + x * sin + y * cos);
  const top = -CAP_SHARE * textHeightMm;
  const bottom = DESCENT_SHARE * textHeightMm;
  return [corner(start, top), corner(start + width, top), corner(start + width, bottom), corner(start, bottom)];
}

/** Whether two boxes share any ground, by separating axes. */
export function boxesOverlap(one: Point[], other: Point[]): boolean {
  for (const box of [one, other]) {
    for (let i = 0; i < box.length; i += 1) {
      const p = box[i]!;
      const q = box[(i + 1) % box.length]!;
      const axis = at(q.yMm - p.yMm, p.xMm - q.xMm);
      const span = (points: Point[]): [number, number] => {
        const reach = points.map((r) => r.xMm * axis.xMm + r.yMm * axis.yMm);
        return [Math.min(...reach), Math.max(...reach)];
      };
      const [low, high] = span(one);
      const [otherLow, otherHigh] = span(other);
      if (high <= otherLow + 1e-6 || otherHigh <= low + 1e-6) return false;
    }
  }
  return true;
}

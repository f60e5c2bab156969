import { CAP_SHARE, DESCENT_SHARE } from './dimension';
import { at, radians } from './geometry';
import type { Point, TextPrimitive } from './primitives';

/** Advance of every letter of IBM Plex Mono as a share of its size; the drawings use no other face. */
export const ADVANCE_SHARE = 0.6;

/** The four corners of a line of words, going round, with some room kept on all sides. */
export function textBox(words: TextPrimitive, textHeightMm: number, roomMm = 0): [Point, Point, Point, Point] {
  const width = [...words.text].length * ADVANCE_SHARE * textHeightMm;
  const start = words.anchor === 'start' ? 0 : words.anchor === 'middle' ? -width / 2 : -width;
  const cos = Math.cos(radians(words.angleDeg));
  const sin = Math.sin(radians(words.angleDeg));
  const corner = (x: number, y: number): Point =>
    at(words.at.xMm + x * cos - y * sin, words.at.yMm + x * sin + y * cos);
  const [left, right] = [start - roomMm, start + width + roomMm];
  const top = -CAP_SHARE * textHeightMm - roomMm;
  const bottom = DESCENT_SHARE * textHeightMm + roomMm;
  return [corner(left, top), corner(right, top), corner(right, bottom), corner(left, bottom)];
}

/** Whether two boxes share any ground, by separating axes. */
export function boxesOverlap(one: readonly Point[], other: readonly Point[]): boolean {
  for (const box of [one, other]) {
    for (let i = 0; i < box.length; i += 1) {
      const p = box[i]!;
      const q = box[(i + 1) % box.length]!;
      const [axisX, axisY] = [q.yMm - p.yMm, p.xMm - q.xMm];
      let [low, high, otherLow, otherHigh] = [Infinity, -Infinity, Infinity, -Infinity];
      for (const r of one) {
        const reach = r.xMm * axisX + r.yMm * axisY;
        if (reach < low) low = reach;
        if (reach > high) high = reach;
      }
      for (const r of other) {
        const reach = r.xMm * axisX + r.yMm * axisY;
        if (reach < otherLow) otherLow = reach;
        if (reach > otherHigh) otherHigh = reach;
      }
      if (high <= otherLow + 1e-6 || otherHigh <= low + 1e-6) return false;
    }
  }
  return true;
}

import { layOutDimension } from './dimension';
import { at, millimetres, radians } from './geometry';
import type { Drawing, Point, Primitive, TextPrimitive } from './primitives';

/** What a renderer strokes: SVG path data in millimetres, shared by the screen and the sheet. */
export interface Outline {
  data: string;
  /** The tint is a light shade that carries no meaning of its own. */
  fill: 'none' | 'ground' | 'tint' | 'ink';
  dashed: boolean;
}

const assertNever = (primitive: never): never => {
  throw new Error(`Unknown primitive: ${JSON.stringify(primitive)}`);
};

const pair = (p: Point): string => `${millimetres(p.xMm)} ${millimetres(p.yMm)}`;
const polyline = (points: Point[]): string => points.map((p, i) => `${i === 0 ? 'M' : 'L'}${pair(p)}`).join('');

function arc(centre: Point, radiusMm: number, startDeg: number, endDeg: number): string {
  const on = (angleDeg: number): Point =>
    at(centre.xMm + radiusMm * Math.cos(radians(angleDeg)), centre.yMm + radiusMm * Math.sin(radians(angleDeg)));
  const r = millimetres(radiusMm);
  const large = endDeg - startDeg > 180 ? 1 : 0;
  return `M${pair(on(startDeg))}A${r} ${r} 0 ${large} 1 ${pair(on(endDeg))}`;
}

/** The outline of a primitive; null for words alone. */
export function outlineOf(primitive: Primitive, textHeightMm: number): Outline | null {
  switch (primitive.kind) {
    case 'line':
      return { data: polyline([primitive.from, primitive.to]), fill: 'none', dashed: primitive.dashed ?? false };
    case 'polyline':
      return {
        data: polyline(primitive.points) + (primitive.closed ? 'Z' : ''),
        fill: primitive.filled ? 'ground' : 'none',
        dashed: false,
      };
    case 'path':
      return {
        data: primitive.data,
        fill: primitive.solid ? 'ink' : primitive.filled ? (primitive.layer === 'share' ? 'tint' : 'ground') : 'none',
        dashed: false,
      };
    case 'arc':
      return {
        data: arc(primitive.centre, primitive.radiusMm, primitive.startDeg, primitive.endDeg),
        fill: 'none',
        dashed: primitive.dashed,
      };
    case 'circle': {
      const half = arc(primitive.centre, primitive.radiusMm, 0, 180);
      const r = millimetres(primitive.radiusMm);
      const start = at(primitive.centre.xMm + primitive.radiusMm, primitive.centre.yMm);
      return {
        data: `${half}A${r} ${r} 0 0 1 ${pair(start)}Z`,
        fill: primitive.solid ? 'ink' : primitive.filled ? 'ground' : 'none',
        dashed: primitive.dashed ?? false,
      };
    }
    case 'dimension':
      return {
        data: layOutDimension(primitive, textHeightMm).lines.map(polyline).join(''),
        fill: 'none',
        dashed: false,
      };
    case 'text':
      return null;
    default:
      return assertNever(primitive);
  }
}

/** The words of a primitive; null where it has none. */
export function wordsOf(primitive: Primitive, textHeightMm: number): TextPrimitive | null {
  if (primitive.kind === 'text') return primitive;
  if (primitive.kind === 'dimension') return layOutDimension(primitive, textHeightMm).words;
  return null;
}

export const allWords = (drawing: Drawing): TextPrimitive[] =>
  drawing.primitives.flatMap((p) => wordsOf(p, drawing.textHeightMm) ?? []);

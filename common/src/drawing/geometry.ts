import type { Point } from './primitives';

/** Pieces of an outline; SVG path data is made of them once, at the end. */
export type Segment =
  | { to: 'move'; point: Point }
  | { to: 'line'; point: Point }
  | { to: 'curve'; first: Point; second: Point; point: Point }
  | { to: 'close' };

/** An affine map: x' = a x + c y + e, y' = b x + d y + f. */
export interface Transform {
  a: number;
  b: number;
  c: number;
  d: number;
  e: number;
  f: number;
}

export const at = (xMm: number, yMm: number): Point => ({ xMm, yMm });
export const move = (xMm: number, yMm: number): Segment => ({ to: 'move', point: at(xMm, yMm) });
export const line = (xMm: number, yMm: number): Segment => ({ to: 'line', point: at(xMm, yMm) });
export const curve = (x1: number, y1: number, x2: number, y2: number, x: number, y: number): Segment => ({
  to: 'curve',
  first: at(x1, y1),
  second: at(x2, y2),
  point: at(x, y),
});
export const close: Segment = { to: 'close' };

export const radians = (degrees: number): number => (degrees * Math.PI) / 180;
export const degrees = (angle: number): number => (angle * 180) / Math.PI;

export const shift = (xMm: number, yMm: number): Transform => ({ a: 1, b: 0, c: 0, d: 1, e: xMm, f: yMm });

/** Turned clockwise about the origin, then moved to a point. */
export function turned(angleDeg: number, origin: Point): Transform {
  const cos = Math.cos(radians(angleDeg));
  const sin = Math.sin(radians(angleDeg));
  return { a: cos, b: sin, c: -sin, d: cos, e: origin.xMm, f: origin.yMm };
}

/** Mirrored about the falling diagonal: what hangs downwards then runs to the right, and its left side lies above. */
export const laidFlat: Transform = { a: 0, b: 1, c: 1, d: 0, e: 0, f: 0 };

export const place = (t: Transform, p: Point): Point => ({
  xMm: t.a * p.xMm + t.c * p.yMm + t.e,
  yMm: t.b * p.xMm + t.d * p.yMm + t.f,
});

export function placeSegments(t: Transform, segments: Segment[]): Segment[] {
  return segments.map((s) => {
    if (s.to === 'close') return s;
    if (s.to === 'curve')
      return { to: 'curve', first: place(t, s.first), second: place(t, s.second), point: place(t, s.point) };
    return { to: s.to, point: place(t, s.point) };
  });
}

/** The angles of an arc after a map; a mirroring map turns them round. */
export function placeAngles(t: Transform, startDeg: number, endDeg: number): { startDeg: number; endDeg: number } {
  const turn = degrees(Math.atan2(t.b, t.a));
  return t.a * t.d - t.b * t.c > 0
    ? { startDeg: startDeg + turn, endDeg: endDeg + turn }
    : { startDeg: turn - endDeg, endDeg: turn - startDeg };
}

/** Closes an outline given as its right half, from the axis or beside it at the top to the bottom. */
export function mirrored(half: Segment[]): Segment[] {
  const flip = (p: Point): Point => at(-p.xMm, p.yMm);
  const back: Segment[] = [];
  for (let i = half.length - 1; i > 0; i -= 1) {
    const segment = half[i]!;
    const before = half[i - 1]!;
    if (segment.to === 'close' || before.to === 'close') continue;
    if (i === half.length - 1) back.push({ to: 'line', point: flip(segment.point) });
    back.push(
      segment.to === 'curve'
        ? { to: 'curve', first: flip(segment.second), second: flip(segment.first), point: flip(before.point) }
        : { to: 'line', point: flip(before.point) },
    );
  }
  return [...half, ...back, close];
}

export function rectangle(x: number, y: number, width: number, height: number): Segment[] {
  return [move(x, y), line(x + width, y), line(x + width, y + height), line(x, y + height), close];
}

/** Millimetres with at most two decimals, never in powers of ten and never "-0". */
export function millimetres(value: number): string {
  const rounded = Math.round(value * 100) / 100;
  return String(rounded === 0 ? 0 : rounded);
}

const pair = (p: Point): string => `${millimetres(p.xMm)} ${millimetres(p.yMm)}`;

export function pathData(segments: Segment[]): string {
  return segments
    .map((s) => {
      switch (s.to) {
        case 'move':
          return `M${pair(s.point)}`;
        case 'line':
          return `L${pair(s.point)}`;
        case 'curve':
          return `C${pair(s.first)} ${pair(s.second)} ${pair(s.point)}`;
        case 'close':
          return 'Z';
      }
    })
    .join('');
}

import { layOutDimension } from './dimension';
import type { Draft } from './drafting';
import { at, radians } from './geometry';
import type { Layer, Point, TextPrimitive } from './primitives';
import { boxesOverlap, textBox } from './text-box';

/** Bodies that no words may stand on; lines of the other layers may be crossed where there is no better place. */
const BODIES: ReadonlySet<Layer> = new Set(['structure', 'insulation', 'metal', 'live', 'share']);
/** Steps of moves with the distance to which they are taken, and price of a crossed line, in heights of text. */
const STEPS = [
  { step: 0.25, from: 0, to: 3 },
  { step: 0.5, from: 3, to: 8 },
  { step: 1, from: 8, to: 16 },
] as const;
const CROSSING = 1.6;
/** Moves across the words cost more than moves along them: they keep their level. */
const ACROSS = 1.15;
/** Room that words keep from what they give way to, in heights of text. */
const CLEAR = 0.12;
const ARC_STEPS = 16;

interface Shape {
  points: Point[];
  left: number;
  top: number;
  right: number;
  bottom: number;
}

const shapeOf = (points: Point[]): Shape => ({
  points,
  left: Math.min(...points.map((p) => p.xMm)),
  top: Math.min(...points.map((p) => p.yMm)),
  right: Math.max(...points.map((p) => p.xMm)),
  bottom: Math.max(...points.map((p) => p.yMm)),
});

const touch = (one: Shape, other: Shape): boolean =>
  one.left < other.right &&
  other.left < one.right &&
  one.top < other.bottom &&
  other.top < one.bottom &&
  boxesOverlap(one.points, other.points);

/** The convex outline of some points, going round. */
function hull(points: Point[]): Point[] {
  const sorted = [...points].sort((p, q) => p.xMm - q.xMm || p.yMm - q.yMm);
  const half = (from: Point[]): Point[] => {
    const chain: Point[] = [];
    for (const p of from) {
      while (chain.length > 1) {
        const [o, q] = [chain[chain.length - 2]!, chain[chain.length - 1]!];
        if ((q.xMm - o.xMm) * (p.yMm - o.yMm) - (q.yMm - o.yMm) * (p.xMm - o.xMm) > 0) break;
        chain.pop();
      }
      chain.push(p);
    }
    return chain.slice(0, -1);
  };
  return [...half(sorted), ...half(sorted.reverse())];
}

const chords = (points: Point[]): Shape[] => points.slice(1).map((p, i) => shapeOf([points[i]!, p]));

/** What a primitive covers, as convex pieces; hatching covers nothing beyond the steel it fills. */
export function piecesOf(draft: Draft, textHeightMm: number): Shape[] {
  switch (draft.kind) {
    case 'text':
      return [];
    case 'line':
      return [shapeOf([draft.from, draft.to])];
    case 'dimension':
      return layOutDimension(draft, textHeightMm).lines.map(shapeOf);
    case 'polyline':
      return chords(draft.points);
    case 'circle': {
      const { centre, radiusMm: r } = draft;
      return [
        shapeOf([at(-r, -r), at(r, -r), at(r, r), at(-r, r)].map((p) => at(centre.xMm + p.xMm, centre.yMm + p.yMm))),
      ];
    }
    case 'arc': {
      const { centre, radiusMm, startDeg, endDeg } = draft;
      return chords(
        Array.from({ length: ARC_STEPS + 1 }, (_, i) => {
          const angle = radians(startDeg + ((endDeg - startDeg) * i) / ARC_STEPS);
          return at(centre.xMm + radiusMm * Math.cos(angle), centre.yMm + radiusMm * Math.sin(angle));
        }),
      );
    }
    case 'path': {
      if (draft.layer === 'hatch') return [];
      const parts: Point[][] = [];
      for (const segment of draft.segments) {
        if (segment.to === 'close') continue;
        if (segment.to === 'move') parts.push([]);
        parts.at(-1)?.push(...(segment.to === 'curve' ? [segment.first, segment.second] : []), segment.point);
      }
      return parts.map((points) => shapeOf(points.length > 2 ? hull(points) : points));
    }
  }
}

const wordsIn = (draft: Draft, textHeightMm: number): TextPrimitive | null =>
  draft.kind === 'text' ? draft : draft.kind === 'dimension' ? layOutDimension(draft, textHeightMm).words : null;

interface Move {
  along: number;
  across: number;
  cost: number;
}

const MOVES: readonly Move[] = (() => {
  const moves: Move[] = [];
  for (const { step, from, to } of STEPS) {
    for (let along = -to; along <= to; along += step) {
      for (let across = -to; across <= to; across += step) {
        const cost = Math.hypot(along, ACROSS * across);
        if (cost >= from && cost < to) moves.push({ along, across, cost });
      }
    }
  }
  return moves.sort((p, q) => p.cost - q.cost || p.across - q.across || q.along - p.along);
})();

/**
 * Gives each line of words a place of its own. Words that stand clear stay; the others move as little as is needed to
 * stand on no other words and on no body, and rather farther than across a line.
 */
export function settle(drafts: readonly Draft[], textHeightMm: number): Draft[] {
  const bodies: Shape[] = [];
  const lines: Shape[] = [];
  for (const draft of drafts) (BODIES.has(draft.layer) ? bodies : lines).push(...piecesOf(draft, textHeightMm));
  const taken: Shape[] = [];
  const boxOf = (words: TextPrimitive, to: Point): Shape =>
    shapeOf(textBox({ ...words, at: to }, textHeightMm, CLEAR * textHeightMm));
  const isFree = (box: Shape): boolean =>
    !taken.some((other) => touch(box, other)) && !bodies.some((b) => touch(box, b));
  const crossings = (box: Shape): number => lines.reduce((sum, line) => sum + (touch(box, line) ? 1 : 0), 0);

  const nearestFree = (words: TextPrimitive): { to: Point; box: Shape } | null => {
    const turn = radians(words.angleDeg);
    const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
    let best: { cost: number; to: Point; box: Shape } | null = null;
    for (const { along, across, cost } of MOVES) {
      if (best && cost * textHeightMm >= best.cost) break;
      const [u, v] = [along * textHeightMm, across * textHeightMm];
      const to = at(words.at.xMm + u * cos - v * sin, words.at.yMm + u * sin + v * cos);
      const box = boxOf(words, to);
      if (!isFree(box)) continue;
      const whole = (cost + CROSSING * crossings(box)) * textHeightMm;
      if (!best || whole < best.cost) best = { cost: whole, to, box };
    }
    return best;
  };

  const found = new Map<number, Point>();
  // Lengths first: they belong to their lines, what is written beside a part can stand anywhere near it.
  for (const kind of ['dimension', 'text'] as const) {
    const waiting: { index: number; words: TextPrimitive }[] = [];
    drafts.forEach((draft, index) => {
      const words = draft.kind === kind ? wordsIn(draft, textHeightMm) : null;
      if (!words) return;
      const box = boxOf(words, words.at);
      if (isFree(box) && crossings(box) === 0) taken.push(box);
      else waiting.push({ index, words });
    });
    for (const { index, words } of waiting) {
      const place = nearestFree(words);
      taken.push(place?.box ?? boxOf(words, words.at));
      if (place) found.set(index, place.to);
    }
  }
  return drafts.map((draft, index) => {
    const to = found.get(index);
    if (!to) return draft;
    if (draft.kind === 'text') return { ...draft, at: to };
    return draft.kind === 'dimension' ? { ...draft, wordsAt: to } : draft;
  });
}

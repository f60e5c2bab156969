import { layOutDimension } from './dimension';
import { at, pathData, place, placeAngles, placeSegments, shift, type Segment, type Transform } from './geometry';
import { settle } from './settle';
import { textBox } from './text-box';
import type { Drawing, Layer, PathPrimitive, Point, Primitive, TextPrimitive } from './primitives';

/** A primitive while it is still being placed: paths as pieces, not yet as text. */
export type Draft = Exclude<Primitive, PathPrimitive> | (Omit<PathPrimitive, 'data'> & { segments: Segment[] });

function moved(t: Transform, draft: Draft): Draft {
  switch (draft.kind) {
    case 'line':
      return { ...draft, from: place(t, draft.from), to: place(t, draft.to) };
    case 'dimension': {
      const wordsAt = draft.wordsAt && place(t, draft.wordsAt);
      return { ...draft, from: place(t, draft.from), to: place(t, draft.to), ...(wordsAt ? { wordsAt } : {}) };
    }
    case 'polyline':
      return { ...draft, points: draft.points.map((p) => place(t, p)) };
    case 'path':
      return { ...draft, segments: placeSegments(t, draft.segments) };
    case 'arc':
      return { ...draft, centre: place(t, draft.centre), ...placeAngles(t, draft.startDeg, draft.endDeg) };
    case 'circle':
      return { ...draft, centre: place(t, draft.centre) };
    case 'text':
      return { ...draft, at: place(t, draft.at) };
  }
}

function reach(draft: Draft, textHeightMm: number): Point[] {
  switch (draft.kind) {
    case 'line':
      return [draft.from, draft.to];
    case 'polyline':
      return draft.points;
    case 'path':
      return draft.segments.flatMap((s) =>
        s.to === 'close' ? [] : s.to === 'curve' ? [s.first, s.second, s.point] : [s.point],
      );
    case 'arc': {
      const points: Point[] = [];
      const steps = 24;
      for (let i = 0; i <= steps; i += 1) {
        const angle = ((draft.startDeg + ((draft.endDeg - draft.startDeg) * i) / steps) * Math.PI) / 180;
        points.push(
          at(draft.centre.xMm + draft.radiusMm * Math.cos(angle), draft.centre.yMm + draft.radiusMm * Math.sin(angle)),
        );
      }
      return points;
    }
    case 'circle':
      return [
        at(draft.centre.xMm - draft.radiusMm, draft.centre.yMm - draft.radiusMm),
        at(draft.centre.xMm + draft.radiusMm, draft.centre.yMm + draft.radiusMm),
      ];
    case 'text':
      return textBox(draft, textHeightMm);
    case 'dimension': {
      const { lines, words } = layOutDimension(draft, textHeightMm);
      return [...lines.flat(), ...textBox(words, textHeightMm)];
    }
  }
}

export interface Bounds {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

const nothing = (): Bounds => ({ left: Infinity, top: Infinity, right: -Infinity, bottom: -Infinity });

function widen(box: Bounds, { xMm, yMm }: Point): void {
  if (xMm < box.left) box.left = xMm;
  if (xMm > box.right) box.right = xMm;
  if (yMm < box.top) box.top = yMm;
  if (yMm > box.bottom) box.bottom = yMm;
}

/** Collects primitives in any place, and hands them over moved to the origin with a margin. */
export class DraftingTable {
  private drafts: Draft[] = [];
  private box: Bounds = nothing();

  constructor(readonly textHeightMm: number) {}

  add(draft: Draft, frame?: Transform): void {
    const placed = frame ? moved(frame, draft) : draft;
    this.drafts.push(placed);
    for (const point of reach(placed, this.textHeightMm)) widen(this.box, point);
  }

  path(
    layer: Layer,
    segments: Segment[],
    options: { filled?: boolean; solid?: boolean; about?: string; frame?: Transform } = {},
  ): void {
    const { filled = false, solid = false, about, frame } = options;
    if (segments.length === 0) return;
    const marks = { ...(solid ? { solid } : {}), ...(about ? { about } : {}) };
    this.add({ kind: 'path', layer, segments, filled, ...marks }, frame);
  }

  text(layer: Layer, at: Point, text: string, anchor: TextPrimitive['anchor'] = 'start', about?: string): void {
    this.add({ kind: 'text', layer, at, text, anchor, angleDeg: 0, ...(about ? { about } : {}) });
  }

  /** A dimension whose line is shifted along the frame's own x; the sign keeps its meaning in a mirrored frame. */
  dimension(
    frame: Transform,
    from: Point,
    to: Point,
    shiftXMm: number,
    text: string,
    options: { about: string; layer?: Layer; beside?: boolean },
  ): void {
    const p = place(frame, from);
    const q = place(frame, to);
    const aim = at(frame.a * shiftXMm, frame.b * shiftXMm);
    const leftward = (q.yMm - p.yMm) * aim.xMm - (q.xMm - p.xMm) * aim.yMm;
    const offsetMm = leftward < 0 ? -Math.abs(shiftXMm) : Math.abs(shiftXMm);
    const { about, layer = 'dimension', beside = false } = options;
    this.add({ kind: 'dimension', layer, from: p, to: q, offsetMm, text, about, ...(beside ? { beside } : {}) });
  }

  /** Moves words that stand on each other or on a body; what is drawn after it keeps clear by itself. */
  settleWords(): void {
    this.drafts = settle(this.drafts, this.textHeightMm);
    this.box = nothing();
    for (const draft of this.drafts) for (const point of reach(draft, this.textHeightMm)) widen(this.box, point);
  }

  bounds(): Readonly<Bounds> {
    return this.box;
  }

  finish(title: string, description: string): Drawing {
    const { left, top, right, bottom } = this.bounds();
    const margin = 0.6 * this.textHeightMm;
    const home = shift(margin - left, margin - top);
    const primitives = this.drafts.map((draft): Primitive => {
      const at = moved(home, draft);
      if (at.kind !== 'path') return at;
      const { segments, ...rest } = at;
      return { ...rest, data: pathData(segments) };
    });
    return {
      title,
      description,
      widthMm: right - left + 2 * margin,
      heightMm: bottom - top + 2 * margin,
      textHeightMm: this.textHeightMm,
      primitives,
    };
  }
}

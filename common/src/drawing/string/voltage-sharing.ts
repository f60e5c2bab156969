import type { DraftingTable } from '../drafting';
import { figure } from '../figures';
import { at, place, rectangle, shift, type Segment, type Transform } from '../geometry';
import type { Point } from '../primitives';
import { deviceReach } from './insulators';
import type { StringPlan } from './plan';

/** Length of the longest bar, its distance from what stands beside it, and room for a figure, in heights of text. */
const LONGEST = 7;
const GAP = 0.8;
const FIGURE = 4.2;
/** Thickness of a bar as a share of the spacing. */
const THICKNESS = 0.5;

const about = 'string.voltageSharing';
const CAPTION = 'voltage share';

export const shareWords = (percent: number): string => `${figure(percent, 1)} %`;

/** The shares as they follow from the attachment to the live part; null where they are not known for each unit. */
export function sharesFromAttachment(plan: StringPlan, lineEndFirst: readonly number[]): number[] | null {
  const isWhole = plan.discs && plan.count > 1 && lineEndFirst.length === plan.count;
  if (!isWhole || !lineEndFirst.every((share) => Number.isFinite(share) && share >= 0)) return null;
  return [...lineEndFirst].reverse();
}

interface Bars {
  shares: number[];
  lengthsMm: number[];
  thicknessMm: number;
  /** Middle of each unit along the string. */
  middlesMm: number[];
}

function barsOf(plan: StringPlan, shares: number[], textHeightMm: number): Bars {
  const longest = Math.max(...shares, Number.MIN_VALUE);
  return {
    shares,
    lengthsMm: shares.map((share) => (share / longest) * LONGEST * textHeightMm),
    thicknessMm: THICKNESS * plan.unit.spacingMm,
    middlesMm: shares.map((_, i) => plan.topMm + (i + 0.5) * plan.unit.spacingMm),
  };
}

/** All bars but the one at the line end are one primitive; that one is solid, so that it stands out in one ink too. */
function addBars(table: DraftingTable, outlines: Segment[][], frame: Transform): void {
  table.path('share', outlines.slice(0, -1).flat(), { filled: true, frame, about });
  table.path('share', outlines.at(-1) ?? [], { solid: true, frame, about });
}

/** How far bars and their figures reach from the axis, where they stand beyond `fromMm`. */
export const sharingReachMm = (fromMm: number, textHeightMm: number): number =>
  fromMm + (GAP + LONGEST + FIGURE) * textHeightMm;

/** Bars at right angles to the string, each beside its unit, growing away from it. */
export function drawSharingBeside(
  table: DraftingTable,
  plan: StringPlan,
  frame: Transform,
  shares: number[],
  fromMm: number,
): void {
  const t = table.textHeightMm;
  const bars = barsOf(plan, shares, t);
  const { lengthsMm, middlesMm, thicknessMm } = bars;
  const startMm = fromMm + GAP * t;
  addBars(
    table,
    lengthsMm.map((length, i) => rectangle(startMm, middlesMm[i]! - thicknessMm / 2, length, thicknessMm)),
    frame,
  );
  const ends = [0, shares.length - 1].map((i) => place(frame, at(startMm + lengthsMm[i]!, middlesMm[i]!)));
  const [first, last] = ends as [Point, Point];
  const words = [shareWords(shares[0]!), shareWords(shares.at(-1)!)] as const;
  const isUpright = Math.abs(frame.a) > 0.5;
  if (isUpright) {
    const beside = (p: Point): Point => at(p.xMm + 0.5 * t, p.yMm + 0.35 * t);
    table.text('share', beside(first), `${words[0]} ${CAPTION}`, 'start', about);
    table.text('share', beside(last), words[1], 'start', about);
    return;
  }
  // Laid flat, the figures stand below the bars and run towards the attachment, where nothing else is written.
  const lowestMm = place(frame, at(startMm + LONGEST * t, 0)).yMm + 1.1 * t;
  const firstMm = first.yMm + 1.1 * t;
  const half = thicknessMm / 2;
  table.text('share', at(last.xMm + half, lowestMm), `${CAPTION} ${words[1]}`, 'end', about);
  const isClear = lowestMm - firstMm > 1.2 * t;
  table.text('share', at(first.xMm + half, isClear ? firstMm : lowestMm + 1.3 * t), words[0], 'end', about);
}

/**
 * Level bars at the height of each unit of a leaning leg. They grow towards the leg from an upright line that stands
 * clear of it, so that the longest of them use the room below the leg.
 */
export function drawSharingOfLeg(table: DraftingTable, plan: StringPlan, leg: Transform, shares: number[]): void {
  const t = table.textHeightMm;
  const { lengthsMm, middlesMm, thicknessMm } = barsOf(plan, shares, t);
  const out = deviceReach(plan).outMm;
  const heights = middlesMm.map((middle) => place(leg, at(0, middle)).yMm);
  const edges = middlesMm.map((middle) => place(leg, at(out, middle)).xMm);
  const baseMm = Math.max(...lengthsMm.map((length, i) => edges[i]! + length)) + GAP * t;
  const pitch = Math.abs(heights[1]! - heights[0]!);
  const thick = Math.min(thicknessMm, 0.6 * pitch);
  addBars(
    table,
    lengthsMm.map((length, i) => rectangle(baseMm - length, heights[i]! - thick / 2, length, thick)),
    shift(0, 0),
  );
  const [top, bottom] = [heights[0]!, heights.at(-1)!];
  table.add({ kind: 'line', layer: 'share', about, from: at(baseMm, top - thick), to: at(baseMm, bottom + thick) });
  const beside = (heightMm: number): Point => at(baseMm + 0.5 * t, heightMm + 0.35 * t);
  const isRoomy = bottom - top > 1.3 * t;
  table.text('share', beside(isRoomy ? top : bottom - 1.3 * t), shareWords(shares[0]!), 'start', about);
  table.text('share', beside(bottom), shareWords(shares.at(-1)!), 'start', about);
  table.text('share', at(baseMm + 0.5 * t, bottom + 1.65 * t), CAPTION, 'start', about);
}

import type { DraftingTable } from '../drafting';
import { figure } from '../figures';
import { at, degrees, line, move, close, place, radians, rectangle, type Segment, type Transform } from '../geometry';
import { drawSteel } from '../silhouettes/structure';
import { dimensionReach, dimensionString } from './dimensions';
import { drawDevices, drawInsulators, drawLivePart } from './insulators';
import type { Layout } from './layouts';
import type { StringPlan } from './plan';

/** Above this a post is drawn on a level beam, below it on an upright pole, degrees above the horizontal. */
const STANDS_FROM_DEG = 45;

const STRUCTURE_WORDS = {
  'cross-arm': 'structure',
  window: 'structure, window not drawn',
  'lower-structure': 'structure, the one below not drawn',
  open: 'structure, surroundings not known',
} as const satisfies Record<StringPlan['surroundings'], string>;

/**
 * Along the post the frame runs from the structure to the tip; its left side, where lengths are dimensioned, lies above
 * the post, so that the angle has the room below.
 */
function postFrame(postDeg: number): Transform {
  const cos = Math.cos(radians(postDeg));
  const sin = Math.sin(radians(postDeg));
  return { a: sin, b: cos, c: cos, d: -sin, e: 0, f: 0 };
}

/** A line post fixed at the structure and leaning out of it, the conductor in a clamp at its tip. */
export const layOutPost: Layout = (table, plan, evaluation) => {
  const t = table.textHeightMm;
  const postDeg = plan.postDeg ?? 0;
  const frame = postFrame(postDeg);
  const stands = postDeg > STANDS_FROM_DEG;
  const live = place(frame, at(0, plan.liveMm));
  const reach = dimensionReach(plan, t);
  const steel = 1.7 * t;

  drawMount(table, plan, frame, stands);
  drawInsulators(table, plan, frame);
  drawDevices(table, plan, frame);
  drawLivePart(table, plan, frame);
  dimensionString(table, plan, frame, evaluation);
  table.text('live', at(live.xMm + plan.liveRadiusMm + 0.6 * t, live.yMm + 1.6 * t), 'live part');
  drawPostClearance(table, plan, postDeg, reach.leftMm);

  const { left, right, bottom } = { ...table.bounds() };
  const words = STRUCTURE_WORDS[plan.surroundings];
  if (stands) {
    const from = Math.min(left, -2 * plan.halfWidthMm);
    const under = Math.max(bottom, steel);
    drawSteel(table, from, 0, Math.max(right, 2 * plan.halfWidthMm) - from, steel);
    table.text('note', at(from, under + 1.3 * t), words);
    drawAngle(table, plan, postDeg, under + 3 * t, from);
    return;
  }
  // No higher than its foot: the lengths along a leaning post have their lines above it.
  const head = -1.2 * mountHalfMm(plan) - t;
  const foot = Math.max(bottom, reach.rightMm) + 2 * t;
  drawSteel(table, -steel, head, steel, foot - head);
  table.text('note', at(-steel, foot + 1.3 * t), words);
  drawAngle(table, plan, postDeg, reach.rightMm + 2 * t, 0.8 * t);
};

/** Half the width of the foot where it meets the posts. */
const mountHalfMm = ({ acrossMm, diameterMm }: StringPlan): number => Math.abs(acrossMm[0] ?? 0) + 0.34 * diameterMm;

/** The foot of the post on the face of the structure, and the clamp at its tip. */
function drawMount(table: DraftingTable, plan: StringPlan, frame: Transform, stands: boolean): void {
  const { topMm, bottomMm, liveMm, liveRadiusMm, acrossMm, diameterMm } = plan;
  const half = mountHalfMm(plan);
  const face = stands
    ? ([at(-1.2 * half, 0), at(1.2 * half, 0)] as const)
    : ([at(0, -1.2 * half), at(0, 1.2 * half)] as const);
  const near = place(frame, at(-half, topMm));
  const far = place(frame, at(half, topMm));
  const foot: Segment[] = [
    move(face[0].xMm, face[0].yMm),
    line(near.xMm, near.yMm),
    line(far.xMm, far.yMm),
    line(face[1].xMm, face[1].yMm),
    close,
  ];
  table.path('metal', foot, { filled: true });
  const clampMm = liveMm - 0.5 * liveRadiusMm - bottomMm;
  const clampHalf = acrossMm.length > 1 ? half : Math.min(26, 0.12 * diameterMm);
  if (clampMm > 1) {
    table.path('metal', rectangle(-clampHalf, bottomMm, 2 * clampHalf, clampMm), { filled: true, frame });
  }
}

/**
 * The distance to earth as an arc round the conductor, from the side of the structure over the post outwards, with its
 * length across. It starts clear of the dimensions along the post and does not pass the face of a pole.
 */
function drawPostClearance(table: DraftingTable, plan: StringPlan, postDeg: number, besideMm: number): void {
  if (plan.clearanceMm === null) return;
  const live = place(postFrame(postDeg), at(0, plan.liveMm));
  const radiusMm = plan.liveRadiusMm + plan.clearanceMm;
  const toFace = degrees(Math.asin(Math.min(1, live.xMm / radiusMm)));
  const toDimensions = postDeg + degrees(Math.acos(Math.min(1, besideMm / radiusMm)));
  const backDeg = Math.max(0, Math.min(toFace, toDimensions, 80));
  const about = 'clearances.phaseToEarthMm';
  table.add({
    kind: 'arc',
    layer: 'clearance',
    about,
    centre: live,
    radiusMm,
    startDeg: -90 - backDeg,
    endDeg: -20,
    dashed: true,
  });
  // Half way between level and the axis' own normal, where no length of the post is written.
  const rayDeg = -(postDeg + 90) / 2;
  const on = (reachMm: number) =>
    at(live.xMm + reachMm * Math.cos(radians(rayDeg)), live.yMm + reachMm * Math.sin(radians(rayDeg)));
  table.add({
    kind: 'dimension',
    layer: 'clearance',
    about,
    from: on(plan.liveRadiusMm),
    to: on(radiusMm),
    offsetMm: 0,
    text: `to earth ${figure(plan.clearanceMm)}`,
  });
}

/** The angle of the axis above the horizontal, in words below the post. */
function drawAngle(table: DraftingTable, plan: StringPlan, postDeg: number, levelMm: number, fromMm: number): void {
  const about = 'string.postAngleDeg';
  const words = `${figure(postDeg, Number.isInteger(postDeg) ? 0 : 1)}° above the horizontal`;
  table.text('dimension', at(fromMm, levelMm), words, 'start', about);
  if (postDeg === 0) return;
  const radiusMm = 0.55 * plan.liveMm;
  table.add({ kind: 'line', layer: 'dimension', about, from: at(0, 0), to: at(1.1 * radiusMm, 0), dashed: true });
  table.add({
    kind: 'arc',
    layer: 'dimension',
    about,
    centre: at(0, 0),
    radiusMm,
    startDeg: -postDeg,
    endDeg: 0,
    dashed: false,
  });
}

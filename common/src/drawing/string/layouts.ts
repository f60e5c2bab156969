import type { Evaluation } from '../../engine/model';
import type { DraftingTable } from '../drafting';
import { figure } from '../figures';
import { at, degrees, laidFlat, radians, shift, turned, type Transform } from '../geometry';
import { drawSteel } from '../silhouettes/structure';
import { dimensionReach, dimensionString, drawClearance, drawClearanceLength } from './dimensions';
import { deviceReach, drawFittings, drawInsulators, drawLivePart } from './insulators';
import type { StringPlan } from './plan';
import { drawSharingBeside, drawSharingOfLeg, sharesFromAttachment, sharingReachMm } from './voltage-sharing';

const SUPPORT_WORDS = {
  'cross-arm': 'cross-arm',
  window: 'tower window',
  'lower-structure': 'cross-arm',
  open: 'support, surroundings not known',
} as const;

export type Layout = (table: DraftingTable, plan: StringPlan, evaluation: Evaluation) => void;

/** The largest measure of the layout without its words: it sets the height of text. */
export function contentSizeMm(plan: StringPlan): number {
  const clearance = (plan.clearanceMm ?? 0) + plan.liveRadiusMm;
  const across = 2 * plan.halfWidthMm + clearance;
  if (plan.postDeg !== null) {
    const reachMm = plan.liveMm * Math.cos(radians(plan.postDeg));
    return Math.max(reachMm + 0.9 * clearance, plan.liveMm * Math.sin(radians(plan.postDeg)) + clearance);
  }
  switch (plan.arrangement) {
    case 'tension':
      return Math.max(1.2 * plan.liveMm, across);
    case 'v-suspension': {
      const wide = Math.sin(radians(plan.windwardDeg)) + Math.sin(radians(plan.leewardDeg));
      const tall = Math.max(Math.cos(radians(plan.windwardDeg)), Math.cos(radians(plan.leewardDeg)));
      return Math.max(1.1 * plan.liveMm * wide, plan.liveMm * tall + 0.5 * clearance);
    }
    case 'suspension':
      return Math.max(plan.liveMm + (plan.surroundings === 'lower-structure' ? clearance : 0), across);
  }
}

function drawWholeString(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  drawFittings(table, plan, frame);
  drawInsulators(table, plan, frame);
}

export const layOutSuspension: Layout = (table, plan, evaluation) => {
  const t = table.textHeightMm;
  const frame = shift(0, 0);
  const reach = dimensionReach(plan, t);
  const outer = plan.clearanceMm === null ? 0 : plan.clearanceMm + plan.liveRadiusMm;
  const shares = sharesFromAttachment(plan, evaluation.string?.voltageSharing ?? []);
  const besideMm = shares ? sharingReachMm(reach.rightMm, t) : reach.rightMm;
  const right = Math.max(outer, besideMm + 2 * t);
  const steel = 1.7 * t;
  const hasWindow = plan.surroundings === 'window' && outer > besideMm;
  drawSteel(table, -reach.leftMm, -steel, reach.leftMm + right + (hasWindow ? steel : 0), steel);
  table.text('note', at(-reach.leftMm, -steel - 0.6 * t), SUPPORT_WORDS[plan.surroundings]);
  drawWholeString(table, plan, frame);
  drawLivePart(table, plan, frame);
  dimensionString(table, plan, frame, evaluation);
  if (shares) drawSharingBeside(table, plan, frame, shares, reach.rightMm);

  const labelMm = plan.liveMm + Math.max(1.6 * t, 0.5 * plan.liveRadiusMm);
  table.text('live', at(plan.liveRadiusMm + 0.5 * t, labelMm), 'live part');
  const below = plan.surroundings === 'lower-structure' && plan.clearanceMm !== null;
  drawClearance(table, plan, frame, below ? 100 : 8, besideMm);
  if (hasWindow) drawSteel(table, outer, 0, steel, plan.liveMm + 3 * t);
  if (below) {
    const ground = plan.liveMm + outer;
    drawSteel(table, -reach.leftMm, ground, reach.leftMm + right, steel);
    table.text('note', at(right, ground - 0.6 * t), 'structure below', 'end');
  }
};

export const layOutTension: Layout = (table, plan, evaluation) => {
  const t = table.textHeightMm;
  const frame = laidFlat;
  const reach = dimensionReach(plan, t);
  const outer = plan.clearanceMm === null ? 0 : plan.clearanceMm + plan.liveRadiusMm;
  const steel = 1.7 * t;
  const shares = sharesFromAttachment(plan, evaluation.string?.voltageSharing ?? []);
  const besideMm = shares ? sharingReachMm(reach.rightMm, t) : reach.rightMm;
  const below = Math.max(reach.rightMm + 2 * t, 0.6 * outer);
  drawSteel(table, -steel, -reach.leftMm, steel, reach.leftMm + below);
  table.text('note', at(-steel, -reach.leftMm - 0.6 * t), SUPPORT_WORDS[plan.surroundings]);
  const end = plan.liveMm + plan.liveRadiusMm + 8 * t;
  table.add({ kind: 'line', layer: 'live', from: at(plan.liveMm, 0), to: at(end, 0) });
  drawWholeString(table, plan, frame);
  drawLivePart(table, plan, frame);
  table.text('live', at(plan.liveMm + 1.2 * t, plan.liveRadiusMm + 1.3 * t), 'live part');
  dimensionString(table, plan, frame, evaluation);
  if (shares) drawSharingBeside(table, plan, frame, shares, reach.rightMm);
  drawClearance(table, plan, frame, 8, besideMm);
};

export const layOutV: Layout = (table, plan, evaluation) => {
  const t = table.textHeightMm;
  const legs = [
    { side: -1, angleDeg: plan.windwardDeg },
    { side: 1, angleDeg: plan.leewardDeg },
  ] as const;
  const steel = 1.7 * t;
  const frames = legs.map(({ side, angleDeg }) => {
    const head = at(side * plan.liveMm * Math.sin(radians(angleDeg)), -plan.liveMm * Math.cos(radians(angleDeg)));
    return { head, frame: turned(side * angleDeg, head) };
  });
  const reach = dimensionReach(plan, t);
  const apart = Math.abs(frames[0]!.head.yMm - frames[1]!.head.yMm) > 0.5 * t;
  const wide = deviceReach(plan).outMm + 2 * t;
  const leftEnd = frames[0]!.head.xMm - wide;
  const rightEnd = frames[1]!.head.xMm + wide;
  const level = Math.min(frames[0]!.head.yMm, frames[1]!.head.yMm);
  if (apart) {
    drawSteel(table, leftEnd, frames[0]!.head.yMm - steel, -leftEnd - 0.5 * t, steel);
    drawSteel(table, 0.5 * t, frames[1]!.head.yMm - steel, rightEnd - 0.5 * t, steel);
  } else drawSteel(table, leftEnd, level - steel, rightEnd - leftEnd, steel);
  table.text('note', at(leftEnd, frames[0]!.head.yMm - steel - 0.6 * t), SUPPORT_WORDS[plan.surroundings]);

  for (const { frame } of frames) drawWholeString(table, plan, frame);
  const home = shift(0, -plan.liveMm);
  drawLivePart(table, plan, home);
  dimensionString(table, plan, frames[0]!.frame, evaluation);
  drawLegAngles(table, plan);
  const shares = sharesFromAttachment(plan, evaluation.string?.voltageSharing ?? []);
  if (shares) drawSharingOfLeg(table, plan, frames[1]!.frame, shares);

  table.text('live', at(plan.liveRadiusMm + 0.5 * t, Math.max(1.6 * t, plan.liveRadiusMm + t)), 'live part');
  if (plan.clearanceMm === null) return;
  const radiusMm = plan.clearanceMm + plan.liveRadiusMm;
  const beside = degrees(Math.asin(Math.min(1, reach.rightMm / radiusMm)));
  const common = { kind: 'arc', layer: 'clearance', about: 'clearances.phaseToEarthMm', dashed: true } as const;
  const startDeg = Math.min(plan.leewardDeg - 90 + beside, 20);
  table.add({ ...common, centre: at(0, 0), radiusMm, startDeg, endDeg: 30 });
  drawClearanceLength(table, plan, home);
};

function drawLegAngles(table: DraftingTable, plan: StringPlan): void {
  const t = table.textHeightMm;
  const radiusMm = Math.min(0.34 * plan.liveMm, 0.6 * (plan.clearanceMm ?? Infinity));
  const top = -radiusMm - 2.6 * t;
  table.add({ kind: 'line', layer: 'dimension', from: at(0, -plan.liveRadiusMm), to: at(0, top), dashed: true });
  for (const { side, angleDeg, about } of [
    { side: -1, angleDeg: plan.windwardDeg, about: 'string.vAngleWindwardDeg' },
    { side: 1, angleDeg: plan.leewardDeg, about: 'string.vAngleLeewardDeg' },
  ] as const) {
    const [startDeg, endDeg] = side < 0 ? [-90 - angleDeg, -90] : [-90, -90 + angleDeg];
    table.add({
      kind: 'arc',
      layer: 'dimension',
      about,
      centre: at(0, 0),
      radiusMm,
      startDeg,
      endDeg,
      dashed: false,
    });
    const words = `${figure(angleDeg, Number.isInteger(angleDeg) ? 0 : 1)}°`;
    table.text('dimension', at(side * 0.4 * t, -radiusMm - 0.6 * t), words, side < 0 ? 'end' : 'start', about);
  }
}

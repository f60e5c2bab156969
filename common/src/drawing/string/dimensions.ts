import type { CriterionResult, Evaluation } from '../../engine/model';
import { CAP_SHARE } from '../dimension';
import type { DraftingTable } from '../drafting';
import { figure } from '../figures';
import { at, degrees, place, type Transform } from '../geometry';
import { ADVANCE_SHARE } from '../text-box';
import { deviceReach } from './insulators';
import type { StringPlan } from './plan';

/** Distances of the dimension lines from the row of insulators, in heights of text. */
const LINES = { spacing: 1.4, section: 5.2, fittings: 7.4, bracket: 1.3, nextBracket: 3.4 } as const;

const DISTANCE_CRITERIA: CriterionResult['criterion'][] = ['lightning', 'switching', 'minimum'];

/** Lengths along the string, on its left in its own frame; lengths of extra units and of the gap on its right. */
export function dimensionString(
  table: DraftingTable,
  plan: StringPlan,
  frame: Transform,
  evaluation: Evaluation,
): void {
  const t = table.textHeightMm;
  const { topMm, bottomMm, unit, count } = plan;
  const edge = -plan.halfWidthMm;
  const governed = evaluation.string?.governedBy;
  const lengthGoverns = governed !== null && governed !== undefined && DISTANCE_CRITERIA.includes(governed);
  const section = figure(bottomMm - topMm, Number.isInteger(bottomMm - topMm) ? 0 : 1);
  const words =
    count > 1 ? `${count} × ${figure(unit.spacingMm, Number.isInteger(unit.spacingMm) ? 0 : 1)} = ${section}` : section;
  table.dimension(frame, at(edge, topMm), at(edge, bottomMm), -LINES.section * t, words, {
    about: 'string.sectionLengthMm',
    layer: lengthGoverns ? 'governing' : 'dimension',
  });
  if (count > 1) {
    const spacing = figure(unit.spacingMm, Number.isInteger(unit.spacingMm) ? 0 : 1);
    table.dimension(frame, at(edge, bottomMm - unit.spacingMm), at(edge, bottomMm), -LINES.spacing * t, spacing, {
      about: 'insulator.spacingMm',
      beside: true,
    });
  }
  if (plan.withFittings) {
    const { minMm, maxMm } = plan.withFittings;
    const range = minMm === maxMm ? figure(maxMm) : `${figure(minMm)} to ${figure(maxMm)}`;
    table.dimension(frame, at(edge, 0), at(edge, plan.liveMm), -LINES.fittings * t, `with fittings ${range}`, {
      about: 'string.stringLengthWithFittingsMaxMm',
    });
  }
  drawDiameter(table, plan, frame);
  drawBrackets(table, plan, frame);
}

/** The diameter as a leader from a rim that no other words stand beside. */
function drawDiameter(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  if (!plan.diameterKnown) return;
  const t = table.textHeightMm;
  const spacing = plan.unit.spacingMm;
  const row = plan.discs
    ? Math.max(
        0,
        Math.min(plan.count - 1, Math.floor((plan.bottomMm - 0.5 * spacing - 4 * t - plan.topMm) / spacing), 1),
      )
    : 0;
  const heightMm = plan.discs ? plan.topMm + (row + 0.62) * spacing : plan.topMm + 0.35 * spacing;
  const upright = Math.abs(frame.a) < 0.5;
  const leader = (upright ? 2.7 : 0.8) * t;
  const from = place(frame, at(-plan.halfWidthMm, heightMm));
  const to = place(frame, at(-plan.halfWidthMm - leader, heightMm));
  const about = 'insulator.diameterMm';
  table.add({ kind: 'line', layer: 'dimension', from, to, about });
  const outX = (to.xMm - from.xMm) / leader;
  const endMm = to.yMm > from.yMm ? to.yMm + (0.3 + CAP_SHARE) * t : to.yMm - 0.3 * t;
  const words = `Ø ${figure(plan.diameterMm)}`;
  table.text(
    'dimension',
    upright ? at(to.xMm, endMm) : at(to.xMm + outX * 0.3 * t, to.yMm + 0.35 * t),
    words,
    upright ? 'middle' : outX < 0 ? 'end' : 'start',
    about,
  );
}

function drawBrackets(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  const t = table.textHeightMm;
  const { outMm, upperMm, lowerMm } = deviceReach(plan);
  const hasGap = plan.devices !== 'none' && plan.gapMm !== null;
  if (hasGap) {
    table.dimension(
      frame,
      at(outMm, upperMm),
      at(outMm, lowerMm),
      LINES.bracket * t,
      `gap ${figure(plan.gapMm ?? 0)}`,
      {
        about: 'string.dryArcWithDevicesMm',
      },
    );
  }
  if (plan.discs && plan.extra > 0) {
    const lengthMm = plan.extra * plan.unit.spacingMm;
    const words = `${plan.extra} extra`;
    table.dimension(
      frame,
      at(outMm, plan.topMm),
      at(outMm, plan.topMm + lengthMm),
      (hasGap ? LINES.nextBracket : LINES.bracket) * t,
      words,
      { about: 'string.extraUnits', beside: lengthMm < (words.length + 1) * ADVANCE_SHARE * t },
    );
  }
}

/** How far the dimensions reach from the axis, on the left and on the right, in the string's frame. */
export function dimensionReach(plan: StringPlan, textHeightMm: number): { leftMm: number; rightMm: number } {
  const brackets = plan.devices !== 'none' && plan.gapMm !== null ? 1 : 0;
  const extras = plan.discs && plan.extra > 0 ? 1 : 0;
  const short = extras && plan.extra * plan.unit.spacingMm < 5 * textHeightMm ? 3.5 : 0;
  return {
    leftMm: plan.halfWidthMm + (plan.withFittings ? 9 : 6.8) * textHeightMm,
    rightMm: deviceReach(plan).outMm + (0.6 + 2.1 * (brackets + extras) + short) * textHeightMm,
  };
}

/**
 * The needed distance to earth as an arc round the live part, from the string's right side to below the live part, with
 * its dimension across. It starts clear of the dimensions and does not pass the attachment's level.
 */
export function drawClearance(
  table: DraftingTable,
  plan: StringPlan,
  frame: Transform,
  endDeg: number,
  startsBeyondMm: number,
): void {
  if (plan.clearanceMm === null) return;
  const about = 'clearances.phaseToEarthMm';
  const radiusMm = plan.liveRadiusMm + plan.clearanceMm;
  const fromAxis = degrees(Math.acos(Math.min(0.985, startsBeyondMm / radiusMm)));
  const fromArm = degrees(Math.asin(Math.min(1, plan.liveMm / radiusMm)));
  const startDeg = -Math.min(fromAxis, fromArm);
  const centre = at(0, plan.liveMm);
  table.add({ kind: 'arc', layer: 'clearance', about, centre, radiusMm, startDeg, endDeg, dashed: true }, frame);
  drawClearanceLength(table, plan, frame);
}

export function drawClearanceLength(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  if (plan.clearanceMm === null) return;
  const from = place(frame, at(plan.liveRadiusMm, plan.liveMm));
  const to = place(frame, at(plan.liveRadiusMm + plan.clearanceMm, plan.liveMm));
  const about = 'clearances.phaseToEarthMm';
  const words = `to earth ${figure(plan.clearanceMm)}`;
  table.add({ kind: 'dimension', layer: 'clearance', about, from, to, offsetMm: 0, text: words });
}

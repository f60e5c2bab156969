import type { DraftingTable } from '../drafting';
import { at, placeSegments, shift, type Segment, type Transform } from '../geometry';
import { discOutline } from '../silhouettes/disc';
import { horn, link, ring, yoke } from '../silhouettes/fittings';
import { rodOutline } from '../silhouettes/rod';
import type { StringPlan } from './plan';

/** How far horns and rings stand out from the axis, and the heights they stand at. */
export interface DeviceReach {
  outMm: number;
  upperMm: number;
  lowerMm: number;
}

export function deviceReach(plan: StringPlan): DeviceReach {
  const section = plan.bottomMm - plan.topMm;
  const gap = plan.gapMm ?? 0.86 * section;
  const middle = (plan.topMm + plan.bottomMm) / 2;
  return {
    outMm: plan.devices === 'none' ? plan.halfWidthMm : plan.halfWidthMm + Math.max(0.35 * plan.diameterMm, 60),
    upperMm: middle - gap / 2,
    lowerMm: middle + gap / 2,
  };
}

/** All insulators of a string, or of one leg, in their frame: one shell or housing a unit, metal parts gathered. */
export function drawInsulators(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  const disc = plan.discs ? discOutline(plan.unit.profile, plan.diameterMm, plan.unit.spacingMm) : null;
  const rod = disc ? null : rodOutline(plan.unit, plan.diameterMm);
  const behind: Segment[] = [];
  const before: Segment[] = [];
  const bodies: Segment[][] = [];
  for (const x of plan.acrossMm) {
    for (let i = 0; i < plan.count; i += 1) {
      const here = shift(x, plan.topMm + i * plan.unit.spacingMm);
      if (disc) {
        behind.push(...placeSegments(here, disc.pin));
        before.push(...placeSegments(here, disc.cap));
        bodies.push(placeSegments(here, disc.shell));
      }
      if (rod) {
        before.push(...placeSegments(here, rod.ends));
        bodies.push(placeSegments(here, rod.housing));
      }
    }
  }
  table.path('metal', behind, { filled: true, frame });
  for (const body of bodies) table.path('insulation', body, { filled: true, frame, about: 'string.units' });
  table.path('metal', before, { filled: true, frame });
}

/** Links, yoke plates and arcing devices in the frame of a string or leg. */
export function drawFittings(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  const { topMm, bottomMm, liveMm, acrossMm, liveRadiusMm } = plan;
  const width = Math.min(26, 0.1 * plan.diameterMm);
  const foot = Math.max(bottomMm, liveMm - liveRadiusMm);
  const parts: Segment[] = [];
  if (acrossMm.length === 1) {
    parts.push(...link(0, 0, topMm, width), ...link(0, bottomMm, foot, width));
  } else {
    const half = Math.abs(acrossMm[0] ?? 0);
    const edge = 1.4 * width;
    parts.push(...link(0, 0, 0.35 * topMm, width), ...yoke(0.35 * topMm, 0.72 * topMm, half, edge));
    parts.push(...yoke(foot, bottomMm + 0.3 * (foot - bottomMm), half, edge));
    for (const x of acrossMm) {
      parts.push(...link(x, 0.72 * topMm, topMm, 0.7 * width));
      parts.push(...link(x, bottomMm, bottomMm + 0.3 * (foot - bottomMm), 0.7 * width));
    }
  }
  table.path('metal', parts, { filled: true, frame });
  drawDevices(table, plan, frame);
}

export function drawDevices(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  if (plan.devices === 'none') return;
  const { outMm, upperMm, lowerMm } = deviceReach(plan);
  const about = 'string.dryArcWithDevicesMm';
  const upperRoot = Math.min(0.6 * plan.topMm, upperMm);
  const lowerRoot = Math.max(plan.bottomMm + 0.4 * (plan.liveMm - plan.bottomMm), lowerMm);
  if (plan.devices === 'horns') {
    const root = Math.min(20, 0.1 * plan.diameterMm);
    const horns = [...horn(root, upperRoot, outMm, upperMm), ...horn(root, lowerRoot, outMm, lowerMm)];
    table.path('metal', horns, { frame, about });
    return;
  }
  const tube = Math.min(45, 0.25 * plan.diameterMm);
  for (const [height, fitting] of [
    [upperMm - tube / 2, upperRoot],
    [lowerMm + tube / 2, lowerRoot],
  ] as const)
    table.path('metal', ring(outMm, height, tube, fitting), { frame, about });
}

/** The clamp with its conductor, seen along the line. */
export function drawLivePart(table: DraftingTable, plan: StringPlan, frame: Transform): void {
  const centre = at(0, plan.liveMm);
  const radiusMm = plan.liveRadiusMm;
  table.add({ kind: 'circle', layer: 'live', centre, radiusMm, filled: true }, frame);
  table.add({ kind: 'circle', layer: 'live', centre, radiusMm: 0.4 * radiusMm, filled: true, solid: true }, frame);
}

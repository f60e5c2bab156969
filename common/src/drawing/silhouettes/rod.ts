import type { InsulatorUnit } from '../../engine/model';
import { curve, line, mirrored, move, type Segment } from '../geometry';

/** Outlines of one long rod on its axis, from its upper end at y = 0 to its lower end at y = length. */
export interface RodOutline {
  ends: Segment[];
  housing: Segment[];
  sheds: number;
}

export const ASSUMED_ROD_DIAMETER_MM = { composite: 140, ceramic: 180 } as const;
const MOST_SHEDS = 300;

/**
 * Length and shed diameter are the unit's own; the number of sheds is not in any catalogue and is drawn at a usual
 * pitch. The end fittings take the length that the dry arc leaves, where it is known.
 */
export function rodOutline(unit: InsulatorUnit, diameterMm: number): RodOutline {
  const length = unit.spacingMm;
  const post = unit.kind === 'line-post';
  const composite = unit.kind === 'composite-rod';
  const radius = diameterMm / 2;
  const left = unit.dryArcMm === null ? 0 : (length - unit.dryArcMm) / 2;
  const end = left > 0.02 * length && left < 0.3 * length ? left : Math.min(0.1 * length, composite ? 130 : 110);
  const shank = composite
    ? Math.min(Math.max(0.12 * diameterMm, 0.16 * radius), 0.4 * radius)
    : Math.min(0.24 * diameterMm, 0.6 * radius);
  const alternating = composite || unit.profile === 'alternating';
  const room = length - 2 * end;
  const usualPitch = Math.max(alternating ? 0.26 * diameterMm : 0.3 * diameterMm, 0.5 * shank);
  const sheds = Math.max(1, Math.min(MOST_SHEDS, Math.floor(room / usualPitch)));
  const pitch = room / sheds;
  const droop = Math.min(0.16 * radius, 0.42 * pitch);
  const edge = Math.min(composite ? 0.05 * radius : 0.1 * radius, 0.2 * pitch);

  const half: Segment[] = [move(0, end), line(shank, end)];
  for (let i = 0; i < sheds; i += 1) {
    const top = end + i * pitch + 0.12 * pitch;
    const tip = alternating && i % 2 === 1 ? shank + 0.72 * (radius - shank) : radius;
    half.push(
      line(shank, top),
      line(tip - edge, top + droop),
      curve(tip, top + droop, tip, top + droop + edge, tip - edge, top + droop + edge),
      line(shank + 0.2 * (tip - shank), top + 0.55 * droop + edge + 0.08 * pitch),
      line(shank, top + 0.5 * droop + edge + 0.12 * pitch),
    );
  }
  half.push(line(shank, length - end), line(0, length - end));

  const grip = composite ? shank * 1.25 : shank * 1.4;
  const eye = Math.min(grip * 0.8, composite ? 14 : 22);
  if (post) return { ends: postEnds(length, end, 1.25 * shank), housing: mirrored(half), sheds };
  const upper: Segment[] = [
    move(0, 0),
    line(eye, 0),
    line(eye, 0.35 * end),
    line(grip, 0.45 * end),
    line(grip, end),
    line(0, end),
  ];
  const lower: Segment[] = [
    move(0, length - end),
    line(grip, length - end),
    line(grip, length - 0.45 * end),
    line(eye, length - 0.35 * end),
    line(eye, length),
    line(0, length),
  ];
  return { ends: [...mirrored(upper), ...mirrored(lower)], housing: mirrored(half), sheds };
}

/** A post is bolted: a flange at its base, a plain cap at its tip. */
function postEnds(length: number, end: number, grip: number): Segment[] {
  const flange = 1.5 * grip;
  const base: Segment[] = [
    move(0, 0),
    line(flange, 0),
    line(flange, 0.16 * end),
    line(grip, 0.16 * end),
    line(grip, end),
    line(0, end),
  ];
  const tip: Segment[] = [move(0, length - end), line(grip, length - end), line(grip, length), line(0, length)];
  return [...mirrored(base), ...mirrored(tip)];
}

import type { Arrangement, Evaluation, InsulatorUnit, SpecificationInput, Surroundings } from '../../engine/model';
import { ASSUMED_ROD_DIAMETER_MM } from '../silhouettes/rod';

const MOST_DISCS = 400;
const MOST_RODS = 20;
const ASSUMED_LEG_DEG = 45;

/** Every length that the drawing of a string needs, measured along the string from its attachment. */
export interface StringPlan {
  unit: InsulatorUnit;
  discs: boolean;
  count: number;
  extra: number;
  arrangement: Arrangement;
  surroundings: Surroundings;
  diameterMm: number;
  diameterKnown: boolean;
  /** Attachment at 0; first insulator, end of the last, centre of the live part. */
  topMm: number;
  bottomMm: number;
  liveMm: number;
  fittingsKnown: boolean;
  /** Positions of parallel strings across, and the half width of the whole row. */
  acrossMm: number[];
  halfWidthMm: number;
  liveRadiusMm: number;
  clearanceMm: number | null;
  windwardDeg: number;
  leewardDeg: number;
  anglesKnown: boolean;
  /** Axis of a line post above the horizontal; null where strings hang or are pulled. */
  postDeg: number | null;
  postAngleKnown: boolean;
  devices: 'none' | 'horns' | 'rings';
  gapMm: number | null;
  withFittings: { minMm: number; maxMm: number } | null;
}

const usable = (value: number | null | undefined): value is number =>
  typeof value === 'number' && Number.isFinite(value) && value > 0;

/** Null where there is nothing to draw: no unit chosen, or no count. */
export function planString(
  input: SpecificationInput,
  unit: InsulatorUnit | null,
  evaluation: Evaluation,
): StringPlan | null {
  const chosen = input.string;
  const answer = evaluation.string;
  if (!unit || !chosen || !answer || !usable(unit.spacingMm)) return null;
  const discs = unit.kind === 'cap-and-pin';
  const count = answer.units ?? (discs ? null : (chosen.rodsInSeries ?? 1));
  if (!usable(count) || !Number.isInteger(count) || count > (discs ? MOST_DISCS : MOST_RODS)) return null;

  const sectionMm = count * unit.spacingMm;
  const diameterKnown = usable(unit.diameterMm);
  const diameterMm = usable(unit.diameterMm) ? unit.diameterMm : assumedDiameter(unit);
  const fittingsKnown = typeof chosen.hardwareLengthMm === 'number' && chosen.hardwareLengthMm >= 0;
  const isPost = unit.kind === 'line-post';
  const assumedFittingsMm = isPost ? Math.min(200, 0.2 * sectionMm) : Math.min(420, 0.7 * sectionMm);
  const fittingsMm = fittingsKnown ? chosen.hardwareLengthMm! : assumedFittingsMm;
  const topMm = 0.55 * fittingsMm;
  const parallel = usable(chosen.parallelStrings) ? Math.min(4, Math.max(1, Math.round(chosen.parallelStrings))) : 1;
  const pitchMm = diameterMm + Math.max(0.3 * diameterMm, 60);
  const acrossMm = Array.from({ length: parallel }, (_, i) => (i - (parallel - 1) / 2) * pitchMm);
  const min = answer.stringLengthWithFittingsMinMm;
  const max = answer.stringLengthWithFittingsMaxMm;
  const clearance = evaluation.clearances?.phaseToEarthMm;
  return {
    unit,
    discs,
    count,
    extra: usable(answer.extraUnits) ? Math.min(count, Math.round(answer.extraUnits)) : 0,
    // A post stands as it is fixed, whatever arrangement is chosen for it.
    arrangement: isPost ? 'suspension' : (chosen.arrangement ?? 'suspension'),
    surroundings: chosen.surroundings ?? 'open',
    diameterMm,
    diameterKnown,
    topMm,
    bottomMm: topMm + sectionMm,
    liveMm: topMm + sectionMm + 0.45 * fittingsMm,
    fittingsKnown,
    acrossMm,
    halfWidthMm: ((parallel - 1) / 2) * pitchMm + diameterMm / 2,
    liveRadiusMm: Math.min(60, Math.max(0.05 * sectionMm, 12)),
    clearanceMm: usable(clearance) ? clearance : null,
    windwardDeg: chosen.vAngleWindwardDeg ?? ASSUMED_LEG_DEG,
    leewardDeg: chosen.vAngleLeewardDeg ?? ASSUMED_LEG_DEG,
    anglesKnown: usable(chosen.vAngleWindwardDeg) && usable(chosen.vAngleLeewardDeg),
    postDeg: isPost ? Math.min(90, Math.max(0, chosen.postAngleDeg ?? 0)) : null,
    postAngleKnown: typeof chosen.postAngleDeg === 'number',
    devices: chosen.arcingDevices ?? 'none',
    gapMm: usable(chosen.arcGapMm) ? Math.min(chosen.arcGapMm, 1.5 * sectionMm) : null,
    withFittings: usable(min) && usable(max) ? { minMm: min, maxMm: max } : null,
  };
}

function assumedDiameter(unit: InsulatorUnit): number {
  if (unit.kind === 'cap-and-pin') return 1.65 * unit.spacingMm;
  return unit.kind === 'composite-rod' ? ASSUMED_ROD_DIAMETER_MM.composite : ASSUMED_ROD_DIAMETER_MM.ceramic;
}

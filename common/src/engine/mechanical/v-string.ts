/** Legs and attachments of a V; the level difference is how much higher the leeward attachment stands. */
export interface VGeometry {
  windwardLegM: number;
  leewardLegM: number;
  /** Distance between the attachments, along the line that joins them. */
  attachmentSpacingM: number;
  levelDifferenceM: number;
}

const degrees = (radians: number): number => (radians * 180) / Math.PI;
const arcCosine = (value: number): number => Math.acos(Math.min(1, Math.max(-1, value)));

/**
 * Angles of the legs from the vertical, degrees, as they hang in still air on two attachments; null where the legs do
 * not reach from one attachment to the other. The load may turn from -leeward to +windward before a leg goes slack.
 */
export function legAnglesDeg(given: VGeometry): { windwardDeg: number; leewardDeg: number } | null {
  const { windwardLegM: l1, leewardLegM: l2, attachmentSpacingM: a, levelDifferenceM: h } = given;
  if (l1 + l2 <= a || Math.abs(l1 - l2) >= a || Math.abs(h) >= a) return null;
  const slopeDeg = degrees(Math.asin(h / a));
  const atWindwardDeg = degrees(arcCosine((l1 ** 2 + a ** 2 - l2 ** 2) / (2 * l1 * a)));
  const atLeewardDeg = degrees(arcCosine((l2 ** 2 + a ** 2 - l1 ** 2) / (2 * l2 * a)));
  return { windwardDeg: 90 - atWindwardDeg + slopeDeg, leewardDeg: 90 - atLeewardDeg - slopeDeg };
}

/** Angles of the load from the vertical, degrees, between which no leg is slack; positive toward the lee. */
export function loadAngleLimitsDeg(given: VGeometry): { leastDeg: number; mostDeg: number } | null {
  const angles = legAnglesDeg(given);
  return angles === null ? null : { leastDeg: -angles.leewardDeg, mostDeg: angles.windwardDeg };
}

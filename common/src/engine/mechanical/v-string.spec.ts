import { legAnglesDeg, loadAngleLimitsDeg } from './v-string';

/** The same limits by the angles at the attachments and at the bottom, as the published rule has them. */
function byPublishedRule(l1: number, l2: number, a: number, h: number): { leastDeg: number; mostDeg: number } {
  const deg = (radians: number): number => (radians * 180) / Math.PI;
  const atLee = deg(Math.acos((l2 ** 2 + a ** 2 - l1 ** 2) / (2 * l2 * a)));
  const atBottom = deg(Math.acos((l1 ** 2 + l2 ** 2 - a ** 2) / (2 * l1 * l2)));
  const slope = deg(Math.asin(h / a));
  return { leastDeg: atLee + slope - 90, mostDeg: atLee + slope - 90 + atBottom };
}

describe(loadAngleLimitsDeg.name, () => {
  it.each([
    [3, 3, 4.2, 0],
    [3, 2.5, 4, 0],
    [3, 3, 4.2, 0.8],
    [2.5, 3, 4.4, -0.5],
  ])('agrees with the published rule: legs of %d and %d m, %d m apart, %d m of level', (l1, l2, a, h) => {
    const limits = loadAngleLimitsDeg({
      windwardLegM: l1,
      leewardLegM: l2,
      attachmentSpacingM: a,
      levelDifferenceM: h,
    })!;
    const published = byPublishedRule(l1, l2, a, h);
    expect(limits.leastDeg).toBeCloseTo(published.leastDeg, 9);
    expect(limits.mostDeg).toBeCloseTo(published.mostDeg, 9);
  });

  it('has none where the legs do not reach', () => {
    const apart = { windwardLegM: 2, leewardLegM: 2, attachmentSpacingM: 4, levelDifferenceM: 0 };
    expect(loadAngleLimitsDeg(apart)).toBeNull();
    expect(legAnglesDeg({ ...apart, attachmentSpacingM: 3, levelDifferenceM: 3 })).toBeNull();
  });
});

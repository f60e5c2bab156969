import {
  DEVIATION_FACTORS,
  fastFrontDistance,
  fastFrontGapFactor,
  fastFrontStrength,
  GAP_LIMITS_M,
  lineGapFactor,
  POWER_FREQUENCY_CONSTANTS,
  powerFrequencyDistance,
  powerFrequencyGapFactor,
  powerFrequencyStrength,
  slowFrontDistance,
  slowFrontStrength,
  slowFrontWithstand,
} from './air-gaps';

const { fastFront, slowFront, powerFrequency } = DEVIATION_FACTORS;
/** EN 50341-1:2001 Annex F prints to 0.01 m and cuts 0.7153 to 0.71. */
const PRINTED_TO_M = 0.006;
const expectPrinted = (distanceM: number, printedM: number) =>
  expect(Math.abs(distanceM - printedM)).toBeLessThanOrEqual(PRINTED_TO_M);

const fastM = (gap: Parameters<typeof lineGapFactor>[0], requiredKvPeak: number, ka: number) =>
  fastFrontDistance({
    requiredKvPeak,
    lineAltitudeFactor: ka,
    deviationFactor: fastFront,
    fastFrontGapFactor: fastFrontGapFactor({ gapFactor: lineGapFactor(gap) }),
  });
const slowM = (gap: Parameters<typeof lineGapFactor>[0], requiredKvPeak: number, ka: number) =>
  slowFrontDistance({
    requiredKvPeak,
    lineAltitudeFactor: ka,
    deviationFactor: slowFront,
    gapFactor: lineGapFactor(gap),
  });
const powerM = (gap: Parameters<typeof lineGapFactor>[0], highestVoltageKv: number, ka: number) =>
  powerFrequencyDistance({
    highestVoltageKv,
    strengthConstantKv:
      gap === 'phase-to-phase' ? POWER_FREQUENCY_CONSTANTS.phaseToPhase : POWER_FREQUENCY_CONSTANTS.phaseToEarth,
    lineAltitudeFactor: ka,
    deviationFactor: powerFrequency,
    powerFrequencyGapFactor: powerFrequencyGapFactor({ gapFactor: lineGapFactor(gap) }),
  });

describe('deviation factors', () => {
  it('are those of EN 50341-1:2001 Annex E, Table E.1', () => {
    expect(fastFront).toBeCloseTo(0.961, 12);
    expect(slowFront).toBeCloseTo(0.922, 12);
    expect(powerFrequency).toBeCloseTo(0.91, 12);
  });
});

describe('line clearances of EN 50341-1:2001 Annex F', () => {
  it('reproduces example F.2.1, a 90 kV line with 6 cap and pin units at 1000 m', () => {
    expectPrinted(fastM('window', 385, 0.946), 0.75);
    expectPrinted(fastM('structure', 385, 0.946), 0.71);
    expectPrinted(fastM('obstacle', 385, 0.946), 0.74);
    expectPrinted(fastM('phase-to-phase', 1.2 * 385, 0.959), 0.82);
    expectPrinted(powerM('window', 100, 0.938), 0.21);
    expectPrinted(powerM('structure', 100, 0.938), 0.19);
    expectPrinted(powerM('phase-to-phase', 100, 0.938), 0.3);
  });

  it('reproduces example F.2.3, a 400 kV line with 19 units at 1000 m', () => {
    expectPrinted(fastM('window', 1550, 0.978), 2.92);
    expectPrinted(fastM('structure', 1550, 0.978), 2.78);
    expectPrinted(fastM('obstacle', 1550, 0.978), 2.89);
    expectPrinted(fastM('phase-to-phase', 1.2 * 1550, 0.978), 3.23);
    expectPrinted(slowM('window', 1.05 * 1050, 0.978), 3.2);
    expectPrinted(slowM('structure', 1.05 * 1050, 0.978), 2.57);
    expectPrinted(slowM('obstacle', 1.05 * 1050, 0.978), 3.02);
    expectPrinted(slowM('phase-to-phase', 1.4 * 1.05 * 1050, 0.978), 3.68);
    expectPrinted(powerM('window', 420, 0.946), 0.75);
    expectPrinted(powerM('structure', 420, 0.946), 0.7);
    expectPrinted(powerM('phase-to-phase', 420, 0.959), 1.17);
  });
});

describe('strength of a gap', () => {
  it('turns the slow-front distance round', () => {
    const figures = { lineAltitudeFactor: 1, deviationFactor: slowFront, gapFactor: 1.45 };
    const distanceM = slowFrontDistance({ ...figures, requiredKvPeak: 950 });
    expect(slowFrontWithstand({ ...figures, distanceM })).toBeCloseTo(950, 9);
    expect(slowFront * slowFrontStrength({ gapFactor: 1.45, distanceM })).toBeCloseTo(950, 9);
  });

  it('turns the fast-front and power-frequency distances round', () => {
    const fastFrontGap = fastFrontGapFactor({ gapFactor: 1.45 });
    const fastFrontM = fastM('structure', 1050, 1);
    expect(fastFront * fastFrontStrength({ fastFrontGapFactor: fastFrontGap, distanceM: fastFrontM })).toBeCloseTo(
      1050,
      9,
    );
    const powerGap = powerFrequencyGapFactor({ gapFactor: 1.45 });
    const strengthKv = powerFrequencyStrength({
      powerFrequencyGapFactor: powerGap,
      distanceM: powerM('structure', 420, 1),
    });
    expect(powerFrequency * strengthKv).toBeCloseTo((420 * Math.SQRT2) / Math.sqrt(3), 9);
  });

  it('ends at 10 m for fast fronts and at 25 m for slow fronts', () => {
    expect(fastFrontStrength.outside({ distanceM: GAP_LIMITS_M.fastFront })).toBeNull();
    expect(fastFrontStrength.outside({ distanceM: 10.01 })).toMatchObject({ name: 'distanceM', most: 10 });
    expect(slowFrontStrength.outside({ distanceM: GAP_LIMITS_M.slowFront })).toBeNull();
    expect(slowFrontStrength.outside({ distanceM: 25.01 })).toMatchObject({ name: 'distanceM', most: 25 });
  });
});

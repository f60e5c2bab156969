import {
  altitudeFactor,
  creepageAltitudeRule,
  dielectricFactor,
  LEVEL_ALTITUDE_RULES,
  levelAltitudeCorrection,
  lineAltitudeFactor,
  relativeAirDensity,
  standardAirDensity,
} from './atmosphere';
import { Calculation } from './trace';

const working = () => new Calculation(true);

describe('the altitude factor of a required withstand', () => {
  it('is 1.13 at 2000 m with exponent 1 (IEC 62271-1:2011, origin 1000 m; printed to two decimals)', () => {
    expect(altitudeFactor({ altitudeM: 2000, originM: 1000, altitudeExponent: 1 })).toBeCloseTo(1.1305, 4);
  });

  it('is exactly 1 up to the altitude that the level holds for', () => {
    expect(altitudeFactor({ altitudeM: 1000, originM: 1000, altitudeExponent: 1 })).toBe(1);
    expect(altitudeFactor({ altitudeM: 0, originM: 1000, altitudeExponent: 1 })).toBe(1);
    expect(levelAltitudeCorrection({ altitudeM: 2310, holdsToM: 2400, stress: 'lightning' }, working())).toBe(1);
  });

  it('takes the exponents of IEC 62271-1:2011', () => {
    const exponents = Object.values(LEVEL_ALTITUDE_RULES).map(({ exponent }) => exponent);
    expect(exponents).toEqual([1, 1, 1, 0.75, 0.9]);
  });

  it('counts an altitude below the sea as the sea', () => {
    const calculation = working();
    expect(levelAltitudeCorrection({ altitudeM: -200, holdsToM: 0, stress: 'lightning' }, calculation)).toBe(1);
    expect(calculation.lines[0]?.substitution).toContain('max(0 - 0, 0)');
  });

  it('lowers the polluted flashover by 6, 11 and 17 % at 1000, 2000 and 3000 m (GB/T 16434:1996 annex B, printed)', () => {
    const reductions = [1000, 2000, 3000].map(
      (altitudeM) => 100 * (1 - 1 / altitudeFactor({ altitudeM, originM: 0, altitudeExponent: 0.5 })),
    );
    [6, 11, 17].forEach((printed, index) =>
      expect(Math.abs((reductions[index] as number) - printed)).toBeLessThan(0.6),
    );
  });

  it('takes 0.8 for fog profiles and where the profile is not known, 0.5 otherwise', () => {
    expect(
      (['standard', 'fog', 'open', 'alternating', 'unknown'] as const).map(
        (profile) => creepageAltitudeRule(profile).exponent,
      ),
    ).toEqual([0.5, 0.8, 0.5, 0.5, 0.8]);
  });
});

describe('the factor that divides a distance', () => {
  it('is 1 up to 1000 m and that of the next higher altitude above', () => {
    expect(dielectricFactor(0, working()).factor).toBe(1);
    expect(dielectricFactor(1000, working()).factor).toBe(1);
    expect(dielectricFactor(1001, working()).factor).toBe(0.98);
    expect(dielectricFactor(3000, working()).factor).toBe(0.8);
  });

  it('has no figure above the table', () => {
    expect(dielectricFactor(6101, working()).factor).toBeNull();
  });
});

describe('the factor on the strength of a line gap', () => {
  /** EN 50341-1:2001 Annex F prints these factors with the voltages of its examples at 1000 m. */
  it.each([
    [141, 0.938],
    [385, 0.946],
    [462, 0.959],
    [557, 0.959],
    [1103, 0.978],
    [1550, 0.978],
    [343, 0.946],
    [594, 0.959],
    [(245 * Math.SQRT2) / Math.sqrt(3), 0.938],
  ])('at 1000 m and %d kV is %d (EN 50341-1:2001 Annex F)', (gapKvPeak, printed) => {
    expect(lineAltitudeFactor({ altitudeM: 1000, gapKvPeak, use: 'test' }, working()).factor).toBe(printed);
  });

  it('is linear between printed altitudes', () => {
    const reading = lineAltitudeFactor({ altitudeM: 1250, gapKvPeak: 300, use: 'test' }, working());
    expect(reading.factor).toBeCloseTo((0.946 + 0.915) / 2, 12);
    expect(reading.interpolated).toBe(true);
  });

  it('has no figure above 3000 m', () => {
    expect(lineAltitudeFactor({ altitudeM: 3000, gapKvPeak: 300, use: 'test' }, working()).factor).toBe(0.815);
    expect(lineAltitudeFactor({ altitudeM: 3001, gapKvPeak: 300, use: 'test' }, working()).factor).toBeNull();
  });
});

describe('air density', () => {
  it('is 0.9327 at 37 degrees C and 750 mmHg (Naidu and Kamaraju, High Voltage Engineering, example 7.3, p. 278)', () => {
    const pressure = { pressureKpa: (750 / 760) * 101.3, referencePressureKpa: 101.3 };
    expect(relativeAirDensity({ ...pressure, temperatureC: 37 })).toBeCloseTo(0.9327, 4);
  });

  it.each([
    [1000, 0.9075],
    [3000, 0.7423],
    [4000, 0.6689],
  ])(
    'of the standard atmosphere at %d m is %d (tables of ISO 2533, which count geometric altitude)',
    (altitudeM, printed) => {
      expect(Math.abs(standardAirDensity({ altitudeM }) - printed)).toBeLessThan(0.0003);
    },
  );
});

import fc from 'fast-check';
import {
  countUp,
  marginPercent,
  mmFromIn,
  providedCreepageMm,
  providedDistanceMm,
  rangeOf,
  reaches,
  requiredCreepageMm,
  requiredDistanceMm,
  unitOf,
} from './quantities';

describe(countUp.name, () => {
  it('keeps an exact quotient, also with the dust of binary arithmetic', () => {
    expect(countUp(15)).toBe(15);
    expect(countUp(15.000000000000002)).toBe(15);
    expect(countUp(15.000000001)).toBe(16);
    expect(countUp(0.2)).toBe(1);
    expect(countUp(-3)).toBe(1);
  });

  it('keeps the count of every exact quotient', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 60 }),
        fc.double({ min: 50, max: 800, noNaN: true }),
        (count, creepageMm) => {
          expect(countUp((count * creepageMm) / creepageMm)).toBe(count);
          expect(countUp((creepageMm * 1.1 * count) / (creepageMm * 1.1))).toBe(count);
        },
      ),
    );
  });
});

describe('rounding', () => {
  it('takes required distances up to 10 mm and required creepage up to 1 mm', () => {
    expect(requiredDistanceMm(2100)).toBe(2100);
    expect(requiredDistanceMm(2100.0000000000005)).toBe(2100);
    expect(requiredDistanceMm(2100.1)).toBe(2110);
    expect(requiredCreepageMm(6124.8)).toBe(6125);
  });

  it('takes what is provided downward', () => {
    expect(providedDistanceMm(2109)).toBe(2100);
    expect(providedCreepageMm(6124.8)).toBe(6124);
  });

  it('counts a margin against the requirement and lets an equal value pass', () => {
    expect(marginPercent(110, 100)).toBeCloseTo(10, 9);
    expect(marginPercent(95, 100)).toBeCloseTo(-5, 9);
    expect(reaches(0.1 + 0.2, 0.3)).toBe(true);
    expect(reaches(299, 300)).toBe(false);
  });
});

describe('ranges and units', () => {
  it('counts exactly 245 kV as range I', () => {
    expect(rangeOf(245)).toBe(1);
    expect(rangeOf(245.1)).toBe(2);
  });

  it('reads the unit from the ending of a name', () => {
    expect(unitOf('creepageRequiredMm')).toBe('mm');
    expect(unitOf('uscdMmPerKv')).toBe('mm/kV');
    expect(unitOf('lightningDryKvPeak')).toBe('kV peak');
    expect(unitOf('altitudeM')).toBe('m');
    expect(unitOf('altitudeFactor')).toBe('');
    expect(unitOf('requiredUnits')).toBe('units');
    expect(unitOf('something')).toBeNull();
  });

  it('converts inches exactly', () => {
    expect(mmFromIn(92)).toBeCloseTo(2336.8, 9);
  });
});

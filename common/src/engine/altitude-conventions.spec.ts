import { altitudeConventions, type AltitudeConvention } from './altitude-conventions';
import { stationDistanceFactor } from './clearances/formulas';
import { C37_30_ALTITUDE, NATIONAL_ALTITUDE_RULES } from './standards';

const of = (id: string, altitudeM: number): AltitudeConvention => {
  const found = altitudeConventions(altitudeM).find((one) => one.id === id);
  if (found === undefined) throw new Error(id);
  return found;
};
const increase = (id: string, altitudeM: number): number | null => of(id, altitudeM).increaseFactor;

describe(altitudeConventions.name, () => {
  it('gives 1.13 at 2000 m with exponent 1, as IEC 62271-1:2011 is quoted', () => {
    expect(increase('exponent-1', 2000)).toBeCloseTo(1.1305, 4);
    expect(increase('exponent-0.75', 2000)).toBeCloseTo(1.0964, 4);
    expect(increase('exponent-0.9', 2000)).toBeCloseTo(1.1168, 4);
  });

  it('agrees with the fall of 6 and 11 and 17 % that GB/T 16434-1996 annex B prints, within 0.01', () => {
    expect(Math.abs((increase('exponent-0.5', 2000) ?? 0) - 0.94 / 0.89)).toBeLessThan(0.01);
    expect(Math.abs((increase('exponent-0.5', 3000) ?? 0) - 0.94 / 0.83)).toBeLessThan(0.01);
  });

  it.each(NATIONAL_ALTITUDE_RULES.rows.map((row) => [row.rule, row] as const))(
    'gives what the rule %s comes to at 2000 and 3000 m',
    (rule, row) => {
      expect(increase(rule, 2000)).toBeCloseTo(row.at2000Factor, 9);
      expect(increase(rule, 3000)).toBeCloseTo(row.at3000Factor, 9);
    },
  );

  it('has the rule of RD 337/2014 once: as the safety distances reckon, and no further', () => {
    for (const altitudeM of [0, 1000, 1001, 1100, 2310, 3000]) {
      expect(increase('rd-337', altitudeM)).toBeCloseTo(stationDistanceFactor({ altitudeM }), 12);
    }
    expect(of('rd-337', 3001)).toMatchObject({ sourceFactor: null, increaseFactor: null });
  });

  /** EN 50341-1:2001 Table E.4, its figures relative to 1000 m. */
  it.each([
    ['en-50341-1:up-to-200', 0.938 / 0.87, 0.938 / 0.798],
    ['en-50341-1:above-1100', 0.978 / 0.938, 0.978 / 0.885],
  ])('compares column %s from 1000 m', (id, at2000, at3000) => {
    expect(increase(id, 2000)).toBeCloseTo(at2000, 12);
    expect(increase(id, 3000)).toBeCloseTo(at3000, 12);
    expect(increase(id, 0)).toBe(1);
    expect(of(id, 0).sourceFactor).toBe(1);
    expect(increase(id, 3001)).toBeNull();
  });

  it('divides by the C37.30 factor of the next higher altitude', () => {
    const row = C37_30_ALTITUDE.rows.find(({ altitudeM }) => altitudeM === 2100)!;
    expect(of('c37.30', 2000)).toMatchObject({
      sourceFactor: row.dielectricFactor,
      increaseFactor: 1 / row.dielectricFactor,
      source: expect.objectContaining({ status: 'memory' }) as unknown,
    });
  });

  it('never asks for less than at 1000 m, and for no less where the site lies higher', () => {
    let before = altitudeConventions(0);
    for (let altitudeM = 0; altitudeM <= 4500; altitudeM += 50) {
      const now = altitudeConventions(altitudeM);
      now.forEach(({ increaseFactor }, index) => {
        if (increaseFactor === null) return;
        expect(increaseFactor).toBeGreaterThanOrEqual(1);
        expect(increaseFactor).toBeGreaterThanOrEqual((before[index]?.increaseFactor ?? 1) - 1e-12);
        if (altitudeM <= 1000) expect(increaseFactor).toBe(1);
      });
      before = now;
    }
  });

  it('has no figure above 4500 m, and takes a site below the sea as at the sea', () => {
    expect(altitudeConventions(4501).every(({ increaseFactor }) => increaseFactor === null)).toBe(true);
    expect(altitudeConventions(-300)).toEqual(altitudeConventions(0));
  });

  it('names each once', () => {
    const ids = altitudeConventions(1000).map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });
});

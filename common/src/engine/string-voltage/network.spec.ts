import fc from 'fast-check';
import { evaluate } from '../evaluate';
import { aCompositeRod, aContext, aDisc, aLine, rangeOneLevel, rangeTwoLevel } from '../testing/specifications';
import { equalisingLineRatio } from './equalise';
import { shieldingCapacitance, stringEfficiency } from './formulas';
import { linkPotentialRatios, voltageShareRatios } from './network';

const loadMath = () => import('mathjs');
let math: Awaited<ReturnType<typeof loadMath>>;
beforeAll(async () => {
  math = await loadMath();
});

/** The node equations as a full matrix, for a general linear solver (mathjs, LU with pivoting). */
function byGeneralSolver(units: number, toEarth: number[], toLine: number[]): number[] {
  const links = units - 1;
  const rows = toEarth.map((c, j) =>
    toEarth.map((_, i) => (i === j ? 2 + c + (toLine[j] as number) : Math.abs(i - j) === 1 ? -1 : 0)),
  );
  const right = toLine.map((k, j) => [k + (j === links - 1 ? 1 : 0)]);
  return math.lusolve(math.matrix(rows), math.matrix(right)).toArray().flat() as number[];
}

const aNetwork = fc.integer({ min: 2, max: 40 }).chain((units) =>
  fc.record({
    units: fc.constant(units),
    toEarth: fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: units - 1, maxLength: units - 1 }),
    toLine: fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: units - 1, maxLength: units - 1 }),
  }),
);

describe(linkPotentialRatios.name, () => {
  it('agrees with a general linear solver, and leaves no residual in its node equations', () => {
    fc.assert(
      fc.property(aNetwork, ({ units, toEarth, toLine }) => {
        const u = linkPotentialRatios({ units, pinToEarthRatio: toEarth, pinToLineRatio: toLine });
        const general = byGeneralSolver(units, toEarth, toLine);
        const at = (j: number): number => (j < 0 ? 0 : (u[j] as number));
        for (let j = 0; j < units - 1; j += 1) {
          const [c, k] = [toEarth[j] as number, toLine[j] as number];
          const residual = at(j) - at(j - 1) + c * at(j) - (at(j + 1) - at(j)) - k * (1 - at(j));
          expect(Math.abs(residual)).toBeLessThan(1e-12);
          expect(Math.abs(at(j) - (general[j] as number))).toBeLessThan(1e-12);
        }
        expect(u.at(-1)).toBe(1);
      }),
    );
  });

  it('refuses ratios that do not fit the links', () => {
    expect(() => linkPotentialRatios({ units: 3, pinToEarthRatio: [0.1] })).toThrow(RangeError);
  });
});

describe(voltageShareRatios.name, () => {
  it('is in the simple form what the recurrence of the textbooks gives', () => {
    const c = 0.17;
    const voltages = [1];
    for (let unit = 1; unit < 12; unit += 1) {
      const sum = voltages.reduce((total, one) => total + one, 0);
      voltages.push((voltages.at(-1) as number) + c * sum);
    }
    const total = voltages.reduce((sum, one) => sum + one, 0);
    const shares = voltageShareRatios({ units: 12, pinToEarthRatio: c }).reverse();
    shares.forEach((share, unit) => expect(share).toBeCloseTo((voltages[unit] as number) / total, 12));
  });

  it('gives a single unit everything', () => {
    expect(voltageShareRatios({ units: 1, pinToEarthRatio: 0.1 })).toEqual([1]);
  });

  it('is even with the capacitances of static shielding, to earth and to the line', () => {
    const units = 8;
    const c = 0.2;
    const toLine = [1, 2, 3, 4, 5, 6, 7].map((linkCount) => c * shieldingCapacitance({ linkCount, units }));
    const shares = voltageShareRatios({ units, pinToEarthRatio: c, pinToLineRatio: toLine });
    for (const share of shares) expect(share).toBeCloseTo(1 / units, 12);
    expect(stringEfficiency({ units, lineEndRatio: shares[0] as number })).toBeCloseTo(100, 9);
  });

  it('is even at the line end with the capacitance that is meant to make it so', () => {
    for (const units of [2, 3, 9]) {
      const { pinToLineRatio, lineEndShareRatio } = equalisingLineRatio({ units, pinToEarthRatio: 0.15 });
      const toLine = [...new Array<number>(units - 2).fill(0), pinToLineRatio];
      const [last, before] = voltageShareRatios({ units, pinToEarthRatio: 0.15, pinToLineRatio: toLine });
      expect(last).toBeCloseTo(before as number, 12);
      expect(last).toBeCloseTo(lineEndShareRatio, 12);
    }
  });
});

describe('the voltage sharing of an evaluation', () => {
  it('stands line end first, adds up, and names the capacitances it took', () => {
    const { string, notAssessed, trace } = evaluate(aLine(), aContext());
    expect(string?.voltageSharing).toHaveLength(9);
    expect(string?.voltageSharing.reduce((sum, one) => sum + one, 0)).toBeCloseTo(100, 9);
    expect([...string!.voltageSharing].sort((one, other) => other - one)).toEqual(string?.voltageSharing);
    expect(string?.efficiencyPercent).toBeCloseTo(10000 / (9 * string!.voltageSharing[0]!), 9);
    expect(notAssessed.map(({ part }) => part)).not.toContain('string.voltageSharing');
    const line = trace.find(({ id }) => id === 'string-voltage.network');
    expect(line?.substitution).toContain('c = 0.1 (usual, practice), k = 0 (usual, practice): ');
    expect(line?.source.status).toBe('practice');
    expect(string?.sharing).toEqual({
      pinToEarth: { valueRatio: 0.1, from: 'usual' },
      pinToLine: { valueRatio: 0, from: 'usual' },
    });
  });

  it('is that of the general network with the capacitances entered, as a general linear solver has it', () => {
    const entered = { pinToEarthRatio: 0.18, pinToLineRatio: 0.04 };
    const { string, trace } = evaluate(aLine({ string: { sharing: entered } }), aContext());
    const u = byGeneralSolver(9, new Array<number>(8).fill(0.18), new Array<number>(8).fill(0.04));
    expect(string?.voltageSharing[0]).toBeCloseTo(100 * (1 - u[7]!), 9);
    expect(string?.voltageSharing.at(-1)).toBeCloseTo(100 * u[0]!, 9);
    const line = trace.find(({ id }) => id === 'string-voltage.network');
    expect(line?.substitution).toContain('c = 0.18 (entered), k = 0.04 (entered): ');
    expect(line?.source.status).toBe('seen');
  });

  it('takes the usual figure for the one that is not entered, and changes no count', () => {
    const withRatio = evaluate(
      aLine({ string: { sharing: { pinToEarthRatio: null, pinToLineRatio: 0.03 } } }),
      aContext(),
    );
    expect(withRatio.string?.sharing).toEqual({
      pinToEarth: { valueRatio: 0.1, from: 'usual' },
      pinToLine: { valueRatio: 0.03, from: 'entered' },
    });
    expect(withRatio.string?.units).toBe(evaluate(aLine(), aContext()).string?.units);
  });

  it('has no efficiency where the unit at the line end does not carry the most', () => {
    const sharing = { pinToEarthRatio: 0.05, pinToLineRatio: 0.5 };
    const { string, notAssessed } = evaluate(aLine({ string: { sharing } }), aContext());
    expect(string?.voltageSharing).toHaveLength(9);
    expect(string?.efficiencyPercent).toBeNull();
    expect(notAssessed.map(({ part }) => part)).toContain('string.efficiencyPercent');
  });

  it('is not there for rods, and says so', () => {
    const { string, notAssessed } = evaluate(aLine(), aContext({ insulator: aCompositeRod() }));
    expect(string).toMatchObject({ voltageSharing: [], efficiencyPercent: null });
    expect(notAssessed.map(({ part }) => part)).toContain('string.voltageSharing');
  });

  it('says from which voltage on rings are usual', () => {
    const kv220 = { nominalVoltageKv: 220, highestVoltageKv: 245, insulationLevel: rangeOneLevel(460, 1050) };
    const kv400 = { nominalVoltageKv: 400, highestVoltageKv: 420, insulationLevel: rangeTwoLevel(1050, 1.5, 1425) };
    const rings = (system: object, insulator: ReturnType<typeof aDisc>, arcingDevices: 'none' | 'rings' = 'none') =>
      evaluate(aLine({ system, string: { arcingDevices, arcGapMm: null } }), aContext({ insulator })).cautions.flatMap(
        ({ code, severity }) => (code.startsWith('ring-usual') ? [`${severity} ${code}`] : []),
      );
    expect(rings(kv220, aCompositeRod())).toEqual(['caution ring-usual-composite']);
    expect(rings(kv220, aCompositeRod(), 'rings')).toEqual([]);
    expect(rings(kv220, aDisc())).toEqual([]);
    expect(rings(kv400, aDisc())).toEqual(['info ring-usual-discs']);
  });
});

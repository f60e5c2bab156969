import fc from 'fast-check';
import { gExponent } from '../g-method';
import { worksheetInputSchema } from '../../schemas/worksheet';
import { unitOf } from '../quantities';
import { aWorksheet } from '../testing/worksheets';
import type { WorksheetAnswer, WorksheetInput } from '../worksheet-model';
import { insulationLevelWorksheet } from './worksheet';

const codes = ({ cautions }: WorksheetAnswer): string[] => cautions.map(({ code, severity }) => `${severity} ${code}`);
const required = (answer: WorksheetAnswer): number[] => answer.rows.map(({ requiredKv }) => requiredKv);

describe(insulationLevelWorksheet.name, () => {
  it('is worked out for the site, and never for less than 1000 m', () => {
    expect(insulationLevelWorksheet(aWorksheet({ altitudeM: 200 })).levelHoldsToM).toBe(1000);
    expect(required(insulationLevelWorksheet(aWorksheet({ altitudeM: 200 })))).toEqual(
      required(insulationLevelWorksheet(aWorksheet())),
    );
    const high = insulationLevelWorksheet(aWorksheet({ altitudeM: 2310 }));
    expect(high.levelHoldsToM).toBe(2310);
    expect(high.proposedLevel?.lightningKv).toBe(1050);
    expect(codes(high)).toContain('caution altitude-over-2000');
  });

  it('corrects external insulation only', () => {
    const [low, high] = [1000, 3000].map((altitudeM) => insulationLevelWorksheet(aWorksheet({ altitudeM })));
    low!.rows.forEach((row, index) => {
      const other = high!.rows[index]!;
      if (row.insulation === 'internal') {
        expect(other.requiredKv).toBe(row.requiredKv);
        expect([row.altitudeFactor, row.altitudeExponent]).toEqual([null, null]);
      } else expect(other.requiredKv).toBeGreaterThan(row.requiredKv);
    });
  });

  it('takes the exponent of switching to earth by the g-method where none is given', () => {
    const answer = insulationLevelWorksheet(aWorksheet({ switchingPhaseToEarthExponent: null }));
    const row = answer.rows.find(
      ({ stress, distance, place }) =>
        stress === 'slow-front' && distance === 'phase-to-earth' && place === 'line-entrance',
    );
    // U50 = 451/0.922 kV in a gap of 0.906 m: g 1.08
    expect(row?.altitudeExponent).toBe(1);
    expect(answer.trace.map(({ id }) => id)).toContain(
      'atmosphere.g-parameter:slow-front:line-entrance:phase-to-earth',
    );
  });

  /** IEC 60060-1, from memory, not verified: the corners and branches of the exponent. */
  it.each([
    [0.1, 0],
    [0.2, 0],
    [0.6, (0.6 * 0.4) / 0.8],
    [1, 1],
    [1.1, 1],
    [1.2, 1],
    [1.6, (0.4 * 0.6) / 0.8],
    [2, 0],
    [2.1, 0],
    [3, 0],
  ])('the exponent at g %d is %d', (gradientRatio, exponent) => {
    expect(gExponent({ gradientRatio })).toBeCloseTo(exponent, 12);
  });

  it('keeps the straight line within 1 % of the factor that the printed example reads off its curve', () => {
    const places = aWorksheet().places!.map((place) => ({ ...place, phaseToEarthCoordinationFactor: null }));
    const answer = insulationLevelWorksheet(aWorksheet({ places }));
    const row = answer.rows.find(({ place, distance }) => place === 'other-equipment' && distance === 'phase-to-earth');
    expect(Math.abs((row?.coordinationFactor ?? 0) / 1.03 - 1)).toBeLessThan(0.01);
  });

  it('needs a switching level in range II, and proposes a row that has it', () => {
    const answer = insulationLevelWorksheet(
      aWorksheet({
        highestVoltageKv: 420,
        arrester: { switchingProtectionKvPeak: 750, lightningProtectionKvPeak: 850 },
        places: [{ place: 'other-equipment', slowFrontPhaseToEarthPu: 2.2, slowFrontPhaseToPhasePu: 3.3 }],
      }),
    );
    expect(answer.proposedLevel?.switchingKv).toBeGreaterThanOrEqual(
      Math.max(
        ...answer.rows.flatMap(({ stress, distance, requiredKv }) =>
          stress === 'slow-front' && distance === 'phase-to-earth' ? [requiredKv] : [],
        ),
      ),
    );
    const temporary = answer.rows.find(({ stress, insulation }) => stress === 'temporary' && insulation === 'external');
    expect(temporary?.convertedSwitchingKvPeak).toBeCloseTo(1.4 * (temporary?.requiredKv ?? 0), 9);
  });

  it('converts wet insulators by their own factors', () => {
    const answer = insulationLevelWorksheet(aWorksheet({ externalInsulation: 'wet-insulators' }));
    const row = answer.rows.find(({ place, insulation }) => place === 'other-equipment' && insulation === 'external');
    expect(row?.convertedPowerFrequencyKvRms).toBeCloseTo(0.6 * (row?.requiredKv ?? 0), 9);
    expect(row?.convertedLightningKvPeak).toBeCloseTo(1.3 * (row?.requiredKv ?? 0), 9);
  });

  it('proposes nothing where no row suffices', () => {
    const answer = insulationLevelWorksheet(aWorksheet({ earthFaultFactor: 1.9, loadRejectionFactor: 2 }));
    expect(answer.proposedLevel).toBeNull();
    expect(answer.proposedWhyNot).toContain('No insulation level for 245 kV');
  });

  it('takes a row that the company added', () => {
    const company = {
      highestVoltageKv: 245,
      powerFrequencyKv: 600,
      switchingKv: null,
      switchingPhaseRatio: null,
      lightningKv: 1300,
      reason: 'Station on a ridge',
    };
    const input = aWorksheet({ earthFaultFactor: 1.9, loadRejectionFactor: 2 });
    expect(insulationLevelWorksheet(input, { companyLevels: [company] }).proposedLevel).toMatchObject(company);
  });

  it('stops outside the method and names its own field', () => {
    const high = insulationLevelWorksheet(aWorksheet({ altitudeM: 5000 }));
    expect(high).toMatchObject({ rows: [], proposedLevel: null, levelHoldsToM: null });
    expect(high.cautions).toContainEqual(expect.objectContaining({ severity: 'stop', field: 'altitudeM' }));
    const voltage = insulationLevelWorksheet(aWorksheet({ highestVoltageKv: 2000 }));
    expect(voltage.cautions).toContainEqual(expect.objectContaining({ severity: 'stop', field: 'highestVoltageKv' }));
    expect(codes(insulationLevelWorksheet(aWorksheet({ altitudeM: 3001 })))).toContain('acceptance altitude-over-3000');
  });

  it('says that it rests on memory, and shows each line once', () => {
    const answer = insulationLevelWorksheet(aWorksheet());
    expect(codes(answer)).toContain('info rests-on-memory');
    const ids = answer.trace.map(({ id }) => id);
    expect(ids.filter((id, index) => ids.indexOf(id) !== index)).toEqual([]);
    expect(insulationLevelWorksheet(aWorksheet(), { trace: false })).toEqual({ ...answer, trace: [] });
  });

  it('never proposes a level without what it rests on', () => {
    const keys = Object.keys(aWorksheet()).filter((key) => key !== 'switchingPhaseToEarthExponent');
    for (const key of keys) {
      const answer = insulationLevelWorksheet({ ...aWorksheet(), [key]: null } as WorksheetInput);
      expect([key, answer.proposedLevel]).toEqual([key, null]);
      expect([key, answer.notAssessed.length > 0]).toEqual([key, true]);
    }
    for (const key of Object.keys(aWorksheet().fastFront!)) {
      const fastFront = { ...aWorksheet().fastFront!, [key]: null };
      expect(insulationLevelWorksheet(aWorksheet({ fastFront })).proposedLevel).toBeNull();
    }
    expect(insulationLevelWorksheet({} as WorksheetInput).proposedLevel).toBeNull();
  });

  it('never asks for less where an overvoltage is larger or the site higher', () => {
    const pu = fc.double({ min: 1.5, max: 3, noNaN: true });
    fc.assert(
      fc.property(pu, pu, fc.integer({ min: 0, max: 4500 }), fc.integer({ min: 0, max: 4500 }), (one, other, a, b) => {
        const at = (slowFrontPhaseToEarthPu: number, altitudeM: number) =>
          required(
            insulationLevelWorksheet(
              aWorksheet({
                altitudeM,
                arrester: { switchingProtectionKvPeak: null, lightningProtectionKvPeak: null },
                places: [{ place: 'other-equipment', slowFrontPhaseToEarthPu, slowFrontPhaseToPhasePu: 3 }],
              }),
              { trace: false },
            ),
          );
        const less = at(Math.min(one, other), Math.min(a, b));
        at(Math.max(one, other), Math.max(a, b)).forEach((kv, index) => {
          expect(Number.isFinite(kv)).toBe(true);
          expect(kv).toBeGreaterThanOrEqual((less[index] ?? 0) - 1e-9);
        });
      }),
      { numRuns: 200 },
    );
  });

  it('has a unit in the name of every number', () => {
    const walk = (value: unknown, path: string): string[] => {
      if (typeof value === 'number') return [path];
      if (value === null || typeof value !== 'object') return [];
      return Object.entries(value).flatMap(([key, inner]) => walk(inner, Array.isArray(value) ? path : key));
    };
    const answer = insulationLevelWorksheet(aWorksheet(), { trace: false });
    for (const name of [...walk(aWorksheet(), ''), ...walk(answer, '')]) {
      expect([name, unitOf(name) !== null]).toEqual([name, true]);
    }
  });
});

describe('the schema of a worksheet', () => {
  const message = async (input: unknown): Promise<string> => {
    try {
      await worksheetInputSchema.validate(input, { strict: true });
      return '';
    } catch (error) {
      return (error as Error).message;
    }
  };

  it('reads the example and a worksheet that is still empty', async () => {
    expect(await message(aWorksheet())).toBe('');
    expect(await message({ highestVoltageKv: null })).toBe('');
  });

  it.each([
    [{ ...aWorksheet(), highestVoltageKv: 'high' }, 'Highest voltage: a number is needed'],
    [{ ...aWorksheet(), earthFaultFactor: 0.9 }, 'Earth-fault factor: must be at least 1'],
    [{ ...aWorksheet(), powerFrequencySurface: 'wet' }, 'Surface at power frequency: choose one of'],
    [{ ...aWorksheet(), more: 1 }, 'more'],
    [aWorksheet({ places: [aWorksheet().places![0]!, aWorksheet().places![0]!] }), 'Places: each place once'],
    [{ ...aWorksheet(), places: [null] }, 'Places: an entry is empty'],
    [
      aWorksheet({ fastFront: { ...aWorksheet().fastFront!, subconductorsCount: 3 } }),
      'Sub-conductors of the line: choose one of 1, 2, 4, 6, 8',
    ],
  ])('says in the reader’s words what cannot be read', async (input, words) => {
    expect(await message(input)).toContain(words);
  });
});

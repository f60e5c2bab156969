import fc from 'fast-check';
import { assessClearances } from './clearances';
import type { ClearanceInput, ClearanceRow, ClearancesResult, SpecificationInput } from './model';
import { assessInsulationLevel } from './overvoltage';
import { readSituation } from './situation';
import { Calculation } from './trace';

interface Case {
  highestVoltageKv?: number | null;
  altitudeM?: number | null;
  lightningKv?: number | null;
  switchingKv?: number | null;
  ratio?: number | null;
  powerFrequencyKv?: number | null;
  holdsToM?: number;
  earthFault?: 'cleared' | 'sustained' | null;
  clearance?: Partial<ClearanceInput> | null;
}

/** A 245 kV line with its highest level, earth faults cleared, to be overridden. */
function assess(given: Case): ClearancesResult & { calculation: Calculation; codes: string[] } {
  const {
    highestVoltageKv = 245,
    altitudeM = 1000,
    lightningKv = 1050,
    switchingKv = null,
    ratio = null,
    powerFrequencyKv = 460,
    holdsToM = 1000,
    earthFault = 'cleared',
    clearance,
  } = given;
  const level = { lightningKv, switchingKv, switchingPhaseRatio: ratio, powerFrequencyKv, levelHoldsToM: holdsToM };
  const input: SpecificationInput = {
    kind: 'line',
    basis: 'iec',
    system: {
      nominalVoltageKv: null,
      highestVoltageKv,
      frequencyHz: 50,
      neutralEarthing: 'resonant',
      earthFault,
      insulationLevel: level,
    },
    site: { altitudeM, pollution: null },
  };
  const calculation = new Calculation(true);
  const situation = readSituation(input, calculation);
  const row = assessInsulationLevel({ highestVoltageKv, basis: 'iec', level }, new Calculation(false));
  const result = assessClearances(
    { situation, level: row, clearance, givenHighestVoltageKv: highestVoltageKv },
    calculation,
  );
  return { ...result, calculation, codes: calculation.cautions.map(({ code }) => code) };
}

const range2 = (given: Case): Case => ({ powerFrequencyKv: null, ...given });
const shapes = (
  shapePhaseToEarth: ClearanceInput['shapePhaseToEarth'],
  shapePhaseToPhase: ClearanceInput['shapePhaseToPhase'],
) => ({
  method: 'iec-table' as const,
  shapePhaseToEarth,
  shapePhaseToPhase,
});
const RODS = shapes('rod-structure', 'rod-conductor');
const CONDUCTORS = shapes('conductor-structure', 'conductor-conductor');
const EN = { method: 'en-empirical' } as const;
const rowOf = (rows: readonly ClearanceRow[], asked: Partial<ClearanceRow>): ClearanceRow => {
  const found = rows.filter((row) =>
    Object.entries(asked).every(([key, value]) => row[key as keyof ClearanceRow] === value),
  );
  if (found.length !== 1) throw new Error(`${found.length} rows for ${JSON.stringify(asked)}`);
  return found[0] as ClearanceRow;
};

describe('the table method, range I', () => {
  /** RD 337/2014 (Spain), ITC-RAT 12, Tables 1 and 2, read in print. */
  it.each([
    [24, 125, 50, 220],
    [36, 170, 70, 320],
    [72.5, 325, 140, 630],
    [123, 550, 230, 1100],
    [145, 650, 275, 1300],
    [170, 750, 325, 1500],
    [245, 1050, 460, 2100],
  ])(
    'at %d kV and %d kV lightning is printed as in RD 337/2014 ITC-RAT 12',
    (highestVoltageKv, lightningKv, powerFrequencyKv, printedMm) => {
      const { phaseToEarthMm, phaseToPhaseMm } = assess({
        highestVoltageKv,
        lightningKv,
        powerFrequencyKv,
        clearance: RODS,
      });
      expect(phaseToEarthMm).toBe(printedMm);
      expect(phaseToPhaseMm).toBe(printedMm);
    },
  );

  it('corrects the voltage above 1000 m and reads between rows: 1050 kV at 2310 m asks for 1233 kV and 2470 mm', () => {
    const { phaseToEarthMm, rows } = assess({ altitudeM: 2310, clearance: RODS });
    const row = rowOf(rows, { method: 'iec-table', distance: 'phase-to-earth' });
    expect(row.withstandKv).toBeCloseTo(1233.1, 1);
    expect(row).toMatchObject({ interpolated: true, withinSource: true, h0M: 1000, exponent: 1 });
    expect(row.altitudeFactor).toBeCloseTo(Math.exp(1310 / 8150), 12);
    expect(phaseToEarthMm).toBe(2470);
  });

  it('corrects nothing up to the altitude that the level holds for', () => {
    expect(assess({ altitudeM: 2310, holdsToM: 2310, clearance: RODS }).phaseToEarthMm).toBe(2100);
    expect(assess({ altitudeM: 0, clearance: RODS }).phaseToEarthMm).toBe(2100);
  });

  it('takes both shapes where clearance is left out, and the larger', () => {
    const { method, phaseToEarthMm, rows, codes } = assess({});
    expect(method).toBe('iec-table');
    expect(phaseToEarthMm).toBe(2100);
    expect(rowOf(rows, { shape: 'conductor-structure' })).toMatchObject({ valueMm: 1900, governs: false });
    expect(codes).toContain('shape-not-chosen-phase-to-earth');
  });

  it('only notes an open shape where one figure serves both', () => {
    const { calculation } = assess({ highestVoltageKv: 145, lightningKv: 650, powerFrequencyKv: 275 });
    expect(calculation.cautions.find(({ code }) => code === 'shape-not-chosen-phase-to-earth')?.severity).toBe('info');
  });

  it('reads a conductor shape between the last single figure and the first pair', () => {
    const { rows } = assess({
      highestVoltageKv: 170,
      lightningKv: 750,
      powerFrequencyKv: 325,
      altitudeM: 1500,
      clearance: CONDUCTORS,
    });
    const row = rowOf(rows, { method: 'iec-table', distance: 'phase-to-earth' });
    const correctedKv = 750 * Math.exp(500 / 8150);
    expect(row.valueMm).toBe(Math.ceil((1500 + correctedKv - 750) / 10) * 10);
  });
});

describe('the table method, range II', () => {
  /** RD 337/2014 (Spain), ITC-RAT 12, Table 3: every 420 kV row, read in print. */
  it.each([
    [850, 1.6, 1050, 1900, 2400, 2900, 3400],
    [850, 1.6, 1175, 2200, 2400, 2900, 3400],
    [950, 1.5, 1175, 2200, 2900, 3100, 3600],
    [950, 1.5, 1300, 2400, 2900, 3100, 3600],
    [1050, 1.5, 1300, 2600, 3400, 3600, 4200],
    [1050, 1.5, 1425, 2600, 3400, 3600, 4200],
  ])(
    'at 420 kV with %d kV x %d and %d kV is printed as in RD 337/2014 ITC-RAT 12 Table 3',
    (switchingKv, ratio, lightningKv, conductorMm, rodMm, conductorsMm, rodConductorMm) => {
      const level = range2({ highestVoltageKv: 420, switchingKv, ratio, lightningKv });
      expect(assess({ ...level, clearance: CONDUCTORS })).toMatchObject({
        phaseToEarthMm: conductorMm,
        phaseToPhaseMm: conductorsMm,
      });
      expect(assess({ ...level, clearance: RODS })).toMatchObject({
        phaseToEarthMm: rodMm,
        phaseToPhaseMm: rodConductorMm,
      });
    },
  );

  it('repeats the 765 kV clearances of the Indian CEA guidelines, clause 4.1(i)', () => {
    const level = range2({ highestVoltageKv: 800, switchingKv: 1550, ratio: 1.6, lightningKv: 2100 });
    expect(assess({ ...level, clearance: CONDUCTORS })).toMatchObject({ phaseToEarthMm: 4900, phaseToPhaseMm: 7600 });
    expect(assess({ ...level, clearance: RODS })).toMatchObject({ phaseToEarthMm: 6400, phaseToPhaseMm: 9400 });
  });

  it('corrects switching to earth with 0.75 and between phases with 1', () => {
    const { rows } = assess(
      range2({
        highestVoltageKv: 420,
        switchingKv: 1050,
        ratio: 1.5,
        lightningKv: 1425,
        altitudeM: 2000,
        clearance: RODS,
      }),
    );
    const earth = rowOf(rows, { stress: 'switching', distance: 'phase-to-earth' });
    const phase = rowOf(rows, { stress: 'switching', distance: 'phase-to-phase' });
    expect(earth.withstandKv).toBeCloseTo(1050 * Math.exp(750 / 8150), 9);
    expect(phase.withstandKv).toBeCloseTo(1575 * Math.exp(1000 / 8150), 9);
    expect(earth.governs).toBe(true);
  });

  it('has no figure above the last row and says at which field', () => {
    const level = range2({ highestVoltageKv: 1200, switchingKv: 1950, ratio: 1.6, lightningKv: 2700, altitudeM: 2000 });
    const { phaseToEarthMm, phaseToPhaseMm, rows, calculation } = assess({ ...level, clearance: RODS });
    expect([phaseToEarthMm, phaseToPhaseMm]).toEqual([null, null]);
    expect(rows.filter(({ method }) => method === 'iec-table').every(({ governs }) => !governs)).toBe(true);
    expect(calculation.cautions).toContainEqual(
      expect.objectContaining({ code: 'clearance-outside-table', severity: 'stop', field: 'site.altitudeM' }),
    );
  });

  it('is not assessed without the switching level', () => {
    const { phaseToEarthMm, calculation } = assess(
      range2({ highestVoltageKv: 420, lightningKv: 1425, clearance: RODS }),
    );
    expect(phaseToEarthMm).toBeNull();
    expect(calculation.notAssessed).toContainEqual({
      part: 'clearances.phaseToEarthMm',
      why: 'The switching level is not known.',
    });
  });

  it('knows a distance between phases only as well as the ratio of its level', () => {
    const { rows } = assess(
      range2({ highestVoltageKv: 550, switchingKv: 1175, ratio: 1.5, lightningKv: 1550, clearance: RODS }),
    );
    expect(rowOf(rows, { stress: 'switching', distance: 'phase-to-phase' }).source.status).toBe('memory');
  });
});

describe('the empirical method of EN 50341-1', () => {
  /** RD 223/2008 (Spain), ITC-LAT 07, Table 15, read in print. */
  it.each([
    [72.5, 325, 140, 700, 800],
    [145, 650, 275, 1200, 1400],
    [245, 1050, 460, 1700, 2000],
  ])(
    'at %d kV is printed as in RD 223/2008 ITC-LAT 07 Table 15, from sea level to 1000 m',
    (highestVoltageKv, lightningKv, powerFrequencyKv, delMm, dppMm) => {
      for (const altitudeM of [0, 1000]) {
        const found = assess({ highestVoltageKv, lightningKv, powerFrequencyKv, altitudeM, clearance: EN });
        expect(found).toMatchObject({ method: 'en-empirical', phaseToEarthMm: delMm, phaseToPhaseMm: dppMm });
      }
    },
  );

  it('keeps 0.20 m to earth at the lowest voltages', () => {
    const { phaseToEarthMm, rows } = assess({
      highestVoltageKv: 7.2,
      lightningKv: 60,
      powerFrequencyKv: 20,
      clearance: EN,
    });
    expect(phaseToEarthMm).toBe(200);
    expect(rowOf(rows, { stress: 'Del' }).source.document).toContain('RD 223/2008');
  });

  it('multiplies the distance in range I above 1000 m, by the column of the lightning level', () => {
    const { rows, phaseToEarthMm } = assess({ altitudeM: 2000, clearance: EN });
    const del = rowOf(rows, { stress: 'Del' });
    expect(del.altitudeFactor).toBeCloseTo(0.97 / 0.923, 12);
    expect(phaseToEarthMm).toBe(Math.ceil((1700 * 0.97) / 0.923 / 10) * 10);
  });

  it('turns the distance into a voltage and back in range II above 1000 m', () => {
    const { rows } = assess(
      range2({
        highestVoltageKv: 420,
        switchingKv: 1050,
        ratio: 1.5,
        lightningKv: 1425,
        altitudeM: 2000,
        clearance: EN,
      }),
    );
    const del = rowOf(rows, { stress: 'Del' });
    const voltageKv = 1080 * 0.922 * 1.45 * Math.log(1 + 0.46 * 2.8);
    expect(del.withstandKv).toBeCloseTo(voltageKv, 9);
    const atSiteM = (Math.exp((voltageKv * (0.978 / 0.938)) / (1080 * 0.922 * 1.45)) - 1) / 0.46;
    expect(del.valueMm).toBe(Math.ceil(atSiteM * 100) * 10);
    expect(del.valueMm).toBeGreaterThan(2800 * (0.978 / 0.938));
  });

  it('has no figure above 3000 m, while the tables of IEC 60071-1 still have', () => {
    const { phaseToEarthMm, rows, calculation } = assess({ altitudeM: 3200, clearance: EN });
    expect(phaseToEarthMm).toBeNull();
    expect(rowOf(rows, { stress: 'Del' })).toMatchObject({ valueMm: null, withinSource: false, governs: false });
    expect(calculation.cautions).toContainEqual(
      expect.objectContaining({ code: 'clearance-beyond-source', severity: 'stop', field: 'site.altitudeM' }),
    );
    const beside = assess({ altitudeM: 3200, clearance: RODS });
    expect(beside.phaseToEarthMm).toBeGreaterThan(2100);
    expect(beside.codes).not.toContain('clearance-beyond-source');
  });

  it('is linear between two voltages with a caution, and has no figure at 800 kV', () => {
    const between = assess({ highestVoltageKv: 200, lightningKv: null, powerFrequencyKv: null, clearance: EN });
    expect(between.phaseToEarthMm).toBe(1460);
    expect(between.codes).toContain('clearance-interpolated');
    const above = assess(
      range2({ highestVoltageKv: 800, switchingKv: 1550, ratio: 1.6, lightningKv: 2100, clearance: EN }),
    );
    expect(above.phaseToEarthMm).toBeNull();
    expect(above.codes).toContain('clearance-outside-table');
  });

  it('reads 525 kV as the table prints it', () => {
    const level = range2({ highestVoltageKv: 525, switchingKv: 1175, ratio: 1.5, lightningKv: 1550 });
    expect(assess({ ...level, clearance: EN })).toMatchObject({ phaseToEarthMm: 3500, phaseToPhaseMm: 4000 });
  });

  it('shows the power-frequency distances beside, but not to earth where an earth fault may stand', () => {
    const cleared = assess({ clearance: EN });
    expect(rowOf(cleared.rows, { stress: 'power-frequency', distance: 'phase-to-earth' })).toMatchObject({
      valueMm: 430,
      governs: false,
    });
    expect(rowOf(cleared.rows, { stress: 'power-frequency', distance: 'phase-to-phase' }).valueMm).toBe(690);
    const sustained = assess({ clearance: EN, earthFault: 'sustained' });
    expect(sustained.rows.some((row) => row.stress === 'power-frequency' && row.distance === 'phase-to-earth')).toBe(
      false,
    );
    expect(sustained.calculation.notAssessed.map(({ part }) => part)).toContain(
      'clearances.powerFrequencyPhaseToEarth',
    );
  });
});

describe('one method fills the headline', () => {
  it('keeps the rows of the other method beside it, none of them governing', () => {
    const { rows } = assess({ clearance: EN });
    expect(rows[0]?.method).toBe('en-empirical');
    expect(rows.filter(({ method }) => method === 'iec-table').length).toBeGreaterThan(0);
    expect(rows.filter(({ governs }) => governs).every(({ method }) => method === 'en-empirical')).toBe(true);
  });

  it('waits for the choice of the method, the altitude, the voltage and the level', () => {
    expect(assess({ clearance: { method: null } })).toMatchObject({ method: null, phaseToEarthMm: null });
    expect(assess({ altitudeM: null })).toMatchObject({ phaseToEarthMm: null, rows: [] });
    expect(assess({ highestVoltageKv: null })).toMatchObject({ phaseToEarthMm: null, rows: [] });
    expect(assess({ lightningKv: null, powerFrequencyKv: null }).phaseToEarthMm).toBeNull();
    expect(assess({ altitudeM: 6000 })).toMatchObject({ phaseToEarthMm: null, rows: [] });
  });

  it('shows how each distance came about', () => {
    const { calculation } = assess({ altitudeM: 2310, clearance: RODS });
    const ids = calculation.lines.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids).toContain('clearances.phaseToEarthMm');
    expect(ids).toContain('clearances.row:iec-table:phase-to-earth:lightning:rod-structure');
  });
});

describe('properties', () => {
  const METHODS = [RODS, CONDUCTORS, EN, undefined];
  const LEVELS: Case[] = [
    { highestVoltageKv: 72.5, lightningKv: 325, powerFrequencyKv: 140 },
    { highestVoltageKv: 145, lightningKv: 650, powerFrequencyKv: 275 },
    { highestVoltageKv: 245, lightningKv: 1050, powerFrequencyKv: 460 },
    range2({ highestVoltageKv: 420, switchingKv: 1050, ratio: 1.5, lightningKv: 1425 }),
    range2({ highestVoltageKv: 550, switchingKv: 1175, ratio: 1.5, lightningKv: 1550 }),
  ];

  it('a higher site never shortens a distance', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...LEVELS),
        fc.constantFrom(...METHODS),
        fc.integer({ min: 0, max: 3000 }),
        fc.integer({ min: 0, max: 3000 }),
        (level, clearance, oneM, otherM) => {
          const lower = assess({ ...level, clearance, altitudeM: Math.min(oneM, otherM) });
          const higher = assess({ ...level, clearance, altitudeM: Math.max(oneM, otherM) });
          expect(higher.phaseToEarthMm as number).toBeGreaterThanOrEqual(lower.phaseToEarthMm as number);
          expect(higher.phaseToPhaseMm as number).toBeGreaterThanOrEqual(lower.phaseToPhaseMm as number);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('a higher level never shortens a distance of the tables', () => {
    const steps: [number, number][] = [
      [275, 650],
      [325, 750],
      [360, 850],
      [395, 950],
      [460, 1050],
    ];
    for (const clearance of [RODS, CONDUCTORS]) {
      for (const altitudeM of [0, 1500, 4500]) {
        const distances = steps.map(
          ([powerFrequencyKv, lightningKv]) =>
            assess({ powerFrequencyKv, lightningKv, altitudeM, clearance }).phaseToEarthMm as number,
        );
        expect(distances).toEqual([...distances].sort((one, other) => one - other));
      }
    }
  });
});

describe('a method beside the chosen one', () => {
  const whyOf = (given: Case, method: string): string[] =>
    (assess(given).besideWhyNot ?? []).flatMap((one) => (one.method === method ? [`${one.distance}: ${one.why}`] : []));

  it('says why it has no figure, distance by distance, and is never silent', () => {
    const nothing = 'Neither the kind of gap nor the source of the fast-front voltage is chosen.';
    expect(whyOf({}, 'en-theoretical')).toEqual([`phase-to-earth: ${nothing}`, `phase-to-phase: ${nothing}`]);
    expect(whyOf({}, 'north-american')).toEqual([
      'phase-to-earth: These distances are for the North American basis only.',
      'phase-to-phase: These distances are for the North American basis only.',
    ]);
    expect(whyOf({}, 'iec-table')).toEqual([]);
    expect(whyOf({ clearance: { method: 'en-empirical' }, lightningKv: null }, 'iec-table')).toEqual([
      'phase-to-earth: The lightning level is not known.',
      'phase-to-phase: The lightning level is not known.',
    ]);
  });

  it('has a figure or a reason for each distance, whatever is chosen', () => {
    const aCase = fc.record({
      highestVoltageKv: fc.constantFrom(null, 72.5, 245, 362, 420, 1100),
      altitudeM: fc.constantFrom(null, 0, 1500, 3200, 4800),
      lightningKv: fc.constantFrom(null, 325, 1050, 1425),
      switchingKv: fc.constantFrom(null, 950, 1050),
      clearance: fc.constantFrom(
        null,
        ...(['iec-table', 'en-empirical', 'en-theoretical', 'north-american', null] as const).map((method) => ({
          method,
          fastFrontFrom: 'level' as const,
        })),
      ),
    });
    fc.assert(
      fc.property(aCase, (given) => {
        const { method, rows, besideWhyNot = [] } = assess(given);
        for (const { why } of besideWhyNot) expect(why).not.toBe('');
        for (const other of ['iec-table', 'en-empirical', 'en-theoretical', 'north-american'] as const) {
          for (const distance of ['phase-to-earth', 'phase-to-phase'] as const) {
            const said = besideWhyNot.some((one) => one.method === other && one.distance === distance);
            const has = rows.some((row) => row.method === other && row.distance === distance && row.valueMm !== null);
            if (other === method) expect(said).toBe(false);
            else expect([other, distance, said || has]).toEqual([other, distance, true]);
          }
        }
      }),
    );
  });
});

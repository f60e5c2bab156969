import {
  DEVIATION_FACTORS,
  lineGapFactor,
  POWER_FREQUENCY_CONSTANTS,
  powerFrequencyDistance,
  powerFrequencyGapFactor,
} from '../../src/engine/air-gaps';
import { lineAltitudeFactor } from '../../src/engine/atmosphere';
import {
  ANSI_C29_2_UNITS,
  C37_30_ALTITUDE,
  C37_32_BUS_CLEARANCES,
  EN_50341_1_CLEARANCES,
  IEC_60071_1_RANGE_I,
  IEC_60071_1_RANGE_II,
  IEC_60071_1_TABLE_A1,
  IEC_60071_1_TABLE_A2,
  IEC_60071_1_TABLE_A3,
  IEC_61936_1_CLEARANCES,
  IEC_TS_60815_USCD,
  RUS_SUSPENSION_LEVELS,
  STRING_FLASHOVER_254X146,
} from '../../src/engine/standards';
import { Calculation } from '../../src/engine/trace';

/** A row that has to be there. */
function one<Row>(rows: readonly Row[], isAsked: (row: Row) => boolean): Row {
  const found = rows.filter(isAsked);
  if (found.length !== 1) throw new Error(`${found.length} rows instead of one`);
  return found[0] as Row;
}
const a1 = (lightningKv: number) => one(IEC_60071_1_TABLE_A1.rows, (row) => row.lightningKv === lightningKv);
const a2 = (switchingKv: number) => one(IEC_60071_1_TABLE_A2.rows, (row) => row.switchingKv === switchingKv);

describe('cross-check: N of IEC 61936-1 (Tables 1 and 2) against Tables A.1 to A.3 of IEC 60071-1', () => {
  const rangeI = IEC_61936_1_CLEARANCES.rows.filter(({ range }) => range === 'I');
  const rangeII = IEC_61936_1_CLEARANCES.rows.filter(({ range }) => range === 'II');
  /** Least outdoor clearances of installations, RD 337/2014 ITC-RAT 12 Table 1: they are not figures of Table A.1. */
  const OUTDOOR_MINIMA_MM = new Map([
    [3.6, 120],
    [7.2, 120],
    [12, 150],
    [17.5, 160],
    [24, 160],
  ]);

  it.each(rangeI.map((row) => [row.highestVoltagesKv[0], row.lightningKv[0], row] as const))(
    'range I, %d kV with %d kV lightning',
    (highestVoltageKv, lightningKv, row) => {
      const printedMm = a1(lightningKv as number).rodStructureMm;
      expect(row.indoorMm).toBe(printedMm);
      expect(row.outdoorMm).toBe(Math.max(printedMm, OUTDOOR_MINIMA_MM.get(highestVoltageKv as number) ?? 0));
    },
  );

  it.each(rangeII.map((row) => [row.highestVoltagesKv.join('/'), row.switchingKv, row] as const))(
    'range II, %s kV with %d kV switching: the larger of lightning and switching, by shape',
    (_highestVoltagesKv, switchingKv, row) => {
      const switching = a2(switchingKv as number);
      row.lightningKv.forEach((lightningKv, index) => {
        const lightning = a1(lightningKv);
        const conductorMm = Math.max(lightning.conductorStructureMm as number, switching.conductorStructureMm);
        const printed = row.conductorStructureMm as number[];
        expect(printed[index] ?? printed[0]).toBe(conductorMm);
        expect(row.rodStructureMm).toBe(Math.max(lightning.rodStructureMm, switching.rodStructureMm));
      });
      const phases = one(
        IEC_60071_1_TABLE_A3.rows,
        ({ switchingPhaseToPhaseKv }) => switchingPhaseToPhaseKv === row.switchingPhaseToPhaseKv,
      );
      expect([row.conductorConductorMm, row.rodConductorMm]).toEqual([
        phases.conductorConductorMm,
        phases.rodConductorMm,
      ]);
    },
  );
});

describe('cross-check: within IEC 60071-1', () => {
  it('Table A.1 rod-structure is 500 kV per metre from 450 kV upward', () => {
    const rows = IEC_60071_1_TABLE_A1.rows.filter(({ lightningKv }) => lightningKv >= 450);
    expect(rows).toHaveLength(19);
    for (const { lightningKv, rodStructureMm } of rows) expect(rodStructureMm).toBe(lightningKv * 2);
  });

  it('every level has its distances in Tables A.1 to A.3', () => {
    for (const { lightningKv } of IEC_60071_1_RANGE_I.rows) expect(a1(lightningKv).rodStructureMm).toBeGreaterThan(0);
    for (const { lightningKv, switchingKv, switchingPhaseToPhaseKv } of IEC_60071_1_RANGE_II.rows) {
      expect(a1(lightningKv).rodStructureMm).toBeGreaterThan(0);
      expect(a2(switchingKv).rodStructureMm).toBeGreaterThan(0);
      const phases = IEC_60071_1_TABLE_A3.rows.filter((row) => row.switchingPhaseToPhaseKv === switchingPhaseToPhaseKv);
      expect(phases).toHaveLength(1);
    }
  });

  it('distances grow with the voltage in every column', () => {
    const columns = [
      IEC_60071_1_TABLE_A1.rows.map(({ rodStructureMm }) => rodStructureMm),
      IEC_60071_1_TABLE_A1.rows.map((row) => row.conductorStructureMm ?? row.rodStructureMm),
      IEC_60071_1_TABLE_A2.rows.map(({ rodStructureMm }) => rodStructureMm),
      IEC_60071_1_TABLE_A2.rows.map(({ conductorStructureMm }) => conductorStructureMm),
      ...[
        ...[...IEC_60071_1_TABLE_A3.rows].sort((x, y) => x.switchingPhaseToPhaseKv - y.switchingPhaseToPhaseKv),
      ].reduce(
        ([conductors, rods], row) => [
          [...(conductors ?? []), row.conductorConductorMm],
          [...(rods ?? []), row.rodConductorMm],
        ],
        [[], []] as number[][],
      ),
    ];
    for (const column of columns) expect(column).toEqual([...column].sort((x, y) => x - y));
  });
});

describe('cross-check: power-frequency distances of EN 50341-1, table against the formula of Annex E at 1000 m', () => {
  const rows = EN_50341_1_CLEARANCES.rows.filter(({ d50HzPhaseToEarthM }) => d50HzPhaseToEarthM !== null);
  const byFormulaM = (highestVoltageKv: number, gap: 'structure' | 'phase-to-phase'): number => {
    const acrossKv = gap === 'structure' ? highestVoltageKv / Math.sqrt(3) : highestVoltageKv;
    const { factor } = lineAltitudeFactor(
      { altitudeM: 1000, gapKvPeak: acrossKv * Math.SQRT2, use: 'cross-check' },
      new Calculation(false),
    );
    return powerFrequencyDistance({
      highestVoltageKv,
      strengthConstantKv:
        gap === 'structure' ? POWER_FREQUENCY_CONSTANTS.phaseToEarth : POWER_FREQUENCY_CONSTANTS.phaseToPhase,
      lineAltitudeFactor: factor as number,
      deviationFactor: DEVIATION_FACTORS.powerFrequency,
      powerFrequencyGapFactor: powerFrequencyGapFactor({ gapFactor: lineGapFactor(gap) }),
    });
  };

  it('covers twelve voltages', () => expect(rows).toHaveLength(12));

  it.each(rows.map((row) => [row.highestVoltageKv, row] as const))(
    '%d kV gives the tabulated figures, rounded to 0.01 m',
    (voltageKv, row) => {
      expect(byFormulaM(voltageKv, 'structure').toFixed(2)).toBe((row.d50HzPhaseToEarthM as number).toFixed(2));
      expect(byFormulaM(voltageKv, 'phase-to-phase').toFixed(2)).toBe((row.d50HzPhaseToPhaseM as number).toFixed(2));
    },
  );
});

describe('cross-check: creepage, 1986 against 2008', () => {
  it.each(IEC_TS_60815_USCD.rows.map((row) => [row.pollutionClass, row] as const))(
    'class %s is the 1986 figure times root 3, within the rounding of the print (0.1)',
    (_class, { uscdMmPerKv, scd1986MmPerKvUm }) => {
      expect(Math.abs(scd1986MmPerKvUm * Math.sqrt(3) - uscdMmPerKv)).toBeLessThan(0.1);
    },
  );
});

describe('cross-check: North American tables', () => {
  /** ANSI C37.32-1996 Table 5, read a second time in print. */
  it.each([
    [72.5, 350, [31, 25, 29, 60]],
    [362, 1300, [110, 104, 106, 174]],
  ] as const)('%d kV with %d kV BIL is as ANSI C37.32-1996 Table 5 prints it', (voltageKv, bilKv, printedIn) => {
    const row = one(
      C37_32_BUS_CLEARANCES.rows,
      (candidate) => candidate.ratedMaximumVoltageKv === voltageKv && candidate.bilKv === bilKv,
    );
    expect([row.metalToMetalIn, row.groundMinimumIn, row.groundRecommendedIn, row.phaseSpacingIn]).toEqual(printedIn);
  });

  it('the millimetres of ANSI C37.32-1996 Table 5 are its inches, within 1 mm', () => {
    for (const row of C37_32_BUS_CLEARANCES.rows) {
      const pairs = [
        [row.metalToMetalIn, row.metalToMetalMm],
        [row.groundMinimumIn, row.groundMinimumMm],
        [row.groundRecommendedIn, row.groundRecommendedMm],
        [row.phaseSpacingIn, row.phaseSpacingMm],
      ];
      for (const [inches, mm] of pairs) {
        if (inches === null || mm === null) expect(inches).toBe(mm);
        else expect(Math.abs((inches as number) * 25.4 - (mm as number))).toBeLessThan(1);
      }
    }
  });

  it('each suspension level is the multi-unit flashover of its units, with 11.5 in of leakage a unit', () => {
    for (const row of RUS_SUSPENSION_LEVELS.rows) {
      const string = one(STRING_FLASHOVER_254X146.rows, ({ units }) => units === row.units);
      expect(row).toMatchObject({
        dryKvRms: string.dryKvRms,
        wetKvRms: string.wetKvRms,
        impulsePositiveKvPeak: string.impulsePositiveKvPeak,
        impulseNegativeKvPeak: string.impulseNegativeKvPeak,
      });
      expect(row.leakageIn).toBe(11.5 * row.units);
      expect(Math.abs(row.leakageFt - row.leakageIn / 12)).toBeLessThan(0.006);
    }
  });

  it('one unit of class 52-3 flashes over as one unit of the multi-unit table', () => {
    const unit = one(ANSI_C29_2_UNITS.rows, ({ ansiClass }) => ansiClass === '52-3');
    const string = one(STRING_FLASHOVER_254X146.rows, ({ units }) => units === 1);
    expect([unit.dryFlashoverKv, unit.wetFlashoverKv, unit.impulsePositiveKv, unit.impulseNegativeKv]).toEqual([
      string.dryKvRms,
      string.wetKvRms,
      string.impulsePositiveKvPeak,
      string.impulseNegativeKvPeak,
    ]);
  });

  it('the altitude factor agrees with the second source within 0.02 up to 3000 m', () => {
    const rows = C37_30_ALTITUDE.rows.filter(({ secondSourceFactor }) => secondSourceFactor !== null);
    expect(rows).toHaveLength(3);
    for (const { dielectricFactor, secondSourceFactor } of rows) {
      expect(Math.abs(dielectricFactor - (secondSourceFactor as number))).toBeLessThanOrEqual(0.02 + 1e-9);
    }
  });
});

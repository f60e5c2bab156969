import type { CompanyInsulationLevel, InsulationLevelInput } from './model';
import {
  assessInsulationLevel,
  insulationLevelsFor,
  matchInsulationLevel,
  switchingBetweenPhases,
} from './overvoltage';
import { IEC_60071_1_RANGE_II } from './standards';
import { Calculation } from './trace';

const level = (given: Partial<InsulationLevelInput>): InsulationLevelInput => ({
  lightningKv: null,
  switchingKv: null,
  powerFrequencyKv: null,
  switchingPhaseRatio: null,
  ...given,
});
const COMPANY: CompanyInsulationLevel = {
  highestVoltageKv: 245,
  powerFrequencyKv: 480,
  switchingKv: null,
  switchingPhaseRatio: null,
  lightningKv: 1175,
  reason: 'Lines without a shield wire',
};
const assess = (highestVoltageKv: number | null, given: Partial<InsulationLevelInput> | null) => {
  const calculation = new Calculation(true);
  const row = assessInsulationLevel(
    { highestVoltageKv, basis: 'iec', level: given === null ? null : level(given) },
    calculation,
  );
  return { row, codes: calculation.cautions.map(({ code, severity }) => `${severity} ${code}`), calculation };
};

describe('the rows that a system can choose from', () => {
  it('are those of its highest voltage in IEC 60071-1 Table 2', () => {
    const rows = insulationLevelsFor(245, 'iec');
    expect(rows.map(({ powerFrequencyKv, lightningKv }) => [powerFrequencyKv, lightningKv])).toEqual([
      [275, 650],
      [325, 750],
      [360, 850],
      [395, 950],
      [460, 1050],
    ]);
    expect(rows.map(({ bracketed }) => bracketed)).toEqual([true, true, false, false, false]);
  });

  it('are those of IEC 60071-1 Table 3 above 245 kV', () => {
    expect(
      insulationLevelsFor(420, 'iec').map((row) => [row.switchingKv, row.switchingPhaseRatio, row.lightningKv]),
    ).toEqual([
      [850, 1.6, 1050],
      [850, 1.6, 1175],
      [950, 1.5, 1175],
      [950, 1.5, 1300],
      [1050, 1.5, 1300],
      [1050, 1.5, 1425],
    ]);
  });

  it('read 525 as 550 and 765 as 800', () => {
    expect(insulationLevelsFor(525, 'iec')).toEqual(insulationLevelsFor(550, 'iec'));
    expect(insulationLevelsFor(765, 'iec')).toEqual(insulationLevelsFor(800, 'iec'));
  });

  it('carry the company rows with their reason after the printed ones', () => {
    const rows = insulationLevelsFor(245, 'iec', [COMPANY]);
    expect(rows).toHaveLength(6);
    expect(rows.at(-1)).toMatchObject({ lightningKv: 1175, reason: COMPANY.reason, source: { status: 'practice' } });
    expect(insulationLevelsFor(145, 'iec', [COMPANY])).toHaveLength(3);
  });

  it('are all rows where the voltage is not known, and none where it is in no table or the basis is not chosen', () => {
    expect(insulationLevelsFor(null, 'iec')).toHaveLength(71);
    expect(insulationLevelsFor(150, 'iec')).toEqual([]);
    expect(insulationLevelsFor(245, null)).toEqual([]);
    expect(insulationLevelsFor(undefined, undefined)).toEqual([]);
  });

  it('are the BIL of ANSI C37.32-1996 Table 5 on the North American basis', () => {
    expect(insulationLevelsFor(242, 'north-american').map(({ lightningKv }) => lightningKv)).toEqual([
      550, 650, 750, 900, 1050,
    ]);
    expect(insulationLevelsFor(169, 'north-american').map(({ lightningKv }) => lightningKv)).toEqual([
      450, 550, 650, 750,
    ]);
    expect(insulationLevelsFor(245, 'north-american')).toEqual([]);
  });

  it('take the next higher rated voltage where a maximum operating voltage has no BIL of its own', () => {
    expect(insulationLevelsFor(36.2, 'north-american')).toMatchObject([{ highestVoltageKv: 36.2, lightningKv: 200 }]);
  });
});

describe('a level is one row, chosen as a whole', () => {
  const match = (highestVoltageKv: number, given: Partial<InsulationLevelInput>) =>
    matchInsulationLevel({ highestVoltageKv, basis: 'iec', level: level(given) });

  it('finds the row', () => {
    expect(match(245, { lightningKv: 1050, powerFrequencyKv: 460 })).toMatchObject({
      found: 'row',
      row: { lightningKv: 1050 },
    });
    expect(match(525, { lightningKv: 1550, switchingKv: 1175, switchingPhaseRatio: 1.5 })).toMatchObject({
      found: 'row',
    });
  });

  it('refuses figures that stand in different rows, and says which rows there are', () => {
    expect(match(245, { lightningKv: 1050, powerFrequencyKv: 395 })).toEqual({
      found: 'no-row',
      text: expect.stringContaining('275/650, 325/750, 360/850, 395/950, 460/1050'),
    });
    expect(match(420, { lightningKv: 1425, switchingKv: 850, switchingPhaseRatio: 1.6 }).found).toBe('no-row');
    expect(match(245, { lightningKv: 1050, powerFrequencyKv: 460, switchingKv: 850 }).found).toBe('no-row');
  });

  it('refuses a level at a voltage that has none', () => {
    expect(match(150, { lightningKv: 650, powerFrequencyKv: 275 })).toEqual({
      found: 'no-row',
      text: expect.stringContaining('150 kV'),
    });
  });

  it('waits for what is missing', () => {
    expect(match(245, { lightningKv: 1050 }).found).toBe('incomplete');
    expect(match(245, {}).found).toBe('incomplete');
    expect(matchInsulationLevel({ highestVoltageKv: null, basis: 'iec', level: level({ lightningKv: 3 }) }).found).toBe(
      'incomplete',
    );
    expect(matchInsulationLevel({ highestVoltageKv: 245, basis: 'iec', level: undefined }).found).toBe('incomplete');
  });

  it('leaves switching and power frequency open on the North American basis', () => {
    const choice = { highestVoltageKv: 242, basis: 'north-american' } as const;
    expect(matchInsulationLevel({ ...choice, level: level({ lightningKv: 900 }) }).found).toBe('row');
    expect(matchInsulationLevel({ ...choice, level: level({ lightningKv: 900, powerFrequencyKv: 395 }) }).found).toBe(
      'row',
    );
    expect(matchInsulationLevel({ ...choice, level: level({ lightningKv: 950 }) }).found).toBe('no-row');
  });

  it('takes a company row', () => {
    const given = level({ lightningKv: 1175, powerFrequencyKv: 480 });
    const choice = { highestVoltageKv: 245, basis: 'iec', level: given } as const;
    expect(matchInsulationLevel(choice).found).toBe('no-row');
    expect(matchInsulationLevel({ ...choice, companyLevels: [COMPANY] }).found).toBe('row');
  });
});

describe('what has to be said about a level', () => {
  it('says nothing about the highest row of a voltage', () => {
    const { row, codes, calculation } = assess(245, { lightningKv: 1050, powerFrequencyKv: 460 });
    expect(row).toMatchObject({ lightningKv: 1050, source: { status: 'seen', clause: 'Table 2' } });
    expect(codes).toEqual([]);
    expect(calculation.lines).toMatchObject([{ id: 'overvoltage.insulation-level', result: '460/1050' }]);
    expect(calculation.restsOnMemory).toBe(false);
  });

  it('names the arresters that a lower row assumes', () => {
    expect(assess(245, { lightningKv: 950, powerFrequencyKv: 395 }).codes).toEqual(['info level-below-highest']);
  });

  it('cautions for a bracketed row', () => {
    expect(assess(145, { lightningKv: 450, powerFrequencyKv: 185 }).codes).toEqual([
      'caution level-bracketed',
      'info level-below-highest',
    ]);
  });

  it('stops at a combination that is no row', () => {
    const { row, codes } = assess(245, { lightningKv: 1050, powerFrequencyKv: 395 });
    expect(row).toBeNull();
    expect(codes).toEqual(['stop level-no-row']);
  });

  it('is silent about what is not filled in', () => {
    expect(assess(245, null)).toMatchObject({ row: null, codes: [] });
    expect(assess(null, { lightningKv: 1050 })).toMatchObject({ row: null, codes: [] });
  });

  it('knows a row only as well as its least known column', () => {
    const { row, calculation } = assess(362, { lightningKv: 1175, switchingKv: 950, switchingPhaseRatio: 1.5 });
    expect(row?.source.status).toBe('memory');
    expect(calculation.restsOnMemory).toBe(true);
  });
});

describe('the switching withstand between phases', () => {
  it('is that of every printed row', () => {
    for (const row of IEC_60071_1_RANGE_II.rows) {
      expect(
        switchingBetweenPhases({ switchingKvPeak: row.switchingKv, switchingPhaseRatio: row.switchingPhaseRatio }),
      ).toBe(row.switchingPhaseToPhaseKv);
    }
  });
});

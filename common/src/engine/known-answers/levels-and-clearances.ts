import { evaluate } from '../evaluate';
import type { ClearancesResult, InsulationLevelInput, ShapePhaseToEarth, ShapePhaseToPhase } from '../model';
import { insulationLevelsFor } from '../overvoltage';
import { C37_32_BUS_CLEARANCES, EN_50341_1_CLEARANCES } from '../standards';
import { aContext, aLine, rangeOneLevel, rangeTwoLevel } from '../testing/specifications';
import type { KnownAnswer } from './known-answer';

function clearances(
  highestVoltageKv: number,
  insulationLevel: InsulationLevelInput,
  shapePhaseToEarth: ShapePhaseToEarth,
  shapePhaseToPhase: ShapePhaseToPhase,
): ClearancesResult {
  const clearance = {
    method: 'iec-table',
    shapePhaseToEarth,
    shapePhaseToPhase,
    fastFrontFrom: null,
    enGap: null,
    externalClearanceMm: null,
    safetySource: null,
  } as const;
  const input = aLine({ system: { nominalVoltageKv: null, highestVoltageKv, insulationLevel }, clearance });
  return evaluate(input, aContext()).clearances!;
}

const RANGE_I = [
  [24, 50, 125, 220],
  [36, 70, 170, 320],
  [72.5, 140, 325, 630],
  [123, 230, 550, 1100],
  [145, 275, 650, 1300],
  [170, 325, 750, 1500],
  [245, 460, 1050, 2100],
] as const;

const bus = (ratedMaximumVoltageKv: number, bilKv: number) => {
  const row = C37_32_BUS_CLEARANCES.rows.find(
    (one) => one.ratedMaximumVoltageKv === ratedMaximumVoltageKv && one.bilKv === bilKv,
  )!;
  return {
    metalToMetalIn: row.metalToMetalIn,
    groundMinimumIn: row.groundMinimumIn,
    groundRecommendedIn: row.groundRecommendedIn,
    phaseSpacingIn: row.phaseSpacingIn,
  };
};

const delM = (highestVoltageKv: number): number | null => {
  const input = aLine({
    system: { nominalVoltageKv: null, highestVoltageKv, insulationLevel: null },
    clearance: {
      method: 'en-empirical',
      shapePhaseToEarth: null,
      shapePhaseToPhase: null,
      fastFrontFrom: null,
      enGap: null,
      externalClearanceMm: null,
      safetySource: null,
    },
  });
  const toEarthMm = evaluate(input, aContext()).clearances?.phaseToEarthMm ?? null;
  return toEarthMm === null ? null : toEarthMm / 1000;
};

const hasLevel = (highestVoltageKv: number, lightningKv: number, switchingKv: number | null): number =>
  insulationLevelsFor(highestVoltageKv, 'iec').filter(
    (row) => row.lightningKv === lightningKv && row.switchingKv === switchingKv,
  ).length;

export const LEVELS_AND_CLEARANCES: KnownAnswer[] = [
  ...RANGE_I.map(([highestVoltageKv, powerFrequencyKv, lightningKv, clearanceMm]): KnownAnswer => ({
    source: 'RD 337/2014 ITC-RAT 12, Tables 1 and 2',
    title: `Um ${highestVoltageKv} kV, ${lightningKv} kV lightning`,
    computed: () => {
      const level = rangeOneLevel(powerFrequencyKv, lightningKv);
      const found = clearances(highestVoltageKv, level, 'rod-structure', 'rod-conductor');
      return { phaseToEarthMm: found.phaseToEarthMm, phaseToPhaseMm: found.phaseToPhaseMm };
    },
    printed: { phaseToEarthMm: clearanceMm, phaseToPhaseMm: clearanceMm },
    within: 0,
    why: 'exact',
  })),
  {
    source: 'Central Electricity Authority (India), Guidelines for substations, clause 4.1(i), Schedule 2',
    title: '765 kV station, switching 1550 kV: rows of IEC 60071-1 Tables A.2 and A.3',
    computed: () => {
      const level = rangeTwoLevel(1550, 1.6, 2100);
      const conductor = clearances(800, level, 'conductor-structure', 'conductor-conductor');
      const rod = clearances(800, level, 'rod-structure', 'rod-conductor');
      return {
        conductorToStructureM: conductor.phaseToEarthMm! / 1000,
        rodToStructureM: rod.phaseToEarthMm! / 1000,
        conductorToConductorM: conductor.phaseToPhaseMm! / 1000,
        rodToConductorM: rod.phaseToPhaseMm! / 1000,
      };
    },
    printed: { conductorToStructureM: 4.9, rodToStructureM: 6.4, conductorToConductorM: 7.6, rodToConductorM: 9.4 },
    within: 1e-9,
    why: 'exact',
  },
  {
    source: 'RD 223/2008 ITC-LAT 07, 5.5',
    title: 'height above ground 5.3 m and Del, from 245 kV',
    computed: () => ({ heightAt245KvM: 5.3 + delM(245)!, heightAt420KvM: 5.3 + delM(420)! }),
    printed: { heightAt245KvM: 7, heightAt420KvM: 8.1 },
    within: 1e-9,
    why: 'exact',
  },
  {
    source: 'RPTD No 05 (Chile, 2020), Tables 1 and 2',
    title: 'minimum levels by voltage are rows of IEC 60071-1',
    computed: () => ({
      at72Kv5: hasLevel(72.5, 325, null),
      at123Kv: hasLevel(123, 550, null),
      at170Kv: hasLevel(170, 750, null),
      at245Kv: hasLevel(245, 1050, null),
      at362Kv: hasLevel(362, 1175, 950),
      at550Kv: hasLevel(550, 1550, 1175),
      at800Kv: hasLevel(800, 1800, 1425),
    }),
    printed: { at72Kv5: 1, at123Kv: 1, at170Kv: 1, at245Kv: 1, at362Kv: 1, at550Kv: 1, at800Kv: 1 },
    within: 0,
    why: 'each is one row',
  },
  {
    source: 'ANSI C37.32-1996, Table 5',
    title: '72.5 kV, 350 kV BIL',
    computed: () => bus(72.5, 350),
    printed: { metalToMetalIn: 31, groundMinimumIn: 25, groundRecommendedIn: 29, phaseSpacingIn: 60 },
    within: 0,
    why: 'exact',
  },
  {
    source: 'ANSI C37.32-1996, Table 5',
    title: '362 kV, 1300 kV BIL',
    computed: () => bus(362, 1300),
    printed: { metalToMetalIn: 110, groundMinimumIn: 104, groundRecommendedIn: 106, phaseSpacingIn: 174 },
    within: 0,
    why: 'exact',
  },
  {
    source: 'OEVE/OENORM EN 50341 Annex F, F.2.3',
    title: 'power-frequency distances of a 420 kV line beside the table',
    computed: () => {
      const row = EN_50341_1_CLEARANCES.rows.find(({ highestVoltageKv }) => highestVoltageKv === 420)!;
      return { toEarthM: row.d50HzPhaseToEarthM, betweenPhasesM: row.d50HzPhaseToPhaseM };
    },
    printed: { toEarthM: 0.7, betweenPhasesM: 1.17 },
    within: 0,
    why: 'exact',
  },
];

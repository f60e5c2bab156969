import type { CompanyInsulationLevel } from '../../model';
import { reaches } from '../../quantities';
import { IEC_60071_1_TABLE_A1 } from '../../standards';
import type { Calculation } from '../../trace';
import type { WorksheetAnswer, WorksheetClearance, WorksheetRow } from '../../worksheet-model';
import { insulationLevelsFor, type InsulationLevelRow } from '../levels';

/** What a level withstands over a distance; between phases in range II by its ratio. */
function switchingOf(level: InsulationLevelRow, distance: WorksheetRow['distance']): number {
  const ratio = distance === 'phase-to-phase' ? (level.switchingPhaseRatio ?? 1) : 1;
  return (level.switchingKv ?? 0) * ratio;
}

/** True where a level meets one requirement: slow front in range I by power frequency or by lightning. */
function meets(level: InsulationLevelRow, row: WorksheetRow, range: 1 | 2): boolean {
  if (row.stress === 'fast-front') return reaches(level.lightningKv, row.requiredKv);
  if (range === 2) {
    if (row.stress === 'slow-front') return reaches(switchingOf(level, row.distance), row.requiredKv);
    return row.convertedSwitchingKvPeak === null
      ? true
      : reaches(switchingOf(level, row.distance), row.convertedSwitchingKvPeak);
  }
  const powerFrequencyKv = level.powerFrequencyKv ?? 0;
  if (row.stress === 'temporary') return reaches(powerFrequencyKv, row.requiredKv);
  return (
    reaches(powerFrequencyKv, row.convertedPowerFrequencyKvRms ?? Infinity) ||
    reaches(level.lightningKv, row.convertedLightningKvPeak ?? Infinity)
  );
}

/** Between phases at the line entrance, where the level does not meet it: the next row of Table A.1 (range I). */
function clearanceFor(
  level: InsulationLevelRow,
  rows: readonly WorksheetRow[],
  range: 1 | 2,
  calculation: Calculation,
): WorksheetClearance | null {
  const unmet = rows.filter((row) => row.metByClearance && !meets(level, row, range));
  if (unmet.length === 0) return null;
  const table = IEC_60071_1_TABLE_A1;
  const { document, edition, clause } = table;
  const neededKv = range === 1 ? Math.max(...unmet.map((row) => row.convertedLightningKvPeak ?? 0)) : null;
  const row = neededKv === null ? undefined : table.rows.find(({ lightningKv }) => reaches(lightningKv, neededKv));
  if (row === undefined) {
    const why = 'The requirement between phases at the line entrance is to be met by a clearance of its own.';
    calculation.missing('line-entrance', why);
    const source = { document, edition, clause, status: 'derived' } as const;
    return { standardLightningKvPeak: null, clearanceMm: null, source };
  }
  const source = calculation.row(table, row);
  calculation.note(() => ({
    id: 'worksheet.line-entrance-clearance',
    heading: 'Clearance between phases at the line entrance',
    formula: 'D(U), next standard lightning withstand',
    substitution: `D(${row.lightningKv} kV)`,
    result: row.rodStructureMm,
    unit: 'mm',
    source,
  }));
  return { standardLightningKvPeak: row.lightningKv, clearanceMm: row.rodStructureMm, source };
}

/** The lowest row that meets every requirement that equipment has to meet. Proposed; the engineer chooses. */
export function proposeLevel(
  { rows, range, highestVoltageKv }: { rows: readonly WorksheetRow[]; range: 1 | 2; highestVoltageKv: number },
  companyLevels: readonly CompanyInsulationLevel[],
  calculation: Calculation,
): Pick<WorksheetAnswer, 'proposedLevel' | 'proposedWhyNot' | 'lineEntranceClearance'> {
  const none = (proposedWhyNot: string) => ({ proposedLevel: null, proposedWhyNot, lineEntranceClearance: null });
  if (calculation.notAssessed.length > 0) return none('Not every requirement is assessed.');
  const levels = insulationLevelsFor(highestVoltageKv, 'iec', companyLevels);
  if (levels.length === 0) return none(`The tables print no insulation level for ${highestVoltageKv} kV line to line.`);
  const byEquipment = rows.filter((row) => !row.metByClearance);
  const level = levels.find((candidate) => byEquipment.every((row) => meets(candidate, row, range)));
  if (level === undefined) return none(`No insulation level for ${highestVoltageKv} kV meets every requirement.`);
  calculation.note(() => ({
    id: 'worksheet.level',
    heading: 'Lowest insulation level that meets every requirement',
    formula: 'level(Um)',
    substitution: `level(${highestVoltageKv} kV)`,
    result: [level.powerFrequencyKv, level.switchingKv, level.lightningKv].filter((kv) => kv !== null).join('/'),
    unit: 'kV',
    source: level.source,
  }));
  if (level.bracketed) {
    const text = 'The level is printed in brackets: that it suffices between phases has to be proved by further tests.';
    calculation.caution('level-bracketed', 'caution', text, null);
  }
  return {
    proposedLevel: level,
    proposedWhyNot: null,
    lineEntranceClearance: clearanceFor(level, rows, range, calculation),
  };
}

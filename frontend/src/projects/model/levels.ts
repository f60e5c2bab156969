import type { InsulationLevelRow } from '@bellgap/common/api';

/** The withstand voltages of one row of the table, kV. */
export interface Level {
  lightningKv: number | null;
  switchingKv: number | null;
  powerFrequencyKv: number | null;
  switchingPhaseRatio: number | null;
}

export const levelOf = ({ lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio }: Level): Level => ({
  lightningKv,
  switchingKv,
  powerFrequencyKv,
  switchingPhaseRatio,
});

export function sameLevel(row: Level, level: Level | null): boolean {
  return (
    level !== null &&
    row.lightningKv === level.lightningKv &&
    row.switchingKv === level.switchingKv &&
    row.powerFrequencyKv === level.powerFrequencyKv
  );
}

/** Rows of a highest voltage; where the table has none of it, those of the next higher one. */
export function rowsFor(rows: readonly InsulationLevelRow[], highestVoltageKv: number): InsulationLevelRow[] {
  const fitting = rows.map((row) => row.highestVoltageKv).filter((voltageKv) => voltageKv >= highestVoltageKv);
  const nearestKv = Math.min(...fitting);
  return rows.filter((row) => row.highestVoltageKv === nearestKv);
}

/** A level in words, with the basis of every voltage. */
export function levelText({ lightningKv, switchingKv, powerFrequencyKv }: Level): string {
  const words: string[] = [];
  if (powerFrequencyKv !== null) words.push(`power frequency ${powerFrequencyKv} kV rms`);
  if (switchingKv !== null) words.push(`switching ${switchingKv} kV peak to earth`);
  if (lightningKv !== null) words.push(`lightning ${lightningKv} kV peak`);
  return words.join(', ');
}

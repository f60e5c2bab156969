import type { InsulationLevelInput, InsulationLevelRow } from '@bellgap/common/api';
import type { Choice } from '../../ui/fields';

type LevelFigures = Pick<
  InsulationLevelInput,
  'lightningKv' | 'switchingKv' | 'powerFrequencyKv' | 'switchingPhaseRatio'
>;

export function levelKey({ lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio }: LevelFigures): string {
  return [lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio].map((kv) => kv ?? '').join('/');
}

/** A level in the signs of the trade: LI lightning impulse, SI switching impulse, AC power frequency. */
export function levelWords({ lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio }: LevelFigures): string {
  const parts: string[] = [];
  if (lightningKv !== null) parts.push(`LI ${lightningKv}`);
  if (switchingKv !== null)
    parts.push(`SI ${switchingKv}${switchingPhaseRatio === null ? '' : ` × ${switchingPhaseRatio}`}`);
  if (powerFrequencyKv !== null) parts.push(`AC ${powerFrequencyKv}`);
  return parts.join(' · ');
}

function detailOf(row: InsulationLevelRow): string {
  const words = [`lightning ${row.lightningKv} kV peak`];
  if (row.switchingKv !== null) words.push(`switching ${row.switchingKv} kV peak to earth`);
  if (row.switchingPhaseRatio !== null) words.push(`between phases × ${row.switchingPhaseRatio}`);
  if (row.powerFrequencyKv !== null) words.push(`power frequency ${row.powerFrequencyKv} kV rms`);
  if (row.bracketed) words.push('in brackets: phase-to-phase to be proved');
  if (row.reason) words.push(`company level: ${row.reason}`);
  return words.join(', ');
}

/** Rows of one highest voltage, the highest level first. */
export function levelsOf(rows: readonly InsulationLevelRow[], highestVoltageKv: number | null): InsulationLevelRow[] {
  return rows
    .filter((row) => row.highestVoltageKv === highestVoltageKv)
    .sort((a, b) => b.lightningKv - a.lightningKv || (b.switchingKv ?? 0) - (a.switchingKv ?? 0));
}

export function levelChoices(rows: readonly InsulationLevelRow[]): Choice[] {
  return rows.map((row) => ({
    value: levelKey(row),
    label: `${levelWords(row)}${row.bracketed ? ' (bracketed)' : ''}`,
    short: levelWords(row),
    detail: detailOf(row),
  }));
}

export function levelFigures(row: InsulationLevelRow): LevelFigures {
  const { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio } = row;
  return { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio };
}

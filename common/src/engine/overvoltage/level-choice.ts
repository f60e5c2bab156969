import type { Basis, CompanyInsulationLevel, InsulationLevelInput } from '../model';
import { isKnown } from '../quantities';
import type { Calculation } from '../trace';
import { entriesFor, type InsulationLevelRow, type LevelEntry } from './levels';

export interface LevelChoice {
  highestVoltageKv: number | null | undefined;
  basis: Basis | null | undefined;
  level: InsulationLevelInput | null | undefined;
  companyLevels?: readonly CompanyInsulationLevel[];
}

export type LevelMatch =
  /** A row of the table or of the company. */
  | { found: 'row'; row: InsulationLevelRow }
  /** Something is still missing; what is given fits at least one row. */
  | { found: 'incomplete' }
  /** No row has these figures together: refused beside its field. */
  | { found: 'no-row'; text: string };

const levelKeys = ['lightningKv', 'switchingKv', 'powerFrequencyKv', 'switchingPhaseRatio'] as const;

function fits(row: LevelEntry, level: InsulationLevelInput, basis: Basis): 'whole' | 'partly' | 'not' {
  let whole = true;
  for (const key of levelKeys) {
    const given = level[key] ?? null;
    const printed = row[key];
    if (printed === null) {
      // The North American rows fix the lightning level alone; what else is known may be given beside it.
      if (given !== null && (basis === 'iec' || row.reason !== null)) return 'not';
    } else if (given === null) {
      // The ratio follows from the row that its voltages name; left out, the row is still known.
      if (key !== 'switchingPhaseRatio') whole = false;
    } else if (given !== printed) return 'not';
  }
  return whole ? 'whole' : 'partly';
}

const levelText = (row: InsulationLevelRow): string =>
  levelKeys
    .flatMap((key) => (row[key] === null || key === 'switchingPhaseRatio' ? [] : [row[key]]))
    .sort((one, other) => one - other)
    .join('/');

function entryOf({
  highestVoltageKv,
  basis,
  level,
  companyLevels = [],
}: LevelChoice): LevelEntry | Exclude<LevelMatch, { found: 'row' }> {
  if (!isKnown(level) || !isKnown(highestVoltageKv) || !isKnown(basis)) return { found: 'incomplete' };
  if (levelKeys.every((key) => !isKnown(level[key]))) return { found: 'incomplete' };
  const rows = entriesFor(highestVoltageKv, basis, companyLevels);
  const whole = rows.find((row) => fits(row, level, basis) === 'whole');
  if (whole !== undefined) return whole;
  if (rows.some((row) => fits(row, level, basis) === 'partly')) return { found: 'incomplete' };
  const text =
    rows.length === 0
      ? `The tables print no insulation level for ${highestVoltageKv} kV line to line; the company may add one.`
      : `No insulation level for ${highestVoltageKv} kV line to line has these figures together. The levels are ${[
          ...new Set(rows.map(levelText)),
        ].join(', ')} kV.`;
  return { found: 'no-row', text };
}

/** The row that a level is, or why it is none. A level without any figure is incomplete, not refused. */
export function matchInsulationLevel(choice: LevelChoice): LevelMatch {
  const entry = entryOf(choice);
  if ('found' in entry) return entry;
  const { cited: _cited, ...row } = entry;
  return { found: 'row', row };
}

const FIELD = 'system.insulationLevel';

/**
 * Reads the level of an evaluation as a row, with what has to be said about it: a bracketed row, a level below the
 * highest of its Um, a company row. Null where it is not filled in or no row, and then nothing that rests on a level has
 * a figure.
 */
export function assessInsulationLevel(choice: LevelChoice, calculation: Calculation): InsulationLevelRow | null {
  const entry = entryOf(choice);
  if ('found' in entry) {
    if (entry.found === 'no-row') calculation.caution('level-no-row', 'stop', entry.text, FIELD);
    return null;
  }
  const { cited: keys, ...row } = entry;
  const status = keys.map(({ key, status: known }) => calculation.status(key, known))[0] ?? row.source.status;
  const source = { ...row.source, status };
  const text = levelText(row);
  calculation.note(() => ({
    id: 'overvoltage.insulation-level',
    heading:
      row.reason === null ? 'Insulation level, one row of the table' : `Insulation level of the company: ${row.reason}`,
    formula: 'level(Um)',
    substitution: `level(${row.highestVoltageKv} kV)`,
    result: text,
    unit: 'kV',
    source,
  }));
  if (row.bracketed) {
    const words = `The level ${text} kV is printed in brackets for ${row.highestVoltageKv} kV: that it suffices between phases has to be proved by further tests.`;
    calculation.caution('level-bracketed', 'caution', words, FIELD);
  }
  const highestKv = Math.max(
    ...entriesFor(row.highestVoltageKv, choice.basis, []).map(({ lightningKv }) => lightningKv),
    -Infinity,
  );
  if (row.lightningKv < highestKv) {
    const words = `The lightning level of ${row.lightningKv} kV lies below the highest of its voltage, ${highestKv} kV: it assumes surge arresters, which the sheet has to name.`;
    calculation.caution('level-below-highest', 'info', words, FIELD);
  }
  return { ...row, source };
}

import type { Basis, CompanyInsulationLevel, SourceReference, Status } from '../model';
import { isKnown } from '../quantities';
import { readHighestVoltageKv } from '../situation';
import { cite, COMPANY, DEFINITION } from '../sources';
import {
  C37_32_BUS_CLEARANCES,
  IEC_60071_1_RANGE_I,
  IEC_60071_1_RANGE_II,
  leastKnown,
  rowKeyOf,
  RUS_SUSPENSION_LEVELS,
  type StandardTable,
  type TableRow,
} from '../standards';
import { formula } from '../trace';

/**
 * The insulation level: one row of the printed table (or of the company's own rows), chosen as a whole. Lightning and
 * switching in kV peak, power frequency in kV r.m.s.; switching is phase to earth.
 */
export interface InsulationLevelRow {
  /** Um, line to line, kV r.m.s. */
  highestVoltageKv: number;
  lightningKv: number;
  switchingKv: number | null;
  powerFrequencyKv: number | null;
  switchingPhaseRatio: number | null;
  /** Printed in brackets: the withstand between phases is to be proved by further tests. */
  bracketed: boolean;
  /** Why the company added the row; null for printed rows. */
  reason: string | null;
  source: SourceReference;
}

/** A row with the keys under which owners of the print record what they found. */
export interface LevelEntry extends InsulationLevelRow {
  cited: { key: string; status: Status }[];
}

/**
 * Switching withstand between phases, kV peak, rounded to 1 kV as Table A.3 prints it.
 * Source: IEC 60071-1, Tables 3 and A.3: 1175 kV and ratio 1.5 give 1763 kV.
 */
export const switchingBetweenPhases = formula({
  id: 'overvoltage.switching-between-phases',
  heading: 'Switching withstand between phases',
  source: cite(DEFINITION, 'withstand to earth times the ratio, to 1 kV', 'derived'),
  expression: 'Upp = round(Upe * r)',
  symbols: { Upe: 'switchingKvPeak', r: 'switchingPhaseRatio' },
  result: 'switchingPhaseToPhaseKvPeak',
  compute: ({
    switchingKvPeak: Upe,
    switchingPhaseRatio: r,
  }: {
    switchingKvPeak: number;
    switchingPhaseRatio: number;
  }) => Math.round(Math.round(Upe * r * 1e6) / 1e6),
});

// ---- the rows ------------------------------------------------------------------------------------------------------

const NO_SWITCHING = { switchingKv: null, switchingPhaseRatio: null };

function cited<Row extends object>(
  table: StandardTable<Row>,
  row: TableRow<Row>,
  status: Status = row.status,
): Pick<LevelEntry, 'source' | 'cited' | 'reason'> {
  const { key, document, edition, clause } = table;
  return {
    reason: null,
    source: { document, edition, clause, status },
    cited: [{ key: `${key}:${rowKeyOf(table, row)}`, status }],
  };
}

const IEC_ROWS: readonly LevelEntry[] = [
  ...IEC_60071_1_RANGE_I.rows.map((row) => ({
    ...NO_SWITCHING,
    highestVoltageKv: row.highestVoltageKv,
    lightningKv: row.lightningKv,
    powerFrequencyKv: row.powerFrequencyKv,
    bracketed: row.bracketed,
    ...cited(IEC_60071_1_RANGE_I, row),
  })),
  ...IEC_60071_1_RANGE_II.rows.map((row) => ({
    highestVoltageKv: row.highestVoltageKv,
    lightningKv: row.lightningKv,
    switchingKv: row.switchingKv,
    switchingPhaseRatio: row.switchingPhaseRatio,
    powerFrequencyKv: null,
    bracketed: false,
    ...cited(IEC_60071_1_RANGE_II, row, leastKnown([row.status, row.statusRatio])),
  })),
];

/** BIL rows by rated maximum voltage; a maximum operating voltage without rows of its own takes the next higher. */
const NORTH_AMERICAN_ROWS: readonly LevelEntry[] = (() => {
  const rated = [...new Set(C37_32_BUS_CLEARANCES.rows.map((row) => row.ratedMaximumVoltageKv))];
  const operating = RUS_SUSPENSION_LEVELS.rows.map((row) => row.maximumVoltageKv);
  const voltagesKv = [...new Set([...rated, ...operating])].sort((one, other) => one - other);
  return voltagesKv.flatMap((highestVoltageKv) => {
    const ratedKv = rated.find((voltageKv) => voltageKv >= highestVoltageKv);
    return C37_32_BUS_CLEARANCES.rows
      .filter((row) => row.ratedMaximumVoltageKv === ratedKv)
      .map((row) => ({
        ...NO_SWITCHING,
        highestVoltageKv,
        lightningKv: row.bilKv,
        powerFrequencyKv: null,
        bracketed: false,
        ...cited(C37_32_BUS_CLEARANCES, row),
      }));
  });
})();

function companyEntry(level: CompanyInsulationLevel): LevelEntry {
  const { highestVoltageKv, lightningKv, switchingKv, switchingPhaseRatio, powerFrequencyKv, reason } = level;
  const source = cite(COMPANY, 'insulation levels', 'practice');
  return {
    highestVoltageKv,
    lightningKv,
    switchingKv,
    switchingPhaseRatio,
    powerFrequencyKv,
    bracketed: false,
    reason,
    source,
    cited: [],
  };
}

/** The rows with their keys, for the choice of one. */
export function entriesFor(
  highestVoltageKv: number | null | undefined,
  basis: Basis | null | undefined,
  companyLevels: readonly CompanyInsulationLevel[],
): LevelEntry[] {
  if (!isKnown(basis)) return [];
  const printed = basis === 'iec' ? IEC_ROWS : NORTH_AMERICAN_ROWS;
  const all = [...printed, ...companyLevels.map(companyEntry)];
  if (!isKnown(highestVoltageKv)) return all;
  const readKv = basis === 'iec' ? readHighestVoltageKv(highestVoltageKv) : highestVoltageKv;
  return all.filter((row) => row.highestVoltageKv === readKv || row.highestVoltageKv === highestVoltageKv);
}

/**
 * The rows that a system of this highest voltage can choose from, printed rows first and company rows after; every row
 * of the basis where the voltage is not known. 525 reads as 550 and 765 as 800.
 */
export function insulationLevelsFor(
  highestVoltageKv: number | null | undefined,
  basis: Basis | null | undefined,
  companyLevels: readonly CompanyInsulationLevel[] = [],
): InsulationLevelRow[] {
  return entriesFor(highestVoltageKv, basis, companyLevels).map(({ cited: _cited, ...row }) => row);
}

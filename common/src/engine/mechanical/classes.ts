import type { Basis, InsulatorUnit } from '../model';
import {
  ANSI_C29_2_UNITS,
  IEC_60305_UNITS,
  IEC_60433_CLASSES,
  IEC_61466_1_CLASSES,
  type StandardTable,
  type TableRow,
} from '../standards';
import { isComposite } from '../insulator-string/unit';
import type { Calculation } from '../trace';

export interface StrengthClass {
  failingLoadKn: number;
  coupling: string;
}

/** The class at or above a strength, from one table; null beyond its last class. */
function nextClass<Row extends object>(
  table: StandardTable<Row>,
  read: (row: TableRow<Row>) => StrengthClass,
  { strengthKn, coupling }: { strengthKn: number; coupling: string | null },
  calculation: Calculation,
): StrengthClass | null {
  let next: TableRow<Row> | null = null;
  for (const row of table.rows) {
    const { failingLoadKn } = read(row);
    // Strengths come from a multiplication: its binary dust does not ask for another class.
    if (failingLoadKn * (1 + 1e-9) < strengthKn) continue;
    const least = next === null ? Infinity : read(next).failingLoadKn;
    const sameCoupling = failingLoadKn === least && read(row).coupling === coupling;
    if (failingLoadKn < least || sameCoupling) next = row;
  }
  if (next === null) return null;
  const found = read(next);
  const source = calculation.row(table, next);
  calculation.note(() => ({
    id: 'mechanical.class',
    heading: 'Strength class needed',
    formula: 'class = next class at or above S',
    substitution: `S = ${strengthKn.toFixed(1)} kN, coupling ${found.coupling}`,
    result: found.failingLoadKn,
    unit: 'kN',
    source,
  }));
  return found;
}

/** The next class in the standard of the unit; without a unit, in that of the basis for discs. */
export function strengthClass(
  strengthKn: number,
  { unit, basis }: { unit: InsulatorUnit | null; basis: Basis | null },
  calculation: Calculation,
): StrengthClass | null {
  const asked = { strengthKn, coupling: unit?.coupling ?? null };
  if (unit !== null && isComposite(unit)) {
    return nextClass(
      IEC_61466_1_CLASSES,
      ({ failingLoadKn, couplingIec60120 }) => ({ failingLoadKn, coupling: couplingIec60120 }),
      asked,
      calculation,
    );
  }
  if (unit?.kind === 'ceramic-rod') {
    return nextClass(
      IEC_60433_CLASSES,
      ({ failingLoadKn, couplingIec60120 }) => ({ failingLoadKn, coupling: couplingIec60120 }),
      asked,
      calculation,
    );
  }
  if (unit === null ? basis === 'north-american' : unit.family === 'ansi-c29.2') {
    return nextClass(
      ANSI_C29_2_UNITS,
      ({ strengthKn: failingLoadKn, coupling }) => ({ failingLoadKn, coupling }),
      asked,
      calculation,
    );
  }
  return nextClass(
    IEC_60305_UNITS,
    ({ failingLoadKn, couplingIec60120 }) => ({ failingLoadKn, coupling: couplingIec60120 }),
    asked,
    calculation,
  );
}

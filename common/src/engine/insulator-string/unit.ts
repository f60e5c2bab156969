import type { InsulatorUnit, StringFlashover } from '../model';
import { STRING_FLASHOVER_254X146 } from '../standards';

/** Spacing and diameters of the units that the string flashover table was made with, mm. */
const TABLE_UNIT = { spacingMm: 146, diametersMm: [254, 255] } as const;

export const isDisc = (unit: InsulatorUnit): boolean => unit.kind === 'cap-and-pin';

export const isComposite = (unit: InsulatorUnit): boolean =>
  unit.kind === 'composite-rod' || unit.material === 'composite';

/**
 * Dry arc of a single unit less its spacing, mm: what the arc path of a string of discs is longer than its section
 * length. 0 where the dry arc of the unit is not known, which makes the string look shorter than it is.
 */
export const arcAllowanceMm = (unit: InsulatorUnit): number =>
  isDisc(unit) && unit.dryArcMm !== null ? unit.dryArcMm - unit.spacingMm : 0;

/** Dry arc of a string, mm; null for rods whose dry arc is not known. */
export function stringDryArcMm(unit: InsulatorUnit, units: number): number | null {
  if (isDisc(unit)) return units * unit.spacingMm + arcAllowanceMm(unit);
  return unit.dryArcMm === null ? null : units * unit.dryArcMm;
}

export const tableUnitApplies = (unit: InsulatorUnit): boolean =>
  isDisc(unit) &&
  unit.spacingMm === TABLE_UNIT.spacingMm &&
  TABLE_UNIT.diametersMm.some((diameterMm) => diameterMm === unit.diameterMm);

/** Wet power-frequency flashover of complete strings: the catalogue's own, else the table's where its unit is used. */
export function wetFlashoverOf(unit: InsulatorUnit): readonly StringFlashover[] | null {
  if (unit.wetFlashover !== null && unit.wetFlashover.length > 0) return unit.wetFlashover;
  return tableUnitApplies(unit) ? STRING_FLASHOVER_254X146.rows : null;
}

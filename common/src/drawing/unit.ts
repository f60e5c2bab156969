import type { InsulatorUnit } from '../engine/model';
import { CHOICE_LABELS } from '../schemas/fields';
import { DraftingTable } from './drafting';
import { figure } from './figures';
import { at } from './geometry';
import type { Drawing } from './primitives';
import { discOutline } from './silhouettes/disc';
import { rodOutline } from './silhouettes/rod';

/** Heights of text in the longer side of a unit, and distance of its dimension lines in heights of text. */
const TEXTS_IN_UNIT = { disc: 24, rod: 34 } as const;
const DIMENSION_TEXTS = 2.6;

/**
 * One catalogue unit to scale with its spacing and diameter, in millimetres; null where its diameter is not known.
 * The form of cap, shell and sheds is not in any catalogue and is drawn as usual.
 */
export function drawUnit(unit: InsulatorUnit): Drawing | null {
  const { diameterMm, spacingMm } = unit;
  if (diameterMm === null || unit.kind === 'line-post') return null;
  const disc = unit.kind === 'cap-and-pin';
  const textHeightMm = Math.max(diameterMm, spacingMm) / (disc ? TEXTS_IN_UNIT.disc : TEXTS_IN_UNIT.rod);
  const table = new DraftingTable(textHeightMm);
  if (disc) {
    const outline = discOutline(unit.profile, diameterMm, spacingMm);
    table.path('metal', outline.pin, { filled: true });
    table.path('insulation', outline.shell, { filled: true });
    table.path('metal', outline.cap, { filled: true });
  } else {
    const outline = rodOutline(unit, diameterMm);
    table.path('insulation', outline.housing, { filled: true });
    table.path('metal', outline.ends, { filled: true });
  }
  const radiusMm = diameterMm / 2;
  const offsetMm = DIMENSION_TEXTS * textHeightMm;
  const dimension = { kind: 'dimension', layer: 'dimension' } as const;
  table.add({ ...dimension, from: at(radiusMm, 0), to: at(radiusMm, spacingMm), offsetMm, text: figure(spacingMm) });
  const widestMm = disc ? 0.7 * spacingMm : spacingMm;
  table.add({
    ...dimension,
    from: at(radiusMm, widestMm),
    to: at(-radiusMm, widestMm),
    offsetMm: spacingMm - widestMm + offsetMm,
    text: `Ø ${figure(diameterMm)}`,
  });
  const kind = CHOICE_LABELS.insulatorKind[unit.kind].toLowerCase();
  return table.finish(
    `Unit ${unit.code}, to scale`,
    `One ${kind} unit: ${disc ? 'spacing' : 'length'} ${figure(spacingMm)} mm, diameter ${figure(diameterMm)} mm.`,
  );
}

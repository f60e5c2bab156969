import { isKnown } from '../quantities';
import { COMPANY, cite } from '../sources';
import type { Calculation } from '../trace';
import type { StringCase } from './assess';
import { isDisc } from './unit';

/**
 * Extra units in the string: the company's for tension strings of discs, and those added by hand. Store spares and a
 * margin for units out of service are other things. Null where the arrangement decides and is not known.
 */
export function extraUnits({ string, context, unit }: StringCase, calculation: Calculation): number | null {
  if (!isDisc(unit)) return 0;
  const byHand = string.spareUnits ?? 0;
  if (!isKnown(string.spareUnits)) {
    const text = 'Whether the string carries extra units is not filled in; it is counted without any by hand.';
    calculation.caution('extra-units-not-filled-in', 'caution', text, 'string.spareUnits');
  }
  const { tensionExtraUnits, version } = context.settings;
  const arrangement = string.arrangement ?? null;
  if (arrangement === null && tensionExtraUnits > 0) {
    calculation.missing('string.extraUnits', 'The arrangement is not filled in; tension strings carry extra units.');
    return null;
  }
  const forTension = arrangement === 'tension' ? tensionExtraUnits : 0;
  if (forTension + byHand > 0) {
    calculation.note(() => ({
      id: 'string.extra-units',
      heading: 'Extra units in the string',
      formula: 'extra = for tension + by hand',
      substitution: `extra = ${forTension} + ${byHand}`,
      result: forTension + byHand,
      unit: 'units',
      source: cite(COMPANY, `version ${version}`, 'practice'),
    }));
  }
  return forTension + byHand;
}

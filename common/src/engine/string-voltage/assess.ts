import type { InsulatorUnit, SharingRatio, StringInput, StringResult } from '../model';
import { isComposite, isDisc } from '../insulator-string/unit';
import type { Devices } from '../insulator-string/impulse';
import { cite, TEXTBOOK_NETWORK } from '../sources';
import { isKnown, reaches } from '../quantities';
import { figureText, type Calculation } from '../trace';
import { stringEfficiency } from './formulas';
import { voltageShareRatios } from './network';

/**
 * Pin-to-earth and pin-to-line capacitance over the self capacitance of a unit: the usual figures of textbook exercises
 * (0.1 to 0.2; simple form). They stand where a sheet gives none of its own; a count never rests on either.
 */
export const USUAL_RATIOS = { pinToEarthRatio: 0.1, pinToLineRatio: 0 } as const;

/** Um from which rings are usual: composite from 220 kV nominal, discs from 345 and 400 kV. Line to line, kV r.m.s. */
const RINGS_USUAL_FROM_KV = { composite: 245, discs: 362 } as const;

type Sharing = Pick<StringResult, 'voltageSharing' | 'efficiencyPercent' | 'sharing'>;
const UNKNOWN: Sharing = { voltageSharing: [], efficiencyPercent: null, sharing: null };
const PART = 'string.voltageSharing';

const ORIGIN_WORDS = { entered: 'entered', usual: 'usual, practice' } as const satisfies Record<
  SharingRatio['from'],
  string
>;

const ratioOf = (entered: number | null | undefined, usualRatio: number): SharingRatio =>
  isKnown(entered) ? { valueRatio: entered, from: 'entered' } : { valueRatio: usualRatio, from: 'usual' };

/** The capacitances of a sheet, each as entered or as usual. */
function ratiosOf(given: StringInput['sharing']): NonNullable<Sharing['sharing']> {
  return {
    pinToEarth: ratioOf(given?.pinToEarthRatio, USUAL_RATIOS.pinToEarthRatio),
    pinToLine: ratioOf(given?.pinToLineRatio, USUAL_RATIOS.pinToLineRatio),
  };
}

/** Voltage along the string, line end first. It concerns corona, radio noise and ageing, never the count. */
export function voltageSharing(
  { unit, units, given }: { unit: InsulatorUnit; units: number | null; given: StringInput['sharing'] },
  calculation: Calculation,
): Sharing {
  if (!isDisc(unit)) {
    calculation.missing(PART, 'The network describes cap and pin units; the supplier shows the field along a rod.');
    return UNKNOWN;
  }
  if (units === null) {
    calculation.missing(PART, 'The number of units is not known.');
    return UNKNOWN;
  }
  const sharing = ratiosOf(given);
  const { pinToEarth, pinToLine } = sharing;
  const shares = voltageShareRatios({
    units,
    pinToEarthRatio: pinToEarth.valueRatio,
    pinToLineRatio: pinToLine.valueRatio,
  }).map((share) => Math.max(0, share));
  const lineEndRatio = shares[0] as number;
  const restsOnUsual = pinToEarth.from === 'usual' || pinToLine.from === 'usual';
  const source = restsOnUsual
    ? cite(
        TEXTBOOK_NETWORK,
        'string efficiency; usual ratios',
        calculation.status('string-voltage.usual-ratios', 'practice'),
      )
    : cite(TEXTBOOK_NETWORK, 'string efficiency', 'seen');
  const words = ({ valueRatio, from }: SharingRatio): string => `${figureText(valueRatio)} (${ORIGIN_WORDS[from]})`;
  calculation.note(() => ({
    id: 'string-voltage.network',
    heading: restsOnUsual
      ? 'Share of the line-end unit, with the usual capacitances of textbooks and no ring'
      : 'Share of the line-end unit, with the capacitances entered and no ring',
    formula: '(u(j) - u(j-1)) + c * u(j) = (u(j+1) - u(j)) + k * (1 - u(j)), u(0) = 0, u(n) = 1',
    substitution: `n = ${units}, c = ${words(pinToEarth)}, k = ${words(pinToLine)}: shares from the line end ${shares
      .map((share) => `${figureText(Number((share * 100).toFixed(2)))} %`)
      .join(', ')}`,
    result: lineEndRatio * 100,
    unit: '%',
    source,
  }));
  // Efficiency is told by the line-end unit because it carries the most; with much capacitance to the line it does not.
  const lineEndLeads = reaches(lineEndRatio, Math.max(...shares));
  if (!lineEndLeads) {
    calculation.missing(
      'string.efficiencyPercent',
      'With these capacitances the unit at the line end does not carry the most, by which string efficiency is told.',
    );
  }
  return {
    voltageSharing: shares.map((share) => share * 100),
    efficiencyPercent: lineEndLeads ? calculation.run(stringEfficiency, { units, lineEndRatio }) : null,
    sharing,
  };
}

/** Says from which voltage on a string usually carries rings, where it has none. */
export function infoRings(
  { unit, highestVoltageKv, devices }: { unit: InsulatorUnit; highestVoltageKv: number | null; devices: Devices },
  calculation: Calculation,
): void {
  if (highestVoltageKv === null || devices.kind === null || devices.kind === 'rings') return;
  const field = 'string.arcingDevices';
  if (isComposite(unit)) {
    if (highestVoltageKv < RINGS_USUAL_FROM_KV.composite) return;
    const text =
      'Composite strings usually carry a ring at the line end from about 220 kV; without one, the supplier has to show the field at the end fitting.';
    calculation.caution('ring-usual-composite', 'caution', text, field);
  } else if (isDisc(unit) && highestVoltageKv >= RINGS_USUAL_FROM_KV.discs) {
    const text =
      'Strings of discs usually carry a ring at the line end from 345 and 400 kV (from memory, not verified); without one, look at corona and radio noise.';
    calculation.caution('ring-usual-discs', 'info', text, field);
  }
}

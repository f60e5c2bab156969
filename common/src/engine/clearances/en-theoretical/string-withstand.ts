import {
  DEVIATION_FACTORS,
  fastFrontGapFactor,
  fiftyPercentVoltage,
  lightningDryArc,
  SCATTER,
  SURROUNDINGS_GAP_FACTORS,
} from '../../air-gaps';
import { countOf, unitsByDryArc } from '../../insulator-string/formulas';
import { arcAllowanceMm, isDisc, stringDryArcMm } from '../../insulator-string/unit';
import type { InsulatorUnit, StringInput } from '../../model';
import { mFromMm } from '../../quantities';
import type { Situation } from '../../situation';
import type { Calculation } from '../../trace';
import { stringFastFront } from '../formulas';

/** The string beside the gap: what was chosen, and the dry arc it has with all its units. */
export interface StringBeside {
  string: Partial<StringInput>;
  unit: InsulatorUnit;
  /** Rods in series; 1 for discs, composite rods and posts. */
  rods: number;
  /** Dry arc of the string as specified, mm; null where it is not known. */
  dryArcMm: number | null;
}

export interface StringWithstand {
  /** Fast-front withstand (90 %) that the gap has to match, kV peak; null with the reason. */
  fastFrontKvPeak: number | null;
  whyNot: string | null;
  /** That of the whole string, where pollution or extra units made it longer; informs, never governs. */
  wholeKvPeak: number | null;
}

const without = (whyNot: string): StringWithstand => ({ fastFrontKvPeak: null, whyNot, wholeKvPeak: null });

/** Dry arc that the lightning level alone would give a string of discs up to 1000 m, mm: whole units. */
function lightningAloneMm(
  { unit, lightningKvPeak, gapFactor }: { unit: InsulatorUnit; lightningKvPeak: number; gapFactor: number },
  calculation: Calculation,
): number {
  const as = 'en-theoretical:fast-front';
  const fiftyPercentKvPeak = calculation.run(
    fiftyPercentVoltage,
    { withstandKvPeak: lightningKvPeak, altitudeFactor: 1, ...SCATTER.fastFront },
    { as, heading: 'Lightning flashover (50 %) needed up to 1000 m' },
  );
  const dryArcM = calculation.run(lightningDryArc, { fiftyPercentKvPeak, fastFrontGapFactor: gapFactor }, { as });
  const figures = { dryArcM, allowanceMm: arcAllowanceMm(unit), spacingMm: unit.spacingMm };
  const quotientRatio = calculation.run(unitsByDryArc, figures, { as });
  const units = calculation.run(countOf, { quotientRatio }, { as, heading: 'Units by lightning alone, up to 1000 m' });
  return stringDryArcMm(unit, units) as number;
}

/**
 * Fast-front withstand of the string, from the distance that the arc has to bridge: the gap between horns or rings where
 * they are, the whole rod, or the dry arc that lightning alone would give a string of discs up to 1000 m. A string that
 * pollution made longer does not ask for a longer gap.
 */
export function stringWithstand(
  { situation, beside }: { situation: Situation; beside: StringBeside | null },
  calculation: Calculation,
): StringWithstand {
  if (beside === null) return without('The string, from which the fast-front voltage is to be taken, is not known.');
  const { string, unit, rods, dryArcMm } = beside;
  const { surroundings = null, arcingDevices = null, arcGapMm = null } = string;
  const lightningKvPeak = situation.level?.lightningKv ?? null;
  if (surroundings === null) return without('The surroundings of the string are not filled in.');
  if (arcingDevices === null) return without('Whether the string has arcing devices is not filled in.');
  if (arcingDevices !== 'none' && arcGapMm === null) return without('The gap between the arcing devices is not known.');
  const disc = isDisc(unit);
  const alongMm = disc ? dryArcMm : stringDryArcMm(unit, rods);
  if (!disc && alongMm === null) return without('The dry arc of the rod is not known.');
  const { gapFactor, source } = SURROUNDINGS_GAP_FACTORS[surroundings];
  calculation.status(`string.gap-factor:${surroundings}`, source.status);
  const factor = calculation.run(
    fastFrontGapFactor,
    { gapFactor },
    { as: 'en-theoretical:fast-front', heading: 'Fast-front gap factor of the string' },
  );
  const withstandOf = (arcMm: number, as: string, heading: string): number =>
    calculation.run(
      stringFastFront,
      { deviationFactor: DEVIATION_FACTORS.fastFront, fastFrontGapFactor: factor, dryArcM: mFromMm(arcMm) },
      { as, heading },
    );
  const governing = (arcMm: number): number =>
    withstandOf(arcMm, 'en-theoretical:fast-front', 'Fast-front withstand of the string');
  if (arcingDevices !== 'none') {
    const gapMm = Math.min(arcGapMm as number, alongMm ?? Infinity);
    return { fastFrontKvPeak: governing(gapMm), whyNot: null, wholeKvPeak: null };
  }
  if (!disc) return { fastFrontKvPeak: governing(alongMm as number), whyNot: null, wholeKvPeak: null };
  if (lightningKvPeak === null) return without('The lightning level is not known.');
  const aloneMm = lightningAloneMm({ unit, lightningKvPeak, gapFactor: factor }, calculation);
  const whole =
    alongMm !== null && alongMm > aloneMm
      ? withstandOf(alongMm, 'en-theoretical:fast-front-whole-string', 'Fast-front withstand of the whole string')
      : null;
  return { fastFrontKvPeak: governing(aloneMm), whyNot: null, wholeKvPeak: whole };
}

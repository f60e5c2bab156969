import type { StringAssessment } from '../insulator-string';
import { isDisc } from '../insulator-string/unit';
import type {
  ClearancesResult,
  CompanySettings,
  InsulatorUnit,
  PollutionClass,
  RuleOfThumbRow,
  StringResult,
} from '../model';
import type { Situation } from '../situation';

/** Rules of thumb: for checking, never for ordering. */
export interface Checked {
  situation: Situation;
  pollutionClass: PollutionClass | null;
  unit: InsulatorUnit | null;
  string: StringResult | null;
  /** The string with what each criterion asks of it, for the bridge. */
  assessment: StringAssessment | null;
  clearances: ClearancesResult | null;
  settings: CompanySettings;
}

/** A card before it is known whether it means anything here. */
export type Card = Omit<RuleOfThumbRow, 'verdict' | 'inRange'>;

export const NOTHING_TO_COMPARE = 'The sheet has no figure yet to compare.';

/** Completes a card: outside its range it has no estimate and says why; without a figure to compare it passes nothing. */
export function complete(card: Card): RuleOfThumbRow {
  const { estimate, given, band, why } = card;
  if (why !== null || estimate === null) return { ...card, inRange: false, verdict: 'out-of-range' };
  if (given === null || band === null) {
    return { ...card, inRange: true, why: NOTHING_TO_COMPARE, verdict: 'out-of-range' };
  }
  const differs = Math.abs(given - estimate) > band + 1e-9;
  return { ...card, inRange: true, verdict: differs ? 'explain' : 'within' };
}

const ONLY_DISCS = 'The rule counts discs; the string is made of rods.';
const NO_VOLTAGE = 'The nominal voltage is not filled in.';
const OUTSIDE = 'The input lies outside the method.';

/** Why a rule about discs says nothing here; null where it does. */
export function discReason({ situation, unit }: Checked): string | null {
  if (unit !== null && !isDisc(unit)) return ONLY_DISCS;
  if (situation.nominalVoltageKv === null) return NO_VOLTAGE;
  return situation.stopped ? (situation.highestVoltageWhyNot ?? situation.altitudeWhyNot ?? OUTSIDE) : null;
}

/** To the nearest whole, halves upward. */
export const roundHalfUp = (value: number): number => Math.floor(Math.round(value * 1e9) / 1e9 + 0.5);

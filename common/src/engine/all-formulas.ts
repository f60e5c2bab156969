import * as airGaps from './air-gaps';
import * as atmosphere from './atmosphere';
import * as clearances from './clearances/formulas';
import * as gMethod from './g-method';
import * as stringFormulas from './insulator-string/formulas';
import * as mechanical from './mechanical';
import * as overvoltage from './overvoltage';
import * as worksheet from './overvoltage/worksheet/formulas';
import * as pollution from './pollution';
import * as profile from './profile';
import * as risk from './risk';
import * as stringVoltage from './string-voltage';
import type { Formula } from './trace';

export type AnyFormula = Formula<Record<string, number>>;

/** Rooms that hold formulas; a formula of any other room is in no list and in no test. */
const ROOMS = {
  airGaps,
  atmosphere,
  clearances,
  mechanical,
  overvoltage,
  pollution,
  profile,
  risk,
  stringFormulas,
  stringVoltage,
  gMethod,
  worksheet,
};

function isFormula(one: unknown): one is AnyFormula {
  return typeof one === 'function' && 'definition' in one;
}

/** Every published formula that the engine runs, room by room. */
export const ALL_FORMULAS: readonly AnyFormula[] = Object.values(ROOMS).flatMap((room) =>
  (Object.values(room) as unknown[]).filter(isFormula),
);

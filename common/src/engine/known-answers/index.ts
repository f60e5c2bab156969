import { ATMOSPHERE } from './atmosphere';
import { CREEPAGE } from './creepage';
import type { KnownAnswer } from './known-answer';
import { LEVELS_AND_CLEARANCES } from './levels-and-clearances';
import { LINE_CLEARANCES } from './line-clearances';
import { LOADS } from './loads';
import { RISK } from './risk';
import { COUNTS_IN_SERVICE } from './rules-of-thumb';
import { STRING_VOLTAGE } from './string-voltage';
import { WORKSHEET } from './worksheet';

export * from './known-answer';
export * from './left-out';

/** Published examples by topic, in the order the page shows them. */
export const KNOWN_ANSWERS: Readonly<Record<string, readonly KnownAnswer[]>> = {
  'Altitude and air density': ATMOSPHERE,
  'Pollution and creepage': CREEPAGE,
  'Insulation levels and clearances': LEVELS_AND_CLEARANCES,
  'Insulation level worksheet': WORKSHEET,
  'Clearances of lines': LINE_CLEARANCES,
  'Loads on the string': LOADS,
  'Units in service': COUNTS_IN_SERVICE,
  'Voltage along the string': STRING_VOLTAGE,
  'Risk of flashover': RISK,
};

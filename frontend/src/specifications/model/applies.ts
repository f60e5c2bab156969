import type { InsulatorUnit } from '@bellgap/common/api';
import { getIn } from 'formik';
import type { FormValues } from './form';

type Rule = (ask: (path: string) => unknown, unit: InsulatorUnit | null) => boolean;

const isRod = (unit: InsulatorUnit | null): boolean => unit !== null && unit.kind !== 'cap-and-pin';

/** Fields that mean something only where others say so. Those not named here always apply. */
const RULES: Record<string, Rule> = {
  'system.earthFault': (ask) => ask('system.neutralEarthing') !== 'effective' || ask('system.earthFault') !== null,
  'system.overvoltages.slowFrontPhaseToEarthKvPeak': (ask) =>
    ask('clearance.method') === 'en-theoretical' || ask('system.overvoltages.slowFrontPhaseToEarthKvPeak') !== null,
  'system.overvoltages.slowFrontPhaseToPhaseKvPeak': (ask) =>
    ask('clearance.method') === 'en-theoretical' || ask('system.overvoltages.slowFrontPhaseToPhaseKvPeak') !== null,
  'site.pollution.class': (ask) => ask('basis') === 'iec',
  'site.pollution.type': (ask) => ask('basis') === 'iec',
  'site.pollution.contamination': (ask) => ask('basis') === 'north-american',
  'string.rodsInSeries': (_, unit) => unit?.kind === 'ceramic-rod',
  'string.spareUnits': (_, unit) => !isRod(unit),
  'string.arcGapMm': (ask) => ask('string.arcingDevices') === 'horns' || ask('string.arcingDevices') === 'rings',
  'string.vAngleWindwardDeg': (ask) => ask('string.arrangement') === 'v-suspension',
  'string.vAngleLeewardDeg': (ask) => ask('string.arrangement') === 'v-suspension',
  'string.postAngleDeg': (_, unit) => unit?.kind === 'line-post',
  'string.sharing.pinToEarthRatio': (_, unit) => !isRod(unit),
  'string.sharing.pinToLineRatio': (_, unit) => !isRod(unit),
  'mechanical.fittingsStrengthKn': (_, unit) => unit?.kind !== 'line-post',
  'mechanical.crossing': (ask) => ask('mechanical.basis') === 'rd-223',
  'mechanical.acceptedStatistically': (ask) => ask('mechanical.basis') === 'rd-223',
  'clearance.shapePhaseToEarth': (ask) => [null, 'iec-table'].includes(ask('clearance.method') as string | null),
  'clearance.shapePhaseToPhase': (ask) => [null, 'iec-table'].includes(ask('clearance.method') as string | null),
  'clearance.fastFrontFrom': (ask) => ask('clearance.method') === 'en-theoretical',
  'clearance.enGap': (ask) => ask('clearance.method') === 'en-theoretical',
};

/** What is sent as unknown where it does not apply. A class of the other scale is left out by the scale itself. */
export const CONDITIONAL_PATHS = Object.keys(RULES);

export function applies(path: string, values: Pick<FormValues, 'input'>, unit: InsulatorUnit | null): boolean {
  const rule = RULES[path];
  return rule === undefined || rule((asked) => (getIn(values.input, asked) as unknown) ?? null, unit);
}

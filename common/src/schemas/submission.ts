import type { FieldError } from '../api/errors';
import type { SpecificationInput } from '../engine/model';
import { labelOf } from './parts';

/** What a complete specification needs before it may be checked: a fault for each input that is still open. */
export function submissionFaults(input: SpecificationInput): FieldError[] {
  return neededPaths(input)
    .filter((path) => isOpen(input, path))
    .map((path) => ({ path, message: `${labelOf(path)}: is needed before the specification can be checked` }));
}

function neededPaths(input: SpecificationInput): string[] {
  return [
    'basis',
    ...SYSTEM,
    ...(input.basis === 'north-american' ? [] : levelOf(input)),
    'site.altitudeM',
    ...pollutionOf(input),
    ...(input.kind === 'bay' ? [] : stringOf(input)),
    'clearance.method',
  ];
}

const SYSTEM = [
  'system.nominalVoltageKv',
  'system.highestVoltageKv',
  'system.frequencyHz',
  'system.neutralEarthing',
  'system.earthFault',
];

/** Up to here the level names a power-frequency voltage, above it a switching voltage. */
const POWER_FREQUENCY_TO_KV = 245;

function levelOf({ system }: SpecificationInput): string[] {
  const isUpper = (system?.highestVoltageKv ?? 0) > POWER_FREQUENCY_TO_KV;
  return [
    'system.insulationLevel.lightningKv',
    isUpper ? 'system.insulationLevel.switchingKv' : 'system.insulationLevel.powerFrequencyKv',
  ];
}

function pollutionOf({ basis, site }: SpecificationInput): string[] {
  const isNorthAmerican = basis === 'north-american' || (site?.pollution && 'contamination' in site.pollution);
  return isNorthAmerican
    ? ['site.pollution.contamination', 'site.pollution.basis']
    : ['site.pollution.class', 'site.pollution.type', 'site.pollution.basis'];
}

function stringOf({ string }: SpecificationInput): string[] {
  const hasDevices = string?.arcingDevices === 'horns' || string?.arcingDevices === 'rings';
  const isV = string?.arrangement === 'v-suspension';
  return [
    'string.insulatorCode',
    'string.arrangement',
    'string.parallelStrings',
    ...(isV ? ['string.vAngleWindwardDeg', 'string.vAngleLeewardDeg'] : []),
    'string.surroundings',
    'string.arcingDevices',
    ...(hasDevices ? ['string.arcGapMm'] : []),
  ];
}

function isOpen(input: SpecificationInput, path: string): boolean {
  let value: unknown = input;
  for (const key of path.split('.')) {
    if (typeof value !== 'object' || value === null) return true;
    value = (value as Record<string, unknown>)[key];
  }
  return value === null || value === undefined || value === '';
}

import * as yup from 'yup';
import {
  EXTERNAL_INSULATIONS,
  POWER_FREQUENCY_SURFACES,
  SUBCONDUCTOR_COUNTS,
  WORKSHEET_PLACES,
  type WorksheetRow,
} from '../engine/worksheet-model';
import { list, measure, oneOf, part } from './parts';
import type { Field } from './fields';

export interface WorksheetField extends Field {
  /** What to enter, or what is taken where it is left empty. */
  help?: string;
}

/** Every input of the insulation level worksheet by its path: words, unit and limits. */
export const WORKSHEET_FIELDS = {
  highestVoltageKv: { label: 'Highest voltage', basis: 'line to line', unit: 'kV rms', above: 0 },
  altitudeM: {
    label: 'Altitude',
    unit: 'm',
    quantity: 'length-m',
    atLeast: -430,
    help: 'of the highest site; below 1000 m the level is worked out for 1000 m',
  },
  earthFaultFactor: {
    label: 'Earth-fault factor',
    atLeast: 1,
    atMost: 1.9,
    help: 'voltage of the sound phases over the one before the fault',
  },
  loadRejectionFactor: {
    label: 'Load-rejection factor',
    atLeast: 1,
    atMost: 2,
    help: 'voltage between phases over the highest voltage',
  },
  powerFrequencySurface: { label: 'Surface at power frequency' },
  externalInsulation: { label: 'External insulation' },
  switchingPhaseToEarthExponent: {
    label: 'Altitude exponent, switching to earth',
    atLeast: 0,
    atMost: 1,
    help: 'left empty: worked out by the g-method',
  },
  'arrester.switchingProtectionKvPeak': { label: 'Switching protection level', unit: 'kV peak', above: 0 },
  'arrester.lightningProtectionKvPeak': { label: 'Lightning protection level', unit: 'kV peak', above: 0 },
  'places.place': { label: 'Place' },
  'places.slowFrontPhaseToEarthPu': { label: 'Slow front to earth, exceeded in 2 %, p.u.', atLeast: 1, atMost: 6 },
  'places.slowFrontPhaseToPhasePu': {
    label: 'Slow front between phases, exceeded in 2 %, p.u.',
    atLeast: 1,
    atMost: 9,
  },
  'places.phaseToEarthCoordinationFactor': {
    label: 'Co-ordination factor to earth',
    atLeast: 1,
    atMost: 1.1,
    help: "left empty: the straight line in place of the standard's curve",
  },
  'places.phaseToPhaseCoordinationFactor': {
    label: 'Co-ordination factor between phases',
    atLeast: 1,
    atMost: 1.1,
    help: "left empty: the straight line in place of the standard's curve",
  },
  'fastFront.subconductorsCount': { label: 'Sub-conductors of the line' },
  'fastFront.linesConnectedCount': { label: 'Lines that stay connected', atLeast: 1, atMost: 20, whole: true },
  'fastFront.spanM': { label: 'Span of the line', unit: 'm', quantity: 'length-m', above: 0 },
  'fastFront.lineOutageRatePerKmYear': { label: 'Line outages per km and year', above: 0 },
  'fastFront.acceptedFailureRatePerYear': { label: 'Accepted failures per year', above: 0 },
  'fastFront.arresterToInternalM': {
    label: 'Arrester to internal insulation',
    unit: 'm',
    quantity: 'length-m',
    atLeast: 0,
  },
  'fastFront.arresterToExternalM': {
    label: 'Arrester to external insulation',
    unit: 'm',
    quantity: 'length-m',
    atLeast: 0,
  },
} as const satisfies Record<string, WorksheetField>;

export type WorksheetPath = keyof typeof WORKSHEET_FIELDS;

/** The field of a path, widened, so that every property can be asked; rows of a list share their fields. */
export function worksheetFieldOf(path: string): WorksheetField | undefined {
  return (WORKSHEET_FIELDS as Record<string, WorksheetField>)[path.replace(/\[\d+\]/g, '')];
}

/** The words of every choice of the worksheet. */
export const WORKSHEET_CHOICES = {
  powerFrequencySurface: {
    'dry-or-clean': 'Dry or clean',
    'polluted-standard': 'Polluted, standard profile',
    'polluted-anti-fog': 'Polluted, anti-fog profile',
  },
  externalInsulation: { 'air-or-dry': 'Air gaps and dry insulators', 'wet-insulators': 'Wet insulators' },
  place: { 'line-entrance': 'Line entrance', 'other-equipment': 'Other equipment' },
  subconductorsCount: Object.fromEntries(SUBCONDUCTOR_COUNTS.map((count) => [count, String(count)])),
} as const;

/** The words of what the worksheet answers. */
export const WORKSHEET_WORDS = {
  stress: { temporary: 'Temporary', 'slow-front': 'Slow front', 'fast-front': 'Fast front' },
  insulation: { external: 'external insulation', internal: 'internal insulation' },
  distance: { 'phase-to-earth': 'to earth', 'phase-to-phase': 'between phases' },
} as const satisfies {
  [Name in 'stress' | 'insulation' | 'distance']: Record<WorksheetRow[Name], string>;
};

const label = (path: WorksheetPath): string => WORKSHEET_FIELDS[path].label;
const figure = (path: WorksheetPath) => measure(label(path), WORKSHEET_FIELDS[path] as Field);

/** What can be read at all of a worksheet; every input may be null, what depends on it is then not assessed. */
export const worksheetInputSchema = yup
  .object({
    highestVoltageKv: figure('highestVoltageKv'),
    altitudeM: figure('altitudeM'),
    earthFaultFactor: figure('earthFaultFactor'),
    loadRejectionFactor: figure('loadRejectionFactor'),
    powerFrequencySurface: oneOf(label('powerFrequencySurface'), POWER_FREQUENCY_SURFACES),
    externalInsulation: oneOf(label('externalInsulation'), EXTERNAL_INSULATIONS),
    switchingPhaseToEarthExponent: figure('switchingPhaseToEarthExponent'),
    arrester: part({
      switchingProtectionKvPeak: figure('arrester.switchingProtectionKvPeak'),
      lightningProtectionKvPeak: figure('arrester.lightningProtectionKvPeak'),
    }),
    places: list(
      'Places',
      part({
        place: oneOf(label('places.place'), WORKSHEET_PLACES),
        slowFrontPhaseToEarthPu: figure('places.slowFrontPhaseToEarthPu'),
        slowFrontPhaseToPhasePu: figure('places.slowFrontPhaseToPhasePu'),
        phaseToEarthCoordinationFactor: figure('places.phaseToEarthCoordinationFactor'),
        phaseToPhaseCoordinationFactor: figure('places.phaseToPhaseCoordinationFactor'),
      }),
      WORKSHEET_PLACES.length,
    ).test('each-place-once', 'Places: each place once', (places) => {
      const named = (places ?? []) as ({ place?: string | null } | null)[];
      const given = named.flatMap((one) => (one?.place ? [one.place] : []));
      return new Set(given).size === given.length;
    }),
    fastFront: part({
      subconductorsCount: figure('fastFront.subconductorsCount').oneOf(
        [...SUBCONDUCTOR_COUNTS, null],
        `${label('fastFront.subconductorsCount')}: choose one of ${SUBCONDUCTOR_COUNTS.join(', ')}`,
      ),
      linesConnectedCount: figure('fastFront.linesConnectedCount'),
      spanM: figure('fastFront.spanM'),
      lineOutageRatePerKmYear: figure('fastFront.lineOutageRatePerKmYear'),
      acceptedFailureRatePerYear: figure('fastFront.acceptedFailureRatePerYear'),
      arresterToInternalM: figure('fastFront.arresterToInternalM'),
      arresterToExternalM: figure('fastFront.arresterToExternalM'),
    }),
  })
  .noUnknown()
  .required();

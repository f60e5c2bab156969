import type { WorksheetInput } from '@bellgap/common/api';
import { WORKSHEET_CHOICES, worksheetFieldOf } from '@bellgap/common/schemas';
import { getIn } from 'formik';
import { PLACES, worksheetValues } from './worksheet-values';

export interface WorksheetGroup {
  title: string;
  /** What leaving the whole group empty means. */
  note?: string;
  paths: readonly string[];
}

/** Inputs of the worksheet in the order in which the overvoltages are worked out. */
export const WORKSHEET_GROUPS: readonly WorksheetGroup[] = [
  { title: 'Site', paths: ['altitudeM', 'externalInsulation', 'switchingPhaseToEarthExponent'] },
  {
    title: 'Temporary overvoltages',
    paths: ['earthFaultFactor', 'loadRejectionFactor', 'powerFrequencySurface'],
  },
  {
    title: 'Arresters',
    note: 'Both left empty: there are none. The method then has no fast-front figure.',
    paths: ['arrester.switchingProtectionKvPeak', 'arrester.lightningProtectionKvPeak'],
  },
  ...PLACES.map((place, index) => ({
    title: `Slow front, ${WORKSHEET_CHOICES.place[place].toLowerCase()}`,
    ...(place === 'line-entrance' && { note: 'Left empty where no line enters.' }),
    paths: [
      'slowFrontPhaseToEarthPu',
      'slowFrontPhaseToPhasePu',
      'phaseToEarthCoordinationFactor',
      'phaseToPhaseCoordinationFactor',
    ].map((name) => `places[${index}].${name}`),
  })),
  {
    title: 'Fast front from the lines',
    paths: [
      'subconductorsCount',
      'linesConnectedCount',
      'spanM',
      'lineOutageRatePerKmYear',
      'acceptedFailureRatePerYear',
      'arresterToInternalM',
      'arresterToExternalM',
    ].map((name) => `fastFront.${name}`),
  },
];

/** The words of the choices at a path; undefined where it holds a figure. */
export function worksheetChoicesAt(path: string): Record<string, string> | undefined {
  const name = path.split('.').at(-1) ?? path;
  return (WORKSHEET_CHOICES as Record<string, Record<string, string>>)[name];
}

export interface WorksheetRowWords {
  label: string;
  text: string | null;
}

function rowAt(path: string, value: unknown): WorksheetRowWords {
  const field = worksheetFieldOf(path);
  const label = [field?.label ?? path, field?.basis].filter(Boolean).join(', ');
  if (value === null || value === undefined) return { label, text: null };
  const text = String(value as string | number);
  return { label, text: worksheetChoicesAt(path)?.[text] ?? [text, field?.unit].filter(Boolean).join(' ') };
}

/** A stored worksheet as named values, group by group. */
export function worksheetRows(stored: WorksheetInput): { title: string; rows: WorksheetRowWords[] }[] {
  const values = { ...worksheetValues(stored), highestVoltageKv: stored.highestVoltageKv };
  return WORKSHEET_GROUPS.map(({ title, paths }, index) => ({
    title,
    rows: [...(index === 0 ? ['highestVoltageKv'] : []), ...paths].map((path) =>
      rowAt(path, getIn(values, path) as unknown),
    ),
  }));
}

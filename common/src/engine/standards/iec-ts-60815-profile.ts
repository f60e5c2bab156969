import type { Status } from '../model';
import { IEC_60815 } from '../sources';
import type { StandardTable } from './table';

export const PROFILE_PARAMETERS = [
  'shed spacing over overhang',
  'distance between sheds',
  'creepage over clearance',
  'difference of overhangs',
  'creepage factor',
] as const;

/** One limit of the profile of an insulator under pollution; one of the three figures is there. */
export interface ProfileLimitRow {
  parameter: (typeof PROFILE_PARAMETERS)[number];
  appliesTo: string;
  leastRatio: number | null;
  mostRatio: number | null;
  leastMm: number | null;
}

const limit = (
  parameter: ProfileLimitRow['parameter'],
  appliesTo: string,
  figure: Partial<Pick<ProfileLimitRow, 'leastRatio' | 'mostRatio' | 'leastMm'>>,
): ProfileLimitRow & { status: Status } => ({
  parameter,
  appliesTo,
  leastRatio: null,
  mostRatio: null,
  leastMm: null,
  ...figure,
  status: 'memory',
});

/** Limits of the profile: they change no figure, and what passes them is said. */
export const PROFILE_LIMITS: StandardTable<ProfileLimitRow> = {
  key: 'iec-ts-60815:profile',
  title: 'Profile of insulators under pollution: limits of the sheds and of the creepage factor',
  document: 'IEC TS 60815-2 and -3',
  edition: `2008; ${IEC_60815.document}:${IEC_60815.edition} Annex D`,
  clause: 'profile parameters',
  rule: 'rows-as-printed',
  identifiedBy: ['parameter', 'appliesTo'],
  remarks: [
    'From memory: single limits as the edition of 1986 has them. The later parts grade deviations into minor and major ones by curves, which are not held.',
    'The classes of 1986 are read as those of the later parts: light and medium as a to c, heavy and very heavy as d and e.',
  ],
  rows: [
    limit('shed spacing over overhang', 'sheds without under-ribs', { leastRatio: 0.65 }),
    limit('shed spacing over overhang', 'sheds with under-ribs', { leastRatio: 0.8 }),
    limit('distance between sheds', 'overhang up to 40 mm', { leastMm: 20 }),
    limit('distance between sheds', 'overhang over 40 mm', { leastMm: 30 }),
    limit('creepage over clearance', 'every profile', { mostRatio: 5 }),
    limit('difference of overhangs', 'alternating sheds', { leastMm: 15 }),
    limit('creepage factor', 'classes a to c', { mostRatio: 3.5 }),
    limit('creepage factor', 'classes d and e', { mostRatio: 4 }),
  ],
};

import type { SpecificationInput } from '@bellgap/common/api';
import type { Override } from '../specifications/inheritance';
import { EN_CLEARANCE, LINE_CLEARANCE, site, string } from './inputs';
import type { Author } from './people';

/** One save of a document: who, when, and what it adds to the input so far. */
export interface StorySave {
  by: Author;
  at: string;
  input: Partial<SpecificationInput>;
  /** Departures from the design basis: value by path, with the reason. */
  overrides?: (Override & { value: unknown })[];
}

export type StoryStep =
  | {
      kind: 'basis';
      projectCode: string;
      by: Author;
      at: string;
      revision: number;
      faultCurrentKa: number;
      note: string;
    }
  | {
      kind: 'specification';
      projectCode: string;
      number: string;
      title: string;
      by: Author;
      at: string;
      saves: StorySave[];
      sheetAt?: string;
    };

/** Documents of the two lines in the order in which they were made. Dates of the story, UTC; figures are invented. */
export const STORY: readonly StoryStep[] = [
  {
    kind: 'specification',
    projectCode: 'KL221',
    number: 'INS-221-001',
    title: 'Suspension strings, Z1-Z2',
    by: 'orvelle',
    at: '2026-01-19T06:10:00Z',
    saves: [
      {
        by: 'orvelle',
        at: '2026-01-19T07:45:00Z',
        input: {
          site: site(500, 'e', 'measured', { type: 'B', recheckBy: '2027-10-31' }),
          string: string('G160-F', 'suspension'),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
    sheetAt: '2026-01-19T07:50:00Z',
  },
  {
    kind: 'specification',
    projectCode: 'KL221',
    number: 'INS-221-002',
    title: 'Tension strings, Z1-Z2',
    by: 'orvelle',
    at: '2026-01-20T05:30:00Z',
    saves: [
      {
        by: 'orvelle',
        at: '2026-01-20T06:20:00Z',
        input: {
          site: site(500, 'e', 'measured', { type: 'B', recheckBy: '2027-10-31' }),
          string: string('G160-F', 'tension', {
            parallelStrings: 2,
            arcingDevices: 'horns',
            arcGapMm: 2100,
            hardwareLengthMm: 760,
          }),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
  },
  {
    kind: 'specification',
    projectCode: 'KL132',
    number: 'INS-132-002',
    title: 'Re-insulation, Z9-Z11',
    by: 'bakkarash',
    at: '2026-02-03T06:00:00Z',
    saves: [
      {
        by: 'bakkarash',
        at: '2026-02-03T09:15:00Z',
        input: {
          site: site(3900, 'a', 'assumed'),
          string: string('U120B', 'suspension', { hardwareLengthMm: 310 }),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
  },
  {
    kind: 'basis',
    projectCode: 'KL132',
    by: 'orvelle',
    at: '2026-02-16T06:00:00Z',
    revision: 2,
    faultCurrentKa: 40,
    note: 'Fault current 40 kA after the second transformer at the mine',
  },
  {
    kind: 'specification',
    projectCode: 'KL132',
    number: 'INS-132-001',
    title: 'Re-insulation, Z8 Ferriston',
    by: 'orvelle',
    at: '2026-02-17T05:20:00Z',
    saves: [
      {
        by: 'orvelle',
        at: '2026-02-17T08:05:00Z',
        input: {
          site: site(1700, 'e', 'measured', { recheckBy: '2027-06-30' }),
          string: string('G120-F', 'suspension', { hardwareLengthMm: 310 }),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
  },
  {
    kind: 'specification',
    projectCode: 'KL132',
    number: 'INS-132-003',
    title: 'Re-insulation, Z12 Mine',
    by: 'orvelle',
    at: '2026-02-24T06:40:00Z',
    saves: [
      {
        by: 'orvelle',
        at: '2026-02-24T07:30:00Z',
        input: {
          site: site(3800, 'd', 'measured', { recheckBy: '2027-06-30' }),
          string: string('C120-132', 'suspension', { hardwareLengthMm: 280 }),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
  },
  {
    kind: 'specification',
    projectCode: 'KL221',
    number: 'INS-221-003',
    title: 'All strings, Z3',
    by: 'orvelle',
    at: '2026-03-04T05:40:00Z',
    saves: [
      {
        by: 'orvelle',
        at: '2026-03-04T10:02:00Z',
        input: {
          site: site(900, 'd', 'measured', { recheckBy: '2027-10-31' }),
          string: string('G160-S', 'suspension'),
          clearance: LINE_CLEARANCE,
        },
      },
    ],
    sheetAt: '2026-03-04T10:05:00Z',
  },
  {
    kind: 'specification',
    projectCode: 'KL221',
    number: 'INS-221-004',
    title: 'All strings, Z5 Harrow Saddle',
    by: 'bakkarash',
    at: '2026-03-09T06:15:00Z',
    saves: [
      {
        by: 'bakkarash',
        at: '2026-03-09T11:30:00Z',
        input: {
          site: site(2400, 'b', 'assumed', { recheckBy: '2027-05-31' }),
          string: string('U160BL', 'v-suspension', {
            surroundings: 'window',
            vAngleWindwardDeg: 45,
            vAngleLeewardDeg: 45,
            hardwareLengthMm: 520,
          }),
          clearance: EN_CLEARANCE,
        },
        overrides: [
          {
            path: 'system.faultCurrentKa',
            value: 25,
            reason: 'Fault level in the middle of the line after the network study; both ends keep 31.5 kA',
          },
        ],
      },
    ],
  },
  {
    kind: 'specification',
    projectCode: 'KL221',
    number: 'INS-221-005',
    title: 'All strings, Z4 and Z6',
    by: 'orvelle',
    at: '2026-03-12T07:00:00Z',
    saves: [
      { by: 'orvelle', at: '2026-03-12T07:20:00Z', input: { site: site(1900, 'c', 'estimated') } },
      {
        by: 'bakkarash',
        at: '2026-03-15T12:40:00Z',
        input: { string: { ...string('', 'suspension'), insulatorCode: null, arcingDevices: null } },
      },
    ],
  },
];

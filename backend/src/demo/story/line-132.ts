import { LINE_CLEARANCE, site, string } from '../inputs';
import type { StoryBasis, StoryDocument } from './steps';

/** Documents of the line KL132. Figures are invented. */
export const LINE_132: readonly StoryDocument[] = [
  {
    projectCode: 'KL132',
    number: 'INS-132-001',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-02-17T05:20:00Z', title: 'Re-insulation, Z8 Ferriston' },
      {
        kind: 'save',
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
    projectCode: 'KL132',
    number: 'INS-132-002',
    acts: [
      { kind: 'create', by: 'bakkarash', at: '2026-02-03T06:00:00Z', title: 'Re-insulation, Z9-Z11' },
      {
        kind: 'save',
        by: 'bakkarash',
        at: '2026-02-03T09:15:00Z',
        input: {
          site: site(3900, 'a', 'assumed'),
          string: string('U120B', 'suspension', { hardwareLengthMm: 300 }),
          clearance: LINE_CLEARANCE,
        },
      },
      {
        kind: 'save',
        by: 'castellary',
        at: '2026-02-05T10:40:00Z',
        input: { string: string('U120B', 'suspension', { hardwareLengthMm: 310 }) },
      },
      {
        kind: 'submit',
        by: 'bakkarash',
        at: '2026-03-13T06:00:00Z',
        dueOn: '2026-03-20',
        note: 'Above the altitude at which one of the tables ends',
      },
    ],
  },
  {
    projectCode: 'KL132',
    number: 'INS-132-003',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-02-24T06:40:00Z', title: 'Re-insulation, Z12 Mine' },
      {
        kind: 'save',
        by: 'orvelle',
        at: '2026-02-24T07:30:00Z',
        input: {
          site: site(3800, 'd', 'measured', { recheckBy: '2027-06-30' }),
          string: string('C120-132', 'suspension', { hardwareLengthMm: 280 }),
          clearance: LINE_CLEARANCE,
        },
      },
      {
        kind: 'submit',
        by: 'orvelle',
        at: '2026-03-06T06:10:00Z',
        dueOn: '2026-03-17',
        note: 'Dirty and high together',
      },
      {
        kind: 'check',
        by: 'sandermo',
        at: '2026-03-12T07:25:00Z',
        verdict: 'pass',
        note: '',
        differenceReason: 'The rules end far below this altitude; compared with the table of the source instead.',
      },
    ],
  },
];

export const BASIS_132: StoryBasis = {
  projectCode: 'KL132',
  by: 'orvelle',
  at: '2026-02-16T06:00:00Z',
  revision: 2,
  faultCurrentKa: 40,
  note: 'Fault current 40 kA after the second transformer at the mine',
};

import { EN_CLEARANCE, LINE_CLEARANCE, site, string } from '../inputs';
import type { StoryDocument } from './steps';

/** Documents of the line KL221. Figures are invented. */
export const LINE_221: readonly StoryDocument[] = [
  {
    projectCode: 'KL221',
    number: 'INS-221-001',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-01-19T06:10:00Z', title: 'Suspension strings, Z1-Z2' },
      {
        kind: 'save',
        by: 'orvelle',
        at: '2026-01-19T07:45:00Z',
        input: {
          site: site(500, 'd', 'estimated', { type: 'B' }),
          string: string('G160-F', 'suspension'),
          clearance: LINE_CLEARANCE,
        },
      },
      { kind: 'draw', by: 'orvelle', at: '2026-01-19T07:50:00Z' },
      {
        kind: 'submit',
        by: 'orvelle',
        at: '2026-01-19T08:05:00Z',
        dueOn: '2026-01-23',
        note: 'Class before the campaign',
      },
      {
        kind: 'check',
        by: 'castellary',
        at: '2026-01-21T05:30:00Z',
        verdict: 'pass',
        note: '',
        differenceReason: 'The rule counts ordinary discs at moderate pollution; the coast asks for more creepage.',
      },
      { kind: 'issue', by: 'holvenstein', at: '2026-01-22T06:00:00Z', reason: 'Until the campaign at MS-01 is read' },
      { kind: 'take-copy', by: 'brant', at: '2026-01-26T05:10:00Z' },
      { kind: 'take-copy', by: 'grebe', at: '2026-02-02T04:40:00Z' },
      { kind: 'next', by: 'orvelle', at: '2026-03-02T06:00:00Z' },
      {
        kind: 'save',
        by: 'orvelle',
        at: '2026-03-02T06:30:00Z',
        input: { site: site(500, 'e', 'measured', { type: 'B', recheckBy: '2027-10-31' }) },
      },
      {
        kind: 'submit',
        by: 'orvelle',
        at: '2026-03-02T07:00:00Z',
        dueOn: '2026-03-06',
        note: 'Class raised after the readings at MS-01',
      },
      {
        kind: 'check',
        by: 'castellary',
        at: '2026-03-04T08:15:00Z',
        verdict: 'pass',
        note: '',
        differenceReason: 'The rule knows no very heavy pollution; the readings at MS-01 were seen.',
      },
      {
        kind: 'issue',
        by: 'holvenstein',
        at: '2026-03-05T05:45:00Z',
        reason: 'Seen with the readings of the campaign',
      },
    ],
  },
  {
    projectCode: 'KL221',
    number: 'INS-221-002',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-01-20T05:30:00Z', title: 'Tension strings, Z1-Z2' },
      {
        kind: 'save',
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
      { kind: 'submit', by: 'orvelle', at: '2026-03-03T06:20:00Z', dueOn: '2026-03-10', note: '' },
      {
        kind: 'check',
        by: 'sandermo',
        at: '2026-03-05T09:40:00Z',
        verdict: 'pass-with-notes',
        note: 'Ask the maker for the gap of the horns with the fittings he offers.',
        differenceReason: 'Tension strings of a dirty coast; the rule is meant for clean country.',
      },
      { kind: 'issue', by: 'ulundimarsh', at: '2026-03-09T05:20:00Z', reason: 'Same site and readings as INS-221-001' },
    ],
  },
  {
    projectCode: 'KL221',
    number: 'INS-221-003',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-03-04T05:40:00Z', title: 'All strings, Z3' },
      {
        kind: 'save',
        by: 'orvelle',
        at: '2026-03-04T10:02:00Z',
        input: {
          site: site(900, 'd', 'measured', { recheckBy: '2027-10-31' }),
          string: string('G160-S', 'suspension'),
          clearance: LINE_CLEARANCE,
        },
      },
      { kind: 'draw', by: 'orvelle', at: '2026-03-04T10:05:00Z' },
      {
        kind: 'submit',
        by: 'orvelle',
        at: '2026-03-11T06:30:00Z',
        dueOn: '2026-03-18',
        note: 'One kind of string for the whole zone',
      },
    ],
  },
  {
    projectCode: 'KL221',
    number: 'INS-221-004',
    acts: [
      { kind: 'create', by: 'bakkarash', at: '2026-03-09T06:15:00Z', title: 'All strings, Z5 Harrow Saddle' },
      {
        kind: 'save',
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
      { kind: 'submit', by: 'bakkarash', at: '2026-03-10T05:15:00Z', dueOn: '2026-03-17', note: '' },
      {
        kind: 'check',
        by: 'castellary',
        at: '2026-03-12T09:05:00Z',
        verdict: 'return',
        note: 'The altitude does not fit the line list; see the two remarks.',
        differenceReason: '',
        remarks: [
          {
            path: 'site.altitudeM',
            text: 'The survey has 7,870 for the saddle, in feet. Was a figure in feet brought to metres and rounded, or read as it stands?',
          },
          { path: 'site.pollution.class', text: 'Class b is assumed. Which station is it taken from?' },
        ],
      },
    ],
  },
  {
    projectCode: 'KL221',
    number: 'INS-221-005',
    acts: [
      { kind: 'create', by: 'orvelle', at: '2026-03-12T07:00:00Z', title: 'All strings, Z4 and Z6' },
      { kind: 'save', by: 'orvelle', at: '2026-03-12T07:20:00Z', input: { site: site(1900, 'c', 'estimated') } },
      {
        kind: 'save',
        by: 'bakkarash',
        at: '2026-03-15T12:40:00Z',
        input: { string: { ...string('', 'suspension'), insulatorCode: null, arcingDevices: null } },
      },
    ],
  },
];

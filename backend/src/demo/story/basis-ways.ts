import type { StoryBasisWay } from './steps';

/** How the design bases of both lines came to be issued. */
export const BASIS_WAYS: readonly StoryBasisWay[] = [
  {
    projectCode: 'KL221',
    revision: 2,
    moves: [
      { move: 'submit', by: 'orvelle', at: '2025-06-30T06:20:00Z', note: 'Only the highest voltage differs' },
      { move: 'check', by: 'castellary', at: '2025-07-02T09:10:00Z', note: 'Seen in the grid code: 245 kV' },
      { move: 'issue', by: 'holvenstein', at: '2025-07-03T05:40:00Z', note: '' },
    ],
  },
  {
    projectCode: 'KL132',
    revision: 1,
    moves: [
      { move: 'submit', by: 'orvelle', at: '2025-07-14T07:00:00Z', note: '' },
      { move: 'check', by: 'castellary', at: '2025-07-16T06:30:00Z', note: '' },
      { move: 'issue', by: 'holvenstein', at: '2025-07-17T08:15:00Z', note: '' },
    ],
  },
  {
    projectCode: 'KL132',
    revision: 2,
    moves: [
      { move: 'submit', by: 'orvelle', at: '2026-02-16T06:10:00Z', note: 'Wanted before Z8 is begun' },
      { move: 'check', by: 'castellary', at: '2026-02-16T08:45:00Z', note: '' },
      { move: 'issue', by: 'holvenstein', at: '2026-02-16T11:20:00Z', note: '' },
    ],
  },
];

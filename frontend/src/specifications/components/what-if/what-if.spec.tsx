import type { Sweep, WhatIf } from '@bellgap/common/api';
import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { makeQueryClient } from '../../../api/queries';
import { discUnit, suspensionCase } from '@bellgap/common/drawing/fixtures';
import { anEvaluation, FakeServer } from '../../testing/fake-server';
import { WhatIfAction } from './index';

const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });
let server: FakeServer;

const figures = (given: Partial<WhatIf['cases'][number]['before']> = {}): WhatIf['cases'][number]['before'] => ({
  insulatorCode: 'G160-S',
  units: 17,
  governedBy: 'pollution',
  marginPercent: 2.69,
  creepageRequiredMm: 6124.8,
  phaseToEarthMm: 1900,
  worst: 'caution',
  ...given,
});

const CASES: WhatIf['cases'] = [
  {
    id: 'class-dirtier',
    title: 'One class dirtier',
    changed: 'class d to e',
    available: true,
    why: null,
    before: figures(),
    after: figures({ units: 21, marginPercent: 1.2, creepageRequiredMm: 7600.1 }),
  },
  {
    id: 'altitude-plus-200',
    title: '200 m higher',
    changed: '900 to 1,100 m',
    available: true,
    why: null,
    before: figures(),
    after: figures(),
  },
  {
    id: 'next-profile',
    title: 'Next profile',
    changed: '',
    available: false,
    why: 'The catalogue has no other profile of this strength.',
    before: figures(),
    after: null,
  },
];

const sweepOf = (altitudesM: number[], classes: string[]): Sweep => ({
  cells: altitudesM.flatMap((altitudeM) =>
    classes.map((name, index) => ({
      altitudeM,
      class: name as 'a',
      units: name === 'e' && altitudeM === 4000 ? null : 10 + 2 * index + (altitudeM > 1000 ? 1 : 0),
      governedBy: 'pollution' as const,
      worst: altitudeM > 3000 ? ('acceptance' as const) : null,
    })),
  ),
});

beforeEach(() => {
  server = new FakeServer();
  server.whatIf = { cases: CASES };
  server.sweep = sweepOf([0, 500, 900, 1000, 1500, 2000, 2500, 3000, 3500, 4000], ['a', 'b', 'c', 'd', 'e']);
  globalThis.fetch = server.fetch as unknown as typeof fetch;
});

async function openDrawer() {
  const { input } = suspensionCase;
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <WhatIfAction
        address={{ code: 'KL221', number: 'INS-221-003', label: 'A' }}
        answer={{ evaluation: anEvaluation(17), input, key: JSON.stringify(input) }}
        unit={discUnit()}
      />
    </QueryClientProvider>,
  );
  await user.click(screen.getByRole('button', { name: 'What if' }));
  await screen.findByText('One class dirtier');
}

const asked = (path: string) => server.asked.filter((one) => one.path.endsWith(path));

describe('what if', () => {
  it('asks nothing until it is opened, then once for the cases and once for the sweep', async () => {
    await openDrawer();
    expect(asked('/what-if')).toHaveLength(1);
    await waitFor(() => expect(asked('/sweep')).toHaveLength(1));
    expect(asked('/sweep')[0]?.body).toMatchObject({
      altitudesM: [0, 500, 900, 1000, 1500, 2000, 2500, 3000, 3500, 4000],
      classes: ['a', 'b', 'c', 'd', 'e'],
    });
    expect(server.saves()).toHaveLength(0);
  });

  it('shows what changes before and after, says what does not, and why a case cannot be had', async () => {
    await openDrawer();
    const dirtier = screen.getByText('One class dirtier').closest('li')!;
    expect(within(dirtier).getByText('class d to e')).toBeInTheDocument();
    expect(within(dirtier).getByText('Units').parentElement).toHaveTextContent('Units17 → to 21');
    expect(within(dirtier).getByText('Creepage needed').parentElement).toHaveTextContent('7,601');
    expect(dirtier).toHaveTextContent('The same: unit, governs, distance to earth, gravest caution.');
    expect(screen.getByText('200 m higher').closest('li')).toHaveTextContent('17 as it is');
    expect(screen.getByText('The catalogue has no other profile of this strength.')).toBeInTheDocument();
  });

  it('keeps a case as a note with its numbers, and lets its author delete it', async () => {
    await openDrawer();
    expect(await screen.findByText(/None yet/)).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Keep as note: One class dirtier' }));
    await user.type(screen.getByLabelText('Why it is kept, if you like'), 'Zone Z4 is dirtier');
    await user.click(screen.getByRole('button', { name: 'Keep' }));
    expect(await screen.findByText('Zone Z4 is dirtier')).toBeInTheDocument();
    const posted = asked('/notes').find(({ method }) => method === 'POST');
    expect(posted?.body).toEqual({
      title: 'One class dirtier: class d to e',
      text: 'Zone Z4 is dirtier',
      figures: { before: CASES[0]!.before, after: CASES[0]!.after },
    });
    await user.click(screen.getByRole('button', { name: /^Delete the note/ }));
    expect(await screen.findByText(/None yet/)).toBeInTheDocument();
  });

  it('leaves the notes of others alone', async () => {
    server.notes = [
      {
        id: 'n',
        title: 'By another',
        text: '',
        figures: null as never,
        writtenBy: 'J',
        writtenAt: '2026-03-12T10:00:00Z',
        own: false,
      },
    ];
    await openDrawer();
    expect(await screen.findByText('By another')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /^Delete/ })).not.toBeInTheDocument();
  });

  it('maps units by altitude and class as a grid that the arrow keys move over', async () => {
    await openDrawer();
    const grid = await screen.findByRole('grid');
    const here = within(grid).getByText(', present site').closest('td')!;
    expect(here).toHaveTextContent('16');
    expect(here).toHaveAttribute('tabindex', '0');
    expect(within(grid).getAllByRole('gridcell')).toHaveLength(50);
    expect(
      within(grid)
        .getAllByRole('gridcell')
        .filter((cell) => cell.tabIndex === 0),
    ).toHaveLength(1);
    await user.click(here);
    fireEvent.keyDown(here, { key: 'ArrowDown' });
    fireEvent.keyDown(document.activeElement!, { key: 'End' });
    expect(document.activeElement).toHaveTextContent('no count');
    expect(
      screen.getByText('4,000 m, class e, very heavy: no count, pollution governs, gravest caution: acceptance.'),
    ).toBeInTheDocument();
  });
});

import type { Revision } from '@bellgap/common/api';
import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { makeQueryClient } from '../../api/queries';
import { aRevision, FakeServer, problem } from '../testing/fake-server';
import { SpecificationPage } from './specification-page';

const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });
const ADDRESS = '/projects/KL221/specifications/INS-221-003';
let server: FakeServer;

beforeEach(() => {
  server = new FakeServer();
  globalThis.fetch = server.fetch as unknown as typeof fetch;
  localStorage.clear();
});

function openPage(given: Partial<Revision>) {
  server.revision = aRevision(given as Parameters<typeof aRevision>[0]);
  const router = createMemoryRouter(
    ['', '/revisions/:label'].map((end) => ({
      path: `/projects/:code/specifications/:number${end}`,
      element: <SpecificationPage />,
    })),
    { initialEntries: [ADDRESS] },
  );
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
}

const altitude = () => screen.findByLabelText(/^Altitude/);
const moved = (end: string) => server.asked.filter(({ path }) => path.endsWith(end));

describe('from draft to check', () => {
  it('asks which check, by when and with which note, and is read only from then on', async () => {
    openPage({});
    await user.click(await screen.findByText('Submit for check'));
    const form = within(screen.getByRole('region', { name: 'Submit for check' }));
    await user.click(form.getByText('Submit it'));
    expect(await form.findByText('Is needed')).toBeInTheDocument();
    await user.click(form.getByLabelText('Check category'));
    await user.click(await screen.findByText('2, independent check'));
    fireEvent.change(form.getByLabelText('Wanted by'), { target: { value: '2026-03-20' } });
    await user.type(form.getByLabelText('Note to the checker'), 'Z3 only');
    await user.click(form.getByText('Submit it'));
    await waitFor(() => expect(moved('/submissions')).toHaveLength(1));
    expect(moved('/submissions')[0]).toMatchObject({
      headers: { 'If-Match': '"4"' },
      body: { checkCategory: 2, dueOn: '2026-03-20', note: 'Z3 only' },
    });
    expect(await screen.findAllByText('In check')).toHaveLength(2);
    expect(await altitude()).toHaveAttribute('readonly');
  });

  it('lists what stands in the way, each leading to its field', async () => {
    openPage({});
    server.refuseMove = () =>
      problem(422, 'validation', {
        errors: [
          { path: 'input.site.altitudeM', message: 'Altitude: is needed before the specification can be checked' },
        ],
      });
    await user.click(await screen.findByText('Submit for check'));
    await user.click(screen.getByLabelText('Check category'));
    await user.click(await screen.findByText('3, check from outside'));
    await user.click(screen.getByText('Submit it'));
    await user.click(await screen.findByText(/^Altitude: is needed before/));
    expect(await altitude()).toHaveFocus();
  });

  it('is taken back with a reason by who submitted it', async () => {
    openPage({
      state: 'in_check',
      submitted: { name: 'Tamsin Orvelle', on: '2026-03-12', dueOn: '2026-03-20', checkCategory: 2, note: '' },
      moves: [
        { name: 'recall', allowed: true, why: null },
        { name: 'pass', allowed: false, why: 'Only checkers of this project check.' },
        { name: 'return', allowed: false, why: 'Only checkers of this project check.' },
      ],
    });
    expect(await screen.findByText(/Submitted for check by Tamsin Orvelle on 12 Mar 2026/)).toBeInTheDocument();
    expect(screen.getByText('Check it: Only checkers of this project check.')).toBeInTheDocument();
    await user.click(screen.getByText('Take back'));
    await user.type(screen.getByLabelText('Reason'), 'The class is wrong');
    await user.click(screen.getByText('Take it back'));
    await waitFor(() => expect(moved('/recalls')[0]?.body).toEqual({ reason: 'The class is wrong' }));
    expect(await altitude()).not.toHaveAttribute('readonly');
  });

  it('says why and what to do when it was returned', async () => {
    openPage({ returned: { at: '2026-03-14T08:00:00Z', note: 'Look at the altitude again.' }, openRemarks: 2 });
    expect(await screen.findByText('Look at the altitude again.')).toBeInTheDocument();
    expect(screen.getByText('2 open remarks')).toHaveAttribute('href', '#remarks');
    expect(await screen.findByRole('region', { name: 'Remarks' })).toBeInTheDocument();
  });
});

describe('figures hidden from a checker', () => {
  it('leave the inputs to be read, say why, and lead to the check page', async () => {
    openPage({ state: 'in_check', evaluation: null, figuresHidden: true, mayEdit: false } as Partial<Revision>);
    expect(await screen.findByText('The figures of the author are hidden from you')).toBeInTheDocument();
    expect(await altitude()).toHaveAttribute('readonly');
    expect(screen.queryByTestId('answer')).not.toBeInTheDocument();
    expect(screen.getByText('Enter your own count on the check page')).toHaveAttribute(
      'href',
      `${ADDRESS}/revisions/A/check`,
    );
  });
});

describe('an edit that bars from signing', () => {
  it('is asked for first; what was typed waits, and is saved or taken away as answered', async () => {
    openPage({ editBarsSigning: true });
    fireEvent.change(await altitude(), { target: { value: '1200' } });
    expect(await screen.findByText(/you can no longer check or approve it/)).toBeInTheDocument();
    expect(screen.getByText('not saved: waits for your answer')).toBeInTheDocument();
    await user.click(screen.getByText('Leave it unchanged'));
    expect(await altitude()).toHaveValue('900');
    expect(server.saves()).toHaveLength(0);
    fireEvent.change(await altitude(), { target: { value: '1250' } });
    await user.click(await screen.findByText('Edit it all the same'));
    await waitFor(() => expect(server.saves()[0]?.body).toMatchObject({ input: { site: { altitudeM: 1250 } } }));
    expect(await altitude()).toHaveValue('1250');
  });
});

describe('who else is there', () => {
  it('is named, and whether he writes; the own heartbeat keeps no session awake', async () => {
    server.others = [{ name: 'Jorin Bakkarash', editing: true, since: '2026-03-12T10:02:31Z' }];
    openPage({});
    expect(await screen.findByText('Jorin Bakkarash')).toBeInTheDocument();
    expect(screen.getByText(/\(editing\)/)).toBeInTheDocument();
    expect(moved('/presence')[0]).toMatchObject({
      headers: { 'X-Bellgap-Passive': '1' },
      body: { editing: false },
    });
  });
});

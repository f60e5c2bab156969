import { contract, type AnswerOf, type Remark } from '@bellgap/common/api';
import { suspensionCase } from '@bellgap/common/drawing/fixtures';
import { QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { makeQueryClient } from '../../api/queries';
import { FakeServer } from '../../testing/fake-server';
import { RemarksPanel } from './remarks-panel';

type Remarks = AnswerOf<typeof contract.remarks>;

const aRemark = (given: Partial<Remark> = {}): Remark => ({
  id: 'remark-1',
  label: 'A',
  path: 'site.altitudeM',
  text: 'The pass at tower 14 is higher.',
  raisedBy: 'Rhona Castellary',
  raisedAt: '2026-03-13T08:00:00Z',
  closedAt: null,
  answers: [],
  mayClose: false,
  mayAnswer: false,
  ...given,
});

const someRemarks = (items: Remark[], mayRaise = false): Remarks => ({
  items,
  open: items.filter(({ closedAt }) => !closedAt).length,
  mayRaise,
});

const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });
const address = { code: 'KL221', number: 'INS-221-003', label: 'A' };

function open(server: FakeServer, hash = '') {
  server.install();
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <MemoryRouter initialEntries={[`/here${hash}`]}>
        <RemarksPanel address={address} input={suspensionCase.input} lines={suspensionCase.evaluation.trace} />
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

describe('remarks', () => {
  it('stand with their place, answers and count; an address leads to one, closed ones too', async () => {
    const closed = aRemark({ id: 'remark-2', path: null, text: 'Say which towers.', closedAt: '2026-03-14T08:00:00Z' });
    open(
      new FakeServer().on(contract.remarks, () => someRemarks([aRemark(), closed])),
      '#remark-remark-2',
    );
    expect(await screen.findByText('1 open, 1 closed')).toBeInTheDocument();
    expect(screen.getByText('Altitude')).toBeInTheDocument();
    expect(screen.getByText('Say which towers.').closest('li')).toHaveFocus();
    expect(screen.getByText('Say which towers.').closest('details')).toHaveAttribute('open');
    expect(screen.queryByText('Raise a remark')).not.toBeInTheDocument();
  });

  it('are raised on a field, and a text is needed', async () => {
    const server = new FakeServer()
      .on(contract.remarks, () => someRemarks([], true))
      .on(contract.raiseRemark, ({ body }) => someRemarks([aRemark(body as Partial<Remark>)], true));
    open(server);
    await user.click(await screen.findByText('Raise a remark'));
    await user.click(screen.getByText('Raise it'));
    expect(await screen.findByText('Is needed')).toBeInTheDocument();
    await user.type(screen.getByLabelText('Remark'), 'Which survey?');
    await user.click(screen.getByLabelText('About'));
    await user.click(await screen.findByText('Altitude'));
    await user.click(screen.getByText('Raise it'));
    await waitFor(() =>
      expect(server.requestsTo(contract.raiseRemark)[0]?.body).toEqual({
        path: 'site.altitudeM',
        text: 'Which survey?',
      }),
    );
    expect(await screen.findByText('Which survey?')).toBeInTheDocument();
    expect(screen.queryByText('Raise it')).not.toBeInTheDocument();
  });

  it('are answered and closed by those who may', async () => {
    const server = new FakeServer()
      .on(contract.remarks, () => someRemarks([aRemark({ mayAnswer: true, mayClose: true })]))
      .on(contract.answerRemark, ({ body }) =>
        someRemarks([
          aRemark({
            mayClose: true,
            answers: [{ id: 'a', by: 'Tamsin Orvelle', at: '2026-03-13T09:00:00Z', ...(body as { text: string }) }],
          }),
        ]),
      )
      .on(contract.closeRemark, () => someRemarks([aRemark({ closedAt: '2026-03-13T10:00:00Z' })]));
    open(server);
    const item = within((await screen.findByText('The pass at tower 14 is higher.')).closest('li')!);
    await user.click(item.getByText('Answer'));
    await user.type(item.getByLabelText('Answer'), 'Corrected to 1,420 m.');
    await user.click(item.getByText('Send the answer'));
    expect(await screen.findByText('Corrected to 1,420 m.')).toBeInTheDocument();
    expect(screen.getByText('◐ answered')).toBeInTheDocument();
    await user.click(screen.getByText('Close it'));
    expect(await screen.findByText('1 closed, none open')).toBeInTheDocument();
    expect(server.requestsTo(contract.closeRemark)[0]?.params).toMatchObject({ remarkId: 'remark-1' });
  });
});

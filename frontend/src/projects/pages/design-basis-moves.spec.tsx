import { contract, type StandingBasis } from '@bellgap/common/api';
import { screen, within } from '@testing-library/react';
import { aPerson, aProject, aStandingBasis } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const MOVES: StandingBasis['moves'] = [
  { move: 'submit', by: 'Tamsin Orvelle', on: '2026-02-03', note: 'Wanted for Z1' },
  { move: 'check', by: 'Ruben Castellary', on: '2026-02-05', note: '' },
];

function serverWith(kept: { current: StandingBasis; earlier: StandingBasis[] }): FakeServer {
  return new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ name: 'Amara Holvenstein', roles: ['approver'] }) }))
    .on(contract.project, () => aProject({ mayEdit: false }))
    .on(contract.designBasis, () => ({ ...kept }));
}

const checked = () =>
  aStandingBasis({
    state: 'checked',
    moves: MOVES,
    allowed: [
      { name: 'return', allowed: true, why: null },
      { name: 'issue', allowed: true, why: null },
    ],
  });

describe('the way of a design basis', () => {
  it('shows the state, who signed on which day of the site, and what is in force meanwhile', async () => {
    const issued = aStandingBasis({ id: 'basis-1', revision: 1, state: 'issued' });
    serverWith({ current: checked(), earlier: [issued] });
    openPage('/projects/KL221/basis');
    expect(await screen.findByText(/In force is revision 1, the one issued/)).toBeInTheDocument();
    expect(screen.getAllByText('Checked').length).toBeGreaterThan(0);
    expect(screen.getAllByText('Issued').length).toBeGreaterThan(0);
    const signatures = screen.getByRole('list', { name: 'Signatures of revision 2' });
    expect(signatures).toHaveTextContent('Submitted for check by Tamsin Orvelle on 3 Feb 2026');
    expect(signatures).toHaveTextContent('Wanted for Z1');
    expect(signatures).toHaveTextContent('Checked by Ruben Castellary on 5 Feb 2026');
    expect(signatures).toHaveTextContent('Days at the site, Etc/GMT-4');
  });

  it('issues with the password, and shows a wrong one beside its field', async () => {
    const kept = { current: checked(), earlier: [] };
    const server = serverWith(kept).on(contract.moveBasis, ({ body }) => {
      if ((body as { password: string }).password !== 'glaze and fog') {
        return new Refusal('validation', 'one field', [{ path: 'password', message: 'Password: is not right' }]);
      }
      kept.current = aStandingBasis({ state: 'issued' });
      return kept.current;
    });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Approve and issue'));
    const dialog = await screen.findByRole('dialog');
    await user.type(within(dialog).getByLabelText('Password'), 'a guess{Enter}');
    expect(await within(dialog).findByText('Is not right')).toBeInTheDocument();
    await user.clear(within(dialog).getByLabelText('Password'));
    await user.type(within(dialog).getByLabelText('Password'), 'glaze and fog{Enter}');
    expect((await screen.findAllByText('Issued')).length).toBeGreaterThan(0);
    const request = server.requestsTo(contract.moveBasis).at(-1);
    expect(request?.params).toEqual({ code: 'KL221', revision: '2' });
    expect(request?.body).toEqual({ move: 'issue', note: '', password: 'glaze and fog' });
  });

  it('returns only with a reason, and asks no password for it', async () => {
    const server = serverWith({ current: checked(), earlier: [] }).on(contract.moveBasis, () => aStandingBasis());
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Return to the engineer'));
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).queryByLabelText('Password')).not.toBeInTheDocument();
    const act = within(dialog).getByRole('button', { name: 'Return to the engineer' });
    await user.click(act);
    expect(await within(dialog).findByText('Say why')).toBeInTheDocument();
    expect(server.requestsTo(contract.moveBasis)).toHaveLength(0);
    await user.type(within(dialog).getByLabelText('Reason'), 'Which fault level?');
    await user.click(act);
    expect(server.requestsTo(contract.moveBasis)[0]?.body).toEqual({
      move: 'return',
      note: 'Which fault level?',
      password: null,
    });
  });

  it('says why a move is not for the reader', async () => {
    const why = 'You have checked this revision; somebody else approves it.';
    const current = aStandingBasis({
      state: 'checked',
      moves: MOVES,
      allowed: [{ name: 'issue', allowed: false, why }],
    });
    serverWith({ current, earlier: [] });
    openPage('/projects/KL221/basis');
    expect(await screen.findByText(`Approve and issue: ${why}`)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Approve and issue' })).not.toBeInTheDocument();
  });
});

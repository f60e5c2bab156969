import { contract } from '@bellgap/common/api';
import { screen, waitFor, within } from '@testing-library/react';
import { aPerson, aProject } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

describe('a session that lapses', () => {
  it('asks to sign in over the page, and what was typed is still there and can be sent', async () => {
    let signedIn = true;
    const server = new FakeServer().install();
    server
      .on(contract.currentSession, () => ({ user: aPerson() }))
      .on(contract.signIn, () => {
        signedIn = true;
        return { user: aPerson() };
      })
      .on(contract.project, () => aProject())
      .on(contract.specifications, () => ({ items: [], next: null, previous: null }))
      .on(contract.towerFamilies, () => [])
      .on(contract.createSpecification, () =>
        signedIn
          ? new Refusal('already-exists', 'taken', [{ path: 'number', message: 'Number: is taken' }])
          : new Refusal('not-signed-in', 'Sign in.'),
      );

    const { user } = openPage('/projects/KL221');
    await user.click((await screen.findAllByText('Begin a specification'))[0]!);
    await user.type(await screen.findByLabelText('Number'), 'ins-221-009');
    await user.type(screen.getByLabelText('Title'), 'Jumper strings');
    signedIn = false;
    await user.click(screen.getByText('Begin the draft'));

    const dialog = (await screen.findByText('Your session has ended')).closest<HTMLElement>('[role="dialog"]')!;
    await user.type(within(dialog).getByLabelText('Password'), 'glaze and fog{Enter}');
    await waitFor(() => expect(screen.queryByText('Your session has ended')).not.toBeInTheDocument());
    expect(screen.getByLabelText('Number')).toHaveValue('INS-221-009');

    await user.click(screen.getByText('Begin the draft'));
    expect(await screen.findByText('Is taken')).toBeInTheDocument();
    expect(server.requestsTo(contract.createSpecification).at(-1)?.body).toEqual({
      number: 'INS-221-009',
      title: 'Jumper strings',
      kind: 'line',
    });
  });
});

import { contract } from '@bellgap/common/api';
import { screen } from '@testing-library/react';
import { aPerson, aProject } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

describe('sign-in', () => {
  it('leads back to the page that was asked for, and keeps the address typed after a wrong password', async () => {
    const server = new FakeServer().install();
    let tries = 0;
    server
      .on(contract.currentSession, () => ({ user: null }))
      .on(contract.signIn, () => {
        tries += 1;
        return tries === 1
          ? new Refusal('not-signed-in', 'The e-mail address or the password is wrong.')
          : { user: aPerson() };
      })
      .on(contract.projects, () => ({ items: [aProject()], next: null, previous: null }));

    const { user, address } = openPage('/projects?kind=line');
    await user.type(await screen.findByLabelText('E-mail address'), 't.orvelle@kigc.example');
    await user.type(screen.getByLabelText('Password'), 'not this one{Enter}');
    expect(await screen.findByText('The e-mail address or the password is wrong.')).toBeInTheDocument();
    expect(screen.getByLabelText('E-mail address')).toHaveValue('t.orvelle@kigc.example');

    await user.clear(screen.getByLabelText('Password'));
    await user.type(screen.getByLabelText('Password'), 'glaze and fog{Enter}');
    expect(await screen.findByText('KL221')).toBeInTheDocument();
    expect(address()).toBe('/projects?kind=line');
    expect(server.requestsTo(contract.projects)[0]?.query.get('kind')).toBe('line');
  });

  it('says what is missing beside the field and asks nothing of the server', async () => {
    const server = new FakeServer().install().on(contract.currentSession, () => ({ user: null }));
    const { user } = openPage('/sign-in');
    await user.click(await screen.findByText('Sign in', { selector: 'button *' }));
    expect(await screen.findAllByText('Is needed')).toHaveLength(2);
    expect(screen.getByLabelText('Password')).toHaveAttribute('aria-invalid', 'true');
    expect(server.requestsTo(contract.signIn)).toHaveLength(0);
  });
});

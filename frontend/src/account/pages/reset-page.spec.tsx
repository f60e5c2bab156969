import { contract } from '@bellgap/common/api';
import { screen } from '@testing-library/react';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

describe('a forgotten password', () => {
  let server: FakeServer;
  beforeEach(() => {
    server = new FakeServer().install().on(contract.currentSession, () => ({ user: null }));
  });
  afterEach(() => {
    window.location.hash = '';
  });

  it('is asked for from the sign-in page, and the answer does not tell whether there is such an account', async () => {
    server.on(contract.requestPasswordReset, () => undefined);
    const { user, address } = openPage('/sign-in');
    await user.click(await screen.findByText('Forgotten password?'));
    expect(await screen.findByText('Send the link')).toBeInTheDocument();
    expect(address()).toBe('/reset');
    await user.type(screen.getByLabelText('E-mail address'), 't.orvelle@kigc.example{Enter}');
    expect(await screen.findByText(/If t\.orvelle@kigc\.example belongs to an account/)).toBeInTheDocument();
    expect(server.requestsTo(contract.requestPasswordReset)[0]?.body).toEqual({ email: 't.orvelle@kigc.example' });
  });

  it('is replaced with the token of the link, which opening the page does not spend', async () => {
    server.on(contract.acceptPasswordReset, () => undefined);
    window.location.hash = '#a-token';
    const { user } = openPage('/reset');
    const field = await screen.findByLabelText('New password');
    expect(server.requestsTo(contract.acceptPasswordReset)).toHaveLength(0);
    await user.type(field, 'a lantern in the fen{Enter}');
    expect(await screen.findByText('The password is set')).toBeInTheDocument();
    const body = { token: 'a-token', password: 'a lantern in the fen' };
    expect(server.requestsTo(contract.acceptPasswordReset)[0]?.body).toEqual(body);
  });

  it('says that a link no longer holds', async () => {
    const message = 'Link: does not hold any more; ask for a new one';
    server.on(contract.acceptPasswordReset, () => new Refusal('validation', message, [{ path: 'token', message }]));
    window.location.hash = '#an-old-token';
    const { user } = openPage('/reset');
    await user.type(await screen.findByLabelText('New password'), 'a lantern in the fen{Enter}');
    expect(await screen.findByText(/does not hold any more/i)).toBeInTheDocument();
  });
});

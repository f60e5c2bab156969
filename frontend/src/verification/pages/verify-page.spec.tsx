import { contract, type Verification } from '@bellgap/common/api';
import { screen, waitFor } from '@testing-library/react';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const CODE = '7K2M-94QX-HV3N-C8TA';

const aVerification = (given: Partial<Verification> = {}): Verification => ({
  standing: 'current',
  number: 'INS-221-001',
  revision: '1',
  issuedOn: '2026-03-20',
  contentCode: '4f1c09ab77de',
  supersededBy: null,
  since: '2026-03-20T08:15:00Z',
  ...given,
});

const serve = (given: Partial<Verification>) =>
  new FakeServer().install().on(contract.verification, () => aVerification(given));

describe('verification of a print', () => {
  it('answers without a session, and asks to compare number, revision and content code', async () => {
    const server = serve({});
    openPage(`/verify/${CODE}`);
    expect(await screen.findByText('In force')).toBeVisible();
    for (const text of ['INS-221-001', '1', '4f1c09ab77de']) expect(screen.getByText(text)).toBeVisible();
    expect(screen.getByText(/differs from the print, the print is not this sheet/)).toBeVisible();
    expect(server.asked).toHaveLength(1);
    expect(server.requestsTo(contract.verification)[0]!.params.verificationCode).toBe(CODE);
  });

  it('says plainly what became of a sheet that is in force no more', async () => {
    serve({ standing: 'superseded', supersededBy: '2' });
    openPage(`/verify/${CODE}`);
    expect(await screen.findByText('Superseded by revision 2')).toBeVisible();
    expect(screen.getByText(/Do not use the print; ask for revision 2\./)).toBeVisible();
  });

  it('says so where a sheet is withdrawn and nothing is in its place', async () => {
    serve({ standing: 'withdrawn' });
    openPage(`/verify/${CODE}`);
    expect(await screen.findByText('Withdrawn')).toBeVisible();
    expect(screen.getByText(/nothing is in force in its place/)).toBeVisible();
  });

  it('says that a code is unknown and shows nothing to compare', async () => {
    const nothing = { number: null, revision: null, issuedOn: null, contentCode: null, since: null };
    serve({ standing: 'unknown', ...nothing });
    openPage(`/verify/${CODE}`);
    expect(await screen.findByText('Unknown')).toBeVisible();
    expect(screen.queryByText('Content code')).not.toBeInTheDocument();
  });

  it('takes a typed code in fours, says what is wrong with it, and asks once it can be one', async () => {
    const server = serve({});
    const { user, address } = openPage('/verify');
    const field = await screen.findByLabelText('Code on the print');
    await user.type(field, '7k2m94qx');
    expect(field).toHaveValue('7K2M-94QX');
    await user.click(screen.getByText('Look it up'));
    expect(screen.getByText('A code has 16 signs; these are 8')).toBeVisible();
    expect(field).toBeInvalid();
    expect(server.asked).toHaveLength(0);
    await user.type(field, 'hv3nc8ta');
    await user.click(screen.getByText('Look it up'));
    await waitFor(() => expect(address()).toBe(`/verify/${CODE}`));
    expect(await screen.findByText('In force')).toBeVisible();
  });

  it('says in words that too many codes were asked for', async () => {
    new FakeServer()
      .install()
      .on(contract.verification, () => new Refusal('too-many-requests', 'Too many attempts from this address.'));
    openPage(`/verify/${CODE}`);
    expect(await screen.findByText(/Too many attempts from this address/)).toBeVisible();
    expect(screen.getByText('Try again')).toBeVisible();
  });
});

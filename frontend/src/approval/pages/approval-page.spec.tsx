import { contract, type Approval, type Revision } from '@bellgap/common/api';
import { screen, waitFor, within } from '@testing-library/react';
import { aPerson } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { aCheckedRevision, anApproval, anIssuedSheet } from '../../testing/issue-builders';
import { openPage } from '../../testing/open-page';

const ADDRESS = '/projects/KL221/specifications/INS-221-003/revisions/B/approval';

function serve(approval: Partial<Approval> = {}, revision: Partial<Revision> = {}) {
  return new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ roles: ['approver'] }) }))
    .on(contract.revision, () => aCheckedRevision(revision))
    .on(contract.approval, () => anApproval(approval))
    .on(contract.remarks, () => ({ items: [], open: 0, mayRaise: true }))
    .on(contract.issuedSheet, () => anIssuedSheet());
}

const part = (name: string) => within(screen.getByRole('region', { name }));

describe('approval', () => {
  it('shows first what is new, outside, failing, assumed, not assessed and departing', async () => {
    serve();
    openPage(ADDRESS);
    const glance = within(await screen.findByRole('navigation', { name: 'What to look at' }));
    expect(glance.getByText('outside limits').closest('a')).toHaveAttribute('href', '#acceptances');
    expect(glance.getByText('disputed').closest('a')).toBeNull();

    const isNew = part('What is new');
    expect(isNew.getByText('Pollution class')).toBeVisible();
    expect(isNew.getByText('c, medium')).toBeVisible();
    expect(isNew.getByText('d, heavy')).toBeVisible();
    expect(isNew.getByText('Units in the string')).toBeVisible();
    expect(part('Assumed').getByText('The pollution class is estimated, not measured.')).toBeVisible();
    expect(part('Not assessed').getByText('Clearances, overvoltages')).toBeVisible();
    expect(part('Departs from the design basis').getByText('Highest voltage')).toBeVisible();
    expect(screen.getByText('The altitude lies outside the source.')).toBeVisible();
    expect(screen.queryByText('Disputed')).not.toBeInTheDocument();
  });

  it('asks a reason for each acceptance, a reason and an end for each fail, and the password', async () => {
    const server = serve().on(contract.issueRevision, () => anIssuedSheet());
    const { user, address } = openPage(ADDRESS);
    await user.click(await screen.findByRole('button', { name: 'Approve and issue as revision 1' }));
    expect(await screen.findAllByText('Is needed')).toHaveLength(3);
    expect(screen.getByText('Is needed to sign')).toBeVisible();
    expect(server.requestsTo(contract.issueRevision)).toHaveLength(0);

    const [acceptance, concession] = screen.getAllByLabelText('Reason');
    await user.type(acceptance!, 'Measured on site up to this altitude');
    await user.type(concession!, 'Washed twice a year');
    await user.type(screen.getByLabelText('Valid until'), '2027-06-30');
    await user.type(screen.getByLabelText('Password'), 'a long password');
    await user.click(screen.getByRole('button', { name: 'Approve and issue as revision 1' }));
    await waitFor(() => expect(address()).toBe('/sheets/sheet-2'));
    const [asked] = server.requestsTo(contract.issueRevision);
    expect(asked!.headers['If-Match']).toBe('"7"');
    expect(asked!.body).toEqual({
      acceptances: [
        {
          code: 'altitude-outside',
          field: 'site.altitudeM',
          text: 'The altitude lies outside the source.',
          reason: 'Measured on site up to this altitude',
        },
      ],
      concessions: [
        {
          code: 'creepage-short',
          field: null,
          text: 'The creepage is short by 3 %.',
          reason: 'Washed twice a year',
          validUntil: '2027-06-30',
        },
      ],
      laterChangesReason: null,
      password: 'a long password',
    });
  });

  it('puts what the server refuses beside its field and keeps what was typed', async () => {
    serve({ acceptances: [] }).on(
      contract.issueRevision,
      () =>
        new Refusal('validation', 'Some fields are not right', [
          { path: 'concessions[0].validUntil', message: 'Valid until: must lie in the future' },
          { path: 'password', message: 'Password: is not right' },
        ]),
    );
    const { user, address } = openPage(ADDRESS);
    await user.type((await screen.findAllByLabelText('Reason'))[0]!, 'Washed twice a year');
    await user.type(screen.getByLabelText('Valid until'), '2025-06-30');
    await user.type(screen.getByLabelText('Password'), 'wrong');
    await user.click(screen.getByRole('button', { name: 'Approve and issue as revision 1' }));
    expect(await screen.findByText('Must lie in the future')).toBeVisible();
    expect(screen.getByText('Is not right')).toBeVisible();
    expect(screen.getAllByLabelText('Reason')[0]).toHaveValue('Washed twice a year');
    expect(address()).toBe(ADDRESS);
  });

  it('asks why the approver does not wait for what is newer', async () => {
    const server = serve({
      acceptances: [],
      fails: [],
      laterChanges: [{ code: 'basis', text: 'Design basis: revision 3 is newer.' }],
    }).on(contract.issueRevision, () => anIssuedSheet());
    const { user } = openPage(ADDRESS);
    await user.type(await screen.findByLabelText('Password'), 'a long password');
    await user.click(screen.getByRole('button', { name: 'Approve and issue as revision 1' }));
    expect(await screen.findByText('Is needed')).toBeVisible();
    await user.type(screen.getByLabelText('Reason for not waiting'), 'The change is of another yard');
    await user.click(screen.getByRole('button', { name: 'Approve and issue as revision 1' }));
    await waitFor(() => expect(server.requestsTo(contract.issueRevision)).toHaveLength(1));
    expect(server.requestsTo(contract.issueRevision)[0]!.body).toMatchObject({
      laterChangesReason: 'The change is of another yard',
    });
  });

  it('says in words what bars it and keeps the act shut', async () => {
    serve({ mayIssue: false, barred: ['One remark is open; who raised it has to close it first.'], openRemarks: 1 });
    openPage(ADDRESS);
    expect(await screen.findByText('One remark is open; who raised it has to close it first.')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Approve and issue as revision 1' })).toBeDisabled();
    expect(screen.getByText('open remarks').closest('a')).toHaveAttribute('href', '#remarks');
  });

  it('gives those who look on what is to be decided, without fields', async () => {
    serve(
      { mayIssue: false, barred: ['You are not an approver here.'] },
      { moves: [{ name: 'issue', allowed: false, why: 'You are not an approver here.' }] },
    );
    openPage(ADDRESS);
    expect(await screen.findByText('The creepage is short by 3 %.')).toBeVisible();
    expect(screen.queryByLabelText('Reason')).not.toBeInTheDocument();
    expect(screen.queryByLabelText('Password')).not.toBeInTheDocument();
    expect(screen.queryByText('Return to the engineer')).not.toBeInTheDocument();
  });

  it('returns it with a reason', async () => {
    const server = serve({ acceptances: [], fails: [] })
      .on(contract.refuseRevision, () => aCheckedRevision({ state: 'draft' }))
      .on(contract.desk, () => ({
        waiting: [],
        returned: [],
        drafts: [],
        outdated: [],
        issued: [],
        endingConcessions: [],
      }));
    const { user, address } = openPage(ADDRESS);
    await user.click(await screen.findByRole('button', { name: 'Return to the engineer' }));
    expect(await screen.findByText('Is needed')).toBeVisible();
    await user.type(screen.getByLabelText('Reason'), 'Wait for basis revision 3');
    await user.click(screen.getByRole('button', { name: 'Return to the engineer' }));
    await waitFor(() => expect(address()).toBe('/'));
    expect(server.requestsTo(contract.refuseRevision)[0]!.body).toEqual({ reason: 'Wait for basis revision 3' });
  });
});

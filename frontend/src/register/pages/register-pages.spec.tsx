import { contract, type IssuedSheet, type Role } from '@bellgap/common/api';
import { screen, waitFor, within } from '@testing-library/react';
import { aPerson, aProject } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { aConcession, aRegisterRow, anIssuedSheet } from '../../testing/issue-builders';
import { openPage } from '../../testing/open-page';

const serve = (roles: Role[] = ['approver']) =>
  new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ roles }) }))
    .on(contract.projects, () => ({ items: [aProject()], next: null, previous: null }))
    .on(contract.insulators, () => ({ items: [], next: null, previous: null }));

describe('register', () => {
  it('asks as the address says and leads to the sheet', async () => {
    const server = serve(['reader']).on(contract.sheets, () => ({
      items: [aRegisterRow(), aRegisterRow({ id: 'sheet-1', label: '0', standing: 'superseded' })],
      next: 'later',
      previous: null,
    }));
    const { user, address } = openPage('/sheets?standing=current&insulatorCode=U160BL&sort=number');
    const [current] = await screen.findAllByText('INS-221-001');
    expect(current).toHaveAttribute('href', '/sheets/sheet-2');
    const rows = screen.getAllByRole('row').slice(1);
    expect(within(rows[0]!).getByText('In force')).toBeVisible();
    expect(within(rows[1]!).getByText('Superseded')).toBeVisible();
    const asked = () => Object.fromEntries(server.requestsTo(contract.sheets).at(-1)!.query);
    expect(asked()).toEqual({ standing: 'current', insulatorCode: 'U160BL', sort: 'number' });
    expect(screen.queryByText('Concessions', { selector: 'button *' })).not.toBeInTheDocument();

    await user.selectOptions(screen.getByLabelText('Project'), 'KL221');
    await waitFor(() => expect(asked().projectCode).toBe('KL221'));
    expect(address()).toContain('projectCode=KL221');
    await user.click(screen.getByText('Next'));
    await waitFor(() => expect(asked().cursor).toBe('later'));
  });

  it('says what to do where nothing is issued yet', async () => {
    serve().on(contract.sheets, () => ({ items: [], next: null, previous: null }));
    openPage('/sheets');
    expect(await screen.findByText('No sheet is issued yet')).toBeVisible();
  });
});

describe('issued sheet', () => {
  const open = (given: Partial<IssuedSheet> = {}, roles?: Role[]) => {
    const server = serve(roles).on(contract.issuedSheet, () => anIssuedSheet(given));
    return { server, ...openPage('/sheets/sheet-2') };
  };

  it('says whether it is in force, who signed when in which zone, and what was conceded', async () => {
    open({}, ['reader']);
    expect(await screen.findByText('In force', { selector: 'b' })).toBeVisible();
    expect(screen.getByText(/Days of signatures are those at the site, UTC\+04:00/)).toBeVisible();
    expect(screen.getByText('16 Mar 2026')).toBeVisible();
    expect(screen.getByText('7K2M-94QX-HV3N-C8TA')).toHaveAttribute('href', '/verify/7K2M-94QX-HV3N-C8TA');
    expect(screen.getByText('Washed twice a year')).toBeVisible();
    expect(screen.getByText('ends in 30 days')).toBeVisible();
    expect(screen.getByText('Sheet as PDF').closest('a')).toHaveAttribute('href', '/api/v1/sheets/sheet-2/sheet.pdf');
    expect(screen.getByText('0', { selector: 'a' })).toHaveAttribute('href', '/sheets/sheet-1');
    expect(screen.queryByText('Withdraw')).not.toBeInTheDocument();
    expect(screen.queryByText('Trail')).not.toBeInTheDocument();
    expect(screen.queryByText('Next revision')).not.toBeInTheDocument();
  });

  it('leads from a superseded one to the one in force', async () => {
    open({
      standing: 'superseded',
      standingSince: '2026-05-01T08:00:00Z',
      successor: { id: 'sheet-3', label: '2' },
      cautions: [{ code: 'recheck-passed', field: null, text: 'The class was to be measured again.' }],
    });
    expect(await screen.findByText('Superseded by revision 2')).toBeVisible();
    expect(screen.getByText('revision 2', { selector: 'a' })).toHaveAttribute('href', '/sheets/sheet-3');
    expect(screen.getByText('The class was to be measured again.')).toBeVisible();
  });

  it('is withdrawn with a reason and the password', async () => {
    const { server, user } = open({ mayWithdraw: true });
    let refuse = true;
    server.on(contract.withdrawSheet, () => {
      if (refuse) return new Refusal('validation', 'No', [{ path: 'password', message: 'Password: is not right' }]);
      return anIssuedSheet({
        standing: 'withdrawn',
        standingSince: '2026-06-01T08:00:00Z',
        standingBy: 'Ansel Holvenstein',
        standingReason: 'Wrong tower family',
      });
    });
    await user.click(await screen.findByText('Withdraw'));
    const dialog = within(await screen.findByRole('dialog'));
    await user.type(dialog.getByLabelText('Reason'), 'Wrong tower family');
    await user.type(dialog.getByLabelText('Password'), 'a long password');
    await user.click(dialog.getByText('Withdraw revision 1'));
    expect(await dialog.findByText('Is not right')).toBeVisible();
    expect(dialog.getByLabelText('Reason')).toHaveValue('Wrong tower family');
    refuse = false;
    await user.click(dialog.getByText('Withdraw revision 1'));
    expect(await screen.findByText('Withdrawn', { selector: 'b' })).toBeVisible();
    expect(screen.getByText(/by Ansel Holvenstein: Wrong tower family/)).toBeVisible();
  });
});

describe('concessions', () => {
  it('stand with what ends first on top, ended ones marked by words', async () => {
    serve().on(contract.concessions, () => [
      aConcession({ id: 'later', number: 'INS-221-002', validUntil: '2027-12-31', daysLeft: 395 }),
      aConcession({ id: 'ended', number: 'INS-221-005', validUntil: '2026-11-28', daysLeft: -3 }),
    ]);
    openPage('/concessions');
    expect(await screen.findByText('ended 3 days ago')).toBeVisible();
    const rows = screen.getAllByRole('row').slice(1);
    expect(within(rows[0]!).getByText('INS-221-005 rev 1')).toHaveAttribute('href', '/sheets/sheet-2');
    expect(within(rows[1]!).getByText('ends in 395 days')).toBeVisible();
  });

  it('are not for readers, and say so', async () => {
    serve(['reader']);
    openPage('/concessions');
    expect(await screen.findByText('The list of concessions is for those who work on drafts')).toBeVisible();
  });
});

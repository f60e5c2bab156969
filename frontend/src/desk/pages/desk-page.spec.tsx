import { contract, type Desk, type Role } from '@bellgap/common/api';
import { screen, within } from '@testing-library/react';
import { aPerson, aSpecificationRow } from '../../testing/builders';
import { FakeServer } from '../../testing/fake-server';
import { aConcession, aDesk, aRegisterRow } from '../../testing/issue-builders';
import { openPage } from '../../testing/open-page';

function open(roles: Role[], given: Partial<Desk>) {
  new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ roles }) }))
    .on(contract.desk, () => aDesk(given));
  return openPage('/');
}

const SPECIFICATION = '/projects/KL221/specifications/INS-221-003';

describe('desk', () => {
  it('says what waits and why, what is overdue in words, and leads to where one acts', async () => {
    const since = '2026-03-12T10:02:31Z';
    open(['checker', 'approver'], {
      waiting: [
        {
          why: 'check',
          since,
          row: aSpecificationRow({ id: 'r1', label: 'B', state: 'in_check', dueOn: '2026-03-01' }),
        },
        { why: 'approve', since, row: aSpecificationRow({ id: 'r2', label: 'C', state: 'checked' }) },
        { why: 'answer', since, row: aSpecificationRow({ id: 'r3' }) },
        { why: 'close', since, row: aSpecificationRow({ id: 'r4', label: 'D', state: 'in_check' }) },
      ],
    });
    const addressOf = (why: string) => screen.getByText(why).closest('a')!.getAttribute('href');
    expect(await screen.findByText(/^overdue by \d+ days$/)).toBeVisible();
    expect(addressOf('Waits for your check')).toBe(`${SPECIFICATION}/revisions/B/check`);
    expect(addressOf('Waits for your approval')).toBe(`${SPECIFICATION}/revisions/C/approval`);
    expect(addressOf('A remark waits for your answer')).toBe(`${SPECIFICATION}#remarks`);
    expect(addressOf('Your remark was answered: close it or write again')).toBe(
      `${SPECIFICATION}/revisions/D/check#remarks`,
    );
    expect(screen.queryByText('You have no drafts')).not.toBeInTheDocument();
  });

  it('shows what was returned with its reason, once, and concessions that end', async () => {
    const returned = aSpecificationRow({ returnedAt: '2026-03-14T10:02:31Z' });
    open(['engineer'], {
      returned: [{ note: 'The count is of the wrong class', row: returned }],
      drafts: [returned, aSpecificationRow({ id: 'revision-9', number: 'INS-221-009' })],
      endingConcessions: [aConcession({ daysLeft: -2 })],
    });
    expect(await screen.findByText('The count is of the wrong class')).toBeVisible();
    expect(screen.getAllByText('INS-221-003')).toHaveLength(1);
    expect(screen.getByText('INS-221-009')).toBeVisible();
    expect(screen.getByText('ended 2 days ago')).toBeVisible();
    expect(screen.getByText('Nothing waits for you')).toBeVisible();
  });

  it('tells each role what to do while nothing waits', async () => {
    open(['checker'], {});
    const empty = within((await screen.findByText('Nothing waits for you')).parentElement!);
    expect(empty.getByText(/what is submitted for your check/)).toBeVisible();
    expect(screen.queryByText('Issued of late')).not.toBeInTheDocument();
  });

  it('shows readers what was issued of late', async () => {
    open(['reader'], { issued: [aRegisterRow()] });
    expect(await screen.findByText('INS-221-001')).toHaveAttribute('href', '/sheets/sheet-2');
    expect(screen.queryByText('Waiting for you')).not.toBeInTheDocument();
    expect(within(screen.getByRole('navigation', { name: 'Main' })).getByText('Sheets')).toHaveAttribute(
      'href',
      '/sheets',
    );
  });
});

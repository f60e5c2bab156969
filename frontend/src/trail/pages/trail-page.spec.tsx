import { contract, type TrailEvent, type TrailVerification } from '@bellgap/common/api';
import { screen, waitFor, within } from '@testing-library/react';
import { aPerson, aProject } from '../../testing/builders';
import { FakeServer } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const anEvent = (given: Partial<TrailEvent> = {}): TrailEvent => ({
  id: 41,
  at: '2026-03-12T10:02:31.000Z',
  actor: { id: 'person-1', name: 'Tamsin Orvelle' },
  action: 'revision.saved',
  entity: 'revision',
  entityId: 'revision-1',
  projectCode: 'KL221',
  specification: { number: 'INS-221-003', label: 'B' },
  personName: null,
  changes: [
    { path: 'input.site.altitudeM', from: 900, to: 1200, hidden: false },
    { path: 'input.site.pollution.class', from: 'c', to: 'd', hidden: false },
    { path: 'units', from: null, to: null, hidden: true },
  ],
  reason: 'Survey of the pass',
  seal: 40,
  ...given,
});

const aVerification = (given: Partial<TrailVerification> = {}): TrailVerification => ({
  verifiedAt: '2026-03-12T11:00:00.000Z',
  sound: true,
  checkedCount: 40,
  lastSeal: { number: 40, hash: '0a1b2c3d4e5f', at: '2026-03-12T10:02:33.000Z' },
  broken: { count: 0, named: [] },
  missing: { count: 0, named: [] },
  unsealed: { count: 0, named: [] },
  knownSeal: null,
  ...given,
});

function serve(events: TrailEvent[], roles: Parameters<typeof aPerson>[0] = {}) {
  return new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson(roles) }))
    .on(contract.projects, () => ({ items: [aProject()], next: null, previous: null }))
    .on(contract.trail, () => ({ items: events, next: null, previous: null }));
}

describe('trail', () => {
  it('tells who did what, when, from which value to which, and why', async () => {
    serve([anEvent()]);
    openPage('/trail');
    const row = within((await screen.findByText('Saved a draft', { selector: 'td' })).closest('tr')!);
    expect(row.getByText('Tamsin Orvelle')).toBeInTheDocument();
    expect(row.getByText('INS-221-003')).toHaveAttribute('href', '/projects/KL221/specifications/INS-221-003');
    expect(row.getByText('900 m')).toBeInTheDocument();
    expect(row.getByText('1200 m')).toBeInTheDocument();
    expect(row.getByText('d, heavy')).toBeInTheDocument();
    expect(row.getByText('not shown to you yet')).toBeInTheDocument();
    expect(row.getByText('Survey of the pass')).toBeInTheDocument();
  });

  it('asks as the address says, with the zone of the reader, and offers the same as a file', async () => {
    const server = serve([anEvent()]);
    const { user, address } = openPage('/trail?project=KL221&specification=INS-221-003&from=2026-03-01');
    await screen.findByText('900 m');
    const asked = () => server.requestsTo(contract.trail).at(-1)!.query;
    expect(asked().get('specification')).toBe('INS-221-003');
    expect(asked().get('from')).toBe('2026-03-01');
    expect(asked().get('zone')).toBe(Intl.DateTimeFormat().resolvedOptions().timeZone);
    expect(screen.getByText('CSV').closest('a')).toHaveAttribute(
      'href',
      expect.stringMatching(/^\/api\/v1\/trail\.csv\?.*specification=INS-221-003/),
    );

    await user.selectOptions(screen.getByLabelText('Field'), 'site.altitudeM');
    await waitFor(() => expect(asked().get('path')).toBe('site.altitudeM'));
    await user.type(screen.getByLabelText('Who'), 'orvelle');
    await waitFor(() => expect(address()).toContain('person=orvelle'));
    await user.click(screen.getByText('All records'));
    await waitFor(() => expect(address()).not.toContain('specification'));
  });

  it('takes no day that is none', async () => {
    serve([anEvent()]);
    const { user, address } = openPage('/trail');
    const to = await screen.findByLabelText('To, year-month-day');
    await user.type(to, '31.03.2026');
    expect(to).toBeInvalid();
    expect(address()).toBe('/trail');
  });

  it('says in words what a verification found, to administrators', async () => {
    const server = serve([anEvent()], { roles: ['administrator'] }).on(contract.verifyTrail, ({ body }) =>
      (body as { knownSeal: unknown }).knownSeal
        ? aVerification({
            sound: false,
            knownSeal: 'gone',
            broken: { count: 1, named: [{ number: 12, eventId: 13 }] },
            missing: { count: 1, named: [{ number: 20, eventId: null }] },
          })
        : aVerification(),
    );
    const { user } = openPage('/trail');
    await user.click(await screen.findByText('Verify the trail'));
    expect(await screen.findByText('The trail is sound: 40 sealed rows checked, each as it was sealed.')).toBeVisible();
    expect(screen.getByText(/Last seal: number 40, 0a1b2c3d4e5f/)).toBeVisible();

    await user.type(screen.getByLabelText('Number of a printed seal, if you have one'), '41');
    await user.type(screen.getByLabelText('Its 12 digits'), '0A1B2C3D4E5F');
    await user.click(screen.getByText('Verify the trail'));
    expect(await screen.findByText('Changed since sealed: row 13 (seal 12).')).toBeVisible();
    expect(screen.getByText('Gone: seal 20.')).toBeVisible();
    expect(screen.getByText(/its end was cut off/)).toBeVisible();
    expect(server.requestsTo(contract.verifyTrail).at(-1)?.body).toEqual({
      knownSeal: { number: 41, hash: '0a1b2c3d4e5f' },
    });
  });

  it('is not for readers, and says so', async () => {
    serve([], { roles: ['reader'] });
    openPage('/trail');
    expect(await screen.findByText('The trail is for those who work on drafts')).toBeInTheDocument();
    expect(screen.queryByText('Trail')).not.toBeInTheDocument();
  });
});

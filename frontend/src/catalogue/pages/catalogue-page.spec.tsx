import { contract, type CatalogueUnit } from '@bellgap/common/api';
import { screen, waitFor } from '@testing-library/react';
import { aPerson } from '../../testing/builders';
import { FakeServer } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const aUnit = (code: string): CatalogueUnit => ({
  code,
  version: 1,
  family: 'iec-60305',
  kind: 'cap-and-pin',
  material: null,
  profile: 'standard',
  failingLoadKn: 160,
  coupling: '20',
  spacingMm: 170,
  diameterMm: 280,
  averageDiameterMm: null,
  creepageMm: 340,
  creepageIsNominal: true,
  dryArcMm: null,
  massKg: null,
  routineTestLoadKn: null,
  wetFlashover: null,
  note: null,
  source: { document: 'IEC 60305', edition: '1995', clause: 'Table 1', status: 'seen' },
  withdrawn: false,
});

describe('catalogue', () => {
  it('asks the server as the address says, and puts sort, search and page into the address', async () => {
    const server = new FakeServer()
      .install()
      .on(contract.currentSession, () => ({ user: aPerson() }))
      .on(contract.insulators, ({ query }) =>
        query.get('cursor')
          ? { items: [aUnit('U210B')], next: null, previous: 'back' }
          : { items: [aUnit('U160BL')], next: 'more', previous: null },
      );
    const { user, address } = openPage('/catalogue?family=iec-60305');
    await screen.findByText('U160BL');
    expect(server.requestsTo(contract.insulators)[0]?.query.toString()).toBe('family=iec-60305');

    await user.click(screen.getByText('Creepage, mm'));
    await waitFor(() => expect(address()).toBe('/catalogue?family=iec-60305&sort=creepageMm'));
    await user.click(screen.getByText('Next'));
    expect(await screen.findByText('U210B')).toBeInTheDocument();
    expect(address()).toContain('cursor=more');

    await user.type(screen.getByLabelText('Search code or note'), 'U16');
    const lastAsked = () => server.requestsTo(contract.insulators).at(-1)?.query.toString();
    await waitFor(() => expect(lastAsked()).toBe('sort=creepageMm&search=U16&family=iec-60305'));
    expect(address()).toBe('/catalogue?family=iec-60305&sort=creepageMm&search=U16');
  });

  it('copies every page of the list, not only the one shown', async () => {
    new FakeServer()
      .install()
      .on(contract.currentSession, () => ({ user: aPerson() }))
      .on(contract.insulators, ({ query }) =>
        query.get('cursor')
          ? { items: [aUnit('U210B')], next: null, previous: 'back' }
          : { items: [aUnit('U160BL')], next: 'more', previous: null },
      );
    const { user } = openPage('/catalogue');
    await screen.findByText('U160BL');
    await user.click(screen.getByText('Copy'));
    expect(await screen.findByText(/Copied 2 rows/)).toBeInTheDocument();
    const copied = await navigator.clipboard.readText();
    expect(copied.split('\n').map((line) => line.split('\t')[0])).toEqual(['Code', 'U160BL', 'U210B']);
  });
});

import { contract, type SourceDifference, type TableDetails, type TableEntry } from '@bellgap/common/api';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { aPerson } from '../../testing/builders';
import { FakeServer } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const NONE = { seen: 0, memory: 0, practice: 0, derived: 0, confirmed: 0, disputed: 0 };

const USCD: TableEntry = {
  key: 'iec-ts-60815:uscd',
  kind: 'table',
  title: 'Reference creepage by class',
  document: 'IEC TS 60815-2 and -3',
  edition: '2008',
  clause: 'reference creepage',
  rule: 'rows-as-printed',
  rowCount: 2,
  statusCounts: { ...NONE, seen: 1, memory: 1 },
  usedFor: 'creepage of the string',
};
const ALTITUDE: TableEntry = {
  ...USCD,
  key: 'atmosphere.altitude-factor',
  kind: 'formula',
  title: 'Altitude factor',
  document: 'IEC 62271-1',
  edition: '2011',
  clause: 'altitude correction',
  rule: 'formula',
  rowCount: 1,
  statusCounts: { ...NONE, confirmed: 1 },
};

const standing = { status: 'seen', statusBefore: 'seen', confirmation: null } as const;
const USCD_DETAILS: TableDetails = {
  ...USCD,
  reproducedIn: null,
  remarks: ['Newer editions exist; their figures were not seen.'],
  formula: null,
  table: {
    columns: [
      { key: 'pollutionClass', label: 'Pollution class', unit: '', identifies: true },
      { key: 'uscdMmPerKv', label: 'Reference', unit: 'mm/kV', identifies: false },
    ],
    rows: [
      {
        ...standing,
        key: 'iec-ts-60815:uscd:a',
        values: { pollutionClass: 'a', uscdMmPerKv: 22 },
        status: 'memory',
        statusBefore: 'memory',
      },
      { ...standing, key: 'iec-ts-60815:uscd:b', values: { pollutionClass: 'b', uscdMmPerKv: 27.8 } },
    ],
  },
};
const ALTITUDE_DETAILS: TableDetails = {
  ...ALTITUDE,
  reproducedIn: null,
  remarks: [],
  table: null,
  formula: {
    expression: 'Ka = exp(m * max(H - H0, 0) / 8150)',
    unit: '',
    symbols: [{ symbol: 'H', meaning: 'altitude', unit: 'm', least: 0, most: 4500 }],
    status: 'confirmed',
    statusBefore: 'seen',
    confirmation: {
      id: 'record-1',
      key: 'atmosphere.altitude-factor',
      outcome: 'confirmed',
      edition: '2011',
      page: '112',
      on: '2026-02-01',
      note: '',
      by: 'W. Tollarsson',
      recordedAt: '2026-02-01T09:00:00Z',
    },
  },
};

const DIFFERENCE: SourceDifference = {
  id: 'creepage',
  topic: 'Pollution',
  quantity: 'Reference creepage of class b',
  unit: 'mm/kV',
  figures: [
    {
      figure: 27.8,
      figureUpTo: null,
      printedFor: 'class b',
      source: { document: 'IEC TS 60815-2', edition: '2008', clause: 'reference creepage', status: 'seen' },
      entryKey: USCD.key,
      key: `${USCD.key}:b`,
      isUsed: true,
    },
    {
      figure: 24,
      figureUpTo: 31,
      printedFor: 'light',
      source: { document: 'Elsewhere', edition: '', clause: 'table 3', status: 'memory' },
      entryKey: null,
      key: null,
      isUsed: false,
    },
  ],
  choice: 'The first, as it was read.',
};

const serverFor = (roles: ReturnType<typeof aPerson>['roles']) =>
  new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ roles }) }))
    .on(contract.tables, () => [USCD, ALTITUDE])
    .on(contract.sourceDifferences, () => [DIFFERENCE])
    .on(contract.table, ({ params }) => (params.key === USCD.key ? USCD_DETAILS : ALTITUDE_DETAILS))
    .on(contract.altitudeConventions, ({ query }) => [
      {
        id: 'rd-337',
        title: 'Spain',
        action: 'multiplies-distance',
        originM: 1000,
        validUpToM: 3000,
        sourceFactor: query.get('altitudeM') === '2000' ? 1.14 : null,
        increaseFactor: query.get('altitudeM') === '2000' ? 1.14 : null,
        source: { document: 'RD 337/2014', edition: '', clause: 'clearance', status: 'seen' },
      },
    ])
    .on(contract.tableConfirmations, () => []);

describe('tables', () => {
  it('count what is confirmed, and narrow by kind and status', async () => {
    serverFor(['engineer']);
    const { user, address } = openPage('/tables');
    await screen.findByText('Reference creepage by class');
    const fact = (label: string) => screen.getByText(label, { selector: 'dt' }).parentElement?.textContent;
    expect([fact('Rows and formulas'), fact('Confirmed'), fact('From memory')]).toEqual([
      'Rows and formulas3',
      'Confirmed1',
      'From memory1',
    ]);
    expect(screen.getByText('1 seen, 1 from memory')).toBeInTheDocument();

    await user.selectOptions(screen.getByLabelText('Status'), 'memory');
    await waitFor(() => expect(screen.queryByText('Altitude factor')).not.toBeInTheDocument());
    expect(address()).toBe('/tables?status=memory');
    await user.click(screen.getByText('Show all'));
    await user.selectOptions(screen.getByLabelText('Kind'), 'formula');
    await waitFor(() => expect(screen.queryByText('Reference creepage by class')).not.toBeInTheDocument());
  });

  it('show where sources differ: every figure with its source, which is used and why', async () => {
    serverFor(['reader']);
    openPage('/tables');
    const sheet = within(await screen.findByRole('region', { name: 'Where sources differ' }));
    expect((await sheet.findAllByRole('listitem')).map((item) => item.textContent)).toEqual([
      '27.8 mm/kVclass bIEC TS 60815-2, 2008, reference creepageseenused',
      '24 to 31 mm/kVlightElsewhere, table 3from memory, not verifiedcompared only',
    ]);
    expect(sheet.getByText('1 quantity')).toBeInTheDocument();
    expect(sheet.getByText('The first, as it was read.')).toBeInTheDocument();
    expect(sheet.getByRole('link')).toHaveAttribute('href', '/tables/iec-ts-60815%3Auscd');
  });

  it('show on a table what others say of its figures', async () => {
    serverFor(['reader']);
    openPage('/tables/iec-ts-60815%3Auscd');
    expect(await screen.findByRole('heading', { name: 'Reference creepage of class b' })).toBeInTheDocument();
    expect(screen.getByText('Elsewhere, table 3')).toBeInTheDocument();
  });

  it('show a formula with where it holds and who confirmed it', async () => {
    serverFor(['engineer']);
    openPage('/tables/atmosphere.altitude-factor');
    expect(await screen.findByText('Ka = exp(m * max(H - H0, 0) / 8150)')).toBeInTheDocument();
    expect(screen.getByText('0 to 4500')).toBeInTheDocument();
    expect(screen.getByText('confirmed, before: seen')).toBeInTheDocument();
    expect(screen.getByText('Print agrees: 2011, page 112, 2026-02-01, W. Tollarsson')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Record/ })).not.toBeInTheDocument();
    expect(screen.queryByRole('region', { name: 'Where sources differ' })).not.toBeInTheDocument();
  });

  it('set the ways with thin air side by side, for the altitude asked', async () => {
    const server = serverFor(['reader']);
    const { user } = openPage('/tables/atmosphere.altitude-factor');
    const row = async () => (await screen.findByText('Spain')).closest('tr')?.textContent;
    expect(await row()).toBe('Spainmultiplies the distance1,0003,0001.1401.140RD 337/2014, clearanceseen');
    await user.clear(screen.getByLabelText(/^Altitude/));
    await user.type(screen.getByLabelText(/^Altitude/), '3500');
    await waitFor(async () =>
      expect(await row()).toBe('Spainmultiplies the distance1,0003,000——RD 337/2014, clearanceseen'),
    );
    expect(server.requestsTo(contract.altitudeConventions).at(-1)?.query.get('altitudeM')).toBe('3500');
  });

  it('let the administrator record that the print differs, with what it says', async () => {
    const server = serverFor(['administrator']).on(contract.confirmTable, ({ body }) => ({
      ...(body as object),
      id: 'record-2',
      by: 'W. Tollarsson',
      recordedAt: '2026-03-01T09:00:00Z',
    }));
    const { user } = openPage('/tables/iec-ts-60815%3Auscd');
    await user.click(await screen.findByLabelText('Record what the print says: Pollution class a'));
    const dialog = within(await screen.findByLabelText('Record'));
    const fill = async (label: string, words: string) => {
      await user.click(dialog.getByLabelText(label));
      await user.paste(words);
    };
    await user.click(dialog.getByLabelText('Outcome'));
    await user.click(await screen.findByText('The print differs'));
    await fill('Edition', '2008');
    await fill('Page', '14');
    fireEvent.change(dialog.getByLabelText('Date'), { target: { value: '2026-03-01' } });
    await user.click(dialog.getByText('Record'));
    expect(await dialog.findByText('What the print says is needed')).toBeInTheDocument();
    expect(server.requestsTo(contract.confirmTable)).toEqual([]);

    await fill('Note', '22.1 mm per kV');
    await user.click(dialog.getByText('Record'));
    await waitFor(() => expect(server.requestsTo(contract.confirmTable)).toHaveLength(1));
    expect(server.requestsTo(contract.confirmTable)[0]?.body).toEqual({
      key: 'iec-ts-60815:uscd:a',
      outcome: 'disputed',
      edition: '2008',
      page: '14',
      on: '2026-03-01',
      note: '22.1 mm per kV',
    });
    await waitFor(() => expect(server.requestsTo(contract.table)).toHaveLength(2));
  });
});

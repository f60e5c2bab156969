import { contract, type Check, type CheckRecord, type Revision } from '@bellgap/common/api';
import { suspensionCase } from '@bellgap/common/drawing/fixtures';
import { CHECKLIST, filledPaths, type ChecklistItem } from '@bellgap/common/schemas';
import { screen, waitFor, within } from '@testing-library/react';
import { aDesignBasis, aPerson } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';
import { inputGroups } from '../model/inputs';

const ADDRESS = '/projects/KL221/specifications/INS-221-003/revisions/A/check';
const { input, evaluation } = suspensionCase;
const source = { document: 'common practice, no published source', edition: '', clause: '', status: 'seen' };

const aRevision = (given: Partial<Revision> = {}): Revision =>
  ({
    id: 'revision-1',
    specificationId: 'specification-1',
    projectCode: 'KL221',
    projectTitle: 'Saltgrave - Ondara',
    number: 'INS-221-003',
    title: 'All strings, Z3',
    label: 'A',
    state: 'in_check',
    input,
    overrides: [],
    basis: aDesignBasis(),
    newerBasisRevision: null,
    context: { insulator: null, settings: {} as never, confirmations: [] },
    evaluation: null,
    figuresHidden: true,
    lockVersion: 5,
    savedAt: '2026-03-12T10:02:31Z',
    savedBy: 'Tamsin Orvelle',
    drafted: { name: 'Tamsin Orvelle', on: '2026-03-12' },
    checked: null,
    approved: null,
    labels: ['A'],
    derivedFrom: null,
    submitted: { name: 'Tamsin Orvelle', on: '2026-03-12', dueOn: '2026-03-20', checkCategory: 2, note: 'Z3 only' },
    returned: null,
    contentCode: 'c0de',
    authors: ['Tamsin Orvelle'],
    openRemarks: 0,
    sheetId: null,
    moves: [],
    mayEdit: false,
    editBarsSigning: false,
    lastSheet: null,
    ...given,
  }) as Revision;

const aRecord = (given: Partial<CheckRecord> = {}): CheckRecord => ({
  id: 'check-1',
  label: 'A',
  contentCode: 'c0de',
  checkCategory: 2,
  checker: 'Rhona Castellary',
  startedAt: '2026-03-13T08:00:00Z',
  ownFigures: { units: 14, unitsCard: 'kv-a-disc', clearanceMm: null, clearanceCard: null, note: 'No table at hand' },
  ownFiguresAt: '2026-03-13T08:00:00Z',
  differences: [
    {
      figure: 'units',
      unit: 'units',
      own: 14,
      authors: 17,
      difference: -3,
      differencePercent: -17.647058,
      band: 2,
      card: 'kv-a-disc',
      outside: true,
    },
  ],
  ticks: [],
  checklist: [],
  differenceReason: '',
  independent: false,
  verdict: null,
  verdictNote: '',
  decidedAt: null,
  decidedOn: null,
  methodEdition: evaluation.methodEdition,
  lockVersion: 1,
  ...given,
});

const aCheck = (given: Partial<Check> = {}): Check => ({
  mayCheck: true,
  why: null,
  cards: [
    { id: 'kv-a-disc', rule: '15 kV a disc', unit: 'units', inRange: true, why: null, source },
    { id: 'old-disc', rule: '11.5 kV a disc', unit: 'units', inRange: false, why: 'Below 100 kV only', source },
    { id: 'cm-a-10-kv', rule: '6.5 cm for 10 kV', unit: 'mm', inRange: true, why: null, source },
  ] as Check['cards'],
  mine: null,
  decided: [],
  ...given,
});

let check: Check;
let revision: Revision;
let server: FakeServer;

function serve() {
  server = new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson({ name: 'Rhona Castellary', roles: ['checker'] }) }))
    .on(contract.check, () => check)
    .on(contract.revision, () => revision)
    .on(contract.remarks, () => ({ items: [], open: 0, mayRaise: true }))
    .on(contract.saveCheck, ({ body }) => {
      const { lockVersion } = check.mine!;
      check = { ...check, mine: { ...check.mine!, ...(body as object), lockVersion: lockVersion + 1 } };
      return check;
    });
}

function running(given: Partial<CheckRecord> = {}) {
  check = aCheck({ mine: aRecord(given) });
  revision = aRevision({ evaluation, figuresHidden: false });
}

const lastSave = () => server.requestsTo(contract.saveCheck).at(-1);

beforeEach(() => {
  check = aCheck();
  revision = aRevision();
  serve();
});

describe('own figures', () => {
  it('come first: inputs are shown, figures are not, and a rule is named', async () => {
    server.on(contract.enterOwnFigures, ({ body }) => {
      running({ ownFigures: body as CheckRecord['ownFigures'] });
      return check;
    });
    const { user } = openPage(ADDRESS);
    expect(await screen.findByText('Altitude')).toBeInTheDocument();
    expect(screen.queryByText('Calculation')).not.toBeInTheDocument();
    expect(screen.getByLabelText(/11.5 kV a disc/)).toBeDisabled();
    expect(screen.getByText('says nothing here: Below 100 kV only')).toBeInTheDocument();
    await user.type(screen.getByLabelText(/^Own count/), '14');
    await user.click(screen.getByText("Enter them and see the author's figures"));
    expect(await screen.findByText('Name the rule you counted by')).toBeInTheDocument();
    expect(screen.getByText('Say why a figure is left out')).toBeInTheDocument();
    expect(server.requestsTo(contract.enterOwnFigures)).toHaveLength(0);
    await user.click(screen.getByLabelText(/15 kV a disc/));
    await user.type(screen.getByLabelText('How you came to them'), 'No table at hand');
    await user.click(screen.getByText("Enter them and see the author's figures"));
    expect(await screen.findByText('Calculation')).toBeInTheDocument();
    expect(server.requestsTo(contract.enterOwnFigures)[0]?.body).toEqual({
      units: 14,
      unitsCard: 'kv-a-disc',
      clearanceMm: null,
      clearanceCard: null,
      note: 'No table at hand',
    });
  });

  it('are not asked of one who may not check, who reads why', async () => {
    check = aCheck({ mayCheck: false, why: 'You changed Altitude on 2026-03-12; nobody checks his own work.' });
    openPage(ADDRESS);
    expect(await screen.findByText(/You changed Altitude on 2026-03-12/)).toBeInTheDocument();
    expect(screen.queryByLabelText(/^Own count/)).not.toBeInTheDocument();
  });
});

describe('a check under way', () => {
  it('agrees by Enter and goes on, takes the words of the line before, and saves by itself', async () => {
    running();
    const { user } = openPage(ADDRESS);
    const fields = await screen.findAllByPlaceholderText('seen in');
    expect(fields).toHaveLength(filledPaths(input).length);
    await user.click(fields[0]!);
    await user.keyboard('Survey SV-12{Enter}');
    expect(fields[1]).toHaveFocus();
    await user.keyboard('{Enter}');
    expect(fields[2]).toHaveFocus();
    const [first, second] = inputGroups(input).flatMap(({ rows }) => rows.map(({ path }) => path));
    await waitFor(() =>
      expect(lastSave()?.body).toMatchObject({
        ticks: [
          { path: first, seenIn: 'Survey SV-12', agreed: true },
          { path: second, seenIn: 'Survey SV-12', agreed: true },
        ],
      }),
    );
    expect(server.requestsTo(contract.saveCheck)[0]?.headers).toMatchObject({
      'If-Match': '"1"',
      'X-Bellgap-Passive': '1',
    });
    expect(await screen.findByText('All saved.')).toBeInTheDocument();
  });

  it('agrees to all of a group that is open with one text', async () => {
    running();
    const { user } = openPage(ADDRESS);
    await user.type(await screen.findByLabelText('All of Site, seen in'), 'Pollution report');
    await user.keyboard('{Enter}');
    const paths = inputGroups(input)
      .find(({ name }) => name === 'Site')!
      .rows.map(({ path }) => path);
    await waitFor(() => {
      const { ticks } = lastSave()!.body as { ticks: CheckRecord['ticks'] };
      expect(ticks.map(({ path }) => path)).toEqual(paths);
      expect(new Set(ticks.map(({ seenIn }) => seenIn))).toEqual(new Set(['Pollution report']));
    });
  });

  it('shows the difference in units and per cent and asks for the reason outside the band', async () => {
    running();
    openPage(ADDRESS);
    const row = within((await screen.findByText('Count of units')).closest('tr')!);
    expect(row.getByText('−3 units (−17.6 %)')).toBeInTheDocument();
    expect(row.getByText('± 2 units')).toBeInTheDocument();
    expect(row.getByText('△ outside the band')).toBeInTheDocument();
    expect(screen.getByLabelText('Reason for the difference, needed for a pass')).toBeInTheDocument();
  });

  it('brings together what was saved in another window, and nothing of either is lost', async () => {
    running();
    const [first = '', second = ''] = inputGroups(input).flatMap(({ rows }) => rows.map(({ path }) => path));
    let isRefused = false;
    server.on(contract.saveCheck, ({ body }) => {
      if (!isRefused) {
        isRefused = true;
        const theirs = aRecord({ lockVersion: 7, ticks: [{ path: second, seenIn: 'Other window', agreed: true }] });
        return new Refusal('newer-version', 'saved meanwhile', [], { current: theirs });
      }
      check = { ...check, mine: { ...aRecord(), ...(body as object), lockVersion: 8 } };
      return check;
    });
    const { user } = openPage(ADDRESS);
    await user.click((await screen.findAllByPlaceholderText('seen in'))[0]!);
    await user.keyboard('Here{Enter}');
    expect(await screen.findByText(/saved in another window too/)).toBeInTheDocument();
    await waitFor(() =>
      expect(lastSave()).toMatchObject({
        headers: { 'If-Match': '"7"' },
        body: {
          ticks: expect.arrayContaining([
            { path: first, seenIn: 'Here', agreed: true },
            { path: second, seenIn: 'Other window', agreed: true },
          ]) as unknown,
        },
      }),
    );
  });

  it('says what is missing for a pass; a return is open all the same, with note and password', async () => {
    running();
    server.on(contract.decideCheck, () => {
      check = aCheck({
        mayCheck: false,
        why: 'This revision is a draft.',
        decided: [aRecord({ verdict: 'return', verdictNote: 'Altitude?', decidedAt: '2026-03-13T09:00:00Z' })],
      });
      revision = aRevision({ state: 'draft', evaluation, figuresHidden: false });
      return check;
    });
    const { user } = openPage(ADDRESS);
    const verdict = within(await screen.findByRole('region', { name: '5 Verdict' }));
    expect(verdict.getByText(/^Inputs: not looked at yet: Kind, Basis/)).toBeInTheDocument();
    expect(verdict.getByText('Checklist: 10 of the points are not answered yet')).toBeInTheDocument();
    expect(verdict.getByText(/^Independence/)).toBeInTheDocument();
    expect(verdict.getByText(/^Reason for the difference/)).toBeInTheDocument();
    expect(verdict.getByLabelText('Pass')).toBeDisabled();
    await user.click(verdict.getByLabelText('Return'));
    await user.type(verdict.getByLabelText('Password'), 'secret words');
    await user.click(verdict.getByText('Sign the verdict'));
    expect(await verdict.findByText('Say what is to be noted or done')).toBeInTheDocument();
    await user.type(verdict.getByLabelText('Note'), 'Altitude?');
    await user.click(verdict.getByText('Sign the verdict'));
    expect(await screen.findByText('Check of revision A by Rhona Castellary')).toBeInTheDocument();
    expect(server.requestsTo(contract.decideCheck)[0]).toMatchObject({
      headers: { 'If-Match': '"1"' },
      body: { verdict: 'return', note: 'Altitude?', password: 'secret words' },
    });
  });

  it('opens a pass when every input is agreed, every point answered, independence declared and the reason given', async () => {
    running({
      ticks: filledPaths(input).map((path) => ({ path, seenIn: 'Survey', agreed: true })),
      checklist: (Object.keys(CHECKLIST) as ChecklistItem[]).map((item) => ({ item, answer: 'yes', note: '' })),
      differenceReason: 'The rule knows no pollution.',
    });
    const { user } = openPage(ADDRESS);
    const verdict = within(await screen.findByRole('region', { name: '5 Verdict' }));
    await user.click(screen.getByLabelText(/^I had no part in this work/));
    expect(await verdict.findByText('Nothing is missing for a pass.')).toBeInTheDocument();
    expect(verdict.getByLabelText('Pass')).toBeEnabled();
    await waitFor(() => expect(lastSave()?.body).toMatchObject({ independent: true }));
  });

  it('begins a remark beside an input', async () => {
    running();
    const { user } = openPage(ADDRESS);
    await user.click(await screen.findByLabelText('Remark on Altitude'));
    const form = within(screen.getByRole('form', { name: 'New remark' }));
    expect(await form.findByText('Altitude')).toBeInTheDocument();
  });
});

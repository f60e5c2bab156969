import { contract, type IssuedSheet } from '@bellgap/common/api';
import { begin, makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';
import {
  QUIET,
  acceptingAll,
  issue,
  issueNext,
  pass,
  signersOf,
  submit,
  toApproval,
  type Signers,
} from './support/to-issue';

const { approval, concessions, desk, issueRevision, issuedSheet, issuedSheetFile, revision, sheets, verification } =
  contract;

jest.setTimeout(120_000);

describe('register', () => {
  let test: TestApp;
  let signers: Signers;
  let reader: TestClient;
  let buyer: TestClient;
  let first: IssuedSheet;
  let second: IssuedSheet;
  const at = (number: string, label = 'latest') => ({ code: 'L1', number, label });
  const place = (number: string) => ({ code: 'L1', number });
  const altitude = (altitudeM: number) => ({ ...QUIET, site: { ...QUIET.site!, altitudeM } });

  beforeAll(async () => {
    test = await TestApp.start({ PUBLIC_URL: 'https://sheets.company.example' });
    signers = await signersOf(test);
    await makeLine(signers.engineer, 'L1');
    await makeLine(signers.engineer, 'L2');
    first = await issue(signers, place('S-1'), altitude(700));
    second = await issueNext(signers, place('S-1'), altitude(800));
    await issue(signers, place('S-2'), altitude(300));
    await issue(signers, { code: 'L2', number: 'T-1' }, altitude(500));
    await begin(signers.engineer, 'L1', 'S-3');
    ({ client: reader } = await test.signedIn({ roles: ['reader'] }));
    ({ client: buyer } = await test.signedIn({ roles: ['procurement'], projects: ['L1'] }));
  });
  afterAll(() => test.stop());

  const list = async (client: TestClient, query: Record<string, string> = {}) =>
    (await client.call(sheets, { query })).answer;
  const names = (items: { number: string; label: string }[]) => items.map(({ number, label }) => `${number} ${label}`);

  it('lists what is issued, the newest first, to all who know the project, and nothing else', async () => {
    expect(names((await list(reader)).items)).toEqual(['T-1 0', 'S-2 0', 'S-1 1', 'S-1 0']);
    expect(names((await list(buyer)).items)).toEqual(['S-2 0', 'S-1 1', 'S-1 0']);
    expect((await list((await test.signedIn({ roles: ['reader'], projects: ['L2'] })).client)).items).toHaveLength(1);
    expect((await list((await test.signedIn({ roles: [] })).client)).items).toEqual([]);
  });

  it('filters, searches, sorts and pages both ways', async () => {
    const found = async (query: Record<string, string>) => names((await list(reader, query)).items);
    expect(await found({ standing: 'superseded' })).toEqual(['S-1 0']);
    expect(await found({ projectCode: 'L2' })).toEqual(['T-1 0']);
    expect(await found({ search: 't-1' })).toEqual(['T-1 0']);
    expect(await found({ search: '%' })).toEqual([]);
    expect(await found({ insulatorCode: 'U70BL' })).toEqual([]);
    expect(await found({ kind: 'bay' })).toEqual([]);
    expect(await found({ sort: 'altitudeM' })).toEqual(['S-2 0', 'T-1 0', 'S-1 0', 'S-1 1']);
    expect(await found({ sort: '-altitudeM' })).toEqual(['S-1 1', 'S-1 0', 'T-1 0', 'S-2 0']);
    for (const sort of ['issuedAt', 'number', 'title', 'units', 'highestVoltageKv', '-altitudeM']) {
      const whole = await found({ sort });
      const one = await list(reader, { sort, limit: '2' });
      const two = await list(reader, { sort, limit: '2', cursor: one.next! });
      expect([...names(one.items), ...names(two.items)]).toEqual(whole);
      expect(two.next).toBeNull();
      expect(names((await list(reader, { sort, limit: '2', cursor: two.previous! })).items)).toEqual(names(one.items));
    }
    expect((await reader.call(sheets, { query: { sort: 'savedAt' } })).status).toBe(422);
  });

  it('shows drafts to nobody who reads issued sheets only: 404, and no trace of them in lists', async () => {
    for (const client of [reader, buyer]) {
      expect((await client.call(revision, { params: at('S-3') })).status).toBe(404);
      expect((await client.call(approval, { params: at('S-3') })).status).toBe(403);
      const { items } = (await client.call(contract.specifications, { params: { code: 'L1' } })).answer;
      expect(names(items)).toEqual(['S-1 1', 'S-2 0']);
      expect((await client.call(issuedSheet, { params: { id: first.id } })).status).toBe(200);
    }
    const other = (await test.signedIn({ roles: ['reader'], projects: ['L2'] })).client;
    for (const endpoint of [issuedSheet, issuedSheetFile]) {
      expect((await other.call(endpoint, { params: { id: first.id } })).status).toBe(404);
      expect((await reader.call(endpoint, { params: { id: 'no-id' } })).status).toBe(404);
    }
  });

  describe('look-up of a print', () => {
    const lookUp = async (code: string, address = '192.0.2.1') => {
      const called = await test.stranger().call(verification, {
        params: { verificationCode: code },
        headers: { 'X-Forwarded-For': address },
      });
      return called;
    };

    it('answers anybody whether it is in force, superseded or withdrawn, and since when', async () => {
      const current = await lookUp(second.verificationCode);
      expect(current.status).toBe(200);
      expect(current.headers['cache-control']).toBe('no-store');
      expect(current.answer).toEqual({
        standing: 'current',
        number: 'S-1',
        revision: '1',
        issuedOn: second.approved.on,
        contentCode: second.contentCode,
        supersededBy: null,
        since: second.issuedAt,
      });
      const plain = first.verificationCode.replaceAll('-', '').toLowerCase();
      expect((await lookUp(plain)).answer).toMatchObject({
        standing: 'superseded',
        revision: '0',
        supersededBy: '1',
        since: second.issuedAt,
      });
      const gone = await issue(signers, place('S-9'));
      const body = { reason: 'Wrong class', password: signers.password };
      await signers.approver.call(contract.withdrawSheet, { params: { id: gone.id }, body });
      expect((await lookUp(gone.verificationCode)).answer).toMatchObject({ standing: 'withdrawn', supersededBy: null });
    });

    it('knows nothing of what it cannot read, and says no more', async () => {
      const unknown = {
        standing: 'unknown',
        number: null,
        revision: null,
        issuedOn: null,
        contentCode: null,
        supersededBy: null,
        since: null,
      };
      for (const code of ['AAAA-AAAA-AAAA-AAAA', 'x', '%00', '0O1I-0O1I-0O1I-0O1I', "' or 1=1"]) {
        const { status, answer } = await lookUp(code);
        expect([status, answer]).toEqual([200, unknown]);
      }
    });
  });

  it('bears 30 look-ups a minute, then says when to ask again', async () => {
    const ask = () => test.stranger().call(verification, { params: { verificationCode: first.verificationCode } });
    test.clock.advance({ minutes: 2 });
    const all = await Promise.all(Array.from({ length: 32 }, ask));
    expect(all.filter(({ status }) => status === 200)).toHaveLength(30);
    const refused = all.filter(({ status }) => status === 429);
    expect(refused).toHaveLength(2);
    expect(Number(refused[0]!.headers['retry-after'])).toBeGreaterThan(0);
    expect(Number(refused[0]!.headers['retry-after'])).toBeLessThanOrEqual(60);
    test.clock.advance({ seconds: 61 });
    expect((await ask()).status).toBe(200);
  });

  describe('concessions', () => {
    it('stand in a list by their end, and on the desk when it is near', async () => {
      const day = (days: number) => new Date(test.clock.now().getTime() + days * 86_400_000).toISOString().slice(0, 10);
      const short = { ...QUIET, string: { ...QUIET.string!, insulatorCode: 'U160BL', spareUnits: 0 } };
      await toApproval(signers, place('S-4'), { ...short, mechanical: WEAK });
      const { answer: seen } = await signers.approver.call(approval, { params: at('S-4') });
      expect(seen.fails.length).toBeGreaterThan(0);
      const { lockVersion } = (await signers.approver.call(revision, { params: at('S-4') })).answer;
      const whole = acceptingAll(seen, signers.password);
      const send = (validUntil: string) =>
        signers.approver.call(issueRevision, {
          params: at('S-4'),
          version: lockVersion,
          body: { ...whole, concessions: whole.concessions.map((one) => ({ ...one, validUntil })) },
        });
      const past = await send(day(-1));
      expect(past.problem.errors[0]).toEqual({
        path: 'concessions[0].validUntil',
        message: 'Valid until: must lie in the future',
      });
      expect((await send(day(20))).status).toBe(201);
      const given = (await signers.engineer.call(concessions)).answer;
      expect(given[0]).toMatchObject({
        number: 'S-4',
        label: '0',
        kind: 'concession',
        standing: 'current',
        givenBy: 'Asta Velin',
      });
      expect([19, 20, 21]).toContain(given[0]!.daysLeft);
      expect((await signers.engineer.call(concessions, { query: { within: '5' } })).answer).toEqual([]);
      expect((await signers.engineer.call(concessions, { query: { projectCode: 'L2' } })).answer).toEqual([]);
      expect((await signers.engineer.call(desk)).answer.endingConcessions[0]).toMatchObject({ number: 'S-4' });
      expect((await reader.call(desk)).answer.endingConcessions).toEqual([]);
    });
  });

  describe('desk', () => {
    const waiting = async (client: TestClient) =>
      (await client.call(desk)).answer.waiting.map(({ why, row }) => `${row.number} ${why}`);

    it('says what waits for whom and why, and nothing that he cannot act on', async () => {
      await begin(signers.engineer, 'L1', 'S-5');
      await submit(signers, place('S-5'));
      expect(await waiting(signers.checker)).toEqual(['S-5 check']);
      const [row] = (await signers.checker.call(desk)).answer.waiting;
      expect(row!.row).toMatchObject({ figuresHidden: true, units: null });
      expect(await waiting(signers.approver)).toEqual([]);
      expect(await waiting(signers.engineer)).toEqual([]);
      expect((await reader.call(desk)).answer).toMatchObject({ waiting: [], drafts: [], returned: [] });

      const params = at('S-5');
      const body = { units: null, unitsCard: null, clearanceMm: null, clearanceCard: null, note: 'By hand' };
      await signers.checker.call(contract.enterOwnFigures, { params, body });
      expect(await waiting(signers.checker)).toEqual(['S-5 go-on-checking']);
      const raised = await signers.checker.call(contract.raiseRemark, { params, body: { path: null, text: 'Why?' } });
      const remarkId = raised.answer.items[0]!.id;
      expect(await waiting(signers.engineer)).toEqual(['S-5 answer']);
      await signers.engineer.call(contract.answerRemark, {
        params: { ...params, remarkId },
        body: { text: 'Because' },
      });
      expect(await waiting(signers.engineer)).toEqual([]);
      expect((await waiting(signers.checker)).sort()).toEqual(['S-5 close', 'S-5 go-on-checking']);
      await signers.checker.call(contract.closeRemark, { params: { ...params, remarkId } });
    });

    it('shows who may approve what is checked, and returns with their reason to the author', async () => {
      await begin(signers.engineer, 'L1', 'S-6');
      await submit(signers, place('S-6'));
      await pass(signers, place('S-6'));
      expect(await waiting(signers.approver)).toEqual(['S-6 approve']);
      const { lockVersion } = (await signers.approver.call(revision, { params: at('S-6') })).answer;
      const body = { reason: 'The class is not proven' };
      await signers.approver.call(contract.refuseRevision, { params: at('S-6'), version: lockVersion, body });
      expect(await waiting(signers.approver)).toEqual([]);
      const { returned } = (await signers.engineer.call(desk)).answer;
      expect(returned.map(({ note, row }) => [row.number, note])).toEqual([['S-6', 'The class is not proven']]);
      expect(names((await reader.call(desk)).answer.issued)).toContain('S-2 0');
    });
  });
});

/** A load that one string does not bear with the factor asked for. */
const WEAK = {
  basis: 'rd-223' as const,
  subconductors: 1,
  crossing: false,
  acceptedStatistically: true,
  windSpanM: 350,
  weightSpanM: 500,
  lineAngleDeg: 0,
  cases: [
    {
      name: 'Everyday',
      kind: 'everyday' as const,
      conductorWeightNPerM: 200,
      windPressurePa: 0,
      conductorDiameterMm: 31.5,
      conductorTensionN: 30_000,
      stringWindN: 0,
      stringWeightN: 900,
      hardwareWeightN: 300,
    },
  ],
};

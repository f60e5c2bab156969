import { createHash } from 'node:crypto';
import { contract, type IssuedSheet } from '@bellgap/common/api';
import { lineInput, makeLine, reviseBasis, SYSTEM_220 } from './support/line-project';
import { TestApp } from './support/test-app';
import {
  QUIET,
  acceptingAll,
  issue,
  issueNext,
  pass,
  signersOf,
  submit,
  toApproval,
  tryToIssue,
  type Signers,
} from './support/to-issue';

const { approval, issueRevision, issuedSheet, issuedSheetFile, revision, sheetFile, withdrawSheet } = contract;

// Sheets are drawn here, and other tests share the machine.
jest.setTimeout(120_000);

describe('approve and issue', () => {
  let test: TestApp;
  let signers: Signers;
  const at = (number: string, label = 'latest') => ({ code: 'L1', number, label });
  const place = (number: string) => ({ code: 'L1', number });
  const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

  beforeAll(async () => {
    test = await TestApp.start({ PUBLIC_URL: 'http://127.0.0.1:3000' });
    signers = await signersOf(test);
    await makeLine(signers.engineer, 'L1');
  });
  afterAll(() => test.stop());

  const letters = async () =>
    (
      await test.database.owner('graphile_worker._private_jobs').select<{ payload: Record<string, never> }[]>('payload')
    ).map(
      ({ payload }) =>
        payload as unknown as { kind: string; toUserId: string; data: { number: string; label: string } },
    );

  it('issues what was checked: number, signatures, codes, register, and the file from store for ever', async () => {
    await toApproval(signers, place('S-1'));
    const before = (await signers.approver.call(approval, { params: at('S-1') })).answer;
    expect(before).toMatchObject({ mayIssue: true, barred: [], nextLabel: '0', inForce: null, openRemarks: 0 });
    const { contentCode } = (await signers.approver.call(revision, { params: at('S-1') })).answer;
    const { status, answer } = await tryToIssue(signers, place('S-1'));
    expect(status).toBe(201);
    expect(answer).toMatchObject({
      number: 'S-1',
      label: '0',
      standing: 'current',
      contentCode,
      drafted: { name: 'Edda Rowan' },
      checked: { name: 'Corin Ashby' },
      approved: { name: 'Asta Velin' },
      mayWithdraw: true,
      insulatorCode: 'U160BL',
      highestVoltageKv: 245,
    });
    expect(answer.verificationCode).toMatch(/^[2-9A-HJ-NP-Z]{4}(-[2-9A-HJ-NP-Z]{4}){3}$/);
    expect(answer.verificationUrl).toBe(`http://127.0.0.1:3000/verify/${answer.verificationCode}`);

    const issued = (await signers.engineer.call(revision, { params: at('S-1', '0') })).answer;
    expect(issued).toMatchObject({ state: 'issued', sheetId: answer.id, contentCode, labels: ['A', '0'] });
    const byLetter = (await signers.engineer.call(revision, { params: at('S-1', 'A') })).answer;
    expect(byLetter.id).toBe(issued.id);

    const files = [
      await signers.engineer.call(issuedSheetFile, { params: { id: answer.id } }),
      await signers.engineer.call(sheetFile, { params: at('S-1', '0') }),
      await signers.engineer.call(sheetFile, { params: at('S-1', 'A') }),
    ].map(({ response }) => response.body as Buffer);
    for (const bytes of files) {
      expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
      expect(sha256(bytes)).toBe(answer.fileSha256);
    }
    const { headers } = await signers.engineer.call(issuedSheetFile, { params: { id: answer.id } });
    expect(headers['content-disposition']).toBe('attachment; filename="S-1_0.pdf"');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['content-security-policy']).toBe("sandbox; default-src 'none'");
  });

  it('supersedes the former issue and tells who holds a copy, and nobody else', async () => {
    const reader = await test.signedIn({ roles: ['reader'] });
    const buyer = await test.signedIn({ roles: ['procurement'] });
    const first = await issue(signers, place('S-2'));
    await reader.client.call(issuedSheetFile, { params: { id: first.id } });
    const second = await issueNext(signers, place('S-2'), { ...QUIET, site: { ...QUIET.site!, altitudeM: 1000 } });
    expect(second).toMatchObject({ label: '1', standing: 'current' });
    expect(second.issues.map(({ label, standing }) => [label, standing])).toEqual([
      ['1', 'current'],
      ['0', 'superseded'],
    ]);
    const former = (await reader.client.call(issuedSheet, { params: { id: first.id } })).answer;
    expect(former).toMatchObject({
      standing: 'superseded',
      successor: { id: second.id, label: '1' },
      standingBy: 'Asta Velin',
      mayWithdraw: false,
    });
    expect((await signers.engineer.call(revision, { params: at('S-2', '0') })).answer.state).toBe('superseded');
    const sent = (await letters()).filter(({ data }) => data.number === 'S-2');
    const to = (kind: string) => sent.filter((letter) => letter.kind === kind).map(({ toUserId }) => toUserId);
    expect(to('superseded-you-hold-a-copy')).toEqual([reader.person.id]);
    expect(to('issued')).toContain(buyer.person.id);
    expect(to('issued')).not.toContain(reader.person.id);
    expect(sent.find(({ kind }) => kind === 'superseded-you-hold-a-copy')?.data.label).toBe('1');
  });

  it('shows field by field what differs from the revision in force', async () => {
    await issue(signers, place('S-3'));
    await signers.engineer.call(contract.startRevision, { params: place('S-3') });
    await submit(signers, place('S-3'), { ...QUIET, site: { ...QUIET.site!, altitudeM: 950 } });
    await pass(signers, place('S-3'));
    const { answer } = await signers.approver.call(approval, { params: at('S-3') });
    expect(answer.changes).toEqual([{ path: 'site.altitudeM', from: 900, to: 950 }]);
    expect(answer).toMatchObject({ nextLabel: '1', inForce: { label: '0' } });
  });

  it('lets one of two approvers win, and one of two issues at once', async () => {
    await toApproval(signers, place('S-4'));
    const other = await test.signedIn({ roles: ['approver'] });
    const { lockVersion } = (await signers.approver.call(revision, { params: at('S-4') })).answer;
    const seen = (await signers.approver.call(approval, { params: at('S-4') })).answer;
    const body = acceptingAll(seen, signers.password);
    const send = (client: Signers['approver']) =>
      client.call(issueRevision, { params: at('S-4'), version: lockVersion, body });
    const both = await Promise.all([send(signers.approver), send(other.client), send(signers.approver)]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    const sheets = await test.database.owner('sheets').where({ number: 'S-4', kind: 'issued' });
    expect(sheets).toHaveLength(1);
  });

  it('asks the password again, and refuses a wrong one beside it', async () => {
    await toApproval(signers, place('S-5'));
    const wrong = await tryToIssue({ ...signers, password: 'not my password' }, place('S-5'));
    expect(wrong.status).toBe(422);
    expect(wrong.problem.errors).toEqual([{ path: 'password', message: 'Password: is not right' }]);
    expect((await signers.engineer.call(revision, { params: at('S-5') })).answer.state).toBe('checked');
  });

  it('refuses who drafted, who checked, and who is no approver', async () => {
    const all = await test.signedIn({ roles: ['engineer', 'checker', 'approver'] });
    const own: Signers = { ...signers, engineer: all.client };
    await toApproval(own, place('S-6'));
    const author = await tryToIssue({ ...signers, approver: all.client }, place('S-6'));
    expect(author.status).toBe(403);
    expect(author.problem.detail).toMatch(/^You changed .* nobody checks or approves his own work\.$/);
    const seen = (await all.client.call(approval, { params: at('S-6') })).answer;
    expect(seen.mayIssue).toBe(false);
    expect(seen.barred.join()).toMatch(/his own work/);

    await toApproval({ ...signers, checker: all.client }, place('S-7'));
    const checked = await tryToIssue({ ...signers, approver: all.client }, place('S-7'));
    expect(checked.status).toBe(403);
    expect(checked.problem.detail).toMatch(/You have checked this revision/);
    const administrator = await test.signedIn({ roles: ['administrator'] });
    expect((await administrator.client.call(issueRevision, { params: at('S-7'), version: 1, body: {} })).status).toBe(
      403,
    );
  });

  it('refuses while a remark is open', async () => {
    await toApproval(signers, place('S-8'));
    const body = { path: 'site.altitudeM', text: 'Which structure is that?' };
    await signers.approver.call(contract.raiseRemark, { params: at('S-8'), body });
    const { status, problem } = await tryToIssue(signers, place('S-8'));
    expect([status, problem.detail]).toEqual([409, 'One remark is open; who raised it has to close it first.']);
  });

  describe('outside a source and short of what is required', () => {
    const HIGH = { ...QUIET, site: { ...QUIET.site!, altitudeM: 3900 } };

    it('asks for a reason for each acceptance and a concession for each fail, each beside its field', async () => {
      await toApproval(signers, place('S-10'), HIGH);
      const { answer: seen } = await signers.approver.call(approval, { params: at('S-10') });
      expect(seen.acceptances.length).toBeGreaterThan(0);
      const { lockVersion } = (await signers.approver.call(revision, { params: at('S-10') })).answer;
      const whole = acceptingAll(seen, signers.password);
      const send = (body: object) =>
        signers.approver.call(issueRevision, { params: at('S-10'), version: lockVersion, body: { ...whole, ...body } });

      const none = await send({ acceptances: [], concessions: [] });
      expect(none.status).toBe(422);
      expect(none.problem.errors).toContainEqual({
        path: 'acceptances',
        message: `Needs a reason: ${seen.acceptances[0]!.text}`,
      });
      const empty = await send({ acceptances: whole.acceptances.map((one) => ({ ...one, reason: ' ' })) });
      expect(empty.status).toBe(422);
      expect(empty.problem.errors[0]!.path).toBe('acceptances[0].reason');
      const stray = await send({
        acceptances: [...whole.acceptances, { code: 'x', field: null, text: 'Something else', reason: 'why' }],
      });
      expect(stray.problem.errors[0]!.path).toBe(`acceptances[${whole.acceptances.length}].text`);
      const sent = await send({});
      expect(sent.status).toBe(201);
      expect(sent.answer.acceptances).toBe(seen.acceptances.length);
      expect(sent.answer.concessionList.map(({ kind, reason }) => [kind, reason])).toContainEqual([
        'acceptance',
        'Seen and accepted',
      ]);
    });
  });

  it('says what is newer than the submission, and asks why it is not waited for', async () => {
    await makeLine(signers.engineer, 'L2');
    const there = { code: 'L2', number: 'S-1' };
    await toApproval(signers, there);
    await reviseBasis(signers.engineer, 'L2', 1, { ...SYSTEM_220, faultCurrentKa: 40 });
    const params = { ...there, label: 'latest' };
    const { answer: seen } = await signers.approver.call(approval, { params });
    expect(seen.laterChanges).toEqual([
      { code: 'basis', text: 'Design basis: submitted on DB-L2 revision 1; revision 2 is newer.' },
    ]);
    const { lockVersion } = (await signers.approver.call(revision, { params })).answer;
    const body = { ...acceptingAll(seen, signers.password), laterChangesReason: null };
    const refused = await signers.approver.call(issueRevision, { params, version: lockVersion, body });
    expect(refused.status).toBe(422);
    expect(refused.problem.errors[0]!.path).toBe('laterChangesReason');
    const { status, answer } = await tryToIssue(signers, there);
    expect(status).toBe(201);
    expect(answer.concessionList).toMatchObject([
      { kind: 'later-change', code: 'basis', reason: 'Does not touch this sheet' },
    ]);
  });

  it('names assumptions, and that the pollution class is due to be measured again', async () => {
    const pollution = { class: 'd', type: 'A', basis: 'estimated', recheckBy: '2020-05-31' } as const;
    const input = { ...QUIET, site: { altitudeM: 900, pollution } };
    const sheet = await issue(signers, place('S-11'), input);
    const due = 'The pollution class was to be measured again by 2020-05-31; that day has passed.';
    expect(sheet.cautions.map(({ text }) => text)).toEqual([due]);
    const { answer } = await signers.approver.call(approval, { params: at('S-11') });
    expect(answer.cautions.map(({ text }) => text)).toContain(due);
    expect(answer.assumed.map(({ path }) => path)).toContain('site.pollution.basis');
  });

  describe('withdrawal', () => {
    let sheet: IssuedSheet;
    beforeAll(async () => {
      sheet = await issue(signers, place('S-12'));
    });

    it('needs an approver, a reason and the password; then the sheet is out of force and its holders are told', async () => {
      const holder = await test.signedIn({ roles: ['reader'] });
      await holder.client.call(issuedSheetFile, { params: { id: sheet.id } });
      const send = (client: Signers['approver'], body: object) =>
        client.call(withdrawSheet, { params: { id: sheet.id }, body });
      const whole = { reason: 'The route has moved', password: signers.password };
      expect((await send(signers.engineer, whole)).status).toBe(403);
      expect((await send(signers.approver, { ...whole, reason: '' })).problem.errors[0]!.path).toBe('reason');
      expect((await send(signers.approver, { ...whole, password: 'x' })).problem.errors[0]!.path).toBe('password');
      const { status, answer } = await send(signers.approver, whole);
      expect(status).toBe(201);
      expect(answer).toMatchObject({
        standing: 'withdrawn',
        standingReason: 'The route has moved',
        mayWithdraw: false,
      });
      expect((await signers.engineer.call(revision, { params: at('S-12', '0') })).answer.state).toBe('withdrawn');
      expect((await send(signers.approver, whole)).status).toBe(409);
      const told = (await letters()).filter(({ kind }) => kind === 'withdrawn-you-hold-a-copy');
      expect(told.map(({ toUserId }) => toUserId)).toEqual([holder.person.id]);
    });
  });

  it('dates signatures by the day where the line stands', async () => {
    const input = lineInput({ clearance: QUIET.clearance });
    await toApproval(signers, place('S-13'), input);
    // To 21:30 in UTC, which is 01:30 of the next day at the site.
    const now = test.clock.now();
    const late = new Date(now);
    late.setUTCHours(21, 30, 0, 0);
    if (late <= now) late.setUTCDate(late.getUTCDate() + 1);
    test.clock.advance({ seconds: (late.getTime() - now.getTime()) / 1000 });
    const approver = await test.signedIn({ name: 'Asta Velin', roles: ['approver'] });
    const { status, answer } = await tryToIssue({ ...signers, approver: approver.client }, place('S-13'));
    expect(status).toBe(201);
    expect(answer.approved.on).toBe(new Date(late.getTime() + 4 * 3_600_000).toISOString().slice(0, 10));
    expect(answer.approved.on).not.toBe(answer.issuedAt.slice(0, 10));
    signers = await signersOf(test);
  });
});

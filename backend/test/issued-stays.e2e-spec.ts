import type { Knex } from 'knex';
import { contract, type IssuedSheet } from '@bellgap/common/api';
import { createKnex } from '@bellgap/database';
import { makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import { issue, signersOf, toApproval, type Signers } from './support/to-issue';

const { issuedSheet, issuedSheetFile, sheetFile } = contract;

jest.setTimeout(120_000);

describe('what is issued stays', () => {
  let test: TestApp;
  let signers: Signers;
  let sheet: IssuedSheet;
  const place = { code: 'L1', number: 'S-1' };

  beforeAll(async () => {
    test = await TestApp.start();
    signers = await signersOf(test);
    await makeLine(signers.engineer, 'L1');
    sheet = await issue(signers, place);
    await test.database.owner('sheet_readings').insert({
      sheet_id: sheet.id,
      user_id: (await test.people.add({ roles: ['reader'] })).id,
    });
  });
  afterAll(() => test.stop());

  const STATEMENTS = [
    "update revisions set input = '{}' where state = 'issued'",
    "update revisions set title = 'Other' where state = 'issued'",
    "update revisions set label = '7' where state = 'issued'",
    "update revisions set state = 'draft' where state = 'issued'",
    "update revisions set state = 'checked' where state = 'issued'",
    "update revisions set approved_by = drafted_by where state = 'issued'",
    "update revisions set content_code = '000000000000' where state = 'issued'",
    "delete from revisions where state = 'issued'",
    'truncate revisions cascade',
    "update sheets set content_code = '000000000000' where kind = 'issued'",
    "update sheets set evaluation = '{}' where kind = 'issued'",
    "update sheets set verification_code = 'AAAAAAAAAAAAAAAA' where kind = 'issued'",
    "update sheets set units = 1 where kind = 'issued'",
    "update sheets set kind = 'draft' where kind = 'issued'",
    "delete from sheets where kind = 'issued'",
    'truncate sheets cascade',
    "update sheet_files set bytes = 'x'",
    "delete from sheet_files where sheet_id in (select id from sheets where kind = 'issued')",
    'truncate sheet_files',
    "update submissions set input = '{}'",
    'delete from submissions',
    'truncate submissions cascade',
    'delete from check_records',
    'delete from revision_labels',
    'update revision_changes set changed_by = gen_random_uuid()',
    'delete from revision_changes',
  ];

  describe.each(['bellgap_app', 'bellgap_owner'] as const)('as %s', (role) => {
    it.each(STATEMENTS)('%s is refused', async (statement) => {
      const knex = role === 'bellgap_app' ? test.database.knex : test.database.owner;
      await expect(knex.raw(statement)).rejects.toMatchObject({ code: expect.stringMatching(/^(23514|42501)$/) });
    });
  });

  it('refuses one who has changed a revision as its approver, whatever the code does', async () => {
    const there = { code: 'L1', number: 'S-2' };
    await toApproval(signers, there);
    const revision = test.database.owner('revisions').where({ state: 'checked' });
    const [row] = (await revision.clone().select('drafted_by', 'checked_by')) as {
      drafted_by: string;
      checked_by: string;
    }[];
    for (const approver of [row!.drafted_by, row!.checked_by]) {
      const move = { state: 'issued', label: '0', approved_by: approver, issued_at: new Date() };
      await expect(revision.clone().update(move)).rejects.toMatchObject({ code: '23514' });
    }
  });

  describe('a byte changed behind the back of the product', () => {
    let superuser: Knex;
    beforeAll(() => {
      const url = new URL(process.env.TEST_SUPERUSER_DATABASE_URL!);
      url.pathname = new URL(test.database.url).pathname;
      superuser = createKnex({ url: url.href, poolMax: 1 });
    });
    afterAll(() => superuser.destroy());

    const withoutTriggers = (statement: string) =>
      superuser.transaction(async (db) => {
        await db.raw("set local session_replication_role = 'replica'");
        await db.raw(statement, [sheet.id]);
      });

    it('is found at the next download, and the file is not given', async () => {
      const params = { id: sheet.id };
      const byLabel = { ...place, label: '0' };
      expect((await signers.engineer.call(issuedSheetFile, { params })).status).toBe(200);
      await withoutTriggers(
        'update sheet_files set bytes = set_byte(bytes, 100, (get_byte(bytes, 100) + 1) % 256) where sheet_id = ?',
      );
      const calls = [
        await signers.engineer.call(issuedSheetFile, { params }),
        await signers.engineer.call(sheetFile, { params: byLabel }),
      ];
      for (const { status, problem } of calls) {
        expect(status).toBe(500);
        expect(problem.detail).toMatch(/its hash differs\. Do not use a copy of it/);
      }
      expect((await signers.engineer.call(issuedSheet, { params })).status).toBe(200);
      await withoutTriggers(
        'update sheet_files set bytes = set_byte(bytes, 100, (get_byte(bytes, 100) + 255) % 256) where sheet_id = ?',
      );
      expect((await signers.engineer.call(issuedSheetFile, { params })).status).toBe(200);
    });
  });

  it('refuses to issue what is no longer what was checked', async () => {
    const url = new URL(process.env.TEST_SUPERUSER_DATABASE_URL!);
    url.pathname = new URL(test.database.url).pathname;
    const superuser = createKnex({ url: url.href, poolMax: 1 });
    await superuser.transaction(async (db) => {
      await db.raw("set local session_replication_role = 'replica'");
      await db.raw(`update revisions set input = jsonb_set(input, '{site,altitudeM}', '901') where state = 'checked'`);
    });
    await superuser.destroy();
    const params = { code: 'L1', number: 'S-2', label: 'latest' };
    const { answer } = await signers.approver.call(contract.approval, { params });
    expect(answer.mayIssue).toBe(false);
    expect(answer.barred.join()).toMatch(/content code differs/);
    const { lockVersion } = (await signers.approver.call(contract.revision, { params })).answer;
    const body = { acceptances: [], concessions: [], laterChangesReason: null, password: signers.password };
    const { status, problem } = await signers.approver.call(contract.issueRevision, {
      params,
      version: lockVersion,
      body,
    });
    expect([status, problem.detail]).toEqual([409, expect.stringMatching(/content code differs/)]);
  });
});

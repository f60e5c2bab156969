import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser } from 'playwright-core';
import { MailServer, until } from '../../backend/test/support/mail-server';
import { startProduct, type ProductProcess } from '../../backend/test/support/product-process';
import { paths } from '../src/app/paths';
import { launchBrowser } from './support/browser';
import { settle } from './support/checks';
import { fill, untilAnswered, untilSaved } from './support/form';
import {
  answerRemark,
  beginDraft,
  enterOwnFigures,
  fillCheck,
  fillDraft,
  issue,
  raiseRemark,
  signVerdict,
  submitForCheck,
  withdraw,
} from './support/moves';
import { Person } from './support/person';

const CODE = 'KL221';
const NUMBER = 'INS-221-902';
const ENGINEER = 't.orvelle@kigc.example';
const CHECKER = 'r.castellary@kigc.example';
const APPROVER = 'a.holvenstein@kigc.example';
const BUYER = 'l.brant@kigc.example';
const NOT_TOLD = ['j.bakkarash@kigc.example', 's.dhorel@kigc.example', 'w.tollarsson@kigc.example'];

const SPECIFICATION = paths.specification.to(CODE, NUMBER);
const REMARK = 'Tower 212 stands at 3,110 m by the profile.';
const ANSWER = 'Corrected to 3,150 m, rounded up from the profile.';
const DIFFERENCE = 'The rule knows neither heavy pollution nor the altitude.';

jest.setTimeout(120_000);

/** From the first draft to the withdrawn sheet, each person at a browser of his own. */
describe('checking, approving and issuing', () => {
  let product: ProductProcess;
  let mail: MailServer;
  let browser: Browser;
  let engineer: Person, checker: Person, approver: Person, buyer: Person, stranger: Person;
  /** Verification codes of the issued sheets by revision. */
  const codes: Record<string, string> = {};
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-issued-'));

  beforeAll(async () => {
    mail = await MailServer.start();
    product = await startProduct({ env: { SMTP_URL: mail.url } });
    browser = await launchBrowser();
    const at = (email: string | null) => Person.at(browser, product.url, email);
    [engineer, checker, approver, buyer, stranger] = await Promise.all([
      at(ENGINEER),
      at(CHECKER),
      at(APPROVER),
      at(BUYER),
      at(null),
    ]);
  }, 180_000);

  afterAll(async () => {
    await browser?.close();
    await product?.stop();
    await mail?.stop();
    rmSync(folder, { recursive: true, force: true });
  });

  const about = (letters: MailServer['letters']) => letters.filter(({ subject }) => subject?.includes(NUMBER));

  /** Subjects of the letters to somebody about the specification, once all of it have come. */
  const lettersTo = async (address: string, atLeast: number): Promise<string[]> => {
    await until(() => about(mail.letters).filter(({ to }) => JSON.stringify(to).includes(address)).length >= atLeast);
    return about(await mail.to(address)).map(({ subject }) => subject ?? '');
  };

  const standingOf = async (code: string): Promise<string> => {
    await stranger.open(paths.verify.to(code));
    return stranger.page.getByRole('status').innerText();
  };

  const issueAs = async (label: string): Promise<void> => {
    codes[label] = await issue(approver.page, NUMBER, label);
  };

  it('begins with an engineer who drafts and submits', async () => {
    const { page } = engineer;
    await engineer.open(paths.project.to(CODE));
    await beginDraft(page, NUMBER, 'Suspension strings, pass of Vintha');
    await fillDraft(page, 2900);
    // 43.3 mm/kV x 245/sqrt(3) kV x exp(0.5 x 1900/8150) = 6882 mm; /370 = 18.6, so 19 (IEC TS 60815-2:2008, class d).
    expect(await page.getByTestId('answer').innerText()).toMatch(/19\s+units G160-S/);
    await submitForCheck(page, 'Wanted before the tender.');
    expect(await engineer.faults('1-submitted')).toEqual([]);
  });

  it('shows the checker no figure before his own', async () => {
    const { page } = checker;
    await checker.open(paths.desk.to());
    await page
      .getByRole('row', { name: new RegExp(NUMBER) })
      .getByRole('link', { name: 'Waits for your check' })
      .waitFor();
    await checker.open(SPECIFICATION);
    await page.getByText('The figures of the author are hidden from you').waitFor();
    expect(await page.getByTestId('answer').count()).toBe(0);
    expect(await page.locator('main').innerText()).not.toMatch(/\b19\b/);
    expect(await checker.faults('2-hidden')).toEqual([]);
    await page.getByRole('link', { name: 'Enter your own count on the check page' }).click();
    await page.getByRole('heading', { name: '1 Your own figures' }).waitFor();
    await settle(page);
    expect(await page.locator('main').innerText()).not.toMatch(/\b19\b/);
    expect(await checker.faults('3-own-figures')).toEqual([]);
  });

  it('sets his figures beside those of the sheet, and lets him return it with a remark', async () => {
    const { page } = checker;
    await enterOwnFigures(page, { units: 15, clearanceMm: 2600 });
    const count = page.getByRole('row', { name: /^Count of units/ });
    expect(await count.innerText()).toMatch(/15 units[\s\S]*19 units[\s\S]*outside the band/);
    expect(await page.getByRole('row', { name: /^Clearance to earth/ }).innerText()).toContain('within the band');
    await page.getByPlaceholder('seen in', { exact: true }).first().fill('Line list LL-221');
    await page.keyboard.press('Enter');
    await page.keyboard.press('Enter');
    await page.getByLabel('Altitude, seen in').fill('Profile P-04');
    await page
      .getByRole('group', { name: 'Altitude: not looked at' })
      .getByRole('button', { name: 'not', exact: true })
      .click();
    await raiseRemark(page, 'Altitude', REMARK);
    await page.getByText('All saved.').waitFor();
    await page.reload();
    await page.getByText(/^3 of \d+ looked at$/).waitFor();
    expect(await page.getByRole('radio', { name: 'Pass', exact: true }).isDisabled()).toBe(true);
    expect(await checker.faults('4-check-with-remark')).toEqual([]);
    await signVerdict(page, 'Return', 'The altitude is not that of the highest tower.');
    expect(await checker.faults('5-returned')).toEqual([]);
  });

  it('tells the engineer on his desk; he answers, changes and submits again', async () => {
    const { page } = engineer;
    await engineer.open(paths.desk.to());
    const returned = page.getByRole('region', { name: 'Returned to you' });
    await returned.getByText('The altitude is not that of the highest tower.').waitFor();
    expect(await engineer.faults('6-desk-returned')).toEqual([]);
    await returned.getByRole('link', { name: NUMBER }).click();
    await page.getByRole('link', { name: '1 open remark' }).waitFor();
    await answerRemark(page, ANSWER);
    await fill(page, /^Altitude/, '3150');
    await untilAnswered(page);
    await untilSaved(page);
    expect(await engineer.faults('7-answered')).toEqual([]);
    await submitForCheck(page, 'Altitude corrected.');
    await page.waitForURL(/\/INS-221-902(\/revisions\/B)?$/);
    expect(await page.getByLabel('Title block').innerText()).toMatch(/revision\s+B/i);
  });

  it('passes with the remark closed and the difference explained', async () => {
    const { page } = checker;
    await checker.open(paths.check.to(CODE, NUMBER, 'B'));
    await enterOwnFigures(page, { units: 15, clearanceMm: 2700 });
    await page.getByText(ANSWER).waitFor();
    await page.getByRole('button', { name: 'Close it' }).click();
    await page.getByText('1 closed, none open').waitFor();
    await fillCheck(page);
    await page.getByText('Reason for the difference: your figures are outside the band', { exact: false }).waitFor();
    await page.getByLabel(/^Reason for the difference/).fill(DIFFERENCE);
    await page.getByText('Nothing is missing for a pass.').waitFor();
    expect(await checker.faults('8-check-whole')).toEqual([]);
    await signVerdict(page, 'Pass');
    await page.getByText(`Reason for the difference: ${DIFFERENCE}`).waitFor();
    expect(await checker.faults('9-passed')).toEqual([]);
  });

  it('shows the approver what he accepts, and issues as revision 0', async () => {
    const { page } = approver;
    await approver.open(paths.desk.to());
    await page
      .getByRole('row', { name: new RegExp(NUMBER) })
      .getByRole('link', { name: 'Waits for your approval' })
      .click();
    await page.getByRole('heading', { name: 'Decide and sign' }).waitFor();
    const form = page.getByRole('form', { name: 'Approve and issue' });
    await form.getByText('Above 3000 m the corrections rest on few tests', { exact: false }).waitFor();
    expect(await approver.faults('10-approval')).toEqual([]);
    await form.getByRole('button', { name: 'Approve and issue as revision 0' }).click();
    expect(await form.getByText('Is needed').count()).toBeGreaterThan(0);
    await form.getByLabel('Reason').fill('Tests of the same unit at 3,400 m were seen.');
    await issueAs('0');
    await page.getByText('Tests of the same unit at 3,400 m were seen.').waitFor();
    expect(await approver.faults('11-issued-sheet')).toEqual([]);
  });

  it('lists it in the register, and gives out the PDF to whoever buys by it', async () => {
    const { page } = buyer;
    await buyer.open(`${paths.sheets.to()}?search=${NUMBER}`);
    const row = page.getByRole('row', { name: new RegExp(NUMBER) });
    expect(await row.innerText()).toMatch(/0[\s\S]*In force[\s\S]*19/);
    expect(await buyer.faults('12-register')).toEqual([]);
    await row.getByRole('link', { name: NUMBER }).click();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Sheet as PDF' }).click(),
    ]);
    expect(download.suggestedFilename()).toBe(`${NUMBER}_0.pdf`);
    const file = path.join(folder, 'issued.pdf');
    await download.saveAs(file);
    const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
    expect(text).toMatch(/issued/i);
    expect(text).not.toMatch(/DRAFT|not for ordering until/);
    expect(text).toContain(codes['0']);
    expect(text).toContain('Tests of the same unit at 3,400 m were seen.');
    for (const name of ['Tamsin Orvelle', 'Ruben Castellary', 'Amara Holvenstein']) expect(text).toContain(name);
  });

  it('tells a stranger who holds the print that it is in force', async () => {
    const words = await standingOf(codes['0']!);
    expect(words).toContain('In force');
    expect(words).toContain(NUMBER);
    expect(await stranger.faults('13-verify-in-force')).toEqual([]);
  });

  it('begins the next revision, which comes the same way and is issued as 1 by a concession', async () => {
    await engineer.open(SPECIFICATION);
    await engineer.page.getByRole('button', { name: 'Begin next revision' }).click();
    await engineer.page.waitForURL('**/revisions/C');
    await settle(engineer.page);
    await fill(engineer.page, /^External clearance provided/, '2000');
    await untilAnswered(engineer.page);
    await submitForCheck(engineer.page, 'Clearance in the old tower head.');
    expect(await engineer.faults('14-next-submitted')).toEqual([]);

    await checker.open(paths.check.to(CODE, NUMBER, 'C'));
    await enterOwnFigures(checker.page, { units: 15, clearanceMm: 2700 });
    await fillCheck(checker.page);
    await checker.page.getByLabel(/^Reason for the difference/).fill(DIFFERENCE);
    await signVerdict(checker.page, 'Pass');

    await approver.open(paths.approval.to(CODE, NUMBER, 'C'));
    const form = approver.page.getByRole('form', { name: 'Approve and issue' });
    const changes = approver.page.getByRole('region', { name: 'What is new, table' });
    expect(await changes.innerText()).toMatch(/External clearance provided[\s\S]*2000/);
    await form.getByLabel('Reason').first().fill('Tests of the same unit at 3,400 m were seen.');
    await form.getByLabel('Reason').nth(1).fill('Until the tower heads are changed.');
    await form.getByLabel('Valid until').fill('2099-12-31');
    expect(await approver.faults('15-approval-of-next')).toEqual([]);
    await issueAs('1');
    expect(codes['1']).not.toBe(codes['0']);
    expect(await approver.faults('16-issued-next')).toEqual([]);
  });

  it('says of the older print that it is superseded, and of a withdrawn sheet that nothing is in force', async () => {
    expect(await standingOf(codes['0']!)).toContain('Superseded by revision 1');
    expect(await stranger.faults('17-verify-superseded')).toEqual([]);
    expect(await standingOf(codes['1']!)).toContain('In force');

    const { page } = approver;
    await withdraw(page, '1', 'The line is built with composite rods.');
    expect(await page.getByRole('button', { name: 'Withdraw' }).count()).toBe(0);
    expect(await approver.faults('18-withdrawn')).toEqual([]);
    expect(await standingOf(codes['1']!)).toMatch(/Withdrawn[\s\S]*nothing is in force in its place/);
    expect(await stranger.faults('19-verify-withdrawn')).toEqual([]);
  });

  it('has told by letter whoever had to know, and nobody else', async () => {
    const told = async (address: string, ...expected: [label: string, what: string][]) => {
      const subjects = expected.map(([label, what]) => `${NUMBER} revision ${label} ${what}`);
      // What leaves at once may arrive in any order.
      expect((await lettersTo(address, expected.length)).sort()).toEqual(subjects.sort());
    };
    const issued: [string, string][] = [
      ['0', 'is issued'],
      ['1', 'is issued'],
    ];
    const toCheck = 'waits for your check';
    await told(CHECKER, ['A', toCheck], ['B', toCheck], ['C', toCheck], ...issued);
    await told(ENGINEER, ['A', 'was returned to you'], ...issued);
    await told(APPROVER, ['B', 'waits for your approval'], ['C', 'waits for your approval']);
    await told(BUYER, ...issued, ['1', 'replaces a sheet that you hold']);
    const addresses = JSON.stringify(about(mail.letters).map(({ to }) => to));
    for (const address of NOT_TOLD) expect(addresses).not.toContain(address);
  });
});

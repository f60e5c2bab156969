import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@bellgap/database';
import { startProduct, type ProductProcess } from '../../backend/test/support/product-process';
import { Complaints, DESKTOP, launchBrowser, openContext } from './support/browser';
import { accessibilityFaults, settle, sidewaysScroll } from './support/checks';
import { choose, fill, inputs, search, untilAnswered, untilSaved } from './support/form';

const NUMBER = 'INS-221-901';

/** The whole job as an engineer does it: from sign-in to the sheet in hand. */
describe('specifying a string', () => {
  let product: ProductProcess;
  let browser: Browser;
  let context: BrowserContext;
  let page: Page;
  let complaints: Complaints;
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-sheet-'));

  beforeAll(async () => {
    product = await startProduct();
    browser = await launchBrowser();
    context = await openContext(browser, DESKTOP, 'light');
    page = await context.newPage();
    complaints = new Complaints(page);
  }, 120_000);

  afterAll(async () => {
    await browser?.close();
    await product?.stop();
    rmSync(folder, { recursive: true, force: true });
  });

  const answer = () => page.getByTestId('answer');

  it('signs in and comes to the desk', async () => {
    await page.goto(`${product.url}/projects/KL221`);
    await page.getByLabel('E-mail address').fill('t.orvelle@kigc.example');
    await page.getByLabel('Password').fill(DEMO_PASSWORD);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByRole('heading', { name: 'Saltgrave - Ondara' }).waitFor();
  }, 30_000);

  it('begins a draft that inherits the design basis', async () => {
    await page.getByRole('button', { name: 'Begin a specification' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Number').fill(NUMBER);
    await dialog.getByLabel('Title').fill('Suspension strings, zone Z3');
    await dialog.getByRole('button', { name: 'Begin the draft' }).click();
    await page.waitForURL(`**/specifications/${NUMBER}**`);
    await settle(page);
    expect(
      await inputs(page)
        .getByLabel(/^Highest voltage/)
        .inputValue(),
    ).toBe('245');
    expect(
      await inputs(page)
        .getByLabel(/^Nominal voltage/)
        .inputValue(),
    ).toBe('220');
    await answer().getByText('No count yet').locator('visible=true').first().waitFor();
  }, 30_000);

  it('answers while the site and the string are filled in', async () => {
    await fill(page, /^Altitude/, '900');
    await choose(page, 'Pollution class', 'd, heavy');
    await choose(page, 'Pollution type', 'A, solid deposit');
    await choose(page, 'How known', 'Measured');
    await search(page, 'Insulator unit', 'G160-S');
    await choose(page, 'Arrangement', 'Suspension');
    await fill(page, /^Strings in parallel/, '1');
    await choose(page, 'Surroundings', 'At the cross-arm');
    await fill(page, /^Extra units/, '0');
    await choose(page, 'Arcing devices', 'None');
    await untilAnswered(page);
    // 43.3 mm/kV x 245/sqrt(3) kV = 6124.8 mm; 6124.8/370 = 16.55, so 17 (IEC TS 60815-2:2008, class d).
    expect(await answer().innerText()).toMatch(/17\s+units G160-S/);
    expect(await answer().innerText()).toMatch(/6,290\s+mm\s+creepage/);
    expect(await answer().innerText()).toContain('needed 6,125 mm');
    expect(await answer().innerText()).toContain('Pollution governs');
  }, 60_000);

  it('follows a dirtier class and a higher site, and goes back', async () => {
    await choose(page, 'Pollution class', 'e, very heavy');
    // 53.7 x 141.45 = 7595.9 mm; /370 = 20.53.
    await answer().getByText(/^21$/).locator('visible=true').first().waitFor();
    await fill(page, /^Altitude/, '2310');
    // times exp(0.5 x 1310/8150) = 8231.6 mm; /370 = 22.25.
    await answer().getByText(/^23$/).locator('visible=true').first().waitFor();
    await fill(page, /^Altitude/, '900');
    await choose(page, 'Pollution class', 'd, heavy');
    await answer().getByText(/^17$/).locator('visible=true').first().waitFor();
  }, 60_000);

  it('opens the working of a figure', async () => {
    await answer()
      .getByRole('button', { name: /Number of units/ })
      .click();
    await page.getByText('ceil(16.55357)', { exact: false }).first().waitFor();
  }, 30_000);

  it('keeps the draft through a reload', async () => {
    await untilSaved(page);
    await page.reload();
    await settle(page);
    expect(
      await inputs(page)
        .getByLabel(/^Altitude/)
        .inputValue(),
    ).toBe('900');
    await answer().getByText(/^17$/).locator('visible=true').first().waitFor();
    expect(await page.getByRole('img', { name: /17/ }).count()).toBeGreaterThan(0);
  }, 30_000);

  it('says beside the field what cannot be, and loses nothing', async () => {
    await fill(page, /^Altitude/, '6000');
    await page.getByText('lies outside the method', { exact: false }).first().waitFor();
    await answer().getByText('No count', { exact: true }).locator('visible=true').first().waitFor();
    await fill(page, /^Altitude/, '90o');
    await page
      .locator('[data-field]', { has: page.getByLabel(/^Altitude/) })
      .getByText(/is no unit known here/)
      .waitFor();
    expect(
      await inputs(page)
        .getByLabel(/^Altitude/)
        .inputValue(),
    ).toBe('90o');
    await fill(page, /^Altitude/, '900');
    await untilAnswered(page);
    await untilSaved(page);
  }, 60_000);

  it('keeps a case of what if as a note with its numbers, and takes it away again', async () => {
    await page.getByRole('button', { name: 'What if' }).click();
    const drawer = page.getByRole('dialog', { name: 'What if' });
    await drawer
      .getByRole('button', { name: /^Keep as note/ })
      .first()
      .click();
    await drawer.getByLabel('Why it is kept, if you like').fill('Asked for by the line owner.');
    await drawer.getByRole('button', { name: 'Keep', exact: true }).click();
    const notes = drawer.getByRole('region', { name: 'Notes of this revision' });
    await notes.getByText('Asked for by the line owner.').waitFor();
    await settle(page);
    expect(await sidewaysScroll(page)).toEqual([]);
    expect(await accessibilityFaults(page)).toEqual([]);
    await notes.getByRole('button', { name: /^Delete the note/ }).click();
    await notes.getByText('None yet.', { exact: false }).waitFor();
    await drawer.getByRole('button', { name: 'Close' }).click();
    await drawer.waitFor({ state: 'hidden' });
  }, 60_000);

  it('hands over the sheet as PDF with the same figures', async () => {
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('button', { name: 'Preview sheet' }).click(),
    ]);
    const file = path.join(folder, 'sheet.pdf');
    await download.saveAs(file);
    expect(readFileSync(file).subarray(0, 5).toString()).toBe('%PDF-');
    const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
    expect(text).toContain(NUMBER);
    expect(text).toContain('G160-S');
    expect(text).toMatch(/\b17\b/);
    expect(text).toContain('6,125');
    expect(text).toContain('not for ordering');
    expect(text).toMatch(/1 of \d/);
    expect(text).toContain('IEC TS 60815');
  }, 60_000);

  it('leaves no complaint on the console', () => {
    // A strange word in a field is answered with 422 by design, a stranger's first look at the session with nothing.
    expect(complaints.take()).toEqual([]);
  });
});

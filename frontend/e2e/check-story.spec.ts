import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@bellgap/database';
import { startProduct, type ProductProcess } from '../../backend/test/support/product-process';
import { paths } from '../src/app/paths';
import { Complaints, DESKTOP, PHONE, launchBrowser, openContext } from './support/browser';
import { accessibilityFaults, settle, sidewaysScroll } from './support/checks';
import { fill, inputs, untilSaved } from './support/form';
import { signInByApi } from './support/walk';

const ENGINEERS = ['t.orvelle@kigc.example', 'j.bakkarash@kigc.example'] as const;
const CHECKER = 'r.castellary@kigc.example';

describe('two who write, and one who checks', () => {
  let product: ProductProcess;
  let browser: Browser;

  beforeAll(async () => {
    product = await startProduct();
    browser = await launchBrowser();
  }, 180_000);

  afterAll(async () => {
    await browser?.close();
    await product?.stop();
  });

  async function openAs(email: string, path: string): Promise<Page> {
    const context = await openContext(browser, DESKTOP, 'light');
    await signInByApi(context, product.url, email);
    const page = await context.newPage();
    await page.goto(product.url + path);
    await settle(page);
    return page;
  }

  it('shows the second who saves both versions, and keeps every keystroke', async () => {
    const draft = paths.specification.to('KL221', 'INS-221-005');
    const [one, two] = await Promise.all(ENGINEERS.map((email) => openAs(email, draft)));
    await two!.getByText(/has this draft open/).waitFor();
    await fill(one!, /^Altitude/, '1111');
    await untilSaved(one!);
    await fill(two!, /^Altitude/, '2222');
    const dialog = two!.getByRole('dialog');
    await dialog.getByText('This draft was saved meanwhile').waitFor();
    const row = dialog.getByRole('radiogroup', { name: 'Altitude' });
    expect(await row.textContent()).toMatch(/mine: 2222 m.*theirs: 1111 m/);
    await row.getByText('2222 m').click();
    await dialog.getByRole('button', { name: 'Go on with these' }).click();
    await untilSaved(two!);
    expect(
      await inputs(two!)
        .getByLabel(/^Altitude/)
        .inputValue(),
    ).toBe('2222');
  }, 120_000);

  it('hides the figures until the own count stands, then checks step by step and returns', async () => {
    const page = await openAs(CHECKER, paths.specification.to('KL221', 'INS-221-003'));
    const complaints = new Complaints(page);
    await page.getByText('The figures of the author are hidden from you').waitFor();
    await page.getByText('Enter your own count on the check page').click();
    await page.getByRole('heading', { name: '1 Your own figures' }).waitFor();
    await settle(page);
    expect(await page.getByText('Calculation', { exact: true }).count()).toBe(0);
    await page.getByLabel(/^Own count/).fill('14');
    await page.locator('.card-choice').first().locator('input:enabled').first().check();
    await page.getByLabel('How you came to them').fill('Clearance not estimated: no rule at hand');
    await page.getByRole('button', { name: /^Enter them/ }).click();
    await page.getByRole('heading', { name: 'Calculation' }).waitFor();
    await page.getByPlaceholder('seen in', { exact: true }).first().focus();
    await page.keyboard.type('Survey SV-12, p. 3');
    await page.keyboard.press('Enter');
    await page.keyboard.press('Enter');
    await page.getByLabel('Remark on Altitude', { exact: true }).click();
    await page
      .getByRole('form', { name: 'New remark' })
      .getByLabel('Remark', { exact: true })
      .fill('Tower 14 stands higher.');
    await page.getByRole('button', { name: 'Raise it' }).click();
    await page.getByText('Tower 14 stands higher.').waitFor();
    await page.getByText('All saved.').waitFor();
    expect(await accessibilityFaults(page)).toEqual([]);
    await page.setViewportSize({ width: PHONE.widthPx, height: PHONE.heightPx });
    expect(await sidewaysScroll(page)).toEqual([]);
    await page.setViewportSize({ width: DESKTOP.widthPx, height: DESKTOP.heightPx });
    await page.reload();
    await page.getByText(/2 of \d+ looked at/).waitFor();
    await page.getByRole('radio', { name: 'Return' }).check();
    await page.getByLabel('Note', { exact: true }).fill('Altitude of tower 14');
    await page.getByLabel('Password').fill(DEMO_PASSWORD);
    await page.getByRole('button', { name: 'Sign the verdict' }).click();
    await page.getByText(/^Check of revision A by/).waitFor();
    expect(complaints.take()).toEqual([]);
  }, 240_000);

  it('tells the author why it came back, and takes his answer', async () => {
    const page = await openAs(ENGINEERS[0], paths.specification.to('KL221', 'INS-221-003'));
    const complaints = new Complaints(page);
    await page.getByText('Altitude of tower 14').first().waitFor();
    await page.getByText('1 open remark').waitFor();
    await page.getByRole('button', { name: 'Answer' }).click();
    await page.getByRole('textbox', { name: 'Answer' }).fill('Corrected.');
    await page.getByRole('button', { name: 'Send the answer' }).click();
    await page.getByText('◐ answered').waitFor();
    await page.getByRole('button', { name: 'Submit for check' }).click();
    expect(await accessibilityFaults(page)).toEqual([]);
    await page.setViewportSize({ width: PHONE.widthPx, height: PHONE.heightPx });
    expect(await sidewaysScroll(page)).toEqual([]);
    expect(complaints.take()).toEqual([]);
  }, 120_000);
});

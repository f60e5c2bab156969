import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { startProduct, type ProductProcess } from '../../backend/test/support/product-process';
import { paths } from '../src/app/paths';
import { Complaints, DESKTOP, launchBrowser, openContext, PHONE } from './support/browser';
import { accessibilityFaults, settle, sidewaysScroll } from './support/checks';
import { PERSON_OF } from './support/routes';
import { signInByApi } from './support/walk';

/** SHOTS=all keeps pictures of the answer, which no address opens by itself. */
const FOLDER = process.env.SHOTS === 'all' ? path.join(__dirname, '../../shots') : null;

async function ask(page: Page): Promise<void> {
  await page.getByLabel('Front of the surge').click();
  await page.getByText('Slow, switching').click();
  await page.getByLabel(/^Mean of the stress/).fill('686');
  await page.getByLabel(/^Deviation of the stress/).fill('86');
  await page.getByLabel(/^50 % flashover voltage/).fill('1098');
  await page.getByLabel(/^Gaps in parallel/).fill('200');
  await page.getByRole('button', { name: 'Work out the risk' }).click();
  await page.getByRole('img', { name: /Stress and strength meet the most near/ }).waitFor();
}

describe('a risk of flashover', () => {
  let product: ProductProcess;
  let browser: Browser;

  beforeAll(async () => {
    product = await startProduct();
    browser = await launchBrowser();
  }, 120_000);

  afterAll(async () => {
    await browser?.close();
    await product?.stop();
  });

  for (const { viewport, theme } of [
    { viewport: DESKTOP, theme: 'light' },
    { viewport: PHONE, theme: 'dark' },
  ] as const) {
    it(`is worked out and drawn at ${viewport.widthPx} px, ${theme}: no complaint, no sideways scroll, accessible`, async () => {
      const context = await openContext(browser, viewport, theme);
      try {
        await signInByApi(context, product.url, PERSON_OF.reader);
        const page = await context.newPage();
        const complaints = new Complaints(page);
        await page.goto(product.url + paths.tables.to());
        await page.getByRole('link', { name: 'Risk of flashover', exact: true }).click();
        await ask(page);
        await settle(page);
        if (FOLDER) {
          mkdirSync(FOLDER, { recursive: true });
          const file = `risk-answer-reader-${viewport.widthPx}-${theme}.png`;
          await page.screenshot({ path: path.join(FOLDER, file), fullPage: true });
        }
        for (const summary of await page.locator('main summary').all()) await summary.click();
        const faults = [...complaints.take(), ...(await sidewaysScroll(page)), ...(await accessibilityFaults(page))];
        expect(faults).toEqual([]);
      } finally {
        await context.close();
      }
    }, 120_000);
  }
});

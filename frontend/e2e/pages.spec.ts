import path from 'node:path';
import type { Browser } from 'playwright-core';
import { ROLES, type Role } from '@bellgap/common/api';
import { startProduct, type ProductProcess } from '../../backend/test/support/product-process';
import { paths } from '../src/app/paths';
import { DESKTOP, PHONE, launchBrowser, type Viewport } from './support/browser';
import { SIGNED_IN_STOPS, SIGNED_OUT_STOPS } from './support/routes';
import { LookedAt, walk, type Theme } from './support/walk';

/**
 * SHOTS=all walks as every role in both themes and keeps the pictures, of pages that are the same for several roles once;
 * the ordinary run walks as one role in one theme.
 */
const EVERYTHING = process.env.SHOTS === 'all';
const FOLDER = EVERYTHING ? path.join(__dirname, '../../shots') : null;

const VIEWPORTS: readonly Viewport[] = [DESKTOP, PHONE];
const THEMES: readonly Theme[] = EVERYTHING ? ['light', 'dark'] : ['light'];
const WALKERS: readonly (Role | null)[] = EVERYTHING ? [null, ...ROLES] : [null, 'engineer'];

describe('pages', () => {
  let product: ProductProcess;
  let browser: Browser;
  const lookedAt = new LookedAt();

  beforeAll(async () => {
    product = await startProduct();
    browser = await launchBrowser();
  }, 120_000);

  afterAll(async () => {
    await browser?.close();
    await product?.stop();
  });

  it('are all on the list that is walked', () => {
    const walked = new Set([...SIGNED_IN_STOPS, ...SIGNED_OUT_STOPS].map(({ route }) => route));
    expect(Object.keys(paths).filter((route) => !walked.has(route as keyof typeof paths))).toEqual([]);
  });

  for (const role of WALKERS) {
    const who = role ?? 'a stranger';
    it(`of ${who}, ${THEMES.join(' and ')}, wide and narrow: no complaint, no sideways scroll, accessible`, async () => {
      const walks = VIEWPORTS.map((viewport) =>
        walk(browser, { url: product.url, role, viewport, themes: THEMES, folder: FOLDER, lookedAt }),
      );
      expect((await Promise.all(walks)).flat()).toEqual([]);
    }, 600_000);
  }
});

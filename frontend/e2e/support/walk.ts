import { createHash } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import type { Role } from '@bellgap/common/api';
import { DEMO_PASSWORD } from '@bellgap/database';
import { Complaints, openContext, type Viewport } from './browser';
import { accessibilityFaults, settle, sidewaysScroll } from './checks';
import { PERSON_OF, SIGNED_IN_STOPS, SIGNED_OUT_STOPS, type Stop } from './routes';

export type Theme = 'light' | 'dark';

/**
 * Pages that were looked at already, by what is on them. Another role that is shown the very same has it neither
 * pictured nor searched for faults again; it is still opened, and what it says on the console still counts.
 */
export class LookedAt {
  private readonly seen = new Set<string>();

  /** Whether this is the first time; the frame with the person's name is left out. */
  async isNew(page: Page, where: string): Promise<boolean> {
    const shown = await page.evaluate(() => {
      const parts = [...document.body.querySelectorAll('nav, main, [role="dialog"]')];
      return parts.length > 0 ? parts.map((part) => part.outerHTML).join('\n') : document.body.innerHTML;
    });
    const key = createHash('sha256').update(`${where}\n${shown}`).digest('hex');
    const isNew = !this.seen.has(key);
    this.seen.add(key);
    return isNew;
  }
}

export interface WalkOptions {
  url: string;
  /** Null walks what a stranger sees. */
  role: Role | null;
  viewport: Viewport;
  themes: readonly Theme[];
  /** Where pictures go; null takes none. */
  folder: string | null;
  lookedAt: LookedAt;
}

export async function signInByApi(context: BrowserContext, url: string, email: string): Promise<void> {
  const answer = await context.request.post(`${url}/api/v1/sessions`, { data: { email, password: DEMO_PASSWORD } });
  if (answer.status() !== 201) throw new Error(`${email} could not sign in: ${answer.status()} ${await answer.text()}`);
}

/** Changes the theme as the system does, and waits until the colours have arrived. */
async function putOn(page: Page, theme: Theme): Promise<void> {
  await page.emulateMedia({ colorScheme: theme });
  await page.waitForFunction((asked) => document.documentElement.dataset.theme === asked, theme);
  await page.evaluate(async () => {
    const passing = document.getAnimations().filter((one) => one.effect?.getComputedTiming().iterations !== Infinity);
    await Promise.allSettled(passing.map(({ finished }) => finished));
  });
}

/** Opens the page once and looks at it in each theme, as it changes before a person's eyes. */
async function visit(page: Page, complaints: Complaints, stop: Stop, options: WalkOptions): Promise<string[]> {
  const { url, folder, role, themes, viewport, lookedAt } = options;
  const who = role ?? 'stranger';
  await page.goto('about:blank');
  await page.emulateMedia({ colorScheme: themes[0] ?? 'light' });
  complaints.take();
  await page.goto(url + stop.path);
  await settle(page);
  for (const start of stop.follow ?? []) {
    const address = await page.locator(`main a[href^="${start}"]`).first().getAttribute('href', { timeout: 5000 });
    await page.goto(url + address);
    await settle(page);
  }
  const faults: string[] = [];
  const isNew = await lookedAt.isNew(page, `${stop.name} ${viewport.widthPx}`);
  for (const theme of themes) {
    await putOn(page, theme);
    const found = await sidewaysScroll(page);
    if (isNew) {
      if (folder) {
        mkdirSync(folder, { recursive: true });
        const file = `${stop.name}-${who}-${viewport.widthPx}-${theme}.png`;
        await page.screenshot({ path: path.join(folder, file), fullPage: true });
      }
      found.push(...(await accessibilityFaults(page)));
    }
    faults.push(...[...complaints.take(), ...found].map((fault) => `${theme}: ${fault}`));
  }
  return faults.map((fault) => `${who} ${viewport.widthPx} ${stop.path} ${fault}`);
}

/** Opens every route that the role may open and says what is wrong with the pages; an empty answer is a clean walk. */
export async function walk(browser: Browser, options: WalkOptions): Promise<string[]> {
  const { url, role, viewport, themes } = options;
  const context = await openContext(browser, viewport, themes[0] ?? 'light');
  try {
    if (role) await signInByApi(context, url, PERSON_OF[role]);
    const stops = role ? SIGNED_IN_STOPS.filter(({ roles }) => !roles || roles.includes(role)) : SIGNED_OUT_STOPS;
    const page = await context.newPage();
    const complaints = new Complaints(page);
    const faults: string[] = [];
    for (const stop of stops) faults.push(...(await visit(page, complaints, stop, options)));
    return faults;
  } finally {
    await context.close();
  }
}

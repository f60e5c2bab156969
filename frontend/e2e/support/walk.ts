import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import type { Role } from '@bellgap/common/api';
import { DEMO_PASSWORD } from '@bellgap/database';
import { Complaints, openContext, type Viewport } from './browser';
import { accessibilityFaults, settle, sidewaysScroll } from './checks';
import { PERSON_OF, SIGNED_IN_STOPS, SIGNED_OUT_STOPS, type Stop } from './routes';

export interface WalkOptions {
  url: string;
  /** Null walks what a stranger sees. */
  role: Role | null;
  viewport: Viewport;
  theme: 'light' | 'dark';
  /** Where pictures go; null takes none. */
  folder: string | null;
}

export async function signInByApi(context: BrowserContext, url: string, email: string): Promise<void> {
  const answer = await context.request.post(`${url}/api/v1/sessions`, { data: { email, password: DEMO_PASSWORD } });
  if (answer.status() !== 201) throw new Error(`${email} could not sign in: ${answer.status()} ${await answer.text()}`);
}

async function visit(page: Page, complaints: Complaints, stop: Stop, options: WalkOptions): Promise<string[]> {
  const { url, folder, role, theme, viewport } = options;
  await page.goto('about:blank');
  complaints.take();
  await page.goto(url + stop.path);
  await settle(page);
  if (folder) {
    mkdirSync(folder, { recursive: true });
    const file = `${stop.name}-${role ?? 'stranger'}-${viewport.widthPx}-${theme}.png`;
    await page.screenshot({ path: path.join(folder, file), fullPage: true });
  }
  const faults = [...complaints.take(), ...(await sidewaysScroll(page)), ...(await accessibilityFaults(page))];
  return faults.map((fault) => `${role ?? 'stranger'} ${viewport.widthPx} ${theme} ${stop.path}: ${fault}`);
}

/** Opens every route that the role may open and says what is wrong with the pages; an empty answer is a clean walk. */
export async function walk(browser: Browser, options: WalkOptions): Promise<string[]> {
  const { url, role, viewport, theme } = options;
  const context = await openContext(browser, viewport, theme);
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

import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { Complaints, DESKTOP, PHONE, openContext, type Viewport } from './browser';
import { accessibilityFaults, settle, sidewaysScroll } from './checks';
import { signInByApi } from './walk';

/** Pictures are kept with those of all pages, where all of them are asked for. */
const FOLDER = process.env.SHOTS === 'all' ? path.join(__dirname, '../../../shots/story') : null;

/** Somebody at a browser of his own, and what his pages complained of. */
export class Person {
  private constructor(
    readonly page: Page,
    private readonly url: string,
    private readonly complaints: Complaints,
  ) {}

  /** Signed in as the owner of the address; null is a stranger. */
  static async at(browser: Browser, url: string, email: string | null): Promise<Person> {
    const context = await openContext(browser, DESKTOP, 'light');
    if (email !== null) await signInByApi(context, url, email);
    const page = await context.newPage();
    return new Person(page, url, new Complaints(page));
  }

  async open(address: string): Promise<void> {
    await this.page.goto(this.url + address);
    await settle(this.page);
  }

  /** What is wrong with the page as it stands, and what it complained of on the way here. */
  async faults(picture: string): Promise<string[]> {
    await settle(this.page);
    const found = [...this.complaints.take(), ...(await sidewaysScroll(this.page))];
    found.push(...(await accessibilityFaults(this.page)));
    await this.take(PHONE);
    found.push(...(await sidewaysScroll(this.page)).map((fault) => `narrow: ${fault}`));
    await this.take(DESKTOP);
    if (FOLDER) {
      await this.picture(`${picture}-1440-light`, DESKTOP, 'light');
      await this.picture(`${picture}-390-dark`, PHONE, 'dark');
      await this.picture(null, DESKTOP, 'light');
    }
    return found;
  }

  /** Complaints that were to be expected. */
  takeComplaints(): string[] {
    return this.complaints.take();
  }

  private take({ widthPx, heightPx }: Viewport): Promise<void> {
    return this.page.setViewportSize({ width: widthPx, height: heightPx });
  }

  private async picture(name: string | null, viewport: Viewport, theme: 'light' | 'dark'): Promise<void> {
    const { page } = this;
    await page.emulateMedia({ colorScheme: theme });
    await this.take(viewport);
    await page.waitForFunction((asked) => document.documentElement.dataset.theme === asked, theme);
    if (name === null || FOLDER === null) return;
    await page.waitForTimeout(400);
    mkdirSync(FOLDER, { recursive: true });
    await page.screenshot({ path: path.join(FOLDER, `${name}.png`), fullPage: true });
  }
}

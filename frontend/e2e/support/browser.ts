import { existsSync } from 'node:fs';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

const CHROMIUM = ['/usr/bin/chromium', '/usr/bin/chromium-browser'];

/** Debian's Chromium without a GPU, a sandbox of its own or calls to the outside. */
export async function launchBrowser(): Promise<Browser> {
  const executablePath = process.env.CHROMIUM ?? CHROMIUM.find((path) => existsSync(path));
  if (!executablePath) throw new Error("Chromium is missing: install Debian's package `chromium`");
  return chromium.launch({
    executablePath,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export interface Viewport {
  widthPx: number;
  heightPx: number;
}

export const DESKTOP: Viewport = { widthPx: 1440, heightPx: 1000 };
export const PHONE: Viewport = { widthPx: 390, heightPx: 844 };

export async function openContext(
  browser: Browser,
  viewport: Viewport,
  theme: 'light' | 'dark',
): Promise<BrowserContext> {
  const context = await browser.newContext({
    viewport: { width: viewport.widthPx, height: viewport.heightPx },
    colorScheme: theme,
    locale: 'en-GB',
    timezoneId: 'UTC',
    acceptDownloads: true,
  });
  // As with the tests' own time: enough for a busy machine.
  context.setDefaultTimeout(30_000);
  return context;
}

/** What a page said on the console or failed to fetch; a clean page leaves it empty. */
export class Complaints {
  readonly rows: string[] = [];

  constructor(page: Page) {
    page.on('console', (message) => {
      if (['error', 'warning'].includes(message.type())) this.rows.push(`console ${message.type()}: ${message.text()}`);
    });
    page.on('pageerror', (error) => this.rows.push(`uncaught: ${error.message}`));
    page.on('requestfailed', (request) => {
      // A request that the page itself gave up for a newer one is no failure.
      if (request.failure()?.errorText === 'net::ERR_ABORTED') return;
      this.rows.push(`request failed: ${request.method()} ${request.url()} ${request.failure()?.errorText ?? ''}`);
    });
    page.on('response', (response) => {
      if (response.status() >= 400)
        this.rows.push(`answer ${response.status()}: ${response.request().method()} ${response.url()}`);
    });
  }

  take(): string[] {
    return this.rows.splice(0);
  }
}

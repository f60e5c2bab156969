import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import type { Browser } from 'playwright-core';
import { DESKTOP, launchBrowser, openContext } from '../../frontend/e2e/support/browser';
import { settle } from '../../frontend/e2e/support/checks';
import { PERSON_OF } from '../../frontend/e2e/support/routes';
import { signInByApi } from '../../frontend/e2e/support/walk';
import { paths } from '../../frontend/src/app/paths';
import type { Figure } from './harness';
import { product } from './product';

const FRONTEND = path.join(__dirname, '../../frontend');
const EMPTY_PAGE = path.join(FRONTEND, 'bench/empty-page');

const gzipKb = (script: Buffer): number => gzipSync(script).length / 1000;
const sum = (values: readonly number[]): number => values.reduce((total, one) => total + one, 0);

/** Scripts that the browser fetches until the page stands, as the network shows them. */
async function scriptsOf(browser: Browser, url: string, email: string | null): Promise<number> {
  const context = await openContext(browser, DESKTOP, 'light');
  try {
    if (email) await signInByApi(context, url, email);
    const page = await context.newPage();
    const scripts: Promise<Buffer>[] = [];
    page.on('response', (response) => {
      if (response.request().resourceType() === 'script') scripts.push(response.body());
    });
    await page.goto(url + paths.desk.to());
    await settle(page);
    return sum((await Promise.all(scripts)).map(gzipKb));
  } finally {
    await context.close();
  }
}

/** All scripts of the empty page, built as the product's pages are. */
function scriptsOfEmptyPage(): number {
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-empty-page-'));
  try {
    execFileSync(
      process.execPath,
      [
        path.join(FRONTEND, '../node_modules/vite/bin/vite.js'),
        ...['build', EMPTY_PAGE, '--config', path.join(FRONTEND, 'vite.config.ts')],
        ...['--outDir', folder, '--emptyOutDir', '--logLevel', 'warn'],
      ],
      { cwd: FRONTEND, stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, NODE_ENV: 'production' } },
    );
    const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('.js'));
    return sum(files.map((file) => gzipKb(readFileSync(path.join(folder, file)))));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** The heavier of the two pages that somebody may see first: to sign in, and the desk of who is signed in still. */
export const pageFigures: readonly Figure[] = [
  {
    name: 'first-page-javascript',
    unit: 'kB gzip',
    aim: { ratioAtMost: 1.5 },
    measure: async () => {
      const { url } = await product();
      const browser = await launchBrowser();
      try {
        const signIn = await scriptsOf(browser, url, null);
        const desk = await scriptsOf(browser, url, PERSON_OF.engineer);
        return { value: Math.max(signIn, desk), beside: scriptsOfEmptyPage() };
      } finally {
        await browser.close();
      }
    },
  },
];

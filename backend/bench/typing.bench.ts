import type { Locator, Page } from 'playwright-core';
import { DESKTOP, launchBrowser, openContext } from '../../frontend/e2e/support/browser';
import { settle } from '../../frontend/e2e/support/checks';
import { fill, inputs, untilAnswered } from '../../frontend/e2e/support/form';
import { PERSON_OF } from '../../frontend/e2e/support/routes';
import { signInByApi } from '../../frontend/e2e/support/walk';
import { paths } from '../../frontend/src/app/paths';
import type { Figure } from './harness';
import { product } from './product';

interface KeyWatch {
  /** From now on the next key is timed. */
  arm(): void;
  /** From the key to the frame that shows another figure. */
  paintedMs: Promise<number>;
}

/** Runs in the page: times a key from the moment it went down until the answer to it stands on the screen. */
function watchKeys(): void {
  const figures = (): string =>
    [...document.querySelectorAll('.answer-figures, .zone-ledger')].map(({ textContent }) => textContent).join('\n');
  let shown = '';
  let downAt: number | null = null;
  let settleWith: ((ms: number) => void) | null = null;
  const watch: KeyWatch = {
    paintedMs: Promise.resolve(0),
    arm() {
      shown = figures();
      downAt = null;
      watch.paintedMs = new Promise((resolve) => (settleWith = resolve));
    },
  };
  document.addEventListener('keydown', ({ timeStamp }) => (downAt = timeStamp), { capture: true });
  new MutationObserver(() => {
    if (downAt === null || !settleWith) return;
    const isCurrent = document.querySelector('[data-testid="answer"]')?.getAttribute('data-state') === 'current';
    if (!isCurrent || figures() === shown) return;
    const [from, resolve] = [downAt, settleWith];
    settleWith = null;
    // The message is handled after the frame that this callback is a part of has been drawn.
    requestAnimationFrame(() => {
      const { port1, port2 } = new MessageChannel();
      port1.onmessage = () => resolve(performance.now() - from);
      port2.postMessage(null);
    });
  }).observe(document.body, { subtree: true, childList: true, characterData: true, attributes: true });
  (window as unknown as { keyWatch: KeyWatch }).keyWatch = watch;
}

/** A field with the digits that are typed over in turn, each with its own round of values, so that no figure comes back soon. */
interface Field {
  label: RegExp;
  begin: string;
  digits: { at: number; values: string }[];
  keys: number;
}

const FIELDS: readonly Field[] = [
  {
    label: /^Altitude/,
    begin: '2000',
    digits: [
      { at: 1, values: '3692581470' },
      { at: 2, values: '741852963' },
    ],
    keys: 80,
  },
  {
    label: /^Length of fittings/,
    begin: '310',
    digits: [
      { at: 1, values: '3692581470' },
      { at: 2, values: '741852963' },
    ],
    keys: 24,
  },
  { label: /^Extra units/, begin: '0', digits: [{ at: 0, values: '123' }], keys: 16 },
];
const BETWEEN_KEYS_MS = 60;
const WARM_UP_KEYS = 6;
const PATIENCE_MS = 15_000;

async function typeOver(page: Page, field: Locator, at: number, digit: string): Promise<number> {
  await field.evaluate((input: HTMLInputElement, from) => input.setSelectionRange(from, from + 1), at);
  await page.evaluate(() => (window as unknown as { keyWatch: KeyWatch }).keyWatch.arm());
  await page.keyboard.press(digit);
  const paintedMs = page.evaluate(() => (window as unknown as { keyWatch: KeyWatch }).keyWatch.paintedMs);
  let timer: NodeJS.Timeout | undefined;
  const impatience = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error(`No figure changed after ${digit}`)), PATIENCE_MS);
  });
  const ms = await Promise.race([paintedMs, impatience]).finally(() => clearTimeout(timer));
  await page.waitForTimeout(BETWEEN_KEYS_MS);
  return ms;
}

async function typeInto(page: Page, { label, begin, digits, keys }: Field): Promise<number[]> {
  await fill(page, label, begin);
  await untilAnswered(page);
  const field = inputs(page).getByLabel(label);
  const times: number[] = [];
  for (let key = 0; key < keys; key += 1) {
    const { at, values } = digits[key % digits.length] as Field['digits'][number];
    const round = Math.floor(key / digits.length);
    times.push(await typeOver(page, field, at, values[round % values.length] ?? '0'));
  }
  return times;
}

export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? Number.NaN;
}

/** What a person waits for after a key: the server's answer, drawn; the pause of the page for fast typists is a part of it. */
export const typingFigures: readonly Figure[] = [
  {
    name: 'key-to-painted-figure',
    unit: 'ms p95',
    aim: { valueAtMost: 200 },
    measure: async () => {
      const { url } = await product();
      const browser = await launchBrowser();
      try {
        const context = await openContext(browser, DESKTOP, 'light');
        await signInByApi(context, url, PERSON_OF.engineer);
        const page = await context.newPage();
        await page.goto(url + paths.specification.to('KL132', 'INS-132-001'));
        await settle(page);
        await page.evaluate(watchKeys);
        for (const field of FIELDS) await typeInto(page, { ...field, keys: WARM_UP_KEYS });
        const times: number[] = [];
        for (const field of FIELDS) times.push(...(await typeInto(page, field)));
        return { value: percentile(times, 0.95), beside: null };
      } finally {
        await browser.close();
      }
    },
  },
];

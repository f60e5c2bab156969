import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';

const AXE = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

interface AxeViolation {
  id: string;
  help: string;
  nodes: { target: string[]; html: string }[];
}

/** Accessibility faults that axe-core finds on the page, a line each. */
export async function accessibilityFaults(page: Page): Promise<string[]> {
  await page.evaluate(AXE);
  const violations = await page.evaluate(async () => {
    const { axe } = window as unknown as { axe: { run: (options: object) => Promise<{ violations: AxeViolation[] }> } };
    return (await axe.run({ runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'] }))
      .violations;
  });
  return violations.map(
    (v) =>
      `axe ${v.id}: ${v.help} at ${v.nodes
        .slice(0, 3)
        .map((n) => `${n.target.join(' ')} ${n.html.slice(0, 140)}`)
        .join(' | ')}`,
  );
}

/** A page must not scroll sideways; wide tables scroll inside themselves. */
export async function sidewaysScroll(page: Page): Promise<string[]> {
  const overflowPx = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  return overflowPx > 0 ? [`page is ${overflowPx} px wider than the window`] : [];
}

/** Waits until the page has fetched what it shows and painted it without skeletons. */
export async function settle(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.waitForFunction(() => !document.querySelector('.ant-skeleton, .ant-spin-spinning, [aria-busy="true"]'));
  await page.evaluate(() => document.fonts.ready.then(() => undefined));
}

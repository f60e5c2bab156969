import type { Page } from 'playwright-core';

/** Replaces what a field holds, key by key, as a person does. */
export async function fill(page: Page, label: string | RegExp, text: string): Promise<void> {
  const field = page.getByLabel(label);
  await field.click();
  await field.press('Control+A');
  await field.pressSequentially(text);
}

/** Opens a closed list by its label and takes the row that begins with these words. */
export async function choose(page: Page, label: string | RegExp, option: string): Promise<void> {
  const field = page.getByLabel(label, { exact: true });
  await field.click();
  const row = page.locator('.ant-select-dropdown:not(.ant-select-dropdown-hidden) .ant-select-item-option', {
    hasText: option,
  });
  await field.pressSequentially('', { delay: 0 });
  await row.first().click();
}

/** Until the answer on the page belongs to what the form holds. */
export async function untilAnswered(page: Page): Promise<void> {
  await page.waitForFunction(
    () => document.querySelector('[data-testid="answer"]')?.getAttribute('data-state') === 'current',
  );
}

/** Until the page says that the draft is saved. */
export async function untilSaved(page: Page): Promise<void> {
  await page.getByText(/^saved \d\d:\d\d:\d\d$/).waitFor();
}

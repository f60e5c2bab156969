import type { Locator, Page } from 'playwright-core';

/** The zone of the specification page in which things are filled in. */
export function inputs(page: Page): Locator {
  return page.getByRole('region', { name: 'Inputs' });
}

/** Replaces what a field holds, key by key, as a person does. */
export async function fill(page: Page, label: string | RegExp, text: string): Promise<void> {
  const field = inputs(page).getByLabel(label);
  await field.click();
  await field.press('Control+A');
  await field.pressSequentially(text);
}

/** Opens a closed list by its label and takes the row that begins with these words. */
export async function choose(page: Page, label: string | RegExp, option: string): Promise<void> {
  const field = inputs(page).getByLabel(label, { exact: true });
  await field.click();
  const row = page.locator('.ant-select-dropdown:not(.ant-select-dropdown-hidden) .ant-select-item-option', {
    hasText: option,
  });
  await row.first().click();
}

/** Types into a list that can be searched and takes the first row found. */
export async function search(page: Page, label: string, text: string): Promise<void> {
  const field = inputs(page).getByLabel(label, { exact: true });
  await field.click();
  await field.pressSequentially(text);
  await page.locator('.ant-select-dropdown:not(.ant-select-dropdown-hidden)', { hasText: text }).waitFor();
  await field.press('Enter');
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

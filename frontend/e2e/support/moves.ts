import type { Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@bellgap/database';
import { settle } from './checks';
import { choose, fill, search, untilAnswered } from './form';

/** What people do on the way from draft to issued, as they do it on the screen. */

export async function beginDraft(page: Page, number: string, title: string): Promise<void> {
  await page.getByRole('button', { name: 'Begin a specification' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Number').fill(number);
  await dialog.getByLabel('Title').fill(title);
  await dialog.getByRole('button', { name: 'Begin the draft' }).click();
  await page.waitForURL(`**/specifications/${number}**`);
  await settle(page);
}

/** A suspension string of 220 kV with its clearances by the printed table. */
export async function fillDraft(page: Page, altitudeM: number): Promise<void> {
  await fill(page, /^Altitude/, String(altitudeM));
  await choose(page, 'Pollution class', 'd, heavy');
  await choose(page, 'Pollution type', 'A, solid deposit');
  await choose(page, 'How known', 'Measured');
  await search(page, 'Insulator unit', 'G160-S');
  await choose(page, 'Arrangement', 'Suspension');
  await choose(page, 'Strings in parallel', '1');
  await choose(page, 'Surroundings', 'At the cross-arm');
  await fill(page, /^Extra units/, '0');
  await choose(page, 'Arcing devices', 'None');
  await choose(page, 'Clearance method', 'IEC 60071 tables');
  await choose(page, 'Shape, phase to earth', 'Conductor to structure');
  await choose(page, 'Shape, between phases', 'Conductor to conductor');
  await untilAnswered(page);
}

export async function submitForCheck(page: Page, note: string): Promise<void> {
  await page.getByRole('button', { name: 'Submit for check' }).click();
  const form = page.getByRole('region', { name: 'Submit for check' });
  await form.getByLabel('Check category').click();
  await page
    .locator('.ant-select-dropdown:not(.ant-select-dropdown-hidden) .ant-select-item-option', {
      hasText: '2, independent check',
    })
    .click();
  await form.getByLabel('Note to the checker').fill(note);
  await form.getByRole('button', { name: 'Submit it' }).click();
  await page.getByText(/^Submitted for check by /).waitFor();
  await settle(page);
}

/** The checker's own figures by rules that he names. */
export async function enterOwnFigures(page: Page, figures: { units: number; clearanceMm: number }): Promise<void> {
  const form = page.getByRole('form', { name: 'Own figures' });
  await form.getByLabel(/^Own count/).fill(String(figures.units));
  await form.getByRole('radio', { name: /^Discs times 15 kV/ }).check();
  await form.getByLabel(/^Own clearance to earth/).fill(String(figures.clearanceMm));
  await form.getByRole('radio', { name: /^Lightning clearance is about 500 kV/ }).check();
  await form.getByLabel('How you came to them').fill('By hand from the inputs.');
  await form.getByRole('button', { name: /^Enter them/ }).click();
  await page.getByRole('heading', { name: '3 Figures of the sheet' }).waitFor();
  await settle(page);
}

/** All inputs agreed group by group, all points answered, independence declared. */
export async function fillCheck(page: Page): Promise<void> {
  for (const group of ['System', 'Site', 'String', 'Clearances']) {
    const section = page.getByRole('region', { name: group, exact: true });
    await section.getByLabel(`All of ${group}, seen in`).fill('Line list LL-221, sheet 4');
    await section.getByRole('button', { name: 'Agree to all open' }).click();
  }
  await page.getByText('Every input has been looked at.').waitFor();
  for (const point of await page.locator('.points').getByText('Yes', { exact: true }).all()) await point.click();
  await page.getByText(/^I had no part in this work/).click();
}

export async function signVerdict(page: Page, verdict: 'Pass' | 'Return', note = ''): Promise<void> {
  const form = page.getByRole('form', { name: 'Verdict' });
  await form.getByRole('radio', { name: verdict, exact: true }).check();
  await form.getByLabel('Note', { exact: true }).fill(note);
  await form.getByLabel('Password').fill(DEMO_PASSWORD);
  await form.getByRole('button', { name: 'Sign the verdict' }).click();
  await page.getByRole('heading', { name: 'Where it stands' }).waitFor();
  await settle(page);
}

export async function raiseRemark(page: Page, field: string, text: string): Promise<void> {
  await page.getByRole('button', { name: `Remark on ${field}`, exact: true }).click();
  const form = page.getByRole('form', { name: 'New remark' });
  await form.getByRole('textbox', { name: 'Remark' }).fill(text);
  await form.getByRole('button', { name: 'Raise it' }).click();
  await form.waitFor({ state: 'hidden' });
  await page.getByText(text).waitFor();
}

export async function answerRemark(page: Page, text: string): Promise<void> {
  await page.getByRole('button', { name: 'Answer' }).click();
  await page.getByRole('textbox', { name: 'Answer' }).fill(text);
  await page.getByRole('button', { name: 'Send the answer' }).click();
  await page.getByText('◐ answered').waitFor();
}

/** From the approval page to the issued sheet; answers its verification code. */
export async function issue(page: Page, number: string, label: string): Promise<string> {
  const form = page.getByRole('form', { name: 'Approve and issue' });
  await form.getByLabel('Password').fill(DEMO_PASSWORD);
  await form.getByRole('button', { name: `Approve and issue as revision ${label}` }).click();
  await page.getByRole('heading', { name: `${number} revision ${label}` }).waitFor();
  await settle(page);
  return page.getByRole('link', { name: /^(\w{4}-){3}\w{4}$/ }).innerText();
}

export async function withdraw(page: Page, label: string, reason: string): Promise<void> {
  await page.getByRole('button', { name: 'Withdraw' }).click();
  const form = page.getByRole('form', { name: 'Withdraw' });
  await form.getByLabel('Reason').fill(reason);
  await form.getByLabel('Password').fill(DEMO_PASSWORD);
  await form.getByRole('button', { name: `Withdraw revision ${label}` }).click();
  await page.getByRole('status').getByText('Withdrawn').waitFor();
  await form.waitFor({ state: 'hidden' });
}

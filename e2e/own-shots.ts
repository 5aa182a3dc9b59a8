import { randomUUID } from 'node:crypto';

import type { Page } from '@playwright/test';

import { gownTable } from './screens/gown-table.ts';

/** Walks through the places of a new account, a picture at each. */
export async function ownScenes(page: Page, keep: (name: string) => Promise<void>): Promise<void> {
  const table = gownTable(page);
  await table.open();
  await page.getByRole('button', { name: /^Judith/ }).click();
  await table.drawing.waitFor();
  await keep('try');
  await page.getByRole('link', { name: 'Keep it' }).click();
  await page.getByLabel('E-mail').fill('nobody');
  await page.getByLabel('Password').fill('short');
  await page.getByRole('button', { name: 'Open an account' }).click();
  await page.locator('[aria-invalid=true]').first().waitFor();
  await keep('sign-up');
  await page.getByLabel('E-mail').fill(`${randomUUID()}@example.org`);
  await page.getByLabel('Password').fill('a pound of pins');
  await page.getByRole('button', { name: 'Open an account' }).click();
  await table.title.waitFor();
  await table.drawing.waitFor();
  await table.setStyle('neckWidth', '8.1');
  await table.standing('saved').waitFor();
  await keep('gown');
  await page.getByRole('button', { name: 'Tape' }).click();
  for (const key of ['n', 'n', 'Enter', 'n', 'Enter']) await table.drawing.press(key);
  await keep('tape');
  await page.getByRole('button', { name: 'Move pieces' }).click();
  for (const key of ['n', 'Shift+ArrowRight', 'Shift+ArrowDown']) await table.drawing.press(key);
  await keep('moved');
  await page.getByRole('button', { name: 'Snap back' }).click();
  await page.getByRole('button', { name: 'Move pieces' }).click();

  const gownId = page.url().split('/').at(-1) ?? '';
  const other = gownTable(await page.context().newPage());
  await other.openGown(gownId);
  await other.setStyle('kneeFinished', '95');
  await other.standing('saved').waitFor();
  await other.page.close();
  await table.setStyle('kneeFinished', '80');
  await table.conflict.waitFor();
  await keep('conflict');
  await table.keepMine.click();
  await table.standing('saved').waitFor();
  await table.openRevisions.click();
  await table.revisions.getByRole('button', { name: /^As saved/ }).click();
  await table.revisions.getByRole('img').first().waitFor();
  await keep('revisions');
  await table.revisions.getByRole('button', { name: 'Close' }).click();
  const gownAddress = page.url();
  await lists(page, keep);
  await page.goto(gownAddress);
  await table.drawing.waitFor();
  await page.context().clearCookies();
  await table.setStyle('kneeFinished', '81');
  await table.standing('signed-out').waitFor();
  await page.getByRole('button', { name: 'Sign in' }).click();
  await keep('signed-out');
  await page.goto('/sign-in');
  await keep('sign-in');
}

async function lists(page: Page, keep: (name: string) => Promise<void>): Promise<void> {
  await page.goto('/gowns');
  for (const copy of [1, 2]) {
    await page
      .getByRole('button', { name: /^Duplicate/ })
      .first()
      .click();
    await page.getByRole('listitem').nth(copy).waitFor();
  }
  await keep('gowns');
  await page.getByRole('link', { name: 'Measure cards' }).click();
  await page.getByRole('button', { name: 'New measure card' }).click();
  await page.locator('input[name="card.bustGirth"]').fill('92');
  await page.locator('[data-standing=saved]').waitFor();
  await keep('card');
  await page.goto('/gowns/measure-cards');
  await page.getByRole('listitem').first().waitFor();
  await keep('cards');
  await page.goto('/account');
  await page.getByText('this one').waitFor();
  await keep('account');
}

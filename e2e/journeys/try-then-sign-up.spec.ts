import { randomUUID } from 'node:crypto';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';

const password = 'a spool of red thread';

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('what was drawn at Try it comes along into the new account', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.getByRole('radio', { name: 'inch' }).check();
      await page.getByRole('link', { name: 'Keep it' }).click();
      const email = `${randomUUID()}@example.org`;
      await page.getByLabel('E-mail').fill(email);
      await page.getByLabel('Password').fill('short');
      await page.getByRole('button', { name: 'Open an account' }).click();
      await expect(page.getByText('too short: give at least 10 letters')).toBeVisible();
      await expect(page.getByLabel('E-mail')).toHaveValue(email);
      await page.getByLabel('Password').fill(password);
      await page.getByRole('button', { name: 'Open an account' }).click();
      await expect(page).toHaveURL(/\/gowns\/[0-9a-f-]{36}$/);
      await expect(drawnTable.drawing).toBeVisible();
      await expect(page.locator('[data-standing="saved"]')).toBeVisible();
      await page.getByRole('link', { name: 'Gowns' }).click();
      await expect(page.getByRole('listitem')).toHaveCount(1);
      await page.goto('/try');
      await expect(drawnTable.start.or(drawnTable.drawing)).toBeVisible();
      await expect(page.getByRole('radio', { name: 'inch' })).toBeChecked();
    });

    test('signing in says the same of a wrong password and of an account that is not there', async ({
      page,
      maker,
      context,
    }) => {
      await context.clearCookies();
      await page.goto('/gowns');
      const said: string[] = [];
      for (const email of [maker.email, `${randomUUID()}@example.org`]) {
        await page.getByLabel('E-mail').fill(email);
        await page.getByLabel('Password').fill('not the password');
        await page.getByRole('button', { name: 'Sign in' }).click();
        await expect(page.getByRole('button', { name: 'Sign in' })).toBeEnabled();
        said.push((await page.getByRole('alert').textContent()) ?? '');
      }
      expect(said[0]).toBe(said[1]);
      await page.getByLabel('E-mail').fill(maker.email);
      await page.getByLabel('Password').fill(maker.password);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await expect(page.getByRole('link', { name: 'Evening gown', exact: true })).toBeVisible();
    });

    test('the password is changed, and signing out everywhere ends every session', async ({
      page,
      maker,
    }) => {
      await page.goto('/account');
      await expect(page.getByText(maker.email)).toBeVisible();
      await page.getByLabel('Present password').fill('not the password');
      await page.getByLabel('New password').fill(password);
      await page.getByRole('button', { name: 'Change password' }).click();
      await expect(page.getByLabel('New password')).toHaveValue(password);
      await expect(page.getByText('✓ changed')).toHaveCount(0);
      await page.getByLabel('Present password').fill(maker.password);
      await page.getByRole('button', { name: 'Change password' }).click();
      await expect(page.getByText('✓ changed')).toBeVisible();
      await expect(page.getByText('this one')).toBeVisible();
      await page.getByRole('button', { name: 'Sign out everywhere' }).click();
      await expect(page).toHaveURL(/\/$/);
      await page.getByRole('link', { name: 'Sign in' }).click();
      await page.getByLabel('E-mail').fill(maker.email);
      await page.getByLabel('Password').fill(password);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await expect(page.getByRole('link', { name: 'Evening gown', exact: true })).toBeVisible();
    });
  });
}

test('by keyboard alone, from the table into the account and out again', async ({
  page,
  drawnTable,
}) => {
  await expect(drawnTable.drawing).toBeVisible();
  await walkTo(page, page.getByRole('link', { name: 'Keep it' }));
  await page.keyboard.press('Enter');
  await walkTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type(`${randomUUID()}@example.org`);
  await page.keyboard.press('Tab');
  await page.keyboard.type(password);
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/gowns\/[0-9a-f-]{36}$/);
  await page.goto('/account');
  const out = page.getByRole('button', { name: 'Sign out', exact: true });
  await expect(out).toBeVisible();
  await walkTo(page, out);
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/$/);
  await expect(page.getByRole('link', { name: 'Sign in' })).toBeVisible();
});

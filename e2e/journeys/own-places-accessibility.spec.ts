import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { expect, test } from '../fixtures/maker.ts';
import { gownTable } from '../screens/gown-table.ts';

const faults = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations;

const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [390, 1280]) {
    test.describe(`${colorScheme}, ${width} px`, () => {
      test.use({ colorScheme, viewport: { width, height: 844 } });

      test('the doors have no fault that axe knows, refused or not', async ({ page }) => {
        for (const path of ['/sign-in', '/sign-up', '/gowns']) {
          await page.goto(path);
          const password = page.getByLabel('Password');
          await password.fill('short');
          await password.press('Enter');
          await expect(page.locator('[role=alert], [aria-invalid=true]').first()).toBeVisible();
          expect(await faults(page)).toEqual([]);
          expect(await sideways(page)).toBe(0);
        }
      });

      test('the lists, a card and the account have none', async ({ page, maker }) => {
        expect(maker.email).not.toBe('');
        for (const path of ['/gowns', '/gowns/measure-cards', '/clients', '/compare', '/account']) {
          await page.goto(path);
          await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
          await expect(page.getByText(/^Fetching/)).toHaveCount(0);
          expect(await faults(page)).toEqual([]);
          expect(await sideways(page)).toBe(0);
        }
        await page.goto('/gowns');
        await page.getByRole('button', { name: 'Rename Evening gown' }).click();
        expect(await faults(page)).toEqual([]);
        await page.goto('/gowns/measure-cards');
        await page.getByRole('button', { name: 'New measure card' }).click();
        await expect(page.locator('[data-standing="saved"]')).toBeVisible();
        expect(await faults(page)).toEqual([]);
        expect(await sideways(page)).toBe(0);
      });

      test('a kept gown has none: on its table, with a tool, in a conflict, among its revisions', async ({
        page,
        context,
        gown,
        maker,
      }) => {
        await expect(gown.standing('saved')).toBeVisible();
        expect(await faults(page)).toEqual([]);
        expect(await sideways(page)).toBe(0);
        await page.getByRole('button', { name: 'Tape' }).click();
        await gown.drawing.press('n');
        await gown.drawing.press('Enter');
        await gown.drawing.press('n');
        expect(await faults(page)).toEqual([]);
        await gown.openRevisions.click();
        await expect(gown.revisions.getByText('No revision yet.')).toBeVisible();
        expect(await faults(page)).toEqual([]);
        await gown.revisions.getByRole('button', { name: 'Close' }).click();

        const other = gownTable(await context.newPage());
        await other.openGown(maker.gownId);
        await other.setStyle('kneeFinished', '80');
        await expect(other.standing('saved')).toBeVisible();
        await gown.setStyle('kneeFinished', '95');
        await expect(gown.conflict).toBeVisible();
        expect(await faults(page)).toEqual([]);
        await context.clearCookies();
      });
    });
  }
}

import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { gownSchema } from '#shared/api/gowns.ts';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';

const cut = (page: Page) => page.route('**/api/**', (route) => route.abort());
const mend = (page: Page) => page.unroute('**/api/**');

async function versionOf(page: Page, gownId: string): Promise<number> {
  const answer = await page.request.get(`/api/gowns/${gownId}`);
  return gownSchema.parse(await answer.json()).version;
}

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('what is drawn without the server is kept, across a reload, and sent once it is back', async ({
      page,
      gown,
      maker,
    }) => {
      const before = await versionOf(page, maker.gownId);
      await cut(page);
      await gown.setStyle('kneeFinished', '95');
      await expect(gown.standing('offline')).toBeVisible();
      await page.reload();
      await gown.showStyle();
      await expect(gown.field('style.kneeFinished')).toHaveValue('95.0');
      await gown.setStyle('neckWidth', '8.1');
      await expect(gown.standing('offline')).toBeVisible();
      await mend(page);
      await expect(gown.standing('saved')).toBeVisible({ timeout: 15_000 });
      // The save that could not be sent, and the one after it: neither lost nor doubled.
      expect(await versionOf(page, maker.gownId)).toBe(before + 2);
      await page.reload();
      await gown.showStyle();
      await expect(gown.field('style.kneeFinished')).toHaveValue('95.0');
      await expect(gown.field('style.neckWidth')).toHaveValue('8.1');
    });

    test('a save whose answer was lost is not done twice', async ({ page, gown, maker }) => {
      const before = await versionOf(page, maker.gownId);
      let lost = 0;
      await page.route('**/save', async (route) => {
        if (lost > 1) return route.fallback();
        lost += 1;
        await route.fetch();
        return route.abort();
      });
      await gown.setStyle('kneeFinished', '95');
      await expect(gown.standing('offline')).toBeVisible();
      await expect(gown.standing('saved')).toBeVisible({ timeout: 15_000 });
      expect(lost).toBe(2);
      expect(await versionOf(page, maker.gownId)).toBe(before + 1);
    });

    test('a session that ends in the middle costs nothing: sign in there, and it is saved', async ({
      page,
      context,
      gown,
      maker,
    }) => {
      await context.clearCookies();
      await gown.setStyle('kneeFinished', '95');
      await expect(gown.standing('signed-out')).toBeVisible();
      await page.getByRole('button', { name: 'Sign in' }).click();
      await gown.signIn.getByLabel('E-mail').fill(maker.email);
      await gown.signIn.getByLabel('Password').fill('not the password');
      await gown.signIn.getByRole('button', { name: 'Sign in' }).click();
      await expect(gown.signIn.getByRole('alert')).toContainText('do not belong together');
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      await expect(gown.signIn.getByLabel('E-mail')).toHaveValue(maker.email);
      await gown.signIn.getByLabel('Password').fill(maker.password);
      await gown.signIn.getByRole('button', { name: 'Sign in' }).click();
      await expect(gown.standing('saved')).toBeVisible();
      await expect(gown.field('style.kneeFinished')).toHaveValue('95.0');
    });
  });
}

test('by keyboard: signed out, signed in again on the table, and saved', async ({
  page,
  context,
  gown,
  maker,
}) => {
  await context.clearCookies();
  await walkTo(page, gown.field('style.kneeFinished'));
  await page.keyboard.type('95');
  await page.keyboard.press('Enter');
  await expect(gown.standing('signed-out')).toBeVisible();
  await walkTo(page, page.getByRole('button', { name: 'Sign in' }), 'Shift+Tab');
  await page.keyboard.press('Enter');
  await walkTo(page, gown.signIn.getByLabel('E-mail'));
  await page.keyboard.type(maker.email);
  await page.keyboard.press('Tab');
  await page.keyboard.type(maker.password);
  await page.keyboard.press('Enter');
  await expect(gown.standing('saved')).toBeVisible();
});

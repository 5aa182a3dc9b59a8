import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { gownSchema } from '#shared/api/gowns.ts';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';

const faults = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations;

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('a gown is saved as it is drawn, and lies there when it is opened again', async ({
      page,
      gown,
    }) => {
      await gown.setStyle('neckWidth', '8.1');
      await gown.setStyle('heelHeight', 'high');
      await expect(gown.standing('saved')).toBeVisible();

      await page.getByRole('link', { name: 'Gowns' }).click();
      await expect(page.getByRole('heading', { level: 1, name: 'Gowns' })).toBeVisible();
      await page.getByRole('link', { name: 'Evening gown', exact: true }).click();
      // The last pieces that could be drawn lie there, although a figure cannot be read.
      await expect(gown.stale).toBeVisible();
      await gown.showStyle();
      await expect(gown.field('style.neckWidth')).toHaveValue('8.1');
      await expect(gown.field('style.heelHeight')).toHaveValue('high');
    });

    test('gowns are renamed, duplicated, put away and taken back', async ({ page, maker }) => {
      expect(maker.gownId).not.toBe('');
      await page.goto('/gowns');
      await page.getByRole('button', { name: 'Duplicate Evening gown' }).click();
      await expect(
        page.getByRole('link', { name: 'Copy of Evening gown', exact: true }),
      ).toBeVisible();
      await page.getByRole('button', { name: 'Rename Evening gown' }).click();
      const name = page.getByRole('textbox', { name: 'Name of the gown' });
      await name.fill('');
      await page.getByRole('button', { name: 'Keep the name' }).click();
      await expect(page.getByRole('dialog')).toContainText('too short');
      await name.fill('Ball gown');
      await name.press('Enter');
      await expect(page.getByRole('link', { name: 'Ball gown', exact: true })).toBeVisible();
      await page.getByRole('button', { name: 'Archive Ball gown' }).click();
      await expect(page.getByRole('link', { name: 'Ball gown', exact: true })).toHaveCount(0);
      await page.getByRole('button', { name: 'Archive (1)' }).click();
      await page.getByRole('button', { name: 'Delete Ball gown' }).click();
      await expect(page.getByRole('dialog')).toContainText('every revision');
      expect(await faults(page)).toEqual([]);
      await page.getByRole('button', { name: 'Keep it' }).click();
      await page.getByRole('button', { name: 'Take back Ball gown' }).click();
      await page.getByRole('button', { name: 'Back to those in use' }).click();
      await expect(page.getByRole('link', { name: 'Ball gown', exact: true })).toBeVisible();

      await page.getByRole('button', { name: 'Archive Copy of Evening gown' }).click();
      await page.getByRole('button', { name: 'Archive (1)' }).click();
      await page.getByRole('button', { name: 'Delete Copy of Evening gown' }).click();
      await page.getByRole('button', { name: 'Delete for good' }).click();
      await expect(page.getByText('Nothing has been put away.')).toBeVisible();
      await page.reload();
      await expect(page.getByRole('link', { name: 'Ball gown', exact: true })).toBeVisible();
      await expect(page.getByText('Copy of Evening gown')).toHaveCount(0);
    });

    test('a state is named, looked at, and returned to', async ({ gown }) => {
      await gown.setStyle('kneeFinished', '80');
      await gown.openRevisions.click();
      await gown.revisions.getByLabel('Name this state').fill('before the fitting');
      await gown.revisions.getByRole('button', { name: 'Keep as a revision' }).click();
      const named = gown.revisions.getByRole('button', { name: /^before the fitting/ });
      await expect(named).toBeVisible();
      await gown.revisions.getByRole('button', { name: 'Close' }).click();

      await gown.setStyle('kneeFinished', '95');
      await expect(gown.standing('saved')).toBeVisible();
      await gown.openRevisions.click();
      await named.click();
      await expect(gown.revisions.getByRole('row', { name: /Finished knee/ })).toContainText(
        '80.0',
      );
      await expect(gown.revisions.getByRole('img')).toHaveCount(2);
      await gown.revisions.getByRole('button', { name: 'Return to “before the fitting”' }).click();
      await gown.showStyle();
      await expect(gown.field('style.kneeFinished')).toHaveValue('80.0');
      await expect(gown.standing('saved')).toBeVisible();
      await gown.openRevisions.click();
      await expect(
        gown.revisions.getByRole('button', { name: /^Before returning to before the fitting/ }),
      ).toBeVisible();
    });
  });
}

test('the same by keyboard alone: open, change, name a state, go back to the list', async ({
  page,
  maker,
}) => {
  expect(maker.gownId).not.toBe('');
  await page.goto('/gowns');
  const link = page.getByRole('link', { name: 'Evening gown', exact: true });
  await expect(link).toBeVisible();
  await walkTo(page, link);
  await page.keyboard.press('Enter');
  const knee = page.locator('input[name="style.kneeFinished"]');
  await expect(knee).toBeVisible();
  await walkTo(page, knee);
  await page.keyboard.type('88');
  await page.keyboard.press('Enter');
  await expect(page.locator('[data-standing="saved"]')).toBeVisible();
  await walkTo(page, page.getByRole('button', { name: 'Revisions' }), 'Shift+Tab');
  await page.keyboard.press('Enter');
  await walkTo(page, page.getByLabel('Name this state'));
  await page.keyboard.type('first try');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: /^first try/ })).toBeVisible();
  await walkTo(page, page.getByRole('button', { name: 'Close' }));
  await page.keyboard.press('Enter');
  await walkTo(page, page.getByRole('link', { name: 'Gowns' }), 'Shift+Tab');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name: 'Gowns' })).toBeVisible();
});

test('a measure card is kept by itself, and laid on a gown', async ({ page, gown }) => {
  await gown.showMeasures();
  await page.getByRole('button', { name: 'Keep this card' }).click();
  await expect(page.getByText('among the measure cards')).toBeVisible();
  await page.goto('/gowns/measure-cards');
  await page.getByRole('link', { name: 'Measure card', exact: true }).click();
  const waist = page.locator('input[name="card.waistGirth"]');
  await waist.fill('70');
  await waist.press('Enter');
  await expect(page.locator('[data-standing="saved"]')).toBeVisible();
  await page.goBack();
  await page.goBack();
  await expect(gown.drawing).toBeVisible();
  await page.getByRole('button', { name: 'Lay a kept card' }).click();
  await page.getByRole('button', { name: /Measure card · 10 measures/ }).click();
  await expect(gown.field('card.waistGirth')).toHaveValue('70.0');
  await expect(gown.standing('saved')).toBeVisible();
});

test('a gown drawn by older rules shows what would change before it changes', async ({
  page,
  maker,
}) => {
  await page.route(`**/api/gowns/${maker.gownId}`, async (route) => {
    const response = await route.fetch();
    const kept = gownSchema.parse(await response.json());
    const changes = (kept.drawn?.pieces ?? [])
      .slice(0, 1)
      .map(({ name, title }) => ({ piece: name, title, change: 'shape', deviation: 3.2 }));
    const redrawing = { engine: '1.0.0', changes, deviation: 3.2, problems: [] };
    const drawn = { ...kept.drawn, engine: '0.9.0' };
    await route.fulfill({ json: { ...kept, drawnBy: '0.9.0', drawn, redrawing } });
  });
  const saves: string[] = [];
  page.on('request', (request) => {
    if (request.url().endsWith('/save')) saves.push(request.url());
  });
  await page.goto(`/gowns/${maker.gownId}`);
  const sheet = page.getByRole('dialog', { name: 'Drawn by older rules' });
  await expect(sheet.getByRole('img')).toHaveCount(2);
  expect(await faults(page)).toEqual([]);
  await sheet.getByRole('button', { name: 'Leave it as it was drawn' }).click();
  await expect(page).toHaveURL(/\/gowns$/);
  expect(saves).toEqual([]);
  await page.getByRole('link', { name: 'Evening gown', exact: true }).click();
  await sheet.getByRole('button', { name: 'Redraw by today’s rules' }).click();
  await expect(page.locator('[data-standing="saved"]')).toBeVisible();
  expect(saves).toHaveLength(1);
});

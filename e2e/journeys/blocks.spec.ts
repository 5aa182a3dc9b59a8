import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { expect, test } from '../fixtures/maker.ts';
import { pagesOf } from '../fixtures/pdf.ts';
import { styleScreen } from '../screens/style-card.ts';

const faults = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations;

const places = ['shoulder', 'armhole', 'side', 'waist', 'neck', 'top line'] as const;

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('a bodice block is drawn by keyboard alone, and its bust dart goes to all six places', async ({
      page,
      drawnTable,
    }) => {
      test.slow();
      const style = styleScreen(drawnTable);
      await style.show();
      await style.option('Garment', 'gown').focus();
      await page.keyboard.press('ArrowRight');
      await expect(style.option('Garment', 'bodice block')).toBeChecked();
      await expect(style.choice('Garment').getByText('its dart can be moved')).toBeVisible();
      await expect(style.choice('Top line')).toHaveCount(0);
      await expect(style.field('style.ease.hip')).toHaveCount(0);
      await expect(style.field('style.armholeDrop')).toBeVisible();
      await style.option('Bust dart in', 'shoulder').focus();
      for (const [index, place] of places.entries()) {
        if (index > 0) await page.keyboard.press('ArrowRight');
        await expect(style.option('Bust dart in', place)).toBeChecked();
        await expect(style.stale, place).toHaveCount(0);
      }
      expect(await faults(page)).toEqual([]);
      await drawnTable.tab('Proof').click();
      await expect(drawnTable.panel.getByText('These pieces sew together.')).toBeVisible();
      await drawnTable.tab('Pieces').click();
      await expect(
        drawnTable.panel.getByText('Bodice block, front', { exact: true }),
      ).toBeVisible();
      await drawnTable.tab('Steps').click();
      await expect(drawnTable.panel.getByText('Dart moved')).toBeVisible();
      expect(await faults(page)).toEqual([]);
    });

    test('a skirt block shows only what it has, keeps its figures and is printed', async ({
      page,
      drawnTable,
    }) => {
      const style = styleScreen(drawnTable);
      await style.show();
      await style.option('Garment', 'skirt block').check();
      await expect(style.field('style.ease.bust')).toHaveCount(0);
      await style.field('style.length').fill('70');
      await style.field('style.length').blur();
      await expect(style.stale).toHaveCount(0);
      await style.field('style.length').fill('7');
      await style.field('style.length').blur();
      await expect(style.stale).toBeVisible();
      await style.field('style.length').fill('70');
      await style.field('style.length').blur();
      await page.reload();
      await style.show();
      await expect(style.option('Garment', 'skirt block')).toBeChecked();
      await expect(style.field('style.length')).toHaveValue('70.0');
      await drawnTable.print.click();
      const chalk = page.waitForEvent('download');
      await drawnTable.printButton('Chalk sheet').click();
      expect(await pagesOf(await chalk)).toBe(1);
      const block = page.waitForEvent('download');
      await drawnTable.printButton('Skirt block').click();
      expect(await pagesOf(await block)).toBeGreaterThan(3);
      expect(await faults(page)).toEqual([]);
    });

    test('a block is kept with an account and lies there when it is opened again', async ({
      page,
      gown,
    }) => {
      const style = styleScreen(gown);
      await style.show();
      await style.option('Garment', 'bodice block').check();
      await style.option('Bust dart in', 'side').check();
      await expect(gown.standing('saved')).toBeVisible();
      await page.reload();
      await expect(gown.drawing).toBeVisible();
      await style.show();
      await expect(style.option('Garment', 'bodice block')).toBeChecked();
      await expect(style.option('Bust dart in', 'side')).toBeChecked();
      await expect(style.stale).toHaveCount(0);
      expect(await faults(page)).toEqual([]);
    });
  });
}

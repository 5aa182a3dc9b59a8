import AxeBuilder from '@axe-core/playwright';

import { expect, test } from '../fixtures/journey.ts';

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [390, 1280]) {
    test.describe(`${colorScheme}, ${width} px`, () => {
      test.use({ colorScheme, viewport: { width, height: 900 } });

      test('the front page has no fault that axe knows', async ({ page }) => {
        await page.goto('/');
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
        expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      });

      test('the empty table has none', async ({ page, table }) => {
        await table.open();
        await expect(table.start).toBeVisible();
        expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      });

      test('the drawn table has none on any sheet, nor has printing', async ({
        page,
        drawnTable,
      }) => {
        await expect(drawnTable.drawing).toBeVisible();
        const tabs = await page.getByRole('tab').all();
        for (const tab of tabs) {
          await tab.click();
          expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
        }
        await drawnTable.print.click();
        await expect(drawnTable.dialog).toBeVisible();
        expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      });

      test('nothing sticks out sideways at 360 px', async ({ page, drawnTable }) => {
        await page.setViewportSize({ width: 360, height: 740 });
        await expect(drawnTable.drawing).toBeVisible();
        const wide = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
        expect(wide).toBe(0);
      });
    });
  }
}

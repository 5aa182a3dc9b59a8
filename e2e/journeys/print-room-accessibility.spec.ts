import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { expect, test } from '../fixtures/journey.ts';
import { patience, printRoom } from '../screens/print-room.ts';

test.describe.configure({ timeout: 4 * patience });

const faults = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations;

const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [390, 1280]) {
    test.describe(`${colorScheme}, ${width} px`, () => {
      test.use({ colorScheme, viewport: { width, height: 844 } });

      test('the print room has no fault that axe knows, refused or not', async ({
        page,
        drawnTable,
      }) => {
        await expect(drawnTable.drawing).toBeVisible();
        await page.goto('/try/print');
        const room = printRoom(page);
        await room.arranged();
        await room.sheet('A1').click();
        expect(await faults(page)).toEqual([]);
        for (const tab of await page.getByRole('tab').all()) {
          await tab.click();
          expect(await faults(page)).toEqual([]);
          expect(await sideways(page)).toBe(0);
        }
        await room.showCard('Paper');
        await room.field('overlap').fill('90');
        await room.field('overlap').blur();
        await expect(room.field('overlap')).toHaveAttribute('aria-invalid', 'true');
        expect(await faults(page)).toEqual([]);
        await page.setViewportSize({ width: 360, height: 740 });
        expect(await sideways(page)).toBe(0);
      });
    });
  }
}

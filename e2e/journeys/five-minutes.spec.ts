import type { Page } from '@playwright/test';

import { expect, test } from '../fixtures/journey.ts';
import { tenMeasures } from '../fixtures/measures.ts';
import { pagesOf } from '../fixtures/pdf.ts';

/** Counts what the maker does with mouse or finger from now on. */
async function countClicks(page: Page): Promise<() => Promise<number>> {
  await page.evaluate(() => {
    document.documentElement.dataset['clicks'] = '0';
    document.addEventListener(
      'pointerdown',
      () => {
        const { dataset } = document.documentElement;
        dataset['clicks'] = String(Number(dataset['clicks']) + 1);
      },
      { capture: true },
    );
  });
  return () => page.evaluate(() => Number(document.documentElement.dataset['clicks']));
}

const sheetsIn = (text: string | null): number => Number(/(\d+) sheets?/.exec(text ?? '')?.[1]);

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 800 }, hasTouch: width < 500 });

    test('ten typed measures become a chalk sheet and a bodice toile in at most four clicks', async ({
      page,
      table,
    }) => {
      await table.open();
      await table.unit('inch').check();
      await table.start.click();
      await table.typeOn(['Anna', ...tenMeasures.inches]);
      await expect(table.drawing).toBeVisible();
      const clicks = await countClicks(page);

      await table.print.click();
      const chalk = page.waitForEvent('download');
      await table.printButton('Chalk sheet').click();
      expect(await pagesOf(await chalk)).toBe(1);

      await expect(table.printRow('Bodice toile')).toContainText(/\d sheet/, {
        timeout: 45_000,
      });
      const sheets = sheetsIn(await table.printRow('Bodice toile').textContent());
      const toile = page.waitForEvent('download');
      await table.printButton('Bodice toile').click();
      expect(await pagesOf(await toile)).toBe(sheets);

      expect(await clicks()).toBeLessThanOrEqual(4);
    });
  });
}

test('the same by keyboard alone', async ({ page, table }) => {
  await table.open();
  const clicks = await countClicks(page);
  const walkTo = async (name: string) => {
    for (let presses = 0; presses < 40; presses += 1) {
      await page.keyboard.press('Tab');
      const focused = page.locator(':focus');
      if ((await focused.count()) > 0 && (await focused.textContent()) === name) return;
    }
    throw new Error(`${name} is not reached`);
  };
  await expect(table.start).toBeVisible();
  // The way past the header and both cards.
  await walkTo('To the content');
  await page.keyboard.press('Enter');
  await walkTo('Type ten measures');
  await page.keyboard.press('Enter');
  await expect(table.field('card.name')).toBeFocused();
  await table.typeOn(['Anna']);
  await expect(table.field('card.bustGirth')).toBeFocused();
  await table.typeOn(tenMeasures.centimetres);
  await expect(table.drawing).toBeFocused();

  await page.keyboard.press('Enter');
  await expect(table.dialog).toBeVisible();
  for (const title of ['Chalk sheet', 'Bodice toile']) {
    await walkTo(title);
    const saved = page.waitForEvent('download');
    await page.keyboard.press('Enter');
    expect(await pagesOf(await saved)).toBeGreaterThan(0);
  }
  expect(await clicks()).toBe(0);
});

test('a sample body lies on the table with one click', async ({ page, table }) => {
  await table.open();
  await page.getByRole('button', { name: 'Judith' }).click();
  await expect(table.drawing).toBeVisible();
  await expect(page.getByText('These pieces sew together')).toBeVisible();
});

import type { Download, Page } from '@playwright/test';
import { readFile } from 'node:fs/promises';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';
import { keptTable } from '../fixtures/measures.ts';
import { pagesOf } from '../fixtures/pdf.ts';
import { patience, printRoom } from '../screens/print-room.ts';

// A plan is a second of work; where many browsers share a small machine it waits for its turn.
test.describe.configure({ timeout: 4 * patience });

async function downloaded(page: Page, act: () => Promise<void>): Promise<Download> {
  const saved = page.waitForEvent('download');
  await act();
  return saved;
}

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 }, hasTouch: width < 500 });

    test('the table leads to the print room, and the PDF has as many pages as its plan', async ({
      page,
      drawnTable,
    }) => {
      const room = printRoom(page);
      await drawnTable.print.click();
      await drawnTable.dialog.getByRole('link', { name: 'Print room' }).click();
      await room.heading.waitFor();
      await room.arranged();
      const sheets = await room.sheets();
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(sheets);
      await expect(page.getByText(/saved as .*whole-gown-a4\.pdf/)).toBeVisible();

      await room.paper.selectOption('A3');
      await expect(room.count).toContainText('of A3', { timeout: patience });
      expect(await room.sheets()).toBeLessThan(sheets);
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(
        await room.sheets(),
      );
    });

    test('a sheet is left out and taken back where it lies', async ({ page, drawnTable }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.goto('/try/print');
      const room = printRoom(page);
      await room.arranged();
      const sheets = await room.sheets();
      await room.sheet('A1').click();
      await room.sheet('A2').click();
      await expect(room.count).toContainText(`${sheets - 2} sheets`, { timeout: patience });
      await expect(page.getByText('2 left out')).toBeVisible();
      await room.sheet('A2').click();
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(sheets - 1);
      await room.paper.selectOption('Letter');
      await expect(room.count).toContainText('of Letter', { timeout: patience });
      await expect(page.getByText('left out', { exact: false }).first()).toBeHidden();
    });

    test('pieces are ticked, copied and drawn otherwise; the SVG has only those', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.goto('/try/print');
      const room = printRoom(page);
      await room.arranged();
      const all = await room.sheets();
      await room.showCard('Pieces');
      await page.getByRole('button', { name: 'Bodice only' }).click();
      await expect(room.piece('Front skirt')).not.toBeChecked();
      await expect.poll(() => room.sheets(), { timeout: patience }).toBeLessThan(all);
      const toile = await room.sheets();
      await page.getByLabel('Copies of Front top, side panel').selectOption('6');
      await expect.poll(() => room.sheets(), { timeout: patience }).toBeGreaterThan(toile);
      await page.getByLabel('How Front top, centre panel is drawn').selectOption('opened out');
      await room.arranged();
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(
        await room.sheets(),
      );
      const svg = await readFile(
        await (await downloaded(page, () => room.makeSvg.click())).path(),
        'utf8',
      );
      expect(svg).toContain('data-piece="front-top');
      expect(svg).not.toContain('data-piece="front-middle"');
    });

    test('a figure that cannot be is told with its bounds, and nothing typed is lost', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.goto('/try/print');
      const room = printRoom(page);
      await room.arranged();
      await room.field('margin').fill('9');
      await room.field('margin').blur();
      await expect(page.getByText('must lie between 0.5 cm and 1.5 cm')).toBeVisible();
      await expect(room.field('margin')).toHaveValue('9.0');
      await expect(room.makePdf).toBeDisabled();
      await page.getByRole('radio', { name: 'inch' }).check();
      await expect(page.getByText(/must lie between .* in and 9⁄16 in/)).toBeVisible();
      await room.field('margin').fill('a thumb');
      await room.field('margin').blur();
      await expect(room.field('margin')).toHaveValue('a thumb');
      await expect(room.field('margin')).toHaveAttribute('aria-invalid', 'true');
      await room.field('margin').fill('1/2');
      await room.paper.selectOption('custom');
      await room.field('width').fill('12 in');
      await room.field('height').fill('18 in');
      await room.field('height').blur();
      await expect(room.count).toContainText('custom', { timeout: patience });

      await page.route('**/api/prints/sheets', (route) => route.abort());
      await room.makePdf.click();
      await expect(page.getByText('The server cannot be reached')).toBeVisible();
      await expect(room.field('width')).toHaveValue('12');
      await page.unroute('**/api/prints/sheets');
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(
        await room.sheets(),
      );

      await page.reload();
      await expect(room.field('margin')).toHaveValue('1⁄2');
      await expect(room.field('height')).toHaveValue('18');
      await expect(room.count).toContainText('custom', { timeout: patience });
    });

    test('what the printed square measures tells what went wrong, in either unit', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.goto('/try/print');
      const room = printRoom(page);
      await room.showCard('Scale');
      await room.field('across').fill('10');
      await room.field('down').fill('10,0');
      await expect(page.getByText('True to scale')).toBeVisible();
      await room.field('across').fill('97');
      await room.field('down').fill('97');
      await expect(page.getByText('Did you mean 97 mm?')).toBeVisible();
      await expect(page.getByText(/came out at/)).toBeHidden();
      await page.getByRole('button', { name: 'Take 97 mm' }).click();
      await expect(room.field('across')).toHaveValue('97 mm');
      await expect(page.getByText(/came out at 97\.0 %/)).toBeVisible();
      await room.field('across').fill('94.1 mm');
      await room.field('down').fill('94 mm');
      await expect(page.getByText(/Everything came out at 94\.\d %/)).toBeVisible();
      await expect(page.getByText(/“actual size” or 100 %/)).toBeVisible();
      await page.getByRole('radio', { name: 'inch' }).check();
      await expect(room.field('across')).toHaveValue('3.705');
      await room.field('across').fill('a lot');
      await expect(page.getByText(/came out at/)).toBeHidden();
      await room.field('across').blur();
      await expect(room.field('across')).toHaveAttribute('aria-invalid', 'true');
      await room.field('across').fill('3 7/8');
      await room.field('down').fill('4');
      await expect(page.getByText('The square is no square')).toBeVisible();
    });

    test('arranging and writing show that they go on, and both can be called off', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.route('**/plan-worker*', async (route) => {
        await new Promise((later) => setTimeout(later, 1500));
        await route.continue();
      });
      await page.goto('/try/print');
      const room = printRoom(page);
      await expect(page.getByRole('progressbar', { name: 'Arranging the pieces' })).toBeVisible();
      await expect(room.makePdf).toBeDisabled();
      await room.cancel.click();
      await expect(page.getByText('Arranging was called off')).toBeVisible();
      await page.waitForTimeout(2000);
      await expect(room.count).toBeHidden();
      await page.unroute('**/plan-worker*');
      await page.getByRole('button', { name: 'Arrange again' }).click();
      await room.arranged();

      await page.route('**/api/prints/sheets', async (route) => {
        await new Promise((later) => setTimeout(later, 3000));
        await route.continue().catch(() => undefined);
      });
      await room.makePdf.click();
      await expect(page.getByRole('progressbar', { name: 'Writing: Sheets' })).toBeVisible();
      await room.cancel.click();
      await expect(page.getByText('Writing…')).toBeHidden();
      await page.unroute('**/api/prints/sheets');
      expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(
        await room.sheets(),
      );
    });

    test('the page plan can be read: names, numbers and room for a finger', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      await page.goto('/try/print');
      const room = printRoom(page);
      await room.arranged();
      const sheets = await room.sheets();
      await expect(room.plan.getByRole('checkbox')).toHaveCount(sheets - 1);
      const sizes = await room.plan
        .getByRole('checkbox')
        .evaluateAll((all) => all.map((each) => each.getBoundingClientRect().width));
      expect(Math.min(...sizes)).toBeGreaterThanOrEqual(32);
      const letters = await page
        .locator('svg text.halo')
        .evaluateAll((all) => all.map((each) => Number(each.getAttribute('font-size'))));
      expect(letters.length).toBeGreaterThan(sheets);
      expect(Math.min(...letters)).toBeGreaterThanOrEqual(11);
    });
  });
}

test('the same by keyboard alone: paper, a sheet left out, the PDF', async ({
  page,
  drawnTable,
}) => {
  await expect(drawnTable.drawing).toBeVisible();
  await page.goto('/try/print');
  const room = printRoom(page);
  await room.arranged();
  await walkTo(page, room.paper);
  await page.keyboard.press('L');
  await expect(room.count).toContainText('of Le', { timeout: patience });
  const sheets = await room.sheets();
  await walkTo(page, room.sheet('A1'));
  await page.keyboard.press('ArrowRight');
  await expect(room.sheet('A2')).toBeFocused();
  await page.keyboard.press('Space');
  await expect(room.count).toContainText(`${sheets - 1} sheets`, { timeout: patience });
  await walkTo(page, room.makePdf, 'Shift+Tab');
  expect(await pagesOf(await downloaded(page, () => page.keyboard.press('Enter')))).toBe(
    sheets - 1,
  );
});

test('a kept gown is printed with what has just been changed on its table', async ({
  page,
  gown,
  maker,
}) => {
  await gown.setStyle('flareLength', '30');
  await page.getByRole('navigation', { name: 'Places' }).getByText('Print room').click();
  const room = printRoom(page);
  await expect(page).toHaveURL(new RegExp(`/gowns/${maker.gownId}/print$`));
  await room.arranged();
  const shorter = await room.sheets();
  const asked = page.waitForRequest('**/api/prints/sheets');
  expect(await pagesOf(await downloaded(page, () => room.makePdf.click()))).toBe(shorter);
  expect((await asked).postDataJSON()).toMatchObject({ inputs: { style: { flareLength: 300 } } });
  await page.getByRole('link', { name: 'To the table' }).click();
  await gown.showStyle();
  await expect(gown.field('style.flareLength')).toHaveValue('30.0');
});

test('a block drafted at the table is printed in the same room', async ({ page, table }) => {
  await page.addInitScript((kept) => {
    localStorage.setItem('ellwand.table', JSON.stringify({ ...kept, garment: 'skirt-block' }));
  }, keptTable);
  await table.open();
  await expect(table.drawing).toBeVisible();
  await page.goto('/try/print');
  const room = printRoom(page);
  await room.arranged();
  await room.showCard('Pieces');
  await expect(page.getByRole('button', { name: 'Bodice only' })).toBeHidden();
  const saved = await downloaded(page, () => room.makePdf.click());
  expect(saved.suggestedFilename()).toContain('skirt-block-a4.pdf');
  expect(await pagesOf(saved)).toBe(await room.sheets());
});

test('without pieces there is a way back to the table', async ({ page }) => {
  await page.goto('/try/print');
  await page.getByRole('link', { name: 'To the table' }).click();
  await expect(page).toHaveURL(/\/try$/);
});

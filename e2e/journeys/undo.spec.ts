import { expect, test } from '../fixtures/maker.ts';
import { gownTable } from '../screens/gown-table.ts';

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('every change is taken back and done again, across a reload, and saved', async ({
      page,
      gown,
    }) => {
      await gown.setStyle('kneeFinished', '95');
      await gown.showStyle();
      await page.getByRole('radio', { name: 'scooped' }).check();
      await page.getByRole('radio', { name: 'darts' }).check();
      const handle = gown.handle('Neck depth');
      const before = await handle.getAttribute('aria-valuenow');
      await handle.focus();
      await handle.press('ArrowDown');
      await handle.press('ArrowDown');
      await expect(handle).toHaveAttribute('aria-valuenow', String(Number(before) + 2));
      await expect(gown.standing('saved')).toBeVisible();

      await page.reload();
      await expect(gown.drawing).toBeVisible();
      await gown.showStyle();
      // Two presses of an arrow key are two changes.
      await gown.undo.click();
      await expect(handle).toHaveAttribute('aria-valuenow', String(Number(before) + 1));
      await gown.undo.click();
      await expect(handle).toHaveAttribute('aria-valuenow', before ?? '');
      await gown.undo.click();
      await expect(page.getByRole('radio', { name: 'princess' })).toBeChecked();
      await gown.undo.click();
      await expect(page.getByRole('radio', { name: 'sweetheart' })).toBeChecked();
      await gown.undo.click();
      await expect(gown.field('style.kneeFinished')).toHaveValue('');
      await expect(gown.undo).toBeDisabled();
      await gown.redo.click();
      await gown.redo.click();
      await expect(page.getByRole('radio', { name: 'scooped' })).toBeChecked();
      await expect(gown.standing('saved')).toBeVisible();
    });

    test('a drag is one change', async ({ page, gown }) => {
      const handle = gown.handle('Finished knee');
      const before = await handle.getAttribute('aria-valuenow');
      const box = await handle.boundingBox();
      if (box === null) throw new Error('there is no handle');
      const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
      await page.mouse.move(x, y);
      await page.mouse.down();
      await page.mouse.move(x + 8, y, { steps: 5 });
      await page.mouse.up();
      await expect(handle).not.toHaveAttribute('aria-valuenow', before ?? '');
      await gown.undo.click();
      await expect(handle).toHaveAttribute('aria-valuenow', before ?? '');
      await expect(gown.undo).toBeDisabled();
    });
  });
}

test('by keyboard: Ctrl+Z in a field and on the drawing, Shift+Ctrl+Z and Ctrl+Y on again', async ({
  page,
  gown,
}) => {
  const knee = gown.field('style.kneeFinished');
  await knee.fill('95');
  await knee.press('Enter');
  await gown.handle('Flare length').focus();
  await page.keyboard.press('ArrowDown');
  const flare = gown.field('style.flareLength');
  await expect(flare).not.toHaveValue('');
  await page.keyboard.press('Control+z');
  await expect(flare).toHaveValue('');
  await knee.focus();
  await page.keyboard.press('Control+z');
  await expect(knee).toHaveValue('');
  await page.keyboard.press('Control+Shift+z');
  await expect(knee).toHaveValue('95.0');
  await page.keyboard.press('Control+y');
  await expect(flare).not.toHaveValue('');
});

test('at Try it too, even after the table was cleared', async ({ page, drawnTable }) => {
  const table = gownTable(page);
  await expect(table.undo).toBeDisabled();
  await page.getByRole('button', { name: 'Clear the table' }).click();
  await expect(drawnTable.start).toBeVisible();
  await page.reload();
  await expect(drawnTable.start).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(drawnTable.drawing).toBeVisible();
});

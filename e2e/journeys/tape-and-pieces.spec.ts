import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('a piece is carried off by mouse, lies there after a reload, and snaps back', async ({
      page,
      gown,
    }) => {
      const knee = gown.handle('Finished knee');
      const lay = await knee.boundingBox();
      if (lay === null) throw new Error('there is no handle');
      await page.getByRole('button', { name: 'Move pieces' }).click();
      // Up and in from the handle lies the skirt it holds.
      const [x, y] = [lay.x + lay.width / 2 - 8, lay.y + lay.height / 2 - 12];
      await page.mouse.move(x, y);
      await page.mouse.down();
      await page.mouse.move(x + 30, y + 20, { steps: 4 });
      await page.mouse.up();
      await page.getByRole('button', { name: 'Move pieces' }).click();
      await expect(async () => {
        const moved = await knee.boundingBox();
        expect(moved?.x).toBeCloseTo(lay.x + 30, 0);
        expect(moved?.y).toBeCloseTo(lay.y + 20, 0);
      }).toPass();
      await page.reload();
      await expect(gown.drawing).toBeVisible();
      await expect.poll(async () => (await knee.boundingBox())?.x).toBeCloseTo(lay.x + 30, 0);
      await page.getByRole('button', { name: 'Snap back' }).click();
      await expect.poll(async () => (await knee.boundingBox())?.x).toBeCloseTo(lay.x, 0);
      await expect(page.getByRole('button', { name: 'Snap back' })).toHaveCount(0);
    });

    test('the tape reads between two points by mouse, in the reader’s unit', async ({
      page,
      gown,
    }) => {
      const from = await gown.handle('Knee seam above the knee').boundingBox();
      const to = await gown.handle('Finished knee').boundingBox();
      if (from === null || to === null) throw new Error('there are no handles');
      await page.getByRole('button', { name: 'Tape' }).click();
      for (const box of [from, to]) {
        await page.mouse.click(box.x + box.width / 2, box.y + box.height / 2);
      }
      const read = page.getByRole('status').filter({ hasText: /along the seam/ });
      await expect(read).toHaveText(/^\d+\.\d cm along the seam$/);
      await gown.unit('inch').check();
      await expect(read).toHaveText(/in along the seam$/);
    });
  });
}

test('both by keyboard: corner to corner along a seam, and a piece stepped aside and back', async ({
  page,
  gown,
}) => {
  const tape = page.getByRole('button', { name: 'Tape' });
  await walkTo(page, tape);
  await page.keyboard.press('Enter');
  await expect(gown.drawing).toBeFocused();
  const status = page.getByRole('status');
  await page.keyboard.press('n');
  await expect(status.filter({ hasText: /^Front.*, .* to / })).toHaveCount(1);
  await page.keyboard.press('Enter');
  await page.keyboard.press('n');
  await expect(status.filter({ hasText: /cm along the seam/ })).toHaveCount(1);
  await page.keyboard.press('Enter');
  await page.keyboard.press('Escape');
  await page.keyboard.press('Escape');
  await expect(tape).toHaveAttribute('aria-pressed', 'false');

  await walkTo(page, page.getByRole('button', { name: 'Move pieces' }));
  await page.keyboard.press('Enter');
  await page.keyboard.press('n');
  await page.keyboard.press('Shift+ArrowRight');
  await expect(page.getByRole('button', { name: 'Snap back' })).toBeVisible();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: 'Snap back' })).toHaveCount(0);
});

test('every handle is stepped by arrow keys and says its value', async ({ gown }) => {
  const handles = await gown.page.getByRole('slider').all();
  expect(handles.length).toBeGreaterThanOrEqual(10);
  const names = await Promise.all(handles.map((each) => each.getAttribute('aria-label')));
  for (const name of names) {
    const handle = gown.handle(name ?? '');
    const before = await handle.getAttribute('aria-valuetext');
    const [now, least] = await Promise.all(
      ['aria-valuenow', 'aria-valuemin'].map((each) => handle.getAttribute(each)),
    );
    // To the right grows and to the left shrinks, whichever way the handle moves.
    await handle.press(now === least ? 'ArrowRight' : 'ArrowLeft');
    await expect(handle, name ?? '').not.toHaveAttribute('aria-valuetext', before ?? '');
  }
  expect(names).toContain('Waist seam above the waist');
});

test('the waist seam is dragged, and keeps where it was let go', async ({ gown, page }) => {
  const handle = gown.handle('Waist seam above the waist');
  const before = Number(await handle.getAttribute('aria-valuenow'));
  const box = await handle.boundingBox();
  if (box === null) throw new Error('there is no handle');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x, y + 8, { steps: 4 });
  await expect(gown.drawing).toHaveAttribute('data-dragging');
  await page.mouse.up();
  await expect
    .poll(async () => Number(await handle.getAttribute('aria-valuenow')))
    .toBeLessThan(before);
  await expect(gown.standing('saved')).toBeVisible();
});

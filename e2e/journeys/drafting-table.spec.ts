import { expect, test } from '../fixtures/journey.ts';

test.use({ viewport: { width: 1280, height: 900 } });

test('the pieces follow every figure at once, on a page no taller than the window', async ({
  page,
  drawnTable,
}) => {
  const before = await drawnTable.drawing.locator('canvas').first().screenshot();
  await drawnTable.field('style.kneeFinished').fill('100');
  await expect(async () => {
    const after = await drawnTable.drawing.locator('canvas').first().screenshot();
    expect(after.equals(before)).toBe(false);
  }).toPass();
  await expect(drawnTable.panel.getByRole('row', { name: /^Knee seam —/ })).toContainText('100.0');
  await page.setViewportSize({ width: 1280, height: 800 });
  await expect.poll(() => page.evaluate(() => document.documentElement.scrollHeight)).toBe(800);
});

test('a seam lights with its partner and both lengths, pointed at or stepped to by key', async ({
  page,
  drawnTable,
}) => {
  await drawnTable.drawing.press('n');
  await expect(drawnTable.seamStatus).toContainText(/Front.*[\d.]+; .*[\d.]+ cm/);
  const first = await drawnTable.seamStatus.textContent();
  await drawnTable.drawing.press('n');
  await expect(drawnTable.seamStatus).not.toHaveText(first ?? '');
  await drawnTable.drawing.press('Escape');
  await expect(drawnTable.seamStatus).toHaveCount(0);

  const box = await drawnTable.drawing.boundingBox();
  if (box === null) throw new Error('there is no drawing');
  await expect(async () => {
    for (let x = box.x + 40; x < box.x + box.width / 2; x += 4) {
      await page.mouse.move(x, box.y + box.height * 0.4);
      if ((await drawnTable.seamStatus.count()) > 0) return;
    }
    throw new Error('no seam lights where the middle pieces lie');
  }).toPass();
});

test('a handle moves by arrow keys, says its value, and is the same figure as the style card', async ({
  drawnTable,
}) => {
  const handle = drawnTable.handle('Finished knee');
  await handle.focus();
  const before = Number(await handle.getAttribute('aria-valuenow'));
  await handle.press('ArrowRight');
  await expect(handle).toHaveAttribute('aria-valuenow', String(before + 1));
  await handle.press('Shift+ArrowRight');
  await expect(handle).toHaveAttribute('aria-valuetext', `${((before + 11) / 10).toFixed(1)} cm`);
  await expect(drawnTable.field('style.kneeFinished')).toHaveValue(((before + 11) / 10).toFixed(1));
});

test('while a handle is dragged the pieces follow, and keep what they became', async ({
  page,
  drawnTable,
}) => {
  const handle = drawnTable.handle('Neck depth');
  const before = Number(await handle.getAttribute('aria-valuenow'));
  const box = await handle.boundingBox();
  if (box === null) throw new Error('there is no handle');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x, y + 12, { steps: 4 });
  const drawing = page.getByRole('group', { name: 'Drawing of the pieces' });
  await expect(drawing).toHaveAttribute('data-dragging');
  await page.mouse.up();
  await expect(drawing).not.toHaveAttribute('data-dragging');
  await expect
    .poll(async () => Number(await handle.getAttribute('aria-valuenow')))
    .toBeGreaterThan(before);
});

test('switching the unit keeps the exact value', async ({ drawnTable }) => {
  const bust = drawnTable.field('card.bustGirth');
  await bust.fill('92.7');
  await bust.press('Enter');
  await drawnTable.unit('inch').check();
  await expect(bust).toHaveValue('36\u00a01⁄2');
  await drawnTable.unit('cm').check();
  await expect(bust).toHaveValue('92.7');
  await bust.fill('36 5/16 in');
  await bust.press('Enter');
  await expect(bust).toHaveValue('92.2');
  await drawnTable.unit('inch').check();
  await expect(bust).toHaveValue('36\u00a05⁄16');
});

test('reload keeps the work, even what could not be read', async ({ page, drawnTable }) => {
  await drawnTable.field('style.neckWidth').fill('8.1');
  await drawnTable.field('style.neckWidth').press('Enter');
  await drawnTable.field('style.heelHeight').fill('high');
  await drawnTable.field('style.heelHeight').press('Enter');
  await page.reload();
  await expect(drawnTable.field('style.neckWidth')).toHaveValue('8.1');
  await expect(drawnTable.field('style.heelHeight')).toHaveValue('high');
  await expect(drawnTable.message('style.heelHeight')).toContainText('not a unit known here');
});

test('a figure out of bounds is refused with both bounds in the reader’s unit, and the drawing stays', async ({
  drawnTable,
}) => {
  const hip = drawnTable.field('card.hipGirth');
  await hip.fill('980');
  await hip.press('Enter');
  await expect(drawnTable.message('card.hipGirth')).toContainText(/between 75\.0 cm and 158\.0 cm/);
  await expect(drawnTable.stale).toBeVisible();
  await expect(hip).toHaveAttribute('aria-invalid', 'true');
  await drawnTable.unit('inch').check();
  await expect(drawnTable.message('card.hipGirth')).toContainText(
    /29\u00a01⁄2 in and 62\u00a03⁄16 in/,
  );
  await hip.fill('38 1/2');
  await expect(drawnTable.stale).toHaveCount(0);
});

test('a chosen step stands out on the drawing', async ({ page, drawnTable }) => {
  await drawnTable.tab('Steps').click();
  const step = drawnTable.panel.getByRole('button').first();
  await step.click();
  await expect(step).toHaveAttribute('aria-pressed', 'true');
  await expect(page.locator('svg circle.fill-brass').first()).toBeVisible();
});

test('zoom to a piece, nearer, further and fit, by mouse and by key', async ({
  page,
  drawnTable,
}) => {
  const width = async () => (await drawnTable.handle('Neck width').boundingBox())?.x;
  const fitted = await width();
  await page.getByRole('button', { name: 'Nearer' }).click();
  expect(await width()).not.toBe(fitted);
  await drawnTable.drawing.press('0');
  await expect.poll(width).toBe(fitted);
  await page.getByRole('combobox', { name: 'Zoom to a piece' }).selectOption('front-middle');
  expect(await width()).not.toBe(fitted);
  await page.getByRole('button', { name: 'Fit' }).click();
  await expect.poll(width).toBe(fitted);
});

test('without the server the table still draws, and the print says what to do', async ({
  page,
  drawnTable,
}) => {
  await page.route('**/api/**', (route) => route.abort());
  await drawnTable.field('style.kneeFinished').fill('100');
  await expect(drawnTable.panel.getByRole('row', { name: /^Knee seam —/ })).toContainText('100.0');
  await drawnTable.print.click();
  await drawnTable.printButton('Chalk sheet').click();
  await expect(drawnTable.printRow('Chalk sheet')).toContainText('The server cannot be reached');
});

test('a busy server is told as it says it', async ({ page, drawnTable }) => {
  await page.route('**/api/prints/**', (route) =>
    route.fulfill({
      status: 503,
      json: { code: 'busy', message: 'Many prints are waiting. Try again in 5 seconds.' },
    }),
  );
  await drawnTable.print.click();
  await drawnTable.printButton('Bodice toile').click();
  await expect(drawnTable.printRow('Bodice toile')).toContainText('Many prints are waiting');
});

test('two fingers zoom the drawing on a phone', async ({ browser, baseURL }) => {
  const context = await browser.newContext({
    viewport: { width: 390, height: 844 },
    hasTouch: true,
    isMobile: true,
    ...(baseURL === undefined ? {} : { baseURL }),
  });
  const page = await context.newPage();
  await page.goto('/try');
  await page.getByRole('button', { name: 'Judith' }).click();
  const knee = page.getByRole('slider', { name: 'Finished knee' });
  const before = await knee.boundingBox();
  const client = await context.newCDPSession(page);
  const fingers = (apart: number) => [
    { x: 195 - apart, y: 220, id: 0 },
    { x: 195 + apart, y: 220, id: 1 },
  ];
  await client.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: fingers(30) });
  for (const apart of [40, 55, 70]) {
    await client.send('Input.dispatchTouchEvent', {
      type: 'touchMove',
      touchPoints: fingers(apart),
    });
  }
  await client.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
  await expect(async () => {
    expect((await knee.boundingBox())?.x).not.toBe(before?.x);
  }).toPass();
  await context.close();
});

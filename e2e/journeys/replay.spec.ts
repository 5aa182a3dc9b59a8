import AxeBuilder from '@axe-core/playwright';

import { expect, test } from '../fixtures/journey.ts';
import { tenMeasures } from '../fixtures/measures.ts';
import { pagesOf } from '../fixtures/pdf.ts';
import { replay } from '../screens/replay.ts';
import { styleScreen } from '../screens/style-card.ts';

const sizes = [
  { name: '390 px', width: 390, height: 844 },
  { name: '1280 px', width: 1280, height: 800 },
];

for (const { name, ...viewport } of sizes) {
  test.describe(`at ${name}`, () => {
    test.use({ viewport });

    test('from the table a draft is told step by step, and the address keeps the step', async ({
      page,
      drawnTable,
    }) => {
      await drawnTable.tab('Steps').click();
      await page.getByRole('link', { name: 'Replay' }).click();
      const told = replay(page);
      await expect(told.title).toHaveText('Levels · Side neck point');
      await expect(told.back).toBeDisabled();
      await told.forward.click();
      await expect(told.title).toContainText('Bust level');
      await expect(told.newLines).toHaveCount(1);
      await told.choose('Side seam');
      await expect(told.title).toHaveText('Front · Side seam');
      await expect(page).toHaveURL(/step=front%2Fside-seam/);
      await page.reload();
      await expect(told.title).toHaveText('Front · Side seam');
      await told.back.click();
      await told.forward.click();
      await expect(told.title).toHaveText('Front · Side seam');
      await told.choose('Allowances');
      await expect(told.drawing(/Allowances, \d+ pieces/)).toBeVisible();
      await expect(told.forward).toBeDisabled();
    });

    test('a number shows the measure it comes from, and why is told when asked', async ({
      page,
      drawnTable,
    }) => {
      await expect(drawnTable.drawing).toBeVisible();
      const told = replay(page);
      await told.open('/try/replay?step=front%2Fbust-line');
      await expect(told.title).toHaveText('Front · Bust line');
      await told.number('92.0 cm').focus();
      await expect(told.source).toHaveText('92.0 cm: Bust 92.0 cm (taken).');
      await told.number('23.0 cm').hover();
      await expect(told.source).toHaveText('23.0 cm: Worked out from Bust 92.0 cm (taken).');
      await expect(told.telling).not.toContainText('what the front gains');
      await told.why.click();
      await expect(told.telling).toContainText('what the front gains, the back gives');
      await page.getByRole('radio', { name: 'inch' }).check();
      await expect(told.number('36 1⁄4 in')).toBeVisible();
      await told.open('/try/replay?step=levels%2Fside-neck-point');
      await told.telling.getByRole('button').first().focus();
      await expect(told.source).toContainText('estimated: from the bust');
    });

    test('a learner’s own measures draw the same step beside it', async ({ page, drawnTable }) => {
      await expect(drawnTable.drawing).toBeVisible();
      const told = replay(page);
      await told.open('/try/replay?step=front%2Fbust-line');
      await told.openMeasures.click();
      await told.measures.getByRole('textbox').first().focus();
      for (const text of tenMeasures.centimetres.slice(0, 9)) {
        await page.keyboard.type(text);
        await page.keyboard.press('Enter');
      }
      await page.keyboard.type('nonsense');
      await expect(told.measures).toContainText('Drawn as soon as all ten are in.');
      await told.measures.getByRole('textbox').last().fill('104');
      await told.measures.getByRole('textbox').first().fill('96');
      await expect(told.measures).toContainText('✓ drawn beside');
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      await told.measures.getByRole('button', { name: 'To the drawing' }).click();
      await expect(told.number('92.0 cm')).toBeVisible();
      const narrow = viewport.width < 700;
      if (narrow) await page.getByRole('button', { name: 'My drawing' }).click();
      await expect(told.ownTelling).toBeVisible();
      await expect(told.number('96.0 cm')).toBeVisible();
      await expect(told.drawing(/^Your measures/)).toBeVisible();
      await expect(told.drawing(/^Tutor/)).toHaveCount(narrow ? 0 : 1);
      await page.reload();
      if (narrow) await page.getByRole('button', { name: 'My drawing' }).click();
      await expect(told.ownTelling).toBeVisible();
    });

    test('nothing axe knows is wrong, and nothing sticks out', async ({ page, drawnTable }) => {
      await expect(drawnTable.drawing).toBeVisible();
      const told = replay(page);
      for (const step of ['levels/hip-level', 'front/top-line', 'finishing/allowances']) {
        await told.open(`/try/replay?step=${encodeURIComponent(step)}`);
        await expect(told.title).toBeVisible();
        expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
        const wide = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
        expect(wide).toBe(0);
      }
    });
  });
}

test('keys and a pointer remote turn the steps, the space bar plays and pauses', async ({
  page,
  drawnTable,
}) => {
  await expect(drawnTable.drawing).toBeVisible();
  const told = replay(page);
  await told.open('/try/replay');
  await expect(told.title).toContainText('Side neck point');
  await page.keyboard.press('ArrowRight');
  await expect(told.title).toContainText('Bust level');
  await page.keyboard.press('PageDown');
  await expect(told.title).toContainText('Under-bust level');
  await page.keyboard.press('PageUp');
  await page.keyboard.press('ArrowLeft');
  await expect(told.title).toContainText('Side neck point');
  await page.keyboard.press('End');
  await expect(told.title).toContainText('Allowances');
  await page.keyboard.press('Home');
  await expect(told.title).toContainText('Side neck point');
  await page.getByRole('radio', { name: 'quick' }).check();
  await page.getByRole('radio', { name: 'quick' }).blur();
  await page.keyboard.press('Space');
  await expect(told.pause).toBeVisible();
  // A busy machine may be steps on by the time it is asked.
  await expect(told.title).not.toContainText('Side neck point', { timeout: 10_000 });
  await page.keyboard.press('Space');
  await expect(told.play).toBeVisible();
  await page.keyboard.press('Home');
  await page.keyboard.press('ArrowDown');
  await expect(told.title).toContainText('Bust level');
});

test.describe('on a projector, 1280 × 720', () => {
  test.use({ viewport: { width: 1280, height: 720 } });

  test('the drawing and the sentence alone, large enough for the back of a room', async ({
    page,
    drawnTable,
  }) => {
    await expect(drawnTable.drawing).toBeVisible();
    const told = replay(page);
    await told.open('/try/replay?step=front%2Ftop-line');
    await told.projector.click();
    await expect(told.leaveProjector).toBeVisible();
    await expect(page.getByRole('banner')).toHaveCount(0);
    const size = await told.telling
      .locator('p')
      .first()
      .evaluate((element) => Number.parseFloat(getComputedStyle(element).fontSize));
    // A thirtieth of the picture's height is read from eight times its height (common practice, no source).
    expect(size).toBeGreaterThanOrEqual(720 / 30);
    const drawing = await told.drawing(/Top line/).boundingBox();
    expect(drawing?.height).toBeGreaterThan(300);
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    await page.keyboard.press('PageDown');
    await expect(told.title).toContainText('Princess seam');
    await page.keyboard.press('Escape');
    await expect(told.projector).toBeVisible();
  });
});

test.describe('where motion is unwanted', () => {
  test.use({ contextOptions: { reducedMotion: 'reduce' } });

  test('lines stand there at once', async ({ page, drawnTable }) => {
    await expect(drawnTable.drawing).toBeVisible();
    const told = replay(page);
    await told.open('/try/replay?step=front%2Ftop-line');
    await expect(told.newLines).toHaveCount(2);
    const names = await told.newLines.evaluateAll((paths) =>
      paths.map((path) => getComputedStyle(path).animationName),
    );
    expect(names).toEqual(['none', 'none']);
  });
});

test('a block is told like a gown', async ({ page, drawnTable }) => {
  const style = styleScreen(drawnTable);
  await style.show();
  await style.option('Garment', 'bodice block').check();
  await drawnTable.tab('Steps').click();
  await page.getByRole('link', { name: 'Replay' }).click();
  const told = replay(page);
  await told.choose('Bust dart');
  await expect(told.title).toHaveText('Front · Bust dart');
  await expect(told.newLines).toHaveCount(3);
  await told.choose('Allowances');
  await expect(told.drawing(/Allowances, 2 pieces/)).toBeVisible();
});

test('the worksheet is a file of several pages', async ({ page, drawnTable }) => {
  await expect(drawnTable.drawing).toBeVisible();
  const told = replay(page);
  await told.open('/try/replay');
  const download = page.waitForEvent('download');
  await told.worksheet.click();
  const file = await download;
  expect(file.suggestedFilename()).toMatch(/worksheet.*\.pdf$/i);
  expect(await pagesOf(file)).toBeGreaterThan(5);
});

test('without a draft there is nothing to tell, and the way to the table', async ({ page }) => {
  await page.goto('/try/replay');
  await expect(page.getByRole('heading', { name: 'Nothing is drawn yet' })).toBeVisible();
  await page.getByRole('link', { name: 'To the drafting table' }).click();
  await expect(page).toHaveURL(/\/try$/);
});

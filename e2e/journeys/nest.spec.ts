import { readFile } from 'node:fs/promises';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';
import { faultsOn, sidewaysOn } from '../fixtures/page-faults.ts';
import { pagesOf } from '../fixtures/pdf.ts';
import { screens } from '../fixtures/screens.ts';

for (const { name, width, height } of screens) {
  test(`on a ${name}: a gown is stepped into a nest by rules of the maker’s own`, async ({
    page,
    maker,
  }) => {
    await page.setViewportSize({ width, height });
    await page.emulateMedia({ reducedMotion: 'reduce' });
    await page.goto('/gowns');
    await page.getByRole('link', { name: 'Nest: Evening gown' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Nest of sizes' })).toBeVisible();
    expect(page.url()).toContain(maker.gownId);
    await expect(page.getByRole('img', { name: '6 sizes over each other' })).toBeVisible();
    const bust = page
      .getByRole('group', { name: 'Finished girths' })
      .getByRole('row', { name: /^bust/i });
    await expect(bust.getByRole('cell')).toHaveText([
      '84.00',
      '88.00',
      '92.00',
      '96.00',
      '100.00',
      '104.00',
    ]);

    // A step of her own; what cannot be read stays as it was typed.
    const step = page.locator('input[name="gradeRules.bustGirth"]');
    await step.fill('five');
    await expect(page.getByText(/not a unit known here/)).toBeVisible();
    await expect(step).toHaveValue('five');
    await step.fill('5');
    await expect(bust.getByRole('cell').first()).toHaveText('82.00');
    await page.reload();
    await expect(step).toHaveValue('5');
    await page.getByRole('button', { name: 'Back to the starter set' }).click();
    await expect(bust.getByRole('cell').first()).toHaveText('84.00');

    await page.getByLabel('Sizes smaller').selectOption('0');
    await expect(page.getByRole('img', { name: '4 sizes over each other' })).toBeVisible();
    await page.getByLabel('+3', { exact: true }).uncheck();
    await expect(page.getByRole('img', { name: '3 sizes over each other' })).toBeVisible();
    await page.getByText(/^Points off the straight line/).click();
    expect(await page.evaluate(() => document.getAnimations().length)).toBe(0);
    expect(await faultsOn(page)).toEqual([]);
    expect(await sidewaysOn(page)).toBe(0);
  });
}

test('a nest is kept as SVG with a group a size, and printed', async ({ page, maker }) => {
  await page.goto(`/gowns/${maker.gownId}/nest`);
  await page.getByText('Keep or print').click();
  const svg = page.waitForEvent('download');
  await page.getByRole('button', { name: /SVG/ }).click();
  const text = await readFile(await (await svg).path(), 'utf8');
  for (const size of ['\u22122', 'base', '+3']) expect(text).toContain(`data-size="${size}"`);
  const button = page.getByRole('button', { name: /quarter scale: \d+ sheets?/ });
  await expect(button).toBeVisible();
  const pdf = page.waitForEvent('download');
  await button.click();
  expect(await pagesOf(await pdf)).toBeGreaterThan(2);
});

test('a size that no body could have is named, by keyboard alone', async ({ page, maker }) => {
  await page.goto(`/gowns/${maker.gownId}/nest`);
  const waist = page.locator('input[name="gradeRules.waistGirth"]');
  await expect(waist).toBeVisible();
  await walkTo(page, waist);
  await page.keyboard.type('9.9');
  await page.keyboard.press('Enter');
  await expect(page.getByText(/cannot be drawn/).first()).toBeVisible();
});

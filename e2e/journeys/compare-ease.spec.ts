import { readFile } from 'node:fs/promises';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';
import { faultsOn, sidewaysOn } from '../fixtures/page-faults.ts';
import { pagesOf } from '../fixtures/pdf.ts';
import { screens } from '../fixtures/screens.ts';

for (const { name, width, height } of screens) {
  test(`on a ${name}: the gown over itself without ease, figure by figure`, async ({
    page,
    maker,
  }) => {
    await page.setViewportSize({ width, height });
    await page.emulateMedia({ reducedMotion: 'reduce' });
    await page.goto('/gowns');
    await page.getByRole('link', { name: 'Compare: Evening gown' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Compare' })).toBeVisible();
    expect(page.url()).toContain(maker.gownId);

    await expect(page.getByRole('img', { name: /over each other/ })).toBeVisible();
    // The gown is cut 20 wider than the hip, 10 narrower than the waist, 20 narrower than the chest.
    const girths = page.getByRole('group', { name: 'Finished girths' });
    await expect(girths.getByRole('row', { name: /^Hip/ })).toContainText('100.00');
    await expect(girths.getByRole('row', { name: /^Hip/ })).toContainText('−2.00');
    await expect(girths.getByRole('row', { name: /^Waist 7/ })).toContainText('+1.00');
    await expect(girths.getByRole('row', { name: /^Chest/ })).toContainText('+2.00');
    await expect(girths.getByRole('row', { name: /^Bust/ })).toHaveCount(0);
    await page.getByLabel('Also what is the same in both').check();
    await expect(girths.getByRole('row', { name: /^Bust/ })).toContainText('0');
    // 100 cm are 39.37 in; read as a tape has it, and remembered at the next place.
    await page.getByRole('radio', { name: 'inch' }).check();
    await expect(girths.getByRole('row', { name: /^Hip/ })).toContainText(/39\s3⁄8/);
    await page.reload();
    await expect(page.getByRole('radio', { name: 'inch' })).toBeChecked();
    await page.getByRole('radio', { name: 'cm' }).check();
    await page.reload();
    await expect(page.getByRole('radio', { name: 'cm' })).toBeChecked();

    await page.getByLabel('Laid together on').selectOption('Side at the hip');
    await page.getByLabel('Laid together on').selectOption('Seam: side');
    await page.getByLabel('Piece', { exact: true }).selectOption('Front skirt');
    const slider = page.getByRole('slider');
    await slider.focus();
    await page.keyboard.press('ArrowRight');
    await expect(slider).toHaveAttribute('aria-valuetext', '1 per cent of the way');
    await expect(page.getByText('on its way from one to the other')).toBeVisible();
    expect(await page.evaluate(() => document.getAnimations().length)).toBe(0);
    expect(await faultsOn(page)).toEqual([]);
    expect(await sidewaysOn(page)).toBe(0);

    for (const [label, title] of [
      ['The same: by the quarter rule', 'by the quarter rule'],
      ['The same: top line: straight', 'top line: straight'],
    ] as const) {
      await page.getByLabel('Second draft').selectOption(label);
      await expect(page.getByRole('img', { name: new RegExp(`${title}, dashed`) })).toBeVisible();
    }
  });
}

test('what lies there is kept as SVG, and printed at a quarter of the scale', async ({
  page,
  maker,
}) => {
  await page.goto(`/compare?first=gown:${maker.gownId}`);
  await page.getByText('Keep or print').click();
  const svg = page.waitForEvent('download');
  await page.getByRole('button', { name: /SVG/ }).click();
  const text = await readFile(await (await svg).path(), 'utf8');
  expect(text).toContain('class="pair"');
  expect(text).toContain('hip ');
  const button = page.getByRole('button', { name: /quarter scale: \d+ sheets?/ });
  await expect(button).toBeVisible();
  const counted = Number(/: (\d+) sheet/.exec((await button.textContent()) ?? '')?.[1]);
  const pdf = page.waitForEvent('download');
  await button.click();
  // The key and the figures go before the sheets.
  expect(await pagesOf(await pdf)).toBeGreaterThanOrEqual(counted + 2);
});

test('without an account two samples are compared by keyboard alone', async ({ page }) => {
  await page.goto('/compare');
  const second = page.getByLabel('Second draft');
  await expect(page.getByRole('img', { name: /over each other/ })).toBeVisible();
  await walkTo(page, second);
  const before = await second.inputValue();
  await page.keyboard.press('ArrowDown');
  await expect(second).not.toHaveValue(before);
  const slider = page.getByRole('slider');
  await walkTo(page, slider);
  await page.keyboard.press('End');
  await expect(slider).toHaveAttribute('aria-valuetext', '100 per cent of the way');
  await walkTo(page, page.getByText('Keep or print'));
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: /SVG/ })).toBeVisible();
});

test('blocks are compared as gowns are, with the dart in another seam', async ({ page }) => {
  await page.goto('/compare?garment=bodice-block&second=same:dart-side');
  await expect(page.getByRole('img', { name: /bust dart in the side, dashed/ })).toBeVisible();
  await page.getByLabel('Garment').selectOption('Skirt block');
  await expect(page.getByRole('img', { name: /with the least ease, dashed/ })).toBeVisible();
  await expect(
    page.getByRole('group', { name: 'Finished girths' }).getByRole('row', { name: /^Hip/ }),
  ).toContainText('−2.00');
});

test('a gown that is not there is said to be missing, and another can be chosen', async ({
  page,
}) => {
  await page.goto('/compare?first=gown:00000000-0000-4000-8000-000000000000');
  await expect(page.getByRole('alert').first()).toBeVisible();
  await page.getByLabel('First draft').selectOption({ index: 1 });
  await expect(page.getByRole('img', { name: /over each other/ })).toBeVisible();
});

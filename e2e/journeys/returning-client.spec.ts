import type { Page } from '@playwright/test';

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';
import { tenMeasures } from '../fixtures/measures.ts';
import { faultsOn, sidewaysOn } from '../fixtures/page-faults.ts';
import { screens } from '../fixtures/screens.ts';

const saved = (page: Page) => expect(page.locator('[data-standing="saved"]')).toBeVisible();

/** Types the ten measures into an open card, Enter after each. */
async function measure(page: Page): Promise<void> {
  await page.locator('input[name="card.bustGirth"]').focus();
  for (const text of tenMeasures.centimetres) {
    await page.keyboard.type(text);
    await page.keyboard.press('Enter');
  }
  await saved(page);
}

for (const { name, width, height } of screens) {
  test(`on a ${name}: a client comes back a year later`, async ({ page, maker }) => {
    test.setTimeout(120_000);
    expect(maker.email).not.toBe('');
    await page.setViewportSize({ width, height });
    await page.emulateMedia({ reducedMotion: 'reduce' });

    // The first visit: on the list, measured, and a gown begun from the card.
    await page.goto('/clients');
    await page.getByLabel('Name of a new client').fill('Tilda Rehm');
    await page.getByRole('button', { name: 'Put on the list' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Tilda Rehm' })).toBeVisible();
    const client = page.url();
    await page.getByLabel('Measured on').fill('2025-11-20');
    await page.getByRole('button', { name: 'New measure card' }).click();
    await measure(page);
    await page.goto(client);
    await expect(page.getByRole('link', { name: '20 November 2025' })).toBeVisible();
    expect(await faultsOn(page)).toEqual([]);
    expect(await sidewaysOn(page)).toBe(0);
    await page.getByRole('button', { name: 'Begin a gown from it' }).click();
    await expect(page.getByRole('textbox', { name: 'Name of the gown' })).toHaveValue(
      'Gown for Tilda Rehm',
    );
    const gown = page.url();

    // A year later: the card she was drawn from stays, the next one starts from it.
    await page.goto(client);
    await expect(page.getByText('Stays as it is: “Gown for Tilda Rehm”')).toBeVisible();
    await page.getByRole('button', { name: 'Start the next card from it' }).click();
    await page.getByLabel('Measured on').last().fill('2026-11-21');
    await page.getByRole('button', { name: 'Copy it for that day' }).click();
    const waist = page.locator('input[name="card.waistGirth"]');
    await expect(waist).toHaveValue('72.0');
    await waist.fill('75');
    await page.locator('input[name="card.hipGirth"]').fill('100');
    await page.keyboard.press('Enter');
    await saved(page);

    // What moved, and which measure moved it.
    await page.goto(client);
    await page.getByRole('link', { name: 'Regrade for the card of 21 November 2026' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Regrade' })).toBeVisible();
    await expect(page.getByText('Waist: 72.0 cm → 75.0 cm')).toBeVisible();
    const girths = page.getByRole('group', { name: 'Finished girths' }).first();
    await expect(girths.getByRole('row', { name: /^Waist 7/ })).toContainText('+3.00');
    await expect(girths.getByRole('row', { name: /^Waist 7/ })).toContainText('waist +3.00');
    await expect(girths.getByRole('row', { name: /^Hip/ })).toContainText('hip +2.00');
    await expect(page.getByRole('img', { name: /as it was, solid/ })).toBeVisible();
    expect(await faultsOn(page)).toEqual([]);
    expect(await sidewaysOn(page)).toBe(0);
    await page.getByRole('button', { name: 'Keep as a new revision' }).click();
    await expect(page.getByText('the gown as it was is kept as well')).toBeVisible();

    // On to paper; and both states are among the revisions.
    await page.getByRole('link', { name: 'Print it' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText(/print/i);
    await page.goto(gown);
    await page.getByRole('button', { name: 'Revisions' }).click();
    const revisions = page.getByRole('dialog', { name: 'Revisions' });
    await expect(
      revisions.getByRole('button', { name: /^For the card of 21 November 2026/ }),
    ).toBeVisible();
    await expect(
      revisions.getByRole('button', { name: /^Before the card of 21 November 2026/ }),
    ).toBeVisible();
  });
}

test('a card that a gown was drawn from is only read', async ({ page, maker }) => {
  expect(maker.email).not.toBe('');
  await page.goto('/clients');
  await page.getByLabel('Name of a new client').fill('Ida Brandt');
  await page.getByLabel('Name of a new client').press('Enter');
  await page.getByRole('button', { name: 'New measure card' }).click();
  await measure(page);
  const card = page.url();
  await page.goto('/clients');
  await page.getByRole('link', { name: 'Ida Brandt' }).click();
  await page.getByRole('button', { name: 'Begin a gown from it' }).click();
  await expect(page.getByRole('textbox', { name: 'Name of the gown' })).toBeVisible();
  await page.goto(card);
  await expect(page.getByText('Stays as it is')).toBeVisible();
  await expect(page.getByRole('row', { name: 'Waist 72.0 cm' })).toBeVisible();
  await expect(page.locator('input[name="card.waistGirth"]')).toHaveCount(0);
  expect(await faultsOn(page)).toEqual([]);
});

test('a person is deleted by keyboard, after what goes was named', async ({ page, maker }) => {
  expect(maker.email).not.toBe('');
  await page.goto('/clients');
  await walkTo(page, page.getByLabel('Name of a new client'));
  await page.keyboard.type('Runa Falk');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name: 'Runa Falk' })).toBeVisible();
  const client = page.url();
  await page.getByRole('button', { name: 'New measure card' }).click();
  await saved(page);
  await page.goto(client);
  await expect(page.getByRole('link', { name: /^\d+ \w+ \d{4}$/ })).toBeVisible();
  await walkTo(page, page.getByRole('button', { name: 'Delete Runa Falk' }));
  await page.keyboard.press('Enter');
  const dialog = page.getByRole('dialog', { name: 'Delete Runa Falk?' });
  await expect(dialog).toContainText('measure card “Card of');
  expect(await faultsOn(page)).toEqual([]);
  await walkTo(page, dialog.getByRole('button', { name: 'Delete all of it' }));
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/clients$/);
  await expect(page.getByRole('link', { name: 'Runa Falk' })).toHaveCount(0);
});

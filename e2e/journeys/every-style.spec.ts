import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';

import { choiceWords, type OptionWords } from '#shared/drafts/gown/choice-words.ts';

import { expect, test } from '../fixtures/maker.ts';
import { styleScreen, type StyleScreen } from '../screens/style-card.ts';

const choices = Object.values(choiceWords).map(({ label, options }) => ({
  label,
  options: Object.values<OptionWords>(options),
}));

const faults = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations;

/** Walks a choice by its arrow keys: every option is told in its sentence, and drawn. */
async function walk(style: StyleScreen, label: string, options: readonly OptionWords[]) {
  for (const [index, { word, says }] of options.entries()) {
    if (index > 0) await style.page.keyboard.press('ArrowRight');
    else await style.option(label, word).focus();
    await expect(style.option(label, word)).toBeChecked();
    await expect(style.choice(label).getByText(says)).toBeVisible();
    await expect(style.stale, `${label}: ${word}`).toHaveCount(0);
  }
  // From the last on to the first: a group goes round.
  await style.page.keyboard.press('ArrowRight');
  await expect(style.option(label, options[0]?.word ?? '')).toBeChecked();
}

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('every style is chosen by arrow keys at the trial table, told and drawn', async ({
      page,
      drawnTable,
    }) => {
      test.slow();
      const style = styleScreen(drawnTable);
      await style.show();
      for (const { label, options } of choices) await walk(style, label, options);
      expect(await faults(page)).toEqual([]);
    });

    test('only the figures of what is chosen are asked for', async ({ drawnTable }) => {
      const style = styleScreen(drawnTable);
      await style.show();
      const figures: readonly (readonly [string, string, string])[] = [
        ['Sleeve', 'pleated band', 'pleatRatio'],
        ['Flare', 'A-line', 'hemSweep'],
        ['Cloth', 'stretch', 'stretch'],
      ];
      for (const [label, word, key] of figures) {
        await expect(style.field(`style.${key}`)).toHaveCount(0);
        await style.option(label, word).check();
        await expect(style.field(`style.${key}`)).toBeVisible();
      }
      await style.option('Top line', 'straight').check();
      await expect(style.field('style.neckDepth')).toHaveCount(0);
      await style.option('Waist seam', 'natural').check();
      await expect(style.field('style.waistSeamRise')).toHaveCount(0);
    });

    test('a combination that cannot be drawn offers the nearest that can', async ({
      page,
      drawnTable,
    }) => {
      const style = styleScreen(drawnTable);
      await style.show('Measures');
      await style.field('card.bustGirth').fill('98');
      await style.field('card.bustGirth').blur();
      await style.show();
      await style.option('Shaping', 'darts').check();
      await expect(style.stale).toBeVisible();
      await expect(style.choice('Shaping')).toContainText('Choose the princess seam.');
      const wayOut = page.getByRole('button', { name: 'Shaping: take princess' });
      await expect(wayOut).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await wayOut.click();
      await expect(style.stale).toHaveCount(0);
      await expect(style.option('Shaping', 'princess')).toBeChecked();
    });

    test('house rules of one’s own go with the gown, and a preset takes them back', async ({
      page,
      drawnTable,
    }) => {
      const style = styleScreen(drawnTable);
      await style.show();
      await style.option('House rules', 'own').check();
      await style.field('rules.allowance.side').fill('3');
      await style.option('Dart intakes', 'given outright').check();
      await expect(style.field('rules.intakes.waist')).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await page.reload();
      await style.show();
      await expect(style.option('House rules', 'own')).toBeChecked();
      await expect(style.field('rules.allowance.side')).toHaveValue('3.0');
      await style.option('House rules', 'quarter rule').check();
      await expect(style.field('rules.allowance.side')).toHaveCount(0);
      await expect(style.stale).toHaveCount(0);
    });

    test('every style is saved with a kept gown, and lies there when it is opened again', async ({
      page,
      gown,
    }) => {
      test.slow();
      const style = styleScreen(gown);
      await style.show();
      for (const { label, options } of choices) {
        const last = options.at(-1)?.word ?? '';
        await style.option(label, last).check();
        await expect(gown.standing('saved')).toBeVisible();
        await page.reload();
        await expect(gown.drawing).toBeVisible();
        await style.show();
        await expect(style.option(label, last)).toBeChecked();
        await expect(style.stale, `${label}: ${last}`).toHaveCount(0);
        await style.option(label, options[0]?.word ?? '').check();
      }
      await expect(gown.standing('saved')).toBeVisible();
      expect(await faults(page)).toEqual([]);
    });
  });
}

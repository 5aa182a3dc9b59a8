/**
 * Pictures of every screen in every width and theme, to be looked at: E2E_URL=… npx tsx e2e/shots.ts
 * writes test-results/shots/.
 */
import { chromium, type Page } from '@playwright/test';

import { tenMeasures } from './fixtures/measures.ts';
import { ownScenes } from './own-shots.ts';
import { draftingTable } from './screens/drafting-table.ts';
import { printRoom } from './screens/print-room.ts';

const address = process.env['E2E_URL'] ?? 'http://127.0.0.1:4173';
const folder = 'test-results/shots';
const widths = [390, 1280, 1920];
const heights: Record<number, number> = { 390: 844, 1280: 800, 1920: 1080 };

const browser = await chromium.launch({
  executablePath: '/usr/bin/chromium',
  args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
});

async function scenes(page: Page, keep: (name: string) => Promise<void>): Promise<void> {
  const table = draftingTable(page);
  await page.goto('/');
  await page.waitForLoadState('networkidle');
  await keep('landing');
  await table.open();
  await table.start.waitFor();
  await page.waitForLoadState('networkidle');
  await keep('empty');
  await table.start.click();
  await table.typeOn(['Anna', ...tenMeasures.centimetres]);
  await table.drawing.waitFor();
  await table.field('card.bustSpan').focus();
  await keep('table');
  await table.tab('Proof').click();
  await table.drawing.press('n');
  await keep('proof');
  await table.tab('Steps').click();
  await table.panel.getByRole('button', { name: 'Bust line' }).first().click();
  await keep('steps');
  await table.tab('Pieces').click();
  await keep('pieces');
  await table.print.click();
  await keep('print');
  await page.goto('/try/print');
  const room = printRoom(page);
  await room.arranged();
  await room.sheet('A1').click();
  await keep('print-room');
}

for (const width of widths) {
  for (const colorScheme of ['light', 'dark'] as const) {
    const context = await browser.newContext({
      viewport: { width, height: heights[width] ?? 900 },
      colorScheme,
      baseURL: address,
      locale: 'en-GB',
      hasTouch: width < 500,
    });
    const page = await context.newPage();
    const keep = async (name: string) => {
      await page.waitForTimeout(250);
      await page.screenshot({ path: `${folder}/${name}-${width}-${colorScheme}.png` });
    };
    await scenes(page, keep);
    await page.evaluate(() => localStorage.clear());
    await ownScenes(page, (name) => keep(`own-${name}`));
    await context.close();
  }
}
await browser.close();

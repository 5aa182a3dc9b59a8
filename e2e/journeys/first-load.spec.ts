import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

import type { Page } from '@playwright/test';

import { expect, test } from '../fixtures/journey.ts';

/** Scripts a page fetches until it is still. */
async function scriptsOf(page: Page, path: string): Promise<Map<string, Buffer>> {
  const scripts = new Map<string, Buffer>();
  page.on('response', async (response) => {
    if (response.request().resourceType() === 'script') {
      scripts.set(new URL(response.url()).pathname, await response.body());
    }
  });
  await page.goto(path, { waitUntil: 'networkidle' });
  return scripts;
}

test('the front page needs at most 130 KiB of script, and nothing of the drafting table', async ({
  page,
}) => {
  const scripts = await scriptsOf(page, '/');
  const bytes = [...scripts.values()].reduce((sum, body) => sum + gzipSync(body).length, 0);
  expect(bytes).toBeGreaterThan(10 * 1024);
  expect(bytes).toBeLessThanOrEqual(130 * 1024);
  for (const body of scripts.values()) {
    expect(body.toString()).not.toMatch(/PaperScope|ZodError|QueryClient|sideNeckToBustPoint/);
  }
});

test('the drafting table does bring paper and the engine', async ({ page }) => {
  const code = [...(await scriptsOf(page, '/try')).values()].map(String).join('');
  expect(code).toMatch(/PaperScope/);
  expect(code).toMatch(/sideNeckToBustPoint/);
});

test('no script of the screens carries PDF code', () => {
  const folder = join(import.meta.dirname, '../../dist/client/assets');
  const scripts = readdirSync(folder).filter((name) => name.endsWith('.js'));
  expect(scripts.length).toBeGreaterThan(2);
  for (const name of scripts) {
    expect(readFileSync(join(folder, name), 'utf8')).not.toMatch(/PDFDocument|FlateDecode|fontkit/);
  }
});

import { chromium, type Page } from '@playwright/test';
import { preview } from 'vite';
import { coreMeasures } from '#shared/body/card.ts';
import { sampleCards } from '#shared/body/sample-cards.ts';

/** One line of the benchmark's report. */
export type BrowserBench = {
  readonly name: string;
  readonly median: number;
  readonly p95: number;
  readonly unit: 'ms';
  readonly against: string;
  /** Median as a part of what it is held against. */
  readonly ratio: number;
};

/** One frame of a screen that is drawn 60 times a second. */
const frame = 1000 / 60;
const slowdown = 4;
const warmUp = 30;
const rounds = 80;

/**
 * Time from a typed figure to the drawing on the canvas (draft, finishing, proof, React and paper), on
 * the built screens with the processor slowed down four times. Needs `dist/client`.
 */
export async function benchBrowser(): Promise<BrowserBench> {
  const screens = await preview({
    preview: { port: 0, host: '127.0.0.1' },
    logLevel: 'silent',
  });
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
  });
  try {
    const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
    await layOut(page, screens.resolvedUrls?.local[0] ?? '');
    const devtools = await page.context().newCDPSession(page);
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowdown });
    const times = (await redraws(page)).slice(warmUp).sort((a, b) => a - b);
    const at = (share: number): number => times[Math.floor((times.length - 1) * share)] ?? 0;
    return {
      name: `full redraw in the browser at ${slowdown}x CPU slowdown`,
      median: round(at(0.5)),
      p95: round(at(0.95)),
      unit: 'ms',
      against: 'one frame at 60 Hz',
      ratio: round(at(0.5) / frame),
    };
  } finally {
    await browser.close();
    await screens.close();
  }
}

const round = (value: number): number => Math.round(value * 100) / 100;

/** Opens the table on a drawing that the browser had kept. */
export async function layOut(page: Page, address: string): Promise<void> {
  const entries = Object.fromEntries(
    coreMeasures.map((key) => [`card.${key}`, { value: sampleCards.judith[key] }]),
  );
  await page.addInitScript((kept) => localStorage.setItem('ellwand.table', JSON.stringify(kept)), {
    version: 1,
    unit: 'cm',
    entries,
  });
  await page.goto(new URL('/try', address).href);
  await page.getByRole('group', { name: 'Drawing of the pieces' }).waitFor();
}

/** Types another finished knee again and again; React commits what is typed before its microtask ends. */
const redraws = (page: Page): Promise<number[]> =>
  page.evaluate(async (count) => {
    const field = document.querySelector<HTMLInputElement>('input[name="style.kneeFinished"]');
    if (field === null) throw new Error('the style card is not there');
    const times: number[] = [];
    for (let round = 0; round < count; round += 1) {
      // Set past React's own setter on the element, as typing does.
      Reflect.set(HTMLInputElement.prototype, 'value', String(80 + (round % 20) / 2), field);
      const start = performance.now();
      field.dispatchEvent(new InputEvent('input', { bubbles: true }));
      await Promise.resolve();
      times.push(performance.now() - start);
      await new Promise((done) => setTimeout(done, 120));
    }
    return times;
  }, warmUp + rounds);

import { bundle } from '../support/bundle.ts';
import { benchBrowser } from './browser.ts';
import { benchDrag } from './drag.ts';
import { benchPdf } from './pdf.ts';
import type { Measured } from './redraw.ts';
import type { SheetBench } from './sheets.ts';

/*
 * `npm run bench`: one JSON object a line. What runs in Node alone is bundled first, as it ships: run
 * from its sources through tsx it would carry tsx's wrappers.
 */

type RedrawBench = { readonly benchRedraw: () => Promise<readonly Measured[]> };

type OverlaysBench = { readonly benchOverlays: () => readonly Measured[] };

type ReplayBench = { readonly benchReplay: () => readonly Measured[] };

type SheetsBench = { readonly benchSheets: () => readonly SheetBench[] };

/** The bundle exports what its source does. */
const asRedrawBench = (loaded: unknown): RedrawBench => loaded as RedrawBench;
const asOverlaysBench = (loaded: unknown): OverlaysBench => loaded as OverlaysBench;
const asReplayBench = (loaded: unknown): ReplayBench => loaded as ReplayBench;
const asSheetsBench = (loaded: unknown): SheetsBench => loaded as SheetsBench;

const write = (lines: readonly object[]): void => {
  for (const line of lines) process.stdout.write(`${JSON.stringify(line)}\n`);
};

const redraw = asRedrawBench(await import(await bundle(new URL('redraw.ts', import.meta.url))));
write(await redraw.benchRedraw());
write(await benchPdf());
const overlays = asOverlaysBench(
  await import(await bundle(new URL('overlays.ts', import.meta.url))),
);
write(overlays.benchOverlays());
const replay = asReplayBench(await import(await bundle(new URL('lesson.ts', import.meta.url))));
write(replay.benchReplay());
const sheets = asSheetsBench(await import(await bundle(new URL('sheets.ts', import.meta.url))));
write(sheets.benchSheets());
write([await benchBrowser(), await benchDrag()]);

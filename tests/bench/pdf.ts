import { execFile, execFileSync } from 'node:child_process';
import { mkdtemp, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { pdfBytes } from '#server/features/print/pdf-document.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { labelFacts } from '#shared/engine/label-facts.ts';
import type { PrintJob } from '#shared/exports/drawing.ts';
import { placedLabels } from '#shared/exports/placed-labels.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { drawnPieces } from '#shared/sheets/drawn-pieces.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { middleBody } from '../support/middle-body.ts';
import { embedPdfRoute, largePage } from './embed-pdf-route.ts';

/** One line of the benchmark's report. */
export type PdfBench = {
  readonly name: string;
  readonly median: number;
  readonly p95: number;
  readonly unit: 'ms' | 'bytes';
  readonly against: string;
  /** Ours as a part of what it is held against, medians. */
  readonly ratio: number;
};

const warmUp = 10;
const rounds = 30;
const order = presetOrder('A4', 'whole-gown');

type Taken = { readonly median: number; readonly p95: number };

const spread = (times: readonly number[]): Taken => {
  const sorted = [...times].sort((a, b) => a - b);
  const at = (share: number): number => sorted[Math.floor((sorted.length - 1) * share)] ?? 0;
  return { median: at(0.5), p95: at(0.95) };
};

const round = (value: number): number => Math.round(value * 100) / 100;

/** Runs several routes in turn, so that whatever slows the machine slows all of them. */
async function inTurn(
  routes: readonly (() => Promise<unknown>)[],
  warm: number,
  times: number,
): Promise<readonly Taken[]> {
  const taken = routes.map((): number[] => []);
  for (let i = 0; i < warm + times; i += 1) {
    for (const [which, route] of routes.entries()) {
      const start = performance.now();
      await route();
      if (i >= warm) taken[which]?.push(performance.now() - start);
    }
  }
  return taken.map(spread);
}

const lines = (
  what: string,
  against: string,
  [ours, theirs]: readonly [Taken, Taken],
  [ownBytes, otherBytes]: readonly [number, number],
): readonly PdfBench[] => [
  {
    name: `${what}, time`,
    median: round(ours.median),
    p95: round(ours.p95),
    unit: 'ms',
    against: `${against}: ${round(theirs.median)} ms`,
    ratio: round(ours.median / theirs.median),
  },
  {
    name: `${what}, size`,
    median: ownBytes,
    p95: ownBytes,
    unit: 'bytes',
    against: `${against}: ${otherBytes} bytes`,
    ratio: round(ownBytes / otherBytes),
  },
];

function hasPdfposter(): boolean {
  try {
    execFileSync('pdfposter', ['--version'], { stdio: 'ignore' });
    return true;
  } catch {
    return false;
  }
}

const none: Taken = { median: 0, p95: 0 };

async function besidePdfposter(
  job: PrintJob,
  large: Uint8Array,
  what: string,
): Promise<readonly PdfBench[]> {
  const run = promisify(execFile);
  const folder = await mkdtemp(join(tmpdir(), 'ellwand-bench-'));
  try {
    const [from, to] = [join(folder, 'large.pdf'), join(folder, 'poster.pdf')];
    await writeFile(from, large);
    const poster = () => run('pdfposter', ['-m', '190x277mm', '-s', '1', from, to]);
    const [ours = none, theirs = none] = await inTurn([() => pdfBytes(job), poster], 1, 7);
    const { size } = await stat(to);
    const own = (await pdfBytes(job)).length;
    return lines(
      what,
      'pdfposter, its whole process, without sheet names or glue marks',
      [ours, theirs],
      [own, size],
    );
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/**
 * The demo gown's tiles as PDF beside pdf-lib's embedPdf route and Debian's pdfposter: same drawing,
 * text and typeface, without the cover, in the same run.
 */
export async function benchPdf(): Promise<readonly PdfBench[]> {
  const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
  const sheets = planSheets(draft.pieces, order);
  const whole = tilesJob(draft, order, 'cm');
  const drawn = new Map(drawnPieces(draft.pieces, order).map((each) => [each.drawing, each]));
  const labels = placedLabels(
    sheets,
    drawn,
    labelFacts('gown', middleBody, draft.number, balanced),
  );
  const job: PrintJob = { ...whole, pages: whole.pages.slice(1) };
  const what = `PDF of the demo gown, ${job.pages.length} A4 tiles`;
  const ours = () => pdfBytes(job);
  const theirs = () => embedPdfRoute(job, sheets);
  const [own = none, other = none] = await inTurn([ours, theirs], warmUp, rounds);
  const beside = lines(
    what,
    'pdf-lib embedPdf',
    [own, other],
    [(await ours()).length, (await theirs()).length],
  );
  if (!hasPdfposter()) {
    process.stderr.write(
      'pdfposter is not installed (Debian package pdfposter): its comparison is left out.\n',
    );
    return beside;
  }
  return [...beside, ...(await besidePdfposter(job, await largePage(job, sheets, labels), what))];
}

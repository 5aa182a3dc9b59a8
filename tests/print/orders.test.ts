import { PDFDocument } from 'pdf-lib';
import { describe, expect, it } from 'vitest';
import { tilesPdf } from '#server/features/print/tiles-pdf.ts';
import { paperOf, toPoints } from '#shared/sheets/papers.ts';
import { type PrintOrder, plainOrder, sheetNames } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { paperDraft } from '../support/paper-draft.ts';
import { oblong } from '../support/paper-pieces.ts';
import { inkIn, inspect, renderPart } from '../support/pgm.ts';

const pieces = [
  oblong('front', 300, 500),
  oblong('back', 240, 480),
  oblong('flare-front', 600, 500, { part: 'flare' }),
];
const draft = paperDraft(pieces);
const print = (change: Partial<PrintOrder>) => tilesPdf(draft, { ...plainOrder, ...change }, 'in');

const orders: readonly (readonly [string, Partial<PrintOrder>])[] = [
  ...sheetNames.map((paper) => [paper, { paper }] as const),
  ['lying, ink saved', { orientation: 'landscape', inkSaving: true }],
  ['custom paper', { paper: { width: 320, height: 500 }, margin: 5, overlap: 25 }],
  ['half scale', { scale: 0.5 }],
  ['finished line alone', { lines: 'finished', glueMarks: false }],
  [
    'pieces one by one',
    {
      pieces: [
        { piece: 'front', copies: 1, how: 'opened out' },
        { piece: 'back', copies: 2, how: 'drawn once' },
      ],
    },
  ],
  ['sheets left out', { leftOut: ['A1', 'B2'] }],
];

describe.each(orders)('an order: %s', (_, change) => {
  let made: Promise<Uint8Array> | undefined;
  const printedOnce = () => (made ??= print(change));

  it('is a file that an independent reader has no complaint about, its typeface in it', async () => {
    const pdf = await printedOnce();
    expect(await inspect(pdf, 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
    const fonts = (await inspect(pdf, 'pdffonts')).trim().split('\n').slice(2);
    expect(fonts.length).toBeGreaterThan(0);
    for (const each of fonts) expect(each).toMatch(/yes yes yes/u);
  });

  it('has as many sheets as its plan, of its paper, to be printed unscaled', async () => {
    const pdf = await PDFDocument.load(await printedOnce());
    const { sheets, plan } = planSheets(pieces, { ...plainOrder, ...change });
    expect(pdf.getPageCount()).toBe(sheets);
    const { width, height } = pdf.getPage(0).getMediaBox();
    expect(width).toBeCloseTo(toPoints(plan.paper.width), 4);
    expect(height).toBeCloseTo(toPoints(plan.paper.height), 4);
    expect(pdf.catalog.getViewerPreferences()?.getPrintScaling()).toBe('None');
  });

  it('is the same bytes on every run', async () => {
    expect(Buffer.compare(await printedOnce(), await print(change))).toBe(0);
  });
});

describe('paper off a roll', () => {
  it('is as wide as the roll, and ends where the pieces end', async () => {
    const pdf = await PDFDocument.load(await print({ paper: 'roll-36in' }));
    const { width, height } = pdf.getPage(0).getMediaBox();
    expect(width).toBeCloseTo(toPoints(914.4), 4);
    expect(height).toBeLessThan(toPoints(paperOf('roll-36in').height / 3));
  });
});

describe('a sheet that saves ink', () => {
  it('takes less than three quarters of the ink, lettering and all', async () => {
    const area = { x: 0, y: 0, width: 210, height: 297 };
    const plain = inkIn(await renderPart(await print({}), 2, area));
    const saving = inkIn(await renderPart(await print({ inkSaving: true }), 2, area));
    expect(saving / plain).toBeLessThan(0.75);
  });
});

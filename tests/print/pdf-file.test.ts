import { PDFDocument } from 'pdf-lib';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { describe, expect, it } from 'vitest';
import { chalkSheetPdf } from '#server/features/print/chalk-sheet-pdf.ts';
import { tilesPdf } from '#server/features/print/tiles-pdf.ts';
import { papers, toPoints } from '#shared/sheets/papers.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { mostSheets, SheetLimitError } from '#shared/sheets/sheet-limit.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { speak } from '#shared/units/speak.ts';
import { paperCard, paperDraft } from '../support/paper-draft.ts';
import { oblong } from '../support/paper-pieces.ts';
import { inspect } from '../support/pgm.ts';

const pieces = [oblong('front', 300, 500), oblong('flare-front', 600, 500, { part: 'flare' })];

describe.each(['A4', 'Letter'] as const)('the tiles as a PDF on %s', (paper) => {
  const print = () => tilesPdf(paperDraft(pieces), presetOrder(paper, 'whole-gown'), 'cm');

  it('pass the check of an independent reader without a complaint', async () => {
    expect(await inspect(await print(), 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
  });

  it('have sheets of exactly that paper, one for the cover and one for each tile', async () => {
    const pdf = await PDFDocument.load(await print());
    const { sheets } = planSheets(pieces, presetOrder(paper, 'whole-gown'));
    expect(pdf.getPageCount()).toBe(sheets);
    for (const page of pdf.getPages()) {
      const { x, y, width, height } = page.getMediaBox();
      expect([x, y]).toEqual([0, 0]);
      expect(width).toBeCloseTo(toPoints(papers[paper].width), 5);
      expect(height).toBeCloseTo(toPoints(papers[paper].height), 5);
    }
  });

  it('ask the viewer not to scale them', async () => {
    const pdf = await PDFDocument.load(await print());
    const scaling = pdf.catalog.getViewerPreferences()?.getPrintScaling();
    expect(scaling).toBe('None');
  });

  it('carry their typeface with them', async () => {
    const fonts = (await inspect(await print(), 'pdffonts')).trim().split('\n').slice(2);
    expect(fonts.length).toBeGreaterThan(0);
    for (const each of fonts)
      expect(each).toMatch(/SourceSans3-\w+ +CID TrueType +Identity-H +yes yes yes/u);
  });

  it('are read by the viewer that browsers use: its sheets, and what is lettered on them', async () => {
    const task = getDocument({ data: await print(), verbosity: 0 });
    const pdf = await task.promise;
    const { sheets, plan } = planSheets(pieces, presetOrder(paper, 'whole-gown'));
    expect(pdf.numPages).toBe(sheets);
    for (const [i, tile] of plan.tiles.entries()) {
      const page = await pdf.getPage(i + 2);
      const { items } = await page.getTextContent();
      expect(items.map((each) => ('str' in each ? each.str : ''))).toContain(tile.name);
    }
    await task.destroy();
  });

  it('are the same bytes for the same draft', async () => {
    expect(Buffer.compare(await print(), await print())).toBe(0);
  });

  it('write each piece once, however many sheets show it', async () => {
    const pdf = await PDFDocument.load(await print());
    const forms = pdf.context
      .enumerateIndirectObjects()
      .filter(
        ([, object]) => 'dict' in object && String(Reflect.get(object, 'dict')).includes('/Form'),
      );
    // Frame, two glue strips, two trimmed edges and the small square are shared by all sheets.
    expect(forms.length).toBe(pieces.length + 6);
  });
});

describe('a name on the card', () => {
  it.each(['王小明', 'عائشة', '👩🏽‍🎨 Zoë', 'A\u0000B\u202eC', ')(\\<>', 'x'.repeat(5000), ''])(
    'of any letters prints: %j',
    async (name) => {
      const draft = paperDraft(pieces, { ...paperCard, name });
      for (const pdf of [
        await tilesPdf(draft, presetOrder('A4', 'whole-gown'), 'cm'),
        await chalkSheetPdf(draft, { paper: 'A4', unit: 'in' }),
      ]) {
        expect(await inspect(pdf, 'qpdf', ['--check'])).toContain(
          'No syntax or stream encoding errors',
        );
      }
    },
  );
});

describe('a date on the card', () => {
  it.each(['2026-11-14', 'soon) /Evil (', ''])('cannot write into the file: %j', async (date) => {
    const pdf = await tilesPdf(
      paperDraft(pieces, { ...paperCard, date }),
      presetOrder('A4', 'whole-gown'),
      'cm',
    );
    expect(await inspect(pdf, 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
    const info = await inspect(pdf, 'pdfinfo');
    expect(info.includes('CreationDate')).toBe(date === '2026-11-14');
  });
});

describe('a drawing too large for home paper', () => {
  it('is refused in words, naming the bound and what to print instead', async () => {
    const draft = paperDraft([oblong('flare-front', 4000, 4000, { part: 'flare' })]);
    const refused = await tilesPdf(draft, presetOrder('A4', 'whole-gown'), 'cm').catch(
      (error: unknown) => error,
    );
    expect(refused).toBeInstanceOf(SheetLimitError);
    const said = refused instanceof SheetLimitError ? speak(refused.problem.said, 'cm') : '';
    expect(said).toContain(`at most ${mostSheets}`);
    expect(said).toContain('chalk sheet');
  });
});

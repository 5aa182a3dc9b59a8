import { readFile } from 'node:fs/promises';
import { PDFDocument } from 'pdf-lib';
import { describe, expect, it } from 'vitest';
import { pdfBytes } from '#server/features/print/pdf-document.ts';
import { readFont } from '#server/features/print/pdf-font.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { chalkSheetJob } from '#shared/exports/chalk-sheet.ts';
import type { Mark } from '#shared/exports/drawing.ts';
import { words } from '#shared/exports/marks.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { papers, toPoints } from '#shared/sheets/papers.ts';
import { fontkitForPdfLib } from '../support/fontkit-for-pdf-lib.ts';
import { middleBody } from '../support/middle-body.ts';
import { type Picture, inkIn, inspect, renderPart } from '../support/pgm.ts';

const size = 9;
const strip = { x: 15, y: 20, width: 180, height: 16 };

const fontFile = new URL(
  '../../server/features/print/fonts/SourceSans3-Regular.ttf',
  import.meta.url,
);

/** One line of lettering as Ellwand prints it. */
const printed = (text: string): Promise<Uint8Array> =>
  pdfBytes({
    title: 'Lettering',
    paper: papers.A4,
    drawings: [],
    pages: [[words(text, 20, 30, size)]],
  });

/** The same line by another route: pdf-lib's own writer with the whole typeface embedded. */
async function byAnotherRoute(text: string): Promise<Uint8Array> {
  const pdf = await PDFDocument.create();
  pdf.registerFontkit(fontkitForPdfLib());
  const font = await pdf.embedFont(await readFile(fontFile), {
    features: { kern: false, liga: false, clig: false, ccmp: false },
  });
  const page = pdf.addPage([toPoints(papers.A4.width), toPoints(papers.A4.height)]);
  page.drawText(text, {
    font,
    size: toPoints(size),
    x: toPoints(20),
    y: toPoints(papers.A4.height - 30),
  });
  return pdf.save();
}

/** Ink that lies in one picture and not in the other, over all the ink of the first. */
function apart(one: Picture, other: Picture): number {
  let difference = 0;
  for (let y = 0; y < one.height; y += 1) {
    for (let x = 0; x < one.width; x += 1) {
      difference += Math.abs(one.grey(x, y) - other.grey(x, y));
    }
  }
  return difference / 255 / inkIn(one);
}

/** Width of the ink in a picture, pixels. */
function breadth(picture: Picture): number {
  const inked = Array.from({ length: picture.width }, (_, x) =>
    inkIn(picture, { x, y: 0, width: 1, height: picture.height }),
  ).flatMap((ink, x) => (ink > 0.2 ? [x] : []));
  return (inked.at(-1) ?? 0) - (inked[0] ?? 0);
}

const picture = async (text: string): Promise<Picture> => renderPart(await printed(text), 1, strip);

describe('lettering on paper, looked at in pixels', () => {
  it.each([
    'Front top, centre panel 0123456789',
    'Åsa Őry-Łukasz ñandú çelik ßen',
    '½ ¼ ¾ ⅛ ⅜ ⅝ ⅞ × · – − ↑ ↓ °',
    'Жанна Ωμέγα “quoted” it’s €',
    'kg jy QW @ % & () /',
  ])('shows “%s” as another writer of PDF shows it', async (text) => {
    const other = await renderPart(await byAnotherRoute(text), 1, strip);
    expect(apart(await picture(text), other)).toBeLessThan(0.02);
  });

  it('shows every letter it uses on a piece: none is a blank', async () => {
    const blank: string[] = [];
    for (const letter of 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789½⅛⁄%·↑↓') {
      if (inkIn(await picture(letter)) < 50) blank.push(letter);
    }
    expect(blank).toEqual([]);
  }, 60_000);

  it('builds inches as fractions, whatever was printed before', async () => {
    // Embedding ½ once made fontkit forget the figures it is composed of.
    await printed('½ ⅛ 1234567890⁄');
    const built = breadth(await picture('15⁄16'));
    const plain = breadth(await picture('15/16'));
    expect(built).toBeLessThan(plain * 0.8);
    expect(inkIn(await picture('15⁄16'))).toBeGreaterThan(300);
  });

  it('puts a box in place of a letter the typeface has not got', async () => {
    const [unknown, box] = [await picture('中'), await picture('□')];
    expect(apart(unknown, box)).toBeLessThan(0.001);
    expect(inkIn(unknown)).toBeGreaterThan(100);
  });

  it('has a letter in the typeface for everything Ellwand itself writes', async () => {
    const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
    const jobs = (['cm', 'in'] as const).flatMap((unit) => [
      tilesJob(draft, presetOrder('A4', 'whole-gown'), unit),
      chalkSheetJob(draft, { paper: 'Letter', unit }),
    ]);
    const texts = (marks: readonly Mark[]): readonly string[] =>
      marks.flatMap((mark) =>
        mark.kind === 'words' ? [mark.text] : mark.kind === 'window' ? texts(mark.marks) : [],
      );
    const written = new Set(
      jobs
        .flatMap((job) => [...job.pages, ...job.drawings.map((each) => each.marks)].flatMap(texts))
        .join(''),
    );
    const { font } = readFont(await readFile(fontFile));
    const lacking = [...written].filter(
      (each) => !font.hasGlyphForCodePoint(each.codePointAt(0) ?? 0),
    );
    expect(written.size).toBeGreaterThan(50);
    expect(lacking).toEqual([]);
  });

  it('can still be searched: fractions and letters come back as text', async () => {
    const text = await inspect(await printed('Bust 36 15⁄16 in, Åsa ½'), 'pdftotext', [], ['-']);
    expect(text.replace(/\s+/gu, ' ')).toContain('Bust 36 15⁄16 in, Åsa ½');
  });
});

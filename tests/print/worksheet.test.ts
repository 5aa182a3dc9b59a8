import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { describe, expect, it } from 'vitest';
import { worksheetPdf } from '#server/features/print/worksheet-pdf.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { type DraftedInputs, draftAny, garments } from '#shared/engine/drafted.ts';
import { toPoints, papers } from '#shared/sheets/papers.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';
import { inspect } from '../support/pgm.ts';

const inputsOf = (garment: (typeof garments)[number]): DraftedInputs => ({
  garment,
  card: middleBody,
  style: {},
  rules: balanced,
});

/** All text of a file as a reader selects it, page by page, with white space as single blanks. */
async function textOf(bytes: Uint8Array): Promise<readonly string[]> {
  const task = getDocument({ data: bytes.slice(), verbosity: 0 });
  const pdf = await task.promise;
  const pages: string[] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const { items } = await (await pdf.getPage(number)).getTextContent();
    const text = items.map((each) => ('str' in each ? each.str : '')).join(' ');
    pages.push(text.replace(/\s+/gu, ' '));
  }
  await task.destroy();
  return pages;
}

const plain = (sentence: string): string => sentence.replace(/\s+/gu, ' ');

describe.each([
  ['A4', 'cm'],
  ['Letter', 'in'],
] as const)('the worksheet on %s in %s', (paper, unit) => {
  it.each(garments)(
    'of a %s has every step with its sentence and its reason, to be selected',
    async (garment) => {
      const draft = draftAny(inputsOf(garment));
      const text = (await textOf(await worksheetPdf(draft, { paper, unit }))).join(' ');
      draft.steps.forEach((step, place) => {
        expect(text).toContain(`${place + 1} ${step.title}`);
        expect(text).toContain(plain(speak(step.said, unit)));
        if (step.why) expect(text).toContain(plain(`Why: ${speak(step.why, unit)}`));
      });
    },
  );

  it('passes an independent reader, carries its typeface, and has pages of that paper', async () => {
    const bytes = await worksheetPdf(draftAny(inputsOf('gown')), { paper, unit });
    expect(await inspect(bytes, 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
    const fonts = (await inspect(bytes, 'pdffonts')).trim().split('\n').slice(2);
    expect(fonts.length).toBeGreaterThan(0);
    for (const each of fonts) {
      expect(each).toMatch(/SourceSans3-\w+ +CID TrueType +Identity-H +yes yes yes/u);
    }
    const task = getDocument({ data: bytes.slice(), verbosity: 0 });
    const page = await (await task.promise).getPage(1);
    const [, , width, height] = page.view;
    expect(width).toBeCloseTo(toPoints(papers[paper].width), 3);
    expect(height).toBeCloseTo(toPoints(papers[paper].height), 3);
    await task.destroy();
  });

  it('counts its pages, and leaves nothing outside of what printers print', async () => {
    const bytes = await worksheetPdf(draftAny(inputsOf('gown')), { paper, unit });
    const pages = await textOf(bytes);
    pages.forEach((text, at) => expect(text).toContain(`page ${at + 1} of ${pages.length}`));
    const task = getDocument({ data: bytes.slice(), verbosity: 0 });
    const pdf = await task.promise;
    for (let number = 1; number <= pdf.numPages; number += 1) {
      const { items } = await (await pdf.getPage(number)).getTextContent();
      for (const item of items) {
        if (!('transform' in item) || item.str.trim() === '') continue;
        const transform: readonly unknown[] = item.transform;
        const [x, y] = [Number(transform[4]), Number(transform[5])];
        expect(x).toBeGreaterThan(toPoints(5));
        expect(x + item.width).toBeLessThan(toPoints(papers[paper].width - 5));
        expect(y).toBeGreaterThan(toPoints(5));
      }
    }
    await task.destroy();
  });
});

it('the same draft gives the same bytes', async () => {
  const print = () => worksheetPdf(draftAny(inputsOf('gown')), { paper: 'A4', unit: 'cm' });
  expect(Buffer.compare(await print(), await print())).toBe(0);
});

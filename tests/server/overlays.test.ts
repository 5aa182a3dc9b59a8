import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { refusal } from '#shared/api/problem-codes.ts';
import { starterRules } from '#shared/regrade/grade-rules.ts';
import { fixedDepths } from '#shared/regrade/style-depths.ts';
import { inspect } from '../support/pgm.ts';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const ask = (path: string, body: unknown) => post(`${server.address}/api/prints/${path}`, body);

const paper = { unit: 'cm', paper: 'A4', scale: 0.25 };
const comparison = {
  first: { card },
  second: { card: { ...card, waistGirth: 768 } },
  names: { first: 'October', second: 'a year later' },
  ...paper,
};
const nest = {
  inputs: { card },
  nest: { rules: starterRules, smaller: 2, larger: 2, depths: fixedDepths },
  lines: 'finished',
  ...paper,
};

async function refusedFields(path: string, body: unknown): Promise<readonly string[]> {
  const reply = await ask(path, body);
  expect(reply.status).toBe(422);
  const { problems } = refusal.parse(await reply.json());
  return (problems ?? []).map(({ field }) => field);
}

const layer = z.object({ name: z.string() });

const bytesOf = async (reply: Response): Promise<Uint8Array> => {
  expect(reply.status).toBe(200);
  return new Uint8Array(await reply.arrayBuffer());
};

/** All that is lettered in a PDF, as the viewer of browsers reads it. */
async function lettersIn(bytes: Uint8Array): Promise<string> {
  const pdf = await getDocument({ data: bytes, verbosity: 0 }).promise;
  const texts: string[] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const { items } = await (await pdf.getPage(number)).getTextContent();
    texts.push(...items.map((each) => ('str' in each ? each.str : '')));
  }
  return texts.join(' ');
}

describe('drafts over each other are refused', () => {
  it('aligned on what is no point, at a scale there is not, or of a body that cannot be drawn', async () => {
    const off = { ...comparison, align: { on: 'point', point: 'elbow' } };
    expect(await refusedFields('compare', off)).toEqual(['align.point']);
    expect(await refusedFields('compare', { ...comparison, scale: 3 })).toEqual(['scale']);
    const odd = { ...comparison, second: { card: { ...card, waistGirth: 92 } } };
    expect(await refusedFields('compare', odd)).toEqual(['card.waistGirth']);
  });

  it('a nest of more than twelve sizes, or by a step no size could have', async () => {
    const many = { ...nest, nest: { ...nest.nest, smaller: 6, larger: 6 } };
    expect(await refusedFields('nest', many)).toEqual(['larger']);
    const wide = { ...nest, nest: { ...nest.nest, rules: { bustGirth: 400 } } };
    expect(await refusedFields('nest.svg', wide)).toEqual(['gradeRules.bustGirth']);
  });

  it('over the limit of prints, with a time to come back', async () => {
    const slow = await startServer({ limits: { printsPerMinute: 1 } });
    try {
      const url = `${slow.address}/api/prints/compare.svg`;
      expect((await post(url, comparison)).status).toBe(200);
      expect((await post(url, comparison)).status).toBe(429);
    } finally {
      await slow.close();
    }
  });
});

describe('two drafts over each other', () => {
  it('are printed with their figures, in the reader’s unit, and pass an independent check', async () => {
    const bytes = await bytesOf(await ask('compare', comparison));
    expect(await inspect(bytes, 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
    const letters = await lettersIn(bytes);
    expect(letters).toContain('October and a year later');
    // The waist grows by 30, and the card asks for 10 less than the body.
    expect(letters).toMatch(/Waist\s+72\.80\s+75\.80\s+\+3\.00/);
    expect(letters).toContain('quarter scale');
  });

  it('come as SVG, a group a piece', async () => {
    const reply = await ask('compare.svg', comparison);
    expect(reply.headers.get('content-disposition')).toContain('october-and-a-year-later.svg');
    const text = await reply.text();
    expect(text.match(/class="pair"/g)?.length).toBeGreaterThan(5);
    expect(text).toContain('class="only-second"');
  });

  it('blocks as well as gowns', async () => {
    const block = { garment: 'bodice-block', card };
    const body = { ...comparison, first: block, second: { ...block, style: { bustDart: 'side' } } };
    expect((await ask('compare.svg', body)).status).toBe(200);
  });
});

describe('a nest', () => {
  it('is printed with a layer a size, named as on the lines', async () => {
    const bytes = await bytesOf(await ask('nest', nest));
    expect(await inspect(bytes, 'qpdf', ['--check'])).toContain(
      'No syntax or stream encoding errors',
    );
    const pdf = await getDocument({ data: bytes.slice(), verbosity: 0 }).promise;
    const config = await pdf.getOptionalContentConfig();
    const names = [...config].map(([, group]) => layer.parse(group).name);
    expect(names).toEqual(['\u22122', '\u22121', 'base', '+1', '+2'].map((each) => `Size ${each}`));
    expect(await lettersIn(bytes)).toContain('Nest of sizes');
  });

  it('at true scale takes more sheets than at a quarter of it', async () => {
    const pagesOf = async (scale: number) =>
      (
        await getDocument({
          data: await bytesOf(await ask('nest', { ...nest, scale })),
          verbosity: 0,
        }).promise
      ).numPages;
    expect(await pagesOf(1)).toBeGreaterThan((await pagesOf(0.25)) + 8);
  });

  it('comes as SVG with a group and a dash a size', async () => {
    const text = await (await ask('nest.svg', nest)).text();
    const dashes = [
      ...text.matchAll(
        /data-step="(-?\d+)".*?<path class="seam-line"[^>]*?(?:stroke-dasharray="([^"]*)")?\/>/g,
      ),
    ];
    expect(new Set(dashes.map(([, step]) => step))).toEqual(new Set(['-2', '-1', '0', '1', '2']));
    const solid = dashes.filter(([, , dash]) => dash === undefined).map(([, step]) => step);
    expect(new Set(solid)).toEqual(new Set(['0']));
    expect(new Set(dashes.map(([, , dash]) => dash)).size).toBe(5);
  });
});

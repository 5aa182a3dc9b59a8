import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import { fillRules } from '#shared/api/rules.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { type PrintOrder, plainOrder } from '#shared/sheets/print-order.ts';
import { type SheetPlan, leavingOut, planSheets } from '#shared/sheets/sheet-plan.ts';
import { printedTiles } from '#shared/sheets/tile-plan.ts';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

const run = promisify(execFile);

let server: ServerUnderTest;
let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sheets-'));
  server = await startServer();
});
afterAll(async () => {
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

const toile: Partial<PrintOrder> = { pieces: 'bodice-toile' };
const wanted = (order: unknown, unit = 'cm') => ({ inputs: { card }, unit, order });
const ask = (order: unknown, { unit = 'cm', what = 'sheets', at = server.address } = {}) =>
  post(`${at}/api/prints/${what}`, wanted(order, unit));

async function refused(reply: Response, status: number) {
  expect(reply.status).toBe(status);
  return refusal.parse(await reply.json());
}

/** The flares of three gowns: seconds of arranging. */
const heap = ['flare-front', 'flare-back'].map((piece) => ({ piece, copies: 3, how: 'on fold' }));

describe('an order that cannot be printed is refused by field, bound and remedy', () => {
  it.each([
    ['a paper nobody makes', { paper: 'A9' }, 'order.paper'],
    ['a paper of half a size', { paper: { width: 300 } }, 'order.paper'],
    ['a way sheets cannot lie', { orientation: 'sideways' }, 'order.orientation'],
    ['a margin in words', { margin: '1 cm' }, 'order.margin'],
    ['a scale nobody teaches with', { scale: 0.3 }, 'order.scale'],
    ['pieces by a word it has not', { pieces: 'sleeves' }, 'order.pieces'],
    ['more sheets left out than any plan has', { leftOut: Array(400).fill('A1') }, 'order.leftOut'],
    ['a choice it has not', { colour: 'red' }, 'order.colour'],
  ])('%s', async (_what, order, field) => {
    const { code, problems } = await refused(await ask(order), 422);
    expect(code).toBe('bad-input');
    expect(problems?.map((each) => each.field)).toEqual([field]);
  });

  it.each([
    ['a margin no printer has', { margin: 40 }, 'order.margin'],
    ['a strip too narrow for glue', { overlap: 1 }, 'order.overlap'],
    [
      'a sheet the cover does not fit on',
      { paper: { width: 100, height: 300 } },
      'order.paper.width',
    ],
    ['a sheet no page can be', { paper: { width: 900, height: 9000 } }, 'order.paper.height'],
    ['no piece', { pieces: [] }, 'order.pieces'],
    [
      'a piece the draft has not',
      { pieces: [{ piece: 'hood', copies: 1, how: 'drawn once' }] },
      'order.pieces.0.piece',
    ],
    [
      'half a copy',
      { pieces: [{ piece: 'front-middle', copies: 1.5, how: 'on fold' }] },
      'order.pieces.0.copies',
    ],
    [
      'a fold where there is none',
      { pieces: [{ piece: 'back-middle', copies: 1, how: 'opened out' }] },
      'order.pieces.0.how',
    ],
  ])('%s', async (_what, order, field) => {
    for (const what of ['sheets', 'sheets.svg']) {
      const { code, problems } = await refused(await ask(order, { what }), 422);
      expect(code).toBe('bad-input');
      expect(problems?.map((each) => each.field)).toEqual([field]);
    }
  });

  it('in the reader’s unit', async () => {
    const inCm = await refused(await ask({ margin: 40 }), 422);
    expect(inCm.message).toMatch(/margin 4\.0 cm must lie between 0\.5 cm and 1\.5 cm/);
    const inInches = await refused(await ask({ margin: 40 }, { unit: 'in' }), 422);
    expect(inInches.message).toMatch(/margin 1\u00a09⁄16 in must lie between .* in and 9⁄16 in/);
  });

  it('a gown that cannot be drawn, before its order is looked at', async () => {
    const body = { ...wanted({ margin: 40 }), inputs: { card: { ...card, bustGirth: 92 } } };
    const reply = await post(`${server.address}/api/prints/sheets`, body);
    expect((await refused(reply, 422)).problems).toMatchObject([{ field: 'card.bustGirth' }]);
  });

  it('a request that is not JSON, or longer than any order', async () => {
    const url = `${server.address}/api/prints/sheets`;
    expect((await refused(await post(url, '{"order":'), 400)).code).toBe('not-json');
    const long = wanted({ leftOut: ['A1'.repeat(60_000)] });
    expect((await refused(await post(url, long), 413)).code).toBe('too-large');
  });
});

describe('sheets share the limits of all prints', () => {
  it('over so many a minute they are sent away with a time to come back', async () => {
    const one = await startServer({ limits: { printsPerMinute: 1 } });
    await ask({}, { at: one.address, what: 'sheets.svg' });
    const second = await ask(toile, { at: one.address });
    expect(Number(second.headers.get('retry-after'))).toBeGreaterThan(0);
    expect((await refused(second, 429)).code).toBe('too-many-requests');
    await one.close();
  });

  it('one address has so many in the line', async () => {
    const narrow = await startServer({ limits: { printsFromOneAddress: 1 } });
    const replies = await Promise.all(
      Array.from({ length: 4 }, () => ask(toile, { at: narrow.address })),
    );
    const sentAway = replies.filter(({ status }) => status !== 200);
    expect(sentAway.length).toBeGreaterThan(0);
    for (const reply of sentAway) {
      expect(reply.headers.get('retry-after')).toBe('5');
      expect((await refused(reply, 503)).code).toBe('busy');
    }
    await narrow.close();
  });
});

describe('a print nobody waits for any more', { timeout: 240_000 }, () => {
  it('is ended where it stands, and the next one gets the thread', async () => {
    const one = await startServer();
    const many = { ...plainOrder, orientation: 'fewest', pieces: heap };
    const begun = performance.now();
    await ask(many, { at: one.address });
    const whole = performance.now() - begun;
    const leaving = new AbortController();
    const left = fetch(`${one.address}/api/prints/sheets`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(wanted(many)),
      signal: leaving.signal,
    }).catch(() => 'left');
    await new Promise((later) => setTimeout(later, whole / 10));
    leaving.abort();
    expect(await left).toBe('left');
    const again = performance.now();
    expect((await ask(toile, { at: one.address })).status).toBe(200);
    expect(performance.now() - again).toBeLessThan(0.8 * whole);
    expect(one.logged()).not.toContain('"fault"');
    await one.close();
  });
});

const draft = draftGown({ card, style: {}, rules: fillRules({}) });

type Printed = { readonly pages: number; readonly sheets: readonly string[] };

const word = /yMin="([\d.]+)" xMax="[\d.]+" yMax="([\d.]+)">([A-Z]+\d+)</g;

/** A sheet's own name is set this large at least; its neighbours' and the page plan's are smaller, pt. */
const large = 24;

/** The name of the sheet a page is; the cover has none. */
const nameOn = (page: string): readonly string[] =>
  [...page.matchAll(word)]
    .filter(([, top, foot]) => Number(foot) - Number(top) > large)
    .map(([, , , name = '']) => name);

/** What a saved PDF says of itself, read by poppler: its pages, and the names of its sheets in their order. */
async function printed(reply: Response): Promise<Printed> {
  expect(reply.status).toBe(200);
  const path = join(folder, 'sheets.pdf');
  await writeFile(path, new Uint8Array(await reply.arrayBuffer()));
  const { stdout } = await run('pdftotext', ['-bbox', path, '-'], { maxBuffer: 1e8 });
  const pages = stdout.split('</page>').slice(0, -1);
  return { pages: pages.length, sheets: pages.flatMap(nameOn) };
}

/** A plan made here; while it is made nothing else is answered, so that lines may have gone dead. */
async function planned(order: PrintOrder): Promise<SheetPlan> {
  const plan = planSheets(draft.pieces, order);
  await new Promise((later) => setTimeout(later, 100));
  return plan;
}

// A plan is a second of work, here and on the server; where every core is busy it is many.
describe('what is printed is what was planned', { timeout: 240_000 }, () => {
  it.each<PrintOrder['paper']>(['A4', 'Tabloid', 'A0', 'roll-36in', { width: 330, height: 480 }])(
    'on %o: the same sheets by name, in the same order',
    async (paper) => {
      const order: PrintOrder = { ...plainOrder, paper, orientation: 'fewest' };
      const plan = await planned(order);
      const { pages, sheets } = await printed(await ask(order));
      expect(pages).toBe(plan.sheets);
      expect(sheets).toEqual(plan.plan.tiles.map(({ name }) => name));
    },
  );

  it('sheets left out are not among the pages; the page plan leaves them out without arranging anew', async () => {
    const whole = await planned(plainOrder);
    const leftOut = whole.plan.tiles.slice(0, 3).map(({ name }) => name);
    const order = { ...plainOrder, leftOut };
    const shown = leavingOut(whole, leftOut);
    expect(shown).toEqual(await planned(order));
    const { pages, sheets } = await printed(await ask({ leftOut }));
    expect(pages).toBe(whole.sheets - 3);
    expect(sheets).toEqual(printedTiles(shown.plan).map(({ name }) => name));
  });

  it('the file is named after the card, the pieces, the paper and a teaching scale', async () => {
    const reply = await ask({ ...toile, paper: 'A3', scale: 0.5 });
    expect(reply.headers.get('content-disposition')).toContain(
      'filename="judith-amsel-bodice-toile-a3-scale-1-2.pdf"',
    );
    expect(reply.headers.get('content-type')).toContain('application/pdf');
  });

  it('a block is printed as a gown is, under its own name, and has no toile of a top it has not', async () => {
    const block = { ...wanted({ paper: 'A3' }), inputs: { garment: 'skirt-block', card } };
    const reply = await post(`${server.address}/api/prints/sheets`, block);
    expect(reply.headers.get('content-disposition')).toContain('judith-amsel-skirt-block-a3.pdf');
    expect((await printed(reply)).sheets).toContain('A1');
    const toileOf = { ...block, order: toile };
    const none = await refused(await post(`${server.address}/api/prints/sheets`, toileOf), 422);
    expect(none.problems).toMatchObject([{ field: 'order.pieces', code: 'no-pieces' }]);
  });

  it('the SVG has the pieces of the order and no others', async () => {
    const pieces = [{ piece: 'front-middle', copies: 2, how: 'on fold' }];
    const reply = await ask({ pieces }, { what: 'sheets.svg' });
    expect(reply.status).toBe(200);
    const svg = await reply.text();
    expect(svg).toContain('data-piece="front-middle"');
    expect(svg).not.toContain('data-piece="back-middle"');
  });
});

import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import { fillRules } from '#shared/api/rules.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { type PrintOrder, plainOrder, sheetNames } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { PDFDocument } from 'pdf-lib';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const toile: Partial<PrintOrder> = { pieces: 'bodice-toile' };
const wanted = (order: unknown, unit = 'cm') => ({ inputs: { card }, unit, order });
const ask = (order: unknown, { unit = 'cm', what = 'sheets', at = server.address } = {}) =>
  post(`${at}/api/prints/${what}`, wanted(order, unit));

async function refused(reply: Response, status: number) {
  expect(reply.status).toBe(status);
  return refusal.parse(await reply.json());
}

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
    expect(inCm.message).toMatch(/margin 4\.0 cm must lie between 0\.5 cm and 2\.5 cm/);
    const inInches = await refused(await ask({ margin: 40 }, { unit: 'in' }), 422);
    expect(inInches.message).toMatch(/margin 1\u00a09⁄16 in must lie between .* in and 1 in/);
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

const draft = draftGown({ card, style: {}, rules: fillRules({}) });
const pagesIn = async (reply: Response): Promise<number> => {
  expect(reply.status).toBe(200);
  return (await PDFDocument.load(await reply.arrayBuffer())).getPageCount();
};

describe('what is printed is what was planned', () => {
  it.each(sheetNames)('on %s: as many pages as the plan has sheets', async (paper) => {
    const order: PrintOrder = { ...plainOrder, paper, orientation: 'fewest' };
    expect(await pagesIn(await ask(order))).toBe(planSheets(draft.pieces, order).sheets);
  });

  it('sheets left out are not among the pages, and an empty order is the plain one', async () => {
    const whole = planSheets(draft.pieces, plainOrder);
    const leftOut = whole.plan.tiles.slice(0, 3).map(({ name }) => name);
    expect(await pagesIn(await ask({}))).toBe(whole.sheets);
    expect(await pagesIn(await ask({ leftOut }))).toBe(whole.sheets - 3);
  });

  it('the file is named after the card, the pieces, the paper and a teaching scale', async () => {
    const reply = await ask({ ...toile, paper: 'A3', scale: 0.5 });
    expect(reply.headers.get('content-disposition')).toContain(
      'filename="judith-amsel-bodice-toile-a3-scale-1-2.pdf"',
    );
    expect(reply.headers.get('content-type')).toContain('application/pdf');
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

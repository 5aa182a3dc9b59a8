import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import { printWorksheet } from '#shared/api/worksheet.ts';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const wish = { inputs: { card }, unit: 'in', paper: 'Letter' };
const ask = (body: unknown, to = server) => post(`${to.address}${printWorksheet.path}`, body);

describe('a worksheet is refused', () => {
  it.each([
    ['a paper no folder takes', { paper: 'A0' }, 'paper', /paper/],
    ['a unit nobody reads', { unit: 'ell' }, 'unit', /unit/],
    [
      'a waist no body has, in the reader’s unit',
      { inputs: { card: { ...card, waistGirth: 90 } } },
      'card.waistGirth',
      /^Waist .* in/,
    ],
  ])('for %s', async (_case, change, field, words) => {
    const reply = await ask({ ...wish, ...change });
    expect(reply.status).toBe(422);
    const { code, message, problems } = refusal.parse(await reply.json());
    expect(code).toBe('bad-input');
    expect(problems?.[0]?.field).toBe(field);
    expect(message).toMatch(words);
  });

  it('by any other method, and to who prints more than anybody does', async () => {
    const got = await fetch(`${server.address}${printWorksheet.path}`);
    expect(got.status).toBe(405);
    const narrow = await startServer({ limits: { printsPerMinute: 1 } });
    expect((await ask(wish, narrow)).status).toBe(200);
    expect((await ask(wish, narrow)).status).toBe(429);
    await narrow.close();
  });
});

describe('a worksheet', () => {
  it.each(['gown', 'bodice-block', 'skirt-block'])(
    'of a %s is a PDF with a name',
    async (garment) => {
      const reply = await ask({ ...wish, inputs: { garment, card } });
      expect(reply.status).toBe(200);
      expect(reply.headers.get('content-type')).toBe('application/pdf');
      expect(reply.headers.get('content-disposition')).toMatch(/worksheet/);
      const bytes = Buffer.from(await reply.arrayBuffer());
      expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
    },
  );
});

import { brotliCompressSync, gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import { speak } from '#shared/units/speak.ts';
import { card, post, print } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

async function refused(reply: Response, status: number) {
  expect(reply.status).toBe(status);
  expect(reply.headers.get('cache-control')).toBe('no-store');
  return refusal.parse(await reply.json());
}

const draft = (body: unknown, headers?: Record<string, string>) =>
  post(`${server.address}/api/drafts`, body, headers);

describe('what cannot be read is refused before it is looked at', () => {
  it('a body that is no JSON, without repeating it', async () => {
    const { code, message } = await refused(await draft('{"card": {"name": "Secret Person"'), 400);
    expect(code).toBe('not-json');
    expect(message).not.toContain('Secret');
  });

  it.each(['null', '17', '"card"', '[]'])('a body that is only %s, as what it is', async (body) => {
    const { code, message } = await refused(await draft(body), 422);
    expect(code).toBe('bad-input');
    expect(message).toMatch(/^The request must be an object/);
  });

  it.each([
    ['gzip', '{"card": {}}'],
    ['br', '{"card": {}}'],
    ['deflate', '{"card": {}}'],
    ['gzip', gzipSync('{"card": {}}').subarray(0, 20)],
    ['br', brotliCompressSync('{"card": {}}').subarray(0, 6)],
    ['zip', '{}'],
  ])('a body that is not the %s it says it is', async (encoding, body) => {
    const reply = await fetch(`${server.address}/api/drafts`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'content-encoding': encoding },
      body,
    });
    expect((await refused(reply, 400)).code).toBe('not-json');
  });

  it('a body over 64 kB', async () => {
    const long = { card: { ...card, name: 'x'.repeat(70_000) } };
    const { code, message } = await refused(await draft(long), 413);
    expect(code).toBe('too-large');
    expect(message).toContain('64 kB');
  });

  it('a body that says it is something else', async () => {
    const reply = await draft('card=1', { 'content-type': 'application/x-www-form-urlencoded' });
    expect((await refused(reply, 415)).code).toBe('wrong-media-type');
  });

  it('a body in an alphabet JSON does not have', async () => {
    const reply = await draft('{}', { 'content-type': 'application/json; charset=latin1' });
    expect((await refused(reply, 400)).code).toBe('not-json');
  });

  it('an address the API does not have, and a method an address does not take', async () => {
    const nowhere = await fetch(`${server.address}/api/nowhere/17`);
    expect((await refused(nowhere, 404)).code).toBe('not-found');
    const wrong = await fetch(`${server.address}/api/drafts`);
    expect(wrong.headers.get('allow')).toBe('POST');
    expect((await refused(wrong, 405)).code).toBe('method-not-allowed');
    const broken = await fetch(`${server.address}/api/%E0%A4%A`);
    expect((await refused(broken, 404)).code).toBe('not-found');
  });
});

describe('a card that cannot be drawn is refused by field, bound and remedy', () => {
  it('a missing measure', async () => {
    const { bustGirth: _, ...rest } = card;
    const { code, problems } = await refused(await draft({ card: rest }), 422);
    expect(code).toBe('bad-input');
    expect(problems).toMatchObject([{ field: 'card.bustGirth', code: 'missing' }]);
  });

  it('an unknown field', async () => {
    const { problems } = await refused(await draft({ card: { ...card, chestSize: 12 } }), 422);
    expect(problems).toMatchObject([{ field: 'card.chestSize', code: 'unknown-field' }]);
  });

  it('a key that would reach into every object', async () => {
    const sly = JSON.stringify({ card }).replace('{"name"', '{"__proto__":{"polluted":1},"name"');
    const reply = await draft(sly);
    await reply.text();
    expect(Object.prototype).not.toHaveProperty('polluted');
  });

  it('a measure given as text', async () => {
    const { problems } = await refused(await draft({ card: { ...card, hipGirth: '99 cm' } }), 422);
    expect(problems).toMatchObject([{ field: 'card.hipGirth', code: 'wrong-form' }]);
  });

  it('a measure no number can be, which JSON writes as null', async () => {
    const { problems } = await refused(await draft({ card: { ...card, hipGirth: NaN } }), 422);
    expect(problems?.[0]?.field).toBe('card.hipGirth');
  });

  it('a measure outside its bounds, both bounds told, in the unit asked for', async () => {
    const wrong = { ...card, bustGirth: 92 };
    const { code, message } = await refused(await draft({ card: wrong }), 422);
    expect(code).toBe('bad-input');
    expect(message).toMatch(/9\.2 cm.*between \d+(\.\d)? cm and \d+(\.\d)? cm/);
    const inches = await post(`${server.address}/api/prints/tiles`, {
      ...print,
      card: wrong,
      unit: 'in',
    });
    expect((await refused(inches, 422)).message).toMatch(/between .* in and .* in/);
  });

  it('two measures that do not go together, both named', async () => {
    const { problems } = await refused(
      await draft({ card: { ...card, underbustGirth: 1000, bustGirth: 800 } }),
      422,
    );
    const fields = problems?.flatMap((each) => [each.field, ...(each.with ?? [])]);
    expect(fields).toEqual(expect.arrayContaining(['card.bustGirth', 'card.underbustGirth']));
  });

  it('a choice of style outside its bounds', async () => {
    const { problems } = await refused(await draft({ card, style: { kneeFinished: 200 } }), 422);
    expect(problems?.[0]?.field).toBe('style.kneeFinished');
  });

  it('the message is the sentences of its problems', async () => {
    const { message, problems = [] } = await refused(
      await draft({ card: { ...card, bustGirth: 92, hipGirth: 99 } }),
      422,
    );
    expect(problems.length).toBeGreaterThan(1);
    expect(message).toBe(problems.map((each) => speak(each.said, 'cm')).join(' '));
  });

  it.each(['tiles', 'chalk-sheet', 'pieces.svg'])('%s refuses the same card', async (what) => {
    const reply = await post(`${server.address}/api/prints/${what}`, {
      ...print,
      card: { ...card, bustGirth: 92 },
    });
    const { problems } = await refused(reply, 422);
    expect(problems).toMatchObject([{ field: 'card.bustGirth', code: 'out-of-range' }]);
  });

  it('a paper nobody has', async () => {
    const reply = await post(`${server.address}/api/prints/tiles`, { ...print, paper: 'A9' });
    expect((await refused(reply, 422)).problems?.[0]?.field).toBe('paper');
  });
});

describe('a fault of ours tells nothing of itself', () => {
  it('says only that it is noted, under the id it is logged with', async () => {
    const broken = await startServer({
      screens: () => {
        throw new Error('password of Judith Amsel');
      },
    });
    const reply = await fetch(`${broken.address}/anywhere`);
    const { code, message } = await refused(reply, 500);
    expect(code).toBe('internal');
    expect(message).not.toContain('Judith');
    const id = reply.headers.get('x-request-id') ?? 'none';
    await broken.close();
    expect(broken.logged()).toContain(id);
    expect(broken.logged()).toContain('"fault"');
    expect(broken.logged()).not.toContain('Judith');
  });
});

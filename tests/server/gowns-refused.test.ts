import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createGown, listGowns, saveGown } from '#shared/api/gowns.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { card } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';
import { newGown, save } from './support/saved-gown.ts';

let server: ServerUnderTest;
let maker: Browser & { readonly email: string };
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

describe('what cannot be saved is refused by field', () => {
  it('nobody’s', async () => {
    const visitor = openBrowser(server.address);
    expect((await visitor.refused(401, listGowns)).code).toBe('not-signed-in');
    await visitor.refused(401, createGown, { nonsense: true });
  });

  it('a page of somebody else’s', async () => {
    const origin = 'https://elsewhere.example';
    const body = { saveId: randomUUID(), title: 'Sly', content: content() };
    expect((await maker.send(createGown, body, {}, { origin })).status).toBe(403);
  });

  it.each([
    ['no title', { title: '  ' }, 'title', /too short: give at least 1 letter\./],
    ['a title nobody sees', { title: '\u200b\u2060\u115f ' }, 'title', /at least 1 letter\./],
    ['an endless title', { title: 'x'.repeat(81) }, 'title', /80 letters/],
    ['no number of its own', { saveId: 'first' }, 'saveId', /UUID/],
    ['nothing on the table', { content: undefined }, 'content', /missing/],
  ])('%s', async (_case, change, field, words) => {
    const body = { saveId: randomUUID(), title: 'Gala gown', content: content(), ...change };
    const { code, problems, message } = await maker.refused(422, createGown, body);
    expect(code).toBe('bad-input');
    expect(problems?.[0]?.field).toBe(field);
    expect(message).toMatch(words);
  });

  it('a version no number counts to, as a number', async () => {
    const gown = await newGown(maker);
    const { message } = await maker.refused(422, saveGown, save(1e300), gown);
    expect(message).toMatch(/“baseVersion” must be at most \d+\./);
  });

  it('a title that would turn its list round is kept without what turns it', async () => {
    const title = 'Gala\u202e gown\n\u2066of\u2069 Judith';
    const { id } = await maker.call(createGown, {
      saveId: randomUUID(),
      title,
      content: content(),
    });
    const { gowns } = await maker.call(listGowns, undefined);
    expect(gowns.find((each) => each.id === id)?.title).toBe('Gala  gown of  Judith');
  });

  it('a measure that is no number, by the measure’s own name', async () => {
    const { inputs, ...rest } = content();
    const wrong = { ...rest, inputs: { ...inputs, card: { ...card, hipGirth: '99 cm' } } };
    const body = { saveId: randomUUID(), title: 'Gala gown', content: wrong };
    const { problems, message } = await maker.refused(422, createGown, body);
    expect(problems?.[0]?.field).toBe('content.inputs.card.hipGirth');
    expect(message).toMatch(/^Hip must be a plain number of millimetres/);
  });

  it('more letters in a field than anybody types, or a field of no such name', async () => {
    const gown = await newGown(maker);
    for (const typed of [{ 'card.waistGirth': 'x'.repeat(201) }, { __proto__x: '1' }]) {
      const { code } = await maker.refused(422, saveGown, save(1, { typed }), gown);
      expect(code).toBe('bad-input');
    }
  });

  it('a request over 64 kB', async () => {
    const typed = Object.fromEntries(
      Array.from({ length: 400 }, (_, i) => [
        `card.x${'abcdefghij'.charAt(i % 10)}${i}`,
        'y'.repeat(180),
      ]),
    );
    expect((await maker.refused(413, createGown, save(1, { typed }))).code).toBe('too-large');
  });

  it('more requests in a minute than anybody makes', async () => {
    const narrow = await startServer({ limits: { savesPerMinute: 2 } });
    const hasty = await openMaker(narrow.address);
    await hasty.call(listGowns, undefined);
    await hasty.call(listGowns, undefined);
    expect((await hasty.refused(429, listGowns)).code).toBe('too-many-requests');
    await narrow.close();
  });
});

import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  followClass,
  listClasses,
  openClass,
  turnClass,
  visitClass,
  withdrawClass,
} from '#shared/api/classes.ts';
import { createGown } from '#shared/api/gowns.ts';
import { mostKept } from '#server/http/most-kept.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { ask } from './support/question.ts';
import { newGown } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let tutor: Browser;
let gown: { readonly gownId: string };
const wish = { title: 'Tuesday class', step: 'front/bust-line', unit: 'cm', hours: 8 } as const;
const nobodys = 'A'.repeat(43);

beforeAll(async () => {
  server = await startServer();
  tutor = await openMaker(server.address);
  gown = await newGown(tutor);
});
afterAll(() => server.close());

describe('a class is refused', () => {
  it('to nobody: opened, listed, turned and withdrawn by who is signed in alone', async () => {
    const visitor = openBrowser(server.address);
    const { id } = await tutor.call(openClass, wish, gown);
    const own = { classId: id };
    for (const [line, params] of [
      [openClass, gown],
      [listClasses, undefined],
      [turnClass, own],
      [withdrawClass, own],
    ] as const) {
      const body = line.method === 'GET' ? undefined : { nonsense: true };
      expect((await visitor.refused(401, line, body, params)).code).toBe('not-signed-in');
    }
  });

  it('to a page of somebody else’s', async () => {
    const origin = 'https://elsewhere.example';
    expect((await tutor.send(openClass, wish, gown, { origin })).status).toBe(403);
  });

  it('to another account, as if there were no such gown or class', async () => {
    const other = await openMaker(server.address);
    await other.refused(404, openClass, wish, gown);
    const { id } = await tutor.call(openClass, wish, gown);
    await other.refused(404, turnClass, { step: 'front/hip-line' }, { classId: id });
    await other.refused(404, withdrawClass, undefined, { classId: id });
    expect((await other.call(listClasses, undefined)).classes).toEqual([]);
    expect((await tutor.call(listClasses, undefined)).classes.map((each) => each.id)).toContain(id);
  });

  it('where there is no such gown or class, or its number is none', async () => {
    await tutor.refused(404, openClass, wish, { gownId: randomUUID() });
    await tutor.refused(404, openClass, wish, { gownId: 'mine' });
    await tutor.refused(404, turnClass, { step: 'front/hip-line' }, { classId: randomUUID() });
    await tutor.refused(404, withdrawClass, undefined, { classId: 'mine' });
  });

  it('alike for a link that is unknown, misspelt, withdrawn or has run out', async () => {
    const visitor = openBrowser(server.address);
    const withdrawn = await tutor.call(openClass, wish, gown);
    await tutor.call(withdrawClass, undefined, { classId: withdrawn.id });
    const expired = await tutor.call(openClass, wish, gown);
    await ask(server.databaseUrl, 'update classes set expires_at = now() where id = $1', [
      expired.id,
    ]);
    const told = [];
    for (const token of [nobodys, 'short', withdrawn.token, expired.token]) {
      for (const line of [visitClass, followClass]) {
        told.push(await visitor.refused(404, line, undefined, { token }));
      }
    }
    for (const each of told) expect(each).toEqual(told[0]);
    await tutor.refused(404, turnClass, { step: 'front/hip-line' }, { classId: expired.id });
    const open = (await tutor.call(listClasses, undefined)).classes.map(({ id }) => id);
    expect(open).not.toContain(expired.id);
    expect(open).not.toContain(withdrawn.id);
  });

  it.each([
    ['no title', { title: '  ' }, 'title'],
    ['hours that are not offered', { hours: 9000 }, 'hours'],
    ['a step that is no step', { step: '<b>' }, 'step'],
    ['a unit nobody reads', { unit: 'ell' }, 'unit'],
  ])('with %s, by field', async (_case, change, field) => {
    const { code, problems } = await tutor.refused(422, openClass, { ...wish, ...change }, gown);
    expect(code).toBe('bad-input');
    expect(problems?.[0]?.field).toBe(field);
  });

  it('of a gown of which nothing is drawn yet', async () => {
    const { inputs, ...rest } = content();
    const bare = { ...rest, inputs: { ...inputs, card: {} } };
    const { id } = await tutor.call(createGown, {
      saveId: randomUUID(),
      title: 'Bare',
      content: bare,
    });
    const { code, message } = await tutor.refused(422, openClass, wish, { gownId: id });
    expect(code).toBe('not-drawable');
    expect(message).toMatch(/drafting table/);
  });

  it('beyond as many open ones as an account may have', async () => {
    const busy = await openMaker(server.address);
    const own = await newGown(busy);
    for (let count = 0; count < mostKept.openClasses; count += 1) {
      await busy.call(openClass, wish, own);
    }
    const { code } = await busy.refused(409, openClass, wish, own);
    expect(code).toBe('account-full');
    const [first] = (await busy.call(listClasses, undefined)).classes;
    await busy.call(withdrawClass, undefined, { classId: first?.id ?? '' });
    await busy.call(openClass, wish, own);
  });

  it('to an address that asks more often than a whole class does', async () => {
    const narrow = await startServer({ limits: { classVisitsPerMinute: 2 } });
    const visitor = openBrowser(narrow.address);
    await visitor.refused(404, visitClass, undefined, { token: nobodys });
    await visitor.refused(404, followClass, undefined, { token: nobodys });
    const { code } = await visitor.refused(429, visitClass, undefined, { token: nobodys });
    expect(code).toBe('too-many-requests');
    await narrow.close();
  });
});

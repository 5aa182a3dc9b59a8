import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  archiveGown,
  createGown,
  duplicateGown,
  listGowns,
  renameGown,
  saveGown,
  unarchiveGown,
} from '#shared/api/gowns.ts';
import {
  listRevisions,
  nameRevision,
  readRevision,
  returnToRevision,
} from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { type Browser, content, openMaker } from './support/maker.ts';
import { card } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';
import { newGown, read, save } from './support/saved-gown.ts';

let server: ServerUnderTest;
let maker: Browser & { readonly email: string };
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

describe('a gown', () => {
  it('keeps its three inputs, what was typed, and the pieces as the engine draws them', async () => {
    const gown = await read(maker, await newGown(maker));
    const draft = draftAny({ ...content().inputs, card });
    expect(gown.content).toEqual(content());
    expect(gown).toMatchObject({
      title: 'Gala gown',
      version: 1,
      drawnBy: engineVersion,
      fresh: true,
    });
    expect(gown.drawn?.number).toBe(draft.number);
    expect(gown.drawn?.pieces).toEqual(JSON.parse(JSON.stringify(draft.pieces)));
    expect(gown.redrawing).toBeNull();
  });

  it('stands in the list with a small picture of its pieces', async () => {
    const { gownId } = await newGown(maker);
    const { gowns } = await maker.call(listGowns, undefined);
    const picture = gowns.find((each) => each.id === gownId)?.picture;
    expect(picture?.path).toMatch(/^(M\d+ \d+(L\d+ \d+)+Z){8}$/);
    expect(picture?.path.length).toBeLessThan(1500);
    const places = [...(picture?.path.matchAll(/(\d+) (\d+)/g) ?? [])];
    expect(Math.max(...places.map((each) => Number(each[1])))).toBeLessThanOrEqual(
      picture?.width ?? 0,
    );
    expect(Math.max(...places.map((each) => Number(each[2])))).toBeLessThanOrEqual(
      picture?.height ?? 0,
    );
  });

  it('half filled in is kept as it is, without pieces', async () => {
    const { inputs, typed } = content();
    const { hipGirth: _, ...part } = card;
    const half = { typed, unread: [], inputs: { ...inputs, card: part } };
    const body = { saveId: randomUUID(), title: 'Begun', content: half };
    const { id: gownId } = await maker.call(createGown, body);
    const gown = await read(maker, { gownId });
    expect(gown.content).toEqual(half);
    expect(gown).toMatchObject({ drawn: null, drawnBy: null, fresh: false });
  });

  it.each([
    ['a field that cannot be read', { unread: ['style.kneeLevel'] }, {}],
    ['a measure out of bounds', { unread: [] }, { waistGirth: 92 }],
  ])('keeps the last good pieces beside %s', async (_case, state, change) => {
    const gown = await newGown(maker);
    const before = await read(maker, gown);
    const bad = { ...content({ ...change, typed: { 'style.kneeLevel': '10 c\u0000' } }), ...state };
    await maker.call(saveGown, { ...save(1), content: bad }, gown);
    const after = await read(maker, gown);
    expect(after.content.typed.fields['style.kneeLevel']).toBe('10 c\ufffd');
    expect(after).toMatchObject({ version: 2, fresh: false, drawn: before.drawn });
    await maker.call(saveGown, save(2, { waistGirth: 700 }), gown);
    expect(await read(maker, gown)).toMatchObject({
      fresh: true,
      drawn: { inputs: { card: { waistGirth: 700 } } },
    });
  });

  it('is renamed, archived and brought back without a new version', async () => {
    const gown = await newGown(maker);
    await maker.call(renameGown, { title: ' Winter ball ' }, gown);
    await maker.call(archiveGown, undefined, gown);
    expect(await read(maker, gown)).toMatchObject({
      title: 'Winter ball',
      archived: true,
      version: 1,
    });
    await maker.call(unarchiveGown, undefined, gown);
    expect((await read(maker, gown)).archived).toBe(false);
  });

  it('is duplicated with its pieces, and the two go their own ways', async () => {
    const gown = await newGown(maker);
    const copy = { saveId: randomUUID(), title: 'Gala gown, shorter' };
    const { id } = await maker.call(duplicateGown, copy, gown);
    await maker.call(saveGown, save(1, { waistGirth: 700 }), { gownId: id });
    const [first, second] = [await read(maker, gown), await read(maker, { gownId: id })];
    expect(first).toMatchObject({ version: 1, content: content() });
    expect(second).toMatchObject({ version: 2, title: 'Gala gown, shorter' });
    expect(second.drawn?.number).not.toBe(first.drawn?.number);
  });
});

describe('revisions', () => {
  it('are named, looked at and returned to, and nothing is overwritten', async () => {
    const gown = await newGown(maker, { waistGirth: 700 });
    const named = { saveId: randomUUID(), baseVersion: 1, name: 'First fitting' };
    const { id: revisionId } = await maker.call(nameRevision, named, gown);
    await maker.call(saveGown, save(1, { waistGirth: 740 }), gown);
    const place = { ...gown, revisionId };
    const then = await maker.call(readRevision, undefined, place);
    expect(then).toMatchObject({
      name: 'First fitting',
      automatic: false,
      version: 1,
      drawnBy: engineVersion,
    });
    expect(then.drawn?.pieces.length).toBeGreaterThan(4);
    const back = { saveId: randomUUID(), baseVersion: 2 };
    const answer = await maker.call(returnToRevision, back, place);
    expect(answer.version).toBe(3);
    expect(await maker.call(returnToRevision, back, place)).toEqual(answer);
    const now = await read(maker, gown);
    expect(now).toMatchObject({
      version: 3,
      content: then.content,
      drawn: then.drawn,
      fresh: true,
    });
    const { revisions } = await maker.call(listRevisions, undefined, gown);
    expect(revisions.map(({ name, version, automatic }) => [name, version, automatic])).toEqual([
      ['Before returning to First fitting', 2, true],
      ['First fitting', 1, false],
    ]);
    const before = { ...gown, revisionId: revisions[0]?.id ?? '' };
    await maker.call(returnToRevision, { saveId: randomUUID(), baseVersion: 3 }, before);
    expect((await read(maker, gown)).content.inputs.card.waistGirth).toBe(740);
    const after = await maker.call(listRevisions, undefined, gown);
    expect(after.revisions[0]).toMatchObject({ version: 3, parentId: revisionId });
  });
});

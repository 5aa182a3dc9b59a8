import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Client } from 'pg';
import {
  createGown,
  deleteGown,
  duplicateGown,
  gownSchema,
  readGown,
  saveGown,
} from '#shared/api/gowns.ts';
import { signIn } from '#shared/api/accounts.ts';
import {
  listRevisions,
  nameRevision,
  readRevision,
  returnToRevision,
} from '#shared/api/revisions.ts';
import {
  type Browser,
  content,
  iphone,
  openBrowser,
  openMaker,
  password,
} from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';
import { newGown, read, save } from './support/saved-gown.ts';

let server: ServerUnderTest;
let maker: Browser & { readonly email: string };
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

describe('numbers of saves', () => {
  it('are forgotten after thirty days but the one that made the gown, and none is done twice', async () => {
    const made = { saveId: randomUUID(), title: 'Old', content: content() };
    const { id: gownId } = await maker.call(createGown, made);
    const first = save(1, { waistGirth: 700 });
    await maker.call(saveGown, first, { gownId });
    const client = new Client({ connectionString: server.databaseUrl });
    await client.connect();
    const numbers = async () => {
      const { rows } = await client.query<{ version: number }>(
        'select version from saves where record = $1 order by version',
        [gownId],
      );
      return rows.map(({ version }) => version);
    };
    const second = save(2, { waistGirth: 710 });
    await maker.call(saveGown, second, { gownId });
    expect(await numbers()).toEqual([1, 2, 3]);
    await client.query("update saves set saved_at = now() - interval '31 days' where record = $1", [
      gownId,
    ]);
    await maker.call(saveGown, save(3, { waistGirth: 720 }), { gownId });
    expect(await numbers()).toEqual([1, 4]);
    await client.end();
    expect((await maker.call(createGown, made)).id).toBe(gownId);
    const late = await maker.refused(409, saveGown, first, { gownId });
    expect(late.code).toBe('conflict');
    expect((await read(maker, { gownId })).version).toBe(4);
  });
});

describe('a gown that is deleted', () => {
  it('goes with its revisions, for its maker alone, and a late save finds nothing', async () => {
    const gown = await newGown(maker);
    const revision = { saveId: randomUUID(), baseVersion: 1, name: 'Before the fitting' };
    const { id: revisionId } = await maker.call(nameRevision, revision, gown);
    const stranger = await openMaker(server.address);
    await stranger.refused(404, deleteGown, undefined, gown);
    await maker.call(deleteGown, undefined, gown);
    await maker.refused(404, readGown, undefined, gown);
    await maker.refused(404, readRevision, undefined, { ...gown, revisionId });
    await maker.refused(404, saveGown, save(1), gown);
    await maker.refused(404, deleteGown, undefined, gown);
  });
});

describe('two tabs or two people on one gown', () => {
  it('the later save is refused, and is told what stands there, since when and from where', async () => {
    const gown = await newGown(maker);
    const phone = openBrowser(server.address, iphone);
    await phone.call(signIn, { email: maker.email, password });
    await phone.call(saveGown, save(1, { waistGirth: 700 }), gown);
    const late = save(1, { waistGirth: 720 });
    const { code, message, current } = await maker.refused(409, saveGown, late, gown);
    expect(code).toBe('conflict');
    expect(message).toContain('Safari on iPhone');
    const there = gownSchema.parse(current);
    expect(there).toMatchObject({
      version: 2,
      lastSave: { device: 'Safari on iPhone', here: false },
    });
    expect(there.content.inputs.card.waistGirth).toBe(700);
    expect(there.drawn?.pieces.length).toBeGreaterThan(4);
    expect((await phone.call(readGown, undefined, gown)).lastSave.here).toBe(true);
    expect((await read(maker, gown)).content.inputs.card.waistGirth).toBe(700);
  });

  it('of many at the same moment one is saved, and the others are told', async () => {
    const gown = await newGown(maker);
    const replies = await Promise.all(
      Array.from({ length: 12 }, (_, i) =>
        maker.send(saveGown, save(1, { waistGirth: 700 + i }), gown),
      ),
    );
    const statuses = replies.map((each) => each.status).sort();
    expect(statuses).toEqual([200, ...Array<number>(11).fill(409)]);
    expect((await read(maker, gown)).version).toBe(2);
  });

  it('who chooses her own keeps the other one as a revision', async () => {
    const gown = await newGown(maker);
    await maker.call(saveGown, save(1, { waistGirth: 700 }), gown);
    const mine = { ...save(2, { waistGirth: 720 }), keepReplaced: true };
    await maker.call(saveGown, mine, gown);
    const { revisions } = await maker.call(listRevisions, undefined, gown);
    expect(revisions).toMatchObject([
      { name: 'As saved from Firefox on Linux', automatic: true, version: 2 },
    ]);
    const other = await maker.call(readRevision, undefined, {
      ...gown,
      revisionId: revisions[0]?.id ?? '',
    });
    expect(other.content.inputs.card.waistGirth).toBe(700);
  });

  it('a gown cannot be named from a version that is gone, nor returned from one', async () => {
    const gown = await newGown(maker);
    const { id: revisionId } = await maker.call(
      nameRevision,
      { saveId: randomUUID(), baseVersion: 1, name: 'First fitting' },
      gown,
    );
    await maker.call(saveGown, save(1), gown);
    const stale = { saveId: randomUUID(), baseVersion: 1 };
    await maker.refused(409, nameRevision, { ...stale, name: 'Second' }, gown);
    await maker.refused(409, returnToRevision, stale, { ...gown, revisionId });
  });

  it('a page that draws by other rules than the server is told to open again', async () => {
    const gown = await newGown(maker);
    const { code } = await maker.refused(409, saveGown, { ...save(1), engine: '0.0.1' }, gown);
    expect(code).toBe('engine-changed');
    expect((await read(maker, gown)).version).toBe(1);
  });
});

describe('a save that is sent again', () => {
  it('is answered as before and done once, also when others came after it', async () => {
    const gown = await newGown(maker);
    const first = save(1, { waistGirth: 700 });
    const answer = await maker.call(saveGown, first, gown);
    expect(await maker.call(saveGown, first, gown)).toEqual(answer);
    await maker.call(saveGown, save(2, { waistGirth: 710 }), gown);
    expect(await maker.call(saveGown, first, gown)).toEqual(answer);
    expect(await read(maker, gown)).toMatchObject({
      version: 3,
      content: { inputs: { card: { waistGirth: 710 } } },
    });
  });

  it('at the same moment as itself is done once', async () => {
    const gown = await newGown(maker);
    const once = save(1);
    const replies = await Promise.all(
      Array.from({ length: 6 }, () => maker.call(saveGown, once, gown)),
    );
    expect(new Set(replies.map((each) => each.version))).toEqual(new Set([2]));
    const body = { saveId: randomUUID(), title: 'Once', content: content() };
    const made = await Promise.all(Array.from({ length: 6 }, () => maker.call(createGown, body)));
    expect(new Set(made.map((each) => each.id)).size).toBe(1);
    const copy = { saveId: randomUUID(), title: 'Copied once' };
    const copies = await Promise.all([1, 2, 3].map(() => maker.call(duplicateGown, copy, gown)));
    expect(new Set(copies.map((each) => each.id)).size).toBe(1);
    const named = { saveId: randomUUID(), baseVersion: 2, name: 'Once' };
    const names = await Promise.all([1, 2, 3].map(() => maker.call(nameRevision, named, gown)));
    expect(new Set(names.map((each) => each.id)).size).toBe(1);
  });

  it('is not mistaken for another gown’s', async () => {
    const [one, two] = [await newGown(maker), await newGown(maker)];
    const body = save(1);
    await maker.call(saveGown, body, one);
    expect((await maker.refused(422, saveGown, body, two)).message).toContain('number of its own');
    const again = { saveId: body.saveId, title: 'T', content: content() };
    await maker.refused(422, createGown, again);
    const { id: gownId } = await maker.call(createGown, { ...again, saveId: randomUUID() });
    expect((await read(maker, { gownId })).version).toBe(1);
    await maker.refused(422, saveGown, { ...body, baseVersion: 2 }, one);
  });
});

import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { saveGown } from '#shared/api/gowns.ts';
import { listRevisions, readRevision } from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { type Browser, openMaker } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';
import { ask } from './support/question.ts';
import { newGown, read, save } from './support/saved-gown.ts';

let server: ServerUnderTest;
let maker: Browser & { readonly email: string };
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

describe('a gown an older engine drew', () => {
  /** As if an engine before this one had drawn every point of one piece 3 mm farther out. */
  async function olderGown(): Promise<{ gownId: string }> {
    const gown = await newGown(maker);
    const { drawn } = await read(maker, gown);
    const moved = drawn?.pieces.map((piece) =>
      piece.name === 'back-middle' ? shifted(piece, 3) : piece,
    );
    await ask(server.databaseUrl, `update gowns set engine = '0.9.0', pieces = $2 where id = $1`, [
      gown.gownId,
      JSON.stringify(moved),
    ]);
    return gown;
  }
  const shifted = <T>(value: T, by: number): T =>
    JSON.parse(JSON.stringify(value), (key, each: unknown) =>
      key === 'x' && typeof each === 'number' ? each + by : each,
    ) as T;

  it('keeps its pieces, and tells what the present one would draw otherwise', async () => {
    const gown = await read(maker, await olderGown());
    expect(gown.drawnBy).toBe('0.9.0');
    expect(gown.redrawing).toMatchObject({
      engine: engineVersion,
      problems: [],
      changes: [{ piece: 'back-middle', change: 'shape' }],
    });
    expect(gown.redrawing?.deviation).toBeGreaterThan(2.9);
    expect(gown.redrawing?.deviation).toBeLessThanOrEqual(3.001);
  });

  it('changes its inputs without its pieces until the maker agrees', async () => {
    const place = await olderGown();
    const before = await read(maker, place);
    await maker.call(saveGown, { ...save(1, { waistGirth: 700 }), engine: '0.9.0' }, place);
    const after = await read(maker, place);
    expect(after).toMatchObject({
      version: 2,
      drawnBy: '0.9.0',
      fresh: false,
      drawn: before.drawn,
    });
    expect(after.content.inputs.card.waistGirth).toBe(700);
  });

  it('is drawn anew once she agrees, and as it was drawn stays as a revision', async () => {
    const place = await olderGown();
    const before = await read(maker, place);
    await maker.call(saveGown, save(1), place);
    const after = await read(maker, place);
    expect(after).toMatchObject({ drawnBy: engineVersion, fresh: true, redrawing: null });
    const { revisions } = await maker.call(listRevisions, undefined, place);
    expect(revisions).toMatchObject([
      { name: 'As drawn by engine 0.9.0', automatic: true, drawnBy: '0.9.0' },
    ]);
    const revisionId = revisions[0]?.id ?? '';
    const old = await maker.call(readRevision, undefined, { ...place, revisionId });
    expect(old.drawn).toEqual(before.drawn);
  });

  it('says why where the present one would not draw it at all', async () => {
    const place = await newGown(maker);
    await ask(
      server.databaseUrl,
      `update gowns set engine = '0.9.0', drawn_from = jsonb_set(drawn_from, '{card,waistGirth}', '92') where id = $1`,
      [place.gownId],
    );
    const { redrawing } = await read(maker, place);
    expect(redrawing?.problems).toMatchObject([{ field: 'card.waistGirth', code: 'out-of-range' }]);
  });
});

import { randomUUID } from 'node:crypto';
import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { createGown, gownSchema, readGown, regradeGown } from '#shared/api/gowns.ts';
import { createMeasureCard, readMeasureCard, saveMeasureCard } from '#shared/api/measure-cards.ts';
import { listRevisions, readRevision, returnToRevision } from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { ask } from './support/question.ts';
import { newGown, read } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let maker: Browser;
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

async function newCard(
  change: {
    readonly waistGirth?: number | undefined;
    readonly date?: string;
    readonly name?: string;
  } = {},
): Promise<string> {
  const { typed, inputs } = content();
  const card = Object.fromEntries(
    Object.entries({ ...inputs.card, ...change }).filter(([, value]) => value !== undefined),
  );
  const body = { saveId: randomUUID(), name: 'Card', content: { typed, card } };
  return (await maker.call(createMeasureCard, body)).id;
}

const order = (cardId: string, baseVersion = 1) => ({
  saveId: randomUUID(),
  baseVersion,
  engine: engineVersion,
  cardId,
  depths: { topDrop: 190 },
});

describe('a regrade is refused', () => {
  it('to nobody, for a gown or a card that is not there', async () => {
    const gown = await newGown(maker);
    const cardId = await newCard();
    await openBrowser(server.address).refused(401, regradeGown, order(cardId), gown);
    await maker.refused(404, regradeGown, order(cardId), { gownId: randomUUID() });
    await maker.refused(404, regradeGown, order(randomUUID()), gown);
  });

  it('for a card that is not filled in, or a body no gown can be drawn on, and keeps the gown', async () => {
    const gown = await newGown(maker);
    const part = await newCard({ waistGirth: undefined });
    const missing = await maker.refused(422, regradeGown, order(part), gown);
    expect(missing.problems?.[0]?.field).toBe('card.waistGirth');
    const odd = await newCard({ waistGirth: 92 });
    const outside = await maker.refused(422, regradeGown, order(odd), gown);
    expect(outside.problems?.[0]?.field).toBe('card.waistGirth');
    expect((await read(maker, gown)).version).toBe(1);
    expect((await maker.call(listRevisions, undefined, gown)).revisions).toEqual([]);
  });

  it('from a version that is gone, with the gown as it stands', async () => {
    const gown = await newGown(maker);
    const cardId = await newCard();
    const { code, current } = await maker.refused(409, regradeGown, order(cardId, 7), gown);
    expect(code).toBe('conflict');
    expect(gownSchema.parse(current).version).toBe(1);
  });

  it('by a page of older rules', async () => {
    const gown = await newGown(maker);
    const older = { ...order(await newCard()), engine: '0.1.0' };
    expect((await maker.refused(409, regradeGown, older, gown)).code).toBe('engine-changed');
  });

  it('to a card of somebody else than the gown is for', async () => {
    const gown = await newGown(maker);
    await maker.call(regradeGown, order(await newCard()), gown);
    const other = order(await newCard({ name: 'Somebody else' }), 2);
    expect((await maker.refused(409, regradeGown, other, gown)).code).toBe('another-person');
  });
});

/**
 * Saves a card beside the server each time a request waits for the gown. Two hands hold the gown in
 * turn, the next one queued behind the request before the last one lets go.
 */
async function savingMeanwhile<T>(
  gownId: string,
  cardId: string,
  waistGirths: readonly number[],
  request: () => Promise<T>,
): Promise<T> {
  const hands = await Promise.all(
    waistGirths.map(async () => {
      const hand = new Client({ connectionString: server.databaseUrl });
      await hand.connect();
      await hand.query('begin');
      return hand;
    }),
  );
  const hold = (hand: Client | undefined) =>
    hand?.query('select 1 from gowns where id = $1 for update', [gownId]);
  const waiting = (count: number) => async () => {
    const rows = await ask(
      server.databaseUrl,
      `select 1 from pg_stat_activity where datname = current_database() and wait_event_type = 'Lock'`,
    );
    return rows.length === count;
  };
  const wait = { timeout: 20_000, interval: 20 };
  try {
    await hold(hands[0]);
    const answer = request();
    for (const [index, hand] of hands.entries()) {
      await vi.waitUntil(waiting(1), wait);
      const next = hold(hands[index + 1]);
      if (next !== undefined) await vi.waitUntil(waiting(2), wait);
      await hand.query(
        `update measure_cards set version = version + 1, card = jsonb_set(card, '{waistGirth}', $2) where id = $1`,
        [cardId, String(waistGirths[index])],
      );
      await hand.query('commit');
      await next;
    }
    return await answer;
  } finally {
    await Promise.all(hands.map((hand) => hand.end()));
  }
}

describe('a card that is saved while a gown is drawn on it', () => {
  it('is drawn again: the gown has the measures of the card it claims', async () => {
    const gown = await newGown(maker);
    const cardId = await newCard({ waistGirth: 730 });
    const regrade = () => maker.call(regradeGown, order(cardId), gown);
    await savingMeanwhile(gown.gownId, cardId, [760], regrade);
    const after = await read(maker, gown);
    expect(after).toMatchObject({ version: 2, cardId });
    expect(after.content.inputs.card.waistGirth).toBe(760);
    expect(after.drawn?.inputs.card.waistGirth).toBe(760);
    const kept = await maker.call(readMeasureCard, undefined, { cardId });
    expect(kept.content.card.waistGirth).toBe(760);
  });

  it('again and again is refused, with the gown as it stands', async () => {
    const gown = await newGown(maker);
    const cardId = await newCard({ waistGirth: 730 });
    const regrade = () => maker.refused(409, regradeGown, order(cardId), gown);
    const { code, current } = await savingMeanwhile(gown.gownId, cardId, [740, 750, 760], regrade);
    expect(code).toBe('conflict');
    expect(gownSchema.parse(current)).toMatchObject({ version: 1, cardId: null });
  });
});

describe('a saved gown regraded a year later', () => {
  it('is a new revision that knows its parent; nothing saved is overwritten', async () => {
    const gown = await newGown(maker, {
      typed: { 'style.heelHeight': '6', 'style.topDrop': '18,5' },
    });
    const before = await read(maker, gown);
    const cardId = await newCard({ waistGirth: 760, date: '2027-10-20' });
    const asked = order(cardId);
    const answers = await Promise.all([1, 2].map(() => maker.call(regradeGown, asked, gown)));
    expect(answers.map(({ version }) => version)).toEqual([2, 2]);

    const after = await read(maker, gown);
    expect(after).toMatchObject({ version: 2, fresh: true, cardId });
    expect(after.content.inputs.card).toMatchObject({ waistGirth: 760, date: '2027-10-20' });
    // Letters typed for figures that are others now are gone; the rest stays as typed.
    expect(after.content.typed.fields).toEqual({ 'style.heelHeight': '6' });

    const { revisions } = await maker.call(listRevisions, undefined, gown);
    const [child, parent] = [
      'For the card of 20 October 2027',
      'Before the card of 20 October 2027',
    ].map((name) => revisions.find((each) => each.name === name));
    expect(revisions).toHaveLength(2);
    expect(child).toMatchObject({ version: 2, parentId: parent?.id, automatic: false, cardId });
    expect(parent).toMatchObject({ version: 1, automatic: false });
    const kept = await maker.call(readRevision, undefined, {
      ...gown,
      revisionId: parent?.id ?? '',
    });
    expect(kept.content).toEqual(before.content);
    expect(kept.drawn).toEqual(before.drawn);
  });

  it('has the pieces of a fresh draft of the same cards', async () => {
    const gown = await newGown(maker);
    const cardId = await newCard({ waistGirth: 700 });
    await maker.call(regradeGown, order(cardId), gown);
    const { drawn } = await read(maker, gown);
    if (drawn === null) throw new Error('not drawn');
    const fresh = draftAny(drawn.inputs);
    // Its number may differ: the database keeps the figures in an order of its own.
    const lines = (pieces: typeof fresh.pieces) =>
      pieces.map(({ name, edges, darts, cutLine }) => ({ name, edges, darts, cutLine }));
    expect(lines(drawn.pieces)).toEqual(JSON.parse(JSON.stringify(lines(fresh.pieces))));
  });

  it('stays a block where it was one', async () => {
    const { typed, inputs } = content();
    const block = {
      typed,
      unread: [],
      inputs: {
        garment: 'skirt-block' as const,
        card: inputs.card,
        style: { length: 600 },
        rules: inputs.rules,
      },
    };
    const { id: gownId } = await maker.call(createGown, {
      saveId: randomUUID(),
      title: 'Skirt block',
      content: block,
    });
    const cardId = await newCard({ waistGirth: 760 });
    await maker.call(regradeGown, { ...order(cardId), depths: {} }, { gownId });
    expect((await read(maker, { gownId })).content.inputs).toMatchObject({
      garment: 'skirt-block',
      style: { length: 600 },
      card: { waistGirth: 760 },
    });
  });

  it('goes back to what it was, and the card it was drawn from is still kept as it was', async () => {
    const gown = await newGown(maker);
    const first = await newCard({ waistGirth: 730 });
    await maker.call(regradeGown, order(first), gown);
    const second = await newCard({ waistGirth: 750 });
    await maker.call(regradeGown, order(second, 2), gown);
    const { revisions } = await maker.call(listRevisions, undefined, gown);
    const earlier = revisions.find(({ version }) => version === 2);
    await maker.call(
      returnToRevision,
      { saveId: randomUUID(), baseVersion: 3 },
      { ...gown, revisionId: earlier?.id ?? '' },
    );
    expect(await maker.call(readGown, undefined, gown)).toMatchObject({ cardId: first });
    // Both cards were used: neither may be changed.
    for (const cardId of [first, second]) {
      const kept = await maker.call(readMeasureCard, undefined, { cardId });
      const save = { saveId: randomUUID(), baseVersion: 1, content: kept.content };
      expect((await maker.refused(409, saveMeasureCard, save, { cardId })).code).toBe(
        'card-in-use',
      );
    }
  });
});

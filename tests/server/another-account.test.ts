import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as accountLines from '#shared/api/accounts.ts';
import type { Endpoint } from '#shared/api/endpoint.ts';
import * as gownLines from '#shared/api/gowns.ts';
import * as cardLines from '#shared/api/measure-cards.ts';
import * as peopleLines from '#shared/api/people.ts';
import * as revisionLines from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

const isLine = (value: unknown): value is Endpoint =>
  typeof value === 'object' && value !== null && 'method' in value && 'reply' in value;

const lines = [accountLines, gownLines, revisionLines, cardLines, peopleLines].flatMap((each) =>
  Object.values<unknown>(each).filter(isLine),
);
const withId = lines.filter((line) => line.path.includes(':'));

/** A right body for every line that takes one, by the last word of its path. */
const bodies: Readonly<Record<string, () => object>> = {
  save: () => ({ saveId: randomUUID(), baseVersion: 1, engine: engineVersion, content: content() }),
  rename: () => ({ title: 'Taken' }),
  duplicate: () => ({ saveId: randomUUID(), title: 'Taken' }),
  revisions: () => ({ saveId: randomUUID(), baseVersion: 1, name: 'Taken' }),
  return: () => ({ saveId: randomUUID(), baseVersion: 1 }),
  card: () => ({ cardId: ids['cardId'] }),
  regrade: () => ({
    saveId: randomUUID(),
    baseVersion: 1,
    engine: engineVersion,
    cardId: ids['cardId'],
    depths: {},
  }),
};
const cardBodies: typeof bodies = {
  save: () => ({ saveId: randomUUID(), baseVersion: 1, content: cardContent }),
  rename: () => ({ name: 'Taken' }),
  duplicate: () => ({ saveId: randomUUID(), name: 'Taken' }),
  next: () => ({ saveId: randomUUID(), name: 'Taken', takenOn: '2027-10-12' }),
  give: () => ({ personId: ids['personId'] }),
};
const peopleBodies: typeof bodies = {
  rename: () => ({ name: 'Taken' }),
  delete: () => ({ cards: [], gowns: [] }),
};
const { typed, inputs } = content();
const cardContent = { typed, card: inputs.card };

const bodiesOf = ({ path }: Endpoint): typeof bodies => {
  if (path.startsWith('/api/people')) return peopleBodies;
  return path.startsWith('/api/measure-cards') ? cardBodies : bodies;
};

function bodyFor(line: Endpoint): object | undefined {
  if (line.body === undefined) return undefined;
  const word = line.path.split('/').at(-1) ?? '';
  const body = bodiesOf(line)[word]?.();
  if (body === undefined) throw new Error(`A body for ${line.path} is missing here.`);
  return body;
}

let server: ServerUnderTest;
let owner: Browser;
let stranger: Browser;
let ids: Readonly<Record<string, string>>;

beforeAll(async () => {
  server = await startServer();
  owner = await openMaker(server.address);
  stranger = await openMaker(server.address);
  const first = { saveId: randomUUID(), title: 'Hers', content: content() };
  const { id: gownId } = await owner.call(gownLines.createGown, first);
  const { id: revisionId } = await owner.call(
    revisionLines.nameRevision,
    { saveId: randomUUID(), baseVersion: 1, name: 'First' },
    { gownId },
  );
  const { id: cardId } = await owner.call(cardLines.createMeasureCard, {
    saveId: randomUUID(),
    name: 'Hers',
    content: cardContent,
  });
  const { id: personId } = await owner.call(peopleLines.createPerson, {
    saveId: randomUUID(),
    name: 'Somebody else of hers',
  });
  ids = { gownId, revisionId, cardId, personId };
});
afterAll(() => server.close());

describe('everything with a number in its address', () => {
  it('is walked here', () => {
    expect(withId.length).toBe(25);
  });

  it.each(withId)('$method $path: nobody signed in is told nothing', async (line) => {
    await openBrowser(server.address).refused(401, line, bodyFor(line), ids);
  });

  it.each(withId)(
    '$method $path: another account’s is not found, and no different from none',
    async (line) => {
      const theirs = await stranger.refused(404, line, bodyFor(line), ids);
      const none = {
        gownId: randomUUID(),
        revisionId: randomUUID(),
        cardId: randomUUID(),
        personId: randomUUID(),
      };
      expect(await stranger.refused(404, line, bodyFor(line), none)).toEqual(theirs);
      expect(theirs.code).toBe('not-found');
      expect(theirs.current).toBeUndefined();
    },
  );

  it.each(withId)('$method $path: what is no number is not found', async (line) => {
    const odd = { gownId: '17', revisionId: "' or 1=1", cardId: '../gowns', personId: '-1' };
    await owner.refused(404, line, bodyFor(line), odd);
  });

  it('a stranger’s own gown opens nobody else’s revision', async () => {
    const { id: gownId } = await stranger.call(gownLines.createGown, {
      saveId: randomUUID(),
      title: 'Theirs',
      content: content(),
    });
    const mixed = { ...ids, gownId };
    await stranger.refused(404, revisionLines.readRevision, undefined, mixed);
    const save = { saveId: randomUUID(), baseVersion: 1 };
    await stranger.refused(404, revisionLines.returnToRevision, save, mixed);
  });

  it('after all that the owner’s things are as they were', async () => {
    const { gowns } = await owner.call(gownLines.listGowns, undefined);
    expect(gowns).toMatchObject([{ title: 'Hers', version: 1, archived: false }]);
    const { cards } = await owner.call(cardLines.listMeasureCards, undefined);
    expect(cards).toMatchObject([{ name: 'Hers', version: 1, archived: false }]);
    const lists = await stranger.call(gownLines.listGowns, undefined);
    expect(lists.gowns.map((each) => each.title)).toEqual(['Theirs']);
    expect((await stranger.call(cardLines.listMeasureCards, undefined)).cards).toEqual([]);
    expect((await stranger.call(peopleLines.listPeople, undefined)).people).toEqual([]);
    expect((await owner.call(peopleLines.listPeople, undefined)).people).toHaveLength(2);
  });

  /** What goes is named as it is by then. */
  async function bodyNow(line: Endpoint): Promise<object | undefined> {
    if (!line.path.endsWith('/delete')) return bodyFor(line);
    const params = { personId: ids['personId'] ?? '' };
    const { cards, gowns } = await owner.call(peopleLines.readPerson, undefined, params);
    return { cards, gowns };
  }

  it('and to the owner every line answers', async () => {
    // Saving a card comes before it is laid on a gown, and deleting whose it is last of all.
    const late = ({ path }: Endpoint) =>
      ['/card', '/regrade', '/delete'].findIndex((end) => path.endsWith(end));
    const order = [...withId].sort((a, b) => a.method.localeCompare(b.method) || late(a) - late(b));
    let versions = { gown: 1, card: 1 };
    for (const line of order) {
      const isCard = line.path.includes('measure-cards');
      const body = await bodyNow(line);
      const version = isCard ? versions.card : versions.gown;
      const sent = body && 'baseVersion' in body ? { ...body, baseVersion: version } : body;
      const reply = await owner.send(line, sent, ids);
      expect([line.path, reply.status]).toEqual([line.path, 200]);
      const told: unknown = await reply.json();
      const saves = /(save|return|regrade)$/.test(line.path);
      if (saves && typeof told === 'object' && told !== null && 'version' in told) {
        const next = Number(told.version);
        versions = isCard ? { ...versions, card: next } : { ...versions, gown: next };
      }
    }
    expect(versions).toEqual({ gown: 4, card: 2 });
  });
});

import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createGown, noteCard, readGown, regradeGown } from '#shared/api/gowns.ts';
import {
  createMeasureCard,
  duplicateMeasureCard,
  giveMeasureCard,
  readMeasureCard,
  startNextCard,
} from '#shared/api/measure-cards.ts';
import { createPerson, listPeople } from '#shared/api/people.ts';
import { nameRevision } from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { type Browser, content, openMaker } from './support/maker.ts';
import { newGown } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let maker: Browser;
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

const newPerson = async (name: string) => ({
  personId: (await maker.call(createPerson, { saveId: randomUUID(), name })).id,
});

const cardOf = async (person: { readonly personId: string }, waistGirth?: number) => {
  const { typed, inputs } = content(waistGirth === undefined ? {} : { waistGirth });
  const body = { saveId: randomUUID(), name: 'Card', content: { typed, card: inputs.card } };
  return { cardId: (await maker.call(createMeasureCard, { ...body, ...person })).id };
};

const nextOf = async (card: { readonly cardId: string }) => {
  const body = { saveId: randomUUID(), name: 'A year on', takenOn: '2027-10-12' };
  return { cardId: (await maker.call(startNextCard, body, card)).id };
};

const regraded = (gown: { readonly gownId: string }, card: { readonly cardId: string }) => {
  const order = { saveId: randomUUID(), baseVersion: 1, engine: engineVersion, depths: {} };
  return maker.call(regradeGown, { ...order, ...card }, gown);
};

const whose = async (card: { readonly cardId: string }) =>
  (await maker.call(readMeasureCard, undefined, card)).person.id;

describe('a card is not given to another person', () => {
  it('while its gown keeps revisions from a card of the first one, nor is that card', async () => {
    const [anna, beth] = [await newPerson('Anna'), await newPerson('Beth')];
    const first = await cardOf(anna);
    const second = await nextOf(first);
    const made = { saveId: randomUUID(), title: 'Ball gown', content: content(), ...first };
    const gown = { gownId: (await maker.call(createGown, made)).id };
    await regraded(gown, second);
    for (const card of [first, second]) {
      const { code, message } = await maker.refused(409, giveMeasureCard, beth, card);
      expect(code).toBe('another-person');
      expect(message).toMatch(/^“Ball gown” .*revisions.*Copy this card/);
      expect(await whose(card)).toBe(anna.personId);
    }
    expect((await maker.call(readGown, undefined, gown)).personId).toBe(anna.personId);
    // What the refusal advises can be done.
    const copy = { saveId: randomUUID(), name: 'Copy' };
    const { id: cardId } = await maker.call(duplicateMeasureCard, copy, second);
    await maker.call(giveMeasureCard, beth, { cardId });
    expect(await whose({ cardId })).toBe(beth.personId);
  });

  it('while its gown keeps other measures that were typed before there was a card', async () => {
    const [anna, beth] = [await newPerson('Anna Moor'), await newPerson('Beth Moor')];
    const gown = await newGown(maker);
    const card = await cardOf(anna, 760);
    await regraded(gown, card);
    const { code } = await maker.refused(409, giveMeasureCard, beth, card);
    expect(code).toBe('another-person');
  });
});

describe('the name on a card', () => {
  const named = (name: string) => {
    const { typed, inputs } = content();
    const card = { ...inputs.card, name };
    return { saveId: randomUUID(), name: 'Card', content: { typed, card } };
  };

  it('with nothing to see in it puts nobody on the list, and no card', async () => {
    const before = await maker.call(listPeople, undefined);
    for (const name of ['\u200b\u200b', '\u202e', '\u2060 \u00ad', '\u0007']) {
      const { code, problems } = await maker.refused(422, createMeasureCard, named(name));
      expect(code).toBe('bad-input');
      expect(problems?.[0]?.field).toBe('content.card.name');
    }
    expect(await maker.call(listPeople, undefined)).toEqual(before);
  });

  it('is cleaned as a name typed on the list is: the same person by both ways', async () => {
    for (const name of ['Ruth\u202e Hall', 'Ruth\n\u0007Hall\u2066', ' Ruth\tAmsel ']) {
      const person = { saveId: randomUUID(), name };
      const { id: personId } = await maker.call(createPerson, person);
      const { id: cardId } = await maker.call(createMeasureCard, named(name));
      const { people } = await maker.call(listPeople, undefined);
      const { person: onCard } = await maker.call(readMeasureCard, undefined, { cardId });
      expect(onCard.name).toBe(people.find(({ id }) => id === personId)?.name);
      expect(onCard.name).not.toMatch(/[\p{Cc}\p{Bidi_Control}]/u);
    }
  });
});

describe('a card is given to whose it is', () => {
  it('with its gown, where all the revisions have its own measures', async () => {
    const [anna, beth] = [await newPerson('Anna Holt'), await newPerson('Beth Holt')];
    const gown = await newGown(maker);
    const named = { saveId: randomUUID(), baseVersion: 1 };
    await maker.call(nameRevision, { ...named, name: 'Typed' }, gown);
    const card = await cardOf(anna);
    await maker.call(noteCard, card, gown);
    await maker.call(nameRevision, { ...named, saveId: randomUUID(), name: 'From the card' }, gown);
    await maker.call(giveMeasureCard, beth, card);
    expect(await whose(card)).toBe(beth.personId);
    expect((await maker.call(readGown, undefined, gown)).personId).toBe(beth.personId);
    await maker.call(giveMeasureCard, beth, card);
  });
});

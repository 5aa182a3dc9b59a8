import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  createGown,
  duplicateGown,
  listGowns,
  noteCard,
  readGown,
  regradeGown,
} from '#shared/api/gowns.ts';
import {
  createMeasureCard,
  giveMeasureCard,
  listMeasureCards,
  readMeasureCard,
  saveMeasureCard,
  startNextCard,
} from '#shared/api/measure-cards.ts';
import {
  createPerson,
  deletePerson,
  listPeople,
  personSchema,
  readPerson,
  renamePerson,
} from '#shared/api/people.ts';
import { nameRevision } from '#shared/api/revisions.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { mostKept } from '#server/http/most-kept.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { ask } from './support/question.ts';
import { newGown } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let maker: Browser & { readonly email: string };
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

const cardContent = (change: { readonly name?: string; readonly waistGirth?: number } = {}) => {
  const { typed, inputs } = content();
  return { typed, card: { ...inputs.card, ...change } };
};

const newPerson = async (name: string) => ({
  personId: (await maker.call(createPerson, { saveId: randomUUID(), name })).id,
});

const newCard = async (
  more: { readonly personId?: string; readonly name?: string } = {},
): Promise<{ cardId: string }> => {
  const { name = 'Tilda Rehm', ...rest } = more;
  const body = { saveId: randomUUID(), name: 'Winter', content: cardContent({ name }), ...rest };
  return { cardId: (await maker.call(createMeasureCard, body)).id };
};

const readCard = (card: { cardId: string }) => maker.call(readMeasureCard, undefined, card);

const save = (baseVersion: number, waistGirth: number) => ({
  saveId: randomUUID(),
  baseVersion,
  content: cardContent({ waistGirth }),
});

describe('the maker’s list of people refuses', () => {
  it('nobody, and a page from elsewhere', async () => {
    await openBrowser(server.address).refused(401, listPeople);
    const from = { origin: 'https://elsewhere.example' };
    const body = { saveId: randomUUID(), name: 'Tilda' };
    expect((await maker.send(createPerson, body, {}, from)).status).toBe(403);
  });

  it('a person without a name, and a card of a person who is not on it', async () => {
    const body = { saveId: randomUUID(), name: '  ' };
    expect((await maker.refused(422, createPerson, body)).problems?.[0]?.field).toBe('name');
    const card = { saveId: randomUUID(), name: 'Winter', content: cardContent() };
    await maker.refused(404, createMeasureCard, { ...card, personId: randomUUID() });
    // It was not kept for nobody either.
    const { cards } = await maker.call(listMeasureCards, undefined);
    expect(cards).toEqual([]);
  });

  it('more people than an account keeps', async () => {
    const other = await openMaker(server.address);
    await ask(
      server.databaseUrl,
      `insert into people select gen_random_uuid(), id, 'Person', now() from accounts, generate_series(1, $2) where email = $1`,
      [other.email, mostKept.people],
    );
    const { code } = await other.refused(409, createPerson, {
      saveId: randomUUID(),
      name: 'One more',
    });
    expect(code).toBe('account-full');
  });

  it('too many requests at once, with a time to come back', async () => {
    const slow = await startServer({ limits: { savesPerMinute: 1 } });
    try {
      const hasty = await openMaker(slow.address);
      await hasty.call(listPeople, undefined);
      expect((await hasty.refused(429, listPeople)).code).toBe('too-many-requests');
    } finally {
      await slow.close();
    }
  });

  it('to delete a person who has more by now than the maker was shown', async () => {
    const person = await newPerson('Grete Wolf');
    const shown = await maker.call(readPerson, undefined, person);
    const { cardId } = await newCard(person);
    const { code, current } = await maker.refused(
      409,
      deletePerson,
      { cards: shown.cards, gowns: [] },
      person,
    );
    expect(code).toBe('conflict');
    expect(personSchema.parse(current).cards).toEqual([cardId]);
    expect((await maker.call(readPerson, undefined, person)).cards).toEqual([cardId]);
  });
});

describe('a measure card', () => {
  it('belongs to who is named on it; the same name is the same person', async () => {
    const first = await readCard(await newCard({ name: 'Anka Holm' }));
    const second = await readCard(await newCard({ name: 'anka holm' }));
    expect(first.person.name).toBe('Anka Holm');
    expect(second.person.id).toBe(first.person.id);
    const nobody = await readCard(await newCard({ name: ' ' }));
    expect(nobody.person.name).toBe('Not named yet');
  });

  it('bears the day its measures were taken, or the day it was put here', async () => {
    expect((await readCard(await newCard())).takenOn).toBe('2026-10-12');
    const undated = cardContent();
    const { date: _, ...card } = undated.card;
    const body = { saveId: randomUUID(), name: 'Undated', content: { ...undated, card } };
    const { id: cardId } = await maker.call(createMeasureCard, body);
    const kept = await readCard({ cardId });
    expect(kept.takenOn).toMatch(/^\d{4}-\d{2}-\d{2}$/);
    expect(kept.content.card.date).toBe(kept.takenOn);
  });

  it('is the start of the next one, which is a year younger and stays the same person’s', async () => {
    const first = await newCard();
    const next = { saveId: randomUUID(), name: 'A year on', takenOn: '2027-10-12' };
    const { id: cardId } = await maker.call(startNextCard, next, first);
    expect(await maker.call(startNextCard, next, first)).toMatchObject({ id: cardId });
    const [before, after] = [await readCard(first), await readCard({ cardId })];
    expect(after).toMatchObject({
      takenOn: '2027-10-12',
      startedFrom: first.cardId,
      person: before.person,
    });
    expect({ ...after.content.card, date: '' }).toEqual({ ...before.content.card, date: '' });
    await maker.call(saveMeasureCard, save(1, 752), { cardId });
    expect((await readCard({ cardId })).content.card.waistGirth).toBe(752);
    expect((await readCard(first)).content.card.waistGirth).toBe(738);
  });

  it('is never changed under a gown that used it: the save is refused and says which', async () => {
    const card = await newCard();
    await maker.call(saveMeasureCard, save(1, 740), card);
    const gown = await newGown(maker);
    await maker.call(noteCard, card, gown);
    const { code, message } = await maker.refused(409, saveMeasureCard, save(2, 760), card);
    expect(code).toBe('card-in-use');
    expect(message).toContain('Gala gown');
    expect(await readCard(card)).toMatchObject({
      version: 2,
      content: { card: { waistGirth: 740 } },
      usedBy: [{ id: gown.gownId, title: 'Gala gown' }],
    });
    // A save acknowledged before is still answered as before.
    const late = save(2, 741);
    await maker.refused(409, saveMeasureCard, late, card);
  });

  it('laid on a gown makes it hers; another person’s card is refused there', async () => {
    const card = await newCard({ name: 'Ida Brandt' });
    const gown = await newGown(maker);
    await maker.call(noteCard, card, gown);
    const { person } = await readCard(card);
    expect(await maker.call(readGown, undefined, gown)).toMatchObject({
      personId: person.id,
      cardId: card.cardId,
    });
    const other = await newCard({ name: 'Thea Lund' });
    expect((await maker.refused(409, noteCard, other, gown)).code).toBe('another-person');
    const copy = { saveId: randomUUID(), title: 'Copy' };
    const { id: gownId } = await maker.call(duplicateGown, copy, gown);
    expect((await maker.call(readGown, undefined, { gownId })).personId).toBe(person.id);
  });

  it('goes to another person with the gowns it is laid on', async () => {
    const card = await newCard({ name: 'Runa Falk' });
    const gown = await newGown(maker);
    await maker.call(noteCard, card, gown);
    const person = await newPerson('Runa Falk-Berg');
    await maker.call(giveMeasureCard, person, card);
    expect((await readCard(card)).person.name).toBe('Runa Falk-Berg');
    expect((await maker.call(readGown, undefined, gown)).personId).toBe(person.personId);
  });
});

describe('many requests at once for one card', () => {
  it('take turns: laid, given, regraded and deleted together, none of them fails', async () => {
    const [one, other] = [await newPerson('Wiebke Sand'), await newPerson('Wiebke Sander')];
    const card = await newCard(one);
    const made = { saveId: randomUUID(), title: 'Hers', content: content(), ...card };
    const { id: gownId } = await maker.call(createGown, made);
    const regrade = () => ({
      saveId: randomUUID(),
      baseVersion: 1,
      engine: engineVersion,
      depths: {},
      ...card,
    });
    const everything = { cards: [card.cardId], gowns: [gownId] };
    const asks = [
      () => maker.send(noteCard, card, { gownId }),
      () => maker.send(giveMeasureCard, one, card),
      () =>
        maker.send(
          nameRevision,
          { saveId: randomUUID(), baseVersion: 1, name: 'So far' },
          { gownId },
        ),
      () => maker.send(giveMeasureCard, other, card),
      () => maker.send(regradeGown, regrade(), { gownId }),
      () => maker.send(deletePerson, { cards: [], gowns: [] }, other),
    ];
    const told = await Promise.all(
      Array.from({ length: 10 }, () => asks.map((ask) => ask())).flat(),
    );
    const last = await Promise.all(
      [one, other].flatMap((person) => [
        maker.send(giveMeasureCard, one, card),
        maker.send(deletePerson, everything, person),
        maker.send(noteCard, card, { gownId }),
      ]),
    );
    const statuses = [...told, ...last].map(({ status }) => status);
    expect(statuses.filter((status) => ![200, 404, 409].includes(status))).toEqual([]);
    expect(statuses).toContain(200);
  });
});

describe('a person', () => {
  it('is put on the list once, however often it is sent, and renamed', async () => {
    const body = { saveId: randomUUID(), name: 'Edda Moor' };
    const answers = await Promise.all([1, 2, 3].map(() => maker.call(createPerson, body)));
    expect(new Set(answers.map(({ id }) => id)).size).toBe(1);
    const personId = answers[0]?.id ?? '';
    await maker.call(renamePerson, { name: 'Edda Moor-Stein' }, { personId });
    const { people } = await maker.call(listPeople, undefined);
    expect(people.find(({ id }) => id === personId)).toMatchObject({
      name: 'Edda Moor-Stein',
      cards: 0,
      gowns: 0,
      measuredOn: null,
    });
  });

  it('is deleted with her cards, gowns and revisions, and nothing else goes', async () => {
    const person = await newPerson('Lene Abel');
    const { cardId } = await newCard(person);
    const made = { saveId: randomUUID(), title: 'Hers', content: content(), cardId };
    const { id: gownId } = await maker.call(createGown, made);
    const stays = await newGown(maker);
    const { cards, gowns } = await maker.call(readPerson, undefined, person);
    expect({ cards, gowns }).toEqual({ cards: [cardId], gowns: [gownId] });
    await maker.call(deletePerson, { cards, gowns }, person);
    await maker.refused(404, readPerson, undefined, person);
    await maker.refused(404, readMeasureCard, undefined, { cardId });
    await maker.refused(404, readGown, undefined, { gownId });
    const left = await maker.call(listGowns, undefined);
    expect(left.gowns.map(({ id }) => id)).toContain(stays.gownId);
    const [rows] = await ask(
      server.databaseUrl,
      `select (select count(*) from people where id = $1) + (select count(*) from measure_cards where person_id = $1)
        + (select count(*) from gowns where person_id = $1) as left`,
      [person.personId],
    );
    expect(Number(rows?.['left'])).toBe(0);
  });
});

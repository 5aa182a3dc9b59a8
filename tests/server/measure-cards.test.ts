import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  archiveMeasureCard,
  deleteMeasureCard,
  createMeasureCard,
  duplicateMeasureCard,
  keptCardSchema,
  listMeasureCards,
  readMeasureCard,
  renameMeasureCard,
  saveMeasureCard,
  startNextCard,
  unarchiveMeasureCard,
} from '#shared/api/measure-cards.ts';
import { createGown, deleteGown } from '#shared/api/gowns.ts';
import { type Browser, content, openBrowser, openMaker } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let maker: Browser;
beforeAll(async () => {
  server = await startServer();
  maker = await openMaker(server.address);
});
afterAll(() => server.close());

const filled = (waistGirth = 738) => {
  const { typed, inputs } = content({ waistGirth });
  return { typed, card: inputs.card };
};

async function newCard(): Promise<{ cardId: string }> {
  const body = { saveId: randomUUID(), name: 'Judith, October', content: filled() };
  return { cardId: (await maker.call(createMeasureCard, body)).id };
}

const save = (baseVersion: number, waistGirth?: number) => ({
  saveId: randomUUID(),
  baseVersion,
  content: filled(waistGirth),
});

describe('a measure card that cannot be kept is refused', () => {
  it('nobody’s', async () => {
    await openBrowser(server.address).refused(401, listMeasureCards);
  });

  it('without a name, or with a measure that is no number', async () => {
    const nameless = { saveId: randomUUID(), name: '', content: filled() };
    expect((await maker.refused(422, createMeasureCard, nameless)).problems?.[0]?.field).toBe(
      'name',
    );
    const odd = { ...nameless, name: 'Odd', content: { ...filled(), card: { hipGirth: '99' } } };
    const { problems, message } = await maker.refused(422, createMeasureCard, odd);
    expect(problems?.[0]?.field).toBe('content.card.hipGirth');
    expect(message).toMatch(/^Hip must be/);
  });

  it.each(['0000-01-01', '1899-12-31', '2101-01-01'])('dated %s, by field', async (day) => {
    const card = await newCard();
    const { typed, card: measures } = filled();
    const dated = { saveId: randomUUID(), content: { typed, card: { ...measures, date: day } } };
    const next = { saveId: randomUUID(), name: 'Next', takenOn: day };
    const told = [
      await maker.refused(422, createMeasureCard, { ...dated, name: 'New' }),
      await maker.refused(422, saveMeasureCard, { ...dated, baseVersion: 1 }, card),
      await maker.refused(422, startNextCard, next, card),
    ];
    const fields = told.map(({ problems }) => problems?.map(({ field }) => field));
    expect(fields).toEqual([['content.card.date'], ['content.card.date'], ['takenOn']]);
    for (const { message } of told) {
      expect(message).toBe(
        'The date of the card must be between the years 1900 and 2100: look at the year again.',
      );
    }
    const last = { ...next, saveId: randomUUID(), takenOn: '2100-12-31' };
    await maker.call(startNextCard, last, card);
  });

  it('from a version that is gone, with the card as it stands', async () => {
    const card = await newCard();
    await maker.call(saveMeasureCard, save(1, 700), card);
    const { code, current } = await maker.refused(409, saveMeasureCard, save(1, 720), card);
    expect(code).toBe('conflict');
    expect(keptCardSchema.parse(current)).toMatchObject({
      version: 2,
      content: { card: { waistGirth: 700 } },
      lastSave: { here: true },
    });
  });
});

describe('a measure card', () => {
  it('that is saved over in a conflict stays findable, put away as a card of its own', async () => {
    const card = await newCard();
    await maker.call(saveMeasureCard, save(1, 700), card);
    const mine = { ...save(2, 720), keepReplaced: true };
    await maker.call(saveMeasureCard, mine, card);
    await maker.call(saveMeasureCard, mine, card);
    expect((await maker.call(readMeasureCard, undefined, card)).content.card.waistGirth).toBe(720);
    const { cards } = await maker.call(listMeasureCards, undefined);
    const kept = cards.filter(
      ({ name }) => name === 'Judith, October, as saved from Firefox on Linux',
    );
    expect(kept).toMatchObject([{ archived: true, version: 1 }]);
    const { content: before } = await maker.call(readMeasureCard, undefined, {
      cardId: kept[0]?.id ?? '',
    });
    expect(before.card.waistGirth).toBe(700);
    await maker.call(deleteMeasureCard, undefined, { cardId: kept[0]?.id ?? '' });
  });

  it('is deleted for good, unless a gown was drawn from it', async () => {
    const card = await newCard();
    const gown = { saveId: randomUUID(), title: 'From the card', content: content(), ...card };
    const { id: gownId } = await maker.call(createGown, gown);
    const { code, message } = await maker.refused(409, deleteMeasureCard, undefined, card);
    expect(code).toBe('card-in-use');
    expect(message).toContain('“From the card” was drawn from this card');
    await maker.call(deleteGown, undefined, { gownId });
    await maker.call(deleteMeasureCard, undefined, card);
    await maker.refused(404, readMeasureCard, undefined, card);
    await maker.refused(404, deleteMeasureCard, undefined, card);
  });

  it('is kept as far as it is filled in, and counts what is taken', async () => {
    const { typed } = filled();
    const begun = { typed, card: { bustGirth: 920, neckGirth: 360 } };
    const body = { saveId: randomUUID(), name: 'Begun', content: begun };
    const { id: cardId } = await maker.call(createMeasureCard, body);
    expect(await maker.call(createMeasureCard, body)).toMatchObject({ id: cardId });
    const card = await maker.call(readMeasureCard, undefined, { cardId });
    expect(card).toMatchObject({ name: 'Begun', content: begun, taken: { core: 1, all: 2 } });
  });

  it('is saved once, however often the save is sent', async () => {
    const card = await newCard();
    const once = save(1, 700);
    const answers = await Promise.all([1, 2, 3].map(() => maker.call(saveMeasureCard, once, card)));
    expect(answers.map((each) => each.version)).toEqual([2, 2, 2]);
  });

  it('is renamed, duplicated, archived and brought back', async () => {
    const card = await newCard();
    await maker.call(renameMeasureCard, { name: 'Judith, May' }, card);
    const copy = { saveId: randomUUID(), name: 'Judith, June' };
    const { id } = await maker.call(duplicateMeasureCard, copy, card);
    await maker.call(archiveMeasureCard, undefined, card);
    const { cards } = await maker.call(listMeasureCards, undefined);
    expect(cards.find((each) => each.id === card.cardId)).toMatchObject({
      name: 'Judith, May',
      archived: true,
      version: 1,
    });
    expect(cards.find((each) => each.id === id)).toMatchObject({
      name: 'Judith, June',
      archived: false,
    });
    await maker.call(unarchiveMeasureCard, undefined, card);
    expect((await maker.call(readMeasureCard, undefined, card)).archived).toBe(false);
  });
});

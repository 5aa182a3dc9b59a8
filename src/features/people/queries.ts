import { queryOptions } from '@tanstack/react-query';

import type { Answer, Sent } from '#shared/api/endpoint.ts';
import { createGown, type GownContent, listGowns } from '#shared/api/gowns.ts';
import {
  createMeasureCard,
  giveMeasureCard,
  listMeasureCards,
  readMeasureCard,
  startNextCard,
} from '#shared/api/measure-cards.ts';
import {
  createPerson,
  deletePerson,
  listPeople,
  readPerson,
  renamePerson,
} from '#shared/api/people.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';

import { call, callOf } from '../../lib/call.ts';

export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: async ({ signal }) => (await call(listPeople, undefined, signal)).people,
  staleTime: 0,
});
export type ListedPerson = Answer<typeof listPeople>['people'][number];

export const personQuery = (personId: string) =>
  queryOptions({
    queryKey: ['person', personId],
    queryFn: ({ signal }) => callOf(readPerson, { personId }, undefined, signal),
    staleTime: 0,
    retry: false,
  });

export const cardsQuery = queryOptions({
  queryKey: ['measure-cards'],
  queryFn: async ({ signal }) => (await call(listMeasureCards, undefined, signal)).cards,
  staleTime: 0,
});
export type ListedCard = Answer<typeof listMeasureCards>['cards'][number];

export const gownsQuery = queryOptions({
  queryKey: ['gowns'],
  queryFn: async ({ signal }) => (await call(listGowns, undefined, signal)).gowns,
  staleTime: 0,
});
export type ListedGown = Answer<typeof listGowns>['gowns'][number];

export const cardQuery = (cardId: string) =>
  queryOptions({
    queryKey: ['card-of-person', cardId],
    queryFn: ({ signal }) => callOf(readMeasureCard, { cardId }, undefined, signal),
    staleTime: 0,
    retry: false,
  });

export const sendPerson = (person: Sent<typeof createPerson>) => call(createPerson, person);
export const nameIt = (personId: string, name: string) =>
  callOf(renamePerson, { personId }, { name });
export const sendCard = (card: Sent<typeof createMeasureCard>) => call(createMeasureCard, card);
export const startCard = (cardId: string, next: Sent<typeof startNextCard>) =>
  callOf(startNextCard, { cardId }, next);
export const giveIt = (cardId: string, personId: string) =>
  callOf(giveMeasureCard, { cardId }, { personId });
export const deleteAll = (personId: string, named: Sent<typeof deletePerson>) =>
  callOf(deletePerson, { personId }, named);

/** A gown begun from a kept card: its measures, no choices made yet. */
export async function startGown(cardId: string, saveId: string, title: string) {
  const { content } = await callOf(readMeasureCard, { cardId }, undefined);
  const gown: GownContent = {
    typed: content.typed,
    unread: [],
    inputs: { card: content.card, style: {}, rules: houseRulePresets.balanced },
  };
  return call(createGown, { saveId, title, content: gown, cardId });
}

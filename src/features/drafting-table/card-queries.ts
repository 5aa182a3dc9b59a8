import { queryOptions } from '@tanstack/react-query';

import type { Sent } from '#shared/api/endpoint.ts';
import { noteCard } from '#shared/api/gowns.ts';
import {
  createMeasureCard,
  keptCardSchema,
  listMeasureCards,
  readMeasureCard,
  saveMeasureCard,
  type CardContent,
} from '#shared/api/measure-cards.ts';

import { call, callOf } from '../../lib/call.ts';
import type { Unsent } from './saver.ts';

export const keptCardsQuery = queryOptions({
  queryKey: ['measure-cards'],
  queryFn: async ({ signal }) => (await call(listMeasureCards, undefined, signal)).cards,
  staleTime: 0,
});

export const fetchCard = (cardId: string, signal?: AbortSignal) =>
  callOf(readMeasureCard, { cardId }, undefined, signal);

/** A measure card as the server has it; asked for anew each time it is opened, and then no more. */
export const cardQuery = (cardId: string) =>
  queryOptions({
    queryKey: ['measure-card', cardId],
    queryFn: ({ signal }) => fetchCard(cardId, signal),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
  });

export const keepCard = (card: Sent<typeof createMeasureCard>) => call(createMeasureCard, card);

export const sendCard = (cardId: string, { engine: _, ...save }: Unsent<CardContent>) =>
  callOf(saveMeasureCard, { cardId }, save);

export const readCurrentCard = (current: unknown) => keptCardSchema.safeParse(current).data;

/** Notes which card is laid on a gown: it stays as it is from then on. */
export const noteLaid = (gownId: string, cardId: string) =>
  callOf(noteCard, { gownId }, { cardId });

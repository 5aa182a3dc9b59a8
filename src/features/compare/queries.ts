import { queryOptions } from '@tanstack/react-query';

import type { Answer, Sent } from '#shared/api/endpoint.ts';
import { printComparison, printNest } from '#shared/api/comparing.ts';
import { createGown, listGowns, readGown, regradeGown } from '#shared/api/gowns.ts';
import { listMeasureCards, readMeasureCard } from '#shared/api/measure-cards.ts';
import { listRevisions, readRevision } from '#shared/api/revisions.ts';
import { listSamples } from '#shared/api/samples.ts';

import { call, callForFile, callOf } from '../../lib/call.ts';

export const samplesQuery = queryOptions({
  queryKey: ['samples'],
  queryFn: async ({ signal }) => (await call(listSamples, undefined, signal)).samples,
});

export const gownsQuery = queryOptions({
  queryKey: ['gowns'],
  queryFn: async ({ signal }) => (await call(listGowns, undefined, signal)).gowns,
  staleTime: 0,
});

/** A gown to look at: as it stands on the server now. */
export const gownQuery = (gownId: string) =>
  queryOptions({
    queryKey: ['gown-compared', gownId],
    queryFn: ({ signal }) => callOf(readGown, { gownId }, undefined, signal),
    staleTime: 0,
    retry: false,
  });

export const revisionsQuery = (gownId: string) =>
  queryOptions({
    queryKey: ['revisions-compared', gownId],
    queryFn: async ({ signal }) =>
      (await callOf(listRevisions, { gownId }, undefined, signal)).revisions,
    staleTime: 0,
  });

export const revisionQuery = (gownId: string, revisionId: string) =>
  queryOptions({
    queryKey: ['revision-compared', gownId, revisionId],
    queryFn: ({ signal }) => callOf(readRevision, { gownId, revisionId }, undefined, signal),
  });

export const cardsQuery = queryOptions({
  queryKey: ['measure-cards'],
  queryFn: async ({ signal }) => (await call(listMeasureCards, undefined, signal)).cards,
  staleTime: 0,
});
export type ListedCard = Answer<typeof listMeasureCards>['cards'][number];

export const cardQuery = (cardId: string) =>
  queryOptions({
    queryKey: ['card-compared', cardId],
    queryFn: ({ signal }) => callOf(readMeasureCard, { cardId }, undefined, signal),
    staleTime: 0,
    retry: false,
  });

export const sendRegrade = (gownId: string, order: Sent<typeof regradeGown>) =>
  callOf(regradeGown, { gownId }, order);

export const sendNewGown = (gown: Sent<typeof createGown>) => call(createGown, gown);

export const fetchComparison = (order: Sent<typeof printComparison>) =>
  callForFile(printComparison, order);

export const fetchNest = (order: Sent<typeof printNest>) => callForFile(printNest, order);

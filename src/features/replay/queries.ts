import { queryOptions } from '@tanstack/react-query';

import {
  followClass,
  listClasses,
  openClass,
  turnClass,
  visitClass,
  withdrawClass,
} from '#shared/api/classes.ts';
import type { Sent } from '#shared/api/endpoint.ts';
import { listMeasureCards, readMeasureCard } from '#shared/api/measure-cards.ts';

import { call, CallFailed, callOf } from '../../lib/call.ts';

/** Measure cards a signed-in learner may pick from. */
export const pickableCardsQuery = queryOptions({
  queryKey: ['measure-cards'],
  queryFn: async ({ signal }) => (await call(listMeasureCards, undefined, signal)).cards,
  staleTime: 0,
});

export const fetchCard = (cardId: string) => callOf(readMeasureCard, { cardId }, undefined);

export const classesQuery = queryOptions({
  queryKey: ['classes'],
  queryFn: async ({ signal }) => (await call(listClasses, undefined, signal)).classes,
  staleTime: 0,
});

/** What a link opens; asked for once. */
export const classQuery = (token: string) =>
  queryOptions({
    queryKey: ['class', token],
    queryFn: ({ signal }) => callOf(visitClass, { token }, undefined, signal),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
  });

/** How often those who follow ask where the tutor stands, ms. */
const followEvery = 2000;

/** Where the tutor stands, asked for as long as one follows. */
export const tutorsStepQuery = (token: string, following: boolean) =>
  queryOptions({
    queryKey: ['class', token, 'step'],
    queryFn: async ({ signal }) => (await callOf(followClass, { token }, undefined, signal)).step,
    enabled: following,
    refetchInterval: (query) => (gone(query.state.error) ? false : followEvery),
    staleTime: 0,
    retry: false,
  });

/** Whether the class has ended, or its link never was one. */
export const gone = (error: unknown): boolean =>
  error instanceof CallFailed && error.code === 'not-found';

export const startClass = (gownId: string, body: Sent<typeof openClass>) =>
  callOf(openClass, { gownId }, body);

export const turnTo = (classId: string, step: string) => callOf(turnClass, { classId }, { step });

export const withdraw = (classId: string) => callOf(withdrawClass, { classId }, undefined);

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useRef } from 'react';

import type { Answer } from '#shared/api/endpoint.ts';
import {
  archiveGown,
  createGown,
  deleteGown,
  duplicateGown,
  listGowns,
  renameGown,
  unarchiveGown,
} from '#shared/api/gowns.ts';
import {
  archiveMeasureCard,
  createMeasureCard,
  deleteMeasureCard,
  duplicateMeasureCard,
  listMeasureCards,
  renameMeasureCard,
  unarchiveMeasureCard,
} from '#shared/api/measure-cards.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';

import { call, callOf } from '../../lib/call.ts';
import { newId } from '../../lib/new-id.ts';

export const gownsQuery = queryOptions({
  queryKey: ['gowns'],
  queryFn: async ({ signal }) => (await call(listGowns, undefined, signal)).gowns,
  staleTime: 0,
});
export type ListedGown = Answer<typeof listGowns>['gowns'][number];

export const cardsQuery = queryOptions({
  queryKey: ['measure-cards'],
  queryFn: async ({ signal }) => (await call(listMeasureCards, undefined, signal)).cards,
  staleTime: 0,
});

/** What a list can do to one of its records, or to have a new one. */
export type Deed =
  | { readonly kind: 'new'; readonly name: string }
  | { readonly kind: 'rename' | 'duplicate'; readonly id: string; readonly name: string }
  | { readonly kind: 'archive' | 'unarchive' | 'delete'; readonly id: string };

type Done = { readonly id?: string };

const typed = { unit: 'cm', fields: {} } as const;

function doToGown(deed: Deed, saveId: string): Promise<Done> {
  switch (deed.kind) {
    case 'new': {
      const inputs = { card: {}, style: {}, rules: houseRulePresets.balanced };
      const content = { typed, unread: [], inputs };
      return call(createGown, { saveId, title: deed.name, content });
    }
    case 'rename':
      return callOf(renameGown, { gownId: deed.id }, { title: deed.name });
    case 'duplicate':
      return callOf(duplicateGown, { gownId: deed.id }, { saveId, title: deed.name });
    case 'archive':
      return callOf(archiveGown, { gownId: deed.id }, undefined);
    case 'unarchive':
      return callOf(unarchiveGown, { gownId: deed.id }, undefined);
    case 'delete':
      return callOf(deleteGown, { gownId: deed.id }, undefined);
  }
}

function doToCard(deed: Deed, saveId: string): Promise<Done> {
  switch (deed.kind) {
    case 'new':
      return call(createMeasureCard, { saveId, name: deed.name, content: { typed, card: {} } });
    case 'rename':
      return callOf(renameMeasureCard, { cardId: deed.id }, { name: deed.name });
    case 'duplicate':
      return callOf(duplicateMeasureCard, { cardId: deed.id }, { saveId, name: deed.name });
    case 'archive':
      return callOf(archiveMeasureCard, { cardId: deed.id }, undefined);
    case 'unarchive':
      return callOf(unarchiveMeasureCard, { cardId: deed.id }, undefined);
    case 'delete':
      return callOf(deleteMeasureCard, { cardId: deed.id }, undefined);
  }
}

/** One deed at a time; sent again after a lost answer it keeps its number, so nothing is doubled. */
function useDeed(act: typeof doToGown, key: readonly string[]) {
  const client = useQueryClient();
  const unanswered = useRef<{ readonly deed: string; readonly saveId: string }>(undefined);
  return useMutation({
    mutationFn: async (deed: Deed) => {
      const written = JSON.stringify(deed);
      if (unanswered.current?.deed !== written) {
        unanswered.current = { deed: written, saveId: newId() };
      }
      const done = await act(deed, unanswered.current.saveId);
      unanswered.current = undefined;
      return done;
    },
    onSettled: () => client.invalidateQueries({ queryKey: key }),
  });
}

export const useGownDeed = () => useDeed(doToGown, gownsQuery.queryKey);
export const useCardDeed = () => useDeed(doToCard, cardsQuery.queryKey);
export type DeedDoer = ReturnType<typeof useGownDeed>;

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useRef } from 'react';

import { readGown } from '#shared/api/gowns.ts';
import {
  listRevisions,
  nameRevision,
  readRevision,
  returnToRevision,
} from '#shared/api/revisions.ts';

import { callOf } from '../../lib/call.ts';
import { newId } from '../../lib/new-id.ts';

export const revisionsQuery = (gownId: string) =>
  queryOptions({
    queryKey: ['revisions', gownId],
    queryFn: async ({ signal }) =>
      (await callOf(listRevisions, { gownId }, undefined, signal)).revisions,
    staleTime: 0,
  });

export const revisionQuery = (gownId: string, revisionId: string) =>
  queryOptions({
    queryKey: ['revisions', gownId, revisionId],
    queryFn: ({ signal }) => callOf(readRevision, { gownId, revisionId }, undefined, signal),
    staleTime: Infinity,
  });

/** What is saved first, so that a revision is one of what lies on the table; gives its version. */
export type SaveFirst = () => Promise<number>;

export function useNameRevision(gownId: string, saveFirst: SaveFirst) {
  const client = useQueryClient();
  const number = useRef(newId());
  return useMutation({
    mutationFn: async (name: string) => {
      const baseVersion = await saveFirst();
      return callOf(nameRevision, { gownId }, { saveId: number.current, baseVersion, name });
    },
    onSuccess: () => {
      number.current = newId();
      return client.invalidateQueries({ queryKey: ['revisions', gownId] });
    },
  });
}

export function useReturnToRevision(gownId: string, saveFirst: SaveFirst) {
  const client = useQueryClient();
  const number = useRef(newId());
  return useMutation({
    mutationFn: async (revisionId: string) => {
      const baseVersion = await saveFirst();
      const save = { saveId: number.current, baseVersion };
      await callOf(returnToRevision, { gownId, revisionId }, save);
      return callOf(readGown, { gownId }, undefined);
    },
    onSuccess: () => {
      number.current = newId();
      return client.invalidateQueries({ queryKey: ['revisions', gownId] });
    },
  });
}

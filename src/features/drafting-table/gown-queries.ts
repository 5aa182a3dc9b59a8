import { queryOptions } from '@tanstack/react-query';

import { gownSchema, readGown, renameGown, saveGown } from '#shared/api/gowns.ts';
import type { GownContent } from '#shared/api/gowns.ts';

import { callOf } from '../../lib/call.ts';
import type { Unsent } from './saver.ts';

/** A gown as the server has it; asked for anew each time its table is opened, and then no more. */
export const gownQuery = (gownId: string) =>
  queryOptions({
    queryKey: ['gown', gownId],
    queryFn: ({ signal }) => callOf(readGown, { gownId }, undefined, signal),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
  });

export const sendGown = (gownId: string, save: Unsent<GownContent>) =>
  callOf(saveGown, { gownId }, save);

export const nameGown = (gownId: string, title: string) =>
  callOf(renameGown, { gownId }, { title });

export const readCurrentGown = (current: unknown) => gownSchema.safeParse(current).data;

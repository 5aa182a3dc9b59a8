import { randomUUID } from 'node:crypto';
import { createGown, type Gown, readGown } from '#shared/api/gowns.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { type Browser, content } from './maker.ts';

type Place = { readonly gownId: string };

/** Puts a gown on the server. */
export async function newGown(
  maker: Browser,
  change: Parameters<typeof content>[0] = {},
): Promise<Place> {
  const body = { saveId: randomUUID(), title: 'Gala gown', content: content(change) };
  return { gownId: (await maker.call(createGown, body)).id };
}

/** A new save made from a version. */
export const save = (baseVersion: number, change: Parameters<typeof content>[0] = {}) => ({
  saveId: randomUUID(),
  baseVersion,
  engine: engineVersion,
  content: content(change),
});

export const read = (maker: Browser, gown: Place): Promise<Gown> =>
  maker.call(readGown, undefined, gown);

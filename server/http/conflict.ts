import type { Acknowledged } from '../database/saves.ts';
import { RefusalError } from './refusal.ts';

/** Refuses a save made from another version than there is; `current` lets the maker compare and choose. */
export const conflict = (row: { readonly savedDevice: string }, current: unknown): RefusalError =>
  new RefusalError(
    'conflict',
    `This was saved meanwhile from ${row.savedDevice}. Look at both and choose; nothing has been overwritten.`,
    { current },
  );

export const notFound = (what: string): RefusalError =>
  new RefusalError('not-found', `There is no such ${what} among yours.`);

/**
 * A number belongs to one save of one record, made from one version; under another it is not answered
 * as if it had been done.
 */
export function sameSave(
  acknowledged: Acknowledged,
  record: string | undefined,
  version: number,
): Acknowledged {
  if (acknowledged.record === record && acknowledged.version === version) return acknowledged;
  throw new RefusalError(
    'bad-input',
    'The number of this save was used for another one before: give each save a number of its own.',
  );
}

/** What an endpoint that only does something answers, where there was something to do it to. */
export function doneTo(what: string, found: boolean): Record<string, never> {
  if (!found) throw notFound(what);
  return {};
}

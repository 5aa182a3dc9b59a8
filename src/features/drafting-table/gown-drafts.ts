import { z } from 'zod';

import { gownContent } from '#shared/api/gowns.ts';
import { browserStorage } from '../../lib/browser-storage.ts';
import { newId } from '../../lib/new-id.ts';

/** What a browser keeps of a gown beside the server: each open tab keeps its own. */
const keptDraft = z.object({
  version: z.literal(1),
  keptAt: z.number(),
  title: z.string(),
  base: z.int(),
  /** Whether it holds work the server has not acknowledged. */
  changed: z.boolean(),
  unsent: z
    .object({
      saveId: z.uuid(),
      baseVersion: z.int(),
      engine: z.string(),
      content: gownContent,
      keepReplaced: z.boolean(),
    })
    .optional(),
  content: gownContent,
  history: z.unknown(),
});
export type KeptDraft = z.output<typeof keptDraft>;

/** A place in this browser for one tab's work on a gown, held until the tab lets go of it. */
export type DraftPlace = {
  readonly found: KeptDraft | undefined;
  /** False where the browser does not allow it. */
  readonly keep: (draft: Omit<KeptDraft, 'version' | 'keptAt'>) => boolean;
  readonly letGo: () => void;
};

const prefixOf = (gownId: string): string => `ellwand.gown.${gownId}.`;

/**
 * Takes this tab's place for a gown: the one it had before a reload, else one that a closed tab left
 * behind (with unsent work first), else a new one. Two tabs never share a place.
 */
export async function takeDraftPlace(gownId: string): Promise<DraftPlace> {
  const storage = browserStorage('local');
  const session = browserStorage('session');
  const prefix = prefixOf(gownId);
  const own = session?.getItem(prefix);
  const left = storage === undefined ? [] : placesLeft(storage, prefix);
  const candidates = [
    ...(own === null || own === undefined ? [] : [own]),
    ...left,
    prefix + newId(),
  ];
  for (const place of candidates) {
    const letGo = await hold(place);
    if (letGo === undefined) continue;
    try {
      session?.setItem(prefix, place);
    } catch {
      // Without it a reload looks for a place as a new tab does.
    }
    return {
      found: readDraft(storage, place),
      keep: (draft) => {
        try {
          if (storage === undefined) return false;
          storage.setItem(place, JSON.stringify({ ...draft, version: 1, keptAt: Date.now() }));
          return true;
        } catch {
          return false;
        }
      },
      letGo,
    };
  }
  return { found: undefined, keep: () => false, letGo: () => undefined };
}

/** Places kept for a gown, those with unsent work first, then the newest. */
function placesLeft(storage: Storage, prefix: string): string[] {
  const keys = Array.from({ length: storage.length }, (_, index) => storage.key(index) ?? '');
  return keys
    .filter((key) => key.startsWith(prefix))
    .flatMap((key) => {
      const draft = readDraft(storage, key);
      return draft === undefined ? [] : [{ key, draft }];
    })
    .toSorted(
      ({ draft: a }, { draft: b }) => Number(b.changed) - Number(a.changed) || b.keptAt - a.keptAt,
    )
    .map(({ key }) => key);
}

function readDraft(storage: Storage | undefined, key: string): KeptDraft | undefined {
  try {
    const text = storage?.getItem(key);
    if (text === null || text === undefined) return undefined;
    return keptDraft.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}

/**
 * Holds a name among the tabs of this browser until it is let go or the tab ends; no answer where
 * another tab holds it. Where the browser has no locks every name is free.
 */
async function hold(name: string): Promise<(() => void) | undefined> {
  if (!('locks' in navigator)) return () => undefined;
  return new Promise((answer) => {
    void navigator.locks.request(name, { ifAvailable: true }, (lock) => {
      if (lock === null) {
        answer(undefined);
        return undefined;
      }
      return new Promise<void>((letGo) => answer(letGo));
    });
  });
}

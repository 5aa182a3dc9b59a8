import { z } from 'zod';

import { browserStorage } from '../../lib/browser-storage.ts';
import { newId } from '../../lib/new-id.ts';
import type { Unsent } from './saver.ts';

/** What a browser keeps of a record beside the server: each open tab keeps its own. */
export type KeptDraft<C> = {
  readonly keptAt: number;
  readonly title: string;
  readonly base: number;
  /** Whether it holds work the server has not acknowledged. */
  readonly changed: boolean;
  readonly unsent?: Unsent<C> | undefined;
  readonly content: C;
  readonly history?: unknown;
};

const version = 1;

const draftSchema = <C>(content: z.ZodType<C>) =>
  asDraftSchema<C>(
    z.object({
      version: z.literal(version),
      keptAt: z.number(),
      title: z.string(),
      base: z.int(),
      changed: z.boolean(),
      unsent: z
        .object({
          saveId: z.uuid(),
          baseVersion: z.int(),
          engine: z.string(),
          content,
          keepReplaced: z.boolean(),
        })
        .optional(),
      content,
      history: z.unknown(),
    }),
  );

/** Zod loses sight of the content's type inside an object of it. */
function asDraftSchema<C>(schema: z.ZodType): z.ZodType<KeptDraft<C>> {
  return schema as z.ZodType<KeptDraft<C>>;
}

/** A place in this browser for one tab's work on a gown, held until the tab lets go of it. */
export type DraftPlace<C> = {
  readonly found: KeptDraft<C> | undefined;
  /** False where the browser does not allow it. */
  readonly keep: (draft: Omit<KeptDraft<C>, 'keptAt'>) => boolean;
  readonly letGo: () => void;
};

/**
 * Takes this tab's place for a record: the one it had before a reload, else one that a closed tab left
 * behind (with unsent work first), else a new one. Two tabs never share a place.
 */
export async function takeDraftPlace<C>(
  kind: 'gown' | 'card',
  id: string,
  content: z.ZodType<C>,
): Promise<DraftPlace<C>> {
  const storage = browserStorage('local');
  const session = browserStorage('session');
  const prefix = `ellwand.${kind}.${id}.`;
  const schema = draftSchema(content);
  const read = (key: string) => readDraft(storage, key, schema);
  const own = session?.getItem(prefix);
  const left = storage === undefined ? [] : placesLeft(storage, prefix, read);
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
      found: read(place),
      keep: (draft) => {
        try {
          if (storage === undefined) return false;
          storage.setItem(place, JSON.stringify({ ...draft, version, keptAt: Date.now() }));
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

/** Places kept for a record, those with unsent work first, then the newest. */
function placesLeft(
  storage: Storage,
  prefix: string,
  read: (key: string) => { readonly changed: boolean; readonly keptAt: number } | undefined,
): string[] {
  const keys = Array.from({ length: storage.length }, (_, index) => storage.key(index) ?? '');
  return keys
    .filter((key) => key.startsWith(prefix))
    .flatMap((key) => {
      const draft = read(key);
      return draft === undefined ? [] : [{ key, draft }];
    })
    .toSorted(
      ({ draft: a }, { draft: b }) => Number(b.changed) - Number(a.changed) || b.keptAt - a.keptAt,
    )
    .map(({ key }) => key);
}

function readDraft<D>(
  storage: Storage | undefined,
  key: string,
  schema: z.ZodType<D>,
): D | undefined {
  try {
    const text = storage?.getItem(key);
    if (text === null || text === undefined) return undefined;
    return schema.safeParse(JSON.parse(text)).data;
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

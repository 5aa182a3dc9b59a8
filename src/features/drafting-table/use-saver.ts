import { useEffect, useRef, useState, useSyncExternalStore } from 'react';

import type { DraftPlace } from './kept-drafts.ts';
import { openSaver, type Saver, type SaverParts, type Saving } from './saver.ts';
import { useKeeping } from './use-keeping.ts';

type UseSaverParts<C, R> = SaverParts<C, R> & {
  readonly place: DraftPlace<C>;
  readonly title: string;
  /** The way back, kept beside the work. */
  readonly history?: unknown;
  /** What the work consists of: another value is another state to save. */
  readonly work: readonly unknown[];
};

/** Saves work by itself as it changes, and keeps it in this browser until the server has it. */
export function useSaver<C, R extends { readonly version: number; readonly content: C }>(
  parts: UseSaverParts<C, R>,
): { readonly saver: Saver<C, R>; readonly saving: Saving<C, R>; readonly kept: boolean } {
  const latest = useRef(parts);
  useEffect(() => {
    latest.current = parts;
  });
  const [saver] = useState(() =>
    openSaver<C, R>({
      ...parts,
      content: () => latest.current.content(),
      send: (save) => latest.current.send(save),
    }),
  );
  const [kept, setKept] = useState(true);
  const saving = useSyncExternalStore(saver.subscribe, saver.now);

  const keep = () => {
    const { place, title, history, content } = latest.current;
    const { standing, base, unsent } = saver.now();
    const changed = standing !== 'saved';
    setKept(place.keep({ title, base, changed, unsent, content: content(), history }));
  };

  const opened = useRef(true);
  useEffect(() => {
    if (opened.current) {
      opened.current = false;
      return;
    }
    saver.edited();
  }, parts.work);
  // A save on its way is kept with its number before anything else can happen to the page.
  useKeeping(keep, [...parts.work, parts.history, parts.title]);
  useEffect(() => {
    const stop = saver.subscribe(keep);
    saver.start();
    const retry = () => {
      if (saver.now().standing === 'offline') void saver.flush();
    };
    const leave = () => {
      if (document.visibilityState === 'hidden' && saver.now().standing === 'waiting') {
        void saver.flush();
      }
    };
    addEventListener('online', retry);
    document.addEventListener('visibilitychange', leave);
    return () => {
      stop();
      saver.close();
      removeEventListener('online', retry);
      document.removeEventListener('visibilitychange', leave);
    };
  }, [saver]);

  return { saver, saving, kept };
}

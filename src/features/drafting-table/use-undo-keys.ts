import { useEffect, type Dispatch } from 'react';

import type { BenchAction } from './bench.ts';

/** Ctrl or Cmd with Z takes back, with Shift+Z or Y does again; in fields of other things letters are meant. */
export function useUndoKeys(dispatch: Dispatch<BenchAction>): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if (key !== 'z' && key !== 'y') return;
      if (isElsewhere(event.target)) return;
      event.preventDefault();
      dispatch({ type: key === 'y' || event.shiftKey ? 'redo' : 'undo' });
    };
    addEventListener('keydown', press);
    return () => removeEventListener('keydown', press);
  }, [dispatch]);
}

/** In a sheet over the table, or a field that is no part of the cards. */
const isElsewhere = (target: EventTarget | null): boolean =>
  target instanceof Element &&
  (target.closest('dialog') !== null ||
    (target instanceof HTMLInputElement &&
      target.type === 'text' &&
      !/^(card|style)\./.test(target.name)));

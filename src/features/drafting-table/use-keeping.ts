import { useEffect, useRef } from 'react';

/** Work is kept in the browser this long after it changed at the latest, ms: not at every frame of a drag. */
const soon = 250;

/** Keeps what changes in the browser: soon after, and at once when the page is left or hidden. */
export function useKeeping(keep: () => void, changed: readonly unknown[]): void {
  const latest = useRef(keep);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    latest.current = keep;
  });
  useEffect(() => {
    timer.current ??= setTimeout(() => {
      timer.current = undefined;
      latest.current();
    }, soon);
    // The caller names what it keeps.
  }, changed);
  useEffect(() => {
    const keepNow = () => {
      if (timer.current === undefined) return;
      clearTimeout(timer.current);
      timer.current = undefined;
      latest.current();
    };
    addEventListener('pagehide', keepNow);
    document.addEventListener('visibilitychange', keepNow);
    return () => {
      removeEventListener('pagehide', keepNow);
      document.removeEventListener('visibilitychange', keepNow);
      keepNow();
    };
  }, []);
}

import { useMemo, useSyncExternalStore } from 'react';

/** Whether a media query holds now. */
export function useMedia(query: string): boolean {
  // Asked for once: a query made anew at every rendering costs more than the rendering.
  const media = useMemo(() => {
    const list = matchMedia(query);
    return {
      follow: (changed: () => void) => {
        list.addEventListener('change', changed);
        return () => list.removeEventListener('change', changed);
      },
      holds: () => list.matches,
    };
  }, [query]);
  return useSyncExternalStore(media.follow, media.holds);
}

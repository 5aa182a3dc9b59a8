import { useSyncExternalStore } from 'react';

import { shownTheme, systemIsDark, type Theme } from './theme.ts';

/** The theme on screen, followed as the system or the reader changes it. */
export const useTheme = (): Theme => useSyncExternalStore(follow, shownTheme);

function follow(changed: () => void): () => void {
  systemIsDark.addEventListener('change', changed);
  const observer = new MutationObserver(changed);
  observer.observe(document.documentElement, { attributeFilter: ['data-theme'] });
  return () => {
    systemIsDark.removeEventListener('change', changed);
    observer.disconnect();
  };
}

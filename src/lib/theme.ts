export type Theme = 'light' | 'dark';

const key = 'ellwand.theme';

/** Asked for once: it is looked at on every rendering. */
export const systemIsDark = matchMedia('(prefers-color-scheme: dark)');

/** The theme chosen on this device; undefined follows the system. */
export function storedTheme(): Theme | undefined {
  try {
    const stored = localStorage.getItem(key);
    return stored === 'light' || stored === 'dark' ? stored : undefined;
  } catch {
    return undefined;
  }
}

/** The theme on screen now: the chosen one, or the system's. */
export function shownTheme(): Theme {
  const chosen = document.documentElement.dataset['theme'];
  if (chosen === 'light' || chosen === 'dark') return chosen;
  return systemIsDark.matches ? 'dark' : 'light';
}

/** Puts a theme on the page; undefined lets the system decide. */
export function showTheme(theme: Theme | undefined): void {
  if (theme === undefined) delete document.documentElement.dataset['theme'];
  else document.documentElement.dataset['theme'] = theme;
}

/** Remembers a theme on this device, where the browser allows it, and shows it. */
export function chooseTheme(theme: Theme): void {
  showTheme(theme);
  try {
    localStorage.setItem(key, theme);
  } catch {
    // Without storage the choice lasts until the page closes.
  }
}

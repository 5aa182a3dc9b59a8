import type { Locator } from '@playwright/test';

import type { DraftingTableScreen } from './drafting-table.ts';

export type StyleScreen = ReturnType<typeof styleScreen>;

/** The choices of the style card and the house rules, on whichever table they lie. */
export function styleScreen({ page, field, stale, tab, drawing }: DraftingTableScreen) {
  const choice = (label: string): Locator => page.getByRole('group', { name: label, exact: true });
  return {
    page,
    field,
    stale,
    choice,
    option: (label: string, word: string): Locator =>
      choice(label).getByRole('radio', { name: word, exact: true }),
    /** On a phone the cards lie behind tabs. */
    show: async (card: 'Style' | 'Measures' = 'Style') => {
      await drawing.waitFor();
      if ((await tab(card).count()) > 0) await tab(card).click();
    },
  };
}

import type { Locator, Page } from '@playwright/test';

import { draftingTable } from './drafting-table.ts';

export type GownTableScreen = ReturnType<typeof gownTable>;

/** The table of a kept gown, and what lies over it when there is something to choose. */
export function gownTable(page: Page) {
  const table = draftingTable(page);
  const conflict = page.getByRole('dialog', { name: 'This gown was saved elsewhere meanwhile' });
  const revisions = page.getByRole('dialog', { name: 'Revisions' });
  const title = page.getByRole('textbox', { name: 'Name of the gown' });
  /** On a phone the cards lie behind tabs. */
  const showCard = async (name: 'Style' | 'Measures') => {
    await title.waitFor();
    const tab = table.tab(name);
    if ((await tab.count()) > 0) await tab.click();
  };
  return {
    ...table,
    openGown: async (gownId: string) => {
      await page.goto(`/gowns/${gownId}`);
    },
    title,
    standing: (name: string): Locator => page.locator(`[data-standing="${name}"]`),
    undo: page.getByRole('button', { name: /^Undo/ }),
    redo: page.getByRole('button', { name: /^Redo/ }),
    conflict,
    keepMine: conflict.getByRole('button', { name: 'Keep mine' }),
    takeSaved: conflict.getByRole('button', { name: 'Take the saved one' }),
    openRevisions: page.getByRole('button', { name: 'Revisions' }),
    revisions,
    signIn: page.getByRole('dialog', { name: 'Sign in again' }),
    showStyle: () => showCard('Style'),
    showMeasures: () => showCard('Measures'),
    /** Types a figure of the style card and leaves the field. */
    setStyle: async (key: string, text: string) => {
      await showCard('Style');
      await table.field(`style.${key}`).fill(text);
      await table.field(`style.${key}`).blur();
    },
  };
}

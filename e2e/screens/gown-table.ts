import type { Locator, Page } from '@playwright/test';

import { draftingTable } from './drafting-table.ts';

export type GownTableScreen = ReturnType<typeof gownTable>;

/** The table of a kept gown, and what lies over it when there is something to choose. */
export function gownTable(page: Page) {
  const table = draftingTable(page);
  const conflict = page.getByRole('dialog', { name: 'This gown was saved elsewhere meanwhile' });
  const revisions = page.getByRole('dialog', { name: 'Revisions' });
  return {
    ...table,
    openGown: async (gownId: string) => {
      await page.goto(`/gowns/${gownId}`);
    },
    title: page.getByRole('textbox', { name: 'Name of the gown' }),
    standing: (name: string): Locator => page.locator(`[data-standing="${name}"]`),
    undo: page.getByRole('button', { name: /^Undo/ }),
    redo: page.getByRole('button', { name: /^Redo/ }),
    conflict,
    keepMine: conflict.getByRole('button', { name: 'Keep mine' }),
    takeSaved: conflict.getByRole('button', { name: 'Take the saved one' }),
    openRevisions: page.getByRole('button', { name: 'Revisions' }),
    revisions,
    signIn: page.getByRole('dialog', { name: 'Sign in again' }),
    /** The style card, which on a phone lies behind a tab. */
    showStyle: async () => {
      const tab = table.tab('Style');
      if ((await tab.count()) > 0) await tab.click();
    },
    showMeasures: async () => {
      const tab = table.tab('Measures');
      if ((await tab.count()) > 0) await tab.click();
    },
    /** Types a figure of the style card and leaves the field. */
    setStyle: async (key: string, text: string) => {
      const tab = table.tab('Style');
      if ((await tab.count()) > 0) await tab.click();
      await table.field(`style.${key}`).fill(text);
      await table.field(`style.${key}`).blur();
    },
  };
}

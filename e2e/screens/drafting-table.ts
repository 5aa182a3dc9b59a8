import type { Locator, Page } from '@playwright/test';

export type DraftingTableScreen = ReturnType<typeof draftingTable>;

/** Where things are on the drafting table, and what a maker does there. */
export function draftingTable(page: Page) {
  const field = (key: string): Locator => page.locator(`input[name="${key}"]`);
  const dialog = page.getByRole('dialog', { name: 'Print' });
  return {
    page,
    open: async () => {
      await page.goto('/try');
    },
    field,
    message: (key: string): Locator =>
      page
        .locator('div', { has: field(key) })
        .locator('p[id$="-message"]')
        .last(),
    start: page.getByRole('button', { name: 'Type ten measures' }),
    drawing: page.getByRole('group', { name: 'Drawing of the pieces' }),
    stale: page.getByText('This is the last drawing'),
    handle: (name: string): Locator => page.getByRole('slider', { name }),
    seamStatus: page.locator('p[role=status]').filter({ hasText: ';' }),
    unit: (name: 'inch' | 'cm'): Locator => page.getByRole('radio', { name }),
    tab: (name: string): Locator => page.getByRole('tab', { name }),
    panel: page.getByRole('tabpanel'),
    print: page.getByRole('button', { name: 'Print', exact: true }),
    dialog,
    printRow: (title: string): Locator => dialog.getByRole('region', { name: title }),
    printButton: (title: string): Locator => dialog.getByRole('button', { name: title }),
    /** Types figures one after the other, Enter between them, into whatever has the focus. */
    typeOn: async (figures: readonly string[]) => {
      for (const figure of figures) {
        await page.keyboard.type(figure);
        await page.keyboard.press('Enter');
      }
    },
  };
}

import type { Locator, Page } from '@playwright/test';

/** How long a plan may take where many browsers share a small machine, ms. */
export const patience = 90_000;

/** Where things are in the print room. */
export function printRoom(page: Page) {
  const heading = page.getByRole('heading', { level: 1, name: 'Print room' });
  const count = page.getByText(/^\d+ sheets? of /);
  return {
    page,
    heading,
    /** The plan in words, shown once it is arranged. */
    count,
    /** Waits until the pieces are arranged: a second of work, on a busy machine many. */
    arranged: () => count.waitFor({ timeout: patience }),
    sheets: async (): Promise<number> => Number(/\d+/.exec((await count.textContent()) ?? '')?.[0]),
    plan: page.getByRole('group', { name: 'Page plan' }),
    sheet: (name: string): Locator => page.getByRole('checkbox', { name: `Sheet ${name}` }),
    makePdf: page.getByRole('button', { name: 'Make the PDF' }),
    makeSvg: page.getByRole('button', { name: 'SVG of the pieces' }),
    cancel: page.getByRole('button', { name: 'Cancel' }),
    paper: page.getByRole('combobox', { name: 'Paper' }),
    field: (name: string): Locator => page.locator(`input[name="${name}"]`),
    piece: (title: string): Locator => page.getByRole('checkbox', { name: title }),
    /** On a phone the cards lie behind tabs. */
    showCard: async (name: 'Paper' | 'Pieces' | 'Lines' | 'Scale') => {
      await heading.waitFor();
      const tab = page.getByRole('tab', { name });
      if ((await tab.count()) > 0) await tab.click();
    },
  };
}

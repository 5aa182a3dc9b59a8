import type { Locator, Page } from '@playwright/test';

/** A replay, wherever it is seen: of the table, of a gown, or in a class. */
export function replay(page: Page) {
  const telling = page.getByRole('region', { name: 'This step' });
  const list = page.getByRole('dialog', { name: 'All steps' });
  const share = page.getByRole('dialog', { name: 'Share with a class' });
  const measures = page.getByRole('dialog', { name: 'My measures' });
  return {
    open: (address: string) => page.goto(address),
    telling,
    title: telling.getByRole('heading', { level: 1 }),
    forward: page.getByRole('button', { name: 'Forward' }),
    back: page.getByRole('button', { name: 'Back', exact: true }),
    play: page.getByRole('button', { name: 'Play' }),
    pause: page.getByRole('button', { name: 'Pause' }),
    why: telling.getByRole('button', { name: 'Why?' }),
    number: (words: string): Locator => telling.getByRole('button', { name: words, exact: true }),
    source: telling.getByRole('status').first(),
    count: (words: string): Locator => page.getByText(words, { exact: true }),
    drawing: (name: string | RegExp): Locator => page.getByRole('img', { name }),
    newLines: page.locator('svg path.draw-in'),
    projector: page.getByRole('button', { name: 'Projector view' }),
    leaveProjector: page.getByRole('button', { name: 'Leave projector view' }),
    /** Goes to a step by its name; on a narrow screen the list lies behind a button. */
    choose: async (title: string) => {
      await telling.waitFor();
      const button = page.getByRole('button', { name: 'All steps' });
      const within = (await button.isVisible()) ? list : page;
      if (within === list) await button.click();
      await within
        .getByRole('navigation', { name: 'Steps' })
        .getByRole('button', { name: title })
        .first()
        .click();
    },
    openShare: page.getByRole('button', { name: 'Share', exact: true }),
    share,
    link: share.getByRole('textbox', { name: 'Link for the class' }),
    openMeasures: page.getByRole('button', { name: 'My measures' }),
    measures,
    ownTelling: telling.getByRole('heading', { name: 'With your measures' }),
    follow: page.getByRole('button', { name: /Follow/ }),
    worksheet: page.getByRole('button', { name: /^Worksheet/ }),
  };
}

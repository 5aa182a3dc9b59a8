import AxeBuilder from '@axe-core/playwright';

import { expect, test } from '../fixtures/maker.ts';
import { replay } from '../screens/replay.ts';

const sizes = [
  { name: '390 px', width: 390, height: 844 },
  { name: '1280 px', width: 1280, height: 800 },
  { name: 'a projector, 1280 × 720', width: 1280, height: 720 },
];

for (const { name, ...viewport } of sizes) {
  test.describe(`at ${name}`, () => {
    test.use({ viewport });

    test('a tutor opens a step to a class, which follows without an account until it is withdrawn', async ({
      page,
      gown,
      maker,
      browser,
      baseURL,
    }) => {
      await gown.tab('Steps').click();
      await page.getByRole('link', { name: 'Replay' }).click();
      const tutor = replay(page);
      await tutor.choose('Bust line');
      await tutor.openShare.click();
      await expect(tutor.share).toContainText('are not shown');
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      const title = tutor.share.getByLabel('What the class sees as its name');
      await title.fill(' ');
      await tutor.share.getByRole('button', { name: 'Make the link' }).click();
      await expect(tutor.share.getByRole('alert')).toContainText('too short');
      await title.fill('Tuesday class');
      await tutor.share.getByLabel('The link works for').selectOption({ label: '2 hours' });
      await title.press('Enter');
      await expect(tutor.link).toHaveValue(/\/class\/[\w-]{43}$/);
      const address = await tutor.link.inputValue();
      await tutor.share.getByRole('button', { name: 'Close' }).click();

      const context = await browser.newContext({
        viewport,
        locale: 'en-GB',
        baseURL: baseURL ?? '',
      });
      const learnerPage = await context.newPage();
      const learner = replay(learnerPage);
      await learner.open(address);
      await expect(learner.title).toHaveText('Front · Bust line');
      await expect(learnerPage.locator('body')).not.toContainText('Maren');
      await expect(learnerPage.locator('body')).not.toContainText('Evening gown');
      await expect(learnerPage.locator('body')).not.toContainText(maker.email);
      await expect(learnerPage.getByText('Tuesday class')).toBeVisible();
      expect((await new AxeBuilder({ page: learnerPage }).analyze()).violations).toEqual([]);
      expect(await context.cookies()).toEqual([]);

      await tutor.forward.click();
      await expect(learner.title).toHaveText('Front · Under-bust line');
      await learner.back.click();
      await expect(learner.title).toHaveText('Front · Bust line');
      await tutor.forward.click();
      await expect(tutor.title).toHaveText('Front · Waist line');
      await expect(learner.follow).toHaveText('Follow the tutor');
      await expect(learner.title).toHaveText('Front · Bust line');
      await learner.follow.click();
      await expect(learner.title).toHaveText('Front · Waist line');

      await page.goto('/classes');
      await page.getByRole('button', { name: 'Withdraw Tuesday class' }).click();
      await expect(page.getByText('No class is open.')).toBeVisible();
      await expect(learnerPage.getByText('The tutor has ended this class.')).toBeVisible();
      await learnerPage.reload();
      await expect(
        learnerPage.getByRole('heading', { name: 'No class is open here' }),
      ).toBeVisible();
      expect((await new AxeBuilder({ page: learnerPage }).analyze()).violations).toEqual([]);
      await context.close();
    });
  });
}

test('the same by keyboard: opened, followed, and leafed alone', async ({
  page,
  maker,
  browser,
  baseURL,
}) => {
  await page.goto(`/gowns/${maker.gownId}/replay?step=front%2Fside-seam`);
  const tutor = replay(page);
  await expect(tutor.title).toHaveText('Front · Side seam');
  await tutor.openShare.focus();
  await page.keyboard.press('Enter');
  await tutor.share.getByLabel('What the class sees as its name').focus();
  await page.keyboard.press('Enter');
  await expect(tutor.link).toHaveValue(/\/class\//);
  const address = await tutor.link.inputValue();
  await page.keyboard.press('Escape');
  const context = await browser.newContext({ locale: 'en-GB', baseURL: baseURL ?? '' });
  const learnerPage = await context.newPage();
  const learner = replay(learnerPage);
  await learner.open(address);
  await expect(learner.title).toHaveText('Front · Side seam');
  await page.keyboard.press('PageDown');
  await expect(learner.title).toHaveText('Front · Above the bust');
  await learnerPage.keyboard.press('End');
  await expect(learner.title).toContainText('Allowances');
  await learner.follow.focus();
  await learnerPage.keyboard.press('Enter');
  await expect(learner.title).toHaveText('Front · Above the bust');
  await context.close();
});

test('a link that is none leads to a plain page, and no further', async ({ page }) => {
  await page.goto(`/class/${'A'.repeat(43)}`);
  await expect(page.getByRole('heading', { name: 'No class is open here' })).toBeVisible();
  await expect(page.getByText('Ask your tutor for a new one.')).toBeVisible();
});

import { walkTo } from '../fixtures/keyboard.ts';
import { expect, test } from '../fixtures/maker.ts';
import { gownTable } from '../screens/gown-table.ts';

for (const width of [390, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 844 } });

    test('the later save sees both side by side and takes the saved one; hers is one step back', async ({
      context,
      gown,
      maker,
    }) => {
      const other = gownTable(await context.newPage());
      await other.openGown(maker.gownId);
      await expect(other.drawing).toBeVisible();
      await gown.setStyle('kneeFinished', '80');
      await expect(gown.standing('saved')).toBeVisible();

      await other.setStyle('kneeFinished', '95');
      await expect(other.conflict).toBeVisible();
      await expect(other.conflict.getByRole('img')).toHaveCount(2);
      const row = other.conflict.getByRole('row', { name: /Finished knee/ });
      await expect(row.getByRole('cell')).toHaveText(['95.0', '80.0']);
      await other.page.keyboard.press('Escape');
      await expect(other.conflict).toBeVisible();
      await other.takeSaved.click();
      await expect(other.conflict).toHaveCount(0);
      await expect(other.field('style.kneeFinished')).toHaveValue('80.0');
      await expect(other.standing('saved')).toBeVisible();

      await other.undo.click();
      await expect(other.field('style.kneeFinished')).toHaveValue('95.0');
      await expect(other.standing('saved')).toBeVisible();
    });

    test('she keeps hers, and the saved one stays as a revision', async ({
      context,
      gown,
      maker,
    }) => {
      const other = gownTable(await context.newPage());
      await other.openGown(maker.gownId);
      await expect(other.drawing).toBeVisible();
      await gown.setStyle('kneeFinished', '80');
      await expect(gown.standing('saved')).toBeVisible();
      await other.setStyle('kneeFinished', '95');
      await other.keepMine.click();
      await expect(other.standing('saved')).toBeVisible();
      await other.openRevisions.click();
      await other.revisions.getByRole('button', { name: /^As saved from/ }).click();
      const row = other.revisions.getByRole('row', { name: /Finished knee/ });
      await expect(row.getByRole('cell')).toHaveText(['80.0', '95.0']);
    });
  });
}

test('by keyboard, and a conflict that was not settled waits across a reload', async ({
  context,
  gown,
  maker,
}) => {
  const other = gownTable(await context.newPage());
  await other.openGown(maker.gownId);
  await expect(other.drawing).toBeVisible();
  await gown.setStyle('kneeFinished', '80');
  await expect(gown.standing('saved')).toBeVisible();
  await walkTo(other.page, other.field('style.kneeFinished'));
  await other.page.keyboard.type('95');
  await other.page.keyboard.press('Enter');
  await expect(other.conflict).toBeVisible();
  await other.page.reload();
  await expect(other.conflict).toBeVisible();
  await walkTo(other.page, other.takeSaved);
  await other.page.keyboard.press('Enter');
  await expect(other.conflict).toHaveCount(0);
  await expect(other.field('style.kneeFinished')).toHaveValue('80.0');
});

test('two tabs that draw the same are asked nothing', async ({ context, gown, maker }) => {
  const other = gownTable(await context.newPage());
  await other.openGown(maker.gownId);
  await expect(other.drawing).toBeVisible();
  await gown.setStyle('kneeFinished', '80');
  await expect(gown.standing('saved')).toBeVisible();
  await other.setStyle('kneeFinished', '80.0');
  await expect(other.standing('saved')).toBeVisible();
  await expect(other.conflict).toHaveCount(0);
});

/** What one person does stands on another's screen, without a reload. */

import { expect, test } from '../support/quiet-test';
import { enter, makeDesign, ready } from '../support/design-screen';
import { builder, owner, signIn } from '../support/sign-ins';

/** What the workshop may wait to see it, ms. */
const SOON = { timeout: 2_000 };

test('a new design, its new name and its end appear in a list that is open', async ({
  page,
  browser,
}) => {
  const context = await browser.newContext();
  const list = await context.newPage();
  await signIn(list, owner);
  const stream = list.waitForRequest((request) => request.url().includes('/api/live?since='));
  await list.goto('/designs');
  await stream;

  await signIn(page, builder);
  const name = `Live ${Date.now()}`;
  const made = page.waitForResponse(
    (response) => response.request().method() === 'POST' && response.url().endsWith('/designs'),
  );
  await Promise.all([makeDesign(page, name), made]);
  await expect(list.getByRole('link', { name })).toBeVisible(SOON);

  // The one who only looks hears that it was saved anew.
  await list.getByRole('link', { name }).click();
  await ready(list);
  await enter(page, 'Air gap', '0.62 mm');
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(list.getByText(/has saved|saved version 2|version 2/).first()).toBeVisible({
    timeout: 5_000,
  });
  await context.close();
});

test('the record shows what was done, filters, and gives it as CSV', async ({ page }) => {
  await signIn(page, builder);
  const name = `Recorded ${Date.now()}`;
  await makeDesign(page, name);
  await page.goto('/record');
  const row = page.getByRole('row').filter({ hasText: name });
  await expect(row).toContainText('made the design');
  await expect(row).toContainText(builder.name);
  await page.getByLabel('Done').selectOption('added to the shop');
  await expect(page.getByRole('row').filter({ hasText: name })).toHaveCount(0);
  await page.getByLabel('Done').selectOption('made the design');
  await expect(row).toBeVisible();
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: 'Save as CSV' }).click(),
  ]);
  expect(file.suggestedFilename()).toBe('record.csv');
});

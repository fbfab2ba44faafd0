/** What a machinist and an outsider get to see. */

import { readFileSync } from 'node:fs';
import { expect, test } from '../support/quiet-test';
import { makeDesign, openReleased } from '../support/design-screen';
import { builder, machinist, outsider, signIn } from '../support/sign-ins';

test.use({ viewport: { width: 390, height: 844 } });

test('a machinist reads the released revision and downloads its DXF, and can change nothing', async ({
  page,
}) => {
  await signIn(page, machinist);
  await page.goto('/designs');
  for (const name of ['New design', /Duplicate/, /Delete/]) {
    await expect(page.getByRole('button', { name })).toHaveCount(0);
  }
  const list = page.getByRole('table');
  // Drafts and what is in review are nothing to them.
  await expect(list.getByText(/released|withdrawn/).first()).toBeVisible();
  await expect(list.getByText(/^(draft|in review|changed)/)).toHaveCount(0);
  await openReleased(page);
  await expect(page.getByRole('status').filter({ hasText: 'Revision 1' })).toContainText(
    /released .* by /,
  );
  await expect(page.getByRole('heading', { name: 'Files to cut from' })).toBeInViewport();
  const parameters = page.locator('main input:not([type=range])');
  // The angle field alone, which turns the view and no design.
  await expect(parameters).toHaveCount(1);
  for (const name of ['Save', 'Ask for review', 'Release', 'Withdraw', 'Order cutting']) {
    await expect(page.getByRole('button', { name, exact: true })).toHaveCount(0);
  }

  const link = page.getByRole('link', { name: /^DXF, Rotor/ });
  expect((await link.boundingBox())!.height).toBeGreaterThanOrEqual(44);
  const [download] = await Promise.all([page.waitForEvent('download'), link.click()]);
  expect(download.suggestedFilename()).toMatch(/rotor.*\.dxf$/);
  const text = readFileSync(await download.path(), 'utf8');
  expect(text).toContain('LWPOLYLINE');
});

test('somebody from another workshop finds nothing', async ({ page, browser, complaints }) => {
  await signIn(page, builder);
  await makeDesign(page, `Ours ${Date.now()}`);
  const path = new URL(page.url()).pathname;
  const context = await browser.newContext();
  const stranger = await context.newPage();
  await signIn(stranger, outsider);
  for (const url of [path, '/designs/not-an-id']) {
    expect((await stranger.goto(url))!.status()).toBe(404);
    await expect(stranger.getByRole('heading', { name: 'Nothing here' })).toBeVisible();
  }
  await stranger.goto('/designs');
  await expect(stranger.getByRole('link', { name: /Ours/ })).toHaveCount(0);
  await context.close();
  expect(complaints).toEqual([]);
});

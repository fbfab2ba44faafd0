/** axe on every screen, wide and narrow, and nothing wider than the screen. */

import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, test } from '../support/quiet-test';
import { ready } from '../support/design-screen';
import { builder, machinist, signIn } from '../support/sign-ins';

async function check(page: Page, what: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  const found = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(' | ')}`,
  );
  expect.soft(found, what).toEqual([]);
  const wider = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(wider, `${what}: pixels beyond the screen`).toBe(0);
}

for (const width of [1440, 390]) {
  test(`every screen at ${width} px`, async ({ page }) => {
    // axe reads ten screens, on a busy machine slowly.
    test.slow();
    await page.setViewportSize({ width, height: width > 1000 ? 900 : 844 });
    await page.goto('/sign-in');
    await check(page, 'sign in');
    await page.goto('/sign-up');
    await check(page, 'sign up');

    await signIn(page, builder);
    await page.goto('/designs');
    await check(page, 'list');
    await page.getByRole('button', { name: 'New design' }).click();
    await expect(page.getByRole('dialog')).toBeVisible();
    await check(page, 'new design');
    await page.keyboard.press('Escape');
    await page
      .getByRole('button', { name: /^Delete/ })
      .first()
      .click();
    await expect(page.getByRole('alertdialog')).toBeVisible();
    await check(page, 'delete');
    await page.getByRole('button', { name: 'Keep it' }).click();
    await page.getByRole('table').getByRole('link').first().click();
    await ready(page);
    await check(page, 'design, builder');
    await page.getByRole('textbox', { name: 'Air gap', exact: true }).fill('90 mm');
    await check(page, 'design with a field to put right');
    await page.goto('/record');
    await expect(page.getByRole('heading', { name: 'Record' })).toBeVisible();
    await check(page, 'record');
    await page.context().clearCookies();

    await signIn(page, machinist);
    await page.goto('/designs');
    await page.getByRole('table').getByRole('link').first().click();
    await ready(page);
    await check(page, 'design, machinist');
  });
}

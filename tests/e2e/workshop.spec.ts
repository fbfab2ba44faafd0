/** Machines and sheet of the workshop. */
import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '../support/quiet-test';
import { builder, machinist, outsider, signIn } from '../support/sign-ins';

test('a builder adds, changes and deletes a machine; wrong values are told', async ({
  page,
}) => {
  const name = `Mill ${Date.now()}`;
  await signIn(page, builder);
  await page.goto('/designs');
  await page.getByRole('link', { name: 'Machines and sheet' }).click();
  await page.getByRole('button', { name: 'Add a machine' }).click();
  const dialog = page.getByRole('dialog', { name: 'Add a machine' });
  await dialog.getByLabel('Name').fill(name);
  await dialog.getByLabel('Kerf').fill('wide');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await expect(dialog.getByText(/Kerf: "wide" is not a number/)).toBeVisible();
  await dialog.getByLabel('Kerf').fill('0.04 in');
  await dialog.getByRole('button', { name: 'Save' }).click();
  const row = page.getByRole('row', { name: new RegExp(name) });
  await expect(row).toContainText('1.016 mm');
  await page.getByRole('button', { name: `Change ${name}` }).click();
  await page.getByRole('dialog').getByLabel('Process').selectOption('milling');
  await page.getByRole('dialog').getByRole('button', { name: 'Save' }).click();
  await expect(row).toContainText('milling');
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
  await page.getByRole('button', { name: `Delete ${name}` }).click();
  await page.getByRole('button', { name: 'Delete it' }).click();
  await expect(row).toHaveCount(0);
});

test('a machinist reads them; another workshop has its own', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await signIn(page, machinist);
  await page.goto('/workshop');
  await expect(page.getByRole('rowheader', { name: 'Bench fibre laser' })).toBeVisible();
  await expect(page.getByRole('button', { name: 'Add a machine' })).toHaveCount(0);
  const wider = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(wider).toBe(0);
  await page.context().clearCookies();
  await signIn(page, outsider);
  await page.goto('/workshop');
  await expect(page.getByText(/No machine yet/)).toBeVisible();
});

/** Machines and sheet of the workshop. */
import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '../support/quiet-test';
import { builder, machinist, outsider, owner, signIn } from '../support/sign-ins';

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

test('two who change one machine see both and choose', async ({
  page,
  browser,
  complaints,
}) => {
  const name = `Shared ${Date.now()}`;
  await signIn(page, builder);
  await page.goto('/workshop');
  await page.getByRole('button', { name: 'Add a machine' }).click();
  await page.getByRole('dialog').getByLabel('Name').fill(name);
  await page.getByRole('dialog').getByRole('button', { name: 'Save' }).click();
  await page.getByRole('button', { name: `Change ${name}` }).click();
  const mine = page.getByRole('dialog', { name: `Change ${name}` });

  const other = await browser.newPage();
  await signIn(other, owner);
  /** The owner gives the machine another kerf while the builder has it open. */
  async function changeKerf(kerf: string) {
    await other.goto('/workshop');
    await other.getByRole('button', { name: `Change ${name}` }).click();
    await other.getByRole('dialog').getByLabel('Kerf').fill(kerf);
    await other.getByRole('dialog').getByRole('button', { name: 'Save' }).click();
    await expect(other.getByRole('dialog')).toHaveCount(0);
  }
  await changeKerf('0.3 mm');

  await mine.getByLabel('Kerf').fill('0.2 mm');
  await mine.getByRole('button', { name: 'Save', exact: true }).click();
  const both = mine.getByRole('row', { name: 'Kerf' });
  await expect(both).toContainText('0.2 mm');
  await expect(both).toContainText('0.3 mm');
  const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
  await mine.getByRole('button', { name: 'Take theirs' }).click();
  await expect(mine.getByLabel('Kerf')).toHaveValue('0.3 mm');

  await changeKerf('0.35 mm');
  await mine.getByLabel('Kerf').fill('0.25 mm');
  await mine.getByRole('button', { name: 'Save', exact: true }).click();
  await mine.getByRole('button', { name: 'Save mine over it' }).click();
  await expect(page.getByRole('row', { name: new RegExp(name) })).toContainText('0.25 mm');
  await other.close();
  // The browser logs the refusals themselves.
  complaints.splice(0, complaints.length, ...complaints.filter((text) => !/409/.test(text)));
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

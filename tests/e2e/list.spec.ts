/** The list of designs: searching, sorting, duplicating, deleting, and others' changes. */

import { expect, test } from '../support/quiet-test';
import { makeDesign } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';

test('designs are found, sorted, duplicated and deleted', async ({ page }) => {
  await signIn(page, builder);
  const name = `List ${Date.now()}`;
  await makeDesign(page, name, 'Panel trimmer, 2.6 to 14 pF');
  await page.goto('/designs');
  await page.getByLabel('Search').fill(name);
  const rows = page.getByRole('row').filter({ has: page.getByRole('link') });
  await expect(rows).toHaveCount(1);
  await expect(rows).toContainText('capacitance');

  await page.getByRole('button', { name: `Duplicate ${name}` }).click();
  const dialog = page.getByRole('dialog');
  await expect(dialog.getByLabel('Name')).toHaveValue(`${name}, copy`);
  await dialog.getByRole('button', { name: 'Make it' }).click();
  await page.waitForURL(/\/designs\/[0-9a-f-]{36}$/);
  await page.goto('/designs');
  await page.getByLabel('Search').fill(name);
  await expect(rows).toHaveCount(2);

  const head = page.getByRole('columnheader', { name: 'Name' });
  await head.getByRole('button').click();
  await expect(head).toHaveAttribute('aria-sort', 'ascending');
  await expect(rows.first().getByRole('link')).toHaveText(name);
  await head.getByRole('button').click();
  await expect(head).toHaveAttribute('aria-sort', 'descending');
  await expect(rows.first().getByRole('link')).toHaveText(`${name}, copy`);

  await page.getByLabel('Status').selectOption('released');
  await expect(page.getByText('No design fits this search')).toBeVisible();
  await page.getByLabel('Status').selectOption('all');

  await page.getByRole('button', { name: `Delete ${name}, copy` }).click();
  await page.getByRole('button', { name: 'Delete it' }).click();
  await expect(rows).toHaveCount(1);
  await page.reload();
  await page.getByLabel('Search').fill(name);
  await expect(rows).toHaveCount(1);
});

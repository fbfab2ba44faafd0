/** Laying the plates out on sheets, beside the files. */

import { expect, test } from '../support/quiet-test';
import { makeDesign } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';

test('the plates are laid out, follow what is asked, and can be stopped', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Sheets ${Date.now()}`, 'Broadcast section, straight-line frequency');
  await page.getByRole('button', { name: 'Lay out on sheets' }).click();
  const tool = page.getByRole('dialog', { name: 'Lay out on sheets' });
  await expect(tool.getByText('Laid out.')).toBeVisible({ timeout: 30_000 });
  await expect(tool.getByText('This machine can cut every contour.')).toBeVisible();
  const sheet = tool.getByRole('img', { name: /^Sheet 1 with 14 × Rotor plate/ });
  await expect(sheet.locator('g > path')).toHaveCount(29);
  await expect(tool.getByRole('heading', { name: '0.8 mm brass' })).toBeVisible();
  await expect(tool.getByText(/compensated: contours moved by half of/)).toBeVisible();
  await expect(tool.getByRole('button', { name: 'Save all in a ZIP' })).toBeEnabled();

  await tool.getByLabel('Machine').selectOption('Old CO₂ laser');
  await expect(tool.getByText(/Bright brass under a laser/).first()).toBeVisible({
    timeout: 30_000,
  });

  // Two small sheets don’t hold it.
  await tool.getByLabel('Sheet taken').selectOption('of the size below');
  await tool.getByLabel('Sheet width').fill('110 mm');
  await tool.getByLabel('Sheet height').fill('4 in');
  await tool.getByLabel('Sheets of each kind').fill('2');
  await expect(tool.getByText(/Parts without room/)).toBeVisible({ timeout: 30_000 });
  await expect(tool.getByText(/Not all parts are on a sheet yet/)).toBeVisible();
  await expect(tool.getByRole('button', { name: 'Save all in a ZIP' })).toBeDisabled();
  await tool.getByLabel('Sheet height').fill('4 kg');
  await expect(tool.getByText('“4 kg” is no length from 20 mm to 4000 mm.')).toBeVisible();

  await tool.getByLabel('Capacitors').fill('12');
  await tool.getByLabel('Sheets of each kind').fill('100');
  await tool.getByRole('button', { name: 'Cancel' }).click();
  await expect(tool.getByText('Shown is the layout before.')).toBeVisible();
  await expect(tool.getByRole('progressbar')).toHaveCount(0);
  await tool.getByLabel('Capacitors').fill('2');
  await tool.getByLabel('Sheet width').fill('500');
  await expect(tool.getByText('Laid out.')).toBeVisible({ timeout: 30_000 });
});

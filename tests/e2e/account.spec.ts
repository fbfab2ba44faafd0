/** Signing in, setting up a workshop and signing out, on the screens. */

import { expect, test } from '../support/quiet-test';
import { machinist } from '../support/sign-ins';

test('a wrong password is told in plain words and the right one still works', async ({
  page,
  complaints,
}) => {
  await page.goto('/sign-in');
  await page.getByLabel('Email').fill(machinist.email);
  await page.getByLabel('Password').fill('not this one');
  await page.getByLabel('Password').press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: 'No account' })).toBeVisible();
  await expect(page.getByLabel('Email')).toHaveValue(machinist.email);
  await page.getByLabel('Password').fill(machinist.password);
  await page.getByLabel('Password').press('Enter');
  await expect(page.getByRole('heading', { name: 'Designs' })).toBeVisible();
  // The browser reports the refused request on its own.
  complaints.splice(0, complaints.length, ...complaints.filter((text) => !/401/.test(text)));
});

test('a workshop is set up, told what to do first, and left', async ({ page }) => {
  await page.goto('/sign-up');
  await page.getByLabel('Workshop').fill('Cooper Row');
  await page.getByLabel('Your name').fill('Ada Brandt');
  await page.getByLabel('Email').fill(`ada.${Date.now()}@cooper.example`);
  await page.getByLabel('Password').fill('short');
  await page.getByRole('button', { name: 'Set up the workshop' }).click();
  await expect(page.getByText(/Password: shorter than \d+ characters/)).toBeVisible();
  await expect(page.getByLabel('Workshop')).toHaveValue('Cooper Row');
  await page.getByLabel('Password').fill('long enough for this');
  await page.getByRole('button', { name: 'Set up the workshop' }).click();
  await expect(page.getByText('No designs yet. Start with New design')).toBeVisible();
  await expect(page.getByText('Cooper Row, Ada Brandt')).toBeVisible();
  await page.getByRole('button', { name: 'Cooper Row, Ada Brandt' }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await page.goto('/designs');
  await expect(page).toHaveURL(/\/sign-in/);
});

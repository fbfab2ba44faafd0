/** What the browser tests do again and again on the screens. */

import { expect, type Locator, type Page } from '@playwright/test';

/** Makes a design from the default through the screen and waits for its plates. */
export async function makeDesign(
  page: Page,
  name: string,
  from = 'Default design',
): Promise<void> {
  await page.goto('/designs');
  await page.getByRole('button', { name: 'New design' }).click();
  const dialog = page.getByRole('dialog', { name: 'New design' });
  await dialog.getByLabel('Name').fill(name);
  await dialog.getByText(from, { exact: true }).click();
  await dialog.getByRole('button', { name: 'Make it' }).click();
  await page.waitForURL(/\/designs\/[0-9a-f-]{36}$/);
  await ready(page);
}

/** A worked design whose first revision the demo workshop has released. */
export const RELEASED = 'Broadcast section, straight-line frequency';

/** Opens it as somebody who cuts does. */
export async function openReleased(page: Page): Promise<void> {
  await page.goto('/designs');
  await page.getByRole('link', { name: RELEASED, exact: true }).click();
  await ready(page);
}

/** The design screen is alive once the stack has drawn its first frame. */
export async function ready(page: Page): Promise<void> {
  await expect(page.locator('[data-part=stack]')).toHaveAttribute('data-angle', /./);
}

export const field = (page: Page, label: string): Locator =>
  page.getByRole('textbox', { name: label, exact: true });

/** Types into a field as a person does and leaves it. */
export async function enter(page: Page, label: string, text: string): Promise<void> {
  await field(page, label).fill(text);
  await field(page, label).press('Tab');
}

export const saveState = (page: Page): Locator =>
  page
    .getByRole('main')
    .getByRole('status')
    .filter({ hasText: /version|unsaved|saving|reach/ });

export async function save(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(saveState(page).first()).toContainText(/version \d+, saved/);
}

/** The outline of the rotor as it is drawn. */
export const rotorOutline = (page: Page): Promise<string | null> =>
  page.locator('[data-part=rotor] path').first().getAttribute('d');

/** Work is never lost: not by a reload, a lost connection or a second person. */

import { expect, test } from '../support/quiet-test';
import { enter, field, makeDesign, ready, save, saveState } from '../support/design-screen';
import { builder, owner, signIn } from '../support/sign-ins';

test('unsaved work survives a reload and can be kept or discarded', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Unsaved ${Date.now()}`);
  await enter(page, 'Air gap', '0.61 mm');
  await enter(page, 'Rotor sheet', 'thick');
  await expect(saveState(page).first()).toContainText('unsaved changes');
  await page.reload();
  await ready(page);
  await expect(page.getByText('are back on the screen')).toBeVisible();
  await expect(field(page, 'Air gap')).toHaveValue('0.61');
  await expect(field(page, 'Rotor sheet')).toHaveValue('thick');
  await expect(field(page, 'Rotor sheet')).toHaveAttribute('aria-invalid', 'true');
  await enter(page, 'Rotor sheet', '1 mm');
  await page.getByRole('button', { name: 'Keep them' }).click();
  await save(page);
  await page.reload();
  await ready(page);
  await expect(page.getByText('are back on the screen')).toHaveCount(0);
  await expect(field(page, 'Air gap')).toHaveValue('0.61');

  await enter(page, 'Air gap', '0.9 mm');
  await page.reload();
  await ready(page);
  await page.getByRole('button', { name: 'Discard them' }).click();
  await expect(field(page, 'Air gap')).toHaveValue('0.61');
  await page.reload();
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.61');
});

test('without a connection the save waits and goes through later', async ({
  page,
  context,
  complaints,
}) => {
  await signIn(page, builder);
  await makeDesign(page, `Offline ${Date.now()}`);
  await enter(page, 'Air gap', '0.62 mm');
  await context.setOffline(true);
  await page.keyboard.press('Control+s');
  await expect(saveState(page).first()).toContainText('will try again');
  await context.setOffline(false);
  await expect(saveState(page).first()).toContainText('version 2, saved', { timeout: 20_000 });
  await page.reload();
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.62');
  // The browser itself reports the request that could not leave.
  complaints.splice(0, complaints.length, ...complaints.filter((text) => !/ERR_/.test(text)));
});

test('two people saving the same design meet a choice', async ({
  page,
  browser,
  complaints,
}) => {
  test.slow();
  await signIn(page, builder);
  await makeDesign(page, `Shared ${Date.now()}`);
  const path = new URL(page.url()).pathname;
  const other = await (await browser.newContext()).newPage();
  await signIn(other, owner);

  const meanwhile = async (gap: string) => {
    await other.goto(path);
    await ready(other);
    await enter(other, 'Air gap', gap);
    await save(other);
  };
  const clash = async (sheet: string) => {
    await enter(page, 'Rotor sheet', sheet);
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    const dialog = page.getByRole('alertdialog');
    await expect(dialog).toContainText(`${owner.name} saved this design meanwhile`);
    await expect(dialog.getByRole('row', { name: /Air gap/ })).toBeVisible();
    await expect(dialog.getByRole('row', { name: /Rotor sheet/ })).toContainText(sheet);
    return dialog;
  };

  await enter(page, 'Stator sheet', '0.9 mm');
  await meanwhile('0.71 mm');
  const first = await clash('0.91 mm');
  await first.getByRole('button', { name: 'Overwrite with mine' }).click();
  await expect(saveState(page).first()).toContainText(/version 3, saved/);
  await expect(field(page, 'Air gap')).toHaveValue('0.5');

  await enter(page, 'Stator sheet', '1 mm');
  await meanwhile('0.72 mm');
  const second = await clash('0.92 mm');
  await second.getByRole('button', { name: 'Take theirs' }).click();
  await expect(field(page, 'Air gap')).toHaveValue('0.72');
  await expect(field(page, 'Rotor sheet')).toHaveValue('0.91');

  await enter(page, 'Stator sheet', '1.1 mm');
  await meanwhile('0.73 mm');
  const third = await clash('0.93 mm');
  await third.getByRole('button', { name: 'Save mine as a new design' }).click();
  await page.waitForURL((url) => url.pathname !== path);
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.72');
  await expect(field(page, 'Rotor sheet')).toHaveValue('0.93');
  await other.context().close();
  // The browser reports every 409 on its own.
  complaints.splice(0, complaints.length, ...complaints.filter((text) => !/409/.test(text)));
});

test('what others save appears', async ({ page, browser }) => {
  await signIn(page, builder);
  await makeDesign(page, `Live ${Date.now()}`);
  const other = await (await browser.newContext()).newPage();
  await signIn(other, owner);
  await other.goto(page.url());
  await ready(other);
  await enter(other, 'Air gap', '0.48 mm');
  await save(other);
  await expect(page.getByText(`${owner.name} saved version 2`)).toBeVisible({
    timeout: 20_000,
  });
  await expect(field(page, 'Air gap')).toHaveValue('0.48');
  await other.context().close();
});

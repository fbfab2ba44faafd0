/** One builder's way from nothing to a saved design, and the fields it takes. */

import { expect, test } from '../support/quiet-test';
import { enter, field, makeDesign, ready, rotorOutline, save } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';

test('a builder signs in, makes a design, changes it, saves it and finds it again', async ({
  page,
}) => {
  await page.goto('/designs');
  await expect(page).toHaveURL(/\/sign-in/);
  await page.getByLabel('Email').fill(builder.email);
  await page.getByLabel('Password').fill(builder.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Designs' })).toBeVisible();

  const name = `Bench test ${Date.now()}`;
  await makeDesign(page, name);
  const before = await rotorOutline(page);
  await enter(page, 'Air gap', '0.02 in');
  await expect(field(page, 'Air gap')).toHaveValue('0.508');
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
  await save(page);

  await page.reload();
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.508');

  await page.getByRole('link', { name: 'Designs' }).click();
  await page.getByLabel('Search').fill(name);
  await expect(page.getByRole('status')).toContainText('1 of');
  await page.getByRole('link', { name }).click();
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.508');
});

test('fields take units as people write them and show them back', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Units ${Date.now()}`);
  for (const [label, typed, shown] of [
    ['Air gap', '1/32"', '0.79375'],
    ['Rotor sheet', '31.5 thou', '0.8001'],
    ['Band, high end', '1.6 MHz', '1600'],
    ['Circuit stray', '0.02 nF', '20'],
    ['Coil inductance', '0.24 mH', '240'],
    ['Travel', '3 rad', '171.887'],
    ['Shaft diameter', '1/4 in', '6.35'],
    ['Band, low end', '540', '540'],
  ] as const) {
    await enter(page, label, typed);
    await expect(field(page, label), typed).toHaveValue(shown);
  }
});

test('a value that cannot be keeps the plates and says what to give', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Invalid ${Date.now()}`);
  const before = await rotorOutline(page);
  for (const [typed, message] of [
    ['5 kHz', 'Air gap: “5 kHz” is not a length; give 0.1 mm to 15 mm'],
    ['40 mm', 'Air gap: 40 mm is out of range; give 0.1 mm to 15 mm'],
    ['', 'Air gap: empty; give 0.1 mm to 15 mm'],
  ] as const) {
    await enter(page, 'Air gap', typed);
    await expect(page.getByLabel('Parameters').getByText(message)).toBeVisible();
    await expect(field(page, 'Air gap')).toHaveAttribute('aria-invalid', 'true');
    expect(await rotorOutline(page)).toBe(before);
  }
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'Not saved' })).toBeVisible();
  await expect(field(page, 'Air gap')).toBeFocused();
  await enter(page, 'Air gap', '0.6');
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
});

test('a check that fails leads to the field to change', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Checks ${Date.now()}`);
  await enter(page, 'Largest radius allowed', '30 mm');
  const finding = page.getByRole('listitem').filter({ hasText: 'fails' }).first();
  await expect(finding).toBeVisible();
  await finding.getByRole('button').click();
  const focused = page.locator('input:focus');
  await expect(focused).toHaveAttribute('id', /^field-/);
});

test('the frame is in the 3D view and can be taken out of it', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, 'Framed');
  const stack = page.locator('[data-part=stack]');
  const picture = stack.getByRole('img', { name: /^Meshed stack/ });
  await expect(stack).toHaveAttribute('data-angle', /\d/);
  await expect(picture).toHaveAccessibleName(/in its frame/);
  const framed = await picture.screenshot();
  await stack.getByRole('button', { name: 'Hide frame' }).click();
  await expect(picture).not.toHaveAccessibleName(/in its frame/);
  await expect.poll(async () => (await picture.screenshot()).equals(framed)).toBe(false);
  await expect(stack.getByRole('button', { name: 'Show frame' })).toBeVisible();
});

test('the angle rule turns floor, chart and stack together, by keyboard', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Rule ${Date.now()}`);
  const rule = page.getByRole('slider', { name: 'Angle rule' });
  const seen = () =>
    Promise.all([
      page.locator('[data-part=rotor]').first().getAttribute('style'),
      page.locator('[data-part=law-chart] [data-part=cursor]').getAttribute('style'),
      page.locator('[data-part=stack]').getAttribute('data-angle'),
    ]);
  await rule.focus();
  await rule.press('Home');
  await expect(page.locator('[data-part=stack]')).toHaveAttribute('data-angle', '0.0');
  const open = await seen();
  await rule.press('End');
  await expect(page.locator('[data-part=stack]')).toHaveAttribute('data-angle', '180.0');
  const meshed = await seen();
  for (const index of [0, 1, 2]) expect(meshed[index]).not.toBe(open[index]);
  await rule.press('ArrowLeft');
  await expect(page.locator('[data-part=stack]')).toHaveAttribute('data-angle', '179.0');
});

test('sections are added, shown and removed without touching the others', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Gang ${Date.now()}`);
  await page.getByRole('button', { name: 'Add a section' }).click();
  await enter(page, 'Air gap', '0.7 mm');
  await page
    .getByRole('radiogroup', { name: 'Section' })
    .getByText('1', { exact: true })
    .click();
  await expect(field(page, 'Air gap')).toHaveValue('0.5');
  await save(page);
  await page.reload();
  await ready(page);
  await page
    .getByRole('radiogroup', { name: 'Section' })
    .getByText('2', { exact: true })
    .click();
  await expect(field(page, 'Air gap')).toHaveValue('0.7');
  await page.getByRole('button', { name: 'Remove' }).click();
  await expect(field(page, 'Air gap')).toHaveValue('0.5');
});

test('a law and a kind of target keep the values that they hide', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Laws ${Date.now()}`);
  const before = await rotorOutline(page);
  await enter(page, 'Coil inductance', '300 µH');
  await page.getByText('capacitance', { exact: true }).last().click();
  await expect(field(page, 'Coil inductance')).toHaveCount(0);
  await enter(page, 'Capacitance, meshed', '365 pF');
  await page.getByText('band and coil', { exact: true }).click();
  await expect(field(page, 'Coil inductance')).toHaveValue('300');
  await page.getByText('wavelength', { exact: true }).click();
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
});

test('the field one tabs to is never under the help line', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Tab ${Date.now()}`);
  for (const size of [
    { width: 1440, height: 900 },
    { width: 390, height: 844 },
  ]) {
    await page.setViewportSize(size);
    await field(page, 'Rotor plates').focus();
    for (let step = 0; step < 14; step++) {
      await page.keyboard.press('Tab');
      const hit = await page.evaluate(() => {
        // A radio's own input is hidden; what is seen of it is its label.
        const shown = document.activeElement!.closest('label') ?? document.activeElement!;
        const box = shown.getBoundingClientRect();
        const at = document.elementFromPoint(box.x + box.width / 2, box.y + box.height / 2);
        return shown.contains(at);
      });
      expect(hit, `${size.width} px, ${step + 1} steps`).toBe(true);
    }
  }
});

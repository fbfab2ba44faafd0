/** How the shaft turns on the screen, and which field the screen says it shows. */

import { expect, test } from '../support/quiet-test';
import { enter, field, makeDesign } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';
import type { Page } from '@playwright/test';

/** How far the rotor is turned as drawn, degrees counter-clockwise. */
const drawn = (page: Page): Promise<number> =>
  page
    .locator('[data-part=rotor]')
    .first()
    .evaluate(
      (layer) => -Number(/rotate\((-?[\d.]+)deg\)/.exec(layer.getAttribute('style')!)![1]),
    );

const shaftAngle = (page: Page) => page.getByRole('textbox', { name: 'Shaft angle' });

/** Takes hold of the blade and carries it round the shaft by so many degrees counter-clockwise. */
async function carry(page: Page, bearing: number, by: number): Promise<void> {
  const box = (await page.locator('[data-part=floor]').boundingBox())!;
  const radius = 0.14 * Math.min(box.width, box.height);
  const at = (degrees: number) =>
    [
      box.x + box.width / 2 + radius * Math.cos((degrees * Math.PI) / 180),
      box.y + box.height / 2 - radius * Math.sin((degrees * Math.PI) / 180),
    ] as const;
  await page.mouse.move(...at(bearing));
  await page.mouse.down();
  for (let part = 1; part <= 6; part++) await page.mouse.move(...at(bearing + (by * part) / 6));
  await page.mouse.up();
}

for (const [sense, direction] of [
  ['anticlockwise', 1],
  ['clockwise', -1],
] as const) {
  test(`a rotor that meshes ${sense} turns and is carried that way`, async ({ page }) => {
    await signIn(page, builder);
    await makeDesign(page, `Sense ${sense} ${Date.now()}`);
    await page
      .getByRole('radiogroup', { name: 'Meshes turning' })
      .getByText(sense, { exact: true })
      .click();
    const rule = page.getByRole('slider', { name: 'Angle rule' });
    // At the meshed stop the rotor stands its own sector, 170°, beyond where it is drawn.
    await rule.press('End');
    await expect.poll(() => drawn(page)).toBeCloseTo(direction * 170, 3);
    await rule.press('Home');
    await expect.poll(() => drawn(page)).toBeCloseTo(direction * -10, 3);
    await expect(shaftAngle(page)).toHaveValue('0.0');

    // The blade lies behind its leading edge: 130° into it, where it is broad.
    await carry(page, direction * -140, direction * 30);
    await expect
      .poll(async () => Number(await shaftAngle(page).inputValue()))
      .toBeGreaterThan(28);
    expect(Number(await shaftAngle(page).inputValue())).toBeLessThan(32);
  });
}

test('a rest left empty shows what was chosen, and the law keeps to what is typed', async ({
  page,
}) => {
  await signIn(page, builder);
  await makeDesign(page, `Rests ${Date.now()}`);
  const rest = field(page, 'Rest before the law');
  await expect(rest).toHaveValue('');
  await expect(rest).toHaveAttribute('placeholder', /^chosen \d+(\.\d+)?$/);
  const chosen = Number((await rest.getAttribute('placeholder'))!.replace('chosen ', ''));
  await expect(page.getByText(new RegExp(`^law ${chosen.toFixed(1)}° to `))).toBeVisible();

  await enter(page, 'Rest before the law', '20');
  await expect(page.getByText(/^law 20\.0° to /)).toBeVisible();
  await expect(page.locator('[data-part=rest]')).toHaveCount(2);
});

test('the screen says which field it shows, in view and without moving', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Field ${Date.now()}`);
  const says = page.getByRole('status').filter({ hasText: 'plan view' });
  await expect(says).toHaveText('edges and plan view');
  await expect(says).toBeInViewport();
  // From before the keystroke on: the first stage is gone again within some tenths of a second.
  await says.evaluate((line) => {
    const rule = document.querySelector('[data-part=angle-rule]')!;
    const height = rule.getBoundingClientRect().height;
    new MutationObserver(() => {
      const moved = rule.getBoundingClientRect().height - height;
      line.setAttribute(
        'data-said',
        `${line.getAttribute('data-said') ?? ''}|${line.textContent}`,
      );
      line.setAttribute('data-moved', String(moved));
    }).observe(line, { characterData: true, childList: true, subtree: true });
  });
  await enter(page, 'Air gap', '0.55');
  await expect(says).toHaveAttribute(
    'data-said',
    /^\|edges only, plan view being solved.*\|edges and plan view$/,
  );
  await expect(says).toHaveAttribute('data-moved', '0');
});

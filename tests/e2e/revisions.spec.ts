/** Revisions on the screens: named, reviewed, released, cut from, withdrawn; compared and restored. */

import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import AxeBuilder from '@axe-core/playwright';
import type { Browser, Locator, Page } from '@playwright/test';
import { enter, field, makeDesign, ready, save } from '../support/design-screen';
import { expect, test } from '../support/quiet-test';
import { builder, machinist, outsider, owner, signIn, type SignIn } from '../support/sign-ins';

/** What the workshop may wait to see it, ms. */
const SOON = { timeout: 2_000 };

async function check(page: Page, what: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  expect
    .soft(
      violations.map(({ id, nodes }) => `${id}: ${nodes[0]!.html.slice(0, 160)}`),
      what,
    )
    .toEqual([]);
  const wider = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(wider, `${what}: pixels beyond the screen`).toBe(0);
}

async function other(browser: Browser, person: SignIn, width = 1440): Promise<Page> {
  const viewport = { width, height: width > 1000 ? 900 : 844 };
  const context = await browser.newContext({ viewport });
  const page = await context.newPage();
  await signIn(page, person);
  return page;
}

/** From the design to a revision with its own page. Resolves to its path. */
async function nameRevision(page: Page, name: string): Promise<string> {
  await page.getByRole('link', { name: 'Revisions', exact: true }).click();
  await page.getByRole('button', { name: 'Name a revision' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Name').fill(name);
  await dialog.getByLabel('Note').fill('First for the bench');
  await dialog.getByRole('button', { name: 'Name it' }).click();
  await expect(dialog).toBeHidden();
  await page.getByRole('link', { name: new RegExp(`^Revision \\d+: ${name}`) }).click();
  await ready(page);
  return new URL(page.url()).pathname;
}

/** The word of the revision's state, beside its heading. */
const state = (page: Page, word: string): Locator =>
  page.getByRole('main').getByText(word, { exact: true }).first();

async function release(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Release', exact: true }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Release it' }).click();
  await expect(state(page, 'released')).toBeVisible();
}

test('named, reviewed, released, cut from as frozen, and withdrawn on every open page', async ({
  page,
  browser,
}) => {
  test.slow();
  const design = `To be cut ${Date.now()}`;
  await signIn(page, builder);
  await makeDesign(page, design);
  const path = await nameRevision(page, 'Bench');
  expect(path).toMatch(/\/designs\/[0-9a-f-]{36}\/revisions\/1$/);
  await expect(state(page, 'draft')).toBeVisible();

  const phone = await other(browser, machinist, 390);
  const cut = path.replace('/revisions/1', '');
  expect((await phone.goto(cut))!.status()).toBe(404);
  const reviewer = await other(browser, owner);
  await reviewer.goto(path);
  await page.getByRole('button', { name: 'Ask for review' }).click();
  await expect(state(page, 'in review')).toBeVisible();
  await expect(state(reviewer, 'in review')).toBeVisible(SOON);

  await reviewer.getByRole('button', { name: 'Send back' }).click();
  await reviewer.getByLabel('Reason').fill('the note says nothing of the gap');
  await reviewer.getByRole('button', { name: 'Send it back' }).click();
  await expect(page.getByRole('button', { name: 'Ask for review' })).toBeVisible(SOON);
  await page.getByRole('button', { name: 'Ask for review' }).click();
  await expect(reviewer.getByRole('button', { name: 'Release', exact: true })).toBeVisible(
    SOON,
  );
  await release(reviewer);
  await expect(state(page, 'released')).toBeVisible(SOON);
  await expect(page.getByRole('button', { name: 'Order cutting' })).toBeVisible();

  await phone.goto('/designs');
  await phone.getByRole('link', { name: design }).click();
  await ready(phone);
  await expect(phone.getByText(`by ${owner.name}`).first()).toBeVisible();
  const link = phone.getByRole('link', { name: /^DXF, Rotor/ }).first();
  const [download] = await Promise.all([phone.waitForEvent('download'), link.click()]);
  const bytes = readFileSync(await download.path());
  await phone.getByText('SHA-256 of each file').click();
  const shown = phone
    .locator('dl > div')
    .filter({ hasText: download.suggestedFilename() })
    .locator('dd');
  await expect(shown).toHaveText(createHash('sha256').update(bytes).digest('hex'));

  const address = (await link.getAttribute('href'))!;
  await reviewer.getByRole('button', { name: 'Withdraw' }).click();
  await reviewer.getByLabel('Reason').fill('the shaft hole is too small');
  await reviewer.getByRole('button', { name: 'Withdraw it' }).click();
  const alert = phone.getByRole('alert').filter({ hasText: 'Do not cut.' });
  await expect(alert).toContainText('the shaft hole is too small', SOON);
  await expect(alert).toContainText(owner.name);
  await expect(phone.getByRole('link', { name: /^(DXF|SVG|ZIP|PDF)/ })).toHaveCount(0);
  expect((await phone.request.get(address)).status()).toBe(410);
  await expect(state(page, 'withdrawn')).toBeVisible();
  await check(phone, 'withdrawn, machinist');

  await signIn(phone, outsider);
  for (const url of [path, `${cut}/revisions`, `${cut}/compare`]) {
    expect((await phone.goto(url))!.status(), url).toBe(404);
  }
  await phone.context().close();
  await reviewer.context().close();
});

test('with a check that fails only the owner releases, and says why', async ({
  page,
  browser,
}) => {
  test.slow();
  await signIn(page, builder);
  await makeDesign(page, `Waived ${Date.now()}`);
  await enter(page, 'Working voltage, peak', '40 kV');
  await save(page);
  const path = await nameRevision(page, 'High voltage');
  await page.getByRole('button', { name: 'Ask for review' }).click();
  await page.getByRole('button', { name: 'Release', exact: true }).click();
  const mine = page.getByRole('dialog');
  await expect(mine).toContainText('Only the owner can release it all the same');
  await expect(mine).toContainText('Working voltage at the gap');
  await expect(mine.getByRole('button', { name: 'Release it' })).toHaveCount(0);
  await mine.getByRole('button', { name: 'Close' }).click();

  const master = await other(browser, owner);
  await master.goto(path);
  await ready(master);
  await master.getByRole('button', { name: 'Release', exact: true }).click();
  const dialog = master.getByRole('dialog');
  await expect(dialog.getByRole('textbox').first()).toBeVisible();
  for (const reason of await dialog.getByRole('textbox').all()) {
    await reason.fill('under oil, measured on the bench');
  }
  await check(master, 'release with a reason');
  await dialog.getByRole('button', { name: 'Release it' }).click();
  await expect(state(master, 'released')).toBeVisible();
  for (const someone of [master, page]) {
    await expect(someone.getByRole('list', { name: 'Released in spite of' })).toContainText(
      `by ${owner.name}, “under oil, measured on the bench”`,
    );
  }
  await master.context().close();
});

test('two states side by side; an earlier one is gone on from', async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Compared ${Date.now()}`);
  const design = page.url();
  await nameRevision(page, 'Narrow');
  await page.goto(design);
  await ready(page);
  await enter(page, 'Air gap', '0.62 mm');
  await save(page);

  await page.getByRole('link', { name: 'Revisions', exact: true }).click();
  await page
    .getByRole('region', { name: 'Compare two' })
    .getByRole('link', { name: 'Compare' })
    .click();
  await page.waitForURL(/compare\?a=r1&b=draft$/);
  const parameters = page.getByRole('region', { name: 'Parameters that differ' });
  await expect(parameters.getByRole('row')).toHaveCount(2);
  await expect(parameters.getByRole('row', { name: /^Air gap/ })).toContainText('0.62 mm');
  const [rotor] = await page.locator('[data-part=overlay] [data-part=rotor] path').all();
  await expect(rotor!).toHaveAttribute('d', /^M/);
  const figures = page.getByRole('region', { name: 'What they reach' });
  await expect(figures.getByRole('row', { name: /^Depth over the plates/ })).toContainText('+');
  await page.getByText('The chart in figures').click();
  const law = page.getByRole('region', { name: 'Difference of the laws in figures' });
  await expect(law.getByRole('row', { name: /^90°/ })).toBeVisible();

  await page.getByLabel('Second').selectOption('Revision 1: Narrow');
  await expect(page.getByText('both have the same parameters')).toBeVisible();
  await expect(page.getByText('Every figure is the same.')).toBeVisible();

  await page.getByRole('link', { name: 'All revisions' }).click();
  await page.getByRole('button', { name: 'Restore revision 1' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Restore' }).click();
  await page.waitForURL(design);
  await ready(page);
  await expect(field(page, 'Air gap')).toHaveValue('0.5');
  await expect(page.getByText('version 3, saved').first()).toBeVisible();
});

for (const width of [1440, 390]) {
  test(`revisions, one of them and two states at ${width} px`, async ({ page }) => {
    test.slow();
    await page.setViewportSize({ width, height: width > 1000 ? 900 : 844 });
    await signIn(page, builder);
    await makeDesign(page, `Looked at ${Date.now()}`);
    const design = page.url();
    const path = await nameRevision(page, 'To be looked at by everybody in the workshop');
    await check(page, 'draft of a revision');
    await page.goto(`${design}/revisions`);
    await check(page, 'revisions');
    await page.getByRole('button', { name: 'Name a revision' }).click();
    await expect(page.getByRole('dialog')).toBeVisible();
    await check(page, 'name a revision');
    await page.goto(`${design}/compare?a=r1&b=v1`);
    await page.getByText('The chart in figures').click();
    await check(page, 'two states');
    await page.goto(`${path}/parts`);
    await expect(page.getByRole('heading', { name: /revision 1$/ })).toBeVisible();
    await check(page, 'parts of a revision');
  });
}

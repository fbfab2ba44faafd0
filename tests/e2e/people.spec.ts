/** Members, invitations and mail, one's account and a forgotten password, on the screens. */

import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from '@playwright/test';
import { expect, test } from '../support/quiet-test';
import { builder, machinist, outsider, owner, signIn } from '../support/sign-ins';

const PASSWORD = 'long enough for this';

// Playwright's own scripts are refused by the frame of a mail, which lets none run.
test.afterEach(({ complaints }) => {
  const rest = complaints.filter((text) => !text.includes("execution in 'about:srcdoc'"));
  complaints.splice(0, complaints.length, ...rest);
});

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

/** The address behind a link of the newest mail to somebody, as its reader would follow it. */
async function linkInMail(page: Page, to: string, words: string): Promise<string> {
  await page.goto('/people/mail');
  const row = page.getByRole('row').filter({ hasText: to }).first();
  await expect(row.getByText('sent', { exact: true })).toBeVisible({ timeout: 20_000 });
  await row.getByRole('button', { name: 'Read' }).click();
  const link = page
    .getByRole('dialog')
    .frameLocator('iframe')
    .getByRole('link', { name: words });
  await expect(link).toBeVisible();
  return (await link.getAttribute('href'))!;
}

async function asStranger(browser: Browser): Promise<Page> {
  return (await browser.newContext({ viewport: { width: 390, height: 844 } })).newPage();
}

async function invite(page: Page, email: string, role: string): Promise<void> {
  await page.goto('/people');
  await page.getByRole('button', { name: 'Invite somebody' }).click();
  const dialog = page.getByRole('dialog', { name: 'Invite somebody' });
  await dialog.getByLabel('Email').fill(email);
  await dialog.getByLabel('Role').selectOption(role);
  await dialog.getByRole('button', { name: 'Invite', exact: true }).click();
  await expect(dialog).toHaveCount(0);
}

test('asked in by mail, joined on a phone, given a role, removed, let back in', async ({
  page,
  browser,
}) => {
  test.slow();
  const email = `vera.${Date.now()}@larkfield.example`;
  const name = `Vera ${Date.now()}`;
  await signIn(page, owner);
  await invite(page, email, 'machinist');
  const invited = page.getByRole('table', { name: 'Invited' });
  await expect(invited.getByRole('row', { name: new RegExp(email) })).toContainText(
    'machinist',
  );
  await check(page, 'people');
  await page.goto('/people/mail');
  // Without a mail open: axe waits for ever for its script in a frame that lets none run.
  await check(page, 'mail sent');
  const href = await linkInMail(page, email, `Join ${owner.workshop}`);

  const stranger = await asStranger(browser);
  await stranger.goto(href);
  await expect(stranger.getByRole('heading', { name: `Join ${owner.workshop}` })).toBeVisible();
  await check(stranger, 'join');
  await stranger.getByLabel('Your name').fill(name);
  await stranger.getByLabel('Password').fill(PASSWORD);
  await stranger.getByRole('button', { name: `Join ${owner.workshop}` }).click();
  await expect(stranger.getByRole('heading', { name: 'Designs' })).toBeVisible();
  await check(stranger, 'list of somebody new');
  await stranger.goto(href);
  await expect(stranger.getByText('has been used')).toBeVisible();
  await check(stranger, 'a link that is used');

  await page.goto('/people');
  const row = page.getByRole('table', { name: 'Members' }).getByRole('row', { name });
  await expect(row).toContainText('machinist');
  await row.getByRole('button', { name: `Change the role of ${name}` }).click();
  await page.getByRole('dialog').getByLabel('Role').selectOption('builder');
  await page.getByRole('button', { name: 'Set the role' }).click();
  await expect(row).toContainText('builder');
  await row.getByRole('button', { name: `Remove ${name}` }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Remove' }).click();
  await expect(row).toHaveCount(0);

  await stranger.goto('/designs');
  await expect(stranger.getByText('You belong to no workshop now')).toBeVisible();
  await check(stranger, 'account without a workshop');
  await invite(page, email, 'builder');
  await stranger.goto(await linkInMail(page, email, `Join ${owner.workshop}`));
  await expect(stranger.getByText('You are signed in as this person')).toBeVisible();
  await stranger.getByRole('button', { name: `Join ${owner.workshop}` }).click();
  await expect(stranger.getByRole('heading', { name: 'Designs' })).toBeVisible();
  await stranger.context().close();
});

test('an invitation is withdrawn; its link says so, also to somebody else signed in', async ({
  page,
  browser,
}) => {
  const email = `otto.${Date.now()}@larkfield.example`;
  await signIn(page, owner);
  await invite(page, email, 'builder');
  const href = await linkInMail(page, email, `Join ${owner.workshop}`);
  await page.goto(href);
  await expect(page.getByText(`You are signed in as ${owner.email}`)).toBeVisible();
  await page.goto('/people');
  await page.getByRole('button', { name: `Withdraw the invitation of ${email}` }).click();
  await expect(page.getByText(email)).toHaveCount(0);
  const stranger = await asStranger(browser);
  await stranger.goto(href);
  await expect(stranger.getByText('was withdrawn')).toBeVisible();
  await stranger.context().close();
});

test('a forgotten password is made anew, and every other browser is signed out', async ({
  page,
  browser,
}) => {
  test.slow();
  const email = `lina.${Date.now()}@larkfield.example`;
  await signIn(page, owner);
  await invite(page, email, 'machinist');
  const first = await asStranger(browser);
  await first.goto(await linkInMail(page, email, `Join ${owner.workshop}`));
  await first.getByLabel('Your name').fill('Lina Aster');
  await first.getByLabel('Password').fill(PASSWORD);
  await first.getByRole('button', { name: `Join ${owner.workshop}` }).click();
  await expect(first.getByRole('heading', { name: 'Designs' })).toBeVisible();

  const second = await asStranger(browser);
  await second.goto('/sign-in');
  await second.getByRole('link', { name: 'Password forgotten?' }).click();
  await expect(second.getByRole('heading', { name: 'A new password' })).toBeVisible();
  await second.getByLabel('Email').fill(email);
  await check(second, 'forgotten password');
  await second.getByRole('button', { name: 'Send the link' }).click();
  await expect(second.getByText('a mail with a link is on its way')).toBeVisible();
  await second.goto(await linkInMail(page, email, 'Choose a new password'));
  await check(second, 'new password');
  await second.getByLabel('New password').fill('another one that is long');
  await second.getByRole('button', { name: 'Set the new password' }).click();
  await expect(second.getByRole('heading', { name: 'Designs' })).toBeVisible();
  await first.goto('/designs');
  await expect(first).toHaveURL(/\/sign-in/);

  await second.goto('/account');
  await second.getByLabel('Password now').fill('another one that is long');
  await second.getByLabel('New password').fill('and one that is longer still');
  await second.getByRole('button', { name: 'Change the password' }).click();
  await expect(second.getByText('The new password holds')).toBeVisible();
  await second.reload();
  await second.getByRole('button', { name: 'Sign out everywhere' }).click();
  await expect(second).toHaveURL(/\/sign-in/);
  await first.context().close();
  await second.context().close();
});

test('somebody in two workshops changes between them, and chooses mail for each', async ({
  page,
}) => {
  await signIn(page, builder);
  await page.goto('/designs');
  await expect(page.getByRole('button', { name: 'New design' })).toBeVisible();
  await page.getByRole('button', { name: `${builder.workshop}, ${builder.name}` }).click();
  await check(page, 'menu');
  await page.getByRole('button', { name: outsider.workshop }).click();
  await expect(
    page.getByRole('button', { name: `${outsider.workshop}, ${builder.name}` }),
  ).toBeVisible();
  await expect(page.getByRole('button', { name: 'New design' })).toHaveCount(0);
  await page.getByRole('button', { name: `${outsider.workshop}, ${builder.name}` }).click();
  await page.getByRole('link', { name: 'Your account' }).click();
  await expect(page.getByRole('heading', { name: 'Your account' })).toBeVisible();
  await check(page, 'account');
  const cut = page
    .getByRole('group', { name: `Mail from ${outsider.workshop} when` })
    .getByLabel('A cut order is cut');
  await cut.uncheck();
  await expect(page.getByText('Kept.')).toBeVisible();
  await page.reload();
  await expect(cut).not.toBeChecked();
  await cut.check();
  await expect(page.getByText('Kept.')).toBeVisible();
  await page.getByRole('button', { name: `Change to ${builder.workshop}` }).click();
  await expect(page.getByRole('button', { name: 'New design' })).toBeVisible();
});

test('a machinist sees who belongs, and neither invitations nor mail', async ({
  page,
  complaints,
}) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await signIn(page, machinist);
  await page.goto('/designs');
  await page.getByRole('link', { name: 'People' }).click();
  await expect(
    page.getByRole('table', { name: 'Members' }).getByText(owner.email),
  ).toBeVisible();
  await expect(page.getByRole('button', { name: /Invite|Remove|Change/ })).toHaveCount(0);
  await check(page, 'people, machinist');
  expect((await page.goto('/people/mail'))!.status()).toBe(404);
  // The browser reports the missing page on its own.
  complaints.splice(0, complaints.length, ...complaints.filter((text) => !/404/.test(text)));
});

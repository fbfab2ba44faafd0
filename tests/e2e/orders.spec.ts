/** Cut orders on the screens: from the order to what came of it, with a question in between. */

import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from '@playwright/test';
import { expect, test } from '../support/quiet-test';
import { builder, machinist, outsider, signIn, type SignIn } from '../support/sign-ins';

const DAY = 24 * 3600 * 1000;
const dayIn = (days: number): string =>
  new Date(Date.now() + days * DAY).toISOString().slice(0, 10);

/** One pixel. */
const photo = {
  name: 'edge.png',
  mimeType: 'image/png',
  buffer: Buffer.from(
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
    'base64',
  ),
};

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

async function onPhone(browser: Browser, person: SignIn): Promise<Page> {
  const context = await browser.newContext({ viewport: { width: 390, height: 844 } });
  const page = await context.newPage();
  await signIn(page, person);
  return page;
}

const state = (page: Page, word: string) =>
  page.getByRole('main').getByText(word, { exact: true }).first();

interface Item {
  readonly id: string;
  readonly name: string;
  readonly values: Readonly<Record<string, string | number>>;
}

async function itemsOf(page: Page, kind: 'machines' | 'sheets'): Promise<Item[]> {
  const answer = await page.request.get(`/api/shop/${kind}`);
  return ((await answer.json()) as { items: Item[] }).items;
}

/** Orders by a hand-made request. Resolves to the order's number. */
async function order(page: Page, dueOn: string): Promise<number> {
  const answer = await page.request.get('/api/orders/orderable');
  const { revisions } = (await answer.json()) as {
    revisions: { id: string; wants: { material: string; thickness: number }[] }[];
  };
  const sheets = await itemsOf(page, 'sheets');
  const [machine] = await itemsOf(page, 'machines');
  const pairs = revisions.flatMap(({ id, wants }) =>
    sheets
      .filter(({ values }) =>
        wants.some(
          ({ material, thickness }) =>
            material === values.material && thickness === values.thickness,
        ),
      )
      .map((sheet) => ({ revision: id, sheet: sheet.id })),
  );
  const placed = await page.request.post('/api/orders', {
    data: { ...pairs[0]!, machine: machine!.id, quantity: 1, sheets: 1, dueOn, note: '' },
  });
  expect(placed.status()).toBe(201);
  return ((await placed.json()) as { number: number }).number;
}

test.beforeEach(async ({ page }) => {
  await signIn(page, builder);
  const answer = await page.request.get('/api/orders/orderable');
  const { revisions } = (await answer.json()) as { revisions: unknown[] };
  expect(revisions, 'released revisions of the demo workshop').not.toEqual([]);
});

test('a builder orders, a machinist asks with a photo, gets the answer and cuts', async ({
  page,
  browser,
}) => {
  test.slow();
  await page.goto('/orders');
  await page.getByRole('button', { name: 'New order' }).click();
  const ordering = page.getByRole('dialog', { name: 'Order cutting' });
  await ordering.getByLabel('Quantity, capacitors').fill('2');
  await ordering.getByLabel('Due date').fill(dayIn(9));
  await ordering.getByLabel('Note').fill('Deburr both faces.');
  await check(page, 'order cutting');
  const sheetName = (await ordering.getByLabel('Sheet', { exact: true }).innerText())
    .split('\n')[0]!
    .replace(/ \(\d+ in store\)$/, '');
  await ordering.getByRole('button', { name: 'Order cutting' }).click();
  const link = ordering.getByRole('link', { name: /^Open order \d+$/ });
  const number = Number(/\d+/.exec(await link.innerText())![0]);
  await link.click();
  const title = { name: new RegExp(`^Order ${number}: 2 × `) };
  await expect(page.getByRole('heading', title)).toBeVisible();
  await check(page, 'an order in the queue');

  const phone = await onPhone(browser, machinist);
  await phone.goto('/orders');
  await check(phone, 'the queue on a phone');
  await expect(phone.getByRole('button', { name: 'New order' })).toHaveCount(0);
  await phone.getByRole('link', { name: `Order ${number}`, exact: true }).click();
  await expect(phone.getByRole('heading', title)).toBeVisible();
  await expect(phone.getByText('Deburr both faces.')).toBeVisible();
  // Of exactly the revision that was ordered, and there before anything else to read.
  const file = phone.getByRole('list', { name: 'Parts to cut' }).getByRole('link').first();
  await expect(file).toHaveAttribute('href', /^\/api\/revisions\/[\w-]{36}\/files\/.+\.dxf$/);
  expect((await file.boundingBox())!.y).toBeLessThan(
    (await phone.getByRole('heading', { name: 'What was ordered' }).boundingBox())!.y,
  );
  await expect(phone.getByRole('button', { name: /^(Change|Cancel) the order$/ })).toHaveCount(
    0,
  );
  await phone.getByRole('button', { name: 'Begin cutting' }).click();
  await expect(state(phone, 'cutting')).toBeVisible();
  await phone.getByRole('button', { name: 'Return with a question' }).click();
  const asking = phone.getByRole('dialog', { name: /with a question$/ });
  await asking.getByLabel('Question').fill('The stock is scratched here. Use it?');
  await asking.getByLabel('Photos and files').setInputFiles(photo);
  await check(phone, 'a question');
  await asking.getByRole('button', { name: 'Return with the question' }).click();
  await expect(asking).toHaveCount(0);
  await expect(state(phone, 'returned')).toBeVisible();

  // The builder has the order open, and hears of it.
  await expect(page.getByText('The stock is scratched here. Use it?')).toBeVisible();
  const picture = page.getByRole('img', { name: 'edge.png' });
  await picture.scrollIntoViewIfNeeded();
  await expect
    .poll(() => picture.evaluate((image: HTMLImageElement) => image.naturalWidth))
    .toBe(1);
  await check(page, 'a returned order');
  await page.getByLabel('Answer').fill('Yes, the scratch is under the hub.');
  await page.getByRole('button', { name: 'Answer, back into the queue' }).click();
  await expect(state(page, 'queued')).toBeVisible();

  await expect(phone.getByText('Yes, the scratch is under the hub.')).toBeVisible();
  await phone.getByRole('button', { name: 'Begin cutting' }).click();
  await phone.getByRole('button', { name: 'It is cut' }).click();
  const finishing = phone.getByRole('dialog', { name: `Order ${number} is cut` });
  const kerf = 0.2 + ((number % 99) + 1) / 1000;
  await finishing.getByLabel('Sheets used').fill('100000');
  await finishing.getByRole('button', { name: 'It is cut' }).click();
  await expect(finishing.getByRole('alert')).toContainText('Sheets used');
  await finishing.getByLabel('Sheets used').fill('1');
  await finishing.getByLabel('Kerf as measured').fill(`${kerf.toFixed(3)} mm`);
  await check(phone, 'what came of it');
  const before = (await itemsOf(page, 'sheets')).find(({ name }) => name === sheetName)!;
  await finishing.getByRole('button', { name: 'It is cut' }).click();
  await expect(finishing).toHaveCount(0);
  await expect(state(phone, 'cut')).toBeVisible();
  const after = (await itemsOf(page, 'sheets')).find(({ id }) => id === before.id)!;
  expect(after.values.count).toBe(Number(before.values.count) - 1);
  await expect(phone.getByText('A builder or the owner can take it over')).toBeVisible();

  const offer = page.getByRole('region', { name: 'Kerf as measured' });
  await expect(offer).toBeVisible();
  await check(page, 'an order that is cut');
  await offer.getByRole('button', { name: /^Set / }).click();
  await expect(offer).toHaveCount(0);
  expect(
    (await itemsOf(page, 'machines')).map(({ values }) => Number(values.kerf).toFixed(3)),
  ).toContain(kerf.toFixed(3));
  await phone.context().close();
});

test('the queue shows what is overdue, and one finds an order by state, hand and words', async ({
  page,
}) => {
  const late = await order(page, dayIn(1));
  const later = await order(page, dayIn(40));
  const row = (number: number) =>
    page
      .getByRole('row')
      .filter({ has: page.getByRole('link', { name: `Order ${number}`, exact: true }) });
  // Two days on, as the reader's own clock has it.
  await page.clock.setFixedTime(new Date(Date.now() + 3 * DAY));
  await page.goto('/orders');
  await expect(row(late)).toContainText('overdue');
  await expect(row(later)).not.toContainText('overdue');
  await check(page, 'the queue');
  await page.getByLabel(/^Overdue/).check();
  await expect(row(late)).toBeVisible();
  await expect(row(later)).toHaveCount(0);
  await page.getByLabel(/^Overdue/).uncheck();
  await page.getByLabel('Search').fill(`order ${later}`);
  await expect(row(later)).toBeVisible();
  await expect(row(late)).toHaveCount(0);
  await page.getByLabel('Search').fill('');
  await page.getByLabel('Mine').check();
  await expect(row(later)).toBeVisible();
  await page.getByLabel('State').selectOption('cutting');
  await expect(row(later)).toHaveCount(0);
  await page.getByLabel('State').selectOption('open');
  const numbers = async () =>
    (await page.getByRole('link', { name: /^Order \d+$/ }).allInnerTexts()).map((text) =>
      Number(text.slice('Order '.length)),
    );
  await page.getByRole('button', { name: 'Order', exact: true }).click();
  const rising = await numbers();
  expect(rising).toEqual([...rising].sort((a, b) => a - b));

  await page.getByRole('link', { name: `Order ${late}`, exact: true }).click();
  await page.getByRole('button', { name: 'Cancel the order' }).click();
  const asking = page.getByRole('alertdialog');
  await check(page, 'before it is cancelled');
  await asking.getByRole('button', { name: 'Cancel the order' }).click();
  await expect(state(page, 'cancelled')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Begin cutting' })).toHaveCount(0);
});

test('the same order is overdue where its day has passed, and not yet elsewhere', async ({
  page,
  browser,
}) => {
  await signIn(page, builder);
  const due = dayIn(2);
  const number = await order(page, due);
  // Five in the morning of the next day, UTC.
  const moment = new Date(Date.parse(due) + DAY + 5 * 3_600_000);
  for (const [timezoneId, overdue] of [
    ['Pacific/Kiritimati', true],
    ['Pacific/Pago_Pago', false],
  ] as const) {
    const context = await browser.newContext({ timezoneId });
    const there = await context.newPage();
    await signIn(there, builder);
    await there.clock.setFixedTime(moment);
    await there.goto('/orders');
    await expect(there.getByText(`in your time zone, ${timezoneId}.`)).toBeVisible();
    const row = there
      .getByRole('row')
      .filter({ has: there.getByRole('link', { name: `Order ${number}`, exact: true }) });
    await expect(row).toBeVisible();
    await expect(row.getByText('overdue')).toHaveCount(overdue ? 1 : 0);
    await context.close();
  }
});

test('nobody of another workshop sees an order', async ({ page, browser }) => {
  await order(page, dayIn(5));
  await page.goto('/orders');
  await page
    .getByRole('link', { name: /^Order \d+$/ })
    .first()
    .click();
  await page.waitForURL(/\/orders\/[\w-]{36}$/);
  const stranger = await (await browser.newContext()).newPage();
  await signIn(stranger, outsider);
  expect((await stranger.goto(page.url()))!.status()).toBe(404);
  await stranger.goto('/orders');
  await expect(stranger.getByText('No cut orders yet')).toBeVisible();
  await stranger.context().close();
});

/** Two circuits on one shaft: the oscillator's section, padder and trimmer, bands, alignment. */
import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Locator, type Page } from '@playwright/test';
import { enter, makeDesign, rotorOutline } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';

test.beforeEach(async ({ page }) => {
  await signIn(page, builder);
});

async function openTool(page: Page, opener: string, title: string): Promise<Locator> {
  await page.getByRole('button', { name: opener, exact: true }).first().click();
  const tool = page.getByRole('dialog', { name: title });
  await expect(tool).toBeVisible();
  return tool;
}

const openPair = (page: Page) =>
  openTool(page, 'Two circuits on one shaft', 'Two circuits on one shaft');

async function expectAccessible(page: Page) {
  const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
}

/** Nothing of the tool reaches beyond the screen's side. */
async function expectWithin(page: Page, tool: Locator) {
  const beyond = await tool.evaluate((sheet) => sheet.scrollWidth - sheet.clientWidth);
  expect(beyond).toBeLessThanOrEqual(0);
  expect(
    await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
  ).toBeLessThanOrEqual(0);
}

const kilohertz = async (row: Locator): Promise<number> =>
  Number(/([\d.]+) kHz/.exec(await row.innerText())?.[1] ?? NaN);

test('an oscillator section is added as one step, tracks, and is taken back', async ({
  page,
}) => {
  await makeDesign(page, 'Superhet', 'Broadcast section, straight-line frequency');
  const tool = await openPair(page);
  await expect(tool.getByText(/serves one band and one intermediate frequency/)).toBeVisible();
  await tool.getByRole('button', { name: 'Add the oscillator section' }).click();
  await expect(page.getByText('Section 2 added as the oscillator.')).toBeVisible();
  const chart = tool.getByRole('img', { name: /Tracking error over the band, at most/ });
  await expect(chart).toBeVisible({ timeout: 20_000 });
  const figures = tool.locator('dl').filter({ hasText: 'Largest error' });
  await expect(figures).toContainText('Oscillator coil');
  await expectAccessible(page);
  await expectWithin(page, tool);
  await page.getByRole('button', { name: 'Undo', exact: true }).last().click();
  await expect(tool.getByRole('button', { name: 'Add the oscillator section' })).toBeVisible();
  await expect(page.getByRole('radiogroup', { name: 'Section' })).toBeHidden();
});

test('three points are beaten by the best ones, and stock padders cost a little', async ({
  page,
}) => {
  await makeDesign(page, 'Padded', 'Broadcast section, straight-line frequency');
  const tool = await openPair(page);
  await tool.getByLabel('To work on').selectOption('equal');
  await tool.getByLabel('Signal coil, µH').fill('200');
  await tool.getByLabel('Band, high end, kHz').fill('1600');
  const mine = tool.locator('section').filter({ hasText: 'At your three points' });
  // Computed from Terman's equations for 600, 1000, 1400 kHz, 200 µH and 455 kHz.
  await expect(mine).toContainText('448.01 pF');
  await expect(mine).toContainText('11.23 pF');
  await expect(tool.getByText(/They beat your points by [\d.]+ kHz/)).toBeVisible();
  const stock = tool.getByRole('region', { name: 'Padder from stock' });
  await expect(stock.getByRole('row', { name: /^E12/ })).toContainText('470 pF');
  await expectAccessible(page);
  await expectWithin(page, tool);
  await tool.getByLabel('Point 2, kHz').fill('590');
  await expect(tool.getByRole('alert')).toContainText(
    'Point 2: 590 kHz is not above the point before it; give more than 600 kHz',
  );
});

test('the pair serves its own band well and others less; it is aligned and weighed', async ({
  page,
}) => {
  await makeDesign(page, 'Pair', 'Tracked pair for a superheterodyne, medium wave');
  await page.getByRole('button', { name: 'All sections', exact: true }).click();
  await expect(page.locator('[data-part=other-rotors] path')).toHaveCount(1);
  const tool = await openPair(page);
  const worst = tool.locator('dl > div').filter({ hasText: 'Largest error' });
  await expect(worst).toContainText(/Hz/);

  await tool.getByLabel('To work on').selectOption('bands');
  const bands = tool.getByRole('region', { name: 'Bands' });
  await expect(bands.getByRole('row', { name: /^Band 1/ })).toContainText(
    '530 kHz to 1700 kHz',
  );
  await tool.getByRole('button', { name: 'Add a band' }).click();
  await expect(bands.getByRole('row')).toHaveCount(3);
  await expectAccessible(page);
  const last = bands
    .getByRole('row', { name: /^Band 2/ })
    .getByRole('cell')
    .last();
  expect(await kilohertz(last)).toBeGreaterThan(10);

  await expect(
    tool.getByRole('img', { name: 'The dial with an arc for each band' }),
  ).toContainText('Band 2, MHz');
  await tool.getByLabel('Outer radius, mm').fill('30');
  await expect(tool.getByRole('alert')).toContainText(/30 mm has no room for 2 bands/);

  await tool.getByLabel('To work on').selectOption('setting-up');
  const steps = tool.locator('[data-part=to-print] li');
  await expect(steps.nth(2)).toContainText(/section 2/, { timeout: 20_000 });
  expect(await steps.count()).toBeGreaterThan(5);
  await expect(tool.getByText('Counterweight, mass times radius')).toBeVisible();
  await expect(tool.getByText('Sections 1 and 2, no screen')).toBeVisible();
  await expectAccessible(page);
  await expectWithin(page, tool);
  // Printed alone.
  await page.emulateMedia({ media: 'print' });
  const printed = page.locator('[data-part=to-print]');
  await expect(printed.locator('li').first()).toBeVisible();
  await expect(page.getByText('Print the steps')).toBeHidden();
});

test('a printed dial is typed or picked on its picture, and becomes the law', async ({
  page,
}) => {
  await makeDesign(page, 'Dial there');
  const before = await rotorOutline(page);
  const tool = await openTool(page, 'Follow a printed dial', 'Printed dial');
  const rows = tool.getByLabel(/Shaft angle and frequency/);
  await rows.fill('0 540\n60 800\n120 1150\n180 1600');
  await expect(tool.getByText('4 rows, counted from the highest frequency')).toBeVisible();
  await expectAccessible(page);
  await rows.fill('0 540\n60 800\n120 700\n180 1600');
  await expect(tool.getByRole('status')).toContainText('a frequency must go one way all along');
  await rows.fill('0 540\n60 800\n120 1150\n180 1600');
  await tool.getByRole('button', { name: 'Follow it in section 1' }).click();
  await expect(page.getByText('Section 1 follows the printed dial, 4 rows.')).toBeVisible();
  await expect.poll(() => rotorOutline(page)).not.toBe(before);

  // A picture 400 by 200: centre at the middle below, marks on a half circle.
  await tool.getByLabel('Given by').selectOption('picture');
  await tool.getByLabel('Picture of the dial').setInputFiles({
    name: 'dial.svg',
    mimeType: 'image/svg+xml',
    buffer: Buffer.from(
      '<svg xmlns="http://www.w3.org/2000/svg" width="400" height="200"><rect width="400" height="200" fill="white"/></svg>',
    ),
  });
  const picture = tool.getByRole('img', { name: /Dial from dial.svg/ });
  const press = async (x: number, y: number) => {
    const box = (await picture.boundingBox())!;
    await picture.click({ position: { x: (x / 400) * box.width, y: (y / 200) * box.height } });
  };
  await press(200, 180);
  await press(40, 180);
  await press(360, 180);
  for (const [frequency, x, y] of [
    ['1600', 45, 170],
    ['1000', 200, 20],
    ['540', 355, 170],
  ] as const) {
    await tool.getByLabel('Frequency printed there, kHz').fill(frequency);
    await press(x, y);
  }
  await expect(tool.getByText('3 rows, counted from the highest frequency')).toBeVisible();
  await expectAccessible(page);
  await tool.getByRole('button', { name: 'Follow it in section 1' }).click();
  await expect(page.getByText('Section 1 follows the printed dial, 3 rows.')).toBeVisible();
});

test('on a phone the tool fits its width', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await makeDesign(page, 'Small', 'Tracked pair for a superheterodyne, medium wave');
  const tool = await openPair(page);
  for (const view of ['oscillator', 'equal', 'bands', 'setting-up']) {
    await tool.getByLabel('To work on').selectOption(view);
    await expect(tool.locator('section').first()).toBeVisible({ timeout: 20_000 });
    await expectWithin(page, tool);
  }
  await expectAccessible(page);
});

test('sections are added, edited apart and removed', async ({ page }) => {
  await makeDesign(page, 'Sections');
  await page.getByRole('button', { name: 'Add a section' }).click();
  const picker = page.getByRole('radiogroup', { name: 'Section' });
  await expect(picker.getByRole('radio')).toHaveCount(2);
  await enter(page, 'Air gap', '0.6');
  await picker.getByText('1', { exact: true }).click();
  await expect(page.getByRole('textbox', { name: 'Air gap', exact: true })).toHaveValue('0.5');
  await page.getByRole('button', { name: 'Remove', exact: true }).click();
  await expect(picker).toBeHidden();
  await expect(page.getByRole('textbox', { name: 'Air gap', exact: true })).toHaveValue('0.6');
});

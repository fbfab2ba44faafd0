import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import { enter, field, makeDesign, rotorOutline } from '../support/design-screen';
import { builder, signIn } from '../support/sign-ins';

test.beforeEach(async ({ page }) => {
  await signIn(page, builder);
});

async function openTool(page: Page, opener: string, title: string) {
  await page.getByRole('button', { name: opener, exact: true }).first().click();
  const tool = page.getByRole('dialog', { name: title });
  await expect(tool).toBeVisible();
  return tool;
}

/** No tool may be out of reach for those who can't see it. */
async function expectAccessible(page: Page) {
  const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
}

test('changes are undone and redone, by key and by button', async ({ page }) => {
  await makeDesign(page, 'Undone');
  await enter(page, 'Air gap', '0.6');
  await enter(page, 'Rotor sheet', '1');
  await page.keyboard.press('Control+z');
  await expect(field(page, 'Rotor sheet')).toHaveValue('0.8');
  await expect(field(page, 'Air gap')).toHaveValue('0.6');
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect(field(page, 'Air gap')).toHaveValue('0.5');
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled();
  await page.getByRole('button', { name: 'Redo', exact: true }).click();
  await expect(field(page, 'Air gap')).toHaveValue('0.6');
});

test('text typed in a tool has its own undo', async ({ page }) => {
  await makeDesign(page, 'Left alone');
  await enter(page, 'Air gap', '0.6');
  const tool = await openTool(page, 'What tolerances do to it', 'Tolerance');
  const limit = tool.getByLabel(/Largest error allowed/);
  await limit.pressSequentially('7');
  await page.keyboard.press('Control+z');
  await expect(field(page, 'Air gap')).toHaveValue('0.6');
  await page.keyboard.press('Escape');
  await expect(tool).toBeHidden();
  await page.keyboard.press('Control+z');
  await expect(field(page, 'Air gap')).toHaveValue('0.5');
});

test('plates that fit are listed, one is taken and put back', async ({ page }) => {
  await makeDesign(page, 'Fitting');
  const before = await rotorOutline(page);
  const tool = await openTool(page, 'Which plates and gap fit', 'Plates that fit');
  await expect(tool.getByRole('status')).toContainText(/\d+ of the \d+ looked at fit/);
  await expectAccessible(page);
  await tool
    .getByRole('button', { name: /^Take / })
    .nth(2)
    .click();
  await expect(page.getByText(/gap taken/)).toBeVisible();
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
  await page.getByRole('button', { name: 'Undo', exact: true }).last().click();
  await expect.poll(() => rotorOutline(page)).toBe(before);
  await page.keyboard.press('Escape');
});

test('two thousand stacks are built, and the limit decides how many pass', async ({ page }) => {
  await makeDesign(page, 'Tolerant');
  const tool = await openTool(page, 'What tolerances do to it', 'Tolerance');
  await tool.getByRole('button', { name: 'Build 2000 stacks' }).click();
  await expect(tool.getByText('Stacks within your limit')).toBeVisible();
  const passed = tool
    .locator('div')
    .filter({ hasText: /^Stacks within your limit/ })
    .last();
  const strict = await passed.innerText();
  await expectAccessible(page);
  await tool.getByLabel(/Largest error allowed/).fill('10');
  await tool.getByRole('button', { name: 'Build 2000 stacks' }).click();
  await expect.poll(() => passed.innerText()).not.toBe(strict);
  await tool.getByRole('button', { name: 'Close' }).click();
  await expect(tool).toBeHidden();
});

test('voltages stand side by side and say that they are no rating', async ({ page }) => {
  await makeDesign(page, 'High');
  const tool = await openTool(page, 'Voltage, loss and drift', 'Voltage, loss and drift');
  // Paschen's law for 0.5 mm, IEC 60664-1 for square edges; tests/references has the values.
  await expect(tool.getByRole('row', { name: /breaks down: Paschen/ })).toContainText(
    '2.88 kV',
  );
  await expect(tool.getByRole('row', { name: /square cut edges/ })).toContainText('1.27 kV');
  await expect(tool.getByText(/None of these is a rating/)).toBeVisible();
  await expect(tool.getByText('Capacitance of the plates', { exact: true })).toBeVisible();
  await expectAccessible(page);
  // Taken as one step; the design has it, and all figures fall.
  const altitude = tool.getByLabel('Altitude of use');
  await altitude.fill('-5 m');
  await altitude.press('Tab');
  await expect(tool.getByText(/“-5 m” is no altitude from 0 m to 10000 m/)).toBeVisible();
  await altitude.fill('3 km');
  await altitude.press('Tab');
  await expect(page.getByText('Altitude of use set to 3000 m.')).toBeVisible();
  await expect(tool.getByRole('row', { name: /breaks down: Paschen/ })).toContainText(
    '2.16 kV',
  );
  await expect(tool.getByRole('row', { name: /square cut edges/ })).toContainText('1.22 kV');
  await tool.getByLabel('Working frequency').fill('7 MHz');
  await tool.getByLabel('Working frequency').press('Enter');
  const loss = tool.getByRole('region', { name: 'Loss and Q' });
  // Brass at 7 MHz: computed from δ = √(ρ/(π·f·µ0)).
  await expect(loss.getByRole('row').nth(1)).toContainText('48.9 µm');
  // At once after a value is taken, and from the field itself.
  await tool.getByLabel('Working frequency').fill('8 MHz');
  await page.keyboard.press('Enter');
  await expect(page.getByText('Working frequency set to 8000 kHz.')).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(tool).toBeHidden();
  await page.getByRole('button', { name: 'Undo', exact: true }).last().click();
  await page.getByRole('button', { name: 'Undo', exact: true }).last().click();
  await page.keyboard.press('Control+z');
  await expect(field(page, 'Altitude of use')).toHaveValue('0');
});

test('a law of one’s own is typed as a table, and told what is wrong with it', async ({
  page,
}) => {
  await makeDesign(page, 'Own law');
  const before = await rotorOutline(page);
  await page.getByText('own table', { exact: true }).click();
  const table = page.getByRole('textbox', { name: /Table of the law/ });
  await table.fill('angle;frequency\n0;1600\n60;1200\n120;850\n180;540');
  await expect(page.getByText('4 rows, joined without overshoot')).toBeVisible();
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
  // Something else between, or both are one step.
  await enter(page, 'Air gap', '0.6');
  await table.fill('0 1600\n60 many');
  await expect(page.getByText(/Row 2, “60 many”/)).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(table).toHaveValue(/^0\t1600\n60\t1200/);
  await page.getByText('formula', { exact: true }).click();
  await page.getByRole('textbox', { name: 'Formula of the law' }).fill('fetch(x)');
  await expect(page.getByText(/fetch is not a function here/)).toBeVisible();
});

test('a law of one’s own is read from a CSV file and turned into the other kind', async ({
  page,
}) => {
  await makeDesign(page, 'Own file');
  await page.getByText('own table', { exact: true }).click();
  await page.getByText('capacitance', { exact: true }).last().click();
  const table = page.getByRole('textbox', { name: /Table of the law: degrees, pF/ });
  await page.locator('input[type=file]').setInputFiles({
    name: 'law.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from('"Angle [°]";"C [nF]"\r\n0;0,045\r\n90;0,18\r\n180;0,39\r\n'),
  });
  await expect(table).toHaveValue('0\t45\n90\t180\n180\t390');
  await expect(page.getByText('Angle that the rows of the table cover')).toBeVisible();
  await page.getByText('band and coil', { exact: true }).click();
  await expect(page.getByText('These rows are no frequency yet')).toBeVisible();
  await page.getByRole('button', { name: /Turn the rows into frequencies/ }).click();
  await expect(page.getByText('3 rows, joined without overshoot')).toBeVisible();
});

test('an old plate is read from its DXF and its law kept', async ({ page }) => {
  await makeDesign(page, 'Copied', 'Laboratory section, straight-line wavelength');
  const id = page.url().split('/').at(-1)!;
  const listed = await page.request.get(`/api/designs/${id}/files`);
  const { files } = (await listed.json()) as {
    files: { name: string; kind: string; label: string }[];
  };
  const rotor = files.find(({ kind, label }) => kind === 'dxf' && label.startsWith('Rotor'))!;
  const dxf = await page.request.get(`/api/designs/${id}/files/${rotor.name}`);
  const before = await rotorOutline(page);
  const tool = await openTool(page, 'Copy an old plate', 'Copy an old plate');
  await tool.getByLabel('Outline file').setInputFiles({
    name: 'broken.dxf',
    mimeType: 'image/vnd.dxf',
    buffer: Buffer.from('no drawing'),
  });
  await expect(tool.getByRole('alert')).toContainText('no DXF');
  await tool.getByLabel('Outline file').setInputFiles({
    name: 'vane.dxf',
    mimeType: 'image/vnd.dxf',
    buffer: await dxf.body(),
  });
  await expect(tool.getByRole('img', { name: 'Outline from vane.dxf' })).toBeVisible();
  await tool.getByRole('button', { name: 'Read its law' }).click();
  await expect(tool.getByText('Off equal steps of wavelength')).toBeVisible();
  await expectAccessible(page);
  await tool.getByRole('button', { name: 'Keep this law' }).click();
  await expect(page.getByText(/The old plate’s law taken/)).toBeVisible();
  await expect.poll(() => rotorOutline(page)).not.toBe(before);
});

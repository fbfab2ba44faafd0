/** The page of whoever cuts, on a phone: the file first, then what it is cut from. */

import { readFileSync } from 'node:fs';
import AxeBuilder from '@axe-core/playwright';
import { unzipSync } from 'fflate';
import { expect, test } from '../support/quiet-test';
import { openReleased } from '../support/design-screen';
import { machinist, signIn } from '../support/sign-ins';

test.use({ viewport: { width: 390, height: 844 } });

test.beforeEach(async ({ page }) => {
  await signIn(page, machinist);
  await openReleased(page);
});

test('each part has its file first, a picture, sheet, kerf and pieces; all by a glove', async ({
  page,
}) => {
  const rotor = page.getByRole('listitem').filter({
    has: page.getByRole('heading', { name: 'Rotor plate, section 1', exact: true }),
  });
  const top = async (locator: ReturnType<typeof rotor.getByText>) =>
    (await locator.boundingBox())!.y;
  const link = rotor.getByRole('link', { name: /^DXF/ });
  await expect(rotor.getByRole('img', { name: /^Outline of Rotor plate/ })).toBeVisible();
  const order = [
    await top(link),
    await top(rotor.getByText('Sheet', { exact: true })),
    await top(rotor.getByText('Kerf', { exact: true })),
    await top(rotor.getByText('Pieces', { exact: true })),
    await top(page.getByText('High voltage and RF can injure or kill.')),
  ];
  expect([...order].sort((a, b) => a - b)).toEqual(order);
  await expect(rotor.getByText('none allowed for')).toBeVisible();
  // Quantity and sheet are those of the file's own name.
  const [, thickness, quantity] = /_(\d\.\d+)mm_(\d+)off_nominal\./.exec(
    (await link.getAttribute('download'))!,
  )!;
  await expect(rotor.getByText(quantity!, { exact: true })).toBeVisible();
  await expect(rotor.getByText(new RegExp(`^${Number(thickness)} mm `))).toBeVisible();

  const files = page.getByRole('main').getByRole('link');
  for (const file of await files.all()) {
    const { height } = (await file.boundingBox())!;
    expect(height, await file.innerText()).toBeGreaterThanOrEqual(44);
  }
  const lists = await page.getByRole('list').count();
  expect(lists).toBeGreaterThan(1);
});

test('sheets are laid out, seen and saved with the kerf allowed for', async ({ page }) => {
  await page.getByRole('button', { name: 'Lay out on sheets' }).click();
  const tool = page.getByRole('dialog', { name: 'Lay out on sheets' });
  await expect(tool.getByText('Laid out.')).toBeVisible({ timeout: 30_000 });
  await expect(tool.getByRole('img', { name: /^Sheet 1 with/ }).first()).toBeVisible();
  await tool.getByLabel('Kerf', { exact: true }).selectOption('compensated, allowed for');
  await expect(tool.getByText('Laid out.')).toBeVisible({ timeout: 30_000 });
  const save = tool.getByRole('button', { name: 'Save sheet 1 as DXF, compensated' }).first();
  expect((await save.boundingBox())!.height).toBeGreaterThanOrEqual(44);
  const [download] = await Promise.all([page.waitForEvent('download'), save.click()]);
  expect(download.suggestedFilename()).toMatch(/_sheet-1-of-\d+_compensated\.dxf$/);
  const dxf = readFileSync(await download.path());
  expect(dxf.toString()).toContain('contours moved by half of');
  const all = tool.getByRole('button', { name: 'Save all in a ZIP' });
  const [zip] = await Promise.all([page.waitForEvent('download'), all.click()]);
  expect(zip.suggestedFilename()).toMatch(/_sheets_compensated\.zip$/);
  const held = Object.entries(unzipSync(readFileSync(await zip.path())));
  const [, same] = held.find(([name]) => name.endsWith(download.suggestedFilename()))!;
  expect(Buffer.from(same).equals(dxf)).toBe(true);
  expect(held.some(([name]) => name.endsWith('manifest.json'))).toBe(true);
  const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
  await page.keyboard.press('Escape');
  await expect(tool).toBeHidden();
});

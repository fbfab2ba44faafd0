/** What leaves the screen for paper and for other tools: the dial and the assembly's files. */

import { readFileSync } from 'node:fs';
import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '../support/quiet-test';
import { makeDesign } from '../support/design-screen';
import { bearingsOf, numbersOf, readDial } from '../support/printed-dial';
import { builder, signIn } from '../support/sign-ins';

test.beforeEach(async ({ page }) => {
  await signIn(page, builder);
  await makeDesign(page, `Dial ${Date.now()}`);
});

test('a dial follows what is asked and is saved as SVG and PDF', async ({ page }) => {
  await page.getByRole('button', { name: 'A dial to print' }).click();
  const tool = page.getByRole('dialog', { name: 'Dial' });
  const shown = tool.getByRole('img', { name: 'The dial as it will be printed' });
  await expect(shown.getByText('1000', { exact: true })).toBeVisible();
  await expect(tool.getByText(/: prints on A4\.$/)).toBeVisible();
  await tool.getByLabel('Outer radius, mm').fill('40');
  await tool.getByLabel('It turns, meshing').selectOption('anticlockwise');
  await tool.getByLabel('Lettering').fill('Bench 1');
  await expect(shown.getByText('Bench 1')).toBeVisible();

  const [svgFile] = await Promise.all([
    page.waitForEvent('download'),
    tool.getByRole('button', { name: 'Save as SVG, true size' }).click(),
  ]);
  const dial = readDial(readFileSync(await svgFile.path(), 'utf8'));
  expect(bearingsOf(dial, 40).length).toBeGreaterThan(20);
  const numbers = numbersOf(dial);
  // Meshing lowers the frequency: anticlockwise, from right to left.
  expect(numbers[0]!.value).toBeLessThan(numbers.at(-1)!.value);

  const [pdfFile] = await Promise.all([
    page.waitForEvent('download'),
    tool.getByRole('link', { name: /Save as PDF/ }).click(),
  ]);
  expect(pdfFile.suggestedFilename()).toMatch(/_dial-frequency\.pdf$/);
  expect(
    readFileSync(await pdfFile.path())
      .subarray(0, 5)
      .toString(),
  ).toBe('%PDF-');

  await tool.getByLabel('Turns for one of the shaft').fill('3');
  await expect(tool.getByRole('alert')).toContainText('take a ratio of at most');
  await expect(shown).toHaveCount(0);
  await tool.getByLabel('Scale', { exact: true }).selectOption('straight, by a cord');
  await expect(shown).toBeVisible();
  const { violations } = await new AxeBuilder({ page }).include('[role=dialog]').analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
});

test('the assembly is saved as glTF in metres and STL in mm', async ({ page }) => {
  const links = page.getByRole('group', { name: 'Save the assembly at this angle' });
  for (const [button, name, begins] of [
    ['glTF, metres', 'assembly_metres.glb', 'glTF'],
    ['STL, mm', 'assembly_mm.stl', ''],
  ] as const) {
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      links.getByRole('button', { name: button }).click(),
    ]);
    expect(download.suggestedFilename()).toBe(name);
    const bytes = readFileSync(await download.path());
    expect(bytes.subarray(0, begins.length).toString()).toBe(begins);
    expect(bytes.byteLength).toBeGreaterThan(50_000);
  }
});

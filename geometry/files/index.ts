/** Files written from derived plates. Apart from geometry/index.ts: pages don't need them. */

import type { Derived } from '../derived';
import { formatQuantity } from '../quantity';
import { partsOf } from '../parts/assembly';
import type { CutPart, Part } from '../parts/part';
import { billTable } from './bill-table';
import type { CutFile } from './cut-file';
import { dxfOf } from './dxf';
import { partFileName, sheetFileName, slugOf } from './file-name';
import { lawTable } from './law-table';
import { placeInRow } from './placement';
import { svgOf } from './svg';

export type { CutFile } from './cut-file';
export { slugOf } from './file-name';

const isCut = (part: Part): part is CutPart => part.kind === 'cut';

/** Plain letters: old readers know no others. */
const wordsFor = ({ key, quantity, material, thickness }: CutPart): string =>
  `${key}: ${quantity} off, ${material} ${thickness} mm, nominal size, no kerf, units mm`;

/** Cut parts of one material and thickness together, in the order in which they come. */
export function bySheet(parts: readonly Part[]): CutPart[][] {
  const sheets = new Map<string, CutPart[]>();
  for (const part of parts.filter(isCut)) {
    const key = `${part.material} ${part.thickness.toFixed(3)}`;
    sheets.set(key, [...(sheets.get(key) ?? []), part]);
  }
  return [...sheets.values()];
}

/** All files of a design. The same design under the same name gives the same bytes. */
export function cutFiles(designName: string, derived: Derived): CutFile[] {
  const { design, sections } = derived;
  const parts = partsOf(derived);
  const sets = [
    ...parts.filter(isCut).map((part) => ({
      base: partFileName(designName, part),
      label: `${part.label}: ${part.quantity} off, ${formatQuantity(part.thickness, 'length')} sheet`,
      placements: placeInRow([{ ...part, words: wordsFor(part) }]),
    })),
    ...bySheet(parts)
      .filter((together) => together.length > 1)
      .map((together) => ({
        base: sheetFileName(designName, together),
        label: `One of each part of ${formatQuantity(together[0]!.thickness, 'length')} ${together[0]!.material}, side by side`,
        placements: placeInRow(together.map((part) => ({ ...part, words: part.key }))),
      })),
  ];
  const slug = slugOf(designName);
  return [
    ...sets.map(({ base, label, placements }): CutFile => ({
      name: `${base}.dxf`,
      label,
      kind: 'dxf',
      mediaType: 'image/vnd.dxf',
      text: dxfOf(placements),
    })),
    ...sets.map(({ base, label, placements }): CutFile => ({
      name: `${base}.svg`,
      label,
      kind: 'svg',
      mediaType: 'image/svg+xml',
      text: svgOf(placements),
    })),
    ...sections.map((section, index): CutFile => ({
      name: `${slug}_s${index + 1}-law.csv`,
      label: `Law over the travel, section ${index + 1}`,
      kind: 'csv',
      mediaType: 'text/csv; charset=utf-8',
      text: lawTable(section),
    })),
    {
      name: `${slug}_parts.csv`,
      label: 'Bill of materials: all parts with size, mass and sheet',
      kind: 'csv',
      mediaType: 'text/csv; charset=utf-8',
      text: billTable(parts),
    },
    {
      name: `${slug}_design.json`,
      label: 'The design itself, to derive it again',
      kind: 'json',
      mediaType: 'application/json',
      text: `${JSON.stringify({ name: designName, kernel: derived.kernel, design }, null, 2)}\n`,
    },
  ];
}

/** Files written from derived plates. Apart from geometry/index.ts: pages don't need them. */

import type { Derived } from '../derived';
import { formatQuantity } from '../quantity';
import { partsOf } from '../parts/assembly';
import { billTable } from './bill-table';
import type { CutFile } from './cut-file';
import { dxfOf } from './dxf';
import { allPlatesFileName, plateFileName, slugOf } from './file-name';
import { lawTable } from './law-table';
import { placeInRow } from './placement';
import { svgOf } from './svg';

export type { CutFile } from './cut-file';
export { slugOf } from './file-name';

/** All files of a design. The same design under the same name gives the same bytes. */
export function cutFiles(designName: string, derived: Derived): CutFile[] {
  const { design, sections } = derived;
  const plates = sections.flatMap(({ rotor, stator }) => [rotor, stator]);
  const sets = [
    ...plates.map((plate) => ({
      base: plateFileName(designName, design, plate),
      label: `${plate.role === 'rotor' ? 'Rotor' : 'Stator'} plate, section ${plate.section + 1}: ${plate.quantity} off, ${formatQuantity(plate.thickness, 'length')} sheet`,
      placements: placeInRow([plate]),
    })),
    {
      base: allPlatesFileName(designName, design, plates),
      label: 'One of each plate, side by side',
      placements: placeInRow(plates),
    },
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
      text: billTable(partsOf(derived)),
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

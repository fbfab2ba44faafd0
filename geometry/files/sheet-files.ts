/** All that a shop cuts from: each part in the state of kerf asked for, and each sheet as laid out. */

import { compensated, type KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';
import type { LaidGroup } from '../nesting/lay-out';
import type { CutPart } from '../parts/part';
import { formatQuantity } from '../quantity';
import type { CutFile } from './cut-file';
import { dxfOf } from './dxf';
import { laidSheetName, partFileName, slugOf } from './file-name';
import { kerfWords } from './kerf-words';
import { placeInRow } from './placement';
import { sheetDxf, sheetWords } from './sheet-dxf';
import { sheetSvg } from './sheet-svg';
import { svgOf } from './svg';

/** A file with what is to be known of it at the machine. */
export interface SheetFile extends CutFile {
  readonly material: CutPart['material'];
  /** mm */
  readonly thickness: number;
  /** Pieces: of a part's own file how many are needed, on a sheet how many lie there. */
  readonly pieces: readonly { readonly part: string; readonly quantity: number }[];
  /** Number of the sheet within its kind, from 1; null for the file of one part. */
  readonly sheet: number | null;
}

export interface SheetNames {
  readonly design: string;
  /** Of the plates: `3`, or a revision's name. */
  readonly revision: string;
}

/** A DXF and an SVG under one name. */
function pair(
  base: string,
  label: string,
  about: Pick<SheetFile, 'material' | 'thickness' | 'pieces' | 'sheet'>,
  dxf: string,
  svg: string,
): SheetFile[] {
  return [
    {
      ...about,
      name: `${base}.dxf`,
      label,
      kind: 'dxf',
      mediaType: 'image/vnd.dxf',
      text: dxf,
    },
    {
      ...about,
      name: `${base}.svg`,
      label,
      kind: 'svg',
      mediaType: 'image/svg+xml',
      text: svg,
    },
  ];
}

/** The contours of a part as its file has them. */
function contoursOf(
  part: CutPart,
  machine: Machine,
  kerf: KerfState,
): Pick<CutPart, 'outside' | 'holes'> {
  if (kerf === 'nominal') return part;
  const { outside, holes } = compensated(part, machine.kerf);
  // A layout with a contour that the kerf closes is refused before.
  return { outside: outside!, holes: holes.map((hole) => hole!) };
}

function partFiles(
  { design }: SheetNames,
  title: string,
  part: CutPart,
  machine: Machine,
  kerf: KerfState,
): SheetFile[] {
  const { key, label, material, thickness, quantity } = part;
  const words = `${title}${key}: ${quantity} off, ${material} ${thickness} mm, ${kerfWords(kerf, machine)}, units mm`;
  const placed = placeInRow([{ key, ...contoursOf(part, machine, kerf), words }]);
  return pair(
    partFileName(design, part, kerf),
    `${label}: ${quantity} off, ${formatQuantity(thickness, 'length')} sheet, ${kerf}`,
    { material, thickness, pieces: [{ part: key, quantity }], sheet: null },
    dxfOf(placed),
    svgOf(placed),
  );
}

function oneSheet(
  { design }: SheetNames,
  title: string,
  group: LaidGroup,
  sheet: number,
  machine: Machine,
  kerf: KerfState,
): SheetFile[] {
  const { material, thickness, layout, parts } = group;
  const of = layout.sheets.length;
  const here = layout.placements.filter((placement) => placement.sheet === sheet);
  const pieces = parts.flatMap(({ key }) => {
    const quantity = here.filter((placement) => placement.key === key).length;
    return quantity > 0 ? [{ part: key, quantity }] : [];
  });
  return pair(
    laidSheetName(design, group, sheet + 1, of, kerf),
    `Sheet ${sheet + 1} of ${of}, ${formatQuantity(thickness, 'length')} ${material}, ${kerf}`,
    { material, thickness, pieces, sheet: sheet + 1 },
    sheetDxf(group, sheet, machine, kerf, title),
    sheetSvg(group, sheet, machine, kerf, title + sheetWords(group, sheet, machine, kerf)),
  );
}

/**
 * DXF and SVG of each part and of each sheet. The same layout gives the same bytes.
 * @param groups a layout that holds: heldLayout
 * @param copies how many capacitors
 */
export function sheetCutFiles(
  names: SheetNames,
  groups: readonly LaidGroup[],
  { machine, kerf, copies }: { machine: Machine; kerf: KerfState; copies: number },
): SheetFile[] {
  // Plain letters: old readers know no others.
  const title = `${slugOf(names.design)}, revision ${names.revision}: `;
  return groups.flatMap((group) => [
    ...group.parts.flatMap((part) =>
      partFiles(names, title, { ...part, quantity: part.quantity * copies }, machine, kerf),
    ),
    ...group.layout.sheets.flatMap((_, sheet) =>
      oneSheet(names, title, group, sheet, machine, kerf),
    ),
  ]);
}

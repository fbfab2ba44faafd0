import type { KerfState } from '../cutting/cut-path';
import { sheetMaterials } from '../material';
import type { CutPart } from '../parts/part';

/** A design's name as it stands in file names: plain letters, digits and hyphens. */
export function slugOf(designName: string): string {
  const slug = designName
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/[^A-Za-z0-9-]/g, '')
    .replace(/^-+|-+$/g, '')
    .slice(0, 48)
    .toLowerCase();
  return slug === '' ? 'design' : slug;
}

const sheet = (thickness: number): string => `${thickness.toFixed(2)}mm`;

const materialSlug = (material: CutPart['material']): string =>
  material === 'insulator' ? 'insulator' : sheetMaterials[material].slug;

/** `NAME_s1-rotor_brass-cuzn37_0.80mm_14off_nominal`, without the ending. */
export function partFileName(
  designName: string,
  part: CutPart,
  kerf: KerfState = 'nominal',
): string {
  const { key, material, thickness, quantity } = part;
  return [
    slugOf(designName),
    key,
    materialSlug(material),
    sheet(thickness),
    `${quantity}off`,
    kerf,
  ].join('_');
}

/** Name of the file that shows one of each part of a sheet. */
export function sheetFileName(designName: string, parts: readonly CutPart[]): string {
  const { material, thickness } = parts[0]!;
  return [
    slugOf(designName),
    'one-of-each',
    materialSlug(material),
    sheet(thickness),
    'nominal',
  ].join('_');
}

/** `NAME_brass-cuzn37_0.800mm_sheet-1-of-2_compensated`: three digits part any two kinds of sheet. */
export function laidSheetName(
  designName: string,
  { material, thickness }: Pick<CutPart, 'material' | 'thickness'>,
  number: number,
  of: number,
  kerf: KerfState,
): string {
  return [
    slugOf(designName),
    materialSlug(material),
    `${thickness.toFixed(3)}mm`,
    `sheet-${number}-of-${of}`,
    kerf,
  ].join('_');
}

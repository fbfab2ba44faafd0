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

/** `NAME_s1-rotor_brass-cuzn37_0.80mm_14off`, without the ending. */
export function partFileName(designName: string, part: CutPart): string {
  const { key, material, thickness, quantity } = part;
  return [
    slugOf(designName),
    key,
    materialSlug(material),
    sheet(thickness),
    `${quantity}off`,
  ].join('_');
}

/** Name of the file that shows one of each part of a sheet. */
export function sheetFileName(designName: string, parts: readonly CutPart[]): string {
  const { material, thickness } = parts[0]!;
  return [slugOf(designName), 'one-of-each', materialSlug(material), sheet(thickness)].join(
    '_',
  );
}

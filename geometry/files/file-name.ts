import type { Plate } from '../derived';
import type { Design } from '../design';
import { sheetMaterials } from '../material';

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

/** `s1-rotor`: section and role, as in names of files and layers. */
export function partSlug(plate: Plate): string {
  return `s${plate.section + 1}-${plate.role}`;
}

/** `NAME_s1-rotor_brass-cuzn37_0.80mm_14off`, without the ending. */
export function plateFileName(designName: string, design: Design, plate: Plate): string {
  const { slug } = sheetMaterials[design.material];
  return [
    slugOf(designName),
    partSlug(plate),
    slug,
    sheet(plate.thickness),
    `${plate.quantity}off`,
  ].join('_');
}

/** Name of the file that shows one of each plate; every thickness that occurs is in it. */
export function allPlatesFileName(
  designName: string,
  design: Design,
  plates: readonly Plate[],
): string {
  const thicknesses = [...new Set(plates.map((plate) => plate.thickness))].sort(
    (a, b) => a - b,
  );
  return [
    slugOf(designName),
    'all-plates',
    sheetMaterials[design.material].slug,
    thicknesses.map(sheet).join('+'),
    plates.map((plate) => `${plate.quantity}off`).join('+'),
  ].join('_');
}

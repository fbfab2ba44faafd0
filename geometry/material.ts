import type { Design } from './design';

export type Material = Design['material'];

interface SheetMaterial {
  /** As it stands in a file name. */
  readonly slug: string;
  /** g/mm³. Handbook values, from memory. */
  readonly density: number;
}

export const sheetMaterials: Record<Material, SheetMaterial> = {
  brass: { slug: 'brass-cuzn37', density: 8.44e-3 },
  aluminium: { slug: 'aluminium-5754', density: 2.67e-3 },
  copper: { slug: 'copper-cu-etp', density: 8.92e-3 },
  steel: { slug: 'steel-dc01', density: 7.85e-3 },
};

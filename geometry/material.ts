import type { Design } from './design';

export type Material = Design['material'];

/** Metal of the spacers on shaft and posts. */
export function spacerMaterialOf({ spacerMaterial, material }: Design): Material {
  return spacerMaterial === 'as-plates' ? material : spacerMaterial;
}

interface SheetMaterial {
  /** As it stands in a file name. */
  readonly slug: string;
  /** g/mm³. Handbook values, from memory. */
  readonly density: number;
}

/** Metals at the surface of a plate. */
export type Metal = Material | 'silver';

/** Resistivity at 20 °C, Ω·mm. Silver and copper published, the others handbook values from memory. */
export const resistivities: Record<Metal, number> = {
  silver: 1.59e-5,
  copper: 1.68e-5,
  brass: 6.6e-5,
  aluminium: 4.9e-5,
  steel: 1.4e-4,
};

/**
 * Relative permeability where it isn't 1. Mild steel in small fields: order of magnitude, from
 * memory; batches differ several times.
 */
const permeabilities: Partial<Record<Metal, number>> = { steel: 200 };

export function relativePermeability(metal: Metal): number {
  return permeabilities[metal] ?? 1;
}

/** Linear expansion, 1/K; middle of the handbook's range, from memory. */
export const expansions: Record<Material, number> = {
  brass: 19.8e-6,
  aluminium: 23.5e-6,
  copper: 16.8e-6,
  steel: 11.5e-6,
};

export const sheetMaterials: Record<Material, SheetMaterial> = {
  brass: { slug: 'brass-cuzn37', density: 8.44e-3 },
  aluminium: { slug: 'aluminium-5754', density: 2.67e-3 },
  copper: { slug: 'copper-cu-etp', density: 8.92e-3 },
  steel: { slug: 'steel-dc01', density: 7.85e-3 },
};

import { sharedParameters } from '@/geometry';

/** What a part is made of, as a person reads it. */
export const partMaterials: Record<string, string> = {
  ...Object.fromEntries(
    sharedParameters.material.options.map(({ value, label }) => [value, label]),
  ),
  insulator: 'Insulator',
};

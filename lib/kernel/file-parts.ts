import type { Derived } from '@/geometry';
import { materialCaution } from '@/geometry/cutting/material-caution';
import { partFileName } from '@/geometry/files/file-name';
import { contourBounds } from '@/geometry/measure';
import { partsOf } from '@/geometry/parts/assembly';
import { outline } from '@/geometry/sketch/sketch';
import type { DesignFiles } from '../schemas/api';

const AS_DRAWN = { x: 0, y: 0, scale: 1 };

/** What a machinist has to know of each file of one cut part, and how the part looks. */
export function filePartsOf(
  designName: string,
  derived: Derived,
  materialOf: (material: string) => string,
): DesignFiles['parts'] {
  return partsOf(derived).flatMap((part) => {
    if (part.kind !== 'cut') return [];
    const { minX, minY, maxX, maxY } = contourBounds(part.outside);
    return [
      {
        stem: partFileName(designName, part),
        label: part.label,
        material: materialOf(part.material),
        thickness: part.thickness,
        quantity: part.quantity,
        kerf: 'nominal' as const,
        note: part.note,
        caution: materialCaution(part.material),
        picture: {
          x: minX,
          // On a screen y runs downwards.
          y: -maxY,
          width: maxX - minX,
          height: maxY - minY,
          path: [part.outside, ...part.holes]
            .map((contour) => outline(contour, AS_DRAWN, 0).path)
            .join(''),
        },
      },
    ];
  });
}

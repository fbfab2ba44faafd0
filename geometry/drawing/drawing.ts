/** All sheets of a design's drawing: the assembly, then one for each part that is cut. */

import type { Derived } from '../derived';
import { partsOf } from '../parts/assembly';
import type { CutPart } from '../parts/part';
import type { Sketch } from '../sketch/sketch';
import { assemblySheet } from './assembly-sheet';
import { partSheet } from './part-sheet';
import type { Sheet } from './title-block';

export interface DrawingFacts {
  readonly name: string;
  readonly owner: string;
  readonly number: string;
  readonly revision: string;
  readonly issued: string;
  readonly creator: string;
  readonly approved: string;
  /** May it be cut? In words: `Draft, not released`. */
  readonly status: string;
  /** What was released in spite of a failing check, and why. */
  readonly waivers: readonly string[];
  /** What a sheet material is called. */
  readonly materialOf: (material: CutPart['material']) => string;
}

export function drawingOf(derived: Derived, facts: DrawingFacts): Sketch[] {
  const cut = partsOf(derived).filter((part): part is CutPart => part.kind === 'cut');
  const total = cut.length + 1;
  const finish = derived.design.finish === 'silver' ? 'silver plated' : 'bare';
  const common = (
    index: number,
    documentType: string,
  ): Omit<Sheet, 'scale' | 'title' | 'material'> => ({
    owner: facts.owner,
    number: facts.number,
    issued: facts.issued,
    creator: facts.creator,
    approved: facts.approved,
    revision: facts.revision,
    status: facts.status,
    sheet: `${index} / ${total}`,
    documentType,
    finish,
    tolerances: `ISO 2768-${derived.design.toleranceClass}`,
    projection: derived.design.projection,
  });
  return [
    assemblySheet(derived, facts.name, common(1, 'Assembly drawing'), facts.waivers),
    ...cut.map((part, i) =>
      partSheet(
        derived,
        part,
        common(i + 2, 'Part drawing'),
        `${facts.materialOf(part.material)}, ${part.thickness} thick`,
      ),
    ),
  ];
}

import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Derivation } from '@/geometry';
import { formatQuantity } from '@/geometry';
import { sheetParameters, type SheetValues } from '@/geometry/cutting/shop-parameters';
import { partsOf } from '@/geometry/parts/assembly';
import type { CutPart } from '@/geometry/parts/part';
import { filePartsOf } from '../kernel/file-parts';
import type { FilePart } from '../schemas/api';

export interface RevisionPart {
  readonly part: CutPart;
  /** The same for a screen. */
  readonly shown: FilePart;
}

/** A kind of sheet. */
export interface SheetKind {
  readonly material: CutPart['material'];
  /** mm */
  readonly thickness: number;
}

/** mm. Sheet thicknesses that differ by less are the same. */
const SAME_THICKNESS = 1e-6;

const labels = new Map<string, string>(
  sheetParameters.material.options.map(({ value, label }) => [value, label]),
);
const materialWords = (material: string): string => labels.get(material) ?? material;

/** `0.8 mm Brass CuZn37` */
export const sheetWords = ({ material, thickness }: SheetKind): string =>
  `${formatQuantity(thickness, 'length')} ${materialWords(material)}`;

export const isSameSheet = (a: SheetKind, b: SheetKind): boolean =>
  a.material === b.material && Math.abs(a.thickness - b.thickness) < SAME_THICKNESS;

export const kindOf = (values: unknown): SheetKind => values as SheetValues;

/** By revision: what a revision says never changes. */
const kept = new Map<string, readonly RevisionPart[]>();
const KEPT = 256;

function partsIn(designName: string, derivation: Derivation): RevisionPart[] {
  if (!derivation.ok) return [];
  const shown = filePartsOf(designName, derivation.derived, materialWords);
  return partsOf(derivation.derived)
    .filter((part) => part.kind === 'cut')
    .map((part, index) => ({ part, shown: shown[index]! }));
}

/** The parts that are cut of a revision which the transaction may see. */
export async function revisionParts(
  tx: EntityManager,
  revision: string,
): Promise<readonly RevisionPart[]> {
  const known = kept.get(revision);
  if (known) return known;
  const [row] = await tx.execute<{ design_name: string; derivation: Derivation }[]>(
    'select design_name, derivation from revisions where id = ?',
    [revision],
  );
  if (!row) return [];
  const parts = partsIn(row.design_name, row.derivation);
  kept.set(revision, parts);
  if (kept.size > KEPT) kept.delete(kept.keys().next().value!);
  return parts;
}

/** Every kind of sheet that the parts want, with those parts. */
export function sheetsWanted(
  parts: readonly RevisionPart[],
): { readonly sheet: SheetKind; readonly parts: readonly RevisionPart[] }[] {
  const kinds: { sheet: SheetKind; parts: RevisionPart[] }[] = [];
  for (const each of parts) {
    const known = kinds.find(({ sheet }) => isSameSheet(sheet, each.part));
    if (known) known.parts.push(each);
    else kinds.push({ sheet: each.part, parts: [each] });
  }
  return kinds;
}

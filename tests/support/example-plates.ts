/** Plates of the worked designs in public/examples. */
import { readFileSync } from 'node:fs';
import { checkDesign, derive, type Derived, type Design, type Plate } from '../../geometry';

const FOLDER = new URL('../../public/examples/', import.meta.url);
const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, FOLDER), 'utf8'));

interface Entry {
  readonly file: string;
  readonly name: string;
}

/** By edges alone: outlines differ by micrometres, and it takes a tenth of the time. */
export function examplesDerived(
  change: Partial<Design> = {},
): { name: string; derived: Derived }[] {
  return (read('index.json') as Entry[]).map(({ file, name }) => {
    const { design } = read(file) as { design: unknown };
    const derivation = derive({ ...checkDesign(design), ...change }, { model: 'edges' });
    if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join());
    return { name, derived: derivation.derived };
  });
}

export function examplePlates(): { name: string; plate: Plate }[] {
  return examplesDerived().flatMap(({ name, derived }) =>
    derived.sections.flatMap(({ rotor, stator }) =>
      [rotor, stator].map((plate) => ({
        name: `${name}: ${plate.role} of section ${plate.section + 1}`,
        plate,
      })),
    ),
  );
}

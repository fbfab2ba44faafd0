/** The plates of a design, as often as it takes to have a given number of them. */
import type { Derived } from '../../geometry';
import type { Piece } from '../../geometry/nesting/layout';

export function plateJob({ sections }: Derived, atLeast: number): Piece[] {
  const plates = sections.flatMap(({ rotor, stator }) => [rotor, stator]);
  const one = plates.reduce((sum, { quantity }) => sum + quantity, 0);
  const copies = Math.ceil(atLeast / one);
  return plates.map((plate) => ({
    key: `s${plate.section + 1}-${plate.role}`,
    outside: plate.outside,
    quantity: plate.quantity * copies,
  }));
}

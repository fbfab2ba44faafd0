/** Rotor and stator plates as parts, the end rotor plates with their slots. */

import type { Derived, Plate, StackPlate } from '../derived';
import type { Design } from '../design';
import { arrangementOf } from '../arrangement';
import type { Path } from '../outline';
import { addCut, type Collection, type Place } from './collection';
import { withSlot } from './slot';

function placeOf({ z, thickness, angle, role }: StackPlate): Place {
  const [from, to] = [z - thickness / 2, z + thickness / 2];
  return { x: 0, y: 0, from, to, angle, turns: role === 'rotor' };
}

/** Bearings of the slots in a rotor plate as drawn, rad. */
function slotAngles(design: Design, direction: 1 | -1): number[] {
  const { endSlots, rotorSector } = design;
  const { lobes } = arrangementOf(design);
  return Array.from({ length: lobes }, (_, lobe) =>
    Array.from(
      { length: endSlots },
      (_, i) =>
        (lobe * 2 * Math.PI) / lobes - (direction * rotorSector * (i + 1)) / (endSlots + 1),
    ),
  ).flat();
}

/** The rotor outline with its slots, and how many of those asked for it has. */
export function slottedRotor(
  design: Design,
  direction: 1 | -1,
  { outside, thickness }: Plate,
): { readonly outside: Path; readonly slots: number } | null {
  if (design.endSlots === 0 || outside.kind !== 'path') return null;
  // The segments hang together where the stator's cut-out leaves the plate uncovered.
  const bottom = design.cutoutRadius + Math.max(thickness, design.endSlotWidth / 2);
  // Between two slots at least as much metal is left as a slot takes.
  const pitch = design.rotorSector / (design.endSlots + 1);
  if (bottom * pitch < 2 * design.endSlotWidth) return { outside, slots: 0 };
  let slotted: Path = outside;
  let slots = 0;
  for (const angle of slotAngles(design, direction)) {
    const next = withSlot(slotted, { angle, width: design.endSlotWidth, bottom });
    if (!next) continue;
    slotted = next;
    slots += 1;
  }
  return { outside: slotted, slots };
}

export function addPlates(collection: Collection, derived: Derived): void {
  const { design, sections, stack, turn } = derived;
  sections.forEach(({ rotor, stator }, section) => {
    const own = stack.plates.filter((plate) => plate.section === section);
    const rotors = own.filter(({ role }) => role === 'rotor');
    const packs = [...new Set(rotors.map(({ pack }) => pack))];
    const ends = packs.flatMap((pack) => {
      const inPack = rotors.filter((plate) => plate.pack === pack);
      return inPack.length > 1 ? [inPack[0]!, inPack.at(-1)!] : inPack;
    });
    const slotted = slottedRotor(design, turn.direction, rotor);
    const plain =
      slotted && slotted.slots > 0 ? rotors.filter((p) => !ends.includes(p)) : rotors;
    const common = { section, material: design.material } as const;
    addCut(
      collection,
      {
        ...common,
        key: `s${section + 1}-rotor`,
        label: `Rotor plate, section ${section + 1}`,
        note: 'Flat; edges broken, both faces free of burr',
        thickness: rotor.thickness,
        outside: rotor.outside,
        holes: rotor.holes,
      },
      plain.map(placeOf),
    );
    if (slotted && slotted.slots > 0) {
      addCut(
        collection,
        {
          ...common,
          key: `s${section + 1}-rotor-end`,
          label: `End rotor plate with slots, section ${section + 1}`,
          note: `${slotted.slots} slots ${design.endSlotWidth} wide; set the trimmer near the top of the band, then bend the segments in the order in which they mesh`,
          thickness: rotor.thickness,
          outside: slotted.outside,
          holes: rotor.holes,
        },
        ends.map(placeOf),
      );
    }
    addCut(
      collection,
      {
        ...common,
        key: `s${section + 1}-stator`,
        label: `Stator plate, section ${section + 1}`,
        note: 'Flat; edges broken, both faces free of burr',
        thickness: stator.thickness,
        outside: stator.outside,
        holes: stator.holes,
      },
      own.filter(({ role }) => role === 'stator').map(placeOf),
    );
  });
}

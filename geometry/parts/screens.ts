/** Earthed plates between neighbouring sections. */

import type { Derived } from '../derived';
import { addCut, type Collection } from './collection';
import { circle } from './contours';
import { postPlaces, RIM, type FrameLayout } from './frame';

/** mm. Air round the rotor spacer that passes through, and round a pillar that earths it. */
const ROUND_SHAFT = 1;
const ROUND_PILLAR = 0.1;

/** Where screens stand along the shaft, mm: midway between the plates of two sections. */
export function screenRooms({
  design,
  stack,
}: Pick<Derived, 'design' | 'stack'>): { readonly from: number; readonly to: number }[] {
  if (design.screens === 'none') return [];
  return design.sections.slice(1).map((_, before) => {
    const last = stack.plates
      .filter(({ section }) => section === before)
      .map(({ z, thickness }) => z + thickness / 2);
    const next = stack.plates
      .filter(({ section }) => section === before + 1)
      .map(({ z, thickness }) => z - thickness / 2);
    const middle = (Math.max(...last) + Math.min(...next)) / 2;
    return {
      from: middle - design.screenThickness / 2,
      to: middle + design.screenThickness / 2,
    };
  });
}

/** Radius of the hole for the rotor's spacer, mm. */
export function screenHole({ spacerRadius }: Pick<Derived['design'], 'spacerRadius'>): number {
  return spacerRadius + ROUND_SHAFT;
}

export function addScreens(
  collection: Collection,
  derived: Derived,
  layout: FrameLayout | null,
): void {
  const { design, stack } = derived;
  const rooms = screenRooms(derived);
  if (rooms.length === 0) return;
  const posts = postPlaces(derived);
  const pillars = layout?.pillars ?? [];
  const pillar = design.pillarDiameter / 2;
  const reach = Math.max(
    stack.outerRadius,
    ...posts.map(({ x, y }) => Math.hypot(x, y) + design.postSpacerRadius + RIM),
    ...pillars.map(({ x, y }) => Math.hypot(x, y) + pillar + RIM),
  );
  addCut(
    collection,
    {
      key: 'screen',
      label: 'Screen between sections',
      section: null,
      material: design.frameMaterial === 'insulator' ? design.material : design.frameMaterial,
      thickness: design.screenThickness,
      note: layout
        ? 'Clamped on the posts between insulating spacers; earthed on the pillars that pass through'
        : 'Clamped on the posts between insulating spacers; earthed by a lug of its own',
      outside: circle(reach),
      holes: [
        circle(screenHole(design)),
        ...posts.map((post) => circle(design.postHoleDiameter / 2, post)),
        ...pillars.map((place) => circle(pillar + ROUND_PILLAR, place)),
      ],
    },
    rooms.map((room) => ({ x: 0, y: 0, ...room, angle: 0, turns: false })),
  );
}

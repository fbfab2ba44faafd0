import { Color, Group, Mesh, MeshStandardMaterial } from 'three';
import type { Derived } from '@/geometry';
import { rotorTurn } from '@/geometry/rotor-turn';
import { bodiesOf } from './bodies';
import { plateGeometry } from './plate-geometry';

/** mm. Arcs are chords in these files; this near, a fit is checked by them and not by the chords. */
const SAGITTA = 0.01;

/** Every part that has a place as a body of its own, mm, shaft along z, at a shaft angle (rad). */
export function assemblyBodies(derived: Derived, angle: number): Group {
  const turned = rotorTurn(derived.turn, angle);
  const group = new Group();
  const made = new Map<string, number>();
  for (const { part, plan, thickness, places, turns, colour } of bodiesOf(derived)) {
    const material = new MeshStandardMaterial({
      name: part.kind === 'bought' ? part.label : part.material,
      color: new Color(colour),
      metalness: 0.4,
      roughness: 0.5,
    });
    const shape = plateGeometry({ ...plan, thickness }, SAGITTA);
    for (const { x, y, from, to, angle: own } of places) {
      const number = (made.get(part.key) ?? 0) + 1;
      made.set(part.key, number);
      const mesh = new Mesh(shape, material);
      mesh.name = `${part.key}-${number}`;
      mesh.position.set(x, y, (from + to) / 2);
      mesh.rotation.z = own + (turns ? turned : 0);
      group.add(mesh);
    }
  }
  group.updateMatrixWorld(true);
  return group;
}

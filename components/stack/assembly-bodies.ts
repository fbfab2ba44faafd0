import { Color, Group, Mesh, MeshStandardMaterial, type BufferGeometry } from 'three';
import { palette } from '@/components/floor/palette';
import type { Derived } from '@/geometry';
import { assemblyOf } from '@/geometry/parts/assembly';
import type { Part } from '@/geometry/parts/part';
import { planOf } from '@/geometry/parts/solid';
import { rotorTurn } from '@/geometry/rotor-turn';
import { plateGeometry } from './plate-geometry';

const colours: Readonly<Record<string, string>> = { insulator: '#d9cfb4', steel: '#b9c0c4' };

function colourOf(part: Part): string {
  if (part.kind === 'bought') return '#b9c0c4';
  if (part.key.includes('rotor')) return palette.brass;
  if (part.key.includes('stator')) return palette.steel;
  return colours[part.material] ?? '#c9d0d2';
}

/** mm. Arcs are chords in these files; this near, a fit is checked by them and not by the chords. */
const SAGITTA = 0.01;

/** Every part that has a place as a body of its own, mm, shaft along z, at a shaft angle (rad). */
export function assemblyBodies(derived: Derived, angle: number): Group {
  const { parts, placed } = assemblyOf(derived);
  const turned = rotorTurn(derived.turn, angle);
  const group = new Group();
  for (const part of parts) {
    const plan = planOf(part, derived.design);
    const places = placed.filter((place) => place.part === part.key);
    if (!plan || places.length === 0) continue;
    const material = new MeshStandardMaterial({
      name: part.kind === 'bought' ? part.label : part.material,
      color: new Color(colourOf(part)),
      metalness: 0.4,
      roughness: 0.5,
    });
    const shapes = new Map<string, BufferGeometry>();
    places.forEach(({ x, y, from, to, angle: own, turns }, i) => {
      const key = (to - from).toFixed(6);
      const shape =
        shapes.get(key) ?? plateGeometry({ ...plan, thickness: to - from }, SAGITTA);
      shapes.set(key, shape);
      const mesh = new Mesh(shape, material);
      mesh.name = `${part.key}-${i + 1}`;
      const spin = own + (turns ? turned : 0);
      mesh.position.set(x, y, (from + to) / 2);
      mesh.rotation.z = spin;
      group.add(mesh);
    });
  }
  group.updateMatrixWorld(true);
  return group;
}

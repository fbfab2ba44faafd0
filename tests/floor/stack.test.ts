import { describe, expect, it } from 'vitest';
import { bodiesOf } from '@/components/stack/bodies';
import { plateGeometry } from '@/components/stack/plate-geometry';
import { stackSize } from '@/components/stack/stack-size';
import { defaultDesign, defaultSection, derive, type Derived } from '@/geometry';
import { assemblyOf } from '@/geometry/parts/assembly';

function derived(design = defaultDesign()): Derived {
  const derivation = derive(design);
  if (!derivation.ok) throw new Error(JSON.stringify(derivation.findings));
  return derivation.derived;
}

/** Volume inside a closed triangle mesh by the divergence theorem, and its extent along z. */
function measure(geometry: ReturnType<typeof plateGeometry>) {
  const p = geometry.getAttribute('position');
  let volume = 0;
  for (let i = 0; i < p.count; i += 3) {
    const [ax, ay, az] = [p.getX(i), p.getY(i), p.getZ(i)];
    const [bx, by, bz] = [p.getX(i + 1), p.getY(i + 1), p.getZ(i + 1)];
    const [cx, cy, cz] = [p.getX(i + 2), p.getY(i + 2), p.getZ(i + 2)];
    volume +=
      (ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx)) / 6;
  }
  geometry.computeBoundingBox();
  return { volume, low: geometry.boundingBox!.min.z, high: geometry.boundingBox!.max.z };
}

describe('the stack in 3D', () => {
  it.each(['rotor', 'stator'] as const)('has the body of the %s that is cut', (role) => {
    const plate = derived().sections[0]![role];
    const { volume, low, high } = measure(plateGeometry(plate));
    // Chords for arcs: 0.2 % of the reach each at most, so well within 1 % of the volume.
    expect(volume / (plate.area * plate.thickness)).toBeGreaterThan(0.99);
    expect(volume / (plate.area * plate.thickness)).toBeLessThan(1.01);
    expect(low).toBeCloseTo(-plate.thickness / 2, 6);
    expect(high).toBeCloseTo(plate.thickness / 2, 6);
  });

  it('shows every placed part once in every place, those of the shaft turning', () => {
    const result = derived({
      ...defaultDesign(),
      sections: [defaultSection(), { ...defaultSection(), rotorPlates: 4, statorPlates: 5 }],
    });
    const bodies = bodiesOf(result);
    const { placed } = assemblyOf(result);
    expect(bodies.flatMap(({ places }) => places).length).toBe(placed.length);
    for (const { turns, places, thickness } of bodies) {
      for (const place of places) {
        expect(place.turns).toBe(turns);
        expect(place.to - place.from).toBeCloseTo(thickness, 6);
      }
    }
    const plates = bodies.filter(({ part }) => /-(rotor|stator)(-end)?$/.test(part.key));
    expect(plates.reduce((sum, { places }) => sum + places.length, 0)).toBe(
      result.stack.plates.length,
    );
  });

  it('knows the frame from the stack, and the end plates that hide it', () => {
    const design = { ...defaultDesign(), frame: 'end-plates', bracket: 'panel' } as const;
    const result = derived(design);
    const keys = (kind: string) =>
      bodiesOf(result)
        .filter((body) => body.kind === kind)
        .map(({ part }) => part.key);
    expect(keys('end-plate')).toEqual(['frame-front', 'frame-back', 'panel-plate']);
    expect(keys('frame')).toEqual(['stop-arm', 'stop-pin', 'pillar', 'post-bush']);
    expect(keys('stack')).toEqual(expect.arrayContaining(['shaft', 'post', 's1-rotor']));
    const bodies = bodiesOf(result);
    const whole = stackSize(result, bodies, true);
    const bare = stackSize(result, bodies, false);
    expect(whole.radius).toBeGreaterThan(bare.radius);
    expect(bare.middle).toBeCloseTo(result.stack.depth / 2, 9);
  });
});

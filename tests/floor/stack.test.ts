import { describe, expect, it } from 'vitest';
import { plateGeometry } from '@/components/stack/plate-geometry';
import { stackRods } from '@/components/stack/rods';
import { defaultDesign, defaultSection, derive, type Derived } from '@/geometry';

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

  it('puts a spacer on the shaft and on every post wherever the kernel has one', () => {
    const result = derived({
      ...defaultDesign(),
      sections: [defaultSection(), { ...defaultSection(), rotorPlates: 4, statorPlates: 5 }],
    });
    const { shaft, posts, rotorSpacers, statorSpacers } = stackRods(result);
    const rotor = result.stack.spacers.filter(({ role }) => role === 'rotor');
    const stator = result.stack.spacers.filter(({ role }) => role === 'stator');
    expect(rotorSpacers).toHaveLength(rotor.length);
    expect(statorSpacers).toHaveLength(stator.length * result.design.postCount);
    expect(rotorSpacers[0]!.to - rotorSpacers[0]!.from).toBeCloseTo(rotor[0]!.length, 9);
    expect(posts).toHaveLength(2 * result.design.postCount);
    for (const post of posts) {
      expect(post.from).toBeLessThan(post.to);
      expect(post.from).toBeGreaterThan(shaft.from);
      expect(post.to).toBeLessThan(shaft.to);
    }
  });
});

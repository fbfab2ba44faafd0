/** Balance of the rotor: exact moments, torque over the turn, and the weight that cancels it. */
import { describe, expect, it } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  defaultSection,
  derive,
  type Contour,
  type Derived,
  type Design,
} from '../../../geometry';
import { flatten } from '../../../geometry/flatten';
import { contourArea } from '../../../geometry/measure';
import { balanceOf } from '../../../geometry/mechanics/balance';
import { contourMoment, faceMoment } from '../../../geometry/mechanics/centroid';
import { arcVertices } from '../../../geometry/polar';

const cache = createEdgeCache();

function derivedOf(design: Design): Derived {
  const result = derive(design, { model: 'edges', cache });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  return result.derived;
}

const gang = (count: number, changes: Partial<Design> = {}): Derived =>
  derivedOf({
    ...defaultDesign(),
    largestDepth: 200,
    ...changes,
    sections: Array.from({ length: count }, defaultSection),
  });

const sector = (radius: number, from: number, sweep: number): Contour => ({
  kind: 'path',
  vertices: [
    { x: 0, y: 0, bulge: 0 },
    ...arcVertices(radius, from, sweep),
    { x: radius * Math.cos(from + sweep), y: radius * Math.sin(from + sweep), bulge: 0 },
  ],
});

describe('the first moment of a contour', () => {
  // Centre of a circular sector: 2·R·sin(α/2)/(3·α/2) from its corner (textbook, from memory).
  it.each([
    [20, 0, Math.PI],
    [35, 0.4, 1.1],
    [12, -1, 2.6],
  ])('of a sector of radius %f from %f over %f', (radius, from, sweep) => {
    const face = sector(radius, from, sweep);
    const area = contourArea(face);
    const { x, y } = contourMoment(face);
    expect(area / (radius ** 2 * (sweep / 2))).toBeCloseTo(1, 12);
    const offset = (2 * radius * Math.sin(sweep / 2)) / (1.5 * sweep);
    expect(Math.hypot(x, y) / area / offset).toBeCloseTo(1, 12);
    expect(Math.atan2(y, x)).toBeCloseTo(from + sweep / 2, 12);
  });

  it('of a face with a hole out of the middle', () => {
    const hole: Contour = { kind: 'circle', x: 4, y: -2, radius: 3 };
    const plate: Contour = { kind: 'circle', x: 0, y: 0, radius: 10 };
    expect(faceMoment(plate, [hole])).toEqual({
      x: -4 * Math.PI * 9,
      y: 2 * Math.PI * 9,
    });
  });

  it('of a finished rotor is that of its polygon', () => {
    const { outside } = gang(1).sections[0]!.rotor;
    const flat = flatten(outside, 1e-4);
    let [mx, my] = [0, 0];
    for (let i = 0; i < flat.length; i += 2) {
      const [ax, ay] = [flat[i]!, flat[i + 1]!];
      const [bx, by] = [flat[(i + 2) % flat.length]!, flat[(i + 3) % flat.length]!];
      mx += ((ax * by - bx * ay) * (ax + bx)) / 6;
      my += ((ax * by - bx * ay) * (ay + by)) / 6;
    }
    const exact = contourMoment(outside);
    const size = Math.hypot(mx, my);
    expect(Math.hypot(exact.x - mx, exact.y - my) / size).toBeLessThan(1e-5);
  });
});

describe('the balance of a shaft', () => {
  it('has the torque of a hung weight', () => {
    const derived = gang(1, { frame: 'none' });
    const { rotor } = derived.sections[0]!;
    const { x, y } = faceMoment(rotor.outside, rotor.holes);
    const balance = balanceOf(derived);
    // kg·m times m/s².
    const expected = (14 * rotor.mass * 1e-3 * Math.hypot(x, y) * 1e-3 * 9.80665) / rotor.area;
    expect(balance.largestTorque / expected).toBeCloseTo(1, 10);
    expect(balance.mass).toBeCloseTo(14 * rotor.mass, 9);
    expect(Math.abs(balance.worst.torque)).toBeLessThanOrEqual(balance.largestTorque);
  });

  it('is largest with the centre level with the shaft, and nothing with it straight below', () => {
    const derived = gang(1);
    const { bearing, largestTorque } = balanceOf(derived);
    const { meshAtOpen, direction } = derived.turn;
    const atOpen = bearing + direction * meshAtOpen;
    const hung = balanceOf(derived, { down: atOpen });
    const level = balanceOf(derived, { down: atOpen + Math.PI / 2 });
    expect(hung.over[0]!.torque / largestTorque).toBeCloseTo(0, 12);
    expect(level.over[0]!.torque / largestTorque).toBeCloseTo(1, 12);
  });

  it('of equal sections without a stop adds up, and each has its own', () => {
    const [one, three] = [gang(1, { frame: 'none' }), gang(3, { frame: 'none' })];
    expect(balanceOf(three).moment / balanceOf(one).moment).toBeCloseTo(3, 10);
    expect(balanceOf(three, { section: 1 }).moment / balanceOf(one).moment).toBeCloseTo(1, 10);
  });

  it('is cancelled by its counterweight', () => {
    const { moment, bearing, counterweight } = balanceOf(gang(2));
    const x =
      moment * Math.cos(bearing) + counterweight.moment * Math.cos(counterweight.bearing);
    const y =
      moment * Math.sin(bearing) + counterweight.moment * Math.sin(counterweight.bearing);
    expect(Math.hypot(x, y) / moment).toBeLessThan(1e-12);
  });

  it('mirrors with the way round', () => {
    const [left, right] = [gang(1), gang(1, { sense: 'clockwise' })];
    expect(balanceOf(right).moment / balanceOf(left).moment).toBeCloseTo(1, 6);
    expect(Math.sin(balanceOf(right).bearing + balanceOf(left).bearing)).toBeCloseTo(0, 6);
  });
});

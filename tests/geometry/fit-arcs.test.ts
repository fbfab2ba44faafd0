import { expect, test } from 'vitest';
import { fitArcs, type CurveSamples } from '../../geometry/fit-arcs';
import { arcOf } from '../../geometry';

type Curve = (t: number) => { x: number; y: number; dx: number; dy: number };

function sample(curve: Curve, count: number): CurveSamples {
  const points = Array.from({ length: count + 1 }, (_, i) => curve(i / count));
  const unit = points.map(({ dx, dy }) => Math.hypot(dx, dy));
  return {
    x: Float64Array.from(points, (p) => p.x),
    y: Float64Array.from(points, (p) => p.y),
    tx: Float64Array.from(points, (p, i) => p.dx / unit[i]!),
    ty: Float64Array.from(points, (p, i) => p.dy / unit[i]!),
  };
}

/** A spiral r = 10·e^(t·ln5) over half a turn. */
const spiral: Curve = (t) => {
  const k = Math.log(5);
  const r = 10 * Math.exp(k * t);
  const [c, s] = [Math.cos(Math.PI * t), Math.sin(Math.PI * t)];
  return { x: r * c, y: r * s, dx: r * (k * c - Math.PI * s), dy: r * (k * s + Math.PI * c) };
};

const circle: Curve = (t) => {
  const [c, s] = [Math.cos(Math.PI * t), Math.sin(Math.PI * t)];
  return { x: 20 * c, y: 20 * s, dx: -s, dy: c };
};

test('a half circle comes back as one arc', () => {
  const { vertices, deviation } = fitArcs(sample(circle, 180), 0.004);
  expect(vertices).toHaveLength(1);
  expect(vertices[0]!.bulge).toBeCloseTo(1, 12);
  expect(deviation).toBeLessThan(1e-12);
});

test('a straight line comes back straight', () => {
  const line: Curve = (t) => ({ x: 30 * t, y: 10 * t, dx: 3, dy: 1 });
  const { vertices } = fitArcs(sample(line, 40), 0.004);
  for (const vertex of vertices) expect(vertex.bulge).toBe(0);
});

test('between its samples, too, a spiral is followed within 5 µm', () => {
  const { vertices } = fitArcs(sample(spiral, 360), 0.004);
  const end = spiral(1);
  let worst = 0;
  let onto = 0;
  for (let i = 0; i <= 20000; i++) {
    const { x, y } = spiral(i / 20000);
    // The nearest arc among all, by distance to its circle within its own angles.
    let nearest = Infinity;
    vertices.forEach((vertex, k) => {
      const { centre, radius, startAngle, sweep } = arcOf(
        vertex,
        vertices[k + 1] ?? end,
        vertex.bulge,
      );
      const turn = (Math.atan2(y - centre.y, x - centre.x) - startAngle) * Math.sign(sweep);
      const along = ((turn % (2 * Math.PI)) + 2 * Math.PI + 1e-9) % (2 * Math.PI);
      if (along > Math.abs(sweep) + 2e-9) return;
      nearest = Math.min(nearest, Math.abs(Math.hypot(x - centre.x, y - centre.y) - radius));
    });
    if (nearest === Infinity) continue;
    onto++;
    worst = Math.max(worst, nearest);
  }
  expect(onto).toBeGreaterThan(19990);
  expect(worst).toBeLessThan(0.005);
  expect(worst).toBeGreaterThan(0.001);
});

test('neighbouring arcs share their tangent', () => {
  const { vertices } = fitArcs(sample(spiral, 360), 0.004);
  const end = spiral(1);
  const arcs = vertices.map((vertex, k) => arcOf(vertex, vertices[k + 1] ?? end, vertex.bulge));
  arcs.slice(1).forEach((arc, k) => {
    const before = arcs[k]!;
    const leaving = before.startAngle + before.sweep;
    const apart = Math.cos(leaving - arc.startAngle) * Math.sign(before.sweep * arc.sweep);
    expect(apart).toBeCloseTo(1, 9);
  });
});

test('a finer tolerance takes more arcs', () => {
  const coarse = fitArcs(sample(spiral, 360), 0.05).vertices.length;
  const fine = fitArcs(sample(spiral, 360), 0.001).vertices.length;
  expect(fine).toBeGreaterThan(coarse);
});

/**
 * Kerf compensation. Areas by J. Steiner's formula for parallel bodies (textbook): grown by d, a
 * convex figure has A + P·d + π·d²; a straight concave corner that turns by θ takes
 * d²·tan(θ/2) where a convex one adds d²·θ/2. Others against polygons inflated by clipper2-ts.
 */
import { EndType, inflatePaths, JoinType } from 'clipper2-ts';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { selfCrossing } from '../../../geometry/cutting/crossing';
import { offsetContour } from '../../../geometry/cutting/offset';
import { distanceToSides, pointAt, sidesOf } from '../../../geometry/cutting/side';
import { flatten } from '../../../geometry/flatten';
import { contourArea, contourLength } from '../../../geometry/measure';
import type { Contour, Path, Vertex } from '../../../geometry';
import { partsOf } from '../../../geometry/parts/assembly';
import { examplePlates, examplesDerived } from '../../support/example-plates';

const at = (x: number, y: number, bulge = 0): Vertex => ({ x, y, bulge });
const path = (...vertices: Vertex[]): Path => ({ kind: 'path', vertices });

const rectangle = path(at(0, 0), at(40, 0), at(40, 25), at(0, 25));
const corner = path(at(0, 0), at(40, 0), at(40, 10), at(15, 10), at(15, 30), at(0, 30));
/** Bulges of a quarter and a half turn: a strip with one round end and round corners. */
const strip = path(at(0, 0), at(30, 0, 1), at(30, 12), at(0, 12));

/** A slot of a given width, 10 mm deep, open to the right edge of a 30 by 20 mm plate. */
const slotted = (width: number): Path =>
  path(
    at(0, 0),
    at(30, 0),
    at(30, 10 - width / 2),
    at(20, 10 - width / 2, -1),
    at(20, 10 + width / 2),
    at(30, 10 + width / 2),
    at(30, 20),
    at(0, 20),
  );

/** Area of the polygon, inflated by clipper2-ts with round corners; largest outline alone. */
function inflatedArea(contour: Contour, distance: number, sagitta = 1e-5): number {
  const unit = 1e-5;
  const flat = flatten(contour, sagitta);
  const points = [];
  for (let i = 0; i < flat.length; i += 2) {
    points.push({ x: Math.round(flat[i]! / unit), y: Math.round(flat[i + 1]! / unit), z: 0 });
  }
  const grown = inflatePaths([points], distance / unit, JoinType.Round, EndType.Polygon, 2, 2);
  const areas = grown.map((ring) =>
    ring.reduce((sum, a, i) => {
      const b = ring[(i + 1) % ring.length]!;
      return sum + ((a.x * b.y - b.x * a.y) * unit * unit) / 2;
    }, 0),
  );
  return Math.max(...areas.map(Math.abs));
}

function offsetOf(contour: Contour, distance: number): Contour {
  const { contour: curve, closing } = offsetContour(contour, distance);
  expect(closing).toBeNull();
  expect(curve).not.toBeNull();
  return curve!;
}

describe('area by Steiner', () => {
  test('a rectangle grown has round corners', () => {
    for (const d of [0.05, 0.1, 3]) {
      const area = contourArea(offsetOf(rectangle, d));
      expect(area).toBeCloseTo(40 * 25 + 130 * d + Math.PI * d * d, 9);
    }
  });

  test('a rectangle shrunk keeps sharp corners', () => {
    const shrunk = offsetOf(rectangle, -2);
    expect(contourArea(shrunk)).toBeCloseTo(36 * 21, 9);
    expect((shrunk as Path).vertices).toHaveLength(4);
  });

  test('a concave corner is trimmed', () => {
    const d = 0.1;
    const grown = contourArea(offsetOf(corner, d));
    // Five convex right angles and a concave one.
    const corners = d * d * ((5 * Math.PI) / 4 - Math.tan(Math.PI / 4));
    expect(grown).toBeCloseTo(contourArea(corner) + contourLength(corner) * d + corners, 9);
  });

  test('arcs stay arcs, tangents stay smooth', () => {
    const d = 0.1;
    const grown = offsetOf(strip, d) as Path;
    expect(contourArea(grown)).toBeCloseTo(
      contourArea(strip) + contourLength(strip) * d + Math.PI * d * d,
      9,
    );
    // Two corners opened, nothing added where line and arc meet smoothly.
    expect(grown.vertices).toHaveLength(6);
    expect(grown.vertices.filter((v) => Math.abs(v.bulge - 1) < 1e-9)).toHaveLength(1);
  });

  test('a circle changes its radius', () => {
    const circle = { kind: 'circle', x: 3, y: 4, radius: 5 } as const;
    expect(offsetOf(circle, -0.1)).toEqual({ ...circle, radius: 4.9 });
  });

  test('a contour drawn clockwise grows too', () => {
    const clockwise = path(...[...rectangle.vertices].reverse());
    expect(contourArea(offsetOf(clockwise, 1))).toBeCloseTo(1000 + 130 + Math.PI, 9);
  });
});

describe('the plates of the worked designs', () => {
  test.each(examplePlates().map(({ name, plate }) => [name, plate] as const))(
    '%s',
    (_name, plate) => {
      for (const d of [0.05, 0.1, 0.5, -0.1]) {
        const curve = offsetOf(plate.outside, d) as Path;
        expect(contourArea(curve) / inflatedArea(plate.outside, d)).toBeCloseTo(1, 6);
        const sides = sidesOf(plate.outside);
        for (const side of sidesOf(curve)) {
          for (const f of [0, 0.3, 0.7]) {
            const away = distanceToSides(sides, pointAt(side, f));
            // 1e-4 mm: joints of the plates' own arcs are smooth to that.
            expect(Math.abs(away - Math.abs(d))).toBeLessThan(1e-4);
          }
        }
        // Corners alone add vertices.
        const { vertices } = plate.outside as Path;
        expect(curve.vertices.length).toBeLessThanOrEqual(2 * vertices.length);
      }
    },
  );
});

describe('end rotor plates with slots, end plates, arms and pads', () => {
  test.each(examplesDerived({ endSlots: 4, frame: 'end-plates' }))('$name', ({ derived }) => {
    const parts = partsOf(derived).filter((part) => part.kind === 'cut');
    expect(parts.length).toBeGreaterThan(4);
    for (const { outside } of parts) {
      if (outside.kind === 'circle') continue;
      for (const d of [0.05, 0.15]) {
        const off = contourArea(offsetOf(outside, d)) - inflatedArea(outside, d, 1e-4);
        expect(Math.abs(off)).toBeLessThan(1e-4 * contourLength(outside));
      }
    }
  });
});

const anyStar = fc
  .array(
    fc.record({
      radius: fc.double({ min: 8, max: 25, noNaN: true }),
      bulge: fc.integer({ min: -25, max: 60 }).map((percent) => percent / 100),
    }),
    { minLength: 5, maxLength: 12 },
  )
  .map((corners) =>
    path(
      ...corners.map(({ radius, bulge }, i) => {
        const angle = (2 * Math.PI * i) / corners.length;
        return at(radius * Math.cos(angle), radius * Math.sin(angle), bulge);
      }),
    ),
  )
  .filter((star) => selfCrossing(sidesOf(star)) === null);

describe('any star of lines and arcs, seed 20261', () => {
  test('has the area that clipper2-ts finds, and stays its distance away', () => {
    let compared = 0;
    fc.assert(
      fc.property(
        anyStar,
        fc.oneof(
          fc.double({ min: 0.02, max: 1, noNaN: true }),
          fc.double({ min: -1, max: -0.02, noNaN: true }),
        ),
        (star, d) => {
          const { contour, closing } = offsetContour(star, d);
          if (closing) return;
          compared++;
          const area = contourArea(contour!);
          expect(Math.abs(area - inflatedArea(star, d, 1e-4))).toBeLessThan(0.01);
          const sides = sidesOf(star);
          for (const side of sidesOf(contour!)) {
            const away = distanceToSides(sides, pointAt(side, 0.5));
            expect(Math.abs(away - Math.abs(d))).toBeLessThan(1e-4);
          }
        },
      ),
      { seed: 20261, numRuns: 250 },
    );
    expect(compared).toBeGreaterThan(200);
  });

  test('grown and shrunk again is what it was, where nothing is concave', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 2, noNaN: true }), (d) => {
        const back = offsetOf(offsetOf(rectangle, d), -d);
        expect(contourArea(back)).toBeCloseTo(1000, 8);
      }),
      { seed: 20261, numRuns: 50 },
    );
  });
});

describe('narrow places', () => {
  test('a slot wider than the kerf is followed', () => {
    const d = 0.1;
    const curve = offsetOf(slotted(0.3), d);
    // Ten corners less the tangent joints: six convex right angles, the slot's bottom a half turn.
    const turns = d * d * ((6 * Math.PI) / 4 - Math.PI / 2);
    const expected = contourArea(slotted(0.3)) + contourLength(slotted(0.3)) * d + turns;
    expect(contourArea(curve)).toBeCloseTo(expected, 9);
  });

  test.each([0.2, 0.19, 0.05])('a slot of %s mm closes up under a kerf of 0.2 mm', (width) => {
    const { contour, closing } = offsetContour(slotted(width), 0.1);
    expect(closing!.width).toBeCloseTo(width, 9);
    // The rest is one closed contour, without the slot.
    expect(contourArea(contour!)).toBeGreaterThan(600);
    const inflated = inflatedArea(slotted(width), 0.1);
    expect(Math.abs(contourArea(contour!) - inflated)).toBeLessThan(0.05);
  });

  test('a mouth that closes is said, the outline stays whole', () => {
    const pocket = path(
      at(0, 0),
      at(30, 0),
      at(30, 9.95),
      at(25, 9.95),
      at(25, 5),
      at(10, 5),
      at(10, 15),
      at(25, 15),
      at(25, 10.05),
      at(30, 10.05),
      at(30, 20),
      at(0, 20),
    );
    const { contour, closing } = offsetContour(pocket, 0.1);
    expect(closing!.width).toBeCloseTo(0.1, 9);
    // Where the arcs about the mouth's corners meet, a cusp is left between them.
    const under = 0.05 * Math.sqrt(0.01 - 0.05 ** 2) + 0.01 * Math.asin(0.5);
    const cusp = 0.1 * 0.1 - under;
    expect(contourArea(contour!)).toBeCloseTo(600 + 100 * 0.1 + Math.PI * 0.01 - cusp, 9);
  });

  test('a hole smaller than the kerf has nothing left', () => {
    const hole = { kind: 'circle', x: 0, y: 0, radius: 0.08 } as const;
    const { contour, closing } = offsetContour(hole, -0.1);
    expect(contour).toBeNull();
    expect(closing!.width).toBeCloseTo(0.16, 12);
  });

  test('a neck of metal that a cut would take is said', () => {
    const dumbbell = path(
      at(0, 0),
      at(10, 0),
      at(10, 4.9),
      at(14, 4.9),
      at(14, 0),
      at(24, 0),
      at(24, 10),
      at(14, 10),
      at(14, 5.1),
      at(10, 5.1),
      at(10, 10),
      at(0, 10),
    );
    const { closing } = offsetContour(dumbbell, -0.15);
    expect(closing!.width).toBeCloseTo(0.2, 9);
  });
});

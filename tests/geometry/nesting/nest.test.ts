import { ClipType, Clipper64, EndType, FillRule, inflatePaths, JoinType } from 'clipper2-ts';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour, Path } from '../../../geometry';
import { flatten } from '../../../geometry/flatten';
import { contourBounds } from '../../../geometry/measure';
import { clearanceOf } from '../../../geometry/nesting/clearance';
import type { Layout, LayoutSettings, Piece } from '../../../geometry/nesting/layout';
import { nest } from '../../../geometry/nesting/nest';
import { placedContour } from '../../../geometry/nesting/placed';
import { boxLength } from '../../support/box-packing';
import { examplesDerived } from '../../support/example-plates';
import { plateJob } from '../../support/plate-job';

const settings: LayoutSettings = { gap: 2, margin: 5, rotations: 12 };

/** Half a disc. */
const half: Path = {
  kind: 'path',
  vertices: [
    { x: -20, y: 0, bulge: 0 },
    { x: 20, y: 0, bulge: 1 },
  ],
};
const disc: Contour = { kind: 'circle', x: 0, y: 0, radius: 8 };

function laid(pieces: readonly Piece[], stocks: Parameters<typeof nest>[1]): Layout {
  return nest(pieces, stocks, settings)!;
}

/** mm² that parts share when each is grown by almost half the gap: clipper2-ts's own word. */
function sharedArea(pieces: readonly Piece[], layout: Layout, gap: number): number {
  const unit = 1e-4;
  const outlines = new Map(pieces.map(({ key, outside }) => [key, outside]));
  const grown = layout.placements.map((placement) => {
    const flat = flatten(placedContour(outlines.get(placement.key)!, placement), 0.005);
    const points = [];
    for (let i = 0; i < flat.length; i += 2) {
      points.push({ x: Math.round(flat[i]! / unit), y: Math.round(flat[i + 1]! / unit), z: 0 });
    }
    const by = (gap / 2 - 0.01) / unit;
    return inflatePaths([points], by, JoinType.Round, EndType.Polygon, 2, 20);
  });
  let shared = 0;
  for (let i = 0; i < grown.length; i++) {
    for (let j = i + 1; j < grown.length; j++) {
      if (layout.placements[i]!.sheet !== layout.placements[j]!.sheet) continue;
      const clipper = new Clipper64();
      clipper.addSubject(grown[i]!);
      clipper.addClip(grown[j]!);
      const solution: { x: number; y: number }[][] = [];
      clipper.execute(ClipType.Intersection, FillRule.NonZero, solution as never);
      shared += solution.length;
    }
  }
  return shared;
}

function expectClean(pieces: readonly Piece[], layout: Layout, { gap, margin } = settings) {
  if (layout.nearest !== null) expect(layout.nearest).toBeGreaterThanOrEqual(gap);
  expect(layout.nearestEdge).toBeGreaterThanOrEqual(margin - 1e-9);
  expect(sharedArea(pieces, layout, gap)).toBe(0);
  for (const { key, quantity } of pieces) {
    const placed = layout.placements.filter((p) => p.key === key).length;
    const left = layout.left.find((l) => l.key === key)?.quantity ?? 0;
    expect(placed + left).toBe(quantity);
  }
  const outlines = new Map(pieces.map((piece) => [piece.key, piece.outside]));
  for (const placement of layout.placements) {
    const { width, height, used } = layout.sheets[placement.sheet]!;
    const { minX, minY, maxX, maxY } = contourBounds(
      placedContour(outlines.get(placement.key)!, placement),
    );
    expect(Math.min(minX, minY)).toBeGreaterThanOrEqual(margin - 1e-9);
    expect(maxY).toBeLessThanOrEqual(height - margin + 1e-9);
    expect(maxX).toBeLessThanOrEqual(Math.min(width, used) - margin + 1e-9);
  }
}

describe('the worked designs, 60 plates and more on a sheet 300 mm high', () => {
  test.each(examplesDerived().map(({ name, derived }) => [name, derived] as const))(
    '%s takes less sheet than its boxes',
    (_name, derived) => {
      const pieces = plateJob(derived, 60);
      const layout = laid(pieces, [{ width: 5000, height: 300, count: 1 }]);
      expect(layout.left).toEqual([]);
      expectClean(pieces, layout);
      expect(layout.sheets[0]!.used).toBeLessThan(boxLength(pieces, 300, settings));
    },
  );
});

describe('shapes', () => {
  test('a half disc nests against its twin', () => {
    const pieces = [{ key: 'half', outside: half, quantity: 24 }];
    const layout = laid(pieces, [{ width: 1000, height: 100, count: 1 }]);
    expectClean(pieces, layout);
    expect(layout.sheets[0]!.used).toBeLessThan(0.97 * boxLength(pieces, 100, settings));
    const bearings = new Set(layout.placements.map(({ angle }) => angle.toFixed(6)));
    expect(bearings.size).toBeGreaterThan(1);
    // The outside check sees it when a larger gap is asked for afterwards.
    expect(sharedArea(pieces, layout, settings.gap + 1)).toBeGreaterThan(0);
  });

  test('a part that may not be turned is not', () => {
    const pieces = [{ key: 'half', outside: half, quantity: 6 }];
    const stock = [{ width: 400, height: 100, count: 1 }];
    const still = nest(pieces, stock, { ...settings, rotations: 1 })!;
    expect(still.placements.every(({ angle }) => angle === 0)).toBe(true);
    expectClean(pieces, still);
  });

  test('discs, a disc alone and nothing at all', () => {
    const discs = [{ key: 'disc', outside: disc, quantity: 9 }];
    expectClean(discs, laid(discs, [{ width: 200, height: 60, count: 1 }]));
    const alone = laid([{ ...discs[0]!, quantity: 1 }], [{ width: 200, height: 60, count: 1 }]);
    expect(alone.nearest).toBeNull();
    expect(laid([], [{ width: 200, height: 60, count: 1 }]).sheets).toEqual([]);
  });
});

describe('sheets', () => {
  const pieces = [
    { key: 'half', outside: half, quantity: 20 },
    { key: 'disc', outside: disc, quantity: 12 },
  ];

  test('one after the other, as many as there are', () => {
    const layout = laid(pieces, [
      { width: 120, height: 80, count: 1 },
      { width: 100, height: 100, count: 9 },
    ]);
    expect(layout.left).toEqual([]);
    expect(layout.sheets.length).toBeGreaterThan(2);
    expect(layout.sheets.map(({ stock }) => stock).slice(0, 2)).toEqual([0, 1]);
    expectClean(pieces, layout);
  });

  test('what has no room is said', () => {
    const layout = laid(pieces, [{ width: 100, height: 100, count: 2 }]);
    expect(layout.sheets).toHaveLength(2);
    expect(layout.left.length).toBeGreaterThan(0);
    expectClean(pieces, layout);
  });

  test('too small for any part', () => {
    const layout = laid(pieces, [{ width: 20, height: 20, count: 2 }]);
    expect(layout.placements).toEqual([]);
    expect(layout.left).toEqual(pieces.map(({ key, quantity }) => ({ key, quantity })));
  });
});

describe('any shapes, seed 20262', () => {
  const anyPiece = fc.record({
    quantity: fc.integer({ min: 1, max: 5 }),
    corners: fc.array(
      fc.record({
        radius: fc.double({ min: 6, max: 18, noNaN: true }),
        bulge: fc.integer({ min: 0, max: 40 }).map((percent) => percent / 100),
      }),
      { minLength: 4, maxLength: 8 },
    ),
  });
  test('keep gap and margin', () => {
    fc.assert(
      fc.property(
        fc.array(anyPiece, { minLength: 1, maxLength: 3 }),
        fc.double({ min: 0.3, max: 4, noNaN: true }),
        fc.double({ min: 0, max: 10, noNaN: true }),
        fc.constantFrom(1, 2, 4, 6, 12),
        (list, gap, margin, rotations) => {
          const pieces = list.map(({ quantity, corners }, k): Piece => {
            const vertices = corners.map(({ radius, bulge }, i) => {
              const angle = (2 * Math.PI * i) / corners.length;
              return { x: radius * Math.cos(angle), y: radius * Math.sin(angle), bulge };
            });
            return { key: `p${k}`, quantity, outside: { kind: 'path', vertices } };
          });
          const own = { gap, margin, rotations };
          const layout = nest(pieces, [{ width: 150, height: 110, count: 3 }], own)!;
          expectClean(pieces, layout, own);
        },
      ),
      { seed: 20262, numRuns: 25 },
    );
  });
});

test('the same again gives the same again', () => {
  const pieces = plateJob(examplesDerived()[0]!.derived, 20);
  const stock = [{ width: 500, height: 200, count: 3 }];
  expect(laid(pieces, stock)).toEqual(laid(pieces, stock));
});

test('progress runs to its end, and stops where it is told', () => {
  const pieces = [{ key: 'half', outside: half, quantity: 10 }];
  const stock = [{ width: 500, height: 200, count: 3 }];
  const told: number[] = [];
  nest(pieces, stock, settings, (done, of) => {
    told.push(done / of);
    return true;
  });
  expect(told.at(-1)).toBe(1);
  expect(told.every((value, i) => i === 0 || value >= told[i - 1]!)).toBe(true);
  let calls = 0;
  expect(nest(pieces, stock, settings, () => ++calls < 7)).toBeNull();
  expect(calls).toBe(7);
});

describe('the exact check finds faults', () => {
  const outlines = new Map<string, Contour>([
    ['half', half],
    ['disc', disc],
  ]);
  const sheet = { stock: 0, width: 200, height: 100, used: 200 };
  const check = (...places: [string, number, number][]) =>
    clearanceOf(
      outlines,
      places.map(([key, x, y]) => ({ key, sheet: 0, x, y, angle: 0 })),
      [sheet],
    );

  test('parts too near', () => {
    // Two discs of radius 8, 17.5 apart.
    expect(check(['disc', 40, 40], ['disc', 57.5, 40]).nearest).toBeCloseTo(1.5, 9);
    // A disc over the arc of the half disc: 30 − 20 − 8.
    expect(check(['half', 60, 20], ['disc', 60, 50]).nearest).toBeCloseTo(2, 9);
  });

  test('parts that cross, and one inside the other', () => {
    expect(check(['disc', 40, 40], ['disc', 50, 40]).nearest).toBe(0);
    const small = new Map<string, Contour>([
      ['half', half],
      ['dot', { kind: 'circle', x: 0, y: 0, radius: 1 }],
    ]);
    const inside = [
      { key: 'half', sheet: 0, x: 60, y: 20, angle: 0 },
      { key: 'dot', sheet: 0, x: 60, y: 30, angle: 0 },
    ];
    expect(clearanceOf(small, inside, [sheet]).nearest).toBe(0);
    expect(clearanceOf(small, [...inside].reverse(), [sheet]).nearest).toBe(0);
  });

  test('a part over the edge', () => {
    expect(check(['disc', 6, 40]).nearestEdge).toBeCloseTo(-2, 9);
    expect(check(['disc', 40, 90]).nearestEdge).toBeCloseTo(2, 9);
  });
});

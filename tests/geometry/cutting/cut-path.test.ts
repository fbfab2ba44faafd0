import { describe, expect, test } from 'vitest';
import type { Path, Vertex } from '../../../geometry';
import { compensated, cutRuns, type CutRun } from '../../../geometry/cutting/cut-path';
import type { Machine } from '../../../geometry/cutting/machine';
import {
  chainSides,
  distanceToSides,
  sideLength,
  sidesOf,
} from '../../../geometry/cutting/side';
import { contourArea, contourLength } from '../../../geometry/measure';
import { examplePlates } from '../../support/example-plates';

const machine: Machine = {
  name: 'Laser',
  process: 'laser',
  kerf: 0.2,
  smallestHole: 1,
  smallestWeb: 1,
  bedWidth: 600,
  bedHeight: 400,
  reflective: true,
  leadIn: 1,
  bridges: 0,
  bridgeWidth: 0.5,
  feed: 50,
  pierceTime: 0.4,
};
const at = (x: number, y: number, bulge = 0): Vertex => ({ x, y, bulge });
const outside: Path = {
  kind: 'path',
  vertices: [at(0, 0), at(30, 0, 1), at(30, 12), at(0, 12)],
};
const holes = [
  { kind: 'circle', x: 30, y: 6, radius: 3 },
  { kind: 'circle', x: 8, y: 6, radius: 0.7 },
] as const;
const part = { outside, holes };

const lengthOf = (run: CutRun): number =>
  chainSides(run.between!, false).reduce((sum, side) => sum + sideLength(side), 0);

test('the tool keeps half a kerf out of the part', () => {
  const { outside: outer, holes: inner } = compensated(part, 0.2);
  // Steiner: one half turn of arc and two opened corners make a whole turn.
  const grown = contourArea(outside) + contourLength(outside) * 0.1 + Math.PI * 0.01;
  expect(contourArea(outer!)).toBeCloseTo(grown, 9);
  const radii = inner.map((hole) => (hole!.kind === 'circle' ? hole!.radius : 0));
  expect(radii[0]).toBeCloseTo(2.9, 12);
  expect(radii[1]).toBeCloseTo(0.6, 12);
});

test('nominal leaves the contours as they are', () => {
  const runs = cutRuns(part, { ...machine, leadIn: 0 }, 'nominal');
  expect(runs.map(({ contour }) => contour)).toEqual([...holes, outside]);
  expect(runs.map(({ edge }) => edge)).toEqual(['inner', 'inner', 'outer']);
});

test('lead-ins start in the waste', () => {
  const runs = cutRuns(part, machine, 'compensated');
  const [large, small, outer] = runs.map(({ leadIn }) => leadIn!);
  expect(Math.hypot(large!.from.x - 30, large!.from.y - 6)).toBeCloseTo(1.9, 9);
  // A hole of 0.6 mm has no room for 1 mm; half of it does.
  expect(Math.hypot(small!.from.x - 8, small!.from.y - 6)).toBeCloseTo(0.1, 9);
  expect(distanceToSides(sidesOf(outside), outer!.from)).toBeCloseTo(1.1, 9);
  const begun = runs[2]!.contour as Path;
  expect(begun.vertices[0]).toMatchObject(outer!.to);
  const curve = compensated(part, 0.2).outside!;
  expect(contourArea(begun)).toBeCloseTo(contourArea(curve), 9);
  expect(runs[2]!.length).toBeCloseTo(contourLength(curve) + 1, 9);
});

describe('bridges', () => {
  const bridged = { ...machine, bridges: 3 };

  test('are left standing at their width', () => {
    const runs = cutRuns(part, bridged, 'compensated').filter(({ edge }) => edge === 'outer');
    expect(runs).toHaveLength(3);
    const whole = contourLength(compensated(part, 0.2).outside!);
    const cut = runs.reduce((sum, run) => sum + lengthOf(run), 0);
    // Half a kerf is lost at both ends of each.
    expect(cut).toBeCloseTo(whole - 3 * (0.5 + 0.2), 9);
    runs.forEach((run, i) => {
      const end = run.between!.at(-1)!;
      const next = runs[(i + 1) % 3]!.between![0]!;
      // Along the contour 0.7 mm; straight across a little less on an arc.
      const gap = Math.hypot(end.x - next.x, end.y - next.y);
      expect(gap).toBeLessThanOrEqual(0.7 + 1e-9);
      expect(gap).toBeGreaterThan(0.69);
      expect(run.length).toBeCloseTo(lengthOf(run) + 1, 9);
    });
  });

  test('are none in holes, nor in contours too short for them', () => {
    const runs = cutRuns(part, { ...bridged, bridges: 80 }, 'compensated');
    expect(runs).toHaveLength(3);
    expect(runs.every(({ contour }) => contour !== null)).toBe(true);
  });
});

test.each(examplePlates().map(({ name, plate }) => [name, plate] as const))(
  '%s: every piercing lies in the waste',
  (_name, plate) => {
    const outer = sidesOf(plate.outside);
    const edges = [outer, ...plate.holes.map(sidesOf)].flat();
    for (const bridges of [0, 2]) {
      const runs = cutRuns(plate, { ...machine, leadIn: 0.6, bridges }, 'compensated');
      for (const { leadIn } of runs) {
        // Half a kerf and the lead-in away from the part's own edge.
        expect(distanceToSides(edges, leadIn!.from)).toBeGreaterThan(0.69);
      }
    }
  },
);

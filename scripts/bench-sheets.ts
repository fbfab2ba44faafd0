/** Part of npm run bench: sheets against boxes, and arcs against chords, for the worked designs. */

import type { Contour } from '../geometry';
import { chainSides, sideLength, sidesOf } from '../geometry/cutting/side';
import { nest } from '../geometry/nesting/nest';
import { boxLength } from '../tests/support/box-packing';
import { examplePlates, examplesDerived } from '../tests/support/example-plates';
import { plateJob } from '../tests/support/plate-job';

const SETTINGS = { gap: 2, margin: 5, rotations: 12 };

/** mm; the shorter side of the sheet that is laid along its length. */
const HEIGHT = 300;

/** mm */
const ERROR = 0.005;

/** Sides of a polyline with its corners on the contour, none further than the error from it. */
function chords(contour: Contour): number {
  return sidesOf(contour).reduce((sum, side) => {
    if (side.kind === 'line') return sum + 1;
    const widest = 2 * Math.acos(1 - ERROR / side.radius);
    return sum + Math.ceil(Math.abs(side.sweep) / widest);
  }, 0);
}

export function printSheets(): void {
  console.log(
    `sheet ${HEIGHT} mm high, gap 2 mm, margin 5 mm, 12 rotations: length that is needed`,
  );
  console.table(
    examplesDerived().map(({ name, derived }) => {
      const pieces = plateJob(derived, 60);
      const start = performance.now();
      const layout = nest(pieces, [{ width: 20_000, height: HEIGHT, count: 1 }], SETTINGS)!;
      const ms = performance.now() - start;
      const own = layout.sheets[0]!.used;
      const boxes = boxLength(pieces, HEIGHT, SETTINGS);
      return {
        design: name,
        plates: layout.placements.length,
        'own, mm': own.toFixed(1),
        'boxes, mm': boxes.toFixed(1),
        'less by': `${(100 * (1 - own / boxes)).toFixed(1)} %`,
        'nearest, mm': layout.nearest?.toFixed(3),
        ms: ms.toFixed(0),
        goal: '60 plates in 5000 ms',
      };
    }),
  );
  console.log(
    'sides of the outlines: arcs and lines as cut, and chords that err by 5 µm at most',
  );
  console.table(
    examplePlates().map(({ name, plate }) => {
      const { outside } = plate;
      const sides = outside.kind === 'path' ? chainSides(outside.vertices, true) : [];
      const short = Math.min(...sides.map(sideLength));
      return {
        plate: name,
        'arcs and lines': sides.length,
        chords: chords(outside),
        'off by, µm': (plate.fitDeviation * 1000).toFixed(2),
        'shortest side, mm': short.toFixed(3),
      };
    }),
  );
}

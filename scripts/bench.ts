/**
 * npm run bench: what the kernel costs, as medians, and as ratios to a fixed piece of arithmetic
 * so that two machines can be compared. Nothing here passes or fails.
 */

import {
  createEdgeCache,
  derive,
  defaultDesign,
  defaultSection,
  type Derived,
  type Design,
} from '../geometry';
import { cutFiles } from '../geometry/files';
import { dxfOf } from '../geometry/files/dxf';
import { placeInRow } from '../geometry/files/placement';
import { printSheets } from './bench-sheets';

const RUNS = 41;

/** ms */
const WARM_UP = 700;

function median(run: () => unknown): number {
  // Until the engine has settled on its best code.
  const warm = performance.now() + WARM_UP;
  while (performance.now() < warm) run();
  const times = Array.from({ length: RUNS }, () => {
    const start = performance.now();
    run();
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[RUNS >> 1]!;
}

/** The yardstick: a million square roots and sines. */
function yardstick(): number {
  let sum = 0;
  for (let i = 1; i <= 1_000_000; i++) sum += Math.sqrt(i) * Math.sin(i);
  return sum;
}

function designWith(sections: number, plates: number): Design {
  const design = defaultDesign();
  design.largestDepth = 500;
  design.largestRadius = 300;
  design.sections = Array.from({ length: sections }, () => ({
    ...defaultSection(),
    law: 'capacitance',
    rotorPlates: Math.floor(plates / 2),
    statorPlates: Math.ceil(plates / 2),
  }));
  return design;
}

function derivedOf(design: Design): Derived {
  const derivation = derive(design);
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join(' '));
  return derivation.derived;
}

const unit = median(yardstick);

interface Row {
  readonly what: string;
  readonly ms: string;
  readonly ratio: string;
  readonly goal: string;
}

function row(what: string, goal: string, run: () => unknown): Row {
  const ms = median(run);
  return { what, ms: ms.toFixed(2), ratio: (ms / unit).toFixed(3), goal };
}

/** Edges solved once, as a worker keeps them. */
const cache = createEdgeCache();
const usual = defaultDesign();
const usualDerived = derivedOf(usual);

console.log(`yardstick ${unit.toFixed(2)} ms, medians of ${RUNS} runs`);
console.table([
  row('edges alone, 29 plates: inverse and back-check', '16 ms, aim 8', () =>
    derive(usual, { model: 'edges', cache }),
  ),
  row('the same when gap or sheet is new', '', () => derive(usual, { model: 'edges' })),
  row('whole field: inverse, plan view and back-check', '200 ms, aim 60', () =>
    derive(usual, { cache }),
  ),
  row('one DXF', '50 ms', () =>
    dxfOf(placeInRow([{ key: 's1-rotor', ...usualDerived.sections[0]!.rotor }])),
  ),
  row('all files of a design', '', () => cutFiles('bench', usualDerived)),
]);

console.log('whole field: growth with plates (one section) and with sections (29 plates each)');
console.table([
  ...[5, 15, 29, 61, 101].map((plates) =>
    row(`1 section, ${plates} plates`, '', () => derive(designWith(1, plates), { cache })),
  ),
  ...[1, 2, 3, 4].map((sections) =>
    row(`${sections} section${sections > 1 ? 's' : ''}, 29 plates`, '', () =>
      derive(designWith(sections, 29), { cache }),
    ),
  ),
]);

printSheets();

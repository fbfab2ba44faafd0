/** The back-check must see what is wrong with an outline, not repeat what was asked. */
import { describe, expect, test } from 'vitest';
import { derive, defaultDesign, type Path, type Vertex } from '../../geometry';
import { EPSILON_0 } from '../../geometry/constants';
import { edgeFactorBetween } from '../../geometry/edge';
import { lawBetween, type LawName } from '../../geometry/law';
import { checkLaw } from '../../geometry/law-check';

function derived(law: LawName, airGap = 0.5) {
  const design = defaultDesign();
  Object.assign(design.sections[0]!, { law, airGap });
  const derivation = derive(design);
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join());
  return derivation.derived;
}

const laws: LawName[] = ['capacitance', 'wavelength', 'frequency', 'logarithmic'];

describe.each(laws)('%s', (law) => {
  test.each([0.3, 0.5, 1])(
    'gap %f mm: the cut outline holds the law within 0.02 %% of the range',
    (gap) => {
      const [section] = derived(law, gap).sections;
      expect(section!.law.largestError.fraction).toBeLessThan(2e-4);
      expect(section!.rotor.fitDeviation).toBeLessThanOrEqual(0.005);
    },
  );
});

test('an outline scaled by 1 % is found out', () => {
  const { design, sections } = derived('frequency');
  const section = sections[0]!;
  const spec = design.sections[0]!;
  const outside = section.rotor.outside as Path;
  const scale = (v: Vertex): Vertex => ({ ...v, x: v.x * 1.01, y: v.y * 1.01 });
  const check = checkLaw({
    law: lawBetween('frequency', section.totalMin, section.totalMax),
    totalMin: section.totalMin,
    totalMax: section.totalMax,
    rotor: { outside: { kind: 'path', vertices: outside.vertices.map(scale) } },
    stator: section.stator,
    travel: design.travel,
    permittivityGaps: EPSILON_0 * spec.permittivity * section.gaps,
    airGap: spec.airGap,
    cutoutRadius: design.cutoutRadius,
    rotorEdge: edgeFactorBetween(spec.rotorThickness, spec.airGap),
    statorEdge: edgeFactorBetween(spec.statorThickness, spec.airGap),
    steps: 90,
  });
  // Area grows by 2 %, and the cut-out under it does not shrink: a little more than 2 %.
  expect(check.largestError.fraction).toBeGreaterThan(0.02);
  expect(check.largestError.fraction).toBeLessThan(0.03);
});

test('the area gained agrees with a count of points in both plates', () => {
  const { sections, design } = derived('wavelength');
  const { rotor, stator, law, totalMin, gaps } = sections[0]!;
  const spec = design.sections[0]!;
  const angle = law.angle[60]!;
  const inside = (path: Path, x: number, y: number): boolean => {
    // Crossing number on chords finer than the grid that is counted.
    let odd = false;
    const points = chords(path);
    points.forEach((a, i) => {
      const b = points[(i + 1) % points.length]!;
      if (a.y > y !== b.y > y && x < a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y)) odd = !odd;
    });
    return odd;
  };
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const step = 0.25;
  let count = 0;
  for (let x = -35 + step / 2; x < 35; x += step) {
    for (let y = step / 2; y < 35; y += step) {
      const turnedBack: [number, number] = [x * c + y * s, y * c - x * s];
      if (inside(stator.outside as Path, x, y) && inside(rotor.outside as Path, ...turnedBack))
        count++;
    }
  }
  const area = count * step * step;
  const edges =
    (law.achieved[60]! - totalMin) / (EPSILON_0 * spec.permittivity * gaps) -
    area / spec.airGap;
  // What is left over is the edge gain: F times some tens of millimetres of edge.
  const factor = edgeFactorBetween(spec.rotorThickness, spec.airGap);
  expect(edges / factor).toBeGreaterThan(40);
  expect(edges / factor).toBeLessThan(95);
});

function chords(path: Path): { x: number; y: number }[] {
  const points: { x: number; y: number }[] = [];
  path.vertices.forEach((a, i) => {
    const b = path.vertices[(i + 1) % path.vertices.length]!;
    const included = 4 * Math.atan(a.bulge);
    for (let k = 0; k < 24; k++) {
      if (a.bulge === 0) {
        points.push({ x: a.x + ((b.x - a.x) * k) / 24, y: a.y + ((b.y - a.y) * k) / 24 });
        continue;
      }
      // Point on the arc by the sine rule: chord turned and shortened.
      const turn = (included * k) / 48;
      const reach = Math.sin(turn) / Math.sin(included / 2);
      const heading = turn - included / 2;
      const [dx, dy] = [(b.x - a.x) * reach, (b.y - a.y) * reach];
      points.push({
        x: a.x + dx * Math.cos(heading) - dy * Math.sin(heading),
        y: a.y + dx * Math.sin(heading) + dy * Math.cos(heading),
      });
    }
  });
  return points;
}

/** The back-check must see what is wrong with an outline, not repeat what was asked. */
import { describe, expect, test } from 'vitest';
import { createEdgeCache, derive, defaultDesign, type Design, type Path } from '../../geometry';
import { EPSILON_0 } from '../../geometry/constants';
import { contourArea } from '../../geometry/measure';
import { overlapAt } from '../../geometry/overlap';
import { bladeOf } from '../../geometry/rotor';
import type { NamedLaw } from '../../geometry/law';

const cache = createEdgeCache();

function derived(change: (design: Design) => void) {
  const design = defaultDesign();
  change(design);
  const derivation = derive(design, { cache });
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join());
  return derivation.derived;
}

const laws: NamedLaw[] = ['capacitance', 'wavelength', 'frequency', 'logarithmic'];

describe.each(laws)('%s', (law) => {
  test.each([0.35, 0.5, 0.8])('gap %f mm: the cut outline holds the law', (airGap) => {
    const [section] = derived((design) => {
      design.largestRadius = 120;
      // Room for the open capacitance of even stators with small gaps.
      Object.assign(design.sections[0]!, {
        law,
        airGap,
        stray: 5e-12,
        rotorPlates: 10,
        statorPlates: 11,
      });
    }).sections;
    expect(section!.law.largestInner.fraction).toBeLessThan(1e-3);
    expect(section!.law.largestError.fraction).toBeLessThan(2e-3);
    expect(section!.law.fallsAt).toBeNull();
    expect(section!.rotor.fitDeviation).toBeLessThanOrEqual(0.005);
    expect(section!.stator.fitDeviation).toBeLessThanOrEqual(0.005);
  });
});

test('what is cut is what is checked: a blade 1 % larger shows in the overlap', () => {
  const { design, sections, turn } = derived(() => undefined);
  const { rotor, stator } = sections[0]!;
  const outside = rotor.outside as Path;
  const larger: Path = {
    kind: 'path',
    vertices: outside.vertices.map((v) => ({ ...v, x: v.x * 1.01, y: v.y * 1.01 })),
  };
  const meshed = [turn.meshAtOpen + turn.travel];
  const areaOf = (path: Path): number => {
    const blade = bladeOf(path, design.rotorSector, 300);
    const curves = { cutoutRadius: design.cutoutRadius, blade };
    return overlapAt({ outside: path }, stator, meshed, curves)[0]!.area;
  };
  // Everything inside the rotor's curve grows by 2.01 %, the cut-out under it does not.
  const cutout = (design.rotorSector / 2) * design.cutoutRadius ** 2;
  const before = areaOf(outside) + cutout;
  expect((areaOf(larger) + cutout) / before).toBeCloseTo(1.0201, 4);
});

test('meshed fully, the overlap is the blade outside the cut-out', () => {
  const { design, sections, turn } = derived((d) => (d.sections[0]!.law = 'wavelength'));
  const { rotor, stator } = sections[0]!;
  const blade = bladeOf(rotor.outside as Path, design.rotorSector, 300);
  const curves = { cutoutRadius: design.cutoutRadius, blade };
  const [overlap] = overlapAt(rotor, stator, [turn.meshAtOpen + turn.travel], curves);
  const hub = ((2 * Math.PI - design.rotorSector) / 2) * design.hubRadius ** 2;
  const cutout = (design.rotorSector / 2) * design.cutoutRadius ** 2;
  expect(overlap!.area / (contourArea(rotor.outside) - hub - cutout)).toBeCloseTo(1, 5);
  // Chords that keep an area are a little longer than its arc.
  const arc = design.cutoutRadius * design.rotorSector;
  expect(Math.abs(overlap!.cutoutEdge / arc - 1)).toBeLessThan(1e-3);
});

test('area alone misses by several per cent of the range, as the comparison curve shows', () => {
  const { sections } = derived(() => undefined);
  const { law, totalMax, totalMin } = sections[0]!;
  const end = law.angle.indexOf(law.to);
  const miss = (law.areaOnly[end]! - law.target[end]!) / (totalMax - totalMin);
  expect(Math.abs(miss)).toBeGreaterThan(0.01);
  expect(Math.abs(miss)).toBeLessThan(0.1);
});

test('the trimmer brings the beginning of the law to its target', () => {
  const { sections } = derived(() => undefined);
  const { platesAtLaw, frame, trimmer, stray, totalMin, law } = sections[0]!;
  expect((platesAtLaw + frame + trimmer + stray) / totalMin).toBeCloseTo(1, 12);
  expect(law.achieved[law.angle.indexOf(law.from)]! / totalMin).toBeCloseTo(1, 12);
  expect(trimmer).toBeGreaterThan(0);
});

test('more plates and thinner gaps raise the open capacitance', () => {
  const few = derived((d) =>
    Object.assign(d.sections[0]!, { rotorPlates: 8, statorPlates: 9, airGap: 0.3 }),
  );
  const many = derived(() => undefined);
  expect(many.sections[0]!.platesOpen).toBeGreaterThan(few.sections[0]!.platesOpen);
  expect(many.sections[0]!.platesOpen).toBeGreaterThan(EPSILON_0);
});

/** The rotor's weight about the shaft. */
import { describe, expect, it } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  defaultSection,
  derive,
  type Path,
} from '../../../geometry';
import { flatten } from '../../../geometry/flatten';
import { balanceOf } from '../../../geometry/mechanics/balance';
import { contourMoment } from '../../../geometry/mechanics/moment';
import { sheetMaterials } from '../../../geometry/material';

const cache = createEdgeCache();

const plates = (edit: (design: ReturnType<typeof defaultDesign>) => void = () => undefined) => {
  const design = { ...defaultDesign(), largestDepth: 200 };
  edit(design);
  const result = derive(design, { model: 'edges', cache });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  return result.derived;
};

describe('the first moment', () => {
  // Computed: a half disc of radius r has ∫y dA = 2/3·r³; a disc has its area at its centre.
  it('of a half disc is two thirds of the cube of its radius', () => {
    const half: Path = {
      kind: 'path',
      vertices: [
        { x: 25, y: 0, bulge: 1 },
        { x: -25, y: 0, bulge: 0 },
      ],
    };
    const { x, y } = contourMoment(half);
    expect(x).toBeCloseTo(0, 9);
    expect(y / ((2 / 3) * 25 ** 3)).toBeCloseTo(1, 12);
  });

  it('of a crescent is that of the half disc less what is hollow', () => {
    const [r, bulge] = [25, 0.3];
    const crescent: Path = {
      kind: 'path',
      vertices: [
        { x: r, y: 0, bulge: 1 },
        { x: -r, y: 0, bulge: -bulge },
      ],
    };
    const segment: Path = {
      kind: 'path',
      vertices: [
        { x: -r, y: 0, bulge: 0 },
        { x: r, y: 0, bulge },
      ],
    };
    expect(contourMoment(segment).y).toBeGreaterThan(0);
    expect(contourMoment(crescent).y + contourMoment(segment).y).toBeCloseTo(
      (2 / 3) * r ** 3,
      8,
    );
  });

  it('of a rotor is that of its polygon', () => {
    const { outside } = plates().sections[0]!.rotor;
    const flat = flatten(outside, 0.0002);
    let [x, y] = [0, 0];
    for (let i = 0; i < flat.length; i += 2) {
      const [ax, ay] = [flat[i]!, flat[i + 1]!];
      const [bx, by] = [flat[(i + 2) % flat.length]!, flat[(i + 3) % flat.length]!];
      x += ((ax + bx) * (ax * by - bx * ay)) / 6;
      y += ((ay + by) * (ax * by - bx * ay)) / 6;
    }
    const exact = contourMoment(outside);
    expect(exact.x / x).toBeCloseTo(1, 5);
    expect(exact.y / y).toBeCloseTo(1, 5);
  });
});

describe('the balance of a rotor', () => {
  const one = plates();
  const { outside, thickness, quantity } = one.sections[0]!.rotor;

  it('is its moment times density, thickness and count', () => {
    const { x, y } = contourMoment(outside);
    const { density } = sheetMaterials[one.design.material];
    const balance = balanceOf(one);
    const unbalance = Math.hypot(x, y) * density * thickness * quantity;
    expect(balance.unbalance / unbalance).toBeCloseTo(1, 9);
    // g·mm to N·m: 1e-6·9.80665 (standard gravity).
    expect(balance.worst / (unbalance * 9.80665e-6)).toBeCloseTo(1, 9);
    expect(balance.turn.every(({ torque }) => Math.abs(torque) <= balance.worst)).toBe(true);
  });

  it('is nothing with its counterweight', () => {
    const { unbalance, bearing, counterweight } = balanceOf(one);
    const left =
      Math.cos(bearing) * unbalance + Math.cos(counterweight.bearing) * counterweight.moment;
    expect(left / unbalance).toBeCloseTo(0, 12);
  });

  it('doubles with a second section, and is nothing with two blades opposite', () => {
    const two = plates((design) => design.sections.push(defaultSection()));
    expect(balanceOf(two).unbalance / balanceOf(one).unbalance).toBeCloseTo(2, 9);
    expect(balanceOf(two).sections).toHaveLength(2);
    const butterfly = plates((design) => {
      design.arrangement = 'butterfly';
      design.travel = design.travel / 2;
      design.rotorSector = 1.4;
      design.statorSector = 1.4;
      design.postCount = 2;
      Object.assign(design.sections[0]!, {
        law: 'capacitance',
        targetKind: 'terminals',
        minCapacitance: 30e-12,
        maxCapacitance: 90e-12,
      });
    });
    expect(balanceOf(butterfly).unbalance / balanceOf(one).unbalance).toBeLessThan(1e-6);
  });

  it('turns the other way where the rotor does, with the same torque', () => {
    const clockwise = plates((design) => {
      design.sense = 'clockwise';
    });
    const [here, there] = [balanceOf(one), balanceOf(clockwise)];
    expect(there.bearing).toBeCloseTo(-here.bearing, 9);
    there.turn.forEach(({ torque }, i) => expect(torque).toBeCloseTo(here.turn[i]!.torque, 12));
  });
});

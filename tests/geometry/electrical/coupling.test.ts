/** Neighbouring sections: how much they act on each other, and what a screen does. */
import { describe, expect, it } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  defaultSection,
  derive,
  type Derived,
  type Design,
} from '../../../geometry';
import { couplingsOf, facingPlates, throughHole } from '../../../geometry/electrical/coupling';

const cache = createEdgeCache();

function gang(changes: Partial<Design>, rotorPlates = 14): Derived {
  const section = { ...defaultSection(), rotorPlates };
  const result = derive(
    {
      ...defaultDesign(),
      largestDepth: 200,
      ...changes,
      sections: [section, section, section],
    },
    { model: 'edges', cache },
  );
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  return result.derived;
}

describe('facing plates', () => {
  it('have the capacitance of Kirchhoff’s thin discs', () => {
    // R = 50, d = 1: 72.564042179 pF, computed from the published formula.
    expect(facingPlates(Math.PI * 2500, 1) * 1e12).toBeCloseTo(72.564042179, 8);
  });

  it('through a small hole act as its polarizability says', () => {
    // Computed from 2a³/3: a = 1, 5 mm either side, ε0·(2/3)/25.
    expect(throughHole(1, 5, 5)).toBeCloseTo((8.8541878188e-15 * (2 / 3)) / 25, 24);
    expect(throughHole(2, 5, 5) / throughHole(1, 5, 5)).toBeCloseTo(8, 12);
    // A hole as wide as the room lets no more through than its own area has.
    expect(throughHole(20, 3, 3)).toBeCloseTo((8.8541878188e-15 * Math.PI * 400) / 6, 20);
  });
});

describe('sections of a gang', () => {
  it('act on each other less the further they stand apart', () => {
    const [near, far] = [4, 12].map((sectionSpacing) => couplingsOf(gang({ sectionSpacing })));
    expect(near).toHaveLength(2);
    expect(near![0]!.distance).toBeCloseTo(4, 9);
    expect(near![0]!.capacitance).toBeGreaterThan(2 * far![0]!.capacitance);
    expect(near![0]!.shieldedMeshed).toBe(false);
    const { totalMin } = gang({}).sections[0]!;
    expect(near![0]!.coefficient).toBeCloseTo(near![0]!.capacitance / totalMin, 12);
  });

  it('with a screen act several times less, and the stack is that much deeper', () => {
    const [open, screened] = [gang({}), gang({ screens: 'between', screenThickness: 1.5 })];
    expect(screened.stack.depth - open.stack.depth).toBeCloseTo(3, 9);
    expect(screened.sections).toEqual(open.sections);
    const [without, within] = [couplingsOf(open)[0]!, couplingsOf(screened)[0]!];
    expect(without.capacitance).toBe(without.unscreened);
    expect(within.capacitance).toBe(within.screened);
    expect(within.capacitance).toBeLessThan(without.capacitance / 3);
  });

  it('with a rotor plate at an end look past it when it is turned out', () => {
    const [coupling] = couplingsOf(gang({ sectionSpacing: 5 }, 15));
    // Rotor 0.8 and gap 0.5 stand between as well.
    expect(coupling!.shieldedMeshed).toBe(true);
    expect(coupling!.distance).toBeCloseTo(5 + 0.8 + 0.5, 9);
  });
});

/**
 * The solver against exact plane fields: concentric squares (F. Bowman, Introduction to Elliptic
 * Functions, 1953), a pair of strips (A. E. H. Love, Proc. London Math. Soc. 22, 1923/24) and a
 * thick edge between planes (S. B. Cohn, IRE Trans. MTT-2, 1954).
 */
import { describe, expect, it } from 'vitest';
import { extrapolate, type Refinements } from './extrapolation';
import { gradedLine, type Grading } from './grading';
import { part, planMesh } from './plan-mesh';
import { gridPlan } from './grid-plan';
import { flatPlan, oneLevel, sectionField, type Section } from './section';
import { stackField } from './stack-field';

/** The fineness of the reference's own grids. */
const growth = 0.6;
const step = 1 / 8;
const refinements: Refinements = [1, 2, 3];
const fall = 1e-8;

function limitOf(solve: (grading: Grading) => number, at: Refinements = refinements) {
  const on = (refinement: number) => solve({ growth, most: Infinity, refinement });
  const onGrids: [number, number, number] = [on(at[0]), on(at[1]), on(at[2])];
  return { ...extrapolate(at, onGrids), onGrids };
}

/** Half-width of a comparison: what the reference itself would state, and never less honest. */
function expectWithin(found: ReturnType<typeof limitOf>, exact: number) {
  expect(Math.abs(found.value - exact)).toBeLessThan(found.uncertainty);
  // The energy of a grid that carries the metal exactly is an upper bound.
  for (const energy of found.onGrids) expect(energy).toBeGreaterThan(exact);
}

describe('concentric squares', () => {
  it.each([
    { ratio: 2, exact: 10.2340925693680517 },
    { ratio: 3, exact: 6.2155472848594 },
  ])('1 : $ratio', ({ ratio, exact }) => {
    const found = limitOf((grading) => {
      const line = gradedLine(
        [
          { at: 0, step: Infinity },
          { at: 1, step: step * (ratio - 1) },
          { at: ratio, step: Infinity },
        ],
        grading,
      );
      const plan = flatPlan(line, line, (x, y) =>
        Math.max(x, y) <= 1 + 1e-9 ? part.rotor : Math.max(x, y) >= ratio ? part.stator : 0,
      );
      return 4 * stackField(plan, oneLevel, fall).capacitance;
    });
    expectWithin(found, exact);
    expect(found.value / exact).toBeCloseTo(1, 3);
  });
});

describe('strip pair', () => {
  // Thin strips: the edge's field is more singular than that of any plate here.
  const fine: Refinements = [2, 4, 6];
  it.each([
    { width: 1, exact: 2.11577897092 },
    { width: 2, exact: 3.26346886276 },
    { width: 5, exact: 6.49067575119 },
  ])('width over separation $width', ({ width, exact }) => {
    const far = 100 * width;
    const found = limitOf((grading) => {
      const x = gradedLine(
        [
          { at: 0, step: Infinity },
          { at: width / 2, step: step / 16 },
          { at: far, step: Infinity },
        ],
        grading,
      );
      const y = gradedLine(
        [
          { at: 0, step: Infinity },
          { at: 0.5, step: step / 16 },
          { at: far, step: Infinity },
        ],
        grading,
      );
      const plan = flatPlan(x, y, (at, height) =>
        height === 0
          ? part.stator
          : Math.abs(height - 0.5) < 1e-9 && at <= width / 2 + 1e-9
            ? part.rotor
            : 0,
      );
      return stackField(plan, oneLevel, fall).capacitance;
    }, fine);
    expectWithin(found, exact);
    expect(found.value / exact).toBeCloseTo(1, 3);
  });
});

const far = 40;

function sectionLimit(section: Section) {
  return limitOf((grading) => {
    const { plan, levels } = sectionField(section, step * section.gap, grading);
    return stackField(plan, levels, fall).capacitance;
  });
}

describe('thick edge deep between planes', () => {
  it.each([0.1, 1 / 3, 0.5])('thickness %f of their distance', (tau) => {
    const y = 1 / (1 - tau);
    const exact = (2 * y * Math.log(y + 1) - (y - 1) * Math.log(y * y - 1)) / Math.PI;
    if (tau === 1 / 3) expect(exact).toBeCloseTo(0.839478796512, 11);
    const gap = (1 - tau) / 2;
    const found = sectionLimit({
      x: [
        { at: -far, step: Infinity },
        { at: 0, step: step * gap },
        { at: far, step: Infinity },
      ],
      rotorThickness: tau,
      statorThickness: 0,
      gap,
      rotorReaches: (x) => x <= 1e-9,
      statorReaches: () => true,
    });
    expectWithin(found, exact + far / gap);
    expect((found.value - far / gap) / exact).toBeCloseTo(1, 2.5);
  });
});

describe('opposed edges of plates as thick as the gap', () => {
  // Another plane solver's table, held to half a per cent.
  it.each([
    [-20, 0.096],
    [-8, 0.227],
    [-4, 0.416],
    [-2, 0.707],
    [-1, 1.053],
    [0, 1.727],
    [1, 2.675],
    [2, 3.672],
    [4, 5.672],
  ])('rotor ends %f past the stator edge', (past, stated) => {
    const end = 400;
    const ends = [...new Set([0, past])].sort((a, b) => a - b);
    const found = sectionLimit({
      x: [
        { at: -end, step: Infinity },
        ...ends.map((at) => ({ at, step })),
        { at: end, step: Infinity },
      ],
      rotorThickness: 1,
      statorThickness: 1,
      gap: 1,
      rotorReaches: (x) => x <= past + 1e-9,
      statorReaches: (x) => x >= -1e-9,
    });
    expect(Math.abs(found.value / stated - 1)).toBeLessThan(0.005);
  });
});

describe('polar metric', () => {
  const polar = (refinement: number, skew: number) => {
    const rho = gradedLine(
      [
        { at: 2, step: Infinity },
        { at: 10, step: Infinity },
      ],
      { growth, most: 1, refinement },
    );
    const rows = 12 * refinement;
    return {
      rho,
      rows,
      grid: (mask: (column: number, row: number) => number, closed: boolean) =>
        planMesh(
          gridPlan({
            metric: 'polar',
            rows,
            columns: rho.length,
            closed,
            first: (column, row) =>
              rho[column]! +
              skew *
                Math.sin((Math.PI * column) / (rho.length - 1)) *
                Math.sin((4 * Math.PI * row) / rows),
            second: (_, row) => ((closed ? 2 : 1) * Math.PI * row) / (closed ? rows : rows - 1),
            mask,
          }),
        ),
    };
  };

  it.each([0, 0.4])('a shaft in a tube, columns waving by %f', (skew) => {
    const exact = (2 * Math.PI) / Math.log(5);
    const error = (refinement: number) => {
      const { rho, grid } = polar(refinement, skew);
      const plan = grid(
        (column) => (column === 0 ? part.rotor : column === rho.length - 1 ? part.stator : 0),
        true,
      );
      return stackField(plan, oneLevel, fall).capacitance / exact - 1;
    };
    const coarse = error(2);
    const fine = error(4);
    expect(Math.abs(fine)).toBeLessThan(2e-3);
    // Second order.
    expect(coarse / fine).toBeGreaterThan(3.5);
    expect(coarse / fine).toBeLessThan(4.5);
  });

  it('two radial walls half a turn apart', () => {
    const exact = Math.log(5) / Math.PI;
    const { rows, grid } = polar(4, 0);
    const plan = grid(
      (_, row) => (row === 0 ? part.rotor : row === rows - 1 ? part.stator : 0),
      false,
    );
    expect(stackField(plan, oneLevel, fall).capacitance / exact).toBeCloseTo(1, 3);
  });
});

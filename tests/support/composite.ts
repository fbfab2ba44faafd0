/** The kernel's field model on the plates of the finite-difference reference (tests/field). */
import { BLADE_STEPS } from '../../geometry/solve-blade';
import type { Blade } from '../../geometry/blade';
import {
  createEdgeCache,
  gapCapacitance,
  sectionEdges,
  stackCapacitance,
  type OverlapSizes,
} from '../../geometry/field/cell-field';
import { planShare } from '../../geometry/field/plan-share';
import { edgePlates } from '../../geometry/law-check';
import { overlapAt } from '../../geometry/overlap';
import { polar } from '../../geometry/polar';
import type { Path } from '../../geometry';
import { rotorRadius, statorRadius, type StackShape } from '../field/stack-shape';

const cache = createEdgeCache();

/** Angle of a stator edge, moved in parallel, from its radial line. */
const setIn = (shape: StackShape, radius: number): number =>
  Math.asin(shape.edgeOffset / radius);

/** An outline of straight sides, fine enough that they do not matter. */
function chords(points: { x: number; y: number }[]): Path {
  return { kind: 'path', vertices: points.map((point) => ({ ...point, bulge: 0 })) };
}

const spread = <T>(count: number, at: (share: number) => T): T[] =>
  Array.from({ length: count + 1 }, (_, i) => at(i / count));

function rotorPath(shape: StackShape, sides: number): Path {
  const { travel, hubRadius } = shape;
  return chords([
    ...spread(sides, (s) => polar(rotorRadius(shape, travel * (1 - s)), -travel * (1 - s))),
    ...spread(sides / 3, (s) => polar(hubRadius, (2 * Math.PI - travel) * s)),
  ]);
}

function statorPath(shape: StackShape, sides: number): Path {
  const { travel, cutoutRadius } = shape;
  const from = setIn(shape, statorRadius(shape, 0));
  const to = travel - setIn(shape, statorRadius(shape, travel));
  const inner = setIn(shape, cutoutRadius);
  return chords([
    ...spread(sides, (s) => {
      const angle = from + (to - from) * s;
      return polar(statorRadius(shape, angle), angle);
    }),
    ...spread(sides / 3, (s) => polar(cutoutRadius, travel - inner - (travel - 2 * inner) * s)),
  ]);
}

const flat = (path: Path): number[] => path.vertices.flatMap(({ x, y }) => [x, y]);

/** Gaps of the short stack: three rotor plates between four stator plates. */
const SHORT_STACK_GAPS = 6;

interface Composite {
  /** Capacitance of half a cell of the endless stack over ε, mm, at fractions of the travel. */
  readonly halfCell: number[];
  /** The same of the whole short stack. */
  readonly shortStack: number[];
}

/** What the field model makes of a reference shape. */
export function compositeOf(shape: StackShape, fractions: readonly number[]): Composite {
  const { gap: g, travel } = shape;
  const middle = travel / 2;
  const edges = sectionEdges(
    {
      airGap: g,
      rotorThickness: shape.rotorThickness,
      statorThickness: shape.statorThickness,
      hubRadius: shape.hubRadius,
      spacerRadius: shape.shaftRadius,
      cutoutRadius: shape.cutoutRadius,
      overhang: statorRadius(shape, middle) - rotorRadius(shape, travel - middle),
    },
    cache,
  );
  const blade: Blade = {
    sector: travel,
    radius: Float64Array.from(spread(BLADE_STEPS, (s) => rotorRadius(shape, travel * s))),
  };
  const plates = edgePlates(blade, {
    statorFirst: statorRadius(shape, 0),
    statorLast: statorRadius(shape, travel),
    statorSector: travel,
    cutoutRadius: shape.cutoutRadius,
    edgeOffset: shape.edgeOffset,
    airGap: g,
    toNextStator: 2 * Math.PI,
  });
  const share = planShare(
    {
      plates,
      rotor: flat(rotorPath(shape, 45)),
      stators: [flat(statorPath(shape, 45))],
      statorAngles: [0],
      lobeAngles: [0],
      hubRadius: shape.hubRadius,
      sweepRadius: shape.rotor.radius,
      gaps: SHORT_STACK_GAPS,
      endPlates: ['stator', 'stator'],
      posts: (shape.posts?.angles ?? []).map((angle) => ({
        ...polar(shape.posts!.at, angle),
        radius: shape.posts!.radius,
        stator: 0,
      })),
    },
    edges.table,
    edges.hub,
    [0, travel],
    [{ weight: 1, potentials: { rotor: 1, stators: [0] } }],
  );
  const angles = fractions.map((fraction) => fraction * travel);
  const overlaps: OverlapSizes[] = overlapAt(
    { outside: rotorPath(shape, 720) },
    { outside: statorPath(shape, 720) },
    angles,
    { cutoutRadius: shape.cutoutRadius, blade },
  );
  return {
    halfCell: angles.map((angle, i) =>
      gapCapacitance(edges, plates, share, overlaps[i]!, angle),
    ),
    shortStack: angles.map((angle, i) =>
      stackCapacitance(SHORT_STACK_GAPS, edges, plates, share, overlaps[i]!, angle),
    ),
  };
}

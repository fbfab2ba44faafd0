/**
 * Overlap of the finished plates by polygon clipping: the back-check's route to C(θ), which
 * shares nothing with the way the outline was solved.
 */

import { ClipType, Clipper64, FillRule, type Path64, type Paths64 } from 'clipper2-ts';
import { flatten } from './flatten';
import type { Plate } from './derived';
import { CLIP_UNIT, FLATTENING } from './tolerances';

export interface Overlap {
  /** mm² */
  readonly area: number;
  /** Length of the rotor's outer curve over the stator, mm. */
  readonly rotorEdge: number;
  /** Length of the stator's cut-out over the rotor, mm. */
  readonly cutoutEdge: number;
}

function toPath(flat: readonly number[], cos: number, sin: number): Path64 {
  const path: Path64 = [];
  for (let i = 0; i < flat.length; i += 2) {
    const x = flat[i]!;
    const y = flat[i + 1]!;
    path.push({
      x: Math.round((x * cos - y * sin) / CLIP_UNIT),
      y: Math.round((x * sin + y * cos) / CLIP_UNIT),
      z: 0,
    });
  }
  return path;
}

function measure(paths: Paths64, cutoutRadius: number): Overlap {
  let area = 0;
  let rotorEdge = 0;
  let cutoutEdge = 0;
  const onCutout = cutoutRadius + FLATTENING;
  for (const path of paths) {
    let a = path[path.length - 1]!;
    for (const b of path) {
      const cross = (a.x * b.y - b.x * a.y) * CLIP_UNIT * CLIP_UNIT;
      area += cross / 2;
      const ra = Math.hypot(a.x, a.y) * CLIP_UNIT;
      const rb = Math.hypot(b.x, b.y) * CLIP_UNIT;
      const length = Math.hypot(b.x - a.x, b.y - a.y) * CLIP_UNIT;
      // A side along a radius, rounding apart, is the edge of a sector and belongs to no curve.
      if (Math.abs(cross) > 2 * CLIP_UNIT * Math.max(ra, rb)) {
        if (Math.max(ra, rb) < onCutout) cutoutEdge += length;
        else rotorEdge += length;
      }
      a = b;
    }
  }
  return { area: Math.abs(area), rotorEdge, cutoutEdge };
}

/**
 * Overlaps of a rotor plate turned to each angle with its stator plate.
 * @param angles mesh angles, rad
 * @param cutoutRadius mm
 */
export function overlapAt(
  rotor: Pick<Plate, 'outside'>,
  stator: Pick<Plate, 'outside'>,
  angles: readonly number[],
  cutoutRadius: number,
): Overlap[] {
  const rotorFlat = flatten(rotor.outside, FLATTENING);
  const clip: Paths64 = [toPath(flatten(stator.outside, FLATTENING), 1, 0)];
  return angles.map((angle) => {
    const clipper = new Clipper64();
    clipper.addSubject([toPath(rotorFlat, Math.cos(angle), Math.sin(angle))]);
    clipper.addClip(clip);
    const solution: Paths64 = [];
    clipper.execute(ClipType.Intersection, FillRule.NonZero, solution);
    return measure(solution, cutoutRadius);
  });
}

/**
 * Overlap of the finished plates by polygon clipping: the back-check's route to C(θ), which
 * shares nothing with the way the outline was solved.
 */

import { ClipType, Clipper64, FillRule, type Path64, type Paths64 } from 'clipper2-ts';
import { bladeRadius, type Blade } from './blade';
import { TWO_PI } from './constants';
import { flatten } from './flatten';
import type { Plate } from './derived';
import type { OverlapSizes } from './field/cell-field';
import { CLIP_UNIT, FLATTENING } from './tolerances';

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

interface Curves {
  readonly cutoutRadius: number;
  /** Blade of the rotor, read from its outline. */
  readonly blade: Blade;
}

function measure(paths: Paths64, angle: number, { cutoutRadius, blade }: Curves): OverlapSizes {
  let area = 0;
  let rotorEdge = 0;
  let cutoutEdge = 0;
  const near = 2 * FLATTENING;
  const onRotor = (x: number, y: number, r: number): boolean => {
    const phi = angle - Math.atan2(y, x);
    const behind = ((phi % TWO_PI) + TWO_PI + 1e-6) % TWO_PI;
    return Math.abs(r - bladeRadius(blade, behind - 1e-6)) < near;
  };
  for (const path of paths) {
    let a = path[path.length - 1]!;
    for (const b of path) {
      area += ((a.x * b.y - b.x * a.y) * CLIP_UNIT * CLIP_UNIT) / 2;
      const ra = Math.hypot(a.x, a.y) * CLIP_UNIT;
      const rb = Math.hypot(b.x, b.y) * CLIP_UNIT;
      const length = Math.hypot(b.x - a.x, b.y - a.y) * CLIP_UNIT;
      // A side of which not both ends lie on a curve is a straight edge of a plate.
      if (Math.max(ra, rb) < cutoutRadius + near) cutoutEdge += length;
      else if (onRotor(a.x, a.y, ra) && onRotor(b.x, b.y, rb)) rotorEdge += length;
      a = b;
    }
  }
  return { area: Math.abs(area), rotorEdge, cutoutEdge };
}

/**
 * Overlaps of a rotor plate turned to each mesh angle with its stator plate.
 * @param angles mesh angles, rad
 */
export function overlapAt(
  rotor: Pick<Plate, 'outside'>,
  stator: Pick<Plate, 'outside'>,
  angles: readonly number[],
  curves: Curves,
): OverlapSizes[] {
  const rotorFlat = flatten(rotor.outside, FLATTENING);
  const clip: Paths64 = [toPath(flatten(stator.outside, FLATTENING), 1, 0)];
  return angles.map((angle) => {
    const clipper = new Clipper64();
    clipper.addSubject([toPath(rotorFlat, Math.cos(angle), Math.sin(angle))]);
    clipper.addClip(clip);
    const solution: Paths64 = [];
    clipper.execute(ClipType.Intersection, FillRule.NonZero, solution);
    return measure(solution, angle, curves);
  });
}

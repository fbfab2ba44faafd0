/** The blade of an old rotor vane, read from its outline about the shaft's centre. */

import type { Blade } from '../blade';
import { flatten } from '../flatten';
import { contourArea } from '../measure';
import type { Path, Point } from '../outline';
import { BLADE_STEPS } from '../solve-blade';
import { DrawingError } from './pieces';

/** mm. Chords of the reading. */
const READING = 0.002;

/** Rays over a whole turn by which the blade's edges are looked for. */
const RAYS = 7200;

/** rad. A blade narrower than this is none. */
const NARROWEST = (15 * Math.PI) / 180;

/** The outline with the most area: the plate itself, not its holes. */
export function plateAmong(paths: readonly Path[]): Path {
  const sorted = [...paths].sort((a, b) => Math.abs(contourArea(b)) - Math.abs(contourArea(a)));
  if (!sorted[0]) throw new DrawingError('There is no closed outline in the file.');
  return sorted[0];
}

/** Furthest crossing of each ray from the centre with the outline, mm; 0 for none. */
function reachAround(flat: readonly number[], { x, y }: Point): Float64Array {
  const reach = new Float64Array(RAYS);
  const n = flat.length;
  const step = (2 * Math.PI) / RAYS;
  for (let i = 0; i < n; i += 2) {
    const [ax, ay] = [flat[i]! - x, flat[i + 1]! - y];
    const [bx, by] = [flat[(i + 2) % n]! - x, flat[(i + 3) % n]! - y];
    const from = Math.atan2(ay, ax);
    let sweep = Math.atan2(by, bx) - from;
    sweep -= 2 * Math.PI * Math.round(sweep / (2 * Math.PI));
    const cross = ax * by - ay * bx;
    const [low, high] = sweep > 0 ? [from, from + sweep] : [from + sweep, from];
    for (let k = Math.ceil(low / step - 1e-9); k <= high / step + 1e-9; k++) {
      const angle = k * step;
      const [dx, dy] = [Math.cos(angle), Math.sin(angle)];
      const den = dx * (by - ay) - dy * (bx - ax);
      const r =
        Math.abs(den) < 1e-12 ? Math.max(Math.hypot(ax, ay), Math.hypot(bx, by)) : cross / den;
      const ray = ((k % RAYS) + RAYS) % RAYS;
      if (r > reach[ray]!) reach[ray] = r;
    }
  }
  return reach;
}

export interface Vane {
  readonly blade: Blade;
  /** Bearing of the leading edge in the drawing, rad. */
  readonly leading: number;
}

/**
 * @param centre of the shaft, mm
 * @param cutoutRadius of the stator: what reaches over it is blade
 * @param direction 1 where the vane meshes turning counter-clockwise as drawn, −1 clockwise
 * @throws DrawingError
 */
export function vaneOf(
  outline: Path,
  centre: Point,
  cutoutRadius: number,
  direction: 1 | -1,
): Vane {
  const reach = reachAround(flatten(outline, READING), centre);
  const step = (2 * Math.PI) / RAYS;
  const over = Array.from(reach, (r) => r > cutoutRadius);
  if (!over.includes(true)) {
    throw new DrawingError(
      'Nothing of the outline reaches over the cut-out: check centre and cut-out radius.',
    );
  }
  if (!over.includes(false)) {
    throw new DrawingError(
      'The outline reaches over the cut-out all round: check centre and cut-out radius.',
    );
  }
  // The longest run of rays that meet the blade.
  const start = over.indexOf(false);
  let best = { from: 0, count: 0 };
  let run = { from: 0, count: 0 };
  for (let i = 1; i <= RAYS; i++) {
    const ray = (start + i) % RAYS;
    if (over[ray]) {
      run = run.count === 0 ? { from: start + i, count: 1 } : { ...run, count: run.count + 1 };
      if (run.count > best.count) best = run;
    } else run = { from: 0, count: 0 };
  }
  const sector = (best.count - 1) * step;
  if (sector < NARROWEST) {
    throw new DrawingError(
      'No blade of at least 15° is left over the cut-out: check centre and cut-out radius.',
    );
  }
  const last = best.from + best.count - 1;
  const radius = Float64Array.from({ length: BLADE_STEPS + 1 }, (_, i) => {
    const behind = ((best.count - 1) * i) / BLADE_STEPS;
    const at = direction > 0 ? last - behind : best.from + behind;
    const low = Math.floor(at);
    const share = at - low;
    const value = (ray: number): number => reach[((ray % RAYS) + RAYS) % RAYS]!;
    return value(low) + (share > 0 ? share * (value(low + 1) - value(low)) : 0);
  });
  return { blade: { sector, radius }, leading: (direction > 0 ? last : best.from) * step };
}

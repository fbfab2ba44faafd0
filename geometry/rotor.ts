import { bladeSlope, type Blade } from './blade';
import { fitArcs, type CurveSamples } from './fit-arcs';
import { flatten } from './flatten';
import type { Circle, Path, Vertex } from './outline';
import { arcVertices, polar } from './polar';
import { CURVE_READING, FIT_AT_SAMPLES } from './tolerances';

function turnVertex({ x, y, bulge }: Vertex, angle: number): Vertex {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  return { x: x * cos - y * sin, y: x * sin + y * cos, bulge };
}

export interface RotorOutline {
  readonly outside: Path;
  readonly holes: readonly Circle[];
  /** Largest distance of the arcs from the samples of the solved curve, mm. */
  readonly fitDeviation: number;
}

/** Samples of the outer curve in plan, counter-clockwise: from the trailing to the leading edge. */
function curveInPlan(blade: Blade): CurveSamples {
  const count = blade.radius.length;
  const slope = bladeSlope(blade);
  const x = new Float64Array(count);
  const y = new Float64Array(count);
  const tx = new Float64Array(count);
  const ty = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    const i = count - 1 - k;
    const r = blade.radius[i]!;
    const dr = slope[i]!;
    const phi = (blade.sector * i) / (count - 1);
    const cos = Math.cos(phi);
    const sin = Math.sin(phi);
    const length = Math.hypot(r, dr);
    x[k] = r * cos;
    y[k] = -r * sin;
    tx[k] = (r * sin - dr * cos) / length;
    ty[k] = (r * cos + dr * sin) / length;
  }
  return { x, y, tx, ty };
}

/**
 * The rotor plate at mesh angle 0: leading edge along +x, blade behind it, hub all round.
 *
 * @param lobes equal blades, evenly round the shaft
 * @param blade radius over the hub radius everywhere, mm
 * @param hubRadius mm
 * @param shaftDiameter mm
 */
export function rotorOutline(
  blade: Blade,
  hubRadius: number,
  shaftDiameter: number,
  lobes: 1 | 2,
): RotorOutline {
  const fitted = fitArcs(curveInPlan(blade), FIT_AT_SAMPLES);
  const tip: Vertex = { x: blade.radius[0]!, y: 0, bulge: 0 };
  const pitch = (2 * Math.PI) / lobes;
  const hub = arcVertices(hubRadius, 0, pitch - blade.sector);
  const root: Vertex = { ...polar(hubRadius, -blade.sector), bulge: 0 };
  const lobe = [...fitted.vertices, tip, ...hub];
  // From the first lobe round to the next one's trailing edge; the last closes at the first's.
  const vertices: Vertex[] =
    lobes === 1
      ? [...lobe, root]
      : [...lobe, turnVertex(root, Math.PI), ...lobe.map((v) => turnVertex(v, Math.PI)), root];
  return {
    outside: { kind: 'path', vertices },
    holes: [{ kind: 'circle', x: 0, y: 0, radius: shaftDiameter / 2 }],
    fitDeviation: fitted.deviation,
  };
}

/**
 * The blade read back from a finished rotor outline, by its chords.
 * @param sector rad, of the blade
 */
export function bladeOf(outside: Path, sector: number, steps: number): Blade {
  const flat = flatten(outside, CURVE_READING);
  const radius = new Float64Array(steps + 1);
  // The outline begins with the outer curve, from the trailing edge to the leading.
  let i = 0;
  const phiAt = (k: number): number => {
    const phi = -Math.atan2(flat[k + 1]!, flat[k]!);
    return phi < -1e-9 ? phi + 2 * Math.PI : Math.max(phi, 0);
  };
  for (let s = steps; s >= 0; s--) {
    const phi = (sector * s) / steps;
    while (i + 2 < flat.length - 2 && phiAt(i + 2) > phi + 1e-12) i += 2;
    const [ax, ay, bx, by] = [flat[i]!, flat[i + 1]!, flat[i + 2]!, flat[i + 3]!];
    // The ray at −φ against the chord.
    const ray = polar(1, -phi);
    const cross = ray.x * (by - ay) - ray.y * (bx - ax);
    radius[s] =
      Math.abs(cross) < 1e-12 ? Math.hypot(ax, ay) : (ax * (by - ay) - ay * (bx - ax)) / cross;
  }
  return { sector, radius };
}

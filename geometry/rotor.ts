import { fitArcs, type CurveSamples } from './fit-arcs';
import type { Circle, Path, Vertex } from './outline';
import { arcVertices, polar } from './polar';
import type { RotorCurve } from './rotor-curve';
import { FIT_AT_SAMPLES } from './tolerances';

export interface RotorOutline {
  readonly outside: Path;
  readonly holes: readonly Circle[];
  /** Largest distance of the arcs from the samples of the solved curve, mm. */
  readonly fitDeviation: number;
}

/** Samples of the outer curve in plan, counter-clockwise: from the trailing to the leading edge. */
function curveInPlan(curve: RotorCurve): CurveSamples {
  const count = curve.phi.length;
  const x = new Float64Array(count);
  const y = new Float64Array(count);
  const tx = new Float64Array(count);
  const ty = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    const i = count - 1 - k;
    const r = curve.radius[i]!;
    const dr = curve.slope[i]!;
    const cos = Math.cos(curve.phi[i]!);
    const sin = Math.sin(curve.phi[i]!);
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
 * @param curve radius over the hub radius everywhere, mm
 * @param hubRadius mm
 * @param shaftDiameter mm
 */
export function rotorOutline(
  curve: RotorCurve,
  hubRadius: number,
  shaftDiameter: number,
): RotorOutline {
  const last = curve.phi.length - 1;
  const travel = curve.phi[last]!;
  const fitted = fitArcs(curveInPlan(curve), FIT_AT_SAMPLES);
  const tip: Vertex = { x: curve.radius[0]!, y: 0, bulge: 0 };
  const hub = arcVertices(hubRadius, 0, 2 * Math.PI - travel);
  const root: Vertex = { ...polar(hubRadius, -travel), bulge: 0 };
  return {
    outside: { kind: 'path', vertices: [...fitted.vertices, tip, ...hub, root] },
    holes: [{ kind: 'circle', x: 0, y: 0, radius: shaftDiameter / 2 }],
    fitDeviation: fitted.deviation,
  };
}

/** Slots that divide a rotor plate into segments, to be bent for trimming the law. */

import { arcOf, type Path, type Point, type Vertex } from '../outline';

/** A radial slot, open at the outer edge, with a round bottom. */
export interface Slot {
  /** Bearing of its middle, rad. */
  readonly angle: number;
  /** mm */
  readonly width: number;
  /** Where its straight flanks end, mm from the shaft. */
  readonly bottom: number;
}

interface Cut {
  readonly side: number;
  readonly along: number;
  /** Distance along the slot's own axis. */
  readonly x: number;
}

/** Crossings of one side with the line a distance across the slot's axis, as fraction and x. */
function crossings(a: Vertex, b: Vertex, cos: number, sin: number, across: number): Cut[] {
  const toFrame = ({ x, y }: Point): Point => ({ x: x * cos + y * sin, y: y * cos - x * sin });
  const from = toFrame(a);
  const to = toFrame(b);
  if (a.bulge === 0) {
    if (from.y === to.y) return [];
    const along = (across - from.y) / (to.y - from.y);
    return [{ side: 0, along, x: from.x + (to.x - from.x) * along }];
  }
  const arc = arcOf(from, to, a.bulge);
  const rise = arc.radius ** 2 - (across - arc.centre.y) ** 2;
  if (rise < 0) return [];
  return [1, -1].map((sign) => {
    const x = arc.centre.x + sign * Math.sqrt(rise);
    const turned = Math.atan2(across - arc.centre.y, x - arc.centre.x) - arc.startAngle;
    const whole = 2 * Math.PI;
    const ahead = (((Math.sign(arc.sweep) * turned) % whole) + whole) % whole;
    return { side: 0, along: ahead / Math.abs(arc.sweep), x };
  });
}

function outermost(vertices: readonly Vertex[], slot: Slot, across: number): Cut | null {
  const cos = Math.cos(slot.angle);
  const sin = Math.sin(slot.angle);
  let best: Cut | null = null;
  vertices.forEach((a, side) => {
    const b = vertices[(side + 1) % vertices.length]!;
    for (const cut of crossings(a, b, cos, sin, across)) {
      if (cut.along < 0 || cut.along > 1 || cut.x <= (best?.x ?? 0)) continue;
      best = { ...cut, side };
    }
  });
  return best;
}

/**
 * The outline with a slot let in.
 * @returns null where the slot doesn't meet the outer edge with both flanks above its bottom
 */
export function withSlot(outline: Path, slot: Slot): Path | null {
  const { vertices } = outline;
  const half = slot.width / 2;
  const first = outermost(vertices, slot, -half);
  const last = outermost(vertices, slot, half);
  if (!first || !last || Math.min(first.x, last.x) <= slot.bottom) return null;
  if (last.side < first.side) return null;
  const cos = Math.cos(slot.angle);
  const sin = Math.sin(slot.angle);
  const at = (x: number, y: number, bulge: number): Vertex => ({
    x: x * cos - y * sin,
    y: x * sin + y * cos,
    bulge,
  });
  const part = (bulge: number, share: number): number => Math.tan(Math.atan(bulge) * share);
  const entered = vertices[first.side]!;
  const left = vertices[last.side]!;
  return {
    kind: 'path',
    vertices: [
      ...vertices.slice(0, first.side),
      { ...entered, bulge: part(entered.bulge, first.along) },
      at(first.x, -half, 0),
      at(slot.bottom, -half, -1),
      at(slot.bottom, half, 0),
      at(last.x, half, part(left.bulge, 1 - last.along)),
      ...vertices.slice(last.side + 1),
    ],
  };
}

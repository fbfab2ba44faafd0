/**
 * Closed contours of lines and circular arcs: the one form in which plates are held. Files,
 * floor, 3D, areas and the back-check all walk the same contour.
 */

export interface Point {
  readonly x: number;
  readonly y: number;
}

/**
 * A corner of a closed path, mm. `bulge` belongs to the side that starts here:
 * tan(included angle / 4), positive turning counter-clockwise, 0 for a straight side
 * (DXF reference, LWPOLYLINE group code 42).
 */
export interface Vertex extends Point {
  readonly bulge: number;
}

export interface Path {
  readonly kind: 'path';
  /** Counter-clockwise; the last vertex joins the first. */
  readonly vertices: readonly Vertex[];
}

export interface Circle extends Point {
  readonly kind: 'circle';
  readonly radius: number;
}

export type Contour = Path | Circle;

/** What a walk tells its sink. Angles in rad; `sweep` is signed, counter-clockwise positive. */
export interface OutlineSink {
  move(x: number, y: number): void;
  line(x: number, y: number): void;
  arc(
    x: number,
    y: number,
    centre: Point,
    radius: number,
    startAngle: number,
    sweep: number,
  ): void;
  circle(x: number, y: number, radius: number): void;
  close(): void;
}

export interface Arc {
  readonly centre: Point;
  readonly radius: number;
  readonly startAngle: number;
  readonly sweep: number;
}

/** The arc from a to b with the given bulge (not 0). */
export function arcOf(a: Point, b: Point, bulge: number): Arc {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  // Half the chord over the tangent of half the included angle, along the chord's left normal.
  const offset = (1 - bulge * bulge) / (4 * bulge);
  const centre = { x: (a.x + b.x) / 2 - dy * offset, y: (a.y + b.y) / 2 + dx * offset };
  return {
    centre,
    radius: (Math.hypot(dx, dy) * (1 + bulge * bulge)) / (4 * Math.abs(bulge)),
    startAngle: Math.atan2(a.y - centre.y, a.x - centre.x),
    sweep: 4 * Math.atan(bulge),
  };
}

/** Walks a contour once, side by side, into any sink. */
export function walk(contour: Contour, sink: OutlineSink): void {
  if (contour.kind === 'circle') {
    sink.circle(contour.x, contour.y, contour.radius);
    return;
  }
  const { vertices } = contour;
  const first = vertices[0];
  if (!first) return;
  sink.move(first.x, first.y);
  for (let i = 0; i < vertices.length; i++) {
    const a = vertices[i]!;
    const b = vertices[(i + 1) % vertices.length]!;
    if (a.bulge === 0) {
      sink.line(b.x, b.y);
    } else {
      const arc = arcOf(a, b, a.bulge);
      sink.arc(b.x, b.y, arc.centre, arc.radius, arc.startAngle, arc.sweep);
    }
  }
  sink.close();
}

import { ExtrudeGeometry, Path as ThreePath, Shape } from 'three';
import type { Contour, OutlineSink, Plate, Point } from '@/geometry';
import { walk } from '@/geometry/outline';

/** Largest distance of a chord from its arc, as a share of the plate's reach: below a pixel. */
const CHORD_SHARE = 0.002;
/** A small hole still looks round with this turn for each chord. */
const LARGEST_STEP = Math.PI / 8;

/** Draws a contour into a path of three, arcs as short chords. Coordinates stay in mm, y up. */
class ChordSink implements OutlineSink {
  constructor(
    readonly path: ThreePath,
    /** mm. */
    readonly deviation: number,
  ) {}

  move(x: number, y: number): void {
    this.path.moveTo(x, y);
  }

  line(x: number, y: number): void {
    this.path.lineTo(x, y);
  }

  arc(
    x: number,
    y: number,
    centre: Point,
    radius: number,
    startAngle: number,
    sweep: number,
  ): void {
    const cosine = Math.max(-1, 1 - this.deviation / radius);
    const step = Math.min(LARGEST_STEP, 2 * Math.acos(cosine));
    const steps = Math.max(1, Math.ceil(Math.abs(sweep) / step));
    for (let i = 1; i < steps; i++) {
      const angle = startAngle + (sweep * i) / steps;
      this.path.lineTo(
        centre.x + radius * Math.cos(angle),
        centre.y + radius * Math.sin(angle),
      );
    }
    this.path.lineTo(x, y);
  }

  circle(x: number, y: number, radius: number): void {
    this.path.moveTo(x + radius, y);
    this.arc(x + radius, y, { x, y }, radius, 0, 2 * Math.PI);
  }

  close(): void {
    this.path.closePath();
  }
}

function drawn<P extends ThreePath>(contour: Contour, path: P, deviation: number): P {
  walk(contour, new ChordSink(path, deviation));
  return path;
}

function reach(contour: Contour): number {
  if (contour.kind === 'circle') return Math.hypot(contour.x, contour.y) + contour.radius;
  return contour.vertices.reduce((most, { x, y }) => Math.max(most, Math.hypot(x, y)), 0);
}

/** One plate as a body with its middle at z = 0, mm. The caller disposes of it. */
export function plateGeometry({ outside, holes, thickness }: Plate): ExtrudeGeometry {
  const deviation = CHORD_SHARE * reach(outside);
  const shape = drawn(outside, new Shape(), deviation);
  shape.holes = holes.map((hole) => drawn(hole, new ThreePath(), deviation));
  const geometry = new ExtrudeGeometry(shape, {
    depth: thickness,
    bevelEnabled: false,
    curveSegments: 1,
  });
  return geometry.translate(0, 0, -thickness / 2);
}

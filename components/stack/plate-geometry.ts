import { ExtrudeGeometry, Path as ThreePath, Shape } from 'three';
import type { Contour, OutlineSink, Plate, Point } from '@/geometry';
import { walk } from '@/geometry/outline';

/** Arcs are drawn as chords of at most this turn: enough for light and shade, and few triangles. */
const LARGEST_STEP = Math.PI / 48;

/** Draws a contour into a path of three, arcs as short chords. Coordinates stay in mm, y up. */
class ChordSink implements OutlineSink {
  constructor(readonly path: ThreePath) {}

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
    const steps = Math.max(1, Math.ceil(Math.abs(sweep) / LARGEST_STEP));
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

function drawn<P extends ThreePath>(contour: Contour, path: P): P {
  walk(contour, new ChordSink(path));
  return path;
}

/** One plate as a body with its middle at z = 0, mm. The caller disposes of it. */
export function plateGeometry({ outside, holes, thickness }: Plate): ExtrudeGeometry {
  const shape = drawn(outside, new Shape());
  shape.holes = holes.map((hole) => drawn(hole, new ThreePath()));
  const geometry = new ExtrudeGeometry(shape, {
    depth: thickness,
    bevelEnabled: false,
    curveSegments: 1,
  });
  return geometry.translate(0, 0, -thickness / 2);
}

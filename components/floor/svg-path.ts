import { walk, type Contour, type OutlineSink, type Point } from '@/geometry/outline';

/** 0.1 µm: far below a pixel on any screen, and it keeps the path text short. */
const DECIMALS = 4;

const write = (value: number): string => String(Number(value.toFixed(DECIMALS)));

/**
 * Collects SVG path data with true arcs, mm, y up as in the kernel: draw it inside a group with
 * `scale(1 -1)`. The arc flags need no change for that, since they follow the path's own axes.
 */
export class SvgPathSink implements OutlineSink {
  #data = '';

  move(x: number, y: number): void {
    this.#data += `M${write(x)} ${write(y)}`;
  }

  line(x: number, y: number): void {
    this.#data += `L${write(x)} ${write(y)}`;
  }

  arc(
    x: number,
    y: number,
    centre: Point,
    radius: number,
    startAngle: number,
    sweep: number,
  ): void {
    // SVG finds the centre from the chord, which is ill-conditioned near a whole turn: an arc of
    // more than a half turn is drawn as two.
    if (Math.abs(sweep) > Math.PI) {
      const middle = startAngle + sweep / 2;
      this.#half(
        centre.x + radius * Math.cos(middle),
        centre.y + radius * Math.sin(middle),
        radius,
        sweep,
      );
    }
    this.#half(x, y, radius, sweep);
  }

  circle(x: number, y: number, radius: number): void {
    this.move(x + radius, y);
    this.#half(x - radius, y, radius, 1);
    this.#half(x + radius, y, radius, 1);
    this.close();
  }

  close(): void {
    this.#data += 'Z';
  }

  /** An arc of a half turn at most. */
  #half(x: number, y: number, radius: number, sweep: number): void {
    const r = write(radius);
    this.#data += `A${r} ${r} 0 0 ${sweep > 0 ? 1 : 0} ${write(x)} ${write(y)}`;
  }

  toString(): string {
    return this.#data;
  }
}

/** Path data of all contours together; fill it with the even-odd rule to keep holes open. */
export function svgPath(contours: readonly Contour[]): string {
  const sink = new SvgPathSink();
  for (const contour of contours) walk(contour, sink);
  return sink.toString();
}

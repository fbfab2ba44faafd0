import type { Point, Vertex } from './outline';

/** Point at a radius (mm) and an angle from +x, counter-clockwise (rad). */
export function polar(radius: number, angle: number): Point {
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

/**
 * Start points of the arcs from one angle to another about the shaft, none over half a turn.
 * The end point is not among them.
 */
export function arcVertices(radius: number, from: number, sweep: number): Vertex[] {
  const pieces = Math.max(1, Math.ceil(Math.abs(sweep) / Math.PI - 1e-12));
  const step = sweep / pieces;
  return Array.from({ length: pieces }, (_, i) => ({
    ...polar(radius, from + i * step),
    bulge: Math.tan(step / 4),
  }));
}

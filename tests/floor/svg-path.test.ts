import { describe, expect, it } from 'vitest';
import { arcOf, type Circle, type Path, type Vertex } from '@/geometry/outline';
import { svgPath } from '@/components/floor/svg-path';

const path = (...vertices: [number, number, number?][]): Path => ({
  kind: 'path',
  vertices: vertices.map(([x, y, bulge = 0]): Vertex => ({ x, y, bulge })),
});

/** End points and flags of every arc in path data, read independently of the sink. */
function arcsIn(data: string) {
  return [...data.matchAll(/A(\S+) (\S+) 0 ([01]) ([01]) (\S+?) ([-\d.e]+)/g)].map((m) => ({
    radius: Number(m[1]),
    large: m[3],
    sweep: m[4],
    x: Number(m[5]),
    y: Number(m[6]),
  }));
}

describe('svg path', () => {
  it('writes straight sides and closes', () => {
    expect(svgPath([path([0, 0], [10, 0], [10, 5])])).toBe('M0 0L10 0L10 5L0 0Z');
  });

  it('writes a quarter turn as one true arc, with its direction', () => {
    const bulge = Math.tan(Math.PI / 8);
    const left = svgPath([path([10, 0, bulge], [0, 10], [0, 0])]);
    expect(left).toBe('M10 0A10 10 0 0 1 0 10L0 0L10 0Z');
    const right = svgPath([path([0, 10, -bulge], [10, 0], [0, 0])]);
    expect(right).toBe('M0 10A10 10 0 0 0 10 0L0 0L0 10Z');
  });

  it('parts an arc beyond a half turn at a point of that arc', () => {
    const sweep = (340 * Math.PI) / 180;
    const bulge = Math.tan(sweep / 4);
    const a = { x: 10 * Math.cos(0.2), y: 10 * Math.sin(0.2) };
    const b = { x: 10 * Math.cos(0.2 + sweep), y: 10 * Math.sin(0.2 + sweep) };
    expect(arcOf(a, b, bulge).radius).toBeCloseTo(10, 9);
    const arcs = arcsIn(svgPath([path([a.x, a.y, bulge], [b.x, b.y])]));
    expect(arcs).toHaveLength(2);
    for (const arc of arcs) {
      expect(arc).toMatchObject({ large: '0', sweep: '1' });
      expect(Math.hypot(arc.x, arc.y)).toBeCloseTo(10, 3);
    }
    expect(arcs[0]!.x).toBeCloseTo(10 * Math.cos(0.2 + sweep / 2), 3);
    expect(arcs[1]!.y).toBeCloseTo(b.y, 3);
  });

  it('writes a circle as two half turns that meet', () => {
    const hole: Circle = { kind: 'circle', x: 3, y: -4, radius: 1.5 };
    expect(svgPath([hole])).toBe('M4.5 -4A1.5 1.5 0 0 1 1.5 -4A1.5 1.5 0 0 1 4.5 -4Z');
  });

  it('puts holes behind the outside in one path', () => {
    const data = svgPath([
      path([0, 0], [9, 0], [9, 9]),
      { kind: 'circle', x: 5, y: 3, radius: 1 },
    ]);
    expect(data.match(/M/g)).toHaveLength(2);
    expect(data.match(/Z/g)).toHaveLength(2);
    expect(data.startsWith('M0 0L9 0')).toBe(true);
  });
});

/** Reads a printed dial back from its SVG, as a ruler and a protractor would. */

interface Spot {
  readonly x: number;
  readonly y: number;
}

export interface PrintedDial {
  readonly svg: string;
  /** mm */
  readonly width: number;
  readonly height: number;
  readonly viewWidth: number;
  readonly viewHeight: number;
}

export function readDial(svg: string): PrintedDial {
  const found = /width="([\d.]+)mm" height="([\d.]+)mm" viewBox="0 0 ([\d.]+) ([\d.]+)"/.exec(
    svg,
  )!;
  const [width, height, viewWidth, viewHeight] = found.slice(1).map(Number) as [
    number,
    number,
    number,
    number,
  ];
  return { svg, width, height, viewWidth, viewHeight };
}

/** Straight strokes, without dashed ones. */
export function strokesOf({ svg }: PrintedDial): { from: Spot; to: Spot; width: number }[] {
  const line =
    /<path d="M([-\d.]+) ([-\d.]+)L([-\d.]+) ([-\d.]+)" fill="none" stroke="#000" stroke-width="([\d.]+)"\/>/g;
  return [...svg.matchAll(line)].map((found) => {
    const [x1, y1, x2, y2, width] = found.slice(1).map(Number) as [
      number,
      number,
      number,
      number,
      number,
    ];
    return { from: { x: x1, y: y1 }, to: { x: x2, y: y2 }, width };
  });
}

/** The middle of the first circle, which is the dial's edge; a straight scale has none. */
function axisOf({ svg }: PrintedDial): Spot {
  const circle = /<path d="M([\d.]+) ([\d.]+)a([\d.]+) /.exec(svg);
  if (!circle) return { x: 0, y: 0 };
  const [x, y, r] = circle.slice(1).map(Number) as [number, number, number];
  return { x: x + r, y };
}

const bearing = (axis: Spot, { x, y }: Spot): number => Math.atan2(x - axis.x, axis.y - y);

/** Bearings of the marks of a round dial, rad clockwise from the top, rising. */
export function bearingsOf(dial: PrintedDial, radius: number): number[] {
  const axis = axisOf(dial);
  return strokesOf(dial)
    .filter(
      ({ from }) =>
        Math.abs(Math.hypot(from.x - axis.x, from.y - axis.y) - (radius - 1)) < 1e-3,
    )
    .map(({ from, to }) => {
      // A mark points at the axis.
      const [outer, inner] = [bearing(axis, from), bearing(axis, to)];
      if (Math.abs(outer - inner) > 1e-4) throw new Error(`a mark at ${outer} rad is askew`);
      return outer;
    })
    .sort((a, b) => a - b);
}

export interface PrintedNumber extends Spot {
  readonly text: string;
  readonly value: number;
  /** Clockwise from the top, rad. */
  readonly bearing: number;
  /** Of the lettering, rad. */
  readonly turn: number;
  /** Of capitals, mm. */
  readonly height: number;
}

/** Numbers by bearing; x and y are the middle of each. */
export function numbersOf(dial: PrintedDial): PrintedNumber[] {
  const axis = axisOf(dial);
  const number =
    /<text x="([-\d.]+)" y="([-\d.]+)" font-size="([\d.]+)" text-anchor="middle"(?: transform="rotate\(([-\d.]+) [^)]*\)")?>([\d.]+)<\/text>/g;
  return [...dial.svg.matchAll(number)]
    .map(([, x, y, size, degrees, text]) => {
      // Capitals of the face are 0.686 of its size.
      const height = Number(size) * 0.686;
      const turn = (Number(degrees ?? 0) * Math.PI) / 180;
      const spot = {
        x: Number(x) + (Math.sin(turn) * height) / 2,
        y: Number(y) - (Math.cos(turn) * height) / 2,
      };
      const at = bearing(axis, spot);
      return { ...spot, text: text!, value: Number(text), bearing: at, turn, height };
    })
    .sort((a, b) => a.bearing - b.bearing);
}

/** A rectangle on paper, turned about its middle. mm, rad */
export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly turn: number;
}

type Axis = readonly [x: number, y: number];

const axesOf = ({ turn }: Box): readonly [Axis, Axis] => [
  [Math.cos(turn), Math.sin(turn)],
  [-Math.sin(turn), Math.cos(turn)],
];

/** How far a box reaches from its middle along an axis. */
function reach(box: Box, [x, y]: Axis): number {
  const [wide, high] = axesOf(box);
  return (
    (box.width / 2) * Math.abs(wide[0] * x + wide[1] * y) +
    (box.height / 2) * Math.abs(high[0] * x + high[1] * y)
  );
}

/** Two boxes are clear of each other if they are so along a side of one of them. */
export function overlaps(a: Box, b: Box): boolean {
  return [...axesOf(a), ...axesOf(b)].every(
    (axis) =>
      Math.abs((b.x - a.x) * axis[0] + (b.y - a.y) * axis[1]) < reach(a, axis) + reach(b, axis),
  );
}

/**
 * A closed polygon with fewer corners: those between which it runs straight within `tolerance` are
 * left out. A curve with fine waves is fitted by very many arcs, which what lies some gaps away
 * doesn't see.
 * @param polygon x, y, x, y, …, mm
 * @param tolerance mm
 */
export function coarsePolygon(polygon: readonly number[], tolerance: number): number[] {
  const count = polygon.length / 2;
  const coarse: number[] = [];
  const straight = (from: number, to: number): boolean => {
    const ax = polygon[2 * from]!;
    const ay = polygon[2 * from + 1]!;
    const end = 2 * (to % count);
    const dx = polygon[end]! - ax;
    const dy = polygon[end + 1]! - ay;
    const length = Math.hypot(dx, dy);
    for (let k = from + 1; k < to; k++) {
      const x = polygon[2 * k]! - ax;
      const y = polygon[2 * k + 1]! - ay;
      const along = x * dx + y * dy;
      if (along < 0 || along > length * length) return false;
      if (Math.abs(x * dy - y * dx) > tolerance * length) return false;
    }
    return true;
  };
  for (let from = 0; from < count;) {
    coarse.push(polygon[2 * from]!, polygon[2 * from + 1]!);
    let to = from + 1;
    while (to < count && straight(from, to + 1)) to += 1;
    from = to;
  }
  return coarse;
}

/**
 * The value at an angle between samples, on the straight line between its neighbours; outside the
 * samples it is the nearest one.
 * A sample may have no value, null.
 * @param angles rising, at least one, as many as there are values.
 */
export function valueAt<V extends number | null>(
  angles: readonly number[],
  values: readonly V[],
  angle: number,
): V {
  const last = angles.length - 1;
  if (last < 0 || values.length !== angles.length) {
    throw new RangeError(
      `invalid samples: ${angles.length} angles and ${values.length} values`,
    );
  }
  if (angle <= angles[0]!) return values[0]!;
  if (angle >= angles[last]!) return values[last]!;
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (angles[middle]! <= angle) low = middle;
    else high = middle;
  }
  const before = values[low]!;
  const after = values[high]!;
  // Beside a sample without a value there is none either.
  if (before === null || after === null) return null as V;
  const part = (angle - angles[low]!) / (angles[high]! - angles[low]!);
  return (before + part * (after - before)) as V;
}

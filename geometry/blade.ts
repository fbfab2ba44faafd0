/** The rotor blade's outer curve, sampled evenly by the angle φ behind the leading edge. */

export interface Blade {
  /** Angle from the leading to the trailing edge, rad. */
  readonly sector: number;
  /** mm, from φ = 0 to φ = sector. */
  readonly radius: Float64Array;
}

/** Radius at an angle behind the leading edge; at the nearest edge beyond either. */
export function bladeRadius({ sector, radius }: Blade, phi: number): number {
  const last = radius.length - 1;
  const position = Math.min(Math.max((phi / sector) * last, 0), last);
  const i = Math.min(Math.floor(position), last - 1);
  return radius[i]! + (radius[i + 1]! - radius[i]!) * (position - i);
}

/** dr/dφ at every sample, mm/rad: central differences of fourth order, one-sided at the ends. */
export function bladeSlope({ sector, radius: r }: Blade): Float64Array {
  const last = r.length - 1;
  const step = sector / last;
  return Float64Array.from(r, (_, i) => {
    if (i === 0) return (-3 * r[0]! + 4 * r[1]! - r[2]!) / (2 * step);
    if (i === last) return (3 * r[last]! - 4 * r[last - 1]! + r[last - 2]!) / (2 * step);
    if (i === 1 || i === last - 1) return (r[i + 1]! - r[i - 1]!) / (2 * step);
    return (8 * (r[i + 1]! - r[i - 1]!) - (r[i + 2]! - r[i - 2]!)) / (12 * step);
  });
}

export function longestRadius({ radius }: Blade): number {
  return radius.reduce((a, b) => Math.max(a, b), 0);
}

export function shortestRadius({ radius }: Blade): number {
  return radius.reduce((a, b) => Math.min(a, b), Infinity);
}

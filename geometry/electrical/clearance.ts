/**
 * Clearances in air of IEC 60664-1:2020 for steady peak voltages, and its altitude factors (tables
 * published, read second-hand in a transcription: confirm them before they are quoted). Between listed values the clearance is taken on a straight
 * line, which the standard allows. Square cut edges make the field inhomogeneous.
 */

export type FieldKind = 'inhomogeneous' | 'homogeneous';

/** Peak voltage, V; clearance in an inhomogeneous and in a homogeneous field, mm. */
const rows: readonly (readonly [number, number, number])[] = [
  [500, 0.04, 0.04],
  [800, 0.13, 0.1],
  [1000, 0.26, 0.15],
  [1200, 0.42, 0.2],
  [1500, 0.76, 0.3],
  [2000, 1.27, 0.45],
  [2500, 1.8, 0.6],
  [3000, 2.4, 0.8],
  [4000, 3.8, 1.2],
  [5000, 5.7, 1.5],
  [6000, 7.9, 2],
  [8000, 11, 3],
  [10000, 15.2, 3.5],
];

/** Altitude, m; factor on the clearance. */
const altitudes: readonly (readonly [number, number])[] = [
  [2000, 1],
  [3000, 1.14],
  [4000, 1.29],
  [5000, 1.48],
  [6000, 1.7],
  [7000, 1.95],
  [8000, 2.25],
  [9000, 2.62],
  [10000, 3.02],
];

function between(x: number, points: readonly (readonly [number, number])[]): number {
  const after = points.findIndex(([at]) => at >= x);
  if (after === 0) return points[0]![1];
  const [[x0, y0], [x1, y1]] = [points[after - 1]!, points[after]!] as const;
  return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
}

/** Factor on clearances at an altitude (mm); 1 up to 2000 m, null above 10 000 m. */
export function altitudeFactor(altitude: number): number | null {
  const metres = altitude / 1000;
  return metres > altitudes.at(-1)![0] ? null : between(metres, altitudes);
}

/**
 * Largest peak voltage for which a gap is as large as the clearance.
 * @param gap mm @param altitude mm above sea level
 * @returns V; null below the table's smallest clearance or above its altitudes
 */
export function clearanceVoltage(gap: number, field: FieldKind, altitude = 0): number | null {
  const factor = altitudeFactor(altitude);
  if (factor === null) return null;
  const column = rows.map(
    ([voltage, inhomogeneous, homogeneous]) =>
      [field === 'inhomogeneous' ? inhomogeneous : homogeneous, voltage] as const,
  );
  const wanted = gap / factor;
  if (wanted < column[0]![0]) return null;
  return wanted >= column.at(-1)![0] ? column.at(-1)![1] : between(wanted, column);
}

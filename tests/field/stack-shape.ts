/**
 * What the reference is solved for: an endless stack of alternating plates, seen in polar
 * coordinates about the shaft. Lengths in mm, angles in rad.
 */
export interface StackShape {
  /** Rotor face to stator face. */
  gap: number;
  rotorThickness: number;
  statorThickness: number;
  /** Shaft and rotor spacers: a cylinder over the whole height at the rotor's potential. */
  shaftRadius: number;
  hubRadius: number;
  /** The stator's cut-out round the shaft. */
  cutoutRadius: number;
  travel: number;
  /** The rotor's radius behind its leading edge. */
  rotor: RotorOutline;
  stator: StatorOutline;
  /** Both radial edges of the stator moved parallel into it, mm. */
  edgeOffset: number;
  posts?: Posts;
}

/** Round posts at the stator's potential, over the height of the stack. */
export interface Posts {
  radius: number;
  /** Their distance from the shaft. */
  at: number;
  /** Their angles from the stator's first edge. */
  angles: number[];
}

export type RotorOutline =
  | { form: 'arc'; radius: number }
  /** C from 1 to `ratio`, dC/dθ ∝ C^1.5, the radius `radius` at the trailing end. */
  | { form: 'frequency'; radius: number; ratio: number };

export type StatorOutline =
  | { form: 'arc'; radius: number }
  /** The rotor's own outline at full mesh, this much further out. */
  | { form: 'follows'; overhang: number };

/** Rotor radius at angle φ behind the leading edge, 0 … travel. */
export function rotorRadius(shape: StackShape, phi: number): number {
  const { rotor, cutoutRadius, travel } = shape;
  if (rotor.form === 'arc') return rotor.radius;
  // C = (A − Bφ)⁻² with A = 1; the swept area's slope goes with C^1.5.
  const b = (1 - 1 / Math.sqrt(rotor.ratio)) / travel;
  const rise = ((1 - b * phi) * Math.sqrt(rotor.ratio)) ** -3;
  return Math.sqrt(cutoutRadius ** 2 + (rotor.radius ** 2 - cutoutRadius ** 2) * rise);
}

/** Stator radius at angle ψ from its first edge, 0 … travel. */
export function statorRadius(shape: StackShape, psi: number): number {
  const { stator, travel } = shape;
  if (stator.form === 'arc') return stator.radius;
  return rotorRadius(shape, Math.min(travel, Math.max(0, travel - psi))) + stator.overhang;
}

/** The largest radius of either plate. */
export function outerRadius(shape: StackShape): number {
  return Math.max(shape.rotor.radius, statorRadius(shape, 0));
}

/** Half a period of the stack, rotor midplane to stator midplane. */
export function cellHeight(shape: StackShape): number {
  return shape.gap + (shape.rotorThickness + shape.statorThickness) / 2;
}

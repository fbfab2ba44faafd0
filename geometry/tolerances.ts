/** Every tolerance of the kernel, with its unit and its reason. */

/** mm. What the fit aims for at its samples, so that between them no point of a cut contour lies
 * further than the stated 5 µm from the solved curve. */
export const FIT_AT_SAMPLES = 0.004;

/** mm. Two arcs whose centres and radii agree this well are one arc. */
export const SAME_ARC = 1e-7;

/** mm. Sagitta of the chords in the back-check. The polygon keeps the area, so less is not needed. */
export const FLATTENING = 0.02;

/** mm. Sagitta of the chords by which a finished curve is read back. */
export const CURVE_READING = 0.001;

/** mm per clipping unit: clipper2 works on integers. */
export const CLIP_UNIT = 1e-5;

/** Bulges below this are straight sides: on a 300 mm chord the sagitta is under 1 nm. */
export const STRAIGHT = 1e-9;

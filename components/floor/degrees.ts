const PER_RADIAN = 180 / Math.PI;

/** Screens show degrees, the kernel holds radians. */
export const toDegrees = (radians: number): number => radians * PER_RADIAN;
export const toRadians = (degrees: number): number => degrees / PER_RADIAN;

/** One decimal, as the angle rule and the floor letter it: `115.0`. */
export const writeDegrees = (radians: number): string => toDegrees(radians).toFixed(1);

/** Numbers by chance from a seed: the same seed gives the same numbers everywhere. */

/** Evenly in 0 to 1: mulberry32 (32 bits of state; from memory). */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

export type Spread = 'normal' | 'even';

/**
 * Draws within ± a tolerance: evenly, or normally with the tolerance at two standard deviations
 * and nothing beyond it (G. E. P. Box and M. E. Muller, 1958).
 */
export function drawWith(random: () => number): (tolerance: number, spread: Spread) => number {
  return (tolerance, spread) => {
    if (tolerance === 0) return 0;
    if (spread === 'even') return tolerance * (2 * random() - 1);
    for (;;) {
      const radius = Math.sqrt(-2 * Math.log(1 - random()));
      const normal = radius * Math.cos(2 * Math.PI * random());
      if (Math.abs(normal) <= 2) return (tolerance * normal) / 2;
    }
  };
}

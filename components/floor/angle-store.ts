/**
 * The shaft angle that floor, angle rule, chart and 3D stack share. It is not React state: each of
 * them moves its own part through a subscription, so that all of them turn in the same frame
 * without a render.
 */
export interface AngleStore {
  /** Shaft angle, rad: 0 at the open stop, the travel at the meshed one. */
  get(): number;
  /**
   * Sets the angle, rad, held between 0 and the travel. Listeners hear of it before this returns.
   * @throws RangeError when the angle is not a number.
   */
  set(angle: number): void;
  /** Changes the travel, rad, and brings the angle back into it. */
  setTravel(travel: number): void;
  /** @returns the function that ends the subscription. */
  subscribe(listener: (angle: number) => void): () => void;
}

/** @param travel rad. @throws RangeError when the travel is not a positive number. */
export function createAngleStore(travel: number): AngleStore {
  let limit = checkedTravel(travel);
  let angle = 0;
  const listeners = new Set<(angle: number) => void>();

  function set(next: number): void {
    if (Number.isNaN(next)) throw new RangeError(`invalid shaft angle: ${next} rad`);
    const held = Math.min(limit, Math.max(0, next));
    if (held === angle) return;
    angle = held;
    for (const listener of [...listeners]) listener(angle);
  }

  return {
    get: () => angle,
    set,
    setTravel(next) {
      limit = checkedTravel(next);
      set(angle);
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

function checkedTravel(travel: number): number {
  if (!(travel > 0) || !Number.isFinite(travel)) {
    throw new RangeError(`invalid travel: ${travel} rad`);
  }
  return travel;
}

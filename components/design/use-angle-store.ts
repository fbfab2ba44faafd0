'use client';

import { useEffect, useState } from 'react';
import { createAngleStore, type AngleStore } from '@/components/floor/angle-store';
import type { Derived } from '@/geometry';

/** The angle that a freshly opened screen shows, as a share of the travel: both plates in sight. */
const OPENING = 0.6;

/** One angle store for a screen, its travel kept that of the plates shown. */
export function useAngleStore(derived: Derived | null): AngleStore {
  const travel = derived?.design.travel ?? Math.PI;
  const [store] = useState(() => {
    const created = createAngleStore(travel);
    created.set(travel * OPENING);
    return created;
  });
  useEffect(() => store.setTravel(travel), [store, travel]);
  return store;
}

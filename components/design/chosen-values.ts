'use client';

import { createContext, useMemo } from 'react';
import type { Derived } from '@/geometry';

/** What the kernel chose for parameters left empty, by key, in kernel units. */
export type ChosenValues = Readonly<Record<string, number | undefined>>;

export const ChosenContext = createContext<ChosenValues>({});

/** mm. Posts nearer than this to one circle stand on it. */
const SAME_CIRCLE = 1e-6;

/** The circle of all posts; a stator that follows its rotor has each at a distance of its own. */
function postCircle({ sections }: Derived): number | undefined {
  const radii = sections.flatMap(({ posts }) => posts.map(({ x, y }) => Math.hypot(x, y)));
  const first = radii[0];
  if (first === undefined) return undefined;
  return radii.every((radius) => Math.abs(radius - first) < SAME_CIRCLE) ? first : undefined;
}

export function chosenIn(derived: Derived, section: number): ChosenValues {
  const { travel, lawFrom, lawTo } = derived.turn;
  return {
    openRest: lawFrom,
    meshedRest: travel - lawTo,
    postCircleRadius: postCircle(derived),
    oscillatorCoil: derived.sections[section]?.inductance ?? undefined,
  };
}

const NONE: ChosenValues = {};

/** The same object until one of its values changes, so that fields are not drawn for nothing. */
export function useChosenValues(derived: Derived | null, section: number): ChosenValues {
  const { openRest, meshedRest, postCircleRadius, oscillatorCoil } = derived
    ? chosenIn(derived, section)
    : NONE;
  return useMemo(
    () => ({ openRest, meshedRest, postCircleRadius, oscillatorCoil }),
    [openRest, meshedRest, postCircleRadius, oscillatorCoil],
  );
}

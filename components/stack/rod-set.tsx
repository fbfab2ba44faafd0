'use client';

import { useMemo } from 'react';
import type { Matrix4 } from 'three';
import { BodySet } from './body-set';
import { plateGeometry } from './plate-geometry';
import type { Rod } from './rods';

function place(matrix: Matrix4, { x, y, radius, from, to }: Rod): void {
  matrix.makeScale(radius, radius, to - from).setPosition(x, y, (from + to) / 2);
}

/** Round bars along the shaft: one of radius 1 and length 1, stretched for each. */
export function RodSet({ rods, colour }: { rods: readonly Rod[]; colour: string }) {
  const geometry = useMemo(
    () =>
      plateGeometry({
        outside: { kind: 'circle', x: 0, y: 0, radius: 1 },
        holes: [],
        thickness: 1,
      }),
    [],
  );
  return <BodySet geometry={geometry} places={rods} place={place} colour={colour} />;
}

'use client';

import { useMemo } from 'react';
import type { Matrix4 } from 'three';
import type { Plate, StackPlate } from '@/geometry';
import { BodySet } from './body-set';
import { plateGeometry } from './plate-geometry';

const place = (matrix: Matrix4, { z, angle }: StackPlate): void =>
  void matrix.makeRotationZ(angle).setPosition(0, 0, z);

/** All plates of one role in one section. */
export function PlateSet({
  plate,
  places,
  colour,
}: {
  plate: Plate;
  places: readonly StackPlate[];
  colour: string;
}) {
  const geometry = useMemo(() => plateGeometry(plate), [plate]);
  return <BodySet geometry={geometry} places={places} place={place} colour={colour} />;
}

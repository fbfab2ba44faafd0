'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { Matrix4, type InstancedMesh } from 'three';
import type { Plate, StackPlate } from '@/geometry';
import { plateGeometry } from './plate-geometry';

/** All plates of one role in one section: one body, drawn once for each place. */
export function PlateSet({
  plate,
  places,
  colour,
}: {
  plate: Plate;
  places: readonly StackPlate[];
  colour: string;
}) {
  const mesh = useRef<InstancedMesh>(null);
  const invalidate = useThree((state) => state.invalidate);
  const geometry = useMemo(() => plateGeometry(plate), [plate]);
  useEffect(() => () => geometry.dispose(), [geometry]);

  useLayoutEffect(() => {
    const instances = mesh.current;
    if (!instances) return;
    const matrix = new Matrix4();
    places.forEach(({ z }, i) => instances.setMatrixAt(i, matrix.makeTranslation(0, 0, z)));
    instances.instanceMatrix.needsUpdate = true;
    instances.computeBoundingSphere();
    invalidate();
  }, [places, geometry, invalidate]);

  return (
    <instancedMesh
      key={`${geometry.uuid} ${places.length}`}
      ref={mesh}
      args={[geometry, undefined, places.length]}
      userData={{ plates: places.length }}
    >
      <meshLambertMaterial color={colour} />
    </instancedMesh>
  );
}

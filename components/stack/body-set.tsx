'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useRef } from 'react';
import { Matrix4, type BufferGeometry, type InstancedMesh } from 'three';

/**
 * One body drawn once for each place. It disposes of the geometry when it gets another.
 * @param place puts the matrix of a place into the one given
 */
export function BodySet<P>({
  geometry,
  places,
  place,
  colour,
}: {
  geometry: BufferGeometry;
  places: readonly P[];
  place: (matrix: Matrix4, at: P) => void;
  colour: string;
}) {
  const mesh = useRef<InstancedMesh>(null);
  const invalidate = useThree((state) => state.invalidate);
  useEffect(() => () => geometry.dispose(), [geometry]);

  useLayoutEffect(() => {
    const instances = mesh.current;
    if (!instances) return;
    const matrix = new Matrix4();
    places.forEach((at, i) => {
      place(matrix, at);
      instances.setMatrixAt(i, matrix);
    });
    instances.instanceMatrix.needsUpdate = true;
    instances.computeBoundingSphere();
    invalidate();
  }, [places, place, geometry, invalidate]);

  if (places.length === 0) return null;
  return (
    <instancedMesh
      key={`${geometry.uuid} ${places.length}`}
      ref={mesh}
      args={[geometry, undefined, places.length]}
    >
      <meshLambertMaterial color={colour} />
    </instancedMesh>
  );
}

'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { CylinderGeometry, Matrix4, type InstancedMesh } from 'three';
import type { Rod } from './rods';

/** Round bars along the shaft: one cylinder of radius 1 and length 1, stretched for each. */
export function RodSet({ rods, colour }: { rods: readonly Rod[]; colour: string }) {
  const mesh = useRef<InstancedMesh>(null);
  const invalidate = useThree((state) => state.invalidate);
  const geometry = useMemo(() => new CylinderGeometry(1, 1, 1, 40).rotateX(Math.PI / 2), []);
  useEffect(() => () => geometry.dispose(), [geometry]);

  useLayoutEffect(() => {
    const instances = mesh.current;
    if (!instances) return;
    const matrix = new Matrix4();
    rods.forEach(({ x, y, radius, from, to }, i) => {
      matrix.makeScale(radius, radius, to - from).setPosition(x, y, (from + to) / 2);
      instances.setMatrixAt(i, matrix);
    });
    instances.instanceMatrix.needsUpdate = true;
    instances.computeBoundingSphere();
    invalidate();
  }, [rods, geometry, invalidate]);

  if (rods.length === 0) return null;
  return (
    <instancedMesh key={rods.length} ref={mesh} args={[geometry, undefined, rods.length]}>
      <meshLambertMaterial color={colour} />
    </instancedMesh>
  );
}

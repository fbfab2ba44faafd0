'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { Matrix4, type InstancedMesh } from 'three';
import type { Body } from './bodies';
import { plateGeometry } from './plate-geometry';

/** What lies behind an end plate stays in sight. */
const SHEER = 0.32;

/** One body drawn once for each of its places. */
export function BodySet({ body: { plan, thickness, places, kind, colour } }: { body: Body }) {
  const mesh = useRef<InstancedMesh>(null);
  const invalidate = useThree((state) => state.invalidate);
  const geometry = useMemo(() => plateGeometry({ ...plan, thickness }), [plan, thickness]);
  useEffect(() => () => geometry.dispose(), [geometry]);

  useLayoutEffect(() => {
    const instances = mesh.current;
    if (!instances) return;
    const matrix = new Matrix4();
    places.forEach(({ x, y, from, to, angle }, i) => {
      instances.setMatrixAt(i, matrix.makeRotationZ(angle).setPosition(x, y, (from + to) / 2));
    });
    instances.instanceMatrix.needsUpdate = true;
    instances.computeBoundingSphere();
    invalidate();
    // Taken away, it has to go from the picture, too.
    return invalidate;
  }, [places, geometry, invalidate]);

  return (
    <instancedMesh
      key={`${geometry.uuid} ${places.length}`}
      ref={mesh}
      args={[geometry, undefined, places.length]}
    >
      {kind === 'end-plate' ? (
        <meshLambertMaterial color={colour} transparent opacity={SHEER} depthWrite={false} />
      ) : (
        <meshLambertMaterial color={colour} />
      )}
    </instancedMesh>
  );
}

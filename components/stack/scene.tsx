'use client';

import { useFrame, useThree } from '@react-three/fiber';
import { useMemo, useRef, type Ref } from 'react';
import type { Group } from 'three';
import { rotorTurn } from '@/geometry/rotor-turn';
import type { AngleStore } from '@/components/floor/angle-store';
import { useAngle } from '@/components/floor/use-angle';
import { BodySet } from './body-set';
import { Eye, type EyeHandle } from './eye';
import { stackSize } from './stack-size';
import type { Built } from './use-bodies';

/** The built capacitor, mm, shaft along z. The rotor turns with the store, by no render. */
export function Scene({
  built: { derived, bodies },
  store,
  frame,
  eye,
  onFrame,
}: {
  built: Built;
  store: AngleStore;
  /** Show end plates, pillars, bushes, stop and panel plate? */
  frame: boolean;
  eye: Ref<EyeHandle>;
  /** Told what a frame that was drawn shows: the shaft angle, rad. */
  onFrame: (angle: number) => void;
}) {
  const rotor = useRef<Group>(null);
  const invalidate = useThree((state) => state.invalidate);
  const size = useMemo(() => stackSize(derived, bodies, frame), [derived, bodies, frame]);

  useAngle(store, (angle) => {
    if (rotor.current) {
      rotor.current.rotation.z = rotorTurn(derived.turn, angle);
      rotor.current.userData.shaftAngle = angle;
    }
    invalidate();
  });
  useFrame(() => {
    if (rotor.current) onFrame(Number(rotor.current.userData.shaftAngle));
  });

  const setsOf = (turning: boolean) =>
    bodies
      .filter(({ turns, kind }) => turns === turning && (frame || kind === 'stack'))
      .map((body) => <BodySet key={`${body.part.key} ${body.thickness}`} body={body} />);
  return (
    <>
      <Eye ref={eye} size={size} />
      <hemisphereLight args={['#ffffff', '#6f7a80', 1.7]} />
      <directionalLight position={[0.5, 1.2, 1]} intensity={1.6} />
      <directionalLight position={[-1, -0.3, 0.5]} intensity={0.4} />
      {setsOf(false)}
      <group ref={rotor}>{setsOf(true)}</group>
    </>
  );
}

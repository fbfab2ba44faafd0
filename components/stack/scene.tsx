'use client';

import { useFrame, useThree } from '@react-three/fiber';
import { useMemo, useRef, type Ref } from 'react';
import type { Group } from 'three';
import type { Derived, PlateRole } from '@/geometry';
import { rotorTurn } from '@/geometry/rotor-turn';
import type { AngleStore } from '@/components/floor/angle-store';
import { palette } from '@/components/floor/palette';
import { useAngle } from '@/components/floor/use-angle';
import { Eye, type EyeHandle } from './eye';
import { PlateSet } from './plate-set';
import { RodSet } from './rod-set';
import { stackRods } from './rods';
import { stackSize } from './stack-size';

/** Turned steel of shaft and posts: between the two metals of the plates. */
const TURNED = '#b9c0c4';

/** The meshed stack, mm, shaft along z. The rotor turns with the store, by no render. */
export function Scene({
  derived,
  store,
  eye,
  onFrame,
}: {
  derived: Derived;
  store: AngleStore;
  eye: Ref<EyeHandle>;
  /** Told what a frame that was drawn shows: the shaft angle, rad. */
  onFrame: (angle: number) => void;
}) {
  const rotor = useRef<Group>(null);
  const invalidate = useThree((state) => state.invalidate);
  const rods = useMemo(() => stackRods(derived), [derived]);
  const size = useMemo(() => stackSize(derived), [derived]);
  const shaft = useMemo(() => [rods.shaft], [rods]);

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

  return (
    <>
      <Eye ref={eye} size={size} />
      <hemisphereLight args={['#ffffff', '#6f7a80', 1.7]} />
      <directionalLight position={[0.5, 1.2, 1]} intensity={1.6} />
      <directionalLight position={[-1, -0.3, 0.5]} intensity={0.4} />
      <Plates derived={derived} role="stator" colour={palette.steel} />
      <RodSet rods={rods.statorSpacers} colour={palette.steel} />
      <RodSet rods={rods.posts} colour={TURNED} />
      <group ref={rotor}>
        <Plates derived={derived} role="rotor" colour={palette.brass} />
        <RodSet rods={rods.rotorSpacers} colour={palette.brass} />
        <RodSet rods={shaft} colour={TURNED} />
      </group>
    </>
  );
}

function Plates({
  derived: { sections, stack },
  role,
  colour,
}: {
  derived: Derived;
  role: PlateRole;
  colour: string;
}) {
  const places = useMemo(
    () =>
      sections.map((_, index) =>
        stack.plates.filter((plate) => plate.role === role && plate.section === index),
      ),
    [sections, stack, role],
  );
  return sections.map((section, index) => (
    <PlateSet key={index} plate={section[role]} places={places[index]!} colour={colour} />
  ));
}

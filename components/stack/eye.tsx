'use client';

import { useThree } from '@react-three/fiber';
import { useEffect, useImperativeHandle, useRef, type Ref } from 'react';
import { Vector3, type PerspectiveCamera } from 'three';
import { OrbitControls } from 'three/addons/controls/OrbitControls.js';
import type { StackSize } from './stack-size';
import { views, type ViewName } from './views';

export interface EyeHandle {
  look(view: ViewName): void;
  /** Moves nearer (below 1) or further. */
  step(factor: number): void;
}

const FIELD_OF_VIEW = 28;

/** Camera distance at which a ball of this radius fills a frame of this aspect, mm. */
function fitted(radius: number, aspect: number): number {
  const vertical = (FIELD_OF_VIEW * Math.PI) / 360;
  const horizontal = Math.atan(Math.tan(vertical) * aspect);
  return radius / Math.sin(Math.min(vertical, horizontal));
}

/** Camera and orbit. There is no damping: it moves only while it is moved. */
export function Eye({ size, ref }: { size: StackSize; ref: Ref<EyeHandle> }) {
  const camera = useThree((state) => state.camera) as PerspectiveCamera;
  const canvas = useThree((state) => state.gl.domElement);
  const invalidate = useThree((state) => state.invalidate);
  const aspect = useThree((state) => state.size.width / state.size.height);
  const controls = useRef<OrbitControls | null>(null);
  const { middle, radius } = size;

  useEffect(() => {
    const made = new OrbitControls(camera, canvas);
    made.enableDamping = false;
    made.enablePan = false;
    // Up and down still scrolls the page on a touch screen; the buttons reach every view.
    canvas.style.touchAction = 'pan-y';
    made.addEventListener('change', () => invalidate());
    controls.current = made;
    camera.position.set(...views.threeQuarter.direction);
    return () => {
      made.dispose();
      controls.current = null;
    };
  }, [camera, canvas, invalidate]);

  // Keeps the direction of view and refits the distance when the stack or the frame changes.
  useEffect(() => {
    const orbit = controls.current;
    if (!orbit) return;
    const distance = fitted(radius, aspect);
    const direction = camera.position.clone().sub(orbit.target).normalize();
    orbit.target.set(0, 0, middle);
    orbit.minDistance = 0.3 * distance;
    orbit.maxDistance = 4 * distance;
    camera.fov = FIELD_OF_VIEW;
    camera.near = 0.02 * distance;
    camera.far = 10 * distance;
    camera.updateProjectionMatrix();
    camera.position.copy(orbit.target).addScaledVector(direction, distance);
    orbit.update();
    invalidate();
  }, [camera, canvas, invalidate, middle, radius, aspect]);

  useImperativeHandle(
    ref,
    () => ({
      look(view) {
        const orbit = controls.current;
        if (!orbit) return;
        const direction = new Vector3(...views[view].direction).normalize();
        camera.position.copy(orbit.target).addScaledVector(direction, fitted(radius, aspect));
        orbit.update();
        invalidate();
      },
      step(factor) {
        const orbit = controls.current;
        if (!orbit) return;
        camera.position.sub(orbit.target).multiplyScalar(factor).add(orbit.target);
        orbit.update();
        invalidate();
      },
    }),
    [camera, invalidate, radius, aspect],
  );
  return null;
}

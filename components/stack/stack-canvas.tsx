'use client';

import { createRoot, extend, type ReconcilerRoot } from '@react-three/fiber';
import { useEffect, useRef, type ReactNode } from 'react';
import {
  DirectionalLight,
  Group,
  HemisphereLight,
  InstancedMesh,
  MeshLambertMaterial,
} from 'three';

// Only what the scene is made of. The ready-made Canvas would bring in the whole of three.
extend({ DirectionalLight, Group, HemisphereLight, InstancedMesh, MeshLambertMaterial });

/** Drawn at most at this many pixels to a CSS pixel: beyond it software rendering gets slow. */
const LARGEST_RATIO = 2;

/**
 * A canvas that draws its scene only when asked to, as large as its container.
 * @param onFailure hears that there is no WebGL to draw with.
 */
export function StackCanvas({
  children,
  onFailure,
}: {
  children: ReactNode;
  onFailure: () => void;
}) {
  const host = useRef<HTMLDivElement>(null);
  const root = useRef<ReconcilerRoot<HTMLCanvasElement> | null>(null);
  const scene = useRef(children);
  const failed = useRef(onFailure);

  useEffect(() => {
    const element = host.current;
    if (!element) return;
    // A canvas that has lost its context can't be used again, so each mount makes its own.
    const canvas = document.createElement('canvas');
    canvas.className = 'block h-full w-full';
    canvas.setAttribute('aria-hidden', 'true');
    element.append(canvas);
    const made = createRoot(canvas);
    let standing = true;

    const fit = async () => {
      const { clientWidth: width, clientHeight: height } = element;
      if (width === 0 || height === 0) return;
      try {
        await made.configure({
          frameloop: 'demand',
          dpr: [1, LARGEST_RATIO],
          flat: true,
          size: { width, height, top: 0, left: 0 },
          gl: { antialias: true, alpha: true, preserveDrawingBuffer: true },
        });
      } catch {
        // What a browser without WebGL does; the message takes the place of the picture.
        if (standing) failed.current();
        return;
      }
      if (!standing) return;
      root.current = made;
      made.render(scene.current);
    };
    const observer = new ResizeObserver(() => void fit());
    observer.observe(element);
    return () => {
      standing = false;
      observer.disconnect();
      root.current = null;
      made.unmount();
      canvas.remove();
    };
  }, []);

  useEffect(() => {
    scene.current = children;
    failed.current = onFailure;
    root.current?.render(children);
  }, [children, onFailure]);

  return <div ref={host} className="h-full w-full" />;
}

'use client';

import { useCallback, useRef, useState } from 'react';
import type { Derived } from '@/geometry';
import type { AngleStore } from '@/components/floor/angle-store';
import { toDegrees } from '@/components/floor/degrees';
import { Button } from '@/components/ui/button';
import { AssemblyLinks } from './assembly-links';
import type { EyeHandle } from './eye';
import { Scene } from './scene';
import { StackCanvas } from './stack-canvas';
import { useBodies } from './use-bodies';
import { views, type ViewName } from './views';

/**
 * The built capacitor in 3D: every part that has a place, its end plates sheer so that the stack
 * stays in sight. It turns with the store. The wrapper carries data-plates, and data-angle with the
 * turn, in degrees, of the frame last drawn.
 */
export function StackView({ derived, store }: { derived: Derived; store: AngleStore }) {
  const wrapper = useRef<HTMLDivElement>(null);
  const eye = useRef<EyeHandle>(null);
  const [drawable, setDrawable] = useState(true);
  const [frame, setFrame] = useState(true);
  const built = useBodies(derived);
  const framed = derived.design.frame !== 'none';
  const fail = useCallback(() => setDrawable(false), []);
  const onFrame = useCallback((angle: number) => {
    if (wrapper.current) wrapper.current.dataset.angle = toDegrees(angle).toFixed(1);
  }, []);
  const { plates, depth } = derived.stack;
  const rotors = plates.filter(({ role }) => role === 'rotor').length;

  return (
    <div
      ref={wrapper}
      data-part="stack"
      data-plates={plates.length}
      className="flex h-full min-h-40 w-full flex-col bg-well"
    >
      {drawable ? (
        <>
          <div className="relative min-h-0 flex-1">
            <div
              role="img"
              aria-label={
                `Meshed stack of ${rotors} rotor and ${plates.length - rotors} stator plates, ` +
                `${depth.toFixed(1)} mm deep, ${framed && frame ? 'in its frame, ' : ''}` +
                'turned to the shaft angle of the angle rule'
              }
              className="absolute inset-0"
            >
              <StackCanvas onFailure={fail}>
                {built && (
                  <Scene
                    built={built}
                    store={store}
                    frame={framed && frame}
                    eye={eye}
                    onFrame={onFrame}
                  />
                )}
              </StackCanvas>
            </div>
            {framed && (
              <Button
                look="quiet"
                className="absolute top-0 right-0 px-2! text-small!"
                onPress={() => setFrame((now) => !now)}
              >
                {frame ? 'Hide frame' : 'Show frame'}
              </Button>
            )}
          </div>
          <div
            role="group"
            aria-label="View of the stack"
            className="flex flex-wrap border-t border-line"
          >
            {(Object.keys(views) as ViewName[]).map((name) => (
              <Button
                key={name}
                look="quiet"
                className="grow px-1.5! text-small!"
                onPress={() => eye.current?.look(name)}
              >
                {views[name].label}
              </Button>
            ))}
            <Button
              look="quiet"
              className="grow px-1.5! text-small!"
              onPress={() => eye.current?.step(0.8)}
            >
              Nearer
            </Button>
            <Button
              look="quiet"
              className="grow px-1.5! text-small!"
              onPress={() => eye.current?.step(1.25)}
            >
              Further
            </Button>
          </div>
          <AssemblyLinks derived={derived} store={store} />
        </>
      ) : (
        <p className="m-auto max-w-sm p-4 text-ink-2">
          This browser offers no WebGL 2, which the picture of the stack needs. Plan, chart and
          files do not depend on it.
        </p>
      )}
    </div>
  );
}

'use client';

import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import type { Derived } from '@/geometry';
import { bandsDial } from '@/geometry/dial/bands-dial';
import { dialBounds, DialError, type DialSettings } from '@/geometry/dial/settings';
import { sketchSvg } from '@/geometry/sketch/svg';
import { bandScale, type BandCircuits } from '@/geometry/tracking/bands';
import { NumberField } from '../number-field';
import { saveSvg } from '../dial/save-svg';

/** A round dial with an arc for each band, true size. */
export function BandsDial({
  derived,
  bands,
}: {
  derived: Derived;
  bands: readonly BandCircuits[];
}) {
  const [radius, setRadius] = useState(80);
  const [sense, setSense] = useState<DialSettings['sense']>('clockwise');
  const made = useMemo(() => {
    const settings: DialSettings = {
      quantity: 'frequency',
      form: 'round',
      moves: 'pointer',
      sense,
      radius,
      place: 'upper',
      open: 0,
      ratio: 1,
      drum: dialBounds.drum[0],
      hole: derived.design.shaftDiameter + 0.5,
      title: '',
    };
    try {
      const arcs = bands.map((band) => ({
        name: band.name.trim() || 'Band',
        scale: bandScale(derived, band),
      }));
      return { svg: sketchSvg(bandsDial(arcs, derived.turn, settings)), trouble: null };
    } catch (error) {
      if (!(error instanceof DialError)) throw error;
      return { svg: null, trouble: error.message };
    }
  }, [derived, bands, radius, sense]);

  return (
    <>
      <div className="grid grid-cols-2 gap-3">
        <NumberField
          label="Outer radius, mm"
          value={radius}
          min={dialBounds.radius[0]}
          max={dialBounds.radius[1]}
          onChange={setRadius}
        />
        <SelectField
          label="The pointer turns, meshing"
          value={sense}
          options={[
            { value: 'clockwise', label: 'clockwise' },
            { value: 'anticlockwise', label: 'anticlockwise' },
          ]}
          onChange={setSense}
        />
      </div>
      {made.trouble !== null && (
        <p role="alert" className="text-bad">
          {made.trouble}
        </p>
      )}
      {made.svg !== null && (
        <>
          <div
            role="img"
            aria-label="The dial with an arc for each band"
            className="border border-line bg-white [&_svg]:h-auto [&_svg]:w-full"
            dangerouslySetInnerHTML={{ __html: made.svg }}
          />
          <p>
            <Button onPress={() => saveSvg(made.svg, 'dial-of-bands_true-size.svg')}>
              Save as SVG, true size
            </Button>
          </p>
        </>
      )}
    </>
  );
}

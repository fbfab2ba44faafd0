'use client';

import { useMemo, useState } from 'react';
import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { writeDegrees } from '@/components/floor/degrees';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { SelectField } from '@/components/ui/select-field';
import { formatQuantity, MAX_SECTIONS, sectionParameters, type Derived } from '@/geometry';
import { trackingOf } from '@/geometry/tracking/tracking-error';
import { NumberField } from '../number-field';
import type { ToolProps } from '../tool-props';
import { ErrorPlot } from './error-plot';
import { oscillatorIn, startingValues, withOscillator } from './oscillator-circuit';

const hertz = (value: number): string => formatQuantity(value, 'frequency', 4);

/** How far apart from the intermediate frequency the finished plates keep both circuits. */
function Tracking({ derived, index }: { derived: Derived; index: number }) {
  const tracking = useMemo(() => trackingOf(derived, index), [derived, index]);
  const coil = derived.sections[index]?.inductance;
  if (!tracking || coil === null || coil === undefined) {
    return <p role="status">There are no plates yet: the checks say what to change.</p>;
  }
  const { places, worst } = tracking;
  return (
    <>
      <ErrorPlot
        label={`Tracking error over the band, at most ${hertz(Math.abs(worst.error))}`}
        lines={[
          {
            points: places.map(({ signal, error }) => ({ frequency: signal, error })),
            className: 'stroke-brass-dark stroke-[2.5]',
          },
        ]}
      />
      <Figures
        rows={[
          ['Largest error', hertz(Math.abs(worst.error))],
          ['It lies at', `${hertz(worst.signal)}, ${writeDegrees(worst.angle)}°`],
          [
            'Oscillator over the law',
            `${hertz(places.at(-1)!.oscillator)} to ${hertz(places[0]!.oscillator)}`,
          ],
          ['Oscillator coil', formatQuantity(coil, 'inductance', 4)],
        ]}
      />
    </>
  );
}

/** An oscillator section cut so that it stays the intermediate frequency away at every angle. */
export function TrackedOscillator({ design, derived, apply }: ToolProps) {
  const [values, setValues] = useState(() => startingValues(design));
  const index = oscillatorIn(design);
  const [first] = design.sections;
  const full = index === null && design.sections.length >= MAX_SECTIONS;
  const trouble =
    first?.law === 'tracked'
      ? 'Section 1 must have a law of its own.'
      : first?.law !== 'points' && first?.targetKind !== 'band'
        ? 'Section 1 must have its range given as band and coil.'
        : full
          ? `A shaft carries at most ${MAX_SECTIONS} sections: remove one first.`
          : null;
  const set = (change: Partial<typeof values>) =>
    setValues((before) => ({ ...before, ...change }));
  const number = (index ?? design.sections.length) + 1;
  const { intermediateFrequency, oscillatorStray, oscillatorCoil } = sectionParameters;

  return (
    <>
      <PanelSection title="Oscillator">
        <p className="text-small text-ink-2">
          Signal circuit: section 1 with its band, coil and stray. The plates of section{' '}
          {number} are cut so that its circuit stays the intermediate frequency away at every
          angle, without a padder. Such a pair serves one band and one intermediate frequency.
        </p>
        <div className="grid grid-cols-2 gap-3">
          <NumberField
            label="Intermediate frequency, kHz"
            value={values.intermediateFrequency / 1e3}
            min={intermediateFrequency.min / 1e3}
            max={intermediateFrequency.max / 1e3}
            onChange={(value) => set({ intermediateFrequency: value * 1e3 })}
          />
          <SelectField
            label="Oscillator"
            value={values.oscillatorSide}
            options={sectionParameters.oscillatorSide.options}
            onChange={(oscillatorSide) => set({ oscillatorSide })}
          />
          <NumberField
            label="Oscillator stray, pF"
            value={values.oscillatorStray * 1e12}
            min={oscillatorStray.min * 1e12}
            max={oscillatorStray.max * 1e12}
            onChange={(value) => set({ oscillatorStray: value * 1e-12 })}
          />
          <NumberField
            label="Rotor plates"
            whole
            value={values.rotorPlates}
            min={1}
            max={60}
            onChange={(rotorPlates) =>
              set({
                rotorPlates,
                statorPlates: Math.max(
                  1,
                  rotorPlates + Math.sign(values.statorPlates - values.rotorPlates),
                ),
              })
            }
          />
        </div>
        <CheckField
          label="Let the kernel choose the coil"
          value={values.oscillatorCoil === null}
          onChange={(chosen) =>
            set({
              oscillatorCoil: chosen
                ? null
                : (derived?.sections[index ?? -1]?.inductance ?? first?.inductance ?? 1e-4),
            })
          }
        />
        {values.oscillatorCoil !== null && (
          <NumberField
            label="Oscillator coil, µH"
            value={values.oscillatorCoil * 1e6}
            min={oscillatorCoil.min * 1e6}
            max={oscillatorCoil.max * 1e6}
            onChange={(value) => set({ oscillatorCoil: value * 1e-6 })}
          />
        )}
        {trouble && (
          <p role="alert" className="text-bad">
            {trouble}
          </p>
        )}
        <p>
          <Button
            look="action"
            isDisabled={trouble !== null}
            onPress={() =>
              apply(
                (before) => withOscillator(before, values),
                index === null
                  ? `Section ${number} added as the oscillator`
                  : `Section ${number} cut anew as the oscillator`,
              )
            }
          >
            {index === null ? 'Add the oscillator section' : `Apply to section ${number}`}
          </Button>
        </p>
      </PanelSection>
      {index !== null && (
        <PanelSection title="Tracking of the finished plates">
          {derived ? (
            <Tracking derived={derived} index={index} />
          ) : (
            <p>There are no plates yet: the checks say what to change.</p>
          )}
          <p className="text-small text-ink-2">
            From the outlines as they are cut, through the field model, with both trimmers set
            where the law begins. What is built differs by its tolerances and by coil and stray.
          </p>
        </PanelSection>
      )}
    </>
  );
}

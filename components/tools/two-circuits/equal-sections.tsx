'use client';

import { useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { formatQuantity, MAX_SECTIONS, sectionParameters } from '@/geometry';
import { chebyshevPoints } from '@/geometry/tracking/least-peak';
import type { OscillatorSide } from '@/geometry/tracking/padded-pair';
import { JobProgress } from '../job/job-progress';
import { NumberField } from '../number-field';
import type { ToolProps } from '../tool-props';
import { PaddedResult } from './padded-result';
import { usePairJob } from './use-pair-job';

const hertz = (value: number): string => formatQuantity(value, 'frequency', 4);

type Points = readonly [number, number, number];

/** The points usual on medium wave, kHz (common practice). */
const USUAL: Points = [600e3, 1000e3, 1400e3];

function startingPoints(low: number, high: number): Points {
  if (low < USUAL[0] && low > 400e3 && high > USUAL[2] && high < 2e6) return USUAL;
  return chebyshevPoints({ low, high }, 3).map((at) =>
    Number(at.toPrecision(3)),
  ) as unknown as Points;
}

/** Two equal sections, the oscillator with a padder in series and a trimmer across. */
export function EqualSections({ design, apply }: ToolProps) {
  const first = design.sections[0]!;
  const [low, setLow] = useState(first.bandLow);
  const [high, setHigh] = useState(first.bandHigh);
  const [plainCoil, setCoil] = useState(first.inductance);
  const [intermediate, setIntermediate] = useState(first.intermediateFrequency);
  const [side, setSide] = useState<OscillatorSide>('above');
  const [points, setPoints] = useState(() => startingPoints(first.bandLow, first.bandHigh));
  const sound = low < high;
  const job = usePairJob(
    sound
      ? {
          kind: 'padded',
          conversion: { intermediate, side, plainCoil },
          band: { low, high },
          points,
        }
      : null,
  );
  const answer = job.answer?.kind === 'padded' ? job.answer : null;
  const full = design.sections.length >= MAX_SECTIONS;
  const kilohertz = (label: string, value: number, onChange: (value: number) => void) => (
    <NumberField
      label={label}
      value={value / 1e3}
      min={1}
      max={1e6}
      onChange={(typed) => onChange(typed * 1e3)}
    />
  );

  return (
    <>
      <PanelSection title="Band and circuits">
        <div className="grid grid-cols-2 gap-3">
          {kilohertz('Band, low end, kHz', low, setLow)}
          {kilohertz('Band, high end, kHz', high, setHigh)}
          {kilohertz('Intermediate frequency, kHz', intermediate, setIntermediate)}
          <SelectField
            label="Oscillator"
            value={side}
            options={sectionParameters.oscillatorSide.options}
            onChange={setSide}
          />
          <NumberField
            label={side === 'above' ? 'Signal coil, µH' : 'Oscillator coil, µH'}
            value={plainCoil * 1e6}
            min={1e-3}
            max={1e6}
            onChange={(value) => setCoil(value * 1e-6)}
          />
        </div>
        <div className="grid grid-cols-3 gap-3">
          {points.map((point, i) => (
            <div key={i}>
              {kilohertz(`Point ${i + 1}, kHz`, point, (value) =>
                setPoints((before) => before.map((p, k) => (k === i ? value : p)) as never),
              )}
            </div>
          ))}
        </div>
        <p className="text-small text-ink-2">
          {side === 'above'
            ? 'Padder and trimmer are in the oscillator’s circuit.'
            : 'With the oscillator below, the signal circuit swings less: padder and trimmer are there.'}{' '}
          The error is how much further apart than the intermediate frequency the circuits are.
        </p>
        {!sound && (
          <p role="alert" className="text-bad">
            Band: its low end, {hertz(low)}, is not below its high end, {hertz(high)}.
          </p>
        )}
        <JobProgress job={job} what="Placing the points" />
      </PanelSection>
      {sound && answer && !job.failure && <PaddedResult answer={answer} />}
      <p>
        <Button
          isDisabled={full}
          onPress={() =>
            apply(
              (before) => ({ ...before, sections: [...before.sections, before.sections[0]!] }),
              `Section ${design.sections.length + 1} added, equal to section 1`,
            )
          }
        >
          Add a section equal to section 1
        </Button>
      </p>
    </>
  );
}

'use client';

import { useState } from 'react';
import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { formatQuantity, MAX_SECTIONS, sectionParameters } from '@/geometry';
import { chebyshevPoints } from '@/geometry/tracking/least-peak';
import type { OscillatorSide } from '@/geometry/tracking/padded-pair';
import { JobProgress } from '../job/job-progress';
import { NumberField } from '../number-field';
import type { ToolProps } from '../tool-props';
import { ErrorPlot } from './error-plot';
import { StockTable } from './stock-table';
import type { PaddedAnswer } from './two-circuits.worker';
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

/** The order of common practice: trimmer high, coil low, the padder between, again and again. */
function PaddedSteps({ placement: { points, pair } }: Pick<PaddedAnswer['best'], 'placement'>) {
  const [low, middle, high] = points.map((at) => `${(at / 1e3).toFixed(0)} kHz`);
  const padded = pair.side === 'above' ? 'oscillator' : 'signal';
  const plain = pair.side === 'above' ? 'signal' : 'oscillator';
  return (
    <ol className="flex list-decimal flex-col gap-1.5 pl-6">
      <li>
        Set the {plain} circuit first, alone: its coil at {low}, its trimmer at {high}, until
        the dial is right at both.
      </li>
      <li>
        Dial and generator at {high}: the {padded} circuit’s trimmer for the loudest.
      </li>
      <li>
        At {low}: the {padded} circuit’s coil for the loudest. Go back to {high} and repeat both
        until neither asks for more.
      </li>
      <li>
        At {middle}: if the {padded} circuit’s trimmer wants to be turned, the padder is off.
        Change it a little, and begin again at {high}.
      </li>
    </ol>
  );
}

function Result({ answer }: { answer: PaddedAnswer }) {
  const { given, best } = answer;
  const [mine, least] = [given, best].map(({ placement }) =>
    Math.abs(placement.peak.error),
  ) as [number, number];
  const rows = (placement: PaddedAnswer['best']['placement']) =>
    [
      ['Tracks at', placement.points.map((at) => (at / 1e3).toFixed(1)).join(', ') + ' kHz'],
      ['Padder', formatQuantity(placement.pair.padder ?? 0, 'capacitance', 5)],
      [
        'Trimmer, beyond the other’s stray',
        formatQuantity(placement.pair.trimmer, 'capacitance', 4),
      ],
      [
        'Coil of the padded circuit',
        formatQuantity(placement.pair.paddedCoil, 'inductance', 5),
      ],
      [
        'Largest error',
        `${hertz(Math.abs(placement.peak.error))} at ${hertz(placement.peak.frequency)}`,
      ],
    ] as const;
  return (
    <>
      <PanelSection title="At your three points">
        <ErrorPlot
          label={`Tracking error over the band, at most ${hertz(mine)} at your points and ${hertz(least)} at the best ones`}
          lines={[
            { points: given.curve, className: 'stroke-steel-dark stroke-[1.5]' },
            { points: best.curve, className: 'stroke-brass-dark stroke-2', dash: '5 3' },
          ]}
        />
        <p className="text-small text-ink-2">
          Full line: your points. Dashed: the points of least peak error.
        </p>
        <Figures rows={rows(given.placement)} />
      </PanelSection>
      <PanelSection title="At the points of least peak error">
        <Figures rows={rows(best.placement)} />
        <p>
          {mine > least * 1.0005
            ? `They beat your points by ${hertz(mine - least)}: the largest error falls by ${Math.round(100 * (1 - least / mine))} %.`
            : 'Your points are the best there are.'}
        </p>
      </PanelSection>
      <PanelSection title="Setting it up">
        <PaddedSteps placement={best.placement} />
      </PanelSection>
      <PanelSection title="Padder from stock">
        <StockTable stock={answer.stock} best={least} />
      </PanelSection>
    </>
  );
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
      {sound && answer && !job.failure && <Result answer={answer} />}
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

'use client';

import { useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { sectionParameters, type Derived } from '@/geometry';
import type { BandCircuits } from '@/geometry/tracking/bands';
import { JobProgress } from '../job/job-progress';
import { NumberField } from '../number-field';
import type { ToolProps } from '../tool-props';
import { BandsDial } from './bands-dial';
import { BandsTable } from './bands-table';
import { oscillatorIn } from './oscillator-circuit';
import { usePairJob } from './use-pair-job';

const MOST_BANDS = 8;

/** The band that the plates were cut for. */
function ownBand({ design, sections }: Derived, oscillator: number): BandCircuits {
  const signal = sections[0]!;
  const values = design.sections[oscillator]!;
  return {
    name: 'Band 1',
    signalCoil: signal.inductance ?? 240e-6,
    signalStray: signal.stray + signal.trimmer,
    oscillatorStray: sections[oscillator]!.stray,
    intermediate: values.intermediateFrequency,
    side: values.oscillatorSide,
    padder: values.law === 'tracked' ? 'none' : 'free',
  };
}

function BandFields({
  band,
  onChange,
  onRemove,
}: {
  band: BandCircuits;
  onChange: (band: BandCircuits) => void;
  onRemove: (() => void) | null;
}) {
  const set = (change: Partial<BandCircuits>) => onChange({ ...band, ...change });
  return (
    <fieldset className="flex flex-col gap-3 border-t border-line pt-3">
      <legend className="sr-only">{band.name}</legend>
      <div className="grid grid-cols-2 gap-3">
        <TextField
          label="Name of the band"
          value={band.name}
          maxLength={40}
          autoComplete="off"
          onChange={(name) => set({ name })}
        />
        <NumberField
          label="Signal coil, µH"
          value={band.signalCoil * 1e6}
          min={1e-3}
          max={1e6}
          onChange={(value) => set({ signalCoil: value * 1e-6 })}
        />
        <NumberField
          label="Signal stray and trimmer, pF"
          value={band.signalStray * 1e12}
          min={0}
          max={5000}
          onChange={(value) => set({ signalStray: value * 1e-12 })}
        />
        <NumberField
          label="Oscillator stray, pF"
          value={band.oscillatorStray * 1e12}
          min={0}
          max={5000}
          onChange={(value) => set({ oscillatorStray: value * 1e-12 })}
        />
        <NumberField
          label="Intermediate frequency, kHz"
          value={band.intermediate / 1e3}
          min={1}
          max={1e6}
          onChange={(value) => set({ intermediate: value * 1e3 })}
        />
        <SelectField
          label="Oscillator"
          value={band.side}
          options={sectionParameters.oscillatorSide.options}
          onChange={(side) => set({ side })}
        />
      </div>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <CheckField
          label="A padder may help"
          value={band.padder === 'free'}
          onChange={(free) => set({ padder: free ? 'free' : 'none' })}
        />
        {onRemove && (
          <Button look="quiet" onPress={onRemove}>
            Remove {band.name}
          </Button>
        )}
      </div>
    </fieldset>
  );
}

function Bands({ derived, oscillator }: { derived: Derived; oscillator: number }) {
  const [bands, setBands] = useState(() => [ownBand(derived, oscillator)]);
  const job = usePairJob({ kind: 'bands', derived, oscillator, bands });
  const answer = job.answer?.kind === 'bands' ? job.answer.bands : null;
  return (
    <>
      <PanelSection title="Bands">
        <p className="text-small text-ink-2">
          The same plates on several coils: section 1 in the signal circuit, section{' '}
          {oscillator + 1} in the oscillator’s, whose coil, trimmer and padder are set for the
          least peak error.
        </p>
        {bands.map((band, i) => (
          <BandFields
            key={i}
            band={band}
            onChange={(changed) =>
              setBands((before) => before.map((one, k) => (k === i ? changed : one)))
            }
            onRemove={
              bands.length > 1
                ? () => setBands((before) => before.filter((_, k) => k !== i))
                : null
            }
          />
        ))}
        {bands.length < MOST_BANDS && (
          <p>
            <Button
              onPress={() =>
                setBands((before) => {
                  const last = before.at(-1)!;
                  const name = `Band ${before.length + 1}`;
                  // About the next band upwards.
                  return [...before, { ...last, name, signalCoil: last.signalCoil / 9 }];
                })
              }
            >
              Add a band
            </Button>
          </p>
        )}
        <JobProgress job={job} what="Reckoning the bands" />
      </PanelSection>
      {answer && !job.failure && (
        <PanelSection title="Coverage and tracking">
          <BandsTable bands={answer} />
        </PanelSection>
      )}
      <PanelSection title="Dial with an arc for each band">
        <BandsDial derived={derived} bands={bands} />
      </PanelSection>
    </>
  );
}

/** One gang on several coils: what each band covers, and how far it is off there. */
export function SeveralBands({ design, derived }: ToolProps) {
  if (!derived || derived.sections.length < 2) {
    return (
      <p>Bands need two finished sections: add an oscillator or an equal section first.</p>
    );
  }
  const oscillator = oscillatorIn(design) ?? 1;
  if (!derived.sections[oscillator]) return <p>The plates are not finished yet.</p>;
  return <Bands key={oscillator} derived={derived} oscillator={oscillator} />;
}

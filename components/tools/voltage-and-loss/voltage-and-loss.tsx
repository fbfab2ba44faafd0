'use client';

import { PanelSection } from '@/components/design/panel-section';
import { driftLeftOut, sectionDrift } from '@/geometry/electrical/drift';
import { Figures } from '@/components/design/figures';
import type { ToolProps } from '../tool-props';
import { Conditions } from './conditions';
import { LossTable } from './loss-table';
import { VoltageTable } from './voltage-table';

const ppm = (value: number): string => {
  const parts = Number((1e6 * value).toPrecision(3));
  return `${parts > 0 ? '+' : ''}${parts} ppm/K`.replace('-', '−');
};

/** What the gap holds, what the metal loses, and how the capacitance drifts as it warms. */
export default function VoltageAndLoss({ design, section, derived, apply }: ToolProps) {
  const values = design.sections[section]!;
  const { area, gap, air, total } = sectionDrift(design, values);
  return (
    <>
      <PanelSection title="Where it works">
        <Conditions design={design} section={section} apply={apply} />
      </PanelSection>
      <PanelSection title="Voltage">
        <VoltageTable design={design} section={values} />
      </PanelSection>
      <PanelSection title="Loss">
        {derived?.sections[section] && <LossTable derived={derived} section={section} />}
      </PanelSection>
      <PanelSection title="Drift with temperature">
        <Figures
          rows={[
            ['Area of the plates', ppm(area)],
            ['Gaps, by plates and spacers', ppm(gap)],
            ['Air', ppm(air)],
            ['Capacitance of the plates', ppm(total)],
          ]}
        />
        <p className="text-small text-ink-2">Left out: {driftLeftOut.join('; ')}.</p>
      </PanelSection>
      <PanelSection title="Take care">
        <p className="text-small">
          High voltage and radio frequency injure and kill; a capacitor can hold its charge
          after switching off, and radio frequency burns without a shock. Discharge it, keep
          covers on, work to local codes, and have licensed practice look at anything beyond a
          receiver.
        </p>
      </PanelSection>
    </>
  );
}

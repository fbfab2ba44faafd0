'use client';

import { useMemo, useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { startingMachines } from '@/geometry/cutting/starting-values';
import type { ToolProps } from '../registry';
import { GroupResult } from './group-result';
import { LayoutFields, type Asked } from './layout-fields';
import { MachineFindings } from './machine-findings';
import { useLayout } from './use-layout';

const first: Asked = {
  machine: startingMachines[0]!.name,
  width: 500,
  height: 300,
  count: 20,
  copies: 1,
  gap: 2,
  margin: 5,
  rotations: 12,
  kerf: 'compensated',
};

/** All cut parts of the design on sheets: how they lie, and what they take. */
export default function Sheets({ derived }: ToolProps) {
  const [asked, setAsked] = useState(first);
  const question = useMemo(() => {
    const machine = startingMachines.find(({ name }) => name === asked.machine)!;
    const { width, height, count, copies, gap, margin, rotations, kerf } = asked;
    return (
      derived && {
        derived,
        machine,
        copies,
        kerf,
        sheet: { width, height, count },
        settings: { gap, margin, rotations },
      }
    );
  }, [asked, derived]);
  const { laid, share, failure, stopped, stop, again } = useLayout(question);

  return (
    <>
      <LayoutFields
        asked={asked}
        onChange={(change) => setAsked((now) => ({ ...now, ...change }))}
      />
      {!derived && <p>There are no plates yet: the checks say what to change.</p>}
      <div className="flex min-h-9 flex-wrap items-center gap-3" aria-live="polite">
        {share !== null && (
          <>
            <progress aria-label="Laying out" value={share} className="grow" />
            <Button onPress={stop}>Stop</Button>
          </>
        )}
        {stopped && (
          <>
            <p>Stopped. What is shown is the layout before.</p>
            <Button onPress={again}>Lay out again</Button>
          </>
        )}
        {failure && (
          <>
            <p className="text-bad">The layout failed: {failure}</p>
            <Button onPress={again}>Try again</Button>
          </>
        )}
        {share === null && !stopped && !failure && laid && <p>Laid out.</p>}
      </div>
      {laid && (
        <>
          <PanelSection title="What the machine can cut">
            <MachineFindings findings={laid.findings} />
          </PanelSection>
          {laid.groups.map((group) => (
            <GroupResult key={`${group.material} ${group.thickness}`} group={group} />
          ))}
          <p className="text-small text-ink-2">
            Time counts cutting and piercing; moves from cut to cut, loading and speeding up are
            left out. No part is put into a hole of another. Distances are measured between the
            true outlines at nominal size.
          </p>
        </>
      )}
    </>
  );
}

'use client';

import { useEffect, useMemo, useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import type { LaidOut } from '@/geometry/nesting/lay-out';
import { JobProgress } from '../job/job-progress';
import { useJob } from '../job/use-job';
import type { ToolProps } from '../tool-props';
import { GroupResult } from './group-result';
import { LayoutFields, type Asked } from './layout-fields';
import { MachineFindings } from './machine-findings';
import type { Question } from './lay-out.worker';
import { SheetFiles } from './sheet-files';
import { useShop } from './use-shop';

/** ms without a change before it begins: nobody wants a layout of half a number. */
const SETTLED = 400;

const first: Asked = {
  machine: '',
  from: 'store',
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
export default function Sheets({ derived, saved }: ToolProps) {
  const [asked, setAsked] = useState(first);
  const { machines, stock } = useShop();
  const question = useMemo((): Question | null => {
    const machine = machines.find(({ name }) => name === asked.machine) ?? machines[0]!;
    const { width, height, count, copies, gap, margin, rotations, kerf } = asked;
    return (
      derived && {
        derived,
        machine,
        copies,
        kerf,
        sheet: { width, height, count },
        stock: asked.from === 'store' ? stock : [],
        settings: { gap, margin, rotations },
      }
    );
  }, [asked, derived, machines, stock]);
  const job = useJob<Question, LaidOut>(
    () => new Worker(new URL('./lay-out.worker.ts', import.meta.url), { type: 'module' }),
  );
  const [shown, setShown] = useState<Question | null>(null);
  const { start, answer: laid } = job;
  useEffect(() => {
    if (!question) return;
    const begin = setTimeout(() => start(question, () => setShown(question)), SETTLED);
    return () => clearTimeout(begin);
  }, [question, start]);

  return (
    <>
      <LayoutFields
        asked={asked}
        machines={machines}
        onChange={(change) => setAsked((now) => ({ ...now, ...change }))}
      />
      {!derived && <p>There are no plates yet: the checks say what to change.</p>}
      <JobProgress job={job} what="Laying out" />
      <div className="flex min-h-9 flex-wrap items-center gap-3" aria-live="polite">
        {laid && !job.running && shown === question && <p>Laid out.</p>}
        {question && !job.running && shown !== question && (
          <>
            <p>{laid ? 'Shown is the layout before.' : 'Not laid out yet.'}</p>
            <Button onPress={() => start(question, () => setShown(question))}>
              Lay out now
            </Button>
          </>
        )}
      </div>
      {laid && (
        <>
          <PanelSection title="What the machine can cut">
            <MachineFindings findings={laid.findings} />
          </PanelSection>
          {laid.groups.map((group) => (
            <GroupResult key={`${group.material} ${group.thickness}`} group={group} />
          ))}
          {shown && (
            <SheetFiles
              saved={saved}
              question={shown}
              laid={laid}
              current={shown === question && !job.running}
            />
          )}
          <p className="text-small text-ink-2">
            From the store, sheet is taken at its own size and count; the size above is for what
            is not there. Time counts cutting and piercing; moves from cut to cut, loading and
            speeding up are left out. No part is put into a hole of another. Distances are
            measured between the true outlines at nominal size.
          </p>
        </>
      )}
    </>
  );
}

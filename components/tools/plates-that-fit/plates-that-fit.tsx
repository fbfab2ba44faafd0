'use client';

import { useEffect, useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { formatQuantity } from '@/geometry';
import type { Candidate } from '@/geometry/advice/advise';
import { SortButton } from '@/components/designs/sort-button';
import { JobProgress } from '../job/job-progress';
import { useJob } from '../job/use-job';
import type { ToolProps } from '../tool-props';
import { columns, type SortKey } from './columns';
import type { FitAnswer, FitQuestion } from './plates-that-fit.worker';

const makeWorker = () =>
  new Worker(new URL('./plates-that-fit.worker.ts', import.meta.url), { type: 'module' });

/** Plate counts and air gaps that reach the target in the room allowed; one of them is taken. */
export default function PlatesThatFit({ design, section, apply }: ToolProps) {
  const list = useJob<FitQuestion, FitAnswer>(makeWorker);
  const trial = useJob<FitQuestion, FitAnswer>(makeWorker);
  const [sort, setSort] = useState<{ key: SortKey; down: boolean }>({
    key: 'outerRadius',
    down: false,
  });
  const asked = JSON.stringify([design, section]);
  const { start } = list;
  useEffect(() => {
    const [wanted, index] = JSON.parse(asked) as [typeof design, number];
    start({ kind: 'list', design: wanted, section: index });
  }, [asked, start]);

  const { answer } = list;
  const candidates = useMemo(() => {
    const found = answer?.kind === 'list' ? [...answer.candidates] : [];
    const by = sort.down ? -1 : 1;
    return found.sort((a, b) => by * (a[sort.key] - b[sort.key]));
  }, [answer, sort]);

  const tried = trial.answer;

  function take(candidate: Candidate) {
    const { airGap, rotorPlates, statorPlates } = candidate;
    const sections = design.sections.map((own, i) =>
      i === section ? { ...own, airGap, rotorPlates, statorPlates } : own,
    );
    trial.start({ kind: 'try', design: { ...design, sections } }, (answer) => {
      if (answer.kind !== 'try' || answer.refusals.length > 0) return;
      const gap = formatQuantity(airGap, 'length');
      apply(
        () => answer.design,
        `${rotorPlates} rotor and ${statorPlates} stator plates with ${gap} of gap taken`,
      );
    });
  }

  return (
    <>
      <p className="text-ink-2">
        With the law, sheet and shaft of the design, within{' '}
        {formatQuantity(design.largestRadius, 'length')} of radius and{' '}
        {formatQuantity(design.largestDepth, 'length')} of depth, at{' '}
        {formatQuantity(design.sections[section]!.workingVoltage, 'voltage')} of working
        voltage. Radius to the furthest ear, depth and narrowest blade in mm; voltage by 1 kV
        peak for each millimetre, less in thin air. Radii and weights are estimates, good to
        some per cent; what you take is worked out in full first.
      </p>
      <JobProgress job={list} what="Looking at plate counts and gaps" />
      {answer?.kind === 'list' && (
        <p role="status">
          {candidates.length === 0
            ? `None of the ${answer.looked} looked at fits: allow more radius or depth, a lower working voltage or a smaller range.`
            : `${candidates.length} of the ${answer.looked} looked at fit.`}
        </p>
      )}
      <JobProgress job={trial} what="Working it out in full" />
      {tried?.kind === 'try' && tried.refusals.length > 0 && (
        <ul role="alert" className="text-bad">
          {tried.refusals.map((refusal) => (
            <li key={refusal}>Not taken. {refusal}</li>
          ))}
        </ul>
      )}
      {candidates.length > 0 && (
        <div
          role="region"
          aria-label="Plates that fit"
          tabIndex={0}
          className="overflow-x-auto"
        >
          <table className="dense w-full text-right text-small tabular-nums">
            <thead>
              <tr className="border-b border-edge">
                {columns.map(({ key, title }) => (
                  <th
                    key={key}
                    scope="col"
                    aria-sort={
                      sort.key === key ? (sort.down ? 'descending' : 'ascending') : 'none'
                    }
                    className="pl-3 first:pl-0"
                  >
                    <SortButton
                      direction={sort.key === key && (sort.down ? 'desc' : 'asc')}
                      onPress={() =>
                        setSort((before) => ({ key, down: before.key === key && !before.down }))
                      }
                    >
                      {title}
                    </SortButton>
                  </th>
                ))}
                <th scope="col">
                  <span className="sr-only">Take it</span>
                </th>
              </tr>
            </thead>
            <tbody>
              {candidates.map((candidate) => (
                <tr
                  key={`${candidate.airGap} ${candidate.rotorPlates}`}
                  className="border-b border-line"
                >
                  {columns.map(({ key, write }) => (
                    <td key={key} className="pl-3 whitespace-nowrap first:pl-0">
                      {write(candidate)}
                    </td>
                  ))}
                  <td className="py-1 pl-3">
                    <Button
                      onPress={() => take(candidate)}
                      aria-label={`Take ${columns[1]!.write(candidate)} plates with ${columns[0]!.write(candidate)} mm`}
                    >
                      Take
                    </Button>
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </>
  );
}

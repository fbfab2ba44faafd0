'use client';

import { useState } from 'react';
import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { formatQuantity } from '@/geometry';
import {
  startingTolerances,
  toleranceNames,
  type Tolerances,
} from '@/geometry/tolerance/tolerances';
import { JobProgress } from '../job/job-progress';
import { useJob } from '../job/use-job';
import type { ToolProps } from '../tool-props';
import { AmountRow } from './amount-row';
import { BandPlot } from './band-plot';
import type { ToleranceAnswer, ToleranceQuestion } from './tolerance.worker';

const STACKS = 2000;

const makeWorker = () =>
  new Worker(new URL('./tolerance.worker.ts', import.meta.url), { type: 'module' });

const percent = (share: number, digits = 2): string =>
  `${Number((100 * share).toPrecision(digits))} %`;

function Outcome({ answer }: { answer: ToleranceAnswer }) {
  const { outcome, range } = answer;
  const { aligned, asBuilt, alone } = outcome;
  const end = aligned.angle.length - 1;
  const most = Math.max(...aligned.low.map(Math.abs), ...aligned.high.map(Math.abs));
  const sum = alone.reduce((square, { spread }) => square + spread * spread, 0);
  return (
    <>
      <PanelSection title="About the law">
        <p className="text-small text-ink-2">
          Nine of ten stacks lie between the lines, the middle one on the dashed line: percent
          of the range over the shaft angle, with a trimmer set where the law begins.
        </p>
        <BandPlot band={aligned} range={range} />
        <Figures
          rows={[
            [
              'Nine of ten within',
              `${percent(most / range)}, ${formatQuantity(most, 'capacitance', 3)}`,
            ],
            [
              'Where the law ends',
              `${formatQuantity(aligned.low[end]!, 'capacitance', 3)} to ${formatQuantity(aligned.high[end]!, 'capacitance', 3)}`,
            ],
            [
              'Where it begins, before the trimmer',
              `${formatQuantity(asBuilt.low[0]!, 'capacitance', 3)} to ${formatQuantity(asBuilt.high[0]!, 'capacitance', 3)}`,
            ],
            ['Stacks within your limit', percent(outcome.yield, 3)],
          ]}
        />
      </PanelSection>
      <PanelSection title="What matters most">
        <p className="text-small text-ink-2">
          Each tolerance alone: root mean square of the error after the trimmer, of the range,
          and its share of all their squares.
        </p>
        <Figures
          rows={alone.map(({ name, spread }) => [
            startingTolerances[name].label,
            `${percent(spread)}, ${sum > 0 ? percent((spread * spread) / sum) : '0 %'}`,
          ])}
        />
      </PanelSection>
    </>
  );
}

/** Two thousand stacks built by chance: how well they hold the law, and what it hangs on. */
export default function Tolerance({ derived, section }: ToolProps) {
  const job = useJob<ToleranceQuestion, ToleranceAnswer>(makeWorker);
  const [tolerances, setTolerances] = useState<Tolerances>(startingTolerances);
  const [limit, setLimit] = useState('1');
  const [seed, setSeed] = useState(1);
  const share = Number(limit.replace(',', '.'));
  const fits = limit.trim() !== '' && share > 0 && share <= 100;
  const current = derived !== null;

  function build(withSeed: number) {
    if (!derived || !fits) return;
    setSeed(withSeed);
    job.start({
      derived,
      section,
      tolerances,
      stacks: STACKS,
      seed: withSeed,
      limit: share / 100,
    });
  }

  return (
    <>
      <PanelSection title="What may differ">
        {toleranceNames.map((name) => (
          <AmountRow
            key={name}
            tolerance={tolerances[name]}
            inDegrees={name === 'angle'}
            onChange={(tolerance) => setTolerances((all) => ({ ...all, [name]: tolerance }))}
          />
        ))}
        <TextField
          label="Largest error allowed, % of the range"
          value={limit}
          onChange={setLimit}
          inputMode="decimal"
          autoComplete="off"
          errorMessage={
            fits ? undefined : `“${limit}” is no limit; give more than 0, up to 100.`
          }
        />
        <p className="flex flex-wrap gap-2">
          <Button
            look="action"
            isDisabled={!current || !fits || job.running}
            onPress={() => build(seed)}
          >
            Build {STACKS} stacks
          </Button>
          <Button isDisabled={!current || !fits || job.running} onPress={() => build(seed + 1)}>
            Other ones
          </Button>
        </p>
        <JobProgress job={job} what="Building stacks" />
      </PanelSection>
      {job.answer && <Outcome answer={job.answer} />}
      <p className="text-small text-ink-2">
        Every gap is counted by itself; outlines act through the length of their edges, and what
        the edges’ field changes with the gap is taken as a straight line. Left out: plates that
        bow, sheet of one lot that errs alike, posts that lean, and everything outside the
        plates. Seed {seed}: the same seed builds the same stacks.
      </p>
    </>
  );
}

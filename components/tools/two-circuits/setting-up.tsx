'use client';

import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { toDegrees, writeDegrees } from '@/components/floor/degrees';
import { Plot } from '@/components/floor/plot';
import { aboutZero } from '@/components/floor/ticks';
import { Button } from '@/components/ui/button';
import { formatQuantity } from '@/geometry';
import type { Balance } from '@/geometry/mechanics/balance';
import { JobProgress } from '../job/job-progress';
import type { ToolProps } from '../tool-props';
import type { SettingUpAnswer } from './two-circuits.worker';
import { usePairJob } from './use-pair-job';

const farads = (value: number): string => formatQuantity(value, 'capacitance', 3);

/** Torques of a rotor are thousandths of a newton metre. */
const millinewtons = (value: number): string => `${Number((1e3 * value).toPrecision(3))} mN·m`;

function Steps({ steps }: { steps: SettingUpAnswer['steps'] }) {
  if (!steps) {
    return (
      <p>
        There are no dial marks to align at: section 1 needs a band with its coil, and a
        capacitance that rises all the way.
      </p>
    );
  }
  return (
    <>
      <div data-part="to-print">
        <h3 className="mb-1 hidden font-semibold print:block">Alignment</h3>
        <ol className="flex list-decimal flex-col gap-1.5 pl-6">
          {steps.map(({ words }, i) => (
            <li key={i}>{words}</li>
          ))}
        </ol>
      </div>
      <p>
        <Button onPress={() => window.print()}>Print the steps</Button>
      </p>
    </>
  );
}

function Weight({ balance }: { balance: Balance }) {
  const { turn, worst, counterweight, sections } = balance;
  const torque = turn.map((at) => 1e3 * at.torque);
  const top = aboutZero(torque);
  return (
    <>
      <div className="relative h-28" data-part="torque">
        <Plot
          angle={turn.map(({ angle }) => toDegrees(angle))}
          scales={[
            {
              side: 'left',
              range: [-1.1 * top, 1.1 * top],
              ticks: [-top, 0, top],
              write: (tick) => String(tick).replace('-', '−'),
              className: 'text-ink-2',
              lines: [{ values: torque, className: 'stroke-brass-dark stroke-2' }],
            },
          ]}
        />
      </div>
      <p className="text-small text-ink-2">
        mN·m over the turn, the shaft level and the stator’s first edge level to the right.
      </p>
      <Figures
        rows={[
          ['Largest torque, however mounted', millinewtons(worst)],
          ...sections.map(
            (own, i) =>
              [`Off balance, section ${i + 1}`, `${Number(own.toPrecision(3))} g·mm`] as const,
          ),
          [
            'Counterweight, mass times radius',
            `${Number(counterweight.moment.toPrecision(3))} g·mm`,
          ],
          [
            'Its bearing from the rotor’s leading edge',
            `${writeDegrees(counterweight.bearing)}°`,
          ],
        ]}
      />
      <p className="text-small text-ink-2">
        Bearing anticlockwise on the rotor as drawn. Over all sections together; a weight at one
        end leaves the shaft a little out of balance along its length, which a hand does not
        feel.
      </p>
    </>
  );
}

function Answer({ answer }: { answer: SettingUpAnswer }) {
  return (
    <>
      <PanelSection title="Alignment">
        <Steps steps={answer.steps} />
      </PanelSection>
      <PanelSection title="Trimmers">
        <Figures
          rows={answer.trimmers.map(({ section, least, most, nominal }) => [
            `Section ${section + 1}, ${farads(nominal)} as drawn`,
            `${farads(least)} to ${farads(most)}`,
          ])}
        />
        {answer.trimmers
          .filter(({ missing }) => missing > 0)
          .map(({ section, missing }) => (
            <p key={section} className="text-small text-bad">
              Section {section + 1}: some stacks have {farads(missing)} too much, which no
              trimmer takes away. Give that much less stray, or a larger open capacitance.
            </p>
          ))}
        <p className="text-small text-ink-2">
          What a trimmer must reach so that nine of ten stacks, built with the starting
          tolerances, can be aligned; a fifth of the spread is added at either side.
        </p>
      </PanelSection>
      <PanelSection title="Weight of the rotor">
        <Weight balance={answer.balance} />
      </PanelSection>
      {answer.couplings.length > 0 && (
        <PanelSection title="Coupling between sections, an estimate">
          <Figures
            rows={answer.couplings.flatMap(({ section, unscreened, screened, coefficient }) => [
              [`Sections ${section + 1} and ${section + 2}, no screen`, farads(unscreened)],
              ['With an earthed screen, at most', farads(screened)],
              ['Coefficient, as designed', `${Number((100 * coefficient).toPrecision(2))} %`],
            ])}
          />
          <p className="text-small text-ink-2">
            From stator to stator where the end plates look at each other, rotors earthed.
            Posts, wiring and frame are not in it: measure the built one. A screen is set among
            the frame’s parameters.
          </p>
        </PanelSection>
      )}
    </>
  );
}

/** How the finished gang is aligned, and what its rotor weighs on the shaft. */
export function SettingUp({ derived }: ToolProps) {
  const job = usePairJob(derived && { kind: 'setting-up', derived });
  if (!derived) return <p>There are no plates yet: the checks say what to change.</p>;
  const answer = job.answer?.kind === 'setting-up' ? job.answer : null;
  return (
    <>
      <JobProgress job={job} what="Building stacks" />
      {answer && !job.failure && <Answer answer={answer} />}
    </>
  );
}

import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { formatQuantity } from '@/geometry';
import { ErrorPlot } from './error-plot';
import { StockTable } from './stock-table';
import type { PaddedAnswer } from './two-circuits.worker';

const hertz = (value: number): string => formatQuantity(value, 'frequency', 4);

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

/** The error of the given points and of the best ones, what they need, and what stock makes of it. */
export function PaddedResult({ answer }: { answer: PaddedAnswer }) {
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
        <StockTable stock={answer.stock} />
      </PanelSection>
    </>
  );
}

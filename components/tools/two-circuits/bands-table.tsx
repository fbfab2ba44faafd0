import { formatQuantity } from '@/geometry';
import type { BandResult } from '@/geometry/tracking/bands';
import { ErrorPlot } from './error-plot';

const hertz = (value: number, digits = 4): string => formatQuantity(value, 'frequency', digits);

const headings = ['Band', 'Covers', 'Oscillator coil', 'Trimmer', 'Padder', 'Largest error'];

/** What each band covers and how well it tracks, with its error over the band. */
export function BandsTable({ bands }: { bands: readonly BandResult[] }) {
  return (
    <>
      <div role="region" aria-label="Bands" tabIndex={0} className="overflow-x-auto">
        <table className="dense w-full text-right text-small tabular-nums">
          <thead>
            <tr className="border-b border-edge">
              {headings.map((title) => (
                <th
                  key={title}
                  scope="col"
                  className="py-1.5 pl-3 font-medium first:pl-0 first:text-left"
                >
                  {title}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {bands.map(({ name, low, high, setting }, i) => (
              <tr key={i} className="border-b border-line">
                <th scope="row" className="py-1.5 text-left font-normal">
                  {name}
                </th>
                <td className="pl-3 whitespace-nowrap">
                  {hertz(low)} to {hertz(high)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(setting.coil, 'inductance', 4)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(setting.trimmer, 'capacitance', 3)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {setting.padder === null
                    ? 'none'
                    : formatQuantity(setting.padder, 'capacitance', 4)}
                </td>
                <td className="pl-3 whitespace-nowrap">{hertz(setting.peak, 3)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {bands.some(({ setting }) => setting.trimmer < 0) && (
        <p className="text-small text-bad">
          A trimmer below nothing: this band’s oscillator has more stray than it should. Take
          less, or put more across the signal circuit.
        </p>
      )}
      {bands.map(({ name, places, setting }, i) => (
        <figure key={i} className="flex flex-col gap-1">
          <figcaption className="text-small font-medium">{name}</figcaption>
          <ErrorPlot
            label={`Tracking error of ${name}, at most ${hertz(setting.peak, 3)}`}
            lines={[
              {
                points: places.map(({ signal, error }) => ({ frequency: signal, error })),
                className: 'stroke-brass-dark stroke-2',
              },
            ]}
          />
        </figure>
      ))}
    </>
  );
}

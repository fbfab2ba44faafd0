import { formatQuantity } from '@/geometry';
import type { PaddedAnswer } from './two-circuits.worker';

const headings = ['Series', 'Padder', 'Trimmer', 'Coil', 'Largest error', 'Set at two points'];

/** The nearest padder of each series, trimmer and coil set anew for it. */
export function StockTable({ stock }: { stock: PaddedAnswer['stock'] }) {
  return (
    <>
      <div
        role="region"
        aria-label="Padder from stock"
        tabIndex={0}
        className="overflow-x-auto"
      >
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
            {stock.map(({ series, best: { pair, peak }, atTwo }) => (
              <tr key={series ?? 'none'} className="border-b border-line">
                <th scope="row" className="py-1.5 text-left font-normal">
                  {series ?? 'none'}
                </th>
                <td className="pl-3 whitespace-nowrap">
                  {pair.padder === null ? '' : formatQuantity(pair.padder, 'capacitance', 3)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(pair.trimmer, 'capacitance', 4)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(pair.paddedCoil, 'inductance', 4)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(Math.abs(peak.error), 'frequency', 3)}
                </td>
                <td className="pl-3 whitespace-nowrap">
                  {formatQuantity(Math.abs(atTwo.peak.error), 'frequency', 3)}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="text-small text-ink-2">
        Preferred values of IEC 60063, nearest to the best padder; trimmer and coil set anew for
        the least peak error over the band. Last column: largest error with both set at the
        first and the last of your points instead.
      </p>
    </>
  );
}

import type { ReactNode } from 'react';

/** Two states side by side, one thing a row. It scrolls by itself where it is too wide. */
export function PairTable({
  caption,
  titles,
  rows,
  none,
}: {
  caption: string;
  /** Of all columns. */
  titles: readonly string[];
  rows: readonly (readonly ReactNode[])[];
  /** What to say where there is no row. */
  none: string;
}) {
  if (rows.length === 0) return <p>{none}</p>;
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
      <table className="dense w-full border-y border-line bg-panel text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-line bg-page text-small text-ink-2">
            {titles.map((title) => (
              <th key={title} scope="col" className="px-3 py-1.5 font-semibold">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(([head, ...cells], index) => (
            <tr key={index} className="border-b border-line last:border-0">
              <th scope="row" className="px-3 py-1 font-normal">
                {head}
              </th>
              {cells.map((cell, column) => (
                <td key={column} className="px-3 py-1 whitespace-nowrap">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

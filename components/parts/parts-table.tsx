import { formatQuantity } from '@/geometry';
import { billOf, type BillLine } from '@/geometry/parts/bill';
import type { Part } from '@/geometry/parts/part';
import { partMaterials } from './part-materials';
import { PartPicture } from './part-picture';

const made: Record<Part['kind'], string> = { cut: 'cut', turned: 'turned', bought: 'bought' };

const grams = (mass: number | null): string =>
  mass === null
    ? '–'
    : mass >= 1000
      ? `${(mass / 1000).toPrecision(3)} kg`
      : `${Number(mass.toPrecision(3))} g`;

const squareCentimetres = (area: number | null): string =>
  area === null ? '–' : `${Number((area / 100).toPrecision(3))} cm²`;

function Line({ line }: { line: BillLine }) {
  const { item, part, size, material, mass, sheetArea } = line;
  return (
    <tr className="border-b border-line align-top">
      <td className="py-2 pr-3 text-right tabular-nums">{item}</td>
      <th scope="row" className="py-2 pr-4 text-left font-medium">
        <span className="flex items-center gap-3">
          {part.kind === 'cut' && <PartPicture part={part} />}
          <span>
            {part.label}
            {part.note && (
              <span className="block max-w-prose text-small font-normal text-ink-2">
                {part.note}
              </span>
            )}
          </span>
        </span>
      </th>
      <td className="py-2 pr-4 text-right tabular-nums">{part.quantity}</td>
      <td className="py-2 pr-4 whitespace-nowrap tabular-nums">{size}</td>
      <td className="py-2 pr-4">{partMaterials[material] ?? material}</td>
      <td className="py-2 pr-4">{made[part.kind]}</td>
      <td className="py-2 pr-4 text-right whitespace-nowrap tabular-nums">{grams(mass)}</td>
      <td className="py-2 text-right whitespace-nowrap tabular-nums">
        {squareCentimetres(sheetArea)}
      </td>
    </tr>
  );
}

const titles = [
  '',
  'Part',
  'Pieces',
  'Size, mm',
  'Material',
  'Made',
  'Mass, all',
  'Faces, all',
];
const toTheRight = new Set(['', 'Pieces', 'Mass, all', 'Faces, all']);

/** The bill of materials of one capacitor. */
export function PartsTable({ parts, depth }: { parts: readonly Part[]; depth: number }) {
  const bill = billOf(parts);
  const sum = (of: 'mass' | 'sheetArea'): number =>
    bill.reduce((total, line) => total + (line[of] ?? 0), 0);
  return (
    <>
      <p className="text-ink-2">
        {parts.length} kinds of part, {grams(sum('mass'))} without what is bought,{' '}
        {squareCentimetres(sum('sheetArea'))} of sheet without what falls between the parts.
        Depth over the plates {formatQuantity(depth, 'length', 4)}.
      </p>
      <div
        role="region"
        aria-label="Bill of materials"
        tabIndex={0}
        className="overflow-x-auto"
      >
        <table className="dense w-full min-w-160 text-small">
          <thead>
            <tr className="border-b border-edge">
              {titles.map((title) => (
                <th
                  key={title}
                  scope="col"
                  className={`py-2 pr-4 font-medium last:pr-0 ${toTheRight.has(title) ? 'text-right' : 'text-left'}`}
                >
                  {title || <span className="sr-only">Item</span>}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {bill.map((line) => (
              <Line key={line.part.key} line={line} />
            ))}
          </tbody>
        </table>
      </div>
    </>
  );
}

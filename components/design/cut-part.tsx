import { formatQuantity } from '@/geometry';
import type { FilePart } from '@/lib/schemas/api';
import { Figures } from './figures';
import { FileLink, type ListedFile } from './file-link';

/** mm round a part in its picture, as a share of its size. */
const ROUND = 0.04;

export function Picture({ part: { label, picture } }: { part: FilePart }) {
  const { x, y, width, height, path } = picture;
  const round = ROUND * Math.max(width, height);
  return (
    <svg
      viewBox={`${x - round} ${y - round} ${width + 2 * round} ${height + 2 * round}`}
      role="img"
      aria-label={`Outline of ${label}, ${width.toFixed(1)} × ${height.toFixed(1)} mm`}
      className="h-40 w-0 grow border border-line bg-white p-1.5 bench:h-32"
    >
      <path
        d={path}
        fillRule="evenodd"
        className="fill-well stroke-ink"
        strokeWidth="1.25"
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}

const kerfs: Record<FilePart['kerf'], string> = {
  nominal: 'nominal, none allowed for',
  compensated: 'compensated, allowed for',
};

/** One part to cut: its file and how it looks first, then what to cut it from and how often. */
export function CutPart({
  href,
  part,
  files,
}: {
  /** Address of the folder of files. */
  href: string;
  part: FilePart;
  files: readonly ListedFile[];
}) {
  const { label, material, thickness, quantity, kerf, note, caution, picture } = part;
  return (
    <li className="flex flex-col gap-2 border-b border-line py-4 first:pt-1 last:border-0">
      <h3 className="text-lead leading-tight">{label}</h3>
      <div className="flex gap-2">
        <Picture part={part} />
        <div className="flex w-32 shrink-0 flex-col justify-center gap-2 *:min-h-12 *:grow-0">
          {files.map((file) => (
            <FileLink key={file.name} href={href} file={file} />
          ))}
        </div>
      </div>
      <Figures
        rows={[
          ['Sheet', `${formatQuantity(thickness, 'length')} ${material}`],
          ['Kerf', kerfs[kerf]],
          ['Pieces', quantity],
          ['Size', `${picture.width.toFixed(1)} × ${picture.height.toFixed(1)} mm`],
        ]}
      />
      {note && <p>{note}.</p>}
      {caution && <p className="border-l-4 border-warn bg-warn-tint px-3 py-1.5">{caution}</p>}
    </li>
  );
}

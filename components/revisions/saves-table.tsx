import Link from 'next/link';
import { ChecksCell } from '@/components/designs/checks-cell';
import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import type { DesignVersion } from '@/lib/schemas/revision';
import { compareHref } from './state-pair';

const titles = ['Version', 'Name', 'Checks', 'Kernel', 'Saved', 'By', 'What to do'];

/** Every save of a design. On a narrow screen each row becomes a card: hence the roles. */
export function SavesTable({
  designId,
  versions,
  onRestore,
}: {
  designId: string;
  versions: readonly DesignVersion[];
  onRestore: (version: number) => void;
}) {
  const saved = versions[0]?.version;
  return (
    <table role="table" className="dense w-full border-y border-line bg-panel max-bench:block">
      <caption className="sr-only">Every save of the design</caption>
      <thead role="rowgroup" className="max-bench:sr-only">
        <tr role="row" className="border-b border-line bg-page">
          {titles.map((title) => (
            <th
              key={title}
              scope="col"
              role="columnheader"
              className="px-3 py-2 text-left text-small font-semibold text-ink-2"
            >
              {title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="max-bench:block">
        {versions.map(({ version, name, checks, kernel, savedAt, savedBy }) => (
          <tr
            key={version}
            role="row"
            className="border-b border-line last:border-0 max-bench:flex max-bench:flex-wrap max-bench:items-center max-bench:py-2 *:px-3 *:py-1"
          >
            <th scope="row" role="rowheader" className="text-left font-semibold">
              <span className="bench:sr-only">Version </span>
              {version}
            </th>
            <td role="cell" className="wrap-anywhere max-bench:basis-full">
              {name}
            </td>
            <td role="cell">
              <ChecksCell checks={checks} />
            </td>
            <td role="cell">
              <span className="bench:sr-only">kernel </span>
              {kernel}
            </td>
            <td role="cell">
              <LocalTime iso={savedAt} />
            </td>
            <td role="cell">{savedBy.name}</td>
            <td role="cell" className="max-bench:basis-full">
              {version === saved ? (
                <Link
                  href={`/designs/${designId}`}
                  className="inline-flex min-h-11 items-center"
                >
                  Open the design
                </Link>
              ) : (
                <span className="flex flex-wrap items-center gap-x-4 gap-y-1">
                  <Link
                    href={compareHref(designId, { a: `v${version}`, b: 'draft' })}
                    aria-label={`Compare version ${version} with what is saved`}
                    className="inline-flex min-h-11 items-center"
                  >
                    Compare
                  </Link>
                  <Button
                    onPress={() => onRestore(version)}
                    aria-label={`Restore version ${version}`}
                  >
                    Restore
                  </Button>
                </span>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

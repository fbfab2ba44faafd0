import Link from 'next/link';
import { LocalTime } from '@/components/ui/local-time';
import type { RecordRow } from '@/lib/schemas/record';

/** Where the thing stands that something was done to, if it has a page. */
function pathOf({ what, subject }: RecordRow): string | null {
  if (what === 'design-deleted') return null;
  if (/^(design|revision|review|file)-/.test(what)) return `/designs/${subject.id}`;
  if (what.startsWith('order-')) return `/orders/${subject.id}`;
  return null;
}

function Facts({ facts }: Pick<RecordRow, 'facts'>) {
  if (facts.length === 0) return null;
  return (
    <details>
      <summary className="min-h-11 cursor-pointer content-center text-ink-2">
        {facts.length} {facts.length === 1 ? 'detail' : 'details'}
      </summary>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 pb-2 text-small">
        {facts.map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-ink-2">{name}</dt>
            <dd className="break-all">{value}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}

/** Who did what to what, newest first. */
export function RecordTable({ rows }: { rows: readonly RecordRow[] }) {
  return (
    <div role="region" aria-label="Record, table" tabIndex={0} className="overflow-x-auto">
      <table className="dense w-full border-y border-line bg-panel">
        <thead>
          <tr className="border-b border-line bg-page text-left">
            {['When', 'Who', 'Did', 'To', 'Details'].map((title) => (
              <th key={title} scope="col" className="px-3 py-2">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => {
            const path = pathOf(row);
            const name = row.subject.name || 'something no longer here';
            return (
              <tr key={row.id} className="border-b border-line align-top last:border-0">
                <td className="px-3 py-2">
                  <LocalTime iso={row.at} />
                </td>
                <td className="px-3 py-2">{row.who.name}</td>
                <td className="px-3 py-2">{row.did}</td>
                <td className="px-3 py-2">
                  {path ? (
                    <Link href={path} className="underline">
                      {name}
                    </Link>
                  ) : (
                    name
                  )}
                  {row.revision !== null && `, revision ${row.revision}`}
                </td>
                <td className="px-3">
                  <Facts facts={row.facts} />
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

'use client';

import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { fetchRecord, recordSearch } from '@/components/api/record';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { Notice } from '@/components/ui/notice';
import type { RecordPage, RecordQuery } from '@/lib/schemas/record';
import { RecordFilter, type Wanted } from './record-filter';
import { RecordTable } from './record-table';

const ALL: Wanted = { who: '', what: '', firstDay: '', lastDay: '' };

/** Midnight of a day in the reader's zone, some days later. */
function midnight(day: string, later = 0): string | undefined {
  if (!day) return undefined;
  const at = new Date(`${day}T00:00`);
  at.setDate(at.getDate() + later);
  return Number.isNaN(at.getTime()) ? undefined : at.toISOString();
}

function queryOf({ who, what, firstDay, lastDay }: Wanted): RecordQuery {
  const [from, until] = [midnight(firstDay), midnight(lastDay, 1)];
  return {
    ...(who && { who }),
    ...(what && { what }),
    ...(from && { from }),
    ...(until && { until }),
  };
}

/** What was done in the workshop, by whom and when; to filter and to take along as CSV. */
export function RecordScreen({
  initial,
  people,
  words,
}: {
  initial: RecordPage;
  people: readonly { readonly id: string; readonly name: string }[];
  words: Readonly<Record<string, string>>;
}) {
  const [wanted, setWanted] = useState(ALL);
  const query = queryOf(wanted);
  const pages = useInfiniteQuery({
    queryKey: ['record', query],
    queryFn: ({ pageParam }) => fetchRecord({ ...query, ...pageParam }),
    initialPageParam: {} as { before?: string },
    getNextPageParam: ({ rows, more }) => (more ? { before: rows.at(-1)!.id } : undefined),
    ...(wanted === ALL && { initialData: { pages: [initial], pageParams: [{}] } }),
    placeholderData: (before) => before,
  });
  const rows = pages.data?.pages.flatMap((page) => page.rows) ?? [];

  return (
    <main id="main" className="mx-auto flex w-full max-w-300 flex-col gap-4 px-5 py-6">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-head">Record</h1>
        <a
          href={`/api/record/export?${recordSearch(query)}`}
          download
          className={buttonClass('plain')}
        >
          Save as CSV
        </a>
      </div>
      <p className="max-w-150 text-ink-2">
        Who did what, and when. Nothing here can be changed or taken away, by anybody.
      </p>
      <RecordFilter wanted={wanted} people={people} words={words} onChange={setWanted} />
      {pages.isError && <Notice look="warn">{pages.error.message}</Notice>}
      {rows.length === 0 && !pages.isPending ? (
        <p role="status" className="border-t border-line pt-4">
          Nothing fits. Choose another person, deed or span of days.
        </p>
      ) : (
        <RecordTable rows={rows} />
      )}
      {pages.hasNextPage && (
        <Button
          isDisabled={pages.isFetchingNextPage}
          onPress={() => void pages.fetchNextPage()}
        >
          Show older
        </Button>
      )}
    </main>
  );
}

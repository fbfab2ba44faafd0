'use client';

import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { lazy, Suspense, useState } from 'react';
import { loadRevisions } from '@/components/api/load-revisions';
import { revisionKeys } from '@/components/api/revision-keys';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { Notice } from '@/components/ui/notice';
import type { History, Restore } from '@/lib/schemas/revision';
import { RevisionItem } from './revision-item';
import { SavesTable } from './saves-table';
import { compareHref, likelyPair, StatePair } from './state-pair';

const NameDialog = lazy(() => import('./name-dialog'));
const RestoreDialog = lazy(() => import('./restore-dialog'));

/** What a dialog is open for: a name, or what is to be restored. */
type Open = 'name' | { readonly from: Restore['from']; readonly what: string } | null;

/** A design's revisions and saves: to name one, compare two, and go on from an earlier one. */
export function HistoryScreen({
  designId,
  name,
  initial,
}: {
  designId: string;
  name: string;
  initial: History;
}) {
  const query = useQuery({
    queryKey: revisionKeys.history(designId),
    queryFn: async () => (await loadRevisions()).fetchHistory(designId),
    initialData: initial,
  });
  const { revisions, versions } = query.data;
  const saved = versions[0]?.version ?? 1;
  const [pair, setPair] = useState(() => likelyPair(initial));
  const [open, setOpen] = useState<Open>(null);
  const close = () => setOpen(null);

  return (
    <main id="main" className="mx-auto flex w-full max-w-300 flex-col gap-5 px-5 py-5">
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2">
        <div className="min-w-0">
          <h1 className="text-head wrap-anywhere">Revisions of {name}</h1>
          <p>
            <Link href={`/designs/${designId}`} className="inline-flex min-h-11 items-center">
              Back to the design
            </Link>
          </p>
        </div>
        <Button look="action" onPress={() => setOpen('name')}>
          Name a revision
        </Button>
      </div>
      {query.isError && (
        <Notice look="warn">{query.error.message} This list may be out of date.</Notice>
      )}
      <section aria-label="Compare two" className="flex flex-wrap items-end gap-3">
        <h2 className="basis-full text-title">Compare two</h2>
        <StatePair history={query.data} pair={pair} onChange={setPair} />
        <Link href={compareHref(designId, pair)} className={buttonClass('plain')}>
          Compare
        </Link>
      </section>
      <section className="flex flex-col gap-2">
        <h2 className="text-title">Revisions</h2>
        {revisions.length === 0 ? (
          <p className="border-t border-line pt-3">
            None yet. Name one once a saved version is worth keeping; when it is released, the
            workshop cuts from it.
          </p>
        ) : (
          <ul aria-label="Revisions" className="border-y border-line bg-panel">
            {revisions.map((revision) => (
              <RevisionItem
                key={revision.id}
                revision={revision}
                onRestore={() =>
                  setOpen({
                    from: { revision: revision.id },
                    what: `revision ${revision.number}`,
                  })
                }
              />
            ))}
          </ul>
        )}
      </section>
      <section className="flex flex-col gap-2">
        <h2 className="text-title">Every save</h2>
        <SavesTable
          designId={designId}
          versions={versions}
          onRestore={(version) => setOpen({ from: { version }, what: `version ${version}` })}
        />
      </section>
      <Suspense>
        {open === 'name' && <NameDialog designId={designId} version={saved} onClose={close} />}
        {open !== null && open !== 'name' && (
          <RestoreDialog designId={designId} version={saved} {...open} onClose={close} />
        )}
      </Suspense>
    </main>
  );
}

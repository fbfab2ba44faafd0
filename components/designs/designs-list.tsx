'use client';

import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useState } from 'react';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { DesignSummary } from '@/lib/schemas/api';
import { DesignsTable } from './designs-table';

// By React itself: next/dynamic would bring more with it than these take.
const NewDesignDialog = lazy(() => import('./new-design-dialog'));
const DeleteDialog = lazy(() => import('./delete-dialog'));

type Asking = { what: 'new' } | { what: 'copy' | 'delete'; design: DesignSummary } | null;

/** The workshop's designs; others' changes appear while one looks. */
export function DesignsList({
  initial,
  lawLabels,
  mayEdit,
}: {
  initial: DesignSummary[];
  lawLabels: Record<string, string>;
  mayEdit: boolean;
}) {
  const query = useQuery({
    queryKey: designKeys.list,
    queryFn: async () => (await loadApi()).fetchDesigns(),
    initialData: initial,
    initialDataUpdatedAt: () => Date.now(),
    refetchInterval: 15_000,
    refetchOnWindowFocus: true,
  });
  const [asking, setAsking] = useState<Asking>(null);
  const designs = query.data;

  return (
    <main id="main" className="mx-auto flex w-full max-w-300 flex-col gap-4 px-5 py-6">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-head">Designs</h1>
        {mayEdit && (
          <Button look="action" onPress={() => setAsking({ what: 'new' })}>
            New design
          </Button>
        )}
      </div>
      {query.isError && (
        <Notice look="warn">{query.error.message} The list below may be out of date.</Notice>
      )}
      {designs.length === 0 ? (
        <p className="max-w-150 border-t border-line pt-4 text-lead">
          {mayEdit
            ? 'No designs yet. Start with New design: take the default or a worked design, then change its tuning law and range.'
            : 'No designs yet. Once a builder of the workshop has saved one, it stands here with its cutting files.'}
        </p>
      ) : (
        <DesignsTable
          designs={designs}
          lawLabels={lawLabels}
          {...(mayEdit && {
            onCopy: (design: DesignSummary) => setAsking({ what: 'copy', design }),
            onDelete: (design: DesignSummary) => setAsking({ what: 'delete', design }),
          })}
        />
      )}
      <Suspense>
        {(asking?.what === 'new' || asking?.what === 'copy') && (
          <NewDesignDialog
            copyOf={asking.what === 'copy' ? asking.design : null}
            onClose={() => setAsking(null)}
          />
        )}
        {asking?.what === 'delete' && (
          <DeleteDialog design={asking.design} onClose={() => setAsking(null)} />
        )}
      </Suspense>
    </main>
  );
}

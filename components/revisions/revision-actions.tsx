'use client';

import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Finding } from '@/geometry';
import type { Revision } from '@/lib/schemas/revision';
import type { May } from './may';
import { useMove } from './use-move';

const ReasonDialog = lazy(() => import('./reason-dialog'));
const ReleaseDialog = lazy(() => import('./release-dialog'));
const OrderDialog = lazy(() => import('@/components/orders/order-dialog'));

/** What this person can do with the revision as it stands. */
export function RevisionActions({
  revision,
  findings,
  may,
}: {
  revision: Revision;
  findings: readonly Finding[];
  may: May;
}) {
  const [open, setOpen] = useState<'draft' | 'withdrawn' | 'release' | 'order' | null>(null);
  const close = () => setOpen(null);
  const asking = useMove(revision, () => undefined);
  const { id, state } = revision;
  return (
    <>
      <div className="flex flex-wrap gap-2 empty:hidden">
        {may.edit && state === 'draft' && (
          <Button
            look="action"
            isDisabled={asking.isPending}
            onPress={() => asking.mutate({ to: 'in-review', from: state })}
          >
            Ask for review
          </Button>
        )}
        {may.edit && state === 'in-review' && (
          <Button onPress={() => setOpen('draft')}>Send back</Button>
        )}
        {may.release && state === 'in-review' && (
          <Button look="action" onPress={() => setOpen('release')}>
            Release
          </Button>
        )}
        {may.order && state === 'released' && (
          <Button look="action" onPress={() => setOpen('order')}>
            Order cutting
          </Button>
        )}
        {may.release && (state === 'released' || state === 'superseded') && (
          <Button look="danger" onPress={() => setOpen('withdrawn')}>
            Withdraw
          </Button>
        )}
      </div>
      {asking.isError && <Notice look="bad">{asking.error.message}</Notice>}
      <Suspense>
        {(open === 'draft' || open === 'withdrawn') && (
          <ReasonDialog revision={revision} to={open} onClose={close} />
        )}
        {open === 'release' && (
          <ReleaseDialog
            revision={revision}
            findings={findings}
            mayWaive={may.waive}
            onClose={close}
          />
        )}
        {open === 'order' && <OrderDialog revision={id} onClose={close} />}
      </Suspense>
    </>
  );
}

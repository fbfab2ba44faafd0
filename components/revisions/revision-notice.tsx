import { LocalTime } from '@/components/ui/local-time';
import { Notice } from '@/components/ui/notice';
import type { Revision } from '@/lib/schemas/revision';

/** Why a revision is not the one to cut, if it is not. */
export function RevisionNotice({
  revision,
  gone,
  mayEdit,
}: {
  revision: Revision;
  /** The design was deleted. */
  gone: boolean;
  mayEdit: boolean;
}) {
  const { designId, number, state, withdrawnBy, withdrawnAt, withdrawnReason } = revision;
  if (gone) {
    return (
      <Notice look="bad">
        <strong>Do not cut. </strong>The design was deleted meanwhile.
      </Notice>
    );
  }
  if (state === 'withdrawn') {
    return (
      <Notice look="bad">
        <strong>Do not cut. </strong>
        {withdrawnBy?.name ?? 'Somebody'} has withdrawn revision {number}
        {withdrawnAt && (
          <>
            , <LocalTime iso={withdrawnAt} />
          </>
        )}
        {withdrawnReason && `: ${withdrawnReason}`}
      </Notice>
    );
  }
  if (state === 'superseded') {
    return (
      <Notice look="warn">
        Revision {number} is superseded: another one has been released since.{' '}
        {/* Afresh: the page may be the very same address. */}
        <a href={mayEdit ? `/designs/${designId}/revisions` : `/designs/${designId}`}>
          {mayEdit ? 'See the revisions' : 'See the one to cut'}
        </a>
      </Notice>
    );
  }
  if (state === 'released') return null;
  return (
    <Notice look="warn">
      {state === 'draft'
        ? 'A draft: nobody has been asked to look at it yet.'
        : 'In review: not released, so not to be cut from yet.'}
    </Notice>
  );
}

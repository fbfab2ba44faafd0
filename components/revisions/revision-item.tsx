import Link from 'next/link';
import { ChecksCell } from '@/components/designs/checks-cell';
import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import type { Revision } from '@/lib/schemas/revision';
import { RevisionBadge } from './revision-badge';
import { WaiverList } from './waiver-list';

const revisionHref = ({ designId, number }: Revision): string =>
  `/designs/${designId}/revisions/${number}`;

/** One revision in the list of a design's. */
export function RevisionItem({
  revision,
  onRestore,
}: {
  revision: Revision;
  onRestore: () => void;
}) {
  const { number, name, note, state, version, kernel, checks, waivers } = revision;
  const { createdAt, createdBy, releasedAt, releasedBy, withdrawnAt, withdrawnBy } = revision;
  return (
    <li className="flex flex-col gap-1.5 border-b border-line px-4 py-3 last:border-0">
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <h3 className="min-w-0 text-lead wrap-anywhere">
          <Link href={revisionHref(revision)} className="inline-flex min-h-11 items-center">
            Revision {number}: {name}
          </Link>
        </h3>
        <RevisionBadge state={state} />
        <ChecksCell checks={checks} />
        <span className="ml-auto">
          <Button onPress={onRestore} aria-label={`Restore revision ${number}`}>
            Restore
          </Button>
        </span>
      </div>
      <p className="text-ink-2">
        version {version}, kernel {kernel}; named by {createdBy.name},{' '}
        <LocalTime iso={createdAt} />
        {releasedAt && (
          <>
            ; released{releasedBy && ` by ${releasedBy.name}`}, <LocalTime iso={releasedAt} />
          </>
        )}
        {withdrawnAt && (
          <>
            ; withdrawn{withdrawnBy && ` by ${withdrawnBy.name}`},{' '}
            <LocalTime iso={withdrawnAt} />: {revision.withdrawnReason}
          </>
        )}
      </p>
      {note && <p className="wrap-anywhere whitespace-pre-wrap">{note}</p>}
      <WaiverList waivers={waivers} />
    </li>
  );
}

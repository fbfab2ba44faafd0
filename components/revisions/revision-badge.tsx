import type { RevisionState } from '@/lib/schemas/revision';

const revisionWords: Readonly<Record<RevisionState, string>> = {
  draft: 'draft',
  'in-review': 'in review',
  released: 'released',
  superseded: 'superseded',
  withdrawn: 'withdrawn',
};

const looks: Readonly<Record<RevisionState, string>> = {
  draft: 'border-edge border-dashed text-ink-2',
  'in-review': 'border-warn text-ink',
  released: 'border-ok text-ok font-semibold',
  superseded: 'border-edge text-ink-2',
  withdrawn: 'border-bad text-bad font-semibold',
};

/** Where a revision stands. */
export function RevisionBadge({ state }: { state: RevisionState }) {
  return (
    <span
      className={`inline-block rounded-[3px] border bg-panel px-2 py-0.5 text-small whitespace-nowrap ${looks[state]}`}
    >
      {revisionWords[state]}
    </span>
  );
}

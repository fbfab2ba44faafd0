import type { DesignState } from '@/lib/schemas/api';

export const stateWords: Record<DesignState['kind'], string> = {
  draft: 'draft',
  'in-review': 'in review',
  released: 'released',
  changed: 'changed since release',
  withdrawn: 'withdrawn',
};

/** As `released, revision 3`. */
export function writtenState({ kind, revision }: DesignState): string {
  if (revision === null) return stateWords[kind];
  return kind === 'changed'
    ? `changed since revision ${revision}`
    : `${stateWords[kind]}, revision ${revision}`;
}

const looks: Record<DesignState['kind'], string> = {
  draft: 'border-edge text-ink-2 border-dashed',
  'in-review': 'border-warn text-ink',
  released: 'border-ok text-ok font-semibold',
  changed: 'border-ok text-ink border-dashed',
  withdrawn: 'border-bad text-bad font-semibold',
};

/** Where a design stands by its revisions. */
export function StatusBadge({ state }: { state: DesignState }) {
  return (
    <span
      className={`inline-block rounded-[3px] border bg-panel px-2 py-0.5 text-small whitespace-nowrap ${looks[state.kind]}`}
    >
      {writtenState(state)}
    </span>
  );
}

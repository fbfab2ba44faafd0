import type { DesignStatus } from '@/lib/schemas/api';

export const statusWords: Record<DesignStatus, string> = {
  draft: 'draft',
  ready: 'ready to cut',
};

export function StatusBadge({ status }: { status: DesignStatus }) {
  const look =
    status === 'ready'
      ? 'border-ok text-ok font-semibold'
      : 'border-edge text-ink-2 border-dashed';
  return (
    <span
      className={`inline-block rounded-[3px] border bg-panel px-2 py-0.5 text-small whitespace-nowrap ${look}`}
    >
      {statusWords[status]}
    </span>
  );
}

import type { OrderState } from '@/lib/schemas/order';

export const stateWords: Readonly<Record<OrderState, string>> = {
  queued: 'queued',
  cutting: 'cutting',
  returned: 'returned',
  cut: 'cut',
  cancelled: 'cancelled',
};

const looks: Readonly<Record<OrderState, string>> = {
  queued: 'border-edge text-ink',
  cutting: 'border-action text-action font-semibold',
  returned: 'border-warn text-warn font-semibold',
  cut: 'border-ok text-ok font-semibold',
  cancelled: 'border-edge border-dashed text-ink-2',
};

export function StateBadge({ state }: { state: OrderState }) {
  return (
    <span
      className={`inline-block rounded-[3px] border bg-panel px-2 py-0.5 text-small whitespace-nowrap ${looks[state]}`}
    >
      {stateWords[state]}
    </span>
  );
}

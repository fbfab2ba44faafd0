import type { OrderState, OrderSummary } from '@/lib/schemas/order';
import { stateWords } from './state-badge';

export type StateAsked = 'open' | 'all' | OrderState;

export const stateOptions: readonly { readonly value: StateAsked; readonly label: string }[] = [
  { value: 'open', label: 'open' },
  { value: 'all', label: 'all' },
  ...Object.entries(stateWords).map(([value, label]) => ({
    value: value as OrderState,
    label,
  })),
];

export interface Asked {
  readonly words: string;
  readonly state: StateAsked;
  /** Ordered or taken by the person who looks. */
  readonly mine: boolean;
  readonly overdue: boolean;
}

export const isOpen = ({ state }: Pick<OrderSummary, 'state'>): boolean =>
  state !== 'cut' && state !== 'cancelled';

/** Its day has passed, and it is not done with. @param today where the reader is */
export const isOverdue = (
  order: Pick<OrderSummary, 'state' | 'dueOn'>,
  today: string,
): boolean => isOpen(order) && order.dueOn < today;

/** Must its revision no longer be cut? */
export const isStopped = (order: Pick<OrderSummary, 'state' | 'revision'>): boolean =>
  isOpen(order) && order.revision.state !== 'released';

const textsOf = (order: OrderSummary): string[] => [
  `order ${order.number}`,
  order.revision.designName,
  `revision ${order.revision.number}`,
  order.revision.name,
  order.sheet.name,
  order.machine.name,
  order.orderedBy.name,
  order.takenBy?.name ?? '',
  stateWords[order.state],
];

/** Orders that fit all that is asked. @param me id of the person who looks */
export function found(
  orders: readonly OrderSummary[],
  { words, state, mine, overdue }: Asked,
  me: string,
  today: string,
): OrderSummary[] {
  const sought = words.trim().toLowerCase();
  return orders.filter(
    (order) =>
      (state === 'all' || (state === 'open' ? isOpen(order) : order.state === state)) &&
      (!mine || order.orderedBy.id === me || order.takenBy?.id === me) &&
      (!overdue || isOverdue(order, today)) &&
      textsOf(order).some((text) => text.toLowerCase().includes(sought)),
  );
}

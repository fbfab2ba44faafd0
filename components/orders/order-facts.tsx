import { LocalTime } from '@/components/ui/local-time';
import { formatQuantity } from '@/geometry';
import type { Order } from '@/lib/schemas/order';
import { DueDay } from './due-day';

const millimetres = (value: unknown): string => formatQuantity(Number(value), 'length');

/** What was asked for, and once it is cut, what came of it. */
export function OrderFacts({ order, overdue }: { order: Order; overdue: boolean }) {
  const { revision, sheet, machine, state } = order;
  const cut = state === 'cut';
  const rows: (readonly [string, React.ReactNode])[] = [
    [
      'Revision',
      <a key="revision" href={`/designs/${revision.designId}/revisions/${revision.number}`}>
        {revision.designName}, revision {revision.number}: {revision.name} ({revision.state})
      </a>,
    ],
    ['Capacitors', order.quantity],
    [cut ? 'Sheets used' : 'Sheets', `${order.sheets} × ${sheet.name}`],
    [
      'Sheet',
      `${millimetres(sheet.values.thickness)}, ${millimetres(sheet.values.width)} × ${millimetres(sheet.values.height)}${sheet.gone ? '; taken out of the store since' : `, ${sheet.values.count} in store`}`,
    ],
    [
      'Machine',
      `${machine.name}, ${machine.values.process}${machine.gone ? '; taken out of the shop since' : ''}`,
    ],
    ['Its kerf', millimetres(machine.values.kerf)],
    ['Due', <DueDay key="due" day={order.dueOn} overdue={overdue} />],
    [
      'Ordered',
      <span key="ordered">
        by {order.orderedBy.name}, <LocalTime iso={order.orderedAt} />
      </span>,
    ],
  ];
  if (order.takenBy && (state === 'cutting' || cut))
    rows.push(['Taken by', order.takenBy.name]);
  if (order.cutAt) {
    rows.push(
      ['Cut', <LocalTime key="cut" iso={order.cutAt} />],
      ['Pieces spoilt', order.scrap ?? 0],
      [
        'Kerf as measured',
        order.actualKerf === null ? 'not measured' : millimetres(order.actualKerf),
      ],
    );
  }
  return (
    <dl aria-label="Order" className="grid grid-cols-[8rem_minmax(0,1fr)] gap-x-3 gap-y-1.5">
      {rows.map(([name, value]) => (
        <div key={name} className="col-span-2 grid grid-cols-subgrid">
          <dt className="text-ink-2">{name}</dt>
          <dd className="min-w-0 break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

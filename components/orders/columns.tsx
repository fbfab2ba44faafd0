import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_basic,
  sortFn_text,
  tableFeatures,
} from '@tanstack/react-table';
import Link from 'next/link';
import type { OrderSummary } from '@/lib/schemas/order';
import { DueDay } from './due-day';
import { isOverdue, isStopped } from './search';
import { StateBadge, stateWords } from './state-badge';

export const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { text: sortFn_text, basic: sortFn_basic },
});

const helper = createColumnHelper<typeof features, OrderSummary>();

const revisionWords = ({ revision }: OrderSummary): string =>
  `${revision.designName}, revision ${revision.number}`;

/** @param today where the reader is */
export const columnsFor = (today: string) =>
  helper.columns([
    helper.accessor('number', {
      header: 'Order',
      sortFn: 'basic',
      sortDescFirst: false,
      cell: ({ row, getValue }) => (
        <Link
          href={`/orders/${row.original.id}`}
          className="flex min-h-11 items-center py-1 font-semibold"
        >
          Order {getValue()}
        </Link>
      ),
    }),
    helper.accessor((order) => stateWords[order.state], {
      id: 'state',
      header: 'State',
      sortFn: 'text',
      cell: ({ row: { original } }) => (
        <span className="flex flex-wrap items-center gap-x-2">
          <StateBadge state={original.state} />
          {original.state === 'cutting' && original.takenBy && (
            <span className="text-small text-ink-2">{original.takenBy.name}</span>
          )}
        </span>
      ),
    }),
    helper.accessor(revisionWords, {
      id: 'revision',
      header: 'To cut',
      sortFn: 'text',
      cell: ({ row: { original } }) => (
        <span className="flex flex-col py-1">
          <span className="break-words">
            {original.quantity} × {original.revision.designName}
          </span>
          <span className="text-small text-ink-2">
            revision {original.revision.number}, {original.revision.name}
          </span>
          {isStopped(original) && (
            <strong className="text-small text-bad">
              {original.revision.state}: must not be cut
            </strong>
          )}
        </span>
      ),
    }),
    helper.accessor((order) => order.sheet.name, {
      id: 'sheet',
      header: 'Sheet',
      sortFn: 'text',
      cell: ({ row: { original } }) => `${original.sheets} × ${original.sheet.name}`,
    }),
    helper.accessor((order) => order.machine.name, {
      id: 'machine',
      header: 'Machine',
      sortFn: 'text',
    }),
    helper.accessor('dueOn', {
      header: 'Due',
      sortFn: 'basic',
      cell: ({ row: { original } }) => (
        <>
          <span className="bench:hidden">due </span>
          <DueDay day={original.dueOn} overdue={isOverdue(original, today)} />
        </>
      ),
    }),
    helper.accessor((order) => order.orderedBy.name, {
      id: 'by',
      header: 'Ordered by',
      sortFn: 'text',
      cell: ({ getValue }) => (
        <>
          <span className="bench:hidden">ordered by </span>
          {getValue()}
        </>
      ),
    }),
  ]);

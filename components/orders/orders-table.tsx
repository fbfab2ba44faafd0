'use client';

import { useTable, type SortingState } from '@tanstack/react-table';
import { useMemo, useState } from 'react';
import { SortButton } from '@/components/designs/sort-button';
import type { OrderSummary } from '@/lib/schemas/order';
import { columnsFor, features } from './columns';
import { QueueFiles } from './queue-files';

function ariaSort(direction: false | 'asc' | 'desc') {
  if (!direction) return 'none' as const;
  return direction === 'asc' ? ('ascending' as const) : ('descending' as const);
}

/** Cells that say which order it is; on a card the files follow them, then the rest. */
const NAMING = 2;

// On a narrow screen every row becomes a card, which would take the table's meaning from it: hence
// the roles.
export function OrdersTable({
  orders,
  today,
}: {
  orders: OrderSummary[];
  /** Where the reader is. */
  today: string;
}) {
  const [sorting, setSorting] = useState<SortingState>([{ id: 'dueOn', desc: false }]);
  const columns = useMemo(() => columnsFor(today), [today]);
  const table = useTable({
    features,
    columns,
    data: orders,
    getRowId: (order) => order.id,
    enableSortingRemoval: false,
    state: { sorting },
    onSortingChange: setSorting,
  });
  const { rows } = table.getRowModel();
  return (
    <table role="table" className="dense w-full border-y border-line bg-panel max-bench:block">
      <caption className="sr-only">Cut orders of the workshop</caption>
      <thead role="rowgroup" className="max-bench:block">
        {table.getHeaderGroups().map((group) => (
          <tr
            key={group.id}
            role="row"
            className="border-b border-line bg-page max-bench:flex max-bench:flex-wrap"
          >
            {group.headers.map((header) => (
              <th
                key={header.id}
                scope="col"
                role="columnheader"
                aria-sort={ariaSort(header.column.getIsSorted())}
                className="px-3 text-left"
              >
                <SortButton
                  direction={header.column.getIsSorted()}
                  onPress={() => header.column.toggleSorting()}
                >
                  <table.FlexRender header={header} />
                </SortButton>
              </th>
            ))}
            <th
              scope="col"
              role="columnheader"
              className="px-3 text-left text-small font-semibold text-ink-2 max-bench:sr-only"
            >
              Files to cut from
            </th>
          </tr>
        ))}
      </thead>
      <tbody role="rowgroup" className="max-bench:block">
        {rows.map((row) => (
          <tr
            key={row.id}
            role="row"
            className="border-b border-line last:border-0 hover:bg-white max-bench:flex max-bench:flex-wrap max-bench:items-center max-bench:gap-y-0.5 max-bench:py-2"
          >
            {row.getAllCells().map((cell, index) => (
              <td
                key={cell.id}
                role="cell"
                className={`px-3 py-1.5 max-bench:py-0.5 max-bench:nth-3:basis-full ${index < NAMING ? '' : 'max-bench:order-2'}`}
              >
                <table.FlexRender cell={cell} />
              </td>
            ))}
            <td role="cell" className="px-3 max-bench:order-1 max-bench:basis-full">
              <QueueFiles order={row.original} />
            </td>
          </tr>
        ))}
        {rows.length === 0 && (
          <tr role="row">
            <td role="cell" colSpan={columns.length + 1} className="px-3 py-4">
              No order fits. Clear the search, or show orders in all states.
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}

'use client';

import { useTable, type SortingState } from '@tanstack/react-table';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { DesignSummary } from '@/lib/schemas/api';
import { columns, features, statusOptions } from './columns';
import { SortButton } from './sort-button';

/** Cells that a narrow screen leaves out; the name, status and checks stay. */
const wideOnly = new Set(['law', 'by']);

const cellClass = (id: string) => (wideOnly.has(id) ? 'max-bench:hidden' : '');

export function DesignsTable({
  designs,
  onCopy,
  onDelete,
}: {
  designs: DesignSummary[];
  onCopy?: (design: DesignSummary) => void;
  onDelete?: (design: DesignSummary) => void;
}) {
  const [search, setSearch] = useState('');
  const [status, setStatus] = useState<(typeof statusOptions)[number]['value']>('all');
  const [sorting, setSorting] = useState<SortingState>([{ id: 'updatedAt', desc: true }]);
  const table = useTable({
    features,
    columns,
    data: designs,
    getRowId: (design) => design.id,
    globalFilterFn: 'includesString',
    enableSortingRemoval: false,
    state: {
      globalFilter: search.trim(),
      columnFilters: status === 'all' ? [] : [{ id: 'status', value: status }],
      sorting,
    },
    onSortingChange: setSorting,
  });
  const { rows } = table.getRowModel();

  return (
    <>
      <div className="flex flex-wrap items-end gap-3">
        <div className="w-full max-w-80 grow">
          <TextField label="Search" type="search" value={search} onChange={setSearch} />
        </div>
        <SelectField
          label="Status"
          value={status}
          options={statusOptions}
          onChange={setStatus}
        />
        <p role="status" className="py-2 text-ink-2">
          {rows.length === designs.length
            ? `${designs.length} ${designs.length === 1 ? 'design' : 'designs'}`
            : `${rows.length} of ${designs.length} designs`}
        </p>
      </div>
      <table className="dense w-full border-y border-line bg-panel">
        <caption className="sr-only">Designs of the workshop</caption>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id} className="border-b border-line bg-page">
              {group.headers.map((header) => (
                <th
                  key={header.id}
                  scope="col"
                  aria-sort={ariaSort(header.column.getIsSorted())}
                  className={`px-3 text-left max-wide:px-2 ${cellClass(header.column.id)}`}
                >
                  <SortButton
                    direction={header.column.getIsSorted()}
                    onPress={() => header.column.toggleSorting()}
                  >
                    <table.FlexRender header={header} />
                  </SortButton>
                </th>
              ))}
              {onCopy && (
                <th scope="col" className="px-3 max-wide:hidden">
                  <span className="sr-only">What can be done</span>
                </th>
              )}
            </tr>
          ))}
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id} className="border-b border-line last:border-0 hover:bg-white">
              {row.getAllCells().map((cell) => (
                <td
                  key={cell.id}
                  className={`px-3 py-0.5 max-wide:px-2 ${cellClass(cell.column.id)}`}
                >
                  <table.FlexRender cell={cell} />
                </td>
              ))}
              {onCopy && onDelete && (
                <td className="px-1 text-right whitespace-nowrap max-wide:hidden">
                  <Button
                    look="quiet"
                    aria-label={`Duplicate ${row.original.name}`}
                    onPress={() => onCopy(row.original)}
                  >
                    Duplicate
                  </Button>
                  <Button
                    look="quiet"
                    aria-label={`Delete ${row.original.name}`}
                    onPress={() => onDelete(row.original)}
                  >
                    Delete
                  </Button>
                </td>
              )}
            </tr>
          ))}
          {rows.length === 0 && (
            <tr>
              <td colSpan={columns.length + 1} className="px-3 py-4">
                No design fits this search. Clear the search or set the status to all.
              </td>
            </tr>
          )}
        </tbody>
      </table>
    </>
  );
}

function ariaSort(direction: false | 'asc' | 'desc') {
  if (!direction) return 'none' as const;
  return direction === 'asc' ? ('ascending' as const) : ('descending' as const);
}

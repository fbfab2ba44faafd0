'use client';

import { useTable, type SortingState } from '@tanstack/react-table';
import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { SearchField } from '@/components/ui/search-field';
import type { DesignSummary } from '@/lib/schemas/api';
import { columnsWith, features } from './columns';
import { found, statusOptions, type StatusAsked } from './search';
import { SortButton } from './sort-button';

// On a narrow screen every row is laid out in lines, which would take the table's meaning from it:
// hence the roles.
export function DesignsTable({
  designs,
  lawLabels,
  onCopy,
  onDelete,
}: {
  designs: DesignSummary[];
  lawLabels: Record<string, string>;
  onCopy?: (design: DesignSummary) => void;
  onDelete?: (design: DesignSummary) => void;
}) {
  const [search, setSearch] = useState('');
  const [status, setStatus] = useState<StatusAsked>('all');
  const [sorting, setSorting] = useState<SortingState>([{ id: 'updatedAt', desc: true }]);
  const columns = useMemo(() => columnsWith(lawLabels), [lawLabels]);
  const data = useMemo(
    () => found(designs, search, status, lawLabels),
    [designs, search, status, lawLabels],
  );
  const table = useTable({
    features,
    columns,
    data,
    getRowId: (design) => design.id,
    enableSortingRemoval: false,
    state: { sorting },
    onSortingChange: setSorting,
  });
  const { rows } = table.getRowModel();

  return (
    <>
      <div className="flex flex-wrap items-end gap-3">
        <div className="w-full max-w-80 grow">
          <SearchField label="Search" value={search} onChange={setSearch} />
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
      <table role="table" className="dense w-full border-y border-line bg-panel max-wide:block">
        <caption className="sr-only">Designs of the workshop</caption>
        <thead role="rowgroup" className="max-wide:block">
          {table.getHeaderGroups().map((group) => (
            <tr
              key={group.id}
              role="row"
              className="border-b border-line bg-page max-wide:flex max-wide:flex-wrap"
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
              {onCopy && (
                <th scope="col" role="columnheader" className="px-3 max-wide:sr-only">
                  <span className="sr-only">What can be done</span>
                </th>
              )}
            </tr>
          ))}
        </thead>
        <tbody role="rowgroup" className="max-wide:block">
          {rows.map((row) => (
            <tr
              key={row.id}
              role="row"
              className="border-b border-line last:border-0 hover:bg-white max-wide:flex max-wide:flex-wrap max-wide:items-center max-wide:pb-1"
            >
              {row.getAllCells().map((cell) => (
                <td key={cell.id} role="cell" className="px-3 py-0.5 max-wide:first:basis-full">
                  <table.FlexRender cell={cell} />
                </td>
              ))}
              {onCopy && onDelete && (
                <td role="cell" className="px-1 text-right whitespace-nowrap max-wide:grow">
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
            <tr role="row">
              <td role="cell" colSpan={columns.length + 1} className="px-3 py-4">
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

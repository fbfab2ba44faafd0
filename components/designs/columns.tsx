import {
  columnFilteringFeature,
  createColumnHelper,
  createFilteredRowModel,
  createSortedRowModel,
  filterFn_equalsString,
  filterFn_includesString,
  globalFilteringFeature,
  rowSortingFeature,
  sortFn_text,
  tableFeatures,
} from '@tanstack/react-table';
import Link from 'next/link';
import { LocalTime } from '@/components/ui/local-time';
import { StatusBadge, statusWords } from '@/components/ui/status-badge';
import type { DesignSummary } from '@/lib/schemas/api';
import { ChecksCell, checksRank } from './checks-cell';

export const features = tableFeatures({
  columnFilteringFeature,
  globalFilteringFeature,
  rowSortingFeature,
  filteredRowModel: createFilteredRowModel(),
  sortedRowModel: createSortedRowModel(),
  filterFns: { includesString: filterFn_includesString, equalsString: filterFn_equalsString },
  sortFns: { text: sortFn_text },
});

/** The laws of a design's sections, each named once. */
export const lawsOf = ({ laws }: DesignSummary, labels: Record<string, string>): string =>
  [...new Set(laws.map((law) => labels[law] ?? law))].join(', ');

const helper = createColumnHelper<typeof features, DesignSummary>();

/** @param labels of the laws; from the server, so that the page needs no kernel. */
export const columnsWith = (labels: Record<string, string>) =>
  helper.columns([
    helper.accessor('name', {
      header: 'Name',
      sortFn: 'text',
      cell: ({ row, getValue }) => (
        <Link
          href={`/designs/${row.original.id}`}
          className="flex min-h-11 items-center py-1 font-semibold break-words"
        >
          {getValue()}
        </Link>
      ),
    }),
    helper.accessor('status', {
      header: 'Status',
      sortFn: 'text',
      filterFn: 'equalsString',
      cell: ({ getValue }) => <StatusBadge status={getValue()} />,
    }),
    helper.accessor((design) => checksRank(design.checks), {
      id: 'checks',
      header: 'Checks',
      enableGlobalFilter: false,
      cell: ({ row }) => <ChecksCell checks={row.original.checks} />,
    }),
    helper.accessor((design) => lawsOf(design, labels), {
      id: 'law',
      header: 'Law',
      sortFn: 'text',
    }),
    helper.accessor('updatedAt', {
      header: 'Last change',
      sortFn: 'text',
      enableGlobalFilter: false,
      cell: ({ getValue }) => <LocalTime iso={getValue()} />,
    }),
    helper.accessor((design) => design.updatedBy.name, {
      id: 'by',
      header: 'By',
      sortFn: 'text',
    }),
  ]);

export const statusOptions = [
  { value: 'all', label: 'all' },
  { value: 'draft', label: statusWords.draft },
  { value: 'ready', label: statusWords.ready },
] as const;

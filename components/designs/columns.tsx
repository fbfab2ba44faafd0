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
import { sectionParameters } from '@/geometry';
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

const lawLabels = new Map<string, string>(
  sectionParameters.law.options.map(({ value, label }) => [value, label]),
);

function lawsOf(design: DesignSummary): string {
  const laws = design.laws.map((law) => lawLabels.get(law) ?? law);
  return [...new Set(laws)].join(', ');
}

const helper = createColumnHelper<typeof features, DesignSummary>();

export const columns = helper.columns([
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
  helper.accessor(lawsOf, { id: 'law', header: 'Law', sortFn: 'text' }),
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

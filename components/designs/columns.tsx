import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_text,
  tableFeatures,
} from '@tanstack/react-table';
import Link from 'next/link';
import { LocalTime } from '@/components/ui/local-time';
import { StatusBadge, writtenState } from '@/components/ui/status-badge';
import type { DesignSummary } from '@/lib/schemas/api';
import { ChecksCell, checksRank } from './checks-cell';
import { lawsOf } from './search';

export const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { text: sortFn_text },
});

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
    helper.accessor((design) => writtenState(design.state), {
      id: 'status',
      header: 'Status',
      sortFn: 'text',
      cell: ({ row }) => <StatusBadge state={row.original.state} />,
    }),
    helper.accessor((design) => checksRank(design.checks), {
      id: 'checks',
      header: 'Checks',
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
      cell: ({ getValue }) => <LocalTime iso={getValue()} />,
    }),
    helper.accessor((design) => design.updatedBy.name, {
      id: 'by',
      header: 'By',
      sortFn: 'text',
    }),
  ]);

import { statusWords } from '@/components/ui/status-badge';
import type { DesignSummary } from '@/lib/schemas/api';

export const statusOptions = [
  { value: 'all', label: 'all' },
  { value: 'draft', label: statusWords.draft },
  { value: 'ready', label: statusWords.ready },
] as const;

export type StatusAsked = (typeof statusOptions)[number]['value'];

/** The laws of a design's sections, each named once. */
export const lawsOf = ({ laws }: DesignSummary, labels: Record<string, string>): string =>
  [...new Set(laws.map((law) => labels[law] ?? law))].join(', ');

/** Designs of a status in whose name, status, law or last hand the words stand. */
export function found(
  designs: readonly DesignSummary[],
  words: string,
  status: StatusAsked,
  labels: Record<string, string>,
): DesignSummary[] {
  const asked = words.trim().toLowerCase();
  return designs.filter(
    (design) =>
      (status === 'all' || design.status === status) &&
      [
        design.name,
        statusWords[design.status],
        lawsOf(design, labels),
        design.updatedBy.name,
      ].some((text) => text.toLowerCase().includes(asked)),
  );
}

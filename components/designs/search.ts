import { stateWords, writtenState } from '@/components/ui/status-badge';
import type { DesignState, DesignSummary } from '@/lib/schemas/api';

export type StatusAsked = 'all' | DesignState['kind'];

export const statusOptions: readonly { value: StatusAsked; label: string }[] = [
  { value: 'all', label: 'all' },
  ...(Object.keys(stateWords) as DesignState['kind'][]).map((kind) => ({
    value: kind,
    label: stateWords[kind],
  })),
];

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
      (status === 'all' || design.state.kind === status) &&
      [
        design.name,
        writtenState(design.state),
        lawsOf(design, labels),
        design.updatedBy.name,
      ].some((text) => text.toLowerCase().includes(asked)),
  );
}

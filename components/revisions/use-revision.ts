import { useQuery } from '@tanstack/react-query';
import { loadRevisions } from '@/components/api/load-revisions';
import { RequestError } from '@/components/api/request-error';
import { revisionKeys } from '@/components/api/revision-keys';
import type { DesignFiles } from '@/lib/schemas/api';
import type { Revision } from '@/lib/schemas/revision';

/** How often a revision is looked at even where nothing was heard of it, ms. */
const PERIOD = 10_000;

/** A revision as it stands, also when others move it; `gone` once its design is deleted. */
export function useRevision(first: Revision) {
  const { data, error } = useQuery({
    queryKey: revisionKeys.one(first.id),
    queryFn: async () => (await loadRevisions()).fetchRevision(first.id),
    initialData: first,
    refetchInterval: PERIOD,
    refetchOnWindowFocus: true,
    retry: false,
  });
  const gone = error instanceof RequestError && error.code === 'not-found';
  return { revision: data, gone, trouble: error && !gone ? error.message : null };
}

/**
 * The files of a revision as they are kept.
 * @param since when the revision that the page came with had last been moved
 * @param first its list
 */
export function useRevisionFiles(
  { id, updatedAt }: Revision,
  since: string,
  first: DesignFiles | null,
  wanted: boolean,
) {
  return useQuery({
    // A release writes them anew, with its name in the drawing.
    queryKey: revisionKeys.files(id, updatedAt),
    queryFn: async () => (await loadRevisions()).fetchRevisionFiles(id),
    enabled: wanted,
    ...(first && updatedAt === since && { initialData: first }),
    staleTime: Infinity,
    retry: false,
  });
}

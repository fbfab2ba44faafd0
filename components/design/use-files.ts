import { useQuery } from '@tanstack/react-query';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';

/** Files of the saved version. @param first the list as the page came with it */
export function useFiles({ id, version }: DesignRecord, first: DesignFiles | null) {
  return useQuery({
    queryKey: designKeys.files(id, version),
    queryFn: async () => (await loadApi()).fetchFiles(id),
    ...(first?.version === version && { initialData: first }),
    staleTime: Infinity,
  });
}

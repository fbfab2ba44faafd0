'use client';

import { useQuery } from '@tanstack/react-query';
import { designKeys } from '@/components/api/design-keys';
import { loadApi } from '@/components/api/load-api';
import { RequestError } from '@/components/api/request-error';
import type { DesignRecord, DesignState } from '@/lib/schemas/api';

/** How often an open design is looked at for others' changes, ms. */
const PERIOD = 10_000;

/** What others did to the open design: a later version, its end, or where its revisions stand. */
export function useNews(known: DesignRecord): {
  later: DesignRecord | null;
  gone: boolean;
  state: DesignState;
} {
  const { data, error } = useQuery({
    queryKey: designKeys.record(known.id),
    queryFn: async () => (await loadApi()).fetchDesign(known.id),
    initialData: known,
    initialDataUpdatedAt: () => Date.now(),
    refetchInterval: PERIOD,
    refetchOnWindowFocus: true,
    retry: false,
  });
  const changed =
    data.version > known.version ||
    (data.version === known.version && data.updatedAt > known.updatedAt);
  return {
    later: changed ? data : null,
    state: data.version < known.version ? known.state : data.state,
    gone: error instanceof RequestError && error.code === 'not-found',
  };
}

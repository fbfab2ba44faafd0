'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useLive } from './live/use-live';

/** What the workshop's pages share in the browser. */
export function Providers({
  since,
  children,
}: {
  /** The last change in the workshop that the page was made with. */
  since: string;
  children: ReactNode;
}) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: { queries: { staleTime: 10_000, retry: 1 }, mutations: { retry: 0 } },
      }),
  );
  const [first] = useState(since);
  useLive(client, first);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}

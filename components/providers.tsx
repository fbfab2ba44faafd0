'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { I18nProvider } from 'react-aria-components/I18nProvider';
import { useState, type ReactNode } from 'react';
import { z } from 'zod';

// The content security policy forbids the code that zod would otherwise generate.
z.config({ jitless: true });

export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: { queries: { staleTime: 10_000, retry: 1 }, mutations: { retry: 0 } },
      }),
  );
  return (
    <I18nProvider locale="en-GB">
      <QueryClientProvider client={client}>{children}</QueryClientProvider>
    </I18nProvider>
  );
}

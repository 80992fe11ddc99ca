'use client';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';

import { ApiError } from '@/lib/api/client';

/** One cache a page load. Old content stays while new is fetched; refusals are not tried again, lost answers are. */
export function QueryProvider({ children }: { children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: {
            staleTime: 10_000,
            retry: (count, error) =>
              count < 3 && (!(error instanceof ApiError) || [0, 503].includes(error.problem.status)),
          },
          // Without a network a press is answered too: one that waited unseen would pay or dispatch when nobody expects it.
          mutations: { networkMode: 'always' },
        },
      }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}

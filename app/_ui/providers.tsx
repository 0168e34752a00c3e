'use client';

import { environmentManager, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { LiveRegionProvider } from './live-region';

/** What client components share: the data client and the region that speaks changes. */
export function Providers({ children }: { readonly children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient()}>
      <LiveRegionProvider>{children}</LiveRegionProvider>
    </QueryClientProvider>
  );
}

let browserClient: QueryClient | undefined;

/** One client for the life of the tab; on the server one for each request, so that nothing leaks. */
function queryClient(): QueryClient {
  if (environmentManager.isServer()) return makeClient();
  browserClient ??= makeClient();
  return browserClient;
}

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: 1 },
      mutations: { retry: false },
    },
  });
}

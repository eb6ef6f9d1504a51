import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import type { ReactElement, ReactNode } from 'react';
import type { Api } from '../../shared/contracts/api.ts';
import { ApiProvider } from '../lib/use-api.ts';

/** How long an answer counts as fresh: a sheet that is opened again within it is not asked for again. */
const freshMilliseconds = 30_000;

/** Makes the cache that loaders prime and sheets read. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: { queries: { staleTime: freshMilliseconds, retry: false, refetchOnWindowFocus: false } },
  });
}

interface ProvidersProps {
  readonly api: Api;
  readonly queryClient: QueryClient;
  readonly children: ReactNode;
}

/** What every sheet may reach: the door to the book, and the cache. */
export function Providers({ api, queryClient, children }: ProvidersProps): ReactElement {
  return (
    <ApiProvider value={api}>
      <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>
    </ApiProvider>
  );
}

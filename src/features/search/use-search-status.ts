import { useSyncExternalStore } from 'react';
import { pageSearchClient, type SearchStatus } from './search-client.ts';

const onTheServer: SearchStatus = { lines: null, prose: null, network: 'reached' };

/** How the search in this browser stands; as if nothing were there, in the server's markup. */
export function useSearchStatus(): SearchStatus {
  return useSyncExternalStore(
    (listener) => pageSearchClient().subscribe(listener),
    () => pageSearchClient().status(),
    () => onTheServer,
  );
}

import { useSyncExternalStore } from 'react';

function never(): () => void {
  return () => undefined;
}

/** False in the server's markup and while the browser takes it over, true from then on. */
export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}

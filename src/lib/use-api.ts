import { useSuspenseQuery, type QueryKey, type UseSuspenseQueryOptions } from '@tanstack/react-query';
import { createContext, use } from 'react';
import type { Api } from '../../shared/contracts/api.ts';

/** The same door that loaders get from the router's context, for the sheets. */
export const ApiProvider = createContext<Api | null>(null);

/** The door to the book; only inside the application's providers. */
export function useApi(): Api {
  const api = use(ApiProvider);
  if (api === null) throw new Error('useApi outside the providers');
  return api;
}

/** Reads an answer that the sheet's loader has primed. */
export function useAnswer<Value, Key extends QueryKey>(
  options: UseSuspenseQueryOptions<Value, Error, Value, Key>,
): Value {
  return useSuspenseQuery(options).data;
}

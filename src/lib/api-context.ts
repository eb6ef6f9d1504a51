import { type QueryClient } from '@tanstack/react-query';
import { createContext } from 'react-router';
import type { Api } from '../../shared/contracts/api.ts';
import type { Bench } from './bench.ts';

declare module 'react-router' {
  // Makes the router's context typed in loaders and actions.
  interface Future {
    v8_middleware: true;
  }
}

/** The door through which a loader or an action reaches the book: the server's own, or HTTP in the browser. */
export const apiContext = createContext<Api>();

/** The cache that a loader primes and the sheets read. One a request on the server, one a visit in the browser. */
export const queryClientContext = createContext<QueryClient>();

/** What is on the reader's bench. */
export const benchContext = createContext<Bench>();

import type { FetchQueryOptions, QueryKey } from '@tanstack/react-query';
import { data, type Params, type RouterContextProvider } from 'react-router';
import type { Api } from '../../shared/contracts/api.ts';
import { problem } from '../../shared/lib/problem.ts';
import { isSlug } from '../../shared/lib/slug.ts';
import { isShelf, type PageAddress, type Shelf, type SubjectAddress } from '../../shared/pages/address.ts';
import { apiContext, queryClientContext } from './api-context.ts';

type Context = Readonly<RouterContextProvider>;

/** The door to the book, for a loader or an action. */
export function apiOf(context: Context): Api {
  return context.get(apiContext);
}

/** Asks for an answer and puts it in the cache, where the sheet reads it. Throws what the book refuses. */
export async function prime<Value, Key extends QueryKey>(
  context: Context,
  options: FetchQueryOptions<Value, Error, Value, Key>,
): Promise<Value> {
  return context.get(queryClientContext).fetchQuery(options);
}

/** The shelf of an address; throws what the error sheet shows where there is none of that name. */
export function requireShelf({ shelf = '' }: Params): Shelf {
  if (!isShelf(shelf)) throw nothingHere();
  return shelf;
}

/** The subject of an address; throws what the error sheet shows where it cannot be one. */
export function requireSubject(parameters: Params): SubjectAddress {
  const { subject = '' } = parameters;
  if (!isSlug(subject)) throw nothingHere();
  return { shelf: requireShelf(parameters), subject };
}

/** The page of an address; throws what the error sheet shows where it cannot be one. */
export function requirePage(parameters: Params): PageAddress {
  const { page = '' } = parameters;
  if (!isSlug(page)) throw nothingHere();
  return { ...requireSubject(parameters), page };
}

/** A number of a revision; throws what the error sheet shows where it is none. */
export function requireRevision(text: string | null | undefined): number {
  const number = Number(text ?? '');
  if (!Number.isInteger(number) || number < 1) throw nothingHere();
  return number;
}

/** What a loader throws where nothing of that address can be in the book. */
export function nothingHere() {
  const refusal = problem(
    'not-found',
    'There is no sheet at this address',
    'It may have been renamed, or the address was cut short on its way. Search for what you were after, or start at a shelf.',
  );
  return data(refusal, { status: refusal.status });
}

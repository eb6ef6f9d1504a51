import type { LoaderFunctionArgs } from 'react-router';
import { apiOf, prime, requireShelf } from '../../lib/loading.ts';
import { shelfQuery } from '../../lib/queries.ts';

/** A shelf of the book. */
export async function shelfLoader({ context, params }: LoaderFunctionArgs) {
  const shelf = requireShelf(params);
  await prime(context, shelfQuery(apiOf(context), shelf));
  return { shelf };
}

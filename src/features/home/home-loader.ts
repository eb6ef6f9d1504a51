import type { LoaderFunctionArgs } from 'react-router';
import { benchContext } from '../../lib/api-context.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { homeQuery } from '../../lib/queries.ts';

/** The first page: what is in the book, and what is on the reader's bench. */
export async function homeLoader({ context }: LoaderFunctionArgs) {
  await prime(context, homeQuery(apiOf(context)));
  const { donor, variant } = context.get(benchContext);
  return { bench: { donor, variant } };
}

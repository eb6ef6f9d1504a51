import type { LoaderFunctionArgs, ShouldRevalidateFunctionArgs } from 'react-router';
import { benchContext } from '../../lib/api-context.ts';
import { readVariant, type Bench } from '../../lib/bench.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { searchQuery } from '../../lib/queries.ts';

/** The longest query that is read. */
export const longestQuery = 300;

/** What the search sheet is asked for by its address, with what is on the bench; the answer is in the cache. */
export async function searchLoader({ context, request }: LoaderFunctionArgs) {
  const parameters = new URL(request.url).searchParams;
  const query = (parameters.get('q') ?? '').slice(0, longestQuery);
  const bench = benchFor(parameters, context.get(benchContext));
  if (query.trim() !== '') await prime(context, searchQuery(apiOf(context), query, bench));
  return { query, bench };
}

/** The bench, with the year or market that the address names in place of its own. */
function benchFor(parameters: URLSearchParams, bench: Bench): Bench {
  const asked = ['year', 'market', 'frame'].some((name) => parameters.has(name));
  return asked ? { donor: bench.donor, variant: readVariant(parameters) } : bench;
}

/** A place on the same sheet asks for nothing new. */
export function searchAgain({ currentUrl, nextUrl, defaultShouldRevalidate }: ShouldRevalidateFunctionArgs): boolean {
  const sameQuestion = currentUrl.pathname === nextUrl.pathname && currentUrl.search === nextUrl.search;
  return sameQuestion && currentUrl.hash !== nextUrl.hash ? false : defaultShouldRevalidate;
}

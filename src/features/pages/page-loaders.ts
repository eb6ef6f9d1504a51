import { redirect, type LoaderFunctionArgs } from 'react-router';
import { benchContext } from '../../lib/api-context.ts';
import { variantFor } from '../../lib/bench.ts';
import { apiOf, prime, requirePage, requireRevision } from '../../lib/loading.ts';
import { paths } from '../../lib/paths.ts';
import { compareQuery, pageQuery, revisionQuery, revisionsQuery } from '../../lib/queries.ts';

/** A published page. */
export async function pageLoader({ context, params, request }: LoaderFunctionArgs) {
  const address = requirePage(params);
  const { search, searchParams } = new URL(request.url);
  // An overview has one address, its subject's.
  if (address.page === 'overview') return redirect(paths.subject(address) + search, 301);
  const variant = variantFor(address, searchParams, context.get(benchContext));
  await prime(context, pageQuery(apiOf(context), address, variant));
  return { address, variant };
}

/** Every revision of a page. */
export async function revisionsLoader({ context, params }: LoaderFunctionArgs) {
  const address = requirePage(params);
  await prime(context, revisionsQuery(apiOf(context), address));
  return { address };
}

/** One revision of a page, as it was published. */
export async function revisionLoader({ context, params, request }: LoaderFunctionArgs) {
  const address = requirePage(params);
  const number = requireRevision(params['number']);
  const variant = variantFor(address, new URL(request.url).searchParams, context.get(benchContext));
  await prime(context, revisionQuery(apiOf(context), address, number, variant));
  return { address, number, variant };
}

/** What changed from one revision to another; without both, the last change. */
export async function compareLoader({ context, params, request }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const address = requirePage(params);
  const { searchParams } = new URL(request.url);
  const { revisions } = await prime(context, revisionsQuery(api, address));
  const newest = revisions[0]?.number ?? 1;
  const to = searchParams.has('to') ? requireRevision(searchParams.get('to')) : newest;
  const from = searchParams.has('from') ? requireRevision(searchParams.get('from')) : Math.max(1, to - 1);
  await prime(context, compareQuery(api, address, from, to));
  return { address, from, to };
}

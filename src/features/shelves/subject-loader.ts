import type { LoaderFunctionArgs } from 'react-router';
import { benchContext } from '../../lib/api-context.ts';
import { variantFor } from '../../lib/bench.ts';
import { apiOf, prime, requireSubject } from '../../lib/loading.ts';
import { pageQuery, subjectQuery } from '../../lib/queries.ts';

/** One donor, part or topic, with its overview. */
export async function subjectLoader({ context, params, request }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const subject = requireSubject(params);
  const variant = variantFor(subject, new URL(request.url).searchParams, context.get(benchContext));
  await Promise.all([
    prime(context, subjectQuery(api, subject)),
    prime(context, pageQuery(api, { ...subject, page: 'overview' }, variant)),
  ]);
  return { subject, variant };
}

import type { LoaderFunctionArgs } from 'react-router';
import { isProblemThrown } from '../../lib/answer.ts';
import { benchContext } from '../../lib/api-context.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { homeQuery, pageQuery, subjectQuery } from '../../lib/queries.ts';

/** What is on the bench, and what could be. */
export async function benchLoader({ context }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const bench = context.get(benchContext);
  await prime(context, homeQuery(api));
  return { bench: { ...bench, donor: (await isInTheBook()) ? bench.donor : null } };

  /** A donor may have left the book since it was put on the bench. */
  async function isInTheBook(): Promise<boolean> {
    if (bench.donor === null) return false;
    const subject = { shelf: 'donors', subject: bench.donor } as const;
    try {
      await Promise.all([
        prime(context, subjectQuery(api, subject)),
        prime(context, pageQuery(api, { ...subject, page: 'overview' }, bench.variant)),
      ]);
      return true;
    } catch (error) {
      if (isProblemThrown(error, 'not-found')) return false;
      throw error;
    }
  }
}

import { redirect, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router';
import { problem } from '../../../shared/lib/problem.ts';
import { benchContext } from '../../lib/api-context.ts';
import { isProblemThrown } from '../../lib/answer.ts';
import { emptyBench, type Bench } from '../../lib/bench.ts';
import { readText } from '../../lib/form-fields.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { paths } from '../../lib/paths.ts';
import { proposalsQuery, subjectQuery, viewerQuery } from '../../lib/queries.ts';
import { refused } from '../../lib/refused.ts';

const passwordChanged = 'changed';

/** Who one is, what one has proposed, and what is on one's bench. */
export async function accountLoader({ context, request }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const { member } = await prime(context, viewerQuery(api));
  if (member === null) return redirect(paths.signInAndReturn(paths.account));
  const [bench] = await Promise.all([benchInTheBook(), prime(context, proposalsQuery(api, null, true))]);
  return { member, bench, passwordChanged: new URL(request.url).searchParams.get('password') === passwordChanged };

  /** A donor may have left the book since it was put on the bench. */
  async function benchInTheBook(): Promise<Bench> {
    const bench = context.get(benchContext);
    if (bench.donor === null) return bench;
    try {
      await prime(context, subjectQuery(api, { shelf: 'donors', subject: bench.donor }));
      return bench;
    } catch (error) {
      if (isProblemThrown(error, 'not-found')) return emptyBench;
      throw error;
    }
  }
}

const notTheSame = problem(
  'fields-invalid',
  'Your password was not changed',
  'The new password was written in two different ways. Write it twice the same.',
  { fields: { again: 'This is not what you wrote above.' } },
);

/** Changes one's own password. */
export async function accountAction({ context, request }: ActionFunctionArgs) {
  const form = await request.formData();
  const next = readText(form, 'next-password');
  // Nothing that was typed goes back: passwords do not stand in pages.
  if (next !== readText(form, 'again')) return refused(notTheSame, null);
  const changed = await apiOf(context).changePassword({ current: readText(form, 'current'), next });
  return changed.ok ? redirect(`${paths.account}?password=${passwordChanged}`) : refused(changed.refusal, null);
}

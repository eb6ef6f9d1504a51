import { data, type LoaderFunctionArgs } from 'react-router';
import type { StartRequest } from '../../../shared/contracts/api.ts';
import { pageKinds, type PageKind } from '../../../shared/pages/page-kind.ts';
import { isProblemThrown } from '../../lib/answer.ts';
import { apiOf, prime, requirePage, requireRevision, requireShelf, requireSubject } from '../../lib/loading.ts';
import { proposalQuery, shelfQuery, startQuery, subjectQuery } from '../../lib/queries.ts';

type Context = LoaderFunctionArgs['context'];

/** Starts a change of a page, or goes back to one of its old revisions. */
export async function changeLoader({ context, params, request }: LoaderFunctionArgs) {
  const written = new URL(request.url).searchParams.get('revision');
  const revision = written === null ? null : requireRevision(written);
  return begin(context, { ...requirePage(params), revision });
}

/** Starts a new subject by its overview. */
export async function newSubjectLoader({ context, params }: LoaderFunctionArgs) {
  const shelf = requireShelf(params);
  await prime(context, shelfQuery(apiOf(context), shelf));
  return begin(context, { shelf, subject: null, page: null, revision: null });
}

/** The kinds of page that a subject can have more of. */
export const furtherKinds: readonly PageKind[] = pageKinds.filter((kind) => kind !== 'overview');

/** Starts a new page of a subject. */
export async function newPageLoader({ context, params, request }: LoaderFunctionArgs) {
  const address = requireSubject(params);
  const asked = new URL(request.url).searchParams.get('kind');
  const kind = furtherKinds.find((one) => one === asked) ?? 'pinouts';
  await prime(context, subjectQuery(apiOf(context), address));
  return begin(context, { ...address, page: null, revision: null, kind });
}

/**
 * Asks what the editor starts from. Where nobody is signed in it says so rather than throwing: a session may have ended
 * while somebody wrote, and then this sheet gives back what they sent.
 */
async function begin(context: Context, request: StartRequest) {
  try {
    await prime(context, startQuery(apiOf(context), request));
    return data({ request, signedIn: true });
  } catch (error) {
    if (isProblemThrown(error, 'sign-in-needed')) return data({ request, signedIn: false }, { status: 401 });
    throw error;
  }
}

/** Goes on with a proposal. One that was decided meanwhile is no reason to leave: this sheet gives back what was sent. */
export async function reviseLoader({ context, params, request }: LoaderFunctionArgs) {
  const id = params['id'] ?? '';
  const fromPublished = new URL(request.url).searchParams.get('from') === 'published';
  try {
    await prime(context, proposalQuery(apiOf(context), id));
    return data({ id, fromPublished, signedIn: true });
  } catch (error) {
    if (isProblemThrown(error, 'sign-in-needed')) return data({ id, fromPublished, signedIn: false }, { status: 401 });
    throw error;
  }
}

import { redirect, redirectDocument, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router';
import { ownPath, readText, readWayBack } from '../../lib/form-fields.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { paths } from '../../lib/paths.ts';
import { viewerQuery } from '../../lib/queries.ts';
import { refused } from '../../lib/refused.ts';

/** Where somebody goes after signing in: where they were going, else the first page. */
export async function signInLoader({ context, request }: LoaderFunctionArgs) {
  const next = ownPath(new URL(request.url).searchParams.get('next') ?? '') ?? paths.home;
  const { member } = await prime(context, viewerQuery(apiOf(context)));
  if (member !== null) return redirect(next === paths.home ? paths.account : next);
  return { next };
}

/** Signs in. What comes after is a new document, so that nothing of the visitor's stays in the browser's hands. */
export async function signInAction({ context, request }: ActionFunctionArgs) {
  const form = await request.formData();
  const email = readText(form, 'email');
  const signedIn = await apiOf(context).signIn({ email, password: readText(form, 'password') });
  return signedIn.ok ? redirectDocument(readWayBack(form, paths.home)) : refused(signedIn.refusal, { email });
}

/** Signs out; with whatever the browser holds of the member. */
export async function signOutAction({ context }: ActionFunctionArgs): Promise<Response> {
  await apiOf(context).signOut();
  return redirectDocument(paths.home);
}

/** Signing out is done by a button, not by an address. */
export function signOutLoader(): Response {
  return redirect(paths.account);
}

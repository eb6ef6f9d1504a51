import type { ReactElement } from 'react';
import { isRouteErrorResponse, useLocation, useRouteError } from 'react-router';
import { problem, type Problem } from '../../shared/lib/problem.ts';
import { problemThrown } from '../lib/answer.ts';
import { paths } from '../lib/paths.ts';
import { ButtonLink } from '../ui/button.tsx';
import { PageHead } from '../ui/page-head.tsx';
import { Sheet } from '../ui/sheet.tsx';
import { SearchField } from '../features/search/search-field.tsx';

/** What stands where a sheet cannot: what happened, what was kept, and what to do. */
export function ErrorSheet(): ReactElement {
  const refusal = refusalOf(useRouteError());
  const { pathname, search } = useLocation();
  return (
    <Sheet title={refusal.title} lead={refusal.detail}>
      <PageHead title={`${refusal.title} · Earthstrap`} listed={false} />
      <WhatToDo code={refusal.code} here={pathname + search} />
    </Sheet>
  );
}

function WhatToDo({ code, here }: { readonly code: Problem['code']; readonly here: string }): ReactElement {
  if (code === 'sign-in-needed') {
    return (
      <p className="button-row">
        <ButtonLink look="primary" to={paths.signInAndReturn(here)}>
          Sign in and go on here
        </ButtonLink>
      </p>
    );
  }
  if (code === 'not-found') {
    return (
      <>
        <div className="error-search">
          <SearchField placement="home" />
        </div>
        <p className="button-row error-places">
          <ButtonLink to={paths.shelf('donors')}>Look along the donors</ButtonLink>
          <ButtonLink to={paths.home}>Go to the first page</ButtonLink>
        </p>
      </>
    );
  }
  return (
    <p className="button-row">
      {/* Asked of the server anew: whatever went wrong here may be in what this browser holds. */}
      <ButtonLink look="primary" to={here} reloadDocument>
        Try again
      </ButtonLink>
      <ButtonLink to={paths.home}>Go to the first page</ButtonLink>
    </p>
  );
}

function refusalOf(error: unknown): Problem {
  const refusal = problemThrown(error);
  if (refusal !== null) return refusal;
  if (isRouteErrorResponse(error) && error.status === 404) {
    return problem(
      'not-found',
      'There is no sheet at this address',
      'Search for what you were after, or start at a shelf.',
    );
  }
  if (isRouteErrorResponse(error) && error.status === 405) {
    return problem(
      'method-not-allowed',
      'Nothing can be sent to this address',
      'Nothing was changed. Go back and use the form again.',
    );
  }
  return problem(
    'unexpected',
    'Something broke on our side',
    'The book is as it was, and what you had sent before is kept. What you typed last may still be in your browser: go back before you write it anew.',
  );
}

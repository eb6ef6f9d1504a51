import { useRef, type ReactElement } from 'react';
import { useActionData, useFetcher, useLoaderData } from 'react-router';
import { SignInFields } from '../../blocks/sign-in-fields.tsx';
import { paths } from '../../lib/paths.ts';
import { useFirstProblem } from '../../lib/use-first-problem.ts';
import { Button } from '../../ui/button.tsx';
import { ProblemNotice } from '../../ui/notice.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { signInAction, signInLoader } from './sign-in.ts';

/** Where members sign in. */
export function SignInSheet(): ReactElement {
  const { next } = useLoaderData<typeof signInLoader>();
  const posted = useActionData<typeof signInAction>();
  const fetcher = useFetcher<typeof signInAction>();
  const outcome = fetcher.data ?? posted;
  const problem = outcome?.problem ?? null;
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, outcome);
  return (
    <Sheet
      title="Sign in"
      lead={
        next === paths.home
          ? 'Reading needs no sign-in. Members propose changes, and see what became of theirs.'
          : 'Then you go on to where you were going.'
      }
    >
      <PageHead title="Sign in · Earthstrap" listed={false} />
      <fetcher.Form ref={form} className="form" method="post" action={paths.signIn} noValidate>
        {problem === null ? null : <ProblemNotice problem={problem} />}
        <input type="hidden" name="next" value={next} />
        <SignInFields email={outcome?.values.email ?? ''} problem={problem} />
        <Button look="primary" disabled={fetcher.state !== 'idle'}>
          Sign in
        </Button>
        <p className="soft small">
          No sign-in yet, or the password is lost? Ask an administrator of the club: they look after both.
        </p>
      </fetcher.Form>
    </Sheet>
  );
}

import type { ReactElement } from 'react';
import type { Problem } from '../../shared/lib/problem.ts';
import { TextField } from '../ui/field.tsx';

interface SignInFieldsProps {
  readonly email?: string;
  /** Why the last attempt was refused; null where there was none. */
  readonly problem: Problem | null;
}

/** E-mail address and password, in whichever form somebody signs in by. */
export function SignInFields({ email = '', problem }: SignInFieldsProps): ReactElement {
  const refusedBoth = problem?.code === 'sign-in-failed';
  return (
    <>
      <TextField
        label="E-mail address"
        name="email"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        defaultValue={email}
        problem={problem?.fields?.['email']}
      />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        problem={
          problem?.fields?.['password'] ??
          (refusedBoth ? 'This, or the e-mail address above, is not right. Look at both and try again.' : undefined)
        }
      />
    </>
  );
}

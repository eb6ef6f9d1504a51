import type { RouteObject } from 'react-router';

/** Signing in and out, and one's own account. */
export const memberRoutes: RouteObject[] = [
  {
    path: 'sign-in',
    id: 'sign-in',
    lazy: async () => {
      const [{ signInLoader, signInAction }, { SignInSheet }] = await Promise.all([
        import('./sign-in.ts'),
        import('./sign-in-sheet.tsx'),
      ]);
      return { loader: signInLoader, action: signInAction, Component: SignInSheet };
    },
  },
  {
    path: 'sign-out',
    id: 'sign-out',
    lazy: async () => {
      const { signOutLoader, signOutAction } = await import('./sign-in.ts');
      return { loader: signOutLoader, action: signOutAction };
    },
  },
  {
    path: 'account',
    id: 'account',
    lazy: async () => {
      const [{ accountLoader, accountAction }, { AccountSheet }] = await Promise.all([
        import('./account.ts'),
        import('./account-sheet.tsx'),
      ]);
      return { loader: accountLoader, action: accountAction, Component: AccountSheet };
    },
  },
];

import type { RouteObject } from 'react-router';
import { searchAgain, searchLoader } from './search-loader.ts';

/** The address of the search. The sheet itself is fetched when it is asked for; the field above every sheet is there at once. */
export const searchRoutes: RouteObject[] = [
  {
    path: 'search',
    id: 'search',
    loader: searchLoader,
    shouldRevalidate: searchAgain,
    lazy: async () => ({ Component: (await import('./search-sheet.tsx')).SearchSheet }),
  },
];

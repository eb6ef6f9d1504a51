import type { RouteObject } from 'react-router';
import { benchAction } from '../features/bench/bench-action.ts';
import { homeLoader } from '../features/home/home-loader.ts';
import { memberRoutes } from '../features/members/routes.tsx';
import { compareLoader, pageLoader, revisionLoader, revisionsLoader } from '../features/pages/page-loaders.ts';
import { PageSheet } from '../features/pages/page-sheet.tsx';
import { proposalRoutes } from '../features/proposals/routes.tsx';
import { searchRoutes } from '../features/search/routes.ts';
import { shelfLoader } from '../features/shelves/shelf-loader.ts';
import { subjectLoader } from '../features/shelves/subject-loader.ts';
import { SubjectSheet } from '../features/shelves/subject-sheet.tsx';
import { nothingHere } from '../lib/loading.ts';
import { ErrorSheet } from './error-sheet.tsx';
import { faceAction } from './face-choice.tsx';
import { HomePage } from './home-page.tsx';
import type { RouteHandle } from './keepable.ts';
import { Root, rootLoader } from './root.tsx';

const kept: RouteHandle = { keepable: true };

/** Every address of the site. What is read at the bench comes at once; what is rarer is fetched when it is asked for. */
export const routes: RouteObject[] = [
  {
    id: 'root',
    Component: Root,
    loader: rootLoader,
    ErrorBoundary: ErrorSheet,
    children: [
      {
        id: 'sheet',
        ErrorBoundary: ErrorSheet,
        children: [
          { index: true, id: 'home', handle: kept, loader: homeLoader, Component: HomePage },
          ...memberRoutes,
          ...proposalRoutes,
          ...searchRoutes,
          { path: 'face', id: 'face', loader: nothing, action: faceAction, element: <></> },
          {
            path: 'bench',
            id: 'bench',
            action: benchAction,
            lazy: async () => {
              const [{ benchLoader }, { BenchSheet }] = await Promise.all([
                import('../features/bench/bench-loader.ts'),
                import('../features/bench/bench-sheet.tsx'),
              ]);
              return { loader: benchLoader, Component: BenchSheet };
            },
          },
          {
            path: ':shelf',
            id: 'shelf',
            handle: kept,
            loader: shelfLoader,
            lazy: async () => ({ Component: (await import('../features/shelves/shelf-sheet.tsx')).ShelfSheet }),
          },
          { path: ':shelf/:subject', id: 'subject', handle: kept, loader: subjectLoader, Component: SubjectSheet },
          { path: ':shelf/:subject/:page', id: 'page', handle: kept, loader: pageLoader, Component: PageSheet },
          {
            path: ':shelf/:subject/:page/revisions',
            id: 'revisions',
            handle: kept,
            loader: revisionsLoader,
            lazy: async () => ({ Component: (await import('../features/pages/revisions-sheet.tsx')).RevisionsSheet }),
          },
          {
            path: ':shelf/:subject/:page/revisions/:number',
            id: 'revision',
            handle: kept,
            loader: revisionLoader,
            lazy: async () => ({ Component: (await import('../features/pages/revision-sheet.tsx')).RevisionSheet }),
          },
          {
            path: ':shelf/:subject/:page/compare',
            id: 'compare',
            loader: compareLoader,
            lazy: async () => ({ Component: (await import('../features/pages/compare-sheet.tsx')).CompareSheet }),
          },
          { path: '*', id: 'nothing', loader: nothing, element: <></> },
        ],
      },
    ],
  },
];

/** No sheet stands at this address. */
function nothing(): never {
  // The router's own kind of throw, which carries the status.
  throw nothingHere();
}

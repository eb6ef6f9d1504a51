import { hydrateRoot } from 'react-dom/client';
import { createBrowserRouter, RouterContextProvider } from 'react-router';
import { RouterProvider } from 'react-router/dom';
import { createHttpApi } from './app/http-api.ts';
import { loadMatchingRoutes } from './app/matching-routes.ts';
import { readPageState } from './app/page-state.ts';
import { createQueryClient, Providers } from './app/providers.tsx';
import { routes } from './app/routes.tsx';
import { apiContext, benchContext, queryClientContext } from './lib/api-context.ts';
import { readBench } from './lib/bench.ts';

async function start(root: HTMLElement, state: HTMLElement): Promise<void> {
  await loadMatchingRoutes(routes, window.location);
  const api = createHttpApi();
  const queryClient = createQueryClient();
  const hydrationData = readPageState(state.textContent, queryClient, document);
  const router = createBrowserRouter(routes, {
    hydrationData,
    getContext() {
      const context = new RouterContextProvider();
      context.set(apiContext, api);
      context.set(queryClientContext, queryClient);
      context.set(benchContext, readBench(document.cookie));
      return context;
    },
  });
  hydrateRoot(
    root,
    <Providers api={api} queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
}

const root = document.getElementById('root');
const state = document.getElementById('state');
// Without a state the server had nothing to go on from: what it sent stands by itself. Not awaited here: sheets that come
// later import from this file's own bundle, and would wait for it while it waits for them.
if (root !== null && state !== null) void start(root, state);

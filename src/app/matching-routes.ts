import { matchRoutes, type RouteObject } from 'react-router';

/**
 * Loads the lazy routes that match an address and puts what they give in their place. Before hydration, or the router
 * would first draw nothing where the server has drawn a sheet.
 */
export async function loadMatchingRoutes(
  routes: RouteObject[],
  location: { pathname: string; search: string },
): Promise<void> {
  const matches = matchRoutes(routes, location) ?? [];
  await Promise.all(
    matches.map(async ({ route }) => {
      if (typeof route.lazy !== 'function') return;
      Object.assign(route, await route.lazy(), { lazy: undefined });
    }),
  );
}

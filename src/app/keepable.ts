import type { QueryClient } from '@tanstack/react-query';
import type { StaticHandlerContext } from 'react-router';
import type { Viewer } from '../../shared/contracts/views.ts';
import { isAnyVariant, variantQuery, type Bench } from '../lib/bench.ts';

/** What a route may say of itself: that its sheet is the same for every visitor. */
export interface RouteHandle {
  readonly keepable: boolean;
}

/**
 * True where a rendered sheet may be given to every visitor who asks for the same path, query and variant.
 * Where a bench's variant was passed in and the sheet is of another donor, so that it was not used, it may not.
 */
export function isKeepable(context: StaticHandlerContext, queryClient: QueryClient, bench: Bench, address: URL): boolean {
  if (context.statusCode !== 200 || context.errors !== null) return false;
  const viewer = queryClient.getQueryData<Viewer>(['viewer']);
  if (viewer === undefined || viewer.member !== null) return false;
  const leaf = context.matches.at(-1);
  const handle: unknown = leaf?.route.handle;
  if (typeof handle !== 'object' || handle === null || !('keepable' in handle) || handle.keepable !== true) return false;
  if (isAnyVariant(bench.variant) || ['year', 'market', 'frame'].some((name) => address.searchParams.has(name))) return true;
  return Object.values(context.loaderData).some((data) => shownFor(data) === variantQuery(bench.variant));
}

/** The variant that a loader says its sheet is shown for, as a query; null where it does not depend on one. */
function shownFor(loaded: unknown): string | null {
  if (typeof loaded !== 'object' || loaded === null || !('shownFor' in loaded)) return null;
  return typeof loaded.shownFor === 'string' ? loaded.shownFor : null;
}

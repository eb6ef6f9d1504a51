import type { QueryClient } from '@tanstack/react-query';
import type { StaticHandlerContext } from 'react-router';
import type { Api } from '../../shared/contracts/api.ts';
import { viewerQuery } from '../lib/queries.ts';

/** What a route may say of itself: that its sheet depends on nothing of a visitor but the bench. */
export interface RouteHandle {
  readonly keepable: boolean;
}

/** True where a rendered sheet may be given to every visitor who asks for the same address with the same bench. */
export function isKeepable(context: StaticHandlerContext, queryClient: QueryClient, api: Api): boolean {
  if (context.statusCode !== 200 || context.errors !== null) return false;
  const viewer = queryClient.getQueryData(viewerQuery(api).queryKey);
  if (viewer === undefined || viewer.member !== null) return false;
  const handle: unknown = context.matches.at(-1)?.route.handle;
  return typeof handle === 'object' && handle !== null && 'keepable' in handle && handle.keepable === true;
}

import type { LoaderFunctionArgs } from 'react-router';
import { can } from '../../../shared/members/can.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { proposalQuery, proposalsQuery, viewerQuery } from '../../lib/queries.ts';

/** One proposal, and for who decides what else waits. */
export async function proposalLoader({ context, params }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const id = params['id'] ?? '';
  const { member } = await prime(context, viewerQuery(api));
  const decides = can(member, 'decide', null);
  await Promise.all([
    prime(context, proposalQuery(api, id)),
    decides ? prime(context, proposalsQuery(api, 'waiting', false)) : null,
  ]);
  return { id, decides, memberId: member?.id ?? '' };
}

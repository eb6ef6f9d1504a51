import type { LoaderFunctionArgs } from 'react-router';
import { can } from '../../../shared/members/can.ts';
import type { ProposalState } from '../../../shared/proposals/proposal.ts';
import { apiOf, prime } from '../../lib/loading.ts';
import { proposalsQuery, viewerQuery } from '../../lib/queries.ts';

/** Which proposals a ledger shows. */
export type Showing = 'waiting' | 'sent-back' | 'mine' | 'decided';

/** What is asked of the book for each; what was decided is of three states, and is picked out of them all. */
export const asked: Readonly<Record<Showing, { readonly state: ProposalState | null; readonly mine: boolean }>> = {
  waiting: { state: 'waiting', mine: false },
  'sent-back': { state: 'sent-back', mine: false },
  mine: { state: null, mine: true },
  decided: { state: null, mine: false },
};

/** A ledger of proposals: of what waits for whoever decides, of one's own for everybody else. */
export async function proposalsLoader({ context, request }: LoaderFunctionArgs) {
  const api = apiOf(context);
  const { member } = await prime(context, viewerQuery(api));
  const decides = can(member, 'decide', null);
  const showing = showingOf(new URL(request.url).searchParams.get('state')) ?? (decides ? 'waiting' : 'mine');
  const { state, mine } = asked[showing];
  await prime(context, proposalsQuery(api, state, mine));
  return { showing, decides, memberId: member?.id ?? '' };
}

function showingOf(text: string | null): Showing | null {
  return text !== null && Object.hasOwn(asked, text) ? (text as Showing) : null;
}

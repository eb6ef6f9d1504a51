import type { RouterContextProvider } from 'react-router';
import type { Api } from '../../../shared/contracts/api.ts';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { queryClientContext } from '../../lib/api-context.ts';
import { proposalQuery } from '../../lib/queries.ts';

/** Keeps what the book answered to a change of a proposal, and lets go of every answer that it made old. */
export function keepAnswer(context: Readonly<RouterContextProvider>, api: Api, proposal: ProposalView): void {
  const cache = context.get(queryClientContext);
  const outdated = proposal.state === 'published' ? ['proposals', 'viewer', 'book'] : ['proposals', 'viewer'];
  // The sheet that comes next asks again; one that is left must not.
  for (const word of outdated) void cache.invalidateQueries({ queryKey: [word], refetchType: 'none' });
  cache.setQueryData(proposalQuery(api, proposal.id).queryKey, proposal);
}

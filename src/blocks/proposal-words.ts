import type { ProposalSummary } from '../../shared/contracts/views.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';
import { paths } from '../lib/paths.ts';

/** Where a proposal stands, as a reader sees it. */
export const stateLabels: Readonly<Record<ProposalState, string>> = {
  draft: 'Draft',
  waiting: 'Waiting',
  'sent-back': 'Sent back',
  published: 'Published',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
};

/** True where something may still become of it. */
export function isOpen({ state }: Pick<ProposalSummary, 'state'>): boolean {
  return state === 'draft' || state === 'waiting' || state === 'sent-back';
}

/** Since when it stands where it stands: a draft since it was begun, what was sent since then, the rest since decided. */
export function standsSince({ state, createdAt, sentAt, updatedAt }: ProposalSummary): string {
  if (state === 'draft') return createdAt;
  return state === 'waiting' ? (sentAt ?? createdAt) : updatedAt;
}

/** What may still become something, whichever has stood longest first. */
export function openProposals(proposals: readonly ProposalSummary[]): ProposalSummary[] {
  return longestFirst(proposals.filter(isOpen));
}

/** What was decided, the last decision first. */
export function decidedProposals(proposals: readonly ProposalSummary[]): ProposalSummary[] {
  return longestFirst(proposals.filter((proposal) => !isOpen(proposal))).reverse();
}

function longestFirst(proposals: readonly ProposalSummary[]): ProposalSummary[] {
  return proposals.toSorted((a, b) => {
    const [one, other] = [standsSince(a), standsSince(b)];
    return one === other ? 0 : one < other ? -1 : 1;
  });
}

/** The next thing to do with a proposal: a verb, and where it is done. */
export interface NextStep {
  readonly verb: string;
  readonly path: string;
}

type Stepping = Pick<ProposalSummary, 'id' | 'state' | 'author' | 'fallenBehind'>;

/** The next thing that this member can do with a proposal. Whoever sees another's may decide on it. */
export function nextStep(proposal: Stepping, memberId: string): NextStep {
  const { id, state, fallenBehind } = proposal;
  const sheet = paths.proposal(id);
  if (proposal.author.id !== memberId)
    return { verb: state === 'waiting' ? 'Decide on it' : 'Look at it', path: sheet };
  if (state === 'draft') return { verb: 'Go on writing', path: paths.revise(id) };
  if (state === 'sent-back') return { verb: 'Answer it', path: paths.revise(id) };
  if (state === 'waiting' && fallenBehind) return { verb: 'Bring it up to date', path: sheet };
  return { verb: 'Look at it', path: sheet };
}

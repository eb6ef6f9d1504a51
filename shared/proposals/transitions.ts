import type { Result } from '../lib/result.ts';
import { accept, refuse } from '../lib/result.ts';
import type { ProposalState } from './proposal.ts';

/** What can be done with a proposal, in the design's words. */
export const proposalActions = ['revise', 'note', 'send', 'send back', 'decline', 'withdraw', 'publish'] as const;

/** One of them. */
export type ProposalAction = (typeof proposalActions)[number];

/** Where each action leads from each state; a state that is missing does not allow it. */
const transitions: Readonly<Record<ProposalAction, Readonly<Partial<Record<ProposalState, ProposalState>>>>> = {
  // In `waiting`, revising sends a new version straight away; before, it changes the draft.
  revise: { draft: 'draft', waiting: 'waiting', 'sent-back': 'sent-back' },
  note: { draft: 'draft', waiting: 'waiting', 'sent-back': 'sent-back' },
  send: { draft: 'waiting', 'sent-back': 'waiting' },
  'send back': { waiting: 'sent-back' },
  decline: { waiting: 'declined' },
  withdraw: { draft: 'withdrawn', waiting: 'withdrawn', 'sent-back': 'withdrawn' },
  publish: { waiting: 'published' },
};

/** Why a proposal does not move: it stands elsewhere; `allowed` are the states in which it would. */
export interface WrongState {
  readonly state: ProposalState;
  readonly allowed: readonly ProposalState[];
}

/**
 * Where a proposal stands after an action. Who may do it is `can`'s to say.
 * @param state where it stands
 * @param action what is to be done with it
 */
export function afterAction(state: ProposalState, action: ProposalAction): Result<ProposalState, WrongState> {
  const next = transitions[action][state];
  if (next !== undefined) return accept(next);
  return refuse({ state, allowed: Object.keys(transitions[action]) as ProposalState[] });
}

/** True where nothing more can become of a proposal. */
export function isClosed(state: ProposalState): boolean {
  return proposalActions.every((action) => transitions[action][state] === undefined);
}

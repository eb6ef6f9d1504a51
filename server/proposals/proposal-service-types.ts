import type { Answer, StartRequest } from '../../shared/contracts/api.ts';
import type { ProposalsView, ProposalView, StartView } from '../../shared/contracts/views.ts';
import type { Actor } from '../../shared/members/member.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';

/**
 * From change to publication. Each method mirrors one of `Api`, with who asks first. Bodies are parsed here, so both
 * doors pass on what came as it came.
 */
export interface ProposalService {
  start(actor: Actor, request: StartRequest): Answer<StartView>;
  proposals(actor: Actor, state: ProposalState | null, mine: boolean): Answer<ProposalsView>;
  proposal(actor: Actor, id: string): Answer<ProposalView>;
  propose(actor: Actor, body: unknown): Answer<ProposalView>;
  addVersion(actor: Actor, id: string, body: unknown): Answer<ProposalView>;
  addNote(actor: Actor, id: string, body: unknown): Answer<ProposalView>;
  send(actor: Actor, id: string): Answer<ProposalView>;
  sendBack(actor: Actor, id: string, body: unknown): Answer<ProposalView>;
  decline(actor: Actor, id: string, body: unknown): Answer<ProposalView>;
  withdraw(actor: Actor, id: string): Answer<ProposalView>;
  publish(actor: Actor, id: string, body: unknown): Answer<ProposalView>;

  /** How many proposals wait for this member to decide; 0 for who may not decide. For `Viewer.waiting`. */
  waitingFor(actor: Actor): number;
}

import type { Answer, Api } from '../shared/contracts/api.ts';
import { signInBodySchema } from '../shared/contracts/bodies.ts';
import { readBody } from '../shared/contracts/read-body.ts';
import type { PreviewView, ProposalView, Viewer } from '../shared/contracts/views.ts';
import { accept } from '../shared/lib/result.ts';
import type { Actor, Member } from '../shared/members/member.ts';
import type { Credentials, MemberService } from './members/member-service.ts';
import type { PageService } from './pages/page-service-types.ts';
import type { ProposalService } from './proposals/proposal-service-types.ts';
import type { SearchService } from './search/search-service.ts';

/** The services that the doors lead to. */
export interface Services {
  readonly members: MemberService;
  readonly pages: PageService;
  readonly proposals: ProposalService;
  readonly search: SearchService;
}

/** Who came in and how they are signed in and out: an HTTP session, or a test's own. */
export interface Door {
  /** Read again from the store for this request. */
  readonly actor: Actor;
  /** Whose attempts and parsing time are counted together: the network address. */
  readonly address: string;
  /** Whether somebody is who they say. */
  prove(credentials: Credentials): Answer<Member>;
  signIn(member: Member): Promise<void>;
  signOut(): Promise<void>;
}

/** The `Api` on the server: bodies may be anything, since the services parse them. */
export interface LocalApi extends Api {
  signIn(body: unknown): Answer<Viewer>;
  changePassword(body: unknown): Answer<null>;
  preview(body: unknown): Answer<PreviewView>;
  propose(body: unknown): Answer<ProposalView>;
  addVersion(id: string, body: unknown): Answer<ProposalView>;
  addNote(id: string, body: unknown): Answer<ProposalView>;
  sendBack(id: string, body: unknown): Answer<ProposalView>;
  decline(id: string, body: unknown): Answer<ProposalView>;
  publish(id: string, body: unknown): Answer<ProposalView>;
}

/**
 * The server's own door to the book, for one request. It adds nothing: what may be done and what is well formed is for
 * the services to say, since the HTTP door leads to them as well.
 */
export function createLocalApi({ members, pages, proposals, search }: Services, door: Door): LocalApi {
  const { address } = door;
  // Whoever signs in with a form is let in for the rest of the same request, as a browser is with its next one.
  let { actor } = door;
  return {
    async viewer() {
      return accept({ member: actor, waiting: proposals.waitingFor(actor) });
    },
    async signIn(body) {
      const credentials = readBody(signInBodySchema, body);
      if (!credentials.ok) return credentials;
      const outcome = await door.prove(credentials.value);
      if (!outcome.ok) return outcome;
      await door.signIn(outcome.value);
      actor = outcome.value;
      return accept({ member: actor, waiting: proposals.waitingFor(actor) });
    },
    async signOut() {
      await door.signOut();
      actor = null;
      return accept(null);
    },
    async changePassword(body) {
      const outcome = await members.changePassword(actor, body, address);
      if (!outcome.ok) return outcome;
      // The service ended every session of the member; this browser stays signed in with a new one.
      await door.signIn(outcome.value);
      return accept(null);
    },

    home: () => pages.home(actor),
    shelf: (shelf) => pages.shelf(actor, shelf),
    subject: (subject) => pages.subject(actor, subject),
    page: (page, variant) => pages.page(actor, page, variant),
    pageData: (page, variant) => pages.pageData(actor, page, variant),
    revisions: (page) => pages.revisions(actor, page),
    revision: (page, number, variant) => pages.revision(actor, page, number, variant),
    compare: (page, from, to) => pages.compare(actor, page, from, to),
    search: (query, bench, variant) => search.search(actor, query, bench, variant),

    preview: (body) => pages.preview(actor, body, address),
    start: (request) => proposals.start(actor, request),
    proposals: (state, mine) => proposals.proposals(actor, state, mine),
    proposal: (id) => proposals.proposal(actor, id),
    propose: (body) => proposals.propose(actor, body),
    addVersion: (id, body) => proposals.addVersion(actor, id, body),
    addNote: (id, body) => proposals.addNote(actor, id, body),
    send: (id) => proposals.send(actor, id),
    sendBack: (id, body) => proposals.sendBack(actor, id, body),
    decline: (id, body) => proposals.decline(actor, id, body),
    withdraw: (id) => proposals.withdraw(actor, id),
    publish: (id, body) => proposals.publish(actor, id, body),
  };
}

import type { Problem } from '../lib/problem.ts';
import type { Result } from '../lib/result.ts';
import type { PageAddress, Shelf, SubjectAddress } from '../pages/address.ts';
import type { Variant } from '../pages/applicability.ts';
import type { PageKind } from '../pages/page-kind.ts';
import type { ProposalState } from '../proposals/proposal.ts';
import type {
  DeclineBody,
  NoteBody,
  PasswordBody,
  PreviewBody,
  ProposeBody,
  PublishBody,
  SendBackBody,
  SignInBody,
  VersionBody,
} from './bodies.ts';
import type {
  CompareView,
  HomeView,
  PageData,
  PageView,
  PreviewView,
  ProposalsView,
  ProposalView,
  RevisionsView,
  SearchView,
  ShelfView,
  StartView,
  SubjectView,
  Viewer,
} from './views.ts';

/** An answer of the book: a value, or an RFC 9457 problem that says what was kept and what to do. */
export type Answer<Value> = Promise<Result<Value, Problem>>;

/** What the editor is to start from. */
export interface StartRequest {
  readonly shelf: Shelf;
  readonly subject: string | null;
  readonly page: string | null;
  /** An old revision to go back to. */
  readonly revision: number | null;
  /** Of a new page that has no address yet: which kind it is to be. */
  readonly kind?: PageKind;
}

/**
 * Everything the pages may ask of the book and do to it. Two doors lead to the same services: the server's own
 * (server rendering, and forms without JavaScript), and HTTP (the browser). The actor is the door's, never a parameter.
 */
export interface Api {
  viewer(): Answer<Viewer>;
  signIn(body: SignInBody): Answer<Viewer>;
  signOut(): Answer<null>;
  changePassword(body: PasswordBody): Answer<null>;

  home(): Answer<HomeView>;
  shelf(shelf: Shelf): Answer<ShelfView>;
  subject(address: SubjectAddress): Answer<SubjectView>;
  page(address: PageAddress, variant: Variant): Answer<PageView>;
  pageData(address: PageAddress, variant: Variant): Answer<PageData>;
  revisions(address: PageAddress): Answer<RevisionsView>;
  revision(address: PageAddress, number: number, variant: Variant): Answer<PageView>;
  compare(address: PageAddress, from: number, to: number): Answer<CompareView>;
  search(query: string, bench: string | null, variant: Variant): Answer<SearchView>;

  preview(body: PreviewBody): Answer<PreviewView>;
  start(request: StartRequest): Answer<StartView>;
  proposals(state: ProposalState | null, mine: boolean): Answer<ProposalsView>;
  proposal(id: string): Answer<ProposalView>;
  propose(body: ProposeBody): Answer<ProposalView>;
  addVersion(id: string, body: VersionBody): Answer<ProposalView>;
  addNote(id: string, body: NoteBody): Answer<ProposalView>;
  send(id: string): Answer<ProposalView>;
  sendBack(id: string, body: SendBackBody): Answer<ProposalView>;
  decline(id: string, body: DeclineBody): Answer<ProposalView>;
  withdraw(id: string): Answer<ProposalView>;
  publish(id: string, body: PublishBody): Answer<ProposalView>;
}

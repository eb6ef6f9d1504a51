import { queryOptions } from '@tanstack/react-query';
import type { Api, StartRequest } from '../../shared/contracts/api.ts';
import { formatPageAddress, type PageAddress, type Shelf, type SubjectAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';
import { requireAnswer } from './answer.ts';
import { variantQuery, type Bench } from './bench.ts';

/*
 * One factory a read, so that loader, sheet and invalidation share a key. The first word of a key is what the read is
 * about: `['book']` is everything that a publication changes, `['proposals']` what moves on its way there.
 */

/** How long an answer about what is being worked on counts as fresh: from a sheet's loader to the sheet itself. */
const workMilliseconds = 5_000;

/** Who is signed in. */
export function viewerQuery(api: Api) {
  return queryOptions({ queryKey: ['viewer'], queryFn: () => requireAnswer(api.viewer()) });
}

export function homeQuery(api: Api) {
  return queryOptions({ queryKey: ['book', 'home'], queryFn: () => requireAnswer(api.home()) });
}

export function shelfQuery(api: Api, shelf: Shelf) {
  return queryOptions({ queryKey: ['book', 'shelf', shelf], queryFn: () => requireAnswer(api.shelf(shelf)) });
}

export function subjectQuery(api: Api, { shelf, subject }: SubjectAddress) {
  return queryOptions({
    queryKey: ['book', 'subject', `${shelf}/${subject}`],
    queryFn: () => requireAnswer(api.subject({ shelf, subject })),
  });
}

export function pageQuery(api: Api, address: PageAddress, variant: Variant) {
  return queryOptions({
    queryKey: ['book', 'page', formatPageAddress(address), variantQuery(variant)],
    queryFn: () => requireAnswer(api.page(address, variant)),
  });
}

export function revisionsQuery(api: Api, address: PageAddress) {
  return queryOptions({
    queryKey: ['book', 'revisions', formatPageAddress(address)],
    queryFn: () => requireAnswer(api.revisions(address)),
  });
}

export function revisionQuery(api: Api, address: PageAddress, number: number, variant: Variant) {
  return queryOptions({
    queryKey: ['book', 'revision', formatPageAddress(address), number, variantQuery(variant)],
    queryFn: () => requireAnswer(api.revision(address, number, variant)),
  });
}

export function compareQuery(api: Api, address: PageAddress, from: number, to: number) {
  return queryOptions({
    queryKey: ['book', 'compare', formatPageAddress(address), from, to],
    queryFn: () => requireAnswer(api.compare(address, from, to)),
  });
}

export function searchQuery(api: Api, query: string, bench: Bench) {
  return queryOptions({
    queryKey: ['book', 'search', query, bench.donor, variantQuery(bench.variant)],
    queryFn: () => requireAnswer(api.search(query, bench.donor, bench.variant)),
  });
}

/** What the editor starts from; soon stale, since a proposal's base is taken from it. */
export function startQuery(api: Api, request: StartRequest) {
  return queryOptions({
    queryKey: ['proposals', 'start', request],
    queryFn: () => requireAnswer(api.start(request)),
    staleTime: workMilliseconds,
  });
}

export function proposalsQuery(api: Api, state: ProposalState | null, mine: boolean) {
  return queryOptions({
    queryKey: ['proposals', 'list', state, mine],
    queryFn: () => requireAnswer(api.proposals(state, mine)),
    staleTime: workMilliseconds,
  });
}

export function proposalQuery(api: Api, id: string) {
  return queryOptions({
    queryKey: ['proposals', 'one', id],
    queryFn: () => requireAnswer(api.proposal(id)),
    staleTime: workMilliseconds,
  });
}

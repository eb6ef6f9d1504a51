import type { Problem } from '../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../shared/lib/result.ts';
import { reservedSlugs, type PageAddress } from '../../shared/pages/address.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import { addressIsSettled, alreadyThere, reservedSlug } from './proposal-problems.ts';
import type { ListedProposalRow } from './proposal-store.ts';
import { addressOf } from './proposal-views.ts';

/** Why a new page cannot have this address: a word of the site's own, or a page that is there; null where it can. */
export function refusalOfAddress(
  address: PageAddress,
  baseRevision: number | null,
  publication: PagePublication,
): Problem | null {
  for (const field of ['subject', 'page'] as const) {
    if ((reservedSlugs as readonly string[]).includes(address[field])) return reservedSlug(field, address[field]);
  }
  return baseRevision === null && publication.standing(address).page !== null ? alreadyThere(address) : null;
}

/** Where a proposal's page is to stand: where it stood, or where its author now wants a new page that was never sent. */
export function addressAfter(
  row: ListedProposalRow,
  wanted: { readonly subject?: string | undefined; readonly page?: string | undefined },
  publication: PagePublication,
): Result<PageAddress, Problem> {
  const present = addressOf(row);
  const address = { ...present, subject: wanted.subject ?? present.subject, page: wanted.page ?? present.page };
  if (address.subject === present.subject && address.page === present.page) return accept(present);
  const { sentAt, baseRevision } = row.proposal;
  if (sentAt !== null || baseRevision !== null) return refuse(addressIsSettled);
  const refusal = refusalOfAddress(address, null, publication);
  return refusal === null ? accept(address) : refuse(refusal);
}

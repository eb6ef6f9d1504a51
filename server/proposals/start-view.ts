import type { StartRequest } from '../../shared/contracts/api.ts';
import type { StartView } from '../../shared/contracts/views.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import { problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import type { Member } from '../../shared/members/member.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import { kindOfSlug, templateOf } from './page-templates.ts';
import type { ProposalReader } from './proposal-store.ts';

function noSuchRevision(revision: number): Problem {
  return problem(
    'not-found',
    `There is no revision ${String(revision)} of this page`,
    'Nothing was changed. Choose a revision from the page’s history.',
  );
}

/** What the editor starts from: the published text, an old revision of it to go back to, or a new page's skeleton. */
export function startView(
  { shelf, subject, page, revision, kind: wanted = 'pinouts' }: StartRequest,
  member: Member,
  publication: PagePublication,
  reader: ProposalReader,
): Result<StartView, Problem> {
  // A new subject begins with its overview.
  const slug = subject === null ? 'overview' : page;
  const address = subject === null || slug === null ? null : { shelf, subject, page: slug };
  const standing = subject === null ? null : publication.standing({ shelf, subject, page: slug ?? '' });
  const openProposal = address === null ? null : reader.openOf(member.id, address);
  const start = { shelf, subject, subjectTitle: standing?.subject?.title ?? null, page: slug, openProposal };
  const published = standing?.page ?? null;
  if (address === null || published === null) {
    if (revision !== null) return refuse(noSuchRevision(revision));
    const kind = slug === null ? wanted : kindOfSlug(slug);
    return accept({ ...start, baseRevision: null, markdown: templateOf(kind, shelf), summary: '' });
  }
  const markdown = publication.markdown(address, revision ?? published.revision);
  if (markdown === null) return refuse(noSuchRevision(revision ?? published.revision));
  // Going back is a new revision, so it starts from the newest however old its text.
  const summary = revision === null ? '' : `Go back to revision ${String(revision)}`;
  return accept({ ...start, baseRevision: published.revision, markdown, summary });
}

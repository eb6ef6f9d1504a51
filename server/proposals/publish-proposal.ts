import type { PublishBody } from '../../shared/contracts/bodies.ts';
import type { ProposalView } from '../../shared/contracts/views.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import type { Member } from '../../shared/members/member.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';
import { afterAction } from '../../shared/proposals/transitions.ts';
import type { AuditLog } from '../db/audit-log.ts';
import type { Database } from '../db/client.ts';
import { transact } from '../db/transact.ts';
import type { BookEvents } from '../pages/book-events.ts';
import type { PagePublication, Published, Standing } from '../pages/page-publication.ts';
import { parseProblem } from '../pages/parse-problem.ts';
import {
  alreadyThere,
  bookKeepsMoving,
  fallenBehind,
  movedMeanwhile,
  newerVersion,
  overrideNeeded,
  overviewFirst,
  wrongKind,
  wrongState,
} from './proposal-problems.ts';
import type { createProposalWriter, ListedProposalRow, ProposalReader, SentVersion } from './proposal-store.ts';
import { addressOf } from './proposal-views.ts';
import type { ProposedTexts } from './proposed-text.ts';

/** How often a publication is decided again because something else of its subject was published meanwhile. */
const mostAttempts = 3;

export interface PublishDependencies {
  readonly database: Database;
  readonly publication: PagePublication;
  readonly texts: ProposedTexts;
  readonly reader: ProposalReader;
  readonly writer: ReturnType<typeof createProposalWriter>;
  readonly audit: AuditLog;
  readonly events: BookEvents;
  readonly now: () => Date;
}

interface Decision {
  readonly text: PageText;
  readonly overrides: ProposalView['overrides'];
}

/** Whether the book has a place for a text that starts from this revision: a new page's, or the newest one's successor. */
export function refusalOfPlace(address: PageAddress, base: number | null, { subject, page }: Standing): Problem | null {
  if (base === null && page !== null) return alreadyThere(address);
  if (page !== null && page.revision !== base) return fallenBehind(base, page.revision);
  if (subject === null && address.page !== 'overview') return overviewFirst(address);
  return null;
}

/** Whether a page's kind fits its address: a subject's first page is its overview, and no other is. */
export function refusalOfKind(address: PageAddress, { frontMatter }: PageText): Problem | null {
  const isOverview = address.page === 'overview';
  return (frontMatter.kind === 'overview') === isOverview ? null : wrongKind(isOverview);
}

/** Every finding that stops needs a reason of its own; gives the reasons that found their finding. */
function matchOverrides(
  findings: ProposalView['findings'],
  given: NonNullable<PublishBody['overrides']>,
): Result<ProposalView['overrides'], Problem> {
  const matched = new Map<string, ProposalView['overrides'][number]>();
  const missing: { code: string; address: string | null; message: string }[] = [];
  for (const { code, message, severity, address = null } of findings) {
    if (severity !== 'stop') continue;
    const reason = given.find((one) => one.code === code && one.address === address)?.reason;
    if (reason === undefined) missing.push({ code, address, message });
    else matched.set(JSON.stringify([code, address]), { code, address, reason });
  }
  return missing.length > 0 ? refuse(overrideNeeded(missing)) : accept([...matched.values()]);
}

/**
 * Publishes a proposal's newest version: what is slow or may be refused is decided first, and the transaction re-checks
 * that the book and the proposal still stand as they stood, then writes. Events follow the commit.
 */
export async function publishProposal(
  dependencies: PublishDependencies,
  moderator: Member,
  row: ListedProposalRow,
  body: PublishBody,
): Promise<Result<null, Problem>> {
  const { database, publication, texts, reader, events } = dependencies;
  const address = addressOf(row);
  const version = reader.versions(row.proposal.id).at(-1);
  if (version === undefined) throw new Error(`Proposal ${row.proposal.id} waits without a version`);
  if (body.version !== undefined && body.version !== version.number) return refuse(newerVersion(version.number));

  async function decide(standing: Standing, newest: SentVersion): Promise<Result<Decision, Problem>> {
    const place = refusalOfPlace(address, newest.baseRevision, standing);
    if (place !== null) return refuse(place);
    const proposed = await texts.read(address, newest.markdown, null);
    if (proposed.refusal !== null) {
      return refuse(parseProblem(proposed.refusal, 'Nothing was published, and the proposal is kept.'));
    }
    if (proposed.text === null) throw new Error('A text that was not refused was not read');
    const kind = refusalOfKind(address, proposed.text);
    if (kind !== null) return refuse(kind);
    const overrides = matchOverrides([...proposed.findings], body.overrides ?? []);
    return overrides.ok ? accept({ text: proposed.text, overrides: overrides.value }) : overrides;
  }

  for (let attempt = 0; attempt < mostAttempts; attempt += 1) {
    const standing = publication.standing(address);
    const decision = await decide(standing, version);
    if (!decision.ok) return decision;
    const outcome = transact(database, (writing) =>
      writePublication(dependencies, writing, moderator, row, version, decision.value, standing),
    );
    if (outcome.ok) {
      events.tell({ kind: 'published', address, revision: outcome.value.number });
      return accept(null);
    }
    if (outcome.refusal !== 'moved') return refuse(outcome.refusal);
  }
  return refuse(bookKeepsMoving);
}

function writePublication(
  { publication, reader, writer, audit, now }: PublishDependencies,
  writing: Parameters<PagePublication['publish']>[0],
  moderator: Member,
  decidedOn: ListedProposalRow,
  version: SentVersion,
  { text, overrides }: Decision,
  standing: Standing,
): Result<Published, Problem | 'moved'> {
  const { id } = decidedOn.proposal;
  const address = addressOf(decidedOn);
  const fresh = reader.proposal(id)?.proposal;
  if (fresh === undefined) return refuse(movedMeanwhile);
  const next = afterAction(fresh.state, 'publish');
  if (!next.ok) return refuse(wrongState(next.refusal, 'publish'));
  if (fresh.versions !== version.number) return refuse(newerVersion(fresh.versions));
  const at = now().toISOString();
  const { markdown, summary } = version;
  const published = publication.publish(
    writing,
    {
      address,
      text,
      markdown,
      summary,
      authorId: fresh.authorId,
      publishedBy: moderator.id,
      proposalId: id,
      at,
      overrides,
    },
    standing,
  );
  if (!published.ok) return published;
  const { revisionId, number, bodyHash } = published.value;
  writer.change(writing, id, {
    state: next.value,
    title: text.frontMatter.title,
    updatedAt: at,
    decidedBy: moderator.id,
    publishedRevisionId: revisionId,
  });
  audit.append(writing, {
    at,
    actorId: moderator.id,
    action: 'publish',
    subject: formatPageAddress(address),
    details: { proposal: id, version: version.number, revision: number, bodyHash, overrides },
  });
  return published;
}

import { previewBodySchema } from '../../shared/contracts/bodies.ts';
import { readBody } from '../../shared/contracts/read-body.ts';
import type { PageView } from '../../shared/contracts/views.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import { problem } from '../../shared/lib/problem.ts';
import { createRecent } from '../../shared/lib/recent.ts';
import type { Result } from '../../shared/lib/result.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import { can } from '../../shared/members/can.ts';
import type { Actor } from '../../shared/members/member.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { applicabilityWords } from '../../shared/pages/applicability-words.ts';
import { differenceOf, type Difference } from '../../shared/text/difference.ts';
import type { Database } from '../db/client.ts';
import { lineViews } from './line-views.ts';
import { createPageLists } from './page-lists.ts';
import type { PagePublication } from './page-publication.ts';
import type { PageService, PublishedDocument } from './page-service-types.ts';
import { createPageReader, type DocumentRow, type PageRow, type RevisionRow, type SubjectRow } from './page-store.ts';
import { createPageTexts } from './page-texts.ts';
import { differenceView, factsView, findingView, revisionSummary } from './page-views.ts';
import type { ParsePool } from './parse-pool-types.ts';
import { parseProblem } from './parse-problem.ts';
import { networkOf } from './parsing-ration.ts';
import { readersFindings } from './readers-findings.ts';

/** A page's last revisions at its foot. */
const lastRevisionsShown = 3;
/** Revisions of one page that its history lists. */
const revisionsListed = 500;
const differencesKept = 50;
/** Their HTML is the one that page-texts.ts keeps as well. */
const viewsKept = 200;

export interface PageServiceDependencies {
  readonly database: Database;
  readonly parsePool: ParsePool;
  readonly publication: PagePublication;
  /** Whether visitors may read, or members only. */
  readonly reading: 'open' | 'members';
}

interface Found {
  readonly page: PageRow;
  readonly subject: SubjectRow;
  readonly revision: RevisionRow;
}

const noSuchPage = problem(
  'not-found',
  'There is no such page',
  'Check the address, or search for what you need. A page that nobody has written yet can be proposed.',
);

function documentView({ document, revision, publishedAt, subjectTitle, ...address }: DocumentRow): PublishedDocument {
  return { address, subjectTitle, revision, publishedAt, ...document };
}

/** Makes the service that reads the book to people: it guards who may read, and changes nothing. */
export function createPageService(dependencies: PageServiceDependencies): PageService {
  const { database, parsePool, publication, reading } = dependencies;
  const reader = createPageReader(database);
  const texts = createPageTexts(database, reader, publication, parsePool);
  const differences = createRecent<string, Difference>(differencesKept);
  const lists = createPageLists(reader);
  const views = createRecent<string, PageView>(viewsKept);

  function refuseReading(actor: Actor): Problem | null {
    if (can(actor, 'read', { reading })) return null;
    return actor === null
      ? problem(
          'sign-in-needed',
          'This book is for members',
          'The club keeps its book to its members: sign in to read it.',
        )
      : problem(
          'not-allowed',
          'You may not read this book',
          'Your membership is suspended. Ask an administrator of the club.',
        );
  }

  /** Answers a reader, or says why they may not read. */
  async function toReader<Value>(
    actor: Actor,
    answer: () => Promise<Result<Value, Problem>> | Result<Value, Problem>,
  ): Promise<Result<Value, Problem>> {
    const refusal = refuseReading(actor);
    return refusal === null ? answer() : refuse(refusal);
  }

  function find(address: PageAddress, number: number | null): Found | null {
    const found = reader.page(address);
    if (found === null) return null;
    const revision = reader.revision(found.page.id, number ?? found.page.publishedRevision);
    return revision === null ? null : { page: found.page, subject: found.subject, revision };
  }

  function pageView(address: PageAddress, found: Found, text: PageText, variant: Variant): PageView {
    const { page, subject, revision } = found;
    const { frontMatter, outline, findings } = text;
    const { facts, choices, siblings } = lists.surroundings(subject);
    return {
      address: formatPageAddress(address),
      ...address,
      subjectTitle: subject.title,
      title: frontMatter.title,
      kind: frontMatter.kind,
      summary: frontMatter.summary,
      revision: revision.number,
      newestRevision: page.publishedRevision,
      retired: page.retiredAt !== null,
      publishedAt: revision.publishedAt,
      author: revision.author,
      publishedBy: revision.publishedBy,
      sources: [...frontMatter.sources],
      facts: frontMatter.kind === 'overview' ? factsView(frontMatter.facts) : facts,
      applies: applicabilityWords(frontMatter.applies),
      variant,
      choices,
      outline: [...outline],
      findings: readersFindings(findings).map(findingView),
      overrides: reader.overrides(revision.id),
      lastRevisions: reader
        .revisionsBefore(page.id, page.publishedRevision + 1, lastRevisionsShown)
        .map(revisionSummary),
      siblings,
      html: texts.html(address, revision, text, variant),
    };
  }

  /** A revision as a reader of a variant sees it: made once, and kept until something of its subject is published. */
  async function viewRevision(
    address: PageAddress,
    number: number | null,
    variant: Variant,
  ): Promise<Result<PageView, Problem>> {
    const found = reader.page(address);
    if (found === null) return refuse(noSuchPage);
    const { page, subject } = found;
    const key = JSON.stringify([
      page.id,
      number ?? page.publishedRevision,
      subject.version,
      variant.year,
      variant.market,
      variant.frame,
    ]);
    const kept = views.get(key);
    if (kept !== undefined) return accept(kept);
    const revision = reader.revision(page.id, number ?? page.publishedRevision);
    if (revision === null) return refuse(noSuchPage);
    const text = await texts.text(address, page, revision);
    const view = pageView(address, { page, subject, revision }, text, variant);
    views.set(key, view);
    return accept(view);
  }

  function compare(from: RevisionRow, to: RevisionRow): Difference {
    const key = `${from.id} ${to.id}`;
    const kept = differences.get(key);
    if (kept !== undefined) return kept;
    const difference = differenceOf(reader.requireBody(from.id), reader.requireBody(to.id));
    differences.set(key, difference);
    return difference;
  }

  return {
    home: (actor) => toReader(actor, () => accept(lists.home())),

    shelf: (actor, shelf) => toReader(actor, () => accept(lists.shelf(shelf))),

    subject: (actor, address) =>
      toReader(actor, () => {
        const view = lists.subject(address);
        return view === null ? refuse(noSuchPage) : accept(view);
      }),

    page: (actor, address, variant) => toReader(actor, () => viewRevision(address, null, variant)),

    revision: (actor, address, number, variant) => toReader(actor, () => viewRevision(address, number, variant)),

    pageData: (actor, address, variant) =>
      toReader(actor, async () => {
        const found = find(address, null);
        if (found === null) return refuse(noSuchPage);
        const text = await texts.text(address, found.page, found.revision);
        return accept({
          ...pageView(address, found, text, variant),
          markdown: reader.requireBody(found.revision.id),
          blocks: [...text.blocks],
          lines: lineViews(address, text),
        });
      }),

    revisions: (actor, address) =>
      toReader(actor, () => {
        const found = reader.page(address);
        if (found === null) return refuse(noSuchPage);
        const { id, title, publishedRevision } = found.page;
        const rows = reader.revisionsBefore(id, publishedRevision + 1, revisionsListed);
        return accept({ address: formatPageAddress(address), title, revisions: rows.map(revisionSummary) });
      }),

    compare: (actor, address, from, to) =>
      toReader(actor, () => {
        const [before, after] = [find(address, from), find(address, to)];
        if (before === null || after === null) return refuse(noSuchPage);
        return accept({
          address: formatPageAddress(address),
          title: after.page.title,
          from: revisionSummary(before.revision),
          to: revisionSummary(after.revision),
          difference: differenceView(compare(before.revision, after.revision)),
        });
      }),

    preview: (actor, body, networkAddress) =>
      toReader(actor, async () => {
        const asked = readBody(previewBodySchema, body);
        if (!asked.ok) return asked;
        const { markdown, shelf, subject, page, year, market, frame } = asked.value;
        const inSubject = shelf === undefined || subject === undefined ? null : { shelf, subject, page: page ?? '' };
        const request = {
          markdown,
          context: inSubject === null ? { idsElsewhere: [] } : publication.context(inSubject),
          address: page === undefined ? null : inSubject,
          variant: { ...anyVariant, year: year ?? null, market: market ?? null, frame: frame ?? null },
        };
        const parsed = await parsePool.parse(request, `network:${networkOf(networkAddress)}`);
        if (!parsed.ok) return refuse(parseProblem(parsed.refusal, 'Your text stands where you wrote it.'));
        const { text, html } = parsed.value;
        return accept({
          html,
          outline: [...text.outline],
          blocks: [...text.blocks],
          findings: text.findings.map(findingView),
        });
      }),

    publishedDocuments: () => reader.documents().map(documentView),

    publishedDocument(address) {
      const row = reader.document(address);
      return row === null ? null : documentView(row);
    },
  };
}

import { createHash } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import type { PageText, SubjectContext } from '../../shared/dialect/page-text.ts';
import type { Result } from '../../shared/lib/result.ts';
import { createRecent } from '../../shared/lib/recent.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { Database } from '../db/client.ts';
import type { NewId } from '../db/new-id.ts';
import { overrides, pages, revisionBodies, revisions, subjects } from '../db/schema/pages.ts';
import type { Writing } from '../db/transact.ts';
import { createDerivedWriter } from './derived-store.ts';
import { createPageReader, type SubjectRow } from './page-store.ts';

/** Subjects whose ids are kept in memory. */
const subjectsKept = 200;

type SubjectIds = SubjectContext['idsElsewhere'];

/** Where an address stands in the book: what a publication is decided by, and re-checked against. */
export interface Standing {
  /** Null where nobody has published the subject's overview yet. */
  readonly subject: { readonly title: string; readonly version: number } | null;
  /** Null where the page does not exist. */
  readonly page: { readonly title: string; readonly revision: number; readonly retired: boolean } | null;
}

/** What is to be published, all of it decided. */
export interface Publication {
  readonly address: PageAddress;
  readonly text: PageText;
  readonly markdown: string;
  /** What the author said that changed. */
  readonly summary: string;
  readonly authorId: string;
  readonly publishedBy: string;
  readonly proposalId: string;
  readonly at: string;
  readonly overrides: readonly { readonly code: string; readonly address: string | null; readonly reason: string }[];
}

/** What was published. */
export interface Published {
  readonly revisionId: string;
  readonly number: number;
  /** SHA-256 of the text, in hex. */
  readonly bodyHash: string;
}

export interface PagePublication {
  standing(address: PageAddress): Standing;
  /** The text of the page's newest revision, or of another; null where there is none. */
  markdown(address: PageAddress, revision?: number): string | null;
  /** What a moderator let through when a revision was published. */
  overrides(revisionId: string): { code: string; address: string | null; reason: string }[];
  /** What a reader of a text at this address may know of the rest of its subject. */
  context(address: PageAddress): SubjectContext;
  /**
   * Writes a revision and everything that follows from it; refuses, having written nothing, where the book no longer
   * stands as it stood when the publication was decided.
   */
  publish(writing: Writing, publication: Publication, decidedOn: Standing): Result<Published, 'moved'>;
}

/** True where both are the same moment of the book, as far as a publication goes. */
function isSameStanding(one: Standing, other: Standing): boolean {
  return one.subject?.version === other.subject?.version && one.page?.revision === other.page?.revision;
}

/** Publishes pages: the one place that writes subjects, pages, revisions and what is derived from them. */
export function createPagePublication(database: Database, newId: NewId): PagePublication {
  const { query } = database;
  const reader = createPageReader(database);
  const { placeholder } = sql;

  const insertSubject = query
    .insert(subjects)
    .values({
      id: placeholder('id'),
      shelf: placeholder('shelf'),
      slug: placeholder('slug'),
      title: placeholder('title'),
      version: 0,
      createdAt: placeholder('at'),
    })
    .prepare();
  const raiseSubject = query
    .update(subjects)
    .set({ version: sql`${subjects.version} + 1`, title: sql`coalesce(${placeholder('title')}, ${subjects.title})` })
    .where(eq(subjects.id, placeholder('id')))
    .prepare();
  const upsertPage = query
    .insert(pages)
    .values({
      id: placeholder('id'),
      subjectId: placeholder('subjectId'),
      slug: placeholder('slug'),
      title: placeholder('title'),
      kind: placeholder('kind'),
      summary: placeholder('summary'),
      publishedRevision: placeholder('number'),
      publishedAt: placeholder('at'),
      createdAt: placeholder('at'),
    })
    .onConflictDoUpdate({
      target: pages.id,
      // A page that was retired comes back with its next revision.
      set: {
        title: sql`excluded.title`,
        kind: sql`excluded.kind`,
        summary: sql`excluded.summary`,
        publishedRevision: sql`excluded.published_revision`,
        publishedAt: sql`excluded.published_at`,
        retiredAt: null,
      },
    })
    .prepare();
  const insertRevision = query
    .insert(revisions)
    .values({
      id: placeholder('id'),
      pageId: placeholder('pageId'),
      number: placeholder('number'),
      title: placeholder('title'),
      summary: placeholder('summary'),
      authorId: placeholder('authorId'),
      publishedBy: placeholder('publishedBy'),
      publishedAt: placeholder('at'),
      proposalId: placeholder('proposalId'),
      bodyHash: placeholder('bodyHash'),
    })
    .prepare();
  const insertBody = query
    .insert(revisionBodies)
    .values({ revisionId: placeholder('revisionId'), markdown: placeholder('markdown') })
    .prepare();
  const insertOverride = query
    .insert(overrides)
    .values({
      id: placeholder('id'),
      revisionId: placeholder('revisionId'),
      code: placeholder('code'),
      address: placeholder('address'),
      reason: placeholder('reason'),
      memberId: placeholder('memberId'),
      createdAt: placeholder('at'),
    })
    .prepare();
  const derived = createDerivedWriter(database);
  const subjectIds = createRecent<string, SubjectIds>(subjectsKept);

  function idsOf({ id: subjectId, version, shelf, slug }: SubjectRow): SubjectIds {
    const key = `${subjectId} ${String(version)}`;
    const known = subjectIds.get(key);
    if (known !== undefined) return known;
    // A page of safe modifications lays its blocks over the donor's: there the same id is meant.
    const original = reader.digestsOfSubject(shelf, slug).filter(({ kind }) => kind !== 'safe-mods');
    const ids = original.flatMap(({ page, digest }) => digest.ids.map((id) => ({ id, page })));
    subjectIds.set(key, ids);
    return ids;
  }

  function standing(address: PageAddress): Standing {
    const found = reader.page(address);
    const subject = found?.subject ?? reader.subject(address.shelf, address.subject);
    return {
      subject: subject === null ? null : { title: subject.title, version: subject.version },
      page:
        found === null
          ? null
          : { title: found.page.title, revision: found.page.publishedRevision, retired: found.page.retiredAt !== null },
    };
  }

  return {
    standing,
    markdown(address, revision) {
      const found = reader.page(address);
      const row = found && reader.revision(found.page.id, revision ?? found.page.publishedRevision);
      return row === null ? null : reader.requireBody(row.id);
    },
    overrides: (revisionId) => reader.overrides(revisionId),
    context({ shelf, subject, page }) {
      const row = reader.subject(shelf, subject);
      return { idsElsewhere: row === null ? [] : idsOf(row).filter((one) => one.page !== page) };
    },
    publish(writing, publication, decidedOn) {
      const { address, text, markdown, summary, authorId, publishedBy, proposalId, at } = publication;
      const found = reader.page(address);
      if (!isSameStanding(standing(address), decidedOn)) return refuse('moved');
      const subjectId = found?.subject.id ?? reader.subject(address.shelf, address.subject)?.id ?? newId();
      const pageId = found?.page.id ?? newId();
      const revisionId = newId();
      const number = (found?.page.publishedRevision ?? 0) + 1;
      const bodyHash = createHash('sha256').update(markdown).digest('hex');
      const { title, kind, summary: pageSummary } = text.frontMatter;
      const isOverview = address.page === 'overview';
      if (decidedOn.subject === null) {
        insertSubject.run({ id: subjectId, shelf: address.shelf, slug: address.subject, title, at });
      }
      upsertPage.run({ id: pageId, subjectId, slug: address.page, title, kind, summary: pageSummary, number, at });
      insertRevision.run({
        id: revisionId,
        pageId,
        number,
        title,
        summary,
        authorId,
        publishedBy,
        at,
        proposalId,
        bodyHash,
      });
      insertBody.run({ revisionId, markdown });
      for (const override of publication.overrides) {
        insertOverride.run({ ...override, id: newId(), revisionId, memberId: publishedBy, at });
      }
      derived.write(writing, pageId, revisionId, text);
      raiseSubject.run({ id: subjectId, title: isOverview ? title : null });
      return accept({ revisionId, number, bodyHash });
    },
  };
}

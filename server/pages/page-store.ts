import { and, asc, desc, eq, isNull, lt, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { PageAddress, Shelf } from '../../shared/pages/address.ts';
import type { Database } from '../db/client.ts';
import { members } from '../db/schema/members.ts';
import {
  overrides,
  pageDigests,
  pages,
  renditions,
  revisionBodies,
  revisions,
  searchDocuments,
  subjects,
} from '../db/schema/pages.ts';

export type SubjectRow = typeof subjects.$inferSelect;
export type PageRow = typeof pages.$inferSelect;

/**
 * Reads subjects, pages and revisions. Its queries are prepared once: built each time they cost more than SQLite itself.
 */
export function createPageReader({ query }: Database) {
  const author = alias(members, 'author');
  const publisher = alias(members, 'publisher');
  const { placeholder } = sql;

  const revisionFields = {
    id: revisions.id,
    number: revisions.number,
    title: revisions.title,
    summary: revisions.summary,
    author: { id: author.id, name: author.name },
    publishedBy: { id: publisher.id, name: publisher.name },
    publishedAt: revisions.publishedAt,
    proposal: revisions.proposalId,
  };
  const revisionRows = () =>
    query
      .select(revisionFields)
      .from(revisions)
      .innerJoin(author, eq(author.id, revisions.authorId))
      .leftJoin(publisher, eq(publisher.id, revisions.publishedBy));

  /** A page with its newest revision and its digest: a row of a list. */
  const listedRows = () =>
    query
      .select({
        shelf: subjects.shelf,
        subject: subjects.slug,
        subjectTitle: subjects.title,
        page: pages.slug,
        title: pages.title,
        kind: pages.kind,
        summary: pages.summary,
        publishedAt: pages.publishedAt,
        revision: pages.publishedRevision,
        author: { id: author.id, name: author.name },
        publishedBy: { id: publisher.id, name: publisher.name },
        lines: pageDigests.lines,
        cited: pageDigests.cited,
        digest: pageDigests.digest,
      })
      .from(pages)
      .innerJoin(subjects, eq(subjects.id, pages.subjectId))
      .innerJoin(revisions, and(eq(revisions.pageId, pages.id), eq(revisions.number, pages.publishedRevision)))
      .innerJoin(pageDigests, eq(pageDigests.pageId, pages.id))
      .innerJoin(author, eq(author.id, revisions.authorId))
      .leftJoin(publisher, eq(publisher.id, revisions.publishedBy));

  const documentRows = () =>
    query
      .select({
        shelf: subjects.shelf,
        subject: subjects.slug,
        subjectTitle: subjects.title,
        page: pages.slug,
        revision: pages.publishedRevision,
        publishedAt: pages.publishedAt,
        document: searchDocuments.document,
      })
      .from(searchDocuments)
      .innerJoin(pages, eq(pages.id, searchDocuments.pageId))
      .innerJoin(subjects, eq(subjects.id, pages.subjectId));

  const onShelf = eq(subjects.shelf, placeholder('shelf'));
  const isSubject = and(onShelf, eq(subjects.slug, placeholder('subject')));
  const isPage = eq(pages.slug, placeholder('page'));
  const isPresent = isNull(pages.retiredAt);

  const subject = query.select().from(subjects).where(isSubject).prepare();
  const page = query
    .select({ page: pages, subject: subjects })
    .from(pages)
    .innerJoin(subjects, eq(subjects.id, pages.subjectId))
    .where(and(isSubject, isPage))
    .prepare();
  const ofSubject = listedRows().where(and(isSubject, isPresent)).orderBy(asc(pages.slug)).prepare();
  const ofShelf = listedRows()
    .where(and(onShelf, isPresent))
    .orderBy(asc(subjects.title), asc(subjects.slug), asc(pages.slug))
    .prepare();
  const lately = listedRows()
    .where(isPresent)
    .orderBy(desc(pages.publishedAt), desc(pages.id))
    .limit(placeholder('limit'))
    .prepare();
  const digests = query
    .select({ page: pages.slug, title: pages.title, kind: pages.kind, digest: pageDigests.digest })
    .from(pages)
    .innerJoin(subjects, eq(subjects.id, pages.subjectId))
    .innerJoin(pageDigests, eq(pageDigests.pageId, pages.id))
    .where(and(isSubject, isPresent))
    .prepare();
  const shelfCounts = query
    .select({
      shelf: subjects.shelf,
      subjects: sql<number>`count(distinct ${subjects.id})`,
      lines: sql<number>`sum(${pageDigests.lines})`,
    })
    .from(pages)
    .innerJoin(subjects, eq(subjects.id, pages.subjectId))
    .innerJoin(pageDigests, eq(pageDigests.pageId, pages.id))
    .where(isPresent)
    .groupBy(subjects.shelf)
    .prepare();
  const bookVersion = query
    .select({ version: sql<number | null>`sum(${subjects.version})` })
    .from(subjects)
    .prepare();
  const revision = revisionRows()
    .where(and(eq(revisions.pageId, placeholder('pageId')), eq(revisions.number, placeholder('number'))))
    .prepare();
  const newestBefore = revisionRows()
    .where(and(eq(revisions.pageId, placeholder('pageId')), lt(revisions.number, placeholder('before'))))
    .orderBy(desc(revisions.number))
    .limit(placeholder('limit'))
    .prepare();
  const body = query
    .select({ markdown: revisionBodies.markdown })
    .from(revisionBodies)
    .where(eq(revisionBodies.revisionId, placeholder('revisionId')))
    .prepare();
  const rendition = query
    .select({ text: renditions.text })
    .from(renditions)
    .where(
      and(
        eq(renditions.revisionId, placeholder('revisionId')),
        eq(renditions.dialectVersion, placeholder('dialectVersion')),
      ),
    )
    .prepare();
  const overridesOf = query
    .select({ code: overrides.code, address: overrides.address, reason: overrides.reason })
    .from(overrides)
    .where(eq(overrides.revisionId, placeholder('revisionId')))
    .prepare();
  const documents = documentRows()
    .where(isPresent)
    .orderBy(asc(subjects.shelf), asc(subjects.slug), asc(pages.slug))
    .prepare();
  const document = documentRows()
    .where(and(isSubject, isPage, isPresent))
    .prepare();
  const outdated = query
    .select({ shelf: subjects.shelf, subject: subjects.slug, page: pages.slug })
    .from(pages)
    .innerJoin(subjects, eq(subjects.id, pages.subjectId))
    .leftJoin(pageDigests, eq(pageDigests.pageId, pages.id))
    .where(
      or(isNull(pageDigests.dialectVersion), sql`${pageDigests.dialectVersion} <> ${placeholder('dialectVersion')}`),
    )
    .prepare();

  return {
    subject: (shelf: Shelf, slug: string) => subject.get({ shelf, subject: slug }) ?? null,
    page: ({ shelf, subject: slug, page: name }: PageAddress) => page.get({ shelf, subject: slug, page: name }) ?? null,
    pagesOfSubject: (shelf: Shelf, slug: string) => ofSubject.all({ shelf, subject: slug }),
    pagesOfShelf: (shelf: Shelf) => ofShelf.all({ shelf }),
    lately: (limit: number) => lately.all({ limit }),
    digestsOfSubject: (shelf: Shelf, slug: string) => digests.all({ shelf, subject: slug }),
    shelfCounts: () => shelfCounts.all(),
    /** A number that every publication raises. */
    bookVersion: () => bookVersion.get()?.version ?? 0,
    revision: (pageId: string, number: number) => revision.get({ pageId, number }) ?? null,
    /** Newest first, below the number `before`: the key that the last list ended with. */
    revisionsBefore: (pageId: string, before: number, limit: number) => newestBefore.all({ pageId, before, limit }),
    requireBody(revisionId: string): string {
      const found = body.get({ revisionId });
      if (found === undefined) throw new Error(`Revision ${revisionId} has no text`);
      return found.markdown;
    },
    rendition: (revisionId: string, dialectVersion: number) =>
      rendition.get({ revisionId, dialectVersion })?.text ?? null,
    overrides: (revisionId: string) => overridesOf.all({ revisionId }),
    documents: () => documents.all(),
    document: ({ shelf, subject: slug, page: name }: PageAddress) =>
      document.get({ shelf, subject: slug, page: name }) ?? null,
    /** Pages whose derived rows another version of the dialect made. */
    outdatedPages: (dialectVersion: number) => outdated.all({ dialectVersion }),
  };
}

export type PageReader = ReturnType<typeof createPageReader>;
export type RevisionRow = NonNullable<ReturnType<PageReader['revision']>>;
export type ListedPageRow = ReturnType<PageReader['lately']>[number];
export type DocumentRow = ReturnType<PageReader['documents']>[number];

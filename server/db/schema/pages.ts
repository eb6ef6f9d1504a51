import { index, integer, primaryKey, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import type { PageText } from '../../../shared/dialect/page-text.ts';
import { shelves } from '../../../shared/pages/address.ts';
import { pageKinds } from '../../../shared/pages/page-kind.ts';
import type { PageDigest, StoredDocument } from './derived.ts';
import { members } from './members.ts';

/**
 * A donor, part or topic. `version` is raised by every publication in it and by whatever else changes what its lists
 * show, so that findings know what they were reckoned from and lists when to be made anew.
 */
export const subjects = sqliteTable(
  'subjects',
  {
    id: text('id').primaryKey(),
    shelf: text('shelf', { enum: shelves }).notNull(),
    slug: text('slug').notNull(),
    /** The title of its overview. */
    title: text('title').notNull(),
    version: integer('version').notNull(),
    createdAt: text('created_at').notNull(),
  },
  (table) => [unique('subjects_address').on(table.shelf, table.slug)],
);

/** A published page. Title, kind and summary are those of its newest revision, so that lists read nothing else. */
export const pages = sqliteTable(
  'pages',
  {
    id: text('id').primaryKey(),
    subjectId: text('subject_id')
      .notNull()
      .references(() => subjects.id),
    slug: text('slug').notNull(),
    title: text('title').notNull(),
    kind: text('kind', { enum: pageKinds }).notNull(),
    summary: text('summary').notNull(),
    /** The number of the newest revision. */
    publishedRevision: integer('published_revision').notNull(),
    publishedAt: text('published_at').notNull(),
    retiredAt: text('retired_at'),
    createdAt: text('created_at').notNull(),
  },
  (table) => [
    unique('pages_address').on(table.subjectId, table.slug),
    index('pages_by_publication').on(table.publishedAt, table.id),
  ],
);

/** What was published, once for all: never changed, never deleted (triggers hold it). */
export const revisions = sqliteTable(
  'revisions',
  {
    id: text('id').primaryKey(),
    pageId: text('page_id')
      .notNull()
      .references(() => pages.id),
    number: integer('number').notNull(),
    title: text('title').notNull(),
    /** What the author said that changed. */
    summary: text('summary').notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => members.id),
    publishedBy: text('published_by').references(() => members.id),
    publishedAt: text('published_at').notNull(),
    proposalId: text('proposal_id'),
    /** SHA-256 of the text, in hex. */
    bodyHash: text('body_hash').notNull(),
  },
  (table) => [unique('revisions_of_page').on(table.pageId, table.number)],
);

/** The texts of revisions, apart from them: a list of history must not read them. Never changed, never deleted. */
export const revisionBodies = sqliteTable('revision_bodies', {
  revisionId: text('revision_id')
    .primaryKey()
    .references(() => revisions.id),
  markdown: text('markdown').notNull(),
});

/** A `stop` finding that a moderator let through, with the reason that the page carries. Never changed, never deleted. */
export const overrides = sqliteTable(
  'overrides',
  {
    id: text('id').primaryKey(),
    revisionId: text('revision_id')
      .notNull()
      .references(() => revisions.id),
    code: text('code').notNull(),
    address: text('address'),
    reason: text('reason').notNull(),
    memberId: text('member_id')
      .notNull()
      .references(() => members.id),
    createdAt: text('created_at').notNull(),
  },
  (table) => [index('overrides_of_revision').on(table.revisionId)],
);

/** A revision's text as the dialect of that version reads it. Derived: may be thrown away and made again. */
export const renditions = sqliteTable(
  'renditions',
  {
    revisionId: text('revision_id')
      .notNull()
      .references(() => revisions.id),
    dialectVersion: integer('dialect_version').notNull(),
    text: text('text', { mode: 'json' }).$type<PageText>().notNull(),
  },
  (table) => [primaryKey({ columns: [table.revisionId, table.dialectVersion] })],
);

/** What lists and neighbours need to know of each page's newest revision. Derived. */
export const pageDigests = sqliteTable('page_digests', {
  pageId: text('page_id')
    .primaryKey()
    .references(() => pages.id),
  dialectVersion: integer('dialect_version').notNull(),
  lines: integer('lines').notNull(),
  cited: integer('cited').notNull(),
  digest: text('digest', { mode: 'json' }).$type<PageDigest>().notNull(),
});

/** What the search indexes of each page's newest revision. Derived. */
export const searchDocuments = sqliteTable('search_documents', {
  pageId: text('page_id')
    .primaryKey()
    .references(() => pages.id),
  dialectVersion: integer('dialect_version').notNull(),
  document: text('document', { mode: 'json' }).$type<StoredDocument>().notNull(),
});

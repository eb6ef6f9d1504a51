import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { shelves } from '../../../shared/pages/address.ts';
import { proposalStates } from '../../../shared/proposals/proposal.ts';
import { members } from './members.ts';
import { revisions } from './pages.ts';

/** The kinds of note: said in passing, or with a decision. */
export const noteKinds = ['note', 'sent-back', 'declined', 'published'] as const;

/**
 * A change on its way to publication. It names its page by address, since the page may not exist yet.
 * Title, summary, base and stops are those of the newest version sent, and of the draft until one is sent.
 */
export const proposals = sqliteTable(
  'proposals',
  {
    id: text('id').primaryKey(),
    shelf: text('shelf', { enum: shelves }).notNull(),
    subject: text('subject').notNull(),
    page: text('page').notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => members.id),
    state: text('state', { enum: proposalStates }).notNull(),
    title: text('title').notNull(),
    summary: text('summary').notNull(),
    baseRevision: integer('base_revision'),
    /** How many `stop` findings it had when it was last read. */
    stops: integer('stops').notNull(),
    /** How many versions were sent. */
    versions: integer('versions').notNull(),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
    sentAt: text('sent_at'),
    decidedBy: text('decided_by').references(() => members.id),
    publishedRevisionId: text('published_revision_id').references(() => revisions.id),
  },
  (table) => [
    index('proposals_by_state').on(table.state, table.updatedAt, table.id),
    index('proposals_by_author').on(table.authorId, table.updatedAt, table.id),
    index('proposals_by_page').on(table.shelf, table.subject, table.page),
  ],
);

/** The text that is still being written: the only text of a proposal that changes. Gone when it is sent. */
export const proposalDrafts = sqliteTable('proposal_drafts', {
  proposalId: text('proposal_id')
    .primaryKey()
    .references(() => proposals.id),
  markdown: text('markdown').notNull(),
  summary: text('summary').notNull(),
  baseRevision: integer('base_revision'),
  createdAt: text('created_at').notNull(),
});

/** What was sent, once for all: never changed, never deleted. */
export const proposalVersions = sqliteTable(
  'proposal_versions',
  {
    proposalId: text('proposal_id')
      .notNull()
      .references(() => proposals.id),
    number: integer('number').notNull(),
    markdown: text('markdown').notNull(),
    summary: text('summary').notNull(),
    baseRevision: integer('base_revision'),
    createdAt: text('created_at').notNull(),
    sentAt: text('sent_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.proposalId, table.number] })],
);

/** What was said about it. Never changed, never deleted. */
export const proposalNotes = sqliteTable(
  'proposal_notes',
  {
    id: text('id').primaryKey(),
    proposalId: text('proposal_id')
      .notNull()
      .references(() => proposals.id),
    /** 1, 2, 3 … within the proposal: the order in which they were written. */
    number: integer('number').notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => members.id),
    kind: text('kind', { enum: noteKinds }).notNull(),
    text: text('text').notNull(),
    address: text('address'),
    line: integer('line'),
    createdAt: text('created_at').notNull(),
  },
  (table) => [index('proposal_notes_in_order').on(table.proposalId, table.number)],
);

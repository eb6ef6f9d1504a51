import { and, asc, count, desc, eq, isNotNull, ne, or, sql, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';
import type { Database } from '../db/client.ts';
import { members } from '../db/schema/members.ts';
import { pages, revisions, subjects } from '../db/schema/pages.ts';
import { proposalDrafts, proposalNotes, proposals, proposalVersions } from '../db/schema/proposals.ts';
import type { Writing } from '../db/transact.ts';

export type ProposalRow = typeof proposals.$inferSelect;
export type DraftRow = typeof proposalDrafts.$inferSelect;
export type VersionRow = typeof proposalVersions.$inferSelect;
export type SentVersion = Omit<VersionRow, 'proposalId'>;
export type NoteRow = typeof proposalNotes.$inferInsert;

/** Proposals in one list. */
const mostListed = 200;

/** Reads proposals with their drafts, versions and notes. */
export function createProposalReader({ query }: Database) {
  const { placeholder } = sql;
  const author = alias(members, 'author');
  const decider = alias(members, 'decider');
  const isProposal = eq(proposals.id, placeholder('id'));

  const listed = (where: SQL | undefined, ...order: SQL[]) =>
    query
      .select({
        proposal: proposals,
        author: { id: author.id, name: author.name },
        decidedBy: { id: decider.id, name: decider.name },
        publishedRevision: pages.publishedRevision,
        publishedAs: revisions.number,
        notes: sql<number>`(select count(*) from ${proposalNotes} where ${proposalNotes.proposalId} = ${proposals.id})`,
      })
      .from(proposals)
      .innerJoin(author, eq(author.id, proposals.authorId))
      .leftJoin(decider, eq(decider.id, proposals.decidedBy))
      .leftJoin(subjects, and(eq(subjects.shelf, proposals.shelf), eq(subjects.slug, proposals.subject)))
      .leftJoin(pages, and(eq(pages.subjectId, subjects.id), eq(pages.slug, proposals.page)))
      .leftJoin(revisions, eq(revisions.id, proposals.publishedRevisionId))
      .where(where)
      .orderBy(...order)
      .limit(mostListed)
      .prepare();

  const isAuthor = eq(proposals.authorId, placeholder('memberId'));
  const inState = eq(proposals.state, placeholder('state'));
  const isVisible = or(isAuthor, isNotNull(proposals.sentAt));
  const newestFirst = [desc(proposals.updatedAt), desc(proposals.id)];
  // What is worked through is read like a day book: the oldest first.
  const oldestFirst = [asc(proposals.sentAt), asc(proposals.createdAt), asc(proposals.id)];

  const one = listed(isProposal);
  const lists = {
    own: listed(isAuthor, ...newestFirst),
    ownInState: listed(and(isAuthor, inState), ...oldestFirst),
    visible: listed(isVisible, ...newestFirst),
    visibleInState: listed(and(isVisible, inState), ...oldestFirst),
  };
  const waitingOfOthers = query
    .select({ waiting: count() })
    .from(proposals)
    .where(and(eq(proposals.state, 'waiting'), ne(proposals.authorId, placeholder('memberId'))))
    .prepare();
  const openOfAuthor = query
    .select({ id: proposals.id })
    .from(proposals)
    .where(
      and(
        isAuthor,
        eq(proposals.shelf, placeholder('shelf')),
        eq(proposals.subject, placeholder('subject')),
        eq(proposals.page, placeholder('page')),
        or(eq(proposals.state, 'draft'), eq(proposals.state, 'waiting'), eq(proposals.state, 'sent-back')),
      ),
    )
    .orderBy(desc(proposals.updatedAt))
    .limit(1)
    .prepare();
  const draft = query
    .select()
    .from(proposalDrafts)
    .where(eq(proposalDrafts.proposalId, placeholder('id')))
    .prepare();
  const versions = query
    .select({
      number: proposalVersions.number,
      markdown: proposalVersions.markdown,
      summary: proposalVersions.summary,
      baseRevision: proposalVersions.baseRevision,
      createdAt: proposalVersions.createdAt,
      sentAt: proposalVersions.sentAt,
    })
    .from(proposalVersions)
    .where(eq(proposalVersions.proposalId, placeholder('id')))
    .orderBy(asc(proposalVersions.number))
    .prepare();
  const notes = query
    .select({
      id: proposalNotes.id,
      author: { id: author.id, name: author.name },
      kind: proposalNotes.kind,
      text: proposalNotes.text,
      address: proposalNotes.address,
      line: proposalNotes.line,
      createdAt: proposalNotes.createdAt,
    })
    .from(proposalNotes)
    .innerJoin(author, eq(author.id, proposalNotes.authorId))
    .where(eq(proposalNotes.proposalId, placeholder('id')))
    .orderBy(asc(proposalNotes.number))
    .prepare();

  return {
    proposal: (id: string) => one.get({ id }) ?? null,
    draft: (id: string) => draft.get({ id }) ?? null,
    versions: (id: string) => versions.all({ id }),
    notes: (id: string) => notes.all({ id }),
    /** A member's own proposals: of one state the oldest first, of all the newest first. */
    own: (memberId: string, state: ProposalState | null) =>
      state === null ? lists.own.all({ memberId }) : lists.ownInState.all({ memberId, state }),
    /** What a moderator sees: their own, and everything that was ever sent. */
    visible: (memberId: string, state: ProposalState | null) =>
      state === null ? lists.visible.all({ memberId }) : lists.visibleInState.all({ memberId, state }),
    waitingOfOthers: (memberId: string) => waitingOfOthers.get({ memberId })?.waiting ?? 0,
    /** A member's proposal of a page of which something may still become; null where there is none. */
    openOf: (memberId: string, { shelf, subject, page }: PageAddress) =>
      openOfAuthor.get({ memberId, shelf, subject, page })?.id ?? null,
  };
}

export type ProposalReader = ReturnType<typeof createProposalReader>;
export type ListedProposalRow = NonNullable<ReturnType<ProposalReader['proposal']>>;

/** What changes of a proposal's row as it goes its way. */
export type ProposalChange = Partial<Omit<ProposalRow, 'id' | 'shelf' | 'authorId' | 'createdAt'>>;

/** Writes proposals; every method asks for an open transaction. */
export function createProposalWriter({ query }: Database) {
  const { placeholder } = sql;
  const nextNote = query
    .select({ number: sql<number>`coalesce(max(${proposalNotes.number}), 0) + 1` })
    .from(proposalNotes)
    .where(eq(proposalNotes.proposalId, placeholder('id')))
    .prepare();
  return {
    insert(_writing: Writing, row: ProposalRow): void {
      query.insert(proposals).values(row).run();
    },
    change(_writing: Writing, id: string, change: ProposalChange): void {
      query.update(proposals).set(change).where(eq(proposals.id, id)).run();
    },
    putDraft(_writing: Writing, row: DraftRow): void {
      const { markdown, summary, baseRevision } = row;
      query
        .insert(proposalDrafts)
        .values(row)
        .onConflictDoUpdate({ target: proposalDrafts.proposalId, set: { markdown, summary, baseRevision } })
        .run();
    },
    removeDraft(_writing: Writing, id: string): void {
      query.delete(proposalDrafts).where(eq(proposalDrafts.proposalId, id)).run();
    },
    insertVersion(_writing: Writing, row: VersionRow): void {
      query.insert(proposalVersions).values(row).run();
    },
    insertNote(_writing: Writing, row: Omit<NoteRow, 'number'>): void {
      const number = nextNote.get({ id: row.proposalId })?.number ?? 1;
      query
        .insert(proposalNotes)
        .values({ ...row, number })
        .run();
    },
  };
}

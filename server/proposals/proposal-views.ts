import { createHash } from 'node:crypto';
import type { ProposalSummary, ProposalView } from '../../shared/contracts/views.ts';
import { createRecent } from '../../shared/lib/recent.ts';
import { can } from '../../shared/members/can.ts';
import type { Actor } from '../../shared/members/member.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { afterAction, isClosed, type ProposalAction } from '../../shared/proposals/transitions.ts';
import { differenceOf, type Difference } from '../../shared/text/difference.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import { differenceView } from '../pages/page-views.ts';
import type { ProposedText } from './proposed-text.ts';
import type { ListedProposalRow, ProposalReader } from './proposal-store.ts';

const differencesKept = 50;

/** The page that a proposal is about. */
export function addressOf({ proposal }: ListedProposalRow): PageAddress {
  return { shelf: proposal.shelf, subject: proposal.subject, page: proposal.page };
}

/** True where something may still become of it and its page was published since: what it starts from is no longer there. */
function hasFallenBehind({ proposal, publishedRevision }: ListedProposalRow, base: number | null): boolean {
  return !isClosed(proposal.state) && publishedRevision !== base;
}

/** What a list and the proposal itself both say of it. */
function commonView(row: ListedProposalRow) {
  const { proposal, author, publishedRevision } = row;
  const { id, shelf, subject, page, title, summary, state, baseRevision, createdAt, updatedAt, sentAt } = proposal;
  return {
    ...{ id, shelf, subject, page, title, summary, state, author, baseRevision, publishedRevision },
    ...{ fallenBehind: hasFallenBehind(row, baseRevision), createdAt, updatedAt, sentAt },
  };
}

/** A proposal as a row of a list. */
export function proposalSummary(row: ListedProposalRow): ProposalSummary {
  return { ...commonView(row), versions: row.proposal.versions, notes: row.notes, stops: row.proposal.stops };
}

/** The text of a proposal that somebody sees: their own draft where there is one, the newest version sent otherwise. */
export interface CurrentText {
  readonly markdown: string;
  readonly summary: string;
  readonly baseRevision: number | null;
}

export interface ProposalViews {
  /** The text that this member sees of it. */
  current(actor: Actor, row: ListedProposalRow): CurrentText;
  view(actor: Actor, row: ListedProposalRow, current: CurrentText, proposed: ProposedText): ProposalView;
}

/** Puts together what a member sees of one proposal. */
export function createProposalViews(reader: ProposalReader, publication: PagePublication): ProposalViews {
  const differences = createRecent<string, Difference>(differencesKept);

  function difference(from: string, to: string): Difference {
    const key = createHash('sha256')
      .update(JSON.stringify([from, to]))
      .digest('hex');
    const known = differences.get(key);
    if (known !== undefined) return known;
    const found = differenceOf(from, to);
    differences.set(key, found);
    return found;
  }

  function versionsFor(actor: Actor, row: ListedProposalRow): ProposalView['versions'] {
    const sent = reader.versions(row.proposal.id);
    const draft = actor?.id === row.proposal.authorId ? reader.draft(row.proposal.id) : null;
    if (draft === null) return sent;
    const { markdown, summary, baseRevision, createdAt } = draft;
    return [...sent, { number: sent.length + 1, markdown, summary, baseRevision, createdAt, sentAt: null }];
  }

  return {
    current(actor, row) {
      const newest = versionsFor(actor, row).at(-1);
      if (newest === undefined) throw new Error(`Proposal ${row.proposal.id} has no text`);
      return newest;
    },

    view(actor, row, current, proposed) {
      const { proposal } = row;
      const common = commonView(row);
      const address = addressOf(row);
      const { baseRevision, markdown } = current;
      const base = baseRevision === null ? '' : (publication.markdown(address, baseRevision) ?? '');
      const fallenBehind = hasFallenBehind(row, baseRevision);
      const published = isClosed(proposal.state) ? null : publication.markdown(address);
      const ownership = { authorId: proposal.authorId, sent: proposal.sentAt !== null };
      const allows = (action: ProposalAction): boolean => afterAction(proposal.state, action).ok;
      const changes = can(actor, 'change proposal', ownership);
      return {
        ...common,
        title: proposed.text?.frontMatter.title ?? common.title,
        summary: current.summary,
        baseRevision,
        fallenBehind,
        versions: versionsFor(actor, row),
        notes: reader.notes(proposal.id),
        findings: [...proposed.findings],
        overrides: proposal.publishedRevisionId === null ? [] : publication.overrides(proposal.publishedRevisionId),
        difference: differenceView(difference(base, markdown)),
        meanwhile: fallenBehind && published !== null ? differenceView(difference(base, published)) : null,
        publishedMarkdown: published,
        html: proposed.html,
        decidedBy: row.decidedBy,
        publishedAs: row.publishedAs,
        may: {
          revise: changes && allows('revise'),
          send: changes && allows('send'),
          withdraw: changes && allows('withdraw'),
          note: can(actor, 'note on proposal', ownership) && allows('note'),
          decide: can(actor, 'decide on proposal', ownership) && allows('publish'),
        },
      };
    },
  };
}

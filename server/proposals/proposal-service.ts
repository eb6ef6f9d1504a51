import type { z } from 'zod';
import {
  declineBodySchema,
  noteBodySchema,
  proposeBodySchema,
  publishBodySchema,
  sendBackBodySchema,
  versionBodySchema,
} from '../../shared/contracts/bodies.ts';
import { readBody } from '../../shared/contracts/read-body.ts';
import type { ProposalView } from '../../shared/contracts/views.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import { can } from '../../shared/members/can.ts';
import type { Actor, Member } from '../../shared/members/member.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';
import { afterAction, type ProposalAction } from '../../shared/proposals/transitions.ts';
import { withBookNewlines } from '../../shared/text/newlines.ts';
import { createAuditLog } from '../db/audit-log.ts';
import type { Database } from '../db/client.ts';
import type { NewId } from '../db/new-id.ts';
import { transact, type Writing } from '../db/transact.ts';
import type { BookEvents } from '../pages/book-events.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import type { ParsePool } from '../pages/parse-pool-types.ts';
import { parseProblem } from '../pages/parse-problem.ts';
import {
  membersOnly,
  movedMeanwhile,
  noSuchProposal,
  noSuchRevision,
  notADecider,
  notTheAuthor,
  nothingChanged,
  wrongState,
} from './proposal-problems.ts';
import type { ProposalService } from './proposal-service-types.ts';
import { createProposalReader, createProposalWriter, type ListedProposalRow, type NoteRow } from './proposal-store.ts';
import { addressOf, createProposalViews, proposalSummary } from './proposal-views.ts';
import { addressAfter, refusalOfAddress } from './proposed-address.ts';
import { createProposedTexts, type ProposedText } from './proposed-text.ts';
import { publishProposal, refusalOfKind } from './publish-proposal.ts';
import { startView } from './start-view.ts';

export interface ProposalServiceDependencies {
  readonly database: Database;
  readonly parsePool: ParsePool;
  readonly publication: PagePublication;
  readonly events: BookEvents;
  readonly now: () => Date;
  readonly newId: NewId;
}

/** Somebody who may, and the proposal that they may do it to. */
interface Admitted {
  readonly member: Member;
  readonly row: ListedProposalRow;
}

/** What is written to a proposal: it must have been read as `row`, and `next` is where it stands afterwards. */
type Write = (writing: Writing, at: string, next: ProposalState) => void;

function ownershipOf({ proposal }: ListedProposalRow) {
  return { authorId: proposal.authorId, sent: proposal.sentAt !== null };
}

/** Makes the service that takes a change from its draft to its publication. */
export function createProposalService(dependencies: ProposalServiceDependencies): ProposalService {
  const { database, parsePool, publication, events, now, newId } = dependencies;
  const reader = createProposalReader(database);
  const writer = createProposalWriter(database);
  const audit = createAuditLog(database);
  const texts = createProposedTexts(publication, parsePool);
  const views = createProposalViews(reader, publication);

  /** Lets in who may see the proposal and may do this to it, in its present state. */
  function admit(actor: Actor, id: string, action: ProposalAction): Result<Admitted, Problem> {
    if (actor === null || !can(actor, 'propose', null)) return refuse(membersOnly(actor));
    const row = reader.proposal(id);
    if (row === null || !can(actor, 'see proposal', ownershipOf(row))) return refuse(noSuchProposal);
    const decides = action === 'publish' || action === 'send back' || action === 'decline';
    const needed = decides ? 'decide on proposal' : action === 'note' ? 'note on proposal' : 'change proposal';
    if (!can(actor, needed, ownershipOf(row))) return refuse(decides ? notADecider : notTheAuthor);
    const after = afterAction(row.proposal.state, action);
    return after.ok ? accept({ member: actor, row }) : refuse(wrongState(after.refusal, action));
  }

  /** Lets in, reads the body. */
  function admitWith<Schema extends z.ZodType>(
    actor: Actor,
    id: string,
    action: ProposalAction,
    schema: Schema,
    body: unknown,
  ): Result<Admitted & { readonly body: z.output<Schema> }, Problem> {
    const admitted = admit(actor, id, action);
    if (!admitted.ok) return admitted;
    const read = readBody(schema, body);
    return read.ok ? accept({ ...admitted.value, body: read.value }) : read;
  }

  async function view(actor: Actor, id: string): Promise<Result<ProposalView, Problem>> {
    if (actor === null || !can(actor, 'propose', null)) return refuse(membersOnly(actor));
    const row = reader.proposal(id);
    if (row === null || !can(actor, 'see proposal', ownershipOf(row))) return refuse(noSuchProposal);
    const current = views.current(actor, row);
    const proposed = await texts.read(addressOf(row), current.markdown, actor.id);
    return accept(views.view(actor, row, current, proposed));
  }

  /** Writes in one transaction, if the proposal still stands where it was read; then gives what the member sees of it. */
  function write(
    { member, row }: Admitted,
    action: ProposalAction,
    details: Readonly<Record<string, unknown>> | null,
    change: Write,
  ): Promise<Result<ProposalView, Problem>> {
    const { id, state, versions } = row.proposal;
    const at = now().toISOString();
    const refusal = transact(database, (writing): Problem | null => {
      const fresh = reader.proposal(id)?.proposal;
      const next = afterAction(state, action);
      if (fresh?.state !== state || fresh.versions !== versions || !next.ok) return movedMeanwhile;
      change(writing, at, next.value);
      if (details !== null) audit.append(writing, { at, actorId: member.id, action, subject: id, details });
      return null;
    });
    return refusal === null ? view(member, id) : Promise.resolve(refuse(refusal));
  }

  function note({ member, row }: Admitted, kind: NoteRow['kind'], text: string, at: string): Omit<NoteRow, 'number'> {
    const { id } = row.proposal;
    return { id: newId(), proposalId: id, authorId: member.id, kind, text, address: null, line: null, createdAt: at };
  }

  /** A decision against a proposal: its reason becomes a note, and the audit says who decided. */
  function decideAgainst(admitted: Admitted, action: 'send back' | 'decline', reason: string) {
    const kind = action === 'decline' ? 'declined' : 'sent-back';
    return write(admitted, action, { reason }, (writing, at, state) => {
      writer.insertNote(writing, note(admitted, kind, reason, at));
      const decidedBy = action === 'decline' ? admitted.member.id : null;
      writer.change(writing, admitted.row.proposal.id, { state, updatedAt: at, decidedBy });
    });
  }

  /** Whether a text that is about to be sent can be read, is its page's kind, and says something new. */
  function refusalToSend(
    address: PageAddress,
    markdown: string,
    base: number | null,
    proposed: ProposedText,
  ): Problem | null {
    if (proposed.refusal !== null) return parseProblem(proposed.refusal, 'It was not sent; what you wrote is kept.');
    if (proposed.text === null) throw new Error('A text that was not refused was not read');
    if (base !== null && publication.markdown(address, base) === markdown) return nothingChanged;
    return refusalOfKind(address, proposed.text);
  }

  /** Whether there is such a revision to start from. */
  function refusalOfBase(address: PageAddress, base: number | null): Problem | null {
    const newest = publication.standing(address).page?.revision ?? null;
    return base !== null && base > (newest ?? 0) ? noSuchRevision(base, newest) : null;
  }

  return {
    proposal: view,

    async start(actor, request) {
      if (actor === null || !can(actor, 'propose', null)) return refuse(membersOnly(actor));
      return startView(request, actor, publication, reader);
    },

    async proposals(actor, state, mine) {
      if (actor === null || !can(actor, 'propose', null)) return refuse(membersOnly(actor));
      const all = can(actor, 'decide', null) && !mine;
      const rows = all ? reader.visible(actor.id, state) : reader.own(actor.id, state);
      return accept({ proposals: rows.map(proposalSummary) });
    },

    async propose(actor, body) {
      if (actor === null || !can(actor, 'propose', null)) return refuse(membersOnly(actor));
      const asked = readBody(proposeBodySchema, body);
      if (!asked.ok) return asked;
      const { shelf, subject, page, baseRevision, summary } = asked.value;
      const markdown = withBookNewlines(asked.value.markdown);
      const address = { shelf, subject, page };
      const refusal =
        refusalOfBase(address, baseRevision) ?? refusalOfAddress(address, baseRevision, publication);
      if (refusal !== null) return refuse(refusal);
      const proposed = await texts.read(address, markdown, actor.id);
      const id = newId();
      const at = now().toISOString();
      transact(database, (writing) => {
        writer.insert(writing, {
          ...address,
          id,
          authorId: actor.id,
          state: 'draft',
          title: proposed.text?.frontMatter.title ?? page,
          summary,
          baseRevision,
          stops: proposed.stops,
          versions: 0,
          createdAt: at,
          updatedAt: at,
          sentAt: null,
          decidedBy: null,
          publishedRevisionId: null,
        });
        writer.putDraft(writing, { proposalId: id, markdown, summary, baseRevision, createdAt: at });
      });
      return view(actor, id);
    },

    async addVersion(actor, id, body) {
      const admitted = admitWith(actor, id, 'revise', versionBodySchema, body);
      if (!admitted.ok) return admitted;
      const { member, row } = admitted.value;
      const { baseRevision, summary } = admitted.value.body;
      const markdown = withBookNewlines(admitted.value.body.markdown);
      const settled = addressAfter(row, admitted.value.body, publication);
      if (!settled.ok) return settled;
      const address = settled.value;
      const refusal = refusalOfBase(address, baseRevision);
      if (refusal !== null) return refuse(refusal);
      const proposed = await texts.read(address, markdown, member.id);
      const { state, versions, title } = row.proposal;
      const shown = { title: proposed.text?.frontMatter.title ?? title, summary, baseRevision, stops: proposed.stops };
      const text = { proposalId: id, markdown, summary, baseRevision };

      if (state !== 'waiting') {
        return write(admitted.value, 'revise', null, (writing, at) => {
          writer.putDraft(writing, { ...text, createdAt: at });
          // What was sent before stays what the ledger says of it, until this is sent.
          const { subject, page } = address;
          writer.change(writing, id, { ...(state === 'draft' ? { ...shown, subject, page } : {}), updatedAt: at });
        });
      }
      const newest = reader.versions(id).at(-1);
      const isSame =
        newest?.markdown === markdown && newest.summary === summary && newest.baseRevision === baseRevision;
      const unsendable = isSame ? nothingChanged : refusalToSend(address, markdown, baseRevision, proposed);
      if (unsendable !== null) return refuse(unsendable);
      return write(admitted.value, 'revise', { version: versions + 1 }, (writing, at) => {
        writer.insertVersion(writing, { ...text, number: versions + 1, createdAt: at, sentAt: at });
        writer.change(writing, id, { ...shown, versions: versions + 1, updatedAt: at });
      });
    },

    async addNote(actor, id, body) {
      const admitted = admitWith(actor, id, 'note', noteBodySchema, body);
      if (!admitted.ok) return admitted;
      const { text, address = null, line = null } = admitted.value.body;
      return write(admitted.value, 'note', null, (writing, at) => {
        writer.insertNote(writing, { ...note(admitted.value, 'note', text, at), address, line });
        writer.change(writing, id, { updatedAt: at });
      });
    },

    async send(actor, id) {
      const admitted = admit(actor, id, 'send');
      if (!admitted.ok) return admitted;
      const { member, row } = admitted.value;
      const address = addressOf(row);
      const { versions } = row.proposal;
      const draft = reader.draft(id);
      if (draft === null) {
        // It was sent back and answered with a note only: the same version waits again.
        return write(admitted.value, 'send', { version: versions }, (writing, at, state) => {
          writer.change(writing, id, { state, updatedAt: at, sentAt: at });
        });
      }
      const { markdown, summary, baseRevision } = draft;
      const proposed = await texts.read(address, markdown, member.id);
      const unsendable = refusalToSend(address, markdown, baseRevision, proposed);
      if (unsendable !== null) return refuse(unsendable);
      const shown = { title: proposed.text?.frontMatter.title ?? row.proposal.title, summary, baseRevision };
      // Another window of its author may have changed the draft while it was read.
      if (JSON.stringify(reader.draft(id)) !== JSON.stringify(draft)) return refuse(movedMeanwhile);
      return write(admitted.value, 'send', { version: versions + 1 }, (writing, at, state) => {
        writer.insertVersion(writing, { ...draft, number: versions + 1, sentAt: at });
        writer.removeDraft(writing, id);
        const sent = { state, versions: versions + 1, stops: proposed.stops, updatedAt: at, sentAt: at };
        writer.change(writing, id, { ...shown, ...sent });
      });
    },

    async sendBack(actor, id, body) {
      const admitted = admitWith(actor, id, 'send back', sendBackBodySchema, body);
      return admitted.ok ? decideAgainst(admitted.value, 'send back', admitted.value.body.note) : admitted;
    },

    async decline(actor, id, body) {
      const admitted = admitWith(actor, id, 'decline', declineBodySchema, body);
      return admitted.ok ? decideAgainst(admitted.value, 'decline', admitted.value.body.reason) : admitted;
    },

    async withdraw(actor, id) {
      const admitted = admit(actor, id, 'withdraw');
      if (!admitted.ok) return admitted;
      return write(admitted.value, 'withdraw', {}, (writing, at, state) => {
        writer.change(writing, id, { state, updatedAt: at });
      });
    },

    async publish(actor, id, body) {
      const admitted = admitWith(actor, id, 'publish', publishBodySchema, body);
      if (!admitted.ok) return admitted;
      const { member, row } = admitted.value;
      const kit = { database, publication, texts, reader, writer, audit, events, now };
      const published = await publishProposal(kit, member, row, admitted.value.body);
      return published.ok ? view(member, id) : published;
    },

    waitingFor: (actor) => (actor !== null && can(actor, 'decide', null) ? reader.waitingOfOthers(actor.id) : 0),
  };
}

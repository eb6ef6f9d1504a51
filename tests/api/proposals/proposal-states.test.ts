import { describe, expect, it } from 'vitest';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import type { Problem } from '../../../shared/lib/problem.ts';
import type { Result } from '../../../shared/lib/result.ts';
import type { Actor } from '../../../shared/members/member.ts';
import { proposalStates, type ProposalState } from '../../../shared/proposals/proposal.ts';
import { accepted, openBookWithDonor, testbike } from '../../factories/book.ts';
import { pageText } from '../../factories/page-texts.ts';

type Book = Awaited<ReturnType<typeof openBookWithDonor>>;
type Step = 'revise' | 'note' | 'send' | 'send back' | 'decline' | 'withdraw' | 'publish';

const text = pageText({ body: 'First words.' });
const otherText = pageText({ body: 'Other words.' });

/** Takes a proposal of the writer's to a state, by the steps that lead there. */
async function inState({ proposals, people, propose }: Book, state: ProposalState): Promise<ProposalView> {
  const draft = await propose(testbike.pinouts, text);
  const { writer, moderator } = people;
  if (state === 'draft') return draft;
  if (state === 'withdrawn') return accepted(await proposals.withdraw(writer, draft.id));
  const waiting = accepted(await proposals.send(writer, draft.id));
  if (state === 'waiting') return waiting;
  if (state === 'published') return accepted(await proposals.publish(moderator, draft.id, {}));
  if (state === 'declined') return accepted(await proposals.decline(moderator, draft.id, { reason: 'Not here.' }));
  return accepted(await proposals.sendBack(moderator, draft.id, { note: 'Say more.' }));
}

function take({ proposals }: Book, step: Step, actor: Actor, id: string): Promise<Result<ProposalView, Problem>> {
  switch (step) {
    case 'revise':
      return proposals.addVersion(actor, id, { markdown: otherText, summary: 'Other words', baseRevision: null });
    case 'note':
      return proposals.addNote(actor, id, { text: 'A word.' });
    case 'send':
      return proposals.send(actor, id);
    case 'send back':
      return proposals.sendBack(actor, id, { note: 'Say more.' });
    case 'decline':
      return proposals.decline(actor, id, { reason: 'Not here.' });
    case 'withdraw':
      return proposals.withdraw(actor, id);
    case 'publish':
      return proposals.publish(actor, id, {});
  }
}

const steps: readonly Step[] = ['revise', 'note', 'send', 'send back', 'decline', 'withdraw', 'publish'];

/** What each step of each person comes to: the state afterwards, or the refusal. Written from section 8 of the design. */
const outcomes: Readonly<Record<ProposalState, Readonly<Record<'author' | 'moderator', readonly string[]>>>> = {
  //                     revise         note           send           send back      decline        withdraw       publish
  draft: {
    author: ['draft', 'draft', 'waiting', 'not-allowed', 'not-allowed', 'withdrawn', 'not-allowed'],
    moderator: ['not-found', 'not-found', 'not-found', 'not-found', 'not-found', 'not-found', 'not-found'],
  },
  waiting: {
    author: ['waiting', 'waiting', 'wrong-state', 'not-allowed', 'not-allowed', 'withdrawn', 'not-allowed'],
    moderator: ['not-allowed', 'waiting', 'not-allowed', 'sent-back', 'declined', 'not-allowed', 'published'],
  },
  'sent-back': {
    author: ['sent-back', 'sent-back', 'waiting', 'not-allowed', 'not-allowed', 'withdrawn', 'not-allowed'],
    moderator: ['not-allowed', 'sent-back', 'not-allowed', 'wrong-state', 'wrong-state', 'not-allowed', 'wrong-state'],
  },
  published: {
    author: ['wrong-state', 'wrong-state', 'wrong-state', 'not-allowed', 'not-allowed', 'wrong-state', 'not-allowed'],
    moderator: [
      'not-allowed',
      'wrong-state',
      'not-allowed',
      'wrong-state',
      'wrong-state',
      'not-allowed',
      'wrong-state',
    ],
  },
  declined: {
    author: ['wrong-state', 'wrong-state', 'wrong-state', 'not-allowed', 'not-allowed', 'wrong-state', 'not-allowed'],
    moderator: [
      'not-allowed',
      'wrong-state',
      'not-allowed',
      'wrong-state',
      'wrong-state',
      'not-allowed',
      'wrong-state',
    ],
  },
  withdrawn: {
    author: ['wrong-state', 'wrong-state', 'wrong-state', 'not-allowed', 'not-allowed', 'wrong-state', 'not-allowed'],
    moderator: ['not-found', 'not-found', 'not-found', 'not-found', 'not-found', 'not-found', 'not-found'],
  },
};

describe('what becomes of a proposal', () => {
  for (const state of proposalStates) {
    steps.forEach((step, index) => {
      for (const who of ['author', 'moderator'] as const) {
        const expected = outcomes[state][who][index];
        it(`${state}: ${step} by ${who === 'author' ? 'its author' : 'a moderator'}: ${String(expected)}`, async () => {
          const book = await openBookWithDonor();
          const { id } = await inState(book, state);
          const before = accepted(await book.proposals.proposal(book.people.writer, id));
          const outcome = await take(book, step, who === 'author' ? book.people.writer : book.people.moderator, id);
          expect(outcome.ok ? outcome.value.state : outcome.refusal.code).toBe(expected);
          const after = accepted(await book.proposals.proposal(book.people.writer, id));
          if (!outcome.ok) expect(after).toEqual(before);
        });
      }
    });

    it(`${state}: nothing of it for another member or a visitor`, async () => {
      const book = await openBookWithDonor();
      const { id } = await inState(book, state);
      const codes: string[] = [];
      for (const step of steps) {
        for (const actor of [book.people.hobbyist, null, { ...book.people.moderator, suspended: true }]) {
          const outcome = await take(book, step, actor, id);
          codes.push(outcome.ok ? 'accepted' : outcome.refusal.code);
        }
      }
      expect(codes).toEqual(steps.flatMap(() => ['not-found', 'sign-in-needed', 'not-allowed']));
    });
  }
});

describe('deciding on one’s own proposal', () => {
  for (const role of ['moderator', 'admin'] as const) {
    it(`is refused to a ${role}, and nothing is published`, async () => {
      const book = await openBookWithDonor();
      const author = book.people[role];
      const { id } = await book.proposeAndSend(testbike.pinouts, text, author);
      for (const step of ['publish', 'send back', 'decline'] as const) {
        const outcome = await take(book, step, author, id);
        expect(outcome.ok ? 'accepted' : outcome.refusal.code).toBe('not-allowed');
      }
      const proposal = accepted(await book.proposals.proposal(author, id));
      expect([proposal.state, proposal.may.decide, proposal.publishedAs]).toEqual(['waiting', false, null]);
      expect(book.told).toEqual([]);
      const decided = accepted(await book.proposals.publish(book.people.secondModerator, id, {}));
      expect([decided.state, decided.decidedBy?.name]).toEqual(['published', 'Second moderator']);
    });
  }
});

describe('what a member may do with a proposal', () => {
  it('is said as it is decided', async () => {
    const book = await openBookWithDonor();
    const { id } = await inState(book, 'waiting');
    const seenBy = async (actor: Actor) => accepted(await book.proposals.proposal(actor, id)).may;
    expect(await seenBy(book.people.writer)).toEqual({
      revise: true,
      send: false,
      withdraw: true,
      note: true,
      decide: false,
    });
    expect(await seenBy(book.people.moderator)).toEqual({
      revise: false,
      send: false,
      withdraw: false,
      note: true,
      decide: true,
    });
  });
});

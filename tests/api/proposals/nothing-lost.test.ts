import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createAuditLog } from '../../../server/db/audit-log.ts';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import type { Problem } from '../../../shared/lib/problem.ts';
import type { Result } from '../../../shared/lib/result.ts';
import { afterAction, proposalActions } from '../../../shared/proposals/transitions.ts';
import { openBookWithDonor, testbike } from '../../factories/book.ts';
import { pageText } from '../../factories/page-texts.ts';

type Book = Awaited<ReturnType<typeof openBookWithDonor>>;

const doings = ['propose', 'revise', 'note', 'send', 'send back', 'decline', 'withdraw', 'publish'] as const;

/** Somebody does something to one of the proposals that there are: who it is for, or anybody, and then it is refused. */
interface Doing {
  readonly what: (typeof doings)[number];
  readonly who: 'whose it is' | 'hobbyist' | 'moderator';
  readonly which: number;
  readonly page: 'pinouts' | 'quirks';
  readonly words: string;
}

const doing: fc.Arbitrary<Doing> = fc.record({
  what: fc.constantFrom(...doings),
  who: fc.oneof(
    { weight: 6, arbitrary: fc.constant('whose it is' as const) },
    { weight: 1, arbitrary: fc.constantFrom('hobbyist' as const, 'moderator' as const) },
  ),
  which: fc.nat(3),
  page: fc.constantFrom('pinouts', 'quirks'),
  words: fc.constantFrom('One.', 'Two.', 'Three.'),
});

function act(
  book: Book,
  ids: readonly string[],
  { what, who, which, page, words }: Doing,
): Promise<Result<ProposalView, Problem>> {
  const id = ids[which % Math.max(1, ids.length)] ?? 'none';
  const { writer, secondModerator } = book.people;
  const usual = ['publish', 'decline', 'send back'].includes(what) ? secondModerator : writer;
  const actor = who === 'whose it is' ? usual : book.people[who];
  const address = testbike[page];
  const baseRevision = book.publication.standing(address).page?.revision ?? null;
  const text = { markdown: pageText({ body: words }), summary: words, baseRevision };
  switch (what) {
    case 'propose':
      return book.proposals.propose(actor, { ...address, ...text });
    case 'revise':
      return book.proposals.addVersion(actor, id, text);
    case 'note':
      return book.proposals.addNote(actor, id, { text: words });
    case 'send':
      return book.proposals.send(actor, id);
    case 'send back':
      return book.proposals.sendBack(actor, id, { note: words });
    case 'decline':
      return book.proposals.decline(actor, id, { reason: words });
    case 'withdraw':
      return book.proposals.withdraw(actor, id);
    case 'publish':
      return book.proposals.publish(actor, id, {});
  }
}

/** Everything that must only ever grow, row by row. */
function records({ database }: Book): Record<string, unknown[]> {
  const all = (sql: string): unknown[] => database.sqlite.prepare(sql).all();
  return {
    versions: all('SELECT * FROM proposal_versions ORDER BY rowid'),
    notes: all('SELECT * FROM proposal_notes ORDER BY rowid'),
    revisions: all('SELECT * FROM revisions JOIN revision_bodies ON id = revision_id ORDER BY revisions.rowid'),
    audit: all('SELECT * FROM audit ORDER BY number'),
  };
}

function statesOf({
  database,
}: Book): Map<string, { state: ProposalView['state']; author: string; decider: string | null }> {
  const rows = database.sqlite.prepare('SELECT id, state, author_id, decided_by FROM proposals').all() as {
    id: string;
    state: ProposalView['state'];
    author_id: string;
    decided_by: string | null;
  }[];
  return new Map(rows.map((row) => [row.id, { state: row.state, author: row.author_id, decider: row.decided_by }]));
}

describe('whatever members and moderators do', () => {
  it('nothing that was sent, said, published or decided is ever changed or lost', { timeout: 240_000 }, async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(doing, { minLength: 10, maxLength: 30, size: 'max' }), async (story) => {
        const book = await openBookWithDonor();
        const ids = [
          (await book.proposeAndSend(testbike.pinouts, pageText({ body: 'One.' }))).id,
          (await book.proposeAndSend(testbike.pinouts, pageText({ body: 'Two.' }), book.people.moderator)).id,
        ];
        let before = records(book);
        let states = statesOf(book);
        for (const one of story) {
          const outcome = await act(book, ids, one);
          if (outcome.ok && one.what === 'propose') ids.push(outcome.value.id);
          const after = records(book);
          for (const [name, rows] of Object.entries(before)) {
            expect(after[name]?.slice(0, rows.length), name).toEqual(rows);
            if (!outcome.ok) expect(after[name], name).toHaveLength(rows.length);
          }
          const now = statesOf(book);
          for (const [id, { state, author, decider }] of now) {
            const was = states.get(id)?.state ?? 'draft';
            const reachable = proposalActions
              .map((action) => afterAction(was, action))
              .map((next) => (next.ok ? next.value : was));
            expect([was, ...reachable]).toContain(state);
            expect(decider).not.toBe(author);
          }
          before = after;
          states = now;
        }
        const numbers = book.database.sqlite
          .prepare('SELECT page_id, count(*) AS revisions, max(number) AS newest FROM revisions GROUP BY page_id')
          .all();
        for (const row of numbers as { revisions: number; newest: number }[]) expect(row.newest).toBe(row.revisions);
        expect(createAuditLog(book.database).firstBrokenLink()).toBeNull();
      }),
      { numRuns: 25 },
    );
  });
});

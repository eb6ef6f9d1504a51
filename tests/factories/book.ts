import type { Result } from '../../shared/lib/result.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import type { ProposalView } from '../../shared/contracts/views.ts';
import type { Actor, Member } from '../../shared/members/member.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { createBookEvents, type BookEvent } from '../../server/pages/book-events.ts';
import { createPagePublication } from '../../server/pages/page-publication.ts';
import { createPageService } from '../../server/pages/page-service.ts';
import { createProposalService } from '../../server/proposals/proposal-service.ts';
import { openTestDatabase } from '../setup/database.ts';
import { addMember } from './members.ts';
import { overviewText } from './page-texts.ts';
import { createDirectParsePool } from './parse-pool.ts';

/** Takes the value of an answer, or fails the test with what was refused. */
export function accepted<Value>(result: Result<Value, Problem>): Value {
  if (result.ok) return result.value;
  throw new Error(`refused: ${result.refusal.code}: ${result.refusal.title}. ${result.refusal.detail}`);
}

/** Takes the problem of an answer, or fails the test since it was not refused. */
export function refused(result: Result<unknown, Problem>): Problem {
  if (!result.ok) return result.refusal;
  throw new Error('it was not refused');
}

/** A book of the test's own: a store in a real file, the services on it, people, a clock and ids that count. */
export function openTestBook(options: { readonly reading?: 'open' | 'members' } = {}) {
  const database = openTestDatabase();
  const parsePool = createDirectParsePool();
  let ids = 0;
  const newId = (): string => `id-${String((ids += 1)).padStart(4, '0')}`;
  let seconds = 0;
  const now = (): Date => new Date(Date.UTC(2026, 0, 1, 12) + (seconds += 1) * 1000);
  const told: BookEvent[] = [];
  const events = createBookEvents((failure) => {
    throw failure;
  });
  events.listen((event) => told.push(event));
  const publication = createPagePublication(database, newId);
  const pages = createPageService({ database, parsePool, publication, reading: options.reading ?? 'open' });
  const proposals = createProposalService({ database, parsePool, publication, events, now, newId });
  const people = {
    writer: addMember(database, 'Writer'),
    hobbyist: addMember(database, 'Hobbyist'),
    moderator: addMember(database, 'Moderator', 'moderator'),
    secondModerator: addMember(database, 'Second moderator', 'moderator'),
    admin: addMember(database, 'Admin', 'admin'),
  };

  /** Proposes a text, by the writer unless somebody else is named, starting from what is published. */
  async function propose(address: PageAddress, markdown: string, author: Actor = people.writer, summary = 'Changed.') {
    const baseRevision = publication.standing(address).page?.revision ?? null;
    return accepted(await proposals.propose(author, { ...address, baseRevision, markdown, summary }));
  }

  async function proposeAndSend(
    address: PageAddress,
    markdown: string,
    author: Actor = people.writer,
  ): Promise<ProposalView> {
    const draft = await propose(address, markdown, author);
    return accepted(await proposals.send(author, draft.id));
  }

  async function publish(
    address: PageAddress,
    markdown: string,
    moderator: Member = people.moderator,
  ): Promise<ProposalView> {
    const waiting = await proposeAndSend(address, markdown);
    return accepted(await proposals.publish(moderator, waiting.id, {}));
  }

  return {
    database,
    parsePool,
    publication,
    pages,
    proposals,
    events,
    told,
    people,
    now,
    newId,
    propose,
    proposeAndSend,
    publish,
  };
}

/** The donor that tests write about. */
export const testbike = {
  overview: { shelf: 'donors', subject: 'testbike-500', page: 'overview' },
  pinouts: { shelf: 'donors', subject: 'testbike-500', page: 'pinouts' },
  quirks: { shelf: 'donors', subject: 'testbike-500', page: 'quirks' },
} as const satisfies Record<string, PageAddress>;

/** A book in which the donor's overview is published. */
export async function openBookWithDonor() {
  const book = openTestBook();
  await book.publish(testbike.overview, overviewText());
  book.told.length = 0;
  return book;
}

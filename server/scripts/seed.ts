import type { Problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';
import type { Member, Role } from '../../shared/members/member.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';
import type { Database } from '../db/client.ts';
import type { NewId } from '../db/new-id.ts';
import { members as memberTable } from '../db/schema/members.ts';
import { subjects } from '../db/schema/pages.ts';
import { createMemberService } from '../members/member-service.ts';
import type { BookEvents } from '../pages/book-events.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import type { ParsePool } from '../pages/parse-pool-types.ts';
import { createProposalService } from '../proposals/proposal-service.ts';
import type { ProposalService } from '../proposals/proposal-service-types.ts';
import { readSeedContent, type SeedPage, type SeedRevision } from './seed-content.ts';

/** The one password of all the demo's people. It is public: the demo is only for a book that nobody else reaches. */
export const demoPassword = 'bench-lamp-42';

const demoPeople = {
  hobbyist: { name: 'Demo hobbyist', role: 'member' },
  writer: { name: 'Demo writer', role: 'member' },
  moderator: { name: 'Demo moderator', role: 'moderator' },
  'second-moderator': { name: 'Second demo moderator', role: 'moderator' },
  admin: { name: 'Demo admin', role: 'admin' },
} as const satisfies Record<string, { name: string; role: Role }>;

/** The demo's book came to be in the month before it was seeded, something every two hours. */
const monthMilliseconds = 30 * 24 * 3600 * 1000;
const stepMilliseconds = 2 * 3600 * 1000;

export interface SeedParts {
  readonly database: Database;
  readonly parsePool: ParsePool;
  readonly publication: PagePublication;
  readonly events: BookEvents;
  /** Milliseconds since 1970. */
  readonly now: () => number;
  readonly newId: NewId;
}

/** What was seeded. */
export interface SeedReport {
  readonly members: number;
  readonly pages: number;
  readonly revisions: number;
  readonly proposals: number;
}

/** True where nobody and nothing is in the book yet. */
export function isBookEmpty({ query }: Database): boolean {
  return (
    query.select().from(memberTable).limit(1).get() === undefined &&
    query.select().from(subjects).limit(1).get() === undefined
  );
}

/**
 * Fills an empty book with the demo: its people, the pages of `content/`, written by one member and signed off by a
 * moderator, and what still waits. Everything goes the way of a member's page, so that a broken seed fails like a broken
 * proposal; all of it is one transaction, so that a seed that failed or was stopped leaves the book empty.
 * @param contentFolder `content/`
 */
export async function seedDemo(parts: SeedParts, contentFolder: string): Promise<SeedReport> {
  const { sqlite } = parts.database;
  const content = readSeedContent(contentFolder);
  sqlite.exec('BEGIN IMMEDIATE');
  try {
    const report = await plantDemo(parts, content);
    sqlite.exec('COMMIT');
    return report;
  } catch (failure) {
    if (sqlite.inTransaction) sqlite.exec('ROLLBACK');
    throw failure;
  }
}

async function plantDemo(parts: SeedParts, content: ReturnType<typeof readSeedContent>): Promise<SeedReport> {
  const { database, now, newId } = parts;
  const members = createMemberService({ database, now, newId });
  async function addPerson(key: keyof typeof demoPeople): Promise<Member> {
    const person = { ...demoPeople[key], email: `${key}@earthstrap.example`, password: demoPassword };
    return seeded(await members.addMember(person), key);
  }
  const [writer, moderator] = [await addPerson('writer'), await addPerson('moderator')];
  for (const key of ['hobbyist', 'second-moderator', 'admin'] as const) await addPerson(key);

  const end = now();
  let time = end - monthMilliseconds;
  const proposals = createProposalService({
    ...parts,
    parsePool: forNobody(parts.parsePool),
    now: () => new Date((time = Math.min(end, time + stepMilliseconds / 3))),
  });
  const desk = { proposals, publication: parts.publication, writer, moderator };

  const pages = content.pages.toSorted(byOrderOfIssue);
  for (const { address, revisions } of pages) await publishRevision(desk, address, revisions[0]);
  // Later revisions come when the whole book is there, as they do in life.
  for (const { address, revisions } of pages) {
    for (const revision of revisions.slice(1)) await publishRevision(desk, address, revision);
  }
  for (const { address, sentBack, ...text } of content.proposals) {
    const id = await sendProposal(desk, address, text);
    if (sentBack === null) continue;
    seeded(await proposals.sendBack(moderator, id, { note: sentBack }), formatPageAddress(address));
  }
  return {
    members: Object.keys(demoPeople).length,
    pages: pages.length,
    revisions: pages.reduce((sum, { revisions }) => sum + revisions.length, 0),
    proposals: content.proposals.length,
  };
}

interface Desk {
  readonly proposals: ProposalService;
  readonly publication: PagePublication;
  readonly writer: Member;
  readonly moderator: Member;
}

/** The book reads its own demo: no one member's reading time may run out over it on a slow machine. */
function forNobody(pool: ParsePool): ParsePool {
  return { parse: (request) => pool.parse(request, null), close: () => pool.close() };
}

/** Reference first, then parts, then donors; a subject's overview before its other pages. */
function byOrderOfIssue({ address: one }: SeedPage, { address: other }: SeedPage): number {
  const shelfOrder = { reference: 0, parts: 1, donors: 2 } as const;
  const later = ({ page }: PageAddress): number => (page === 'overview' ? 0 : 1);
  return shelfOrder[one.shelf] - shelfOrder[other.shelf] || later(one) - later(other);
}

async function sendProposal(desk: Desk, address: PageAddress, { markdown, summary }: SeedRevision): Promise<string> {
  const { proposals, publication, writer } = desk;
  const where = formatPageAddress(address);
  const baseRevision = publication.standing(address).page?.revision ?? null;
  const draft = seeded(await proposals.propose(writer, { ...address, baseRevision, markdown, summary }), where);
  seeded(await proposals.send(writer, draft.id), where);
  return draft.id;
}

async function publishRevision(desk: Desk, address: PageAddress, revision: SeedRevision): Promise<void> {
  const id = await sendProposal(desk, address, revision);
  seeded(await desk.proposals.publish(desk.moderator, id, {}), formatPageAddress(address));
}

/** Takes what was accepted; what was refused ends the seed, and says what, where and why. */
function seeded<Value>(outcome: Result<Value, Problem>, what: string): Value {
  if (outcome.ok) return outcome.value;
  const { title, detail, fields, missing } = outcome.refusal;
  const more = [
    ...Object.values(fields ?? {}),
    ...(missing ?? []).map(({ code, address, message }) => `${code} ${address ?? ''}: ${message}`),
  ];
  throw new Error([`The demo cannot be seeded: ${what}: ${title}. ${detail}`, ...more].join('\n  '));
}

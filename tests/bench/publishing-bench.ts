import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { createAuditLog } from '../../server/db/audit-log.ts';
import { openDatabase, type Database } from '../../server/db/client.ts';
import { migrate } from '../../server/db/migrate.ts';
import { randomId } from '../../server/db/new-id.ts';
import { transact } from '../../server/db/transact.ts';
import { createBookEvents } from '../../server/pages/book-events.ts';
import { digestOf, documentOf } from '../../server/pages/page-digest.ts';
import { createPagePublication } from '../../server/pages/page-publication.ts';
import { createProposalReader, createProposalWriter } from '../../server/proposals/proposal-store.ts';
import { publishProposal } from '../../server/proposals/publish-proposal.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { addMember } from '../factories/members.ts';
import { createBareWriter, type BarePublication } from './bare-publication.ts';
import { honestPage } from './honest-page.ts';
import type { Pace } from './pace.ts';
import type { BenchRow } from './row.ts';
import { inTurns, milliseconds } from './side-by-side.ts';

const overview: PageAddress = { shelf: 'donors', subject: 'measured', page: 'overview' };
const pinouts: PageAddress = { shelf: 'donors', subject: 'measured', page: 'pinouts' };
const publicationsARound = 20;
const at = '2026-01-01T12:00:00.000Z';
const overviewText =
  '---\ntitle: Measured\nkind: overview\nsummary: Made for measuring.\n---\n\nA donor made for measuring.\n';
const summary = 'Wire colours of the later years.';

function read(markdown: string): PageText {
  const text = readPage(markdown);
  if (!text.ok) throw new Error(text.refusal.message);
  return text.value;
}

/** A store with two members and a donor whose page has one revision, in a file of its own. */
function openStore(file: string, pageMarkdown: string, pageText: PageText) {
  const database = openDatabase(file);
  migrate(database, join(process.cwd(), 'drizzle'));
  const author = addMember(database, 'Writer');
  const moderator = addMember(database, 'Moderator', 'moderator');
  const publication = createPagePublication(database, randomId);
  const first = {
    summary: 'First issue',
    authorId: author.id,
    publishedBy: moderator.id,
    proposalId: 'first',
    at,
    overrides: [],
  };
  transact(database, (writing) => {
    publication.publish(
      writing,
      { ...first, address: overview, text: read(overviewText), markdown: overviewText },
      publication.standing(overview),
    );
    publication.publish(
      writing,
      { ...first, address: pinouts, text: pageText, markdown: pageMarkdown },
      publication.standing(pinouts),
    );
  });
  const writer = createProposalWriter(database);
  let made = 0;
  /** Proposals of the page's next revisions, waiting for a decision. */
  function addProposals(count: number, baseRevision: number): string[] {
    return transact(database, (writing) =>
      Array.from({ length: count }, (_, index) => {
        const id = `proposal-${String((made += 1))}`;
        const base = baseRevision + index;
        writer.insert(writing, {
          id,
          ...pinouts,
          authorId: author.id,
          state: 'waiting',
          title: 'Connectors',
          summary,
          baseRevision: base,
          stops: 0,
          versions: 1,
          createdAt: at,
          updatedAt: at,
          sentAt: at,
          decidedBy: null,
          publishedRevisionId: null,
        });
        writer.insertVersion(writing, {
          proposalId: id,
          number: 1,
          markdown: pageMarkdown,
          summary,
          baseRevision: base,
          createdAt: at,
          sentAt: at,
        });
        return id;
      }),
    );
  }
  return { database, publication, writer, author, moderator, addProposals };
}

type Store = ReturnType<typeof openStore>;

/** Publishes as the service does, the text being read already. */
function measureOurs(store: Store, text: PageText): () => Promise<number> {
  const { database, publication, writer, moderator } = store;
  const reader = createProposalReader(database);
  const dependencies = {
    database,
    publication,
    reader,
    writer,
    texts: { read: async () => ({ html: '', findings: [], stops: 0, text, refusal: null }) },
    audit: createAuditLog(database),
    events: createBookEvents((failure) => {
      throw failure;
    }),
    now: () => new Date(at),
  };
  let revision = 1;
  return async () => {
    const ids = store.addProposals(publicationsARound, revision);
    revision += ids.length;
    const start = performance.now();
    for (const id of ids) {
      const row = reader.proposal(id);
      if (row === null) throw new Error('a proposal is missing');
      const outcome = await publishProposal(dependencies, moderator, row, {});
      if (!outcome.ok) throw new Error(outcome.refusal.title);
    }
    return (performance.now() - start) / ids.length;
  };
}

function idOf(database: Database, table: 'pages' | 'subjects', slug: string): string {
  const id: unknown = database.sqlite.prepare(`SELECT id FROM ${table} WHERE slug = ?`).pluck().get(slug);
  if (typeof id !== 'string') throw new Error(`${slug} is missing`);
  return id;
}

/** Writes the same rows, every value of which was made before. */
function measureBare(store: Store, markdown: string, text: PageText): () => Promise<number> {
  const { database, author, moderator } = store;
  const write = createBareWriter(database);
  const { lines, digest } = digestOf(text);
  const bodyHash = createHash('sha256').update(markdown).digest('hex');
  const same = {
    pageId: idOf(database, 'pages', 'pinouts'),
    subjectId: idOf(database, 'subjects', 'measured'),
    authorId: author.id,
    moderatorId: moderator.id,
    title: text.frontMatter.title,
    summary,
    markdown,
    bodyHash,
    hash: bodyHash,
    rendition: JSON.stringify(text),
    digest: JSON.stringify(digest),
    lines,
    document: JSON.stringify(documentOf(text)),
    at,
    details: JSON.stringify({ proposal: 'proposal-1', version: 1, revision: 2, bodyHash, overrides: [] }),
  };
  let number = 1;
  return async () => {
    const publications = store.addProposals(publicationsARound, number).map((proposalId): BarePublication => {
      number += 1;
      return { ...same, proposalId, revisionId: randomId(), number, auditNumber: number };
    });
    const start = performance.now();
    for (const publication of publications) write(publication);
    return (performance.now() - start) / publications.length;
  };
}

/**
 * Publishing beside the rows that it writes, both with `synchronous=FULL` on the same disk. Within: reading the proposal
 * and the book's standing, every check, the page's digest, JSON, hashes, the transaction. Without: parsing.
 */
export async function publishingRows(pace: Pace): Promise<BenchRow[]> {
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-bench-'));
  const markdown = honestPage(3);
  const text = read(markdown);
  const stores = ['ours', 'bare'].map((name) => openStore(join(folder, `${name}.sqlite`), markdown, text));
  try {
    const [own, bare] = stores;
    if (own === undefined || bare === undefined) throw new Error('no stores');
    const [ours, yardstick] = [measureOurs(own, text), measureBare(bare, markdown, text)];
    await ours();
    await yardstick();
    const times = await inTurns(pace.rounds, ours, yardstick);
    return [
      {
        what: 'publish a 6 kB page, its text read already, synchronous=FULL',
        beside: 'the same rows as bare prepared statements, their values made before',
        measured: milliseconds(times.ours),
        yardstick: milliseconds(times.yardstick),
        ratio: 1 / times.timeRatio,
        budget: { kind: 'at least', ratio: 0.7 },
      },
    ];
  } finally {
    for (const { database } of stores) database.close();
    rmSync(folder, { recursive: true, force: true });
  }
}

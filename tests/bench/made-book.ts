import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { openDatabase } from '../../server/db/client.ts';
import { migrate } from '../../server/db/migrate.ts';
import { randomId } from '../../server/db/new-id.ts';
import { transact } from '../../server/db/transact.ts';
import { createPagePublication } from '../../server/pages/page-publication.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import { addMember } from '../factories/members.ts';
import { makeCorpus, type MadePage } from './made-corpus.ts';

const pagesATransaction = 250;
const firstIssue = Date.UTC(2026, 0, 1);

/** The corpus knows everything of its pages but their trees: those are read when a page is asked for. */
function withoutTree({ text }: MadePage): PageText {
  const { frontMatter, outline, sections, blocks } = text;
  return { frontMatter, outline, sections, blocks, findings: [], tree: { type: 'root', children: [] } };
}

function* inChunks<Value>(values: Iterable<Value>, size: number): Generator<Value[]> {
  let chunk: Value[] = [];
  for (const value of values) {
    chunk.push(value);
    if (chunk.length < size) continue;
    yield chunk;
    chunk = [];
  }
  if (chunk.length > 0) yield chunk;
}

function fillStore(file: string, pages: number): void {
  const database = openDatabase(file);
  try {
    // Made once and thrown away when anything changes: a power cut costs nothing.
    database.sqlite.pragma('synchronous = OFF');
    migrate(database, join(process.cwd(), 'drizzle'));
    const author = addMember(database, 'Writer');
    const moderator = addMember(database, 'Moderator', 'moderator');
    const publication = createPagePublication(database, randomId);
    let issued = 0;
    for (const chunk of inChunks(makeCorpus(pages), pagesATransaction)) {
      transact(database, (writing) => {
        for (const page of chunk) {
          const at = new Date(firstIssue + (issued += 1) * 60_000).toISOString();
          const issue = {
            summary: 'First issue',
            authorId: author.id,
            publishedBy: moderator.id,
            proposalId: 'made',
            at,
            overrides: [],
          };
          const { address, markdown } = page;
          publication.publish(
            writing,
            { ...issue, address, markdown, text: withoutTree(page) },
            publication.standing(address),
          );
        }
        database.sqlite.exec('DELETE FROM renditions');
      });
    }
    database.sqlite.pragma('wal_checkpoint(TRUNCATE)');
  } finally {
    database.close();
  }
}

/**
 * The folder of data of a club with so many made pages, kept until the program is built anew.
 */
export function requireMadeBook(pages: number): string {
  const root = process.cwd();
  const folder = join(root, '.cache', `made-book-${String(pages)}`);
  const made = join(folder, 'made-from');
  const stamp = readFileSync(join(root, '.cache', 'build'), 'utf8');
  if (existsSync(made) && readFileSync(made, 'utf8') === stamp) return folder;
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  fillStore(join(folder, 'book.sqlite'), pages);
  writeFileSync(made, stamp);
  return folder;
}

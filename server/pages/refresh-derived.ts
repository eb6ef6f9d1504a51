import { eq, sql } from 'drizzle-orm';
import { dialectVersion } from '../../shared/dialect/dialect-version.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import type { Database } from '../db/client.ts';
import { subjects } from '../db/schema/pages.ts';
import { transact } from '../db/transact.ts';
import { createDerivedWriter } from './derived-store.ts';
import type { PagePublication } from './page-publication.ts';
import { createPageReader } from './page-store.ts';
import type { ParsePool } from './parse-pool-types.ts';

/**
 * Reads again every page whose lists and search document another version of the dialect made; done before the book
 * opens. A page that is refused now keeps what was read of it before.
 * @returns addresses that could not be read, for the log
 */
export async function refreshDerived(
  database: Database,
  publication: PagePublication,
  parsePool: ParsePool,
): Promise<string[]> {
  const reader = createPageReader(database);
  const derived = createDerivedWriter(database);
  const raise = database.query
    .update(subjects)
    .set({ version: sql`${subjects.version} + 1` })
    .where(eq(subjects.id, sql.placeholder('id')))
    .prepare();
  const unread: string[] = [];
  for (const address of reader.outdatedPages(dialectVersion)) {
    const found = reader.page(address);
    const revision = found === null ? null : reader.revision(found.page.id, found.page.publishedRevision);
    if (found === null || revision === null) continue;
    const markdown = reader.requireBody(revision.id);
    const request = { markdown, context: publication.context(address), address, variant: anyVariant };
    const parsed = await parsePool.parse(request, null);
    if (parsed.ok) {
      transact(database, (writing) => {
        derived.write(writing, found.page.id, revision.id, parsed.value.text);
        // Lists and neighbours are kept by the subject's version.
        raise.run({ id: found.subject.id });
      });
    } else unread.push(`${address.shelf}/${address.subject}/${address.page}`);
  }
  return unread;
}

import { and, eq, ne, sql } from 'drizzle-orm';
import { dialectVersion } from '../../shared/dialect/dialect-version.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import type { Database } from '../db/client.ts';
import { pageDigests, renditions, searchDocuments } from '../db/schema/pages.ts';
import type { Writing } from '../db/transact.ts';
import { digestOf, documentOf } from './page-digest.ts';

/** Writes what is derived from a page's newest revision: its text as read, its digest, its document for the search. */
export function createDerivedWriter({ query }: Database) {
  const { placeholder } = sql;
  const deleteOld = query
    .delete(renditions)
    .where(and(eq(renditions.revisionId, placeholder('revisionId')), ne(renditions.dialectVersion, dialectVersion)))
    .prepare();
  const putRendition = query
    .insert(renditions)
    .values({ revisionId: placeholder('revisionId'), dialectVersion, text: placeholder('text') })
    .onConflictDoUpdate({
      target: [renditions.revisionId, renditions.dialectVersion],
      set: { text: sql`excluded.text` },
    })
    .prepare();
  const putDigest = query
    .insert(pageDigests)
    .values({
      pageId: placeholder('pageId'),
      dialectVersion,
      lines: placeholder('lines'),
      cited: placeholder('cited'),
      digest: placeholder('digest'),
    })
    .onConflictDoUpdate({
      target: pageDigests.pageId,
      set: {
        dialectVersion: sql`excluded.dialect_version`,
        lines: sql`excluded.lines`,
        cited: sql`excluded.cited`,
        digest: sql`excluded.digest`,
      },
    })
    .prepare();
  const putDocument = query
    .insert(searchDocuments)
    .values({ pageId: placeholder('pageId'), dialectVersion, document: placeholder('document') })
    .onConflictDoUpdate({
      target: searchDocuments.pageId,
      set: { dialectVersion: sql`excluded.dialect_version`, document: sql`excluded.document` },
    })
    .prepare();
  return {
    /** Keeps a revision's text as read by this version of the dialect; what an older one read goes. */
    writeRendition(_writing: Writing, revisionId: string, text: PageText): void {
      deleteOld.run({ revisionId });
      putRendition.run({ revisionId, text });
    },
    write(writing: Writing, pageId: string, revisionId: string, text: PageText): void {
      this.writeRendition(writing, revisionId, text);
      const { lines, cited, digest } = digestOf(text);
      putDigest.run({ pageId, lines, cited, digest });
      putDocument.run({ pageId, document: documentOf(text) });
    },
  };
}

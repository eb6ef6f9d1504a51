import type { Database } from '../../server/db/client.ts';
import { dialectVersion } from '../../shared/dialect/dialect-version.ts';

/** What a publication writes, all of it made before: the yardstick makes nothing itself. */
export interface BarePublication {
  readonly pageId: string;
  readonly subjectId: string;
  readonly proposalId: string;
  readonly revisionId: string;
  readonly authorId: string;
  readonly moderatorId: string;
  readonly number: number;
  readonly title: string;
  readonly summary: string;
  readonly markdown: string;
  readonly bodyHash: string;
  readonly rendition: string;
  readonly digest: string;
  readonly lines: number;
  readonly document: string;
  readonly at: string;
  readonly auditNumber: number;
  readonly details: string;
  readonly hash: string;
}

/** Writes the rows that publishing writes, with prepared statements and nothing else. */
export function createBareWriter({ sqlite }: Database): (publication: BarePublication) => void {
  const page =
    sqlite.prepare(`INSERT INTO pages (id, subject_id, slug, title, kind, summary, published_revision, published_at, created_at)
    VALUES (@pageId, @subjectId, 'pinouts', @title, 'pinouts', @summary, @number, @at, @at)
    ON CONFLICT (id) DO UPDATE SET title = excluded.title, kind = excluded.kind, summary = excluded.summary,
      published_revision = excluded.published_revision, published_at = excluded.published_at, retired_at = NULL`);
  const revision =
    sqlite.prepare(`INSERT INTO revisions (id, page_id, number, title, summary, author_id, published_by, published_at, proposal_id, body_hash)
    VALUES (@revisionId, @pageId, @number, @title, @summary, @authorId, @moderatorId, @at, @proposalId, @bodyHash)`);
  const body = sqlite.prepare('INSERT INTO revision_bodies (revision_id, markdown) VALUES (@revisionId, @markdown)');
  const rendition = sqlite.prepare(
    `INSERT INTO renditions (revision_id, dialect_version, text) VALUES (@revisionId, ${String(dialectVersion)}, @rendition)`,
  );
  const digest = sqlite.prepare(`INSERT INTO page_digests (page_id, dialect_version, lines, cited, digest)
    VALUES (@pageId, ${String(dialectVersion)}, @lines, @lines, @digest)
    ON CONFLICT (page_id) DO UPDATE SET lines = excluded.lines, cited = excluded.cited, digest = excluded.digest`);
  const document = sqlite.prepare(`INSERT INTO search_documents (page_id, dialect_version, document)
    VALUES (@pageId, ${String(dialectVersion)}, @document)
    ON CONFLICT (page_id) DO UPDATE SET document = excluded.document`);
  const subject = sqlite.prepare('UPDATE subjects SET version = version + 1 WHERE id = @subjectId');
  const proposal = sqlite.prepare(`UPDATE proposals SET state = 'published', title = @title, updated_at = @at,
    decided_by = @moderatorId, published_revision_id = @revisionId WHERE id = @proposalId`);
  const audit = sqlite.prepare(`INSERT INTO audit (number, at, actor_id, action, subject, details, previous_hash, hash)
    VALUES (@auditNumber, @at, @moderatorId, 'publish', 'donors/measured/pinouts', @details, @hash, @hash)`);
  const statements = [page, revision, body, rendition, digest, document, subject, proposal, audit];
  const write = sqlite.transaction((publication: BarePublication) => {
    for (const statement of statements) statement.run(publication);
  });
  return (publication) => write.immediate(publication);
}

import { createHash } from 'node:crypto';
import { asc, desc, sql } from 'drizzle-orm';
import type { Database } from './client.ts';
import { audit } from './schema/audit.ts';
import type { Writing } from './transact.ts';

/** Something that somebody did. */
export interface AuditEntry {
  /** ISO 8601 in UTC. */
  readonly at: string;
  /** Null for what the program did by itself. */
  readonly actorId: string | null;
  readonly action: string;
  readonly subject: string;
  readonly details: Readonly<Record<string, unknown>>;
}

export interface AuditLog {
  append(writing: Writing, entry: AuditEntry): void;
  /** The number of the first row that does not follow from the one before it; null where the chain is whole. */
  firstBrokenLink(): number | null;
}

function hashOf(previousHash: string, number: number, { at, actorId, action, subject, details }: AuditEntry): string {
  const said = JSON.stringify([previousHash, number, at, actorId, action, subject, JSON.stringify(details)]);
  return createHash('sha256').update(said).digest('hex');
}

/** The book's memory of who did what: each row is hashed with the one before it, so that a row changed or gone shows. */
export function createAuditLog({ query }: Database): AuditLog {
  const last = query
    .select({ number: audit.number, hash: audit.hash })
    .from(audit)
    .orderBy(desc(audit.number))
    .limit(1)
    .prepare();
  const insert = query
    .insert(audit)
    .values({
      number: sql.placeholder('number'),
      at: sql.placeholder('at'),
      actorId: sql.placeholder('actorId'),
      action: sql.placeholder('action'),
      subject: sql.placeholder('subject'),
      details: sql.placeholder('details'),
      previousHash: sql.placeholder('previousHash'),
      hash: sql.placeholder('hash'),
    })
    .prepare();
  return {
    append(_writing, entry) {
      const before = last.get();
      const number = (before?.number ?? 0) + 1;
      const previousHash = before?.hash ?? '';
      insert.run({ ...entry, number, previousHash, hash: hashOf(previousHash, number, entry) });
    },
    firstBrokenLink() {
      let previousHash = '';
      let expected = 1;
      for (const row of query.select().from(audit).orderBy(asc(audit.number)).all()) {
        const whole = row.number === expected && row.previousHash === previousHash;
        if (!whole || row.hash !== hashOf(previousHash, row.number, row)) return row.number;
        previousHash = row.hash;
        expected += 1;
      }
      return null;
    },
  };
}

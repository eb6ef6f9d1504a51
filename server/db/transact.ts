import type { Brand } from '../../shared/lib/brand.ts';
import type { Database } from './client.ts';

/** Proof that a transaction is open: every method that writes asks for it, so nothing is written outside one. */
export type Writing = Brand<{ readonly database: Database }, 'Writing'>;

/**
 * Runs `write` in one transaction that takes the write lock at once, and gives what it gives; if it throws, nothing
 * was written. It is synchronous: one that gives a promise is refused by better-sqlite3 and writes nothing, where
 * Drizzle's own types would accept it and commit before it had begun.
 */
export function transact<Value>(database: Database, write: (writing: Writing) => Value): Value {
  // The one place that makes the proof.
  const writing = { database } as Writing;
  return database.sqlite.transaction(() => write(writing)).immediate();
}
